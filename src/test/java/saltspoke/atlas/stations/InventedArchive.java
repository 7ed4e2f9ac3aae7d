package saltspoke.atlas.stations;

import java.io.IOException;
import java.io.OutputStream;
import java.io.OutputStreamWriter;
import java.io.Writer;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Random;
import java.util.zip.GZIPOutputStream;

/** Invented hourly years in packed CSV, for tests and benchmarks of the ingest. Nothing is real. */
public final class InventedArchive {
  /** What the columns mean, for {@code --mapping}. */
  public static final String MAPPING =
      "quantity,column,unit,missing\nstation,station,,\nlatitude_deg,lat,,\nlongitude_deg,lon,,\n"
          + "elevation_m,elev,,\ntime,time,,\nclock,utc,,\ntemperature,t,c,\ndew_point,td,c,\n"
          + "wind_direction,dir,deg,999\nwind_speed,speed,m_s,\n";

  private static final int[] DAYS = {31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31};
  private static final int FIRST_YEAR = 2001;

  private InventedArchive() {}

  /** Writes an archive for a benchmark: FOLDER STATIONS YEARS. */
  public static void main(String[] args) throws IOException {
    write(Path.of(args[0]), Integer.parseInt(args[1]), Integer.parseInt(args[2]));
  }

  /**
   * Writes {@code stations} × {@code years} files {@code S00-2001.csv.gz} and the mapping {@code
   * ../mapping.csv}.
   */
  public static Path write(Path folder, int stations, int years) throws IOException {
    Files.createDirectories(folder);
    Files.writeString(folder.resolveSibling("mapping.csv"), MAPPING);
    for (int s = 0; s < stations; s++) {
      for (int y = 0; y < years; y++) {
        Path file =
            folder.resolve(String.format(Locale.ROOT, "S%02d-%d.csv.gz", s, FIRST_YEAR + y));
        try (OutputStream out = Files.newOutputStream(file);
            Writer writer =
                new OutputStreamWriter(
                    new GZIPOutputStream(out, 1 << 16), StandardCharsets.US_ASCII)) {
          year(writer, s, FIRST_YEAR + y);
        }
      }
    }
    return folder;
  }

  private static void year(Writer out, int station, int year) throws IOException {
    Random random = new Random(1000L * station + year);
    String place =
        String.format(
            Locale.ROOT,
            "S%02d,%.3f,%.3f,%d,",
            station,
            50 + station % 10 * 0.3,
            8 + station / 10 * 0.5,
            100 + 10 * station);
    out.write("station,lat,lon,elev,time,t,td,dir,speed\n");
    double slow = 0;
    int hour = 0;
    for (int m = 0; m < DAYS.length; m++) {
      for (int d = 1; d <= DAYS[m]; d++) {
        for (int h = 0; h < 24; h++, hour++) {
          slow = 0.98 * slow + 0.6 * random.nextGaussian();
          double t =
              9
                  - 9 * Math.cos(hour * 2 * Math.PI / 8760)
                  + 4 * Math.sin((h - 9) * Math.PI / 12)
                  + slow;
          double td = t - 0.3 - Math.abs(3 * random.nextGaussian());
          out.write(
              place
                  + String.format(
                      Locale.ROOT,
                      "%d-%02d-%02dT%02d:00:00,%.1f,%.1f,%d,%.1f%n",
                      year,
                      m + 1,
                      d,
                      h,
                      t,
                      td,
                      10 * random.nextInt(36),
                      5 * random.nextDouble()));
        }
      }
    }
  }
}
