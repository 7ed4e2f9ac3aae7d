package saltspoke.sources;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.Path;

/** Takes the files of the world that is being built and writes their manifest rows. */
public interface LayerSink {
  /**
   * Opens a new file; the caller closes it. A path ending in {@code .gz} is compressed here,
   * without a time stamp, so the caller writes plain bytes.
   */
  OutputStream file(LayerFile description) throws IOException;

  /**
   * For libraries that insist on a file of their own: a path that the caller writes before the
   * builder returns. Nothing is compressed.
   */
  Path path(LayerFile description) throws IOException;

  /**
   * Tells the person who waits, and keeps the sentence for the manifest: a fall-back taken, a gap.
   */
  void note(String sentence);
}
