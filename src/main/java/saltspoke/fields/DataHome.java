package saltspoke.fields;

import java.io.IOException;
import java.io.InputStream;
import java.net.URISyntaxException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.CodeSource;
import java.util.ArrayList;
import java.util.List;
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

  /** Where the shipped world lies; see {@link DataSet#shipped()}. */
  static DataHome shipped() {
    String named = System.getProperty(DataSet.FOLDER_PROPERTY);
    if (named != null) {
      return folder(Path.of(named));
    }
    for (Path candidate : candidates()) {
      if (Files.isRegularFile(candidate.resolve(Manifest.FILE_NAME))) {
        return folder(candidate);
      }
    }
    return classPath(DataSet.FOLDER_NAME);
  }

  private static List<Path> candidates() {
    List<Path> folders = new ArrayList<>();
    CodeSource code = DataHome.class.getProtectionDomain().getCodeSource();
    if (code != null) {
      try {
        Path program = Path.of(code.getLocation().toURI());
        if (Files.isRegularFile(program)) {
          folders.add(program.resolveSibling(DataSet.FOLDER_NAME));
        }
      } catch (URISyntaxException | IllegalArgumentException e) {
        // A program that was not loaded from a file has no folder beside it.
      }
    }
    folders.add(Path.of(DataSet.FOLDER_NAME));
    return folders;
  }
}
