package saltspoke.faces;

import java.io.IOException;
import java.io.InputStream;
import saltspoke.values.Refusal;

/** Files that ship on the class path. */
public final class Resources {
  private Resources() {}

  /** The bytes of a file that must be there. */
  public static byte[] bytes(String path) {
    try (InputStream in = Resources.class.getClassLoader().getResourceAsStream(path)) {
      if (in != null) {
        return in.readAllBytes();
      }
    } catch (IOException e) {
      // Refused below: a file of the program that cannot be read is as good as missing.
    }
    throw Refusal.dataDamaged("missing-file", path, "", "install the program anew");
  }
}
