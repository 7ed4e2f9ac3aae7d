package saltspoke.faces;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.nio.charset.StandardCharsets;
import java.util.Locale;
import saltspoke.faces.json.Json;
import saltspoke.fields.DataSet;
import saltspoke.fields.Manifest;

/** Version, data set, sources and licences. */
public final class About {
  private static final String LIBRARIES = "saltspoke/licences/libraries.csv";

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
    node.put("licence", "Apache-2.0");
    ObjectNode data = node.putObject("dataSet");
    ArrayNode files = data.putArray("files");
    for (Manifest.Entry file : dataSet.manifest().files()) {
      ObjectNode entry = files.addObject();
      entry.put("layer", file.layer());
      entry.put("path", file.path());
      entry.put("title", file.title());
      entry.put("unit", file.unit());
      entry.put("period", file.period());
      entry.put("licence", file.licence());
      entry.put("attribution", file.attribution());
      entry.put("notice", file.notice());
      entry.put("sha256", file.sha256());
      entry.put("bytes", file.bytes());
      ArrayNode sources = entry.putArray("sources");
      file.sources().forEach(sources::add);
    }
    ArrayNode sources = data.putArray("sources");
    for (Manifest.Source source : dataSet.manifest().sources()) {
      ObjectNode entry = sources.addObject();
      entry.put("id", source.id());
      entry.put("registry", source.registry());
      entry.put("name", source.name());
      entry.put("version", source.version());
      entry.put("file", source.file());
      entry.put("licence", source.licence());
      entry.put("attribution", source.attribution());
      entry.put("sha256", source.sha256());
    }
    ArrayNode notes = data.putArray("notes");
    dataSet.manifest().notes().forEach(notes::add);
    return node;
  }

  /** The same in short, for reading. */
  public static String text(DataSet dataSet) {
    StringBuilder out = new StringBuilder();
    out.append("Saltspoke ").append(version()).append(", Apache License 2.0\n");
    out.append("Data: ").append(dataSet.location()).append("\n\n");
    for (Manifest.Entry file : dataSet.manifest().files()) {
      out.append(
          String.format(
              Locale.ROOT,
              "%-36s %8.2f MB  %-12s %s%n",
              file.layer(),
              file.bytes() / 1e6,
              file.period(),
              file.title()));
    }
    dataSet.manifest().notes().forEach(note -> out.append("note: ").append(note).append('\n'));
    out.append("\nLicences and attributions: saltspoke about --licences\n");
    return out.toString();
  }

  /** The notice of every library in the jar and of every layer and package of the data. */
  public static String notices(DataSet dataSet) {
    StringBuilder out = new StringBuilder();
    out.append("LIBRARIES\n");
    out.append(new String(Resources.bytes(LIBRARIES), StandardCharsets.UTF_8));
    out.append("\nDATA LAYERS\n");
    for (Manifest.Entry file : dataSet.manifest().files()) {
      out.append(file.path()).append(": ").append(file.licence()).append(". ");
      out.append(file.attribution()).append(' ').append(file.notice()).append('\n');
    }
    out.append("\nPACKAGES THEY WERE BUILT FROM\n");
    for (Manifest.Source source : dataSet.manifest().sources()) {
      out.append(source.name()).append(' ').append(source.version()).append(": ");
      out.append(source.licence()).append(". ").append(source.attribution()).append(' ');
      out.append(source.notice()).append('\n');
    }
    return out.toString();
  }
}
