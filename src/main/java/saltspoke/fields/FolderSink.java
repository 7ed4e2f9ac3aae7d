package saltspoke.fields;

import java.io.BufferedOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.function.Consumer;
import java.util.zip.Deflater;
import java.util.zip.GZIPOutputStream;
import saltspoke.sources.LayerFile;
import saltspoke.sources.LayerSink;

/** Writes a builder's files into a folder and remembers them for the manifest. */
final class FolderSink implements LayerSink {
  private final Path folder;
  private final Consumer<String> notes;
  private final Set<LayerFile> files = new LinkedHashSet<>();

  FolderSink(Path folder, Consumer<String> notes) {
    this.folder = folder;
    this.notes = notes;
  }

  @Override
  public OutputStream file(LayerFile description) throws IOException {
    OutputStream plain =
        new BufferedOutputStream(Files.newOutputStream(path(description)), 1 << 16);
    return description.path().endsWith(".gz") ? new BestGzip(plain) : plain;
  }

  @Override
  public Path path(LayerFile description) throws IOException {
    if (!files.add(description)) {
      throw new IllegalStateException("written twice: " + description.path());
    }
    Path path = folder.resolve(description.path());
    Files.createDirectories(path.getParent());
    return path;
  }

  @Override
  public void note(String sentence) {
    notes.accept(sentence);
  }

  /** Manifest rows of the files written so far. */
  List<Manifest.Entry> entries(Set<String> sources) throws IOException {
    List<Manifest.Entry> entries = new ArrayList<>();
    for (LayerFile file : files) {
      Path path = folder.resolve(file.path());
      entries.add(
          new Manifest.Entry(
              file.layer(),
              file.path(),
              file.title(),
              file.unit(),
              file.period(),
              file.bands(),
              List.copyOf(sources),
              file.licence(),
              file.attribution(),
              file.remark(),
              Checksum.of(path),
              Files.size(path)));
    }
    return entries;
  }

  /** RFC 1952 at the smallest size; the JDK writes no time and a fixed system byte. */
  private static final class BestGzip extends GZIPOutputStream {
    BestGzip(OutputStream out) throws IOException {
      super(out, 1 << 16);
      def.setLevel(Deflater.BEST_COMPRESSION);
    }
  }
}
