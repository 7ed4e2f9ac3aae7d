package saltspoke.faces.cli;

import java.nio.file.Path;
import saltspoke.faces.Answers;
import saltspoke.faces.LocalCorrections;
import saltspoke.fields.DataSet;

/** Opens the data set that a command line names, else the shipped one. */
final class Opening {
  private Opening() {}

  static DataSet dataSet(Path directory) {
    return directory == null ? DataSet.shipped() : DataSet.in(directory);
  }

  static Answers answers(Path directory) {
    return new Answers(dataSet(directory));
  }

  /** Answers over a data set and the correction file that a command line names, if any. */
  static Answers answers(Path directory, CorrectionsOption corrections) {
    LocalCorrections read =
        corrections.file == null ? LocalCorrections.NONE : LocalCorrections.read(corrections.file);
    return new Answers(dataSet(directory), read);
  }
}
