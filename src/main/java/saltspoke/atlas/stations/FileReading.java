package saltspoke.atlas.stations;

import java.io.IOException;
import java.io.InputStream;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import saltspoke.atmosphere.stations.YearCounter;
import saltspoke.atmosphere.stations.YearHours;
import saltspoke.sources.hourly.HourlyFormats;
import saltspoke.sources.hourly.HourlyRow;
import saltspoke.sources.hourly.HourlySink;
import saltspoke.sources.hourly.HourlyStation;
import saltspoke.values.Refusal;

/**
 * Reads one file after the other into station years. Holds the hours of one year at a time: a
 * station's rows of one year stand together in a file. Not safe for several threads.
 */
public final class FileReading implements HourlySink {
  private static final double DEGREES_OF_AN_HOUR = 15;

  private final HourlyFormats formats;
  private final YearHours hours = new YearHours();
  private final YearCounter counter = new YearCounter();
  private final List<StationYearRecord> done = new ArrayList<>();
  private final Set<String> seen = new HashSet<>();
  private HourlyStation station;
  private int year;
  private boolean open;
  private String name = "";

  public FileReading(HourlyFormats formats) {
    this.formats = formats;
  }

  /** Something that opens a file. */
  public interface Source {
    InputStream open() throws IOException;
  }

  /** Reads a file; one that cannot be read gives its refusal. */
  public FileOutcome read(String fileName, Source source) {
    name = fileName;
    done.clear();
    seen.clear();
    station = null;
    open = false;
    try (InputStream in = source.open()) {
      formats.read(in, name, this);
      finish();
      return new FileOutcome(name, done, Optional.empty());
    } catch (Refusal refusal) {
      return new FileOutcome(name, List.of(), Optional.of(refusal));
    } catch (IOException e) {
      return new FileOutcome(
          name,
          List.of(),
          Optional.of(
              Refusal.dataDamaged(
                  "unreadable-file",
                  name + ":1 file",
                  String.valueOf(e.getMessage()),
                  "a whole file that can be read")));
    }
  }

  @Override
  public void station(HourlyStation next) {
    finish();
    station = next;
  }

  @Override
  public void row(HourlyRow row) {
    if (!open || row.year() != year) {
      finish();
      year = row.year();
      open = true;
      if (!seen.add(station.id() + " " + year)) {
        throw Refusal.dataDamaged(
            "scattered-rows",
            name + ":" + row.line() + " station",
            station.id() + " " + year + " once more",
            "the rows of a station and year together: sort by station, then time");
      }
      hours.begin(year, station.kind() == HourlyStation.Kind.DAILY);
    }
    hours.put(row);
  }

  private void finish() {
    if (open) {
      int ahead = station.utc() ? (int) Math.rint(station.longitudeDeg() / DEGREES_OF_AN_HOUR) : 0;
      done.add(new StationYearRecord(station, counter.count(hours, ahead)));
      open = false;
    }
  }
}
