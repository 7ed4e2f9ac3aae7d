package saltspoke.fields;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;

/** Where the files of a data set lie: a folder, or inside the program's own jar. */
interface DataHome {
  /** For messages. */
  String name();

  /** The bytes of a file, or nothing when it is missing. */
  Optional<byte[]> find(String path) throws IOException;

  /** A folder on disk. */
  static DataHome folder(Path folder) {
    return new DataHome() {
      @Override
      public String name() {
        return folder.toString();
      }

      @Override
      public Optional<byte[]> find(String path) throws IOException {
        Path file = folder.resolve(path);
        return Files.isRegularFile(file) ? Optional.of(Files.readAllBytes(file)) : Optional.empty();
      }
    };
  }

  /** A folder on the class path. */
  static DataHome classPath(String folder) {
    return new DataHome() {
      @Override
      public String name() {
        return folder + " inside the program";
      }

      @Override
      public Optional<byte[]> find(String path) throws IOException {
        try (InputStream in =
            DataHome.class.getClassLoader().getResourceAsStream(folder + "/" + path)) {
          return in == null ? Optional.empty() : Optional.of(in.readAllBytes());
        }
      }
    };
  }
}
