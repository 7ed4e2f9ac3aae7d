package saltspoke.faces.cli;

import java.nio.file.Path;
import saltspoke.faces.Answers;
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
}
