package saltspoke.faces;

import com.fasterxml.jackson.databind.node.ObjectNode;
import saltspoke.faces.json.Json;
import saltspoke.fields.DataSet;

/** Version, data set, sources and licences. */
public final class About {
  /** Table of the libraries inside the jar with their licences, on the class path. */
  public static final String LIBRARIES = "saltspoke/licences/libraries.csv";

  private About() {}

  /** Version of the running jar, or {@code development} outside of one. */
  public static String version() {
    String version = About.class.getPackage().getImplementationVersion();
    return version == null ? "development" : version;
  }

  public static ObjectNode json(DataSet dataSet) {
    ObjectNode node = Json.object();
    node.put("program", "Saltspoke");
    node.put("version", version());
    return node;
  }

  /** What {@link #json} says, for reading. */
  public static String text(DataSet dataSet) {
    return "Saltspoke " + version() + "\nData: " + dataSet.location();
  }

  /** Licence and attribution of every layer. */
  public static String dataNotice(DataSet dataSet) {
    return "";
  }
}
