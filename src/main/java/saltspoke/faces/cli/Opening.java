package saltspoke.faces.cli;

import java.nio.file.Path;
import saltspoke.faces.Answers;
import saltspoke.faces.LocalCorrections;
import saltspoke.fields.DataSet;
import saltspoke.values.Refusal;

/** Opens the data set that a command line names, else the shipped one. */
final class Opening {
  private Opening() {}

  static DataSet dataSet(Path directory) {
    return directory == null ? DataSet.shipped() : DataSet.in(directory);
  }

  static Answers answers(Path directory) {
    return new Answers(dataSet(directory));
  }

  /** Answers over a data set and the local measurements that a command line names, if any. */
  static Answers answers(Path directory, CorrectionsOption corrections) {
    LocalCorrections read = LocalCorrections.NONE;
    if (corrections.file != null && corrections.stations != null) {
      throw Refusal.wrongUse(
          "too-many", "stations", corrections.stations, "either --corrections or --stations");
    }
    if (corrections.file != null) {
      read = LocalCorrections.read(corrections.file);
    } else if (corrections.stations != null) {
      read = LocalCorrections.stations(corrections.stations);
    }
    return new Answers(dataSet(directory), read);
  }
}
