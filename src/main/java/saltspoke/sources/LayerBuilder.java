package saltspoke.sources;

import java.io.IOException;
import java.util.List;
import java.util.Optional;

/**
 * Builds one or a few files of the shipped world from source packages. Given the same packages it
 * writes the same bytes: no clock, no random order, no dependence on the machine.
 */
public interface LayerBuilder {
  /** Short name for progress and messages. */
  String id();

  /**
   * Ids of packages that it cannot do without; others it may use when {@link SourcePackages#has}.
   */
  List<String> needs();

  /**
   * What the world does without this layer when a needed package is missing, as a sentence for the
   * person who waits; nothing when the ingest must not go on without it.
   */
  default Optional<String> fallBack() {
    return Optional.empty();
  }

  /**
   * Reads from the packages and writes the layer's files. Packages that are opened through {@code
   * in} are recorded as the sources of every file written to {@code out}.
   *
   * @throws IOException when a package cannot be read or a file not be written
   */
  void build(SourcePackages in, LayerSink out) throws IOException;
}
