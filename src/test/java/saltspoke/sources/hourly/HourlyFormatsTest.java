package saltspoke.sources.hourly;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Random;
import java.util.zip.GZIPInputStream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import saltspoke.values.Refusal;

class HourlyFormatsTest {
  private static final Path ISD =
      Path.of("src/test/resources/reference/noaa-isd-lite/725300-2015.gz");

  private static final String HISTORY =
      "\"USAF\",\"WBAN\",\"STATION NAME\",\"CTRY\",\"STATE\",\"ICAO\",\"LAT\",\"LON\",\"ELEV(M)\","
          + "\"BEGIN\",\"END\"\n"
          + "\"725300\",\"94846\",\"CHICAGO O'HARE\",\"US\",\"IL\",\"KORD\",\"+41.995\","
          + "\"-087.934\",\"+0204.8\",\"19461001\",\"20250101\"\n"
          + "\"000000\",\"11111\",\"NOWHERE\",\"\",\"\",\"\",\"\",\"\",\"\",\"\",\"\"\n";

  private static final StationList LIST = StationList.read(stream(HISTORY), "isd-history.csv");

  /** A row as a test sees it. */
  private record Seen(
      String station,
      int year,
      int month,
      int day,
      int hour,
      int minute,
      double temperatureC,
      double dewPointC,
      double humidityPct,
      double windFromDeg,
      double windMPerS,
      int impossible) {}

  private static InputStream stream(String text) {
    return new ByteArrayInputStream(text.getBytes(StandardCharsets.UTF_8));
  }

  private static List<Seen> read(HourlyFormats formats, InputStream in, String name) {
    List<Seen> seen = new ArrayList<>();
    formats.read(
        in,
        name,
        new HourlySink() {
          private HourlyStation station;

          @Override
          public void station(HourlyStation next) {
            station = next;
          }

          @Override
          public void row(HourlyRow row) {
            seen.add(
                new Seen(
                    station.id()
                        + String.format(
                            Locale.ROOT,
                            " %.3f %.3f %.1f %s",
                            station.latitudeDeg(),
                            station.longitudeDeg(),
                            station.elevationM(),
                            station.kind()),
                    row.year(),
                    row.month(),
                    row.day(),
                    row.hour(),
                    row.minute(),
                    row.get(HourlyQuantity.TEMPERATURE),
                    row.get(HourlyQuantity.DEW_POINT),
                    row.get(HourlyQuantity.RELATIVE_HUMIDITY),
                    row.get(HourlyQuantity.WIND_DIRECTION),
                    row.get(HourlyQuantity.WIND_SPEED),
                    row.impossible()));
          }
        });
    return seen;
  }

  private static List<Seen> published(String text, String name) {
    return read(HourlyFormats.published(LIST), stream(text), name);
  }

  private static List<Seen> mapped(String mapping, String table) {
    return read(
        HourlyFormats.published(LIST).with(stream(mapping), "map.csv"), stream(table), "t.csv");
  }

  @Test
  @Tag("published")
  void aRealYearOfIsdLiteIsReadAsItsDocumentSays() throws IOException {
    try (InputStream in = new GZIPInputStream(Files.newInputStream(ISD))) {
      List<Seen> rows = read(HourlyFormats.published(LIST), in, "725300-2015.gz");
      assertEquals(8758, rows.size());
      assertEquals(
          new Seen(
              "725300 41.995 -87.934 204.8 HOURLY",
              2015,
              1,
              1,
              0,
              0,
              -8.3,
              -17.2,
              Double.NaN,
              240,
              6.2,
              0),
          rows.get(0));
      assertEquals(0, rows.stream().mapToInt(Seen::impossible).sum());
    }
  }

  /** Column names and units as in NOAA's documents; the values are invented. */
  @Test
  @Tag("published")
  void bothEditionsOfGhcnHourlyAreReadAndBadQualityIsMissing() {
    String early =
        "Station_ID|Station_name|Year|Month|Day|Hour|Minute|Latitude|Longitude|Elevation|"
            + "temperature|temperature_Measurement_Code|temperature_Quality_Code|"
            + "dew_point_temperature|dew_point_temperature_Quality_Code|wind_direction|wind_speed|"
            + "relative_humidity\n"
            + "DEX00001234|Invented|2021|03|04|05|53|54.50|8.25|12.0|6.5||1|4.5|1|999|3.1|87\n"
            + "DEX00001234|Invented|2021|03|04|06|0|54.50|8.25|12.0|6.7||3|4.6|o|270|3.6|\n";
    List<Seen> rows = published(early, "GHCNh_DEX00001234_2021.psv");
    assertEquals(
        new Seen(
            "DEX00001234 54.500 8.250 12.0 HOURLY",
            2021,
            3,
            4,
            5,
            53,
            6.5,
            4.5,
            87,
            Double.NaN,
            3.1,
            0),
        rows.get(0));
    assertTrue(Double.isNaN(rows.get(1).temperatureC()), "erroneous in its source");
    assertTrue(Double.isNaN(rows.get(1).dewPointC()), "failed a test");
    String late =
        "STATION|DATE|LATITUDE|LONGITUDE|ELEVATION|temperature|dew_point_temperature\n"
            + "DEX00001234|2025-11-01T00:20:00|54.50|8.25|12.0|6.0|5.0\n";
    assertEquals(
        new Seen(
            "DEX00001234 54.500 8.250 12.0 HOURLY",
            2025,
            11,
            1,
            0,
            20,
            6,
            5,
            Double.NaN,
            Double.NaN,
            Double.NaN,
            0),
        published(late, "x.psv").get(0));
  }

  @Test
  @Tag("published")
  void gsodIsBroughtToDegreesCelsiusAndMetresPerSecond() {
    String text =
        "\"STATION\",\"DATE\",\"LATITUDE\",\"LONGITUDE\",\"ELEVATION\",\"NAME\",\"TEMP\","
            + "\"TEMP_ATTRIBUTES\",\"DEWP\",\"WDSP\",\"MAX\",\"MIN\"\n"
            + "\"01001099999\",\"2020-01-31\",\"70.933\",\"-8.667\",\"9.0\",\"JAN \"\"MAYEN\"\"\","
            + "\"  32.0\",\"24\",\"  23.0\",\"  10.0\",\"  41.0\",\"9999.9\"\n";
    Seen day = published(text, "01001099999.csv").get(0);
    assertEquals("01001099999 70.933 -8.667 9.0 DAILY", day.station());
    assertEquals(0, day.temperatureC(), 1e-12);
    assertEquals(-5, day.dewPointC(), 1e-12);
    assertEquals(5.1444, day.windMPerS(), 1e-4);
    assertEquals(31, day.day());
  }

  private static String epw(int hours) {
    StringBuilder text =
        new StringBuilder("LOCATION,Invented,-,XXX,made up,099999,54.5,8.25,1.0,12.0\n");
    for (int line = 2; line < 8; line++) {
      text.append("COMMENTS ").append(line).append('\n');
    }
    text.append("DATA PERIODS,1,1,Data,Sunday, 1/ 1,12/31\n");
    int[] days = {31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31};
    for (int m = 0, n = 0; m < 12; m++) {
      for (int d = 1; d <= days[m]; d++) {
        for (int h = 1; h <= 24 && n < hours; h++, n++) {
          text.append("1999,").append(m + 1).append(',').append(d).append(',').append(h);
          text.append(",60,?9,5.5,99.9,80,101300,0,0,0,0,0,0,0,0,0,0,250,4.2,0\n");
        }
      }
    }
    return text.toString();
  }

  @Test
  @Tag("published")
  void aTypicalYearHasNoYearAndItsHoursNameTheirEnd() {
    List<Seen> rows = published(epw(8760), "x.epw");
    assertEquals(8760, rows.size());
    assertEquals(
        new Seen(
            "099999 54.500 8.250 12.0 TYPICAL", 0, 1, 1, 0, 0, 5.5, Double.NaN, 80, 250, 4.2, 0),
        rows.get(0));
    assertEquals(23, rows.get(8759).hour());
    Refusal shortYear = assertThrows(Refusal.class, () -> published(epw(5000), "x.epw"));
    assertEquals("short-year", shortYear.error());
  }

  @Test
  @Tag("law")
  void aMappingSaysWhatPeoplesColumnsMean() {
    String map =
        "quantity,column,unit,missing\nstation,where,,\nlatitude_deg,=54.5,,\n"
            + "longitude_deg,=8.25,,\nelevation_m,=12,,\ntime,When,,\ntemperature,T,f,NA -99\n"
            + "relative_humidity,#4,fraction,\nseparator,semicolon,,\n";
    List<Seen> rows =
        mapped(
            map,
            "where;when;t;other\nPier;2020-02-29 23:30;50;0.5\nPier;2020-03-01T00:00:00Z;NA;1\n"
                + "\"Pier\" ; 2020-03-01 01:00 ;-99;\n");
    assertEquals(10, rows.get(0).temperatureC(), 1e-12);
    assertEquals(50, rows.get(0).humidityPct(), 1e-12);
    assertTrue(Double.isNaN(rows.get(1).temperatureC()));
    assertTrue(Double.isNaN(rows.get(2).temperatureC()));
    assertEquals("Pier 54.500 8.250 12.0 HOURLY", rows.get(2).station());
    assertEquals(1, rows.get(2).hour());
  }

  @Test
  @Tag("law")
  void blanksAndNumberedCellsAfterAPreamble() {
    String map =
        "quantity,column,unit,missing\nseparator,space,,\ndata_after,***,,\nkind,typical,,\n"
            + "station,=725300,,\nmonth,#1,,\nday,#2,,\nhour,#3,ending,\ntemperature,#4,c,\n"
            + "dew_point,#5,c,\n";
    List<Seen> rows = mapped(map, "Some words\n*** \n  1   1  24  -1.5   -3\r\n");
    assertEquals(
        new Seen(
            "725300 41.995 -87.934 204.8 TYPICAL",
            0,
            1,
            1,
            23,
            0,
            -1.5,
            -3,
            Double.NaN,
            Double.NaN,
            Double.NaN,
            0),
        rows.get(0));
  }

  /** What stands in a file, and where and why it is refused. */
  @ParameterizedTest
  @CsvSource(
      delimiter = '!',
      value = {
        "station|time|t|rh;P|2020-02-30T00:00|5|50 ! out-of-range ! t.csv:2 day",
        "station|time|t|rh;P|2020-02-01T24:00|5|50 ! out-of-range ! t.csv:2 hour",
        "station|time|t|rh;P|2020-02-01|5|50 ! not-a-time ! t.csv:2 time (cell 2)",
        "station|time|t|rh;P|2020-02-01T00:00|warm|50 ! not-a-number ! t.csv:2 temperature (cell 3)",
        "station|time|t|rh;P|2020-02-01T00:00|5 ! short-row ! t.csv:2 cell 4",
        "station|time|t|rh;P|2020-02-01T00:00|\"5|50 ! open-quote ! t.csv:2 cell 3",
        "station|time|temp|rh;P|2020-02-01T00:00|5|50 ! missing-column ! t.csv:1 header",
        "station|when|t|rh;P|2020-02-01T00:00|5|50 ! missing-column ! t.csv:1 time",
        "station|time|t|rh ! no-rows ! t.csv:1 line",
        "station|time|t|rh;P|2020-02-01T00:00|5000|50 ! impossible-values ! t.csv:2 temperature"
      })
  @Tag("law")
  void refusalsNameLineFieldAndReason(String text, String error, String where) {
    String map =
        "quantity,column,unit,missing\nseparator,pipe,,\nstation,station,,\nlatitude_deg,=54,,\n"
            + "longitude_deg,=8,,\nelevation_m,=1,,\ntime,time,,\ntemperature,t,c,\n"
            + "relative_humidity,rh,pct,\n";
    Refusal refusal =
        assertThrows(Refusal.class, () -> mapped(map, text.replace(';', '\n') + "\n"));
    assertEquals(error, refusal.error());
    assertEquals(where, refusal.field());
    assertTrue(!refusal.allowed().isEmpty());
  }

  @Test
  @Tag("law")
  void anUnknownFormatSaysWhatWasSeenAndWhatCanBeRead() {
    Refusal refusal = assertThrows(Refusal.class, () -> published("a,b,c\n1,2,3\n", "x.csv"));
    assertEquals("unknown-format", refusal.error());
    assertEquals("a,b,c", refusal.was());
    for (String format : List.of("ISD-Lite", "GHCN hourly", "GSOD", "EPW", "mapping file")) {
      assertTrue(refusal.allowed().contains(format), format);
    }
    String unknown = "2015 01 01 00   -83  -172 10243   240    62     2 -9999 -9999\n";
    assertEquals(
        "unknown-station",
        assertThrows(Refusal.class, () -> published(unknown, "999998-2015")).error());
  }

  @Test
  @Tag("law")
  void aMappingIsHeldToItsWords() {
    for (String row : List.of("temprature,t,c,", "temperature,t,celsius,", "separator,dot,,")) {
      Refusal refusal =
          assertThrows(
              Refusal.class, () -> mapped("quantity,column,unit,missing\n" + row + "\n", "x\n1\n"));
      assertEquals("unknown-word", refusal.error(), row);
      assertTrue(refusal.field().startsWith("map.csv:2 "), refusal.field());
    }
  }

  @Test
  @Tag("law")
  void decimalsAreThoseOfTheLanguage() {
    Random random = new Random(11);
    for (int i = 0; i < 20_000; i++) {
      String text =
          switch (i % 4) {
            case 0 -> String.format(Locale.ROOT, "%.1f", random.nextDouble() * 200 - 100);
            case 1 -> String.format(Locale.ROOT, "%.12f", random.nextDouble() * 200 - 100);
            case 2 -> Double.toString(random.nextDouble() * Math.pow(10, random.nextInt(40) - 20));
            default -> Integer.toString(random.nextInt());
          };
      byte[] bytes = ("x" + text + "y").getBytes(StandardCharsets.US_ASCII);
      assertEquals(Double.parseDouble(text), Decimal.parse(bytes, 1, bytes.length - 1), text);
    }
    for (String none : List.of("", "-", ".", "1.2.3", "12a", "NaN", "1e", "--1")) {
      byte[] bytes = none.getBytes(StandardCharsets.US_ASCII);
      assertTrue(Double.isNaN(Decimal.parse(bytes, 0, bytes.length)), none);
    }
  }
}
