package saltspoke.sources;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;

/**
 * Reads the GeoNames city table: tab-separated UTF-8 without a header, 19 columns in the order of
 * the GeoNames readme (geonameid, name, asciiname, alternatenames, latitude, longitude, feature
 * class, feature code, country code, cc2, admin1–admin4 codes, population, elevation, dem,
 * timezone, modification date).
 */
final class GeonamesCities {
  /** Sections of towns, abandoned places and settlements, which would show a town twice. */
  private static final Set<String> DROPPED = Set.of("PPLX", "PPLQ", "STLMT");

  /**
   * A town.
   *
   * @param alternates other spellings, separated by commas
   * @param demM elevation of the ground by GeoNames' digital elevation model, m; −9999 when missing
   */
  record City(
      String name,
      String alternates,
      double latitudeDeg,
      double longitudeDeg,
      String country,
      String admin1,
      String admin2,
      String admin3,
      String admin4,
      long population,
      int demM) {}

  private GeonamesCities() {}

  static List<City> read(SourcePackages in) throws IOException {
    List<City> cities = new ArrayList<>();
    try (BufferedReader reader =
        new BufferedReader(
            new InputStreamReader(
                in.open("cities-500", "dist/cities500.txt"), StandardCharsets.UTF_8))) {
      for (String line = reader.readLine(); line != null; line = reader.readLine()) {
        String[] c = line.split("\t", -1);
        if (c.length >= 19 && !DROPPED.contains(c[7])) {
          cities.add(
              new City(
                  c[1],
                  c[3],
                  Double.parseDouble(c[4]),
                  Double.parseDouble(c[5]),
                  c[8],
                  c[10],
                  c[11],
                  c[12],
                  c[13],
                  c[14].isEmpty() ? 0 : Long.parseLong(c[14]),
                  c[16].isEmpty() ? -9999 : Integer.parseInt(c[16])));
        }
      }
    }
    return cities;
  }
}
