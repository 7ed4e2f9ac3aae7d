package saltspoke.atlas.stock;

import java.io.IOException;
import java.io.Writer;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Random;
import saltspoke.fields.DataSet;
import saltspoke.sources.CsvTable;

/**
 * An invented customer list over five countries, as an office would export it: postcodes are real,
 * everything else is made up. About one row in ten is written so that it has to be mended, about
 * one in fifty so that it cannot be. The same seed gives the same list.
 *
 * <p>Run as a program: ROWS FILE.
 */
public final class InventedCustomers {
  private static final String[] COUNTRIES = {"DE", "FR", "IT", "US", "IN"};
  private static final String[][] WRITTEN = {
    {"DE", "Deutschland"}, {"FR", "France"}, {"IT", "Italia"}, {"US", "USA"}, {"IN", "India"}
  };
  private static final String[] PROFILES = {
    "all-winter-commuter", "year-round-club", "weekend-gravel", "fair-weather-racer", ""
  };
  private static final String[] NIPPLES = {"", "", "brass-nickel", "aluminium-anodised-thick"};

  private InventedCustomers() {}

  public static void main(String[] arguments) throws IOException {
    write(Integer.parseInt(arguments[0]), Path.of(arguments[1]), 7);
  }

  /** Writes a list. */
  public static void write(int rows, Path file, long seed) throws IOException {
    Random random = new Random(seed);
    DataSet data = DataSet.shipped();
    List<List<String>> codes = new ArrayList<>();
    for (String country : COUNTRIES) {
      codes.add(postcodes(data, country));
    }
    try (Writer out = Files.newBufferedWriter(file, StandardCharsets.UTF_8)) {
      out.write("customer;Postal code;Country;Wheels;Profile;Nipple\r\n");
      for (int i = 0; i < rows; i++) {
        int c = random.nextInt(COUNTRIES.length);
        String code = codes.get(c).get(random.nextInt(codes.get(c).size()));
        String country = WRITTEN[c][random.nextInt(20) == 0 ? 1 : 0];
        String wheels = String.valueOf(1 + random.nextInt(12));
        switch (random.nextInt(50)) {
          case 0 -> code = "none";
          case 1 -> wheels = wheels + ",5";
          case 2 -> code = code + ".0";
          case 3, 4 -> code = code.replaceFirst("^0+(?=\\d)", "");
          default -> {}
        }
        out.write(
            String.join(
                    ";",
                    "invented " + i,
                    random.nextInt(8) == 0 ? "\"" + code + "\"" : code,
                    " " + country,
                    wheels,
                    PROFILES[random.nextInt(PROFILES.length)],
                    NIPPLES[random.nextInt(NIPPLES.length)])
                + "\r\n");
      }
    }
  }

  private static List<String> postcodes(DataSet data, String country) throws IOException {
    List<String> codes = new ArrayList<>();
    String layer = "postcodes-" + country.toLowerCase(Locale.ROOT);
    CsvTable.forEach(data.open(layer), layer, row -> codes.add(row.text("postcode")));
    return codes;
  }
}
