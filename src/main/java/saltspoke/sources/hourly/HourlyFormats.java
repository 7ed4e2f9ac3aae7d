package saltspoke.sources.hourly;

import java.io.InputStream;
import java.util.ArrayList;
import java.util.List;
import saltspoke.values.Refusal;

/** The layouts that can be read, and the one entry to all of them. Safe for use by many threads. */
public final class HourlyFormats {
  private static final int LOOKED_AT = 16;

  private final List<HourlyFormat> formats;
  private final StationList stations;

  private HourlyFormats(List<HourlyFormat> formats, StationList stations) {
    this.formats = List.copyOf(formats);
    this.stations = stations;
  }

  /** The published layouts; stations that a file only names are sought in the list. */
  public static HourlyFormats published(StationList stations) {
    return new HourlyFormats(
        List.of(
            new IsdLite(),
            PublishedColumns.ghcnHourly(),
            PublishedColumns.gsodDaily(),
            new EpwWeather()),
        stations);
  }

  /** The same, and every other file by a mapping file; closes the stream. */
  public HourlyFormats with(InputStream mapping, String mappingName) {
    List<HourlyFormat> all = new ArrayList<>(formats);
    all.add(MappingFile.read(mapping, mappingName));
    return new HourlyFormats(all, stations);
  }

  /**
   * Reads one file, already unpacked.
   *
   * @param fileName for messages and for layouts that keep the station in the name
   * @throws Refusal naming file, line and field of the first thing that cannot be
   */
  public void read(InputStream in, String fileName, HourlySink sink) {
    LineReader lines = new LineReader(in, fileName);
    if (!lines.next()) {
      throw lines.refuse("empty-file", "file", "", "at least one row");
    }
    refuseNoText(lines);
    String first = lines.text();
    HourlyFormat format =
        formats.stream()
            .filter(f -> f.fits(first))
            .findFirst()
            .orElseThrow(
                () ->
                    lines.refuse(
                        "unknown-format",
                        "line",
                        first,
                        "one of: "
                            + String.join(
                                "; ", formats.stream().map(HourlyFormat::description).toList())
                            + "; or any table with a mapping file (--mapping)"));
    String name = fileName.substring(fileName.lastIndexOf('/') + 1);
    format.read(lines, name, stations, sink);
  }

  /** Says what a file is that is no text in one byte per letter or UTF-8. */
  private static void refuseNoText(LineReader lines) {
    byte[] bytes = lines.bytes();
    int to = Math.min(lines.end(), lines.start() + LOOKED_AT);
    if (to - lines.start() >= 2
        && ((bytes[lines.start()] == (byte) 0xFF && bytes[lines.start() + 1] == (byte) 0xFE)
            || (bytes[lines.start()] == (byte) 0xFE && bytes[lines.start() + 1] == (byte) 0xFF))) {
      throw lines.refuse("wrong-encoding", "line", "UTF-16", "text in UTF-8");
    }
    for (int i = lines.start(); i < to; i++) {
      if (bytes[i] >= 0 && bytes[i] < ' ' && bytes[i] != '\t') {
        throw lines.refuse(
            "binary-file", "line", lines.text(), "text, maybe packed as gzip or zip");
      }
    }
  }
}
