package saltspoke.faces.export;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;

/** Files that appear whole or not at all. */
final class WholeFile {
  private WholeFile() {}

  /** Puts a finished file in the place of another. */
  static void moveInto(Path finished, Path target) throws IOException {
    Files.move(
        finished, target, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
  }

  /** The name under which a file is written until it is whole. */
  static Path aside(Path target) {
    return target.resolveSibling(target.getFileName() + ".new");
  }
}
