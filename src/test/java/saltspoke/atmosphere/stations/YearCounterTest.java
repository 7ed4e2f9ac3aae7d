package saltspoke.atmosphere.stations;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Locale;
import java.util.Random;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.atmosphere.HourlyCount;
import saltspoke.atmosphere.stations.MonthSums.Sum;
import saltspoke.sources.hourly.HourlyFormats;
import saltspoke.sources.hourly.HourlyRow;
import saltspoke.sources.hourly.HourlySink;
import saltspoke.sources.hourly.HourlyStation;
import saltspoke.sources.hourly.StationList;

/** Invented years, each with one thing wrong. */
@Tag("law")
class YearCounterTest {
  private static final int HOURS = 8760;
  private static final int[] DAYS = {31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31};

  private static final String MAPPING =
      "quantity,column,unit,missing\nstation,=S,,\nlatitude_deg,=50,,\nlongitude_deg,=8,,\n"
          + "elevation_m,=100,,\ntime,time,,\ntemperature,t,c,\nrelative_humidity,rh,pct,\n"
          + "wind_direction,d,deg,\nwind_speed,v,m_s,\n";

  private final double[] temperature = new double[HOURS];
  private final double[] humidity = new double[HOURS];
  private final boolean[] there = new boolean[HOURS];

  private void weather() {
    Random random = new Random(5);
    double slow = 0;
    for (int i = 0; i < HOURS; i++) {
      slow = 0.98 * slow + random.nextGaussian() * 0.6;
      double sun = Math.sin((i % 24 - 9) * Math.PI / 12);
      double season = -Math.cos(i * 2 * Math.PI / HOURS);
      temperature[i] = Math.round(10 * (6 + 9 * season + 4 * sun + slow)) / 10.0;
      humidity[i] =
          Math.max(
              5,
              Math.min(100, Math.round(10 * (78 - 10 * sun + 12 * random.nextGaussian())) / 10.0));
      there[i] = true;
    }
  }

  private List<String> rows() {
    List<String> rows = new ArrayList<>();
    int i = 0;
    for (int m = 0; m < 12; m++) {
      for (int d = 1; d <= DAYS[m]; d++) {
        for (int h = 0; h < 24; h++, i++) {
          if (there[i]) {
            rows.add(
                String.format(
                    Locale.ROOT,
                    "2019-%02d-%02dT%02d:00,%s,%s,%d,%s",
                    m + 1,
                    d,
                    h,
                    temperature[i],
                    humidity[i],
                    i % 37 * 10,
                    i % 9 == 0 ? "0" : "3.5"));
          }
        }
      }
    }
    return rows;
  }

  private static YearStatistics count(List<String> rows) {
    YearHours year = new YearHours();
    year.begin(2019, false);
    HourlyFormats.published(StationList.NONE)
        .with(stream(MAPPING), "m.csv")
        .read(
            stream("time,t,rh,d,v\n" + String.join("\n", rows) + "\n"),
            "t.csv",
            new HourlySink() {
              @Override
              public void station(HourlyStation station) {
                assertEquals("S", station.id());
              }

              @Override
              public void row(HourlyRow row) {
                year.put(row);
              }
            });
    return new YearCounter().count(year, 0);
  }

  private static ByteArrayInputStream stream(String text) {
    return new ByteArrayInputStream(text.getBytes(StandardCharsets.UTF_8));
  }

  @Test
  void aWholeYearCountsAsTheDefinitionDoes() {
    weather();
    YearStatistics statistics = count(rows());
    int from = 0;
    for (int m = 0; m < 12; m++) {
      int to = from + 24 * DAYS[m];
      HourlyCount count =
          HourlyCount.of(
              java.util.Arrays.copyOfRange(temperature, from, to),
              java.util.Arrays.copyOfRange(humidity, from, to));
      MonthSums sums = statistics.months().get(m).orElseThrow();
      assertEquals(count.hours(), sums.get(Sum.REPORTS));
      assertEquals(count.wetHours(), sums.get(Sum.WET));
      assertEquals(count.hoursAbove33Pct(), sums.get(Sum.ABOVE_33));
      assertEquals(count.hoursAbove75Pct(), sums.get(Sum.ABOVE_75));
      assertEquals(count.hoursBelow0C(), sums.get(Sum.BELOW_0));
      assertEquals(count.frostDays(), sums.get(Sum.FROST_DAYS));
      assertEquals(count.nearFreezingDays(), sums.get(Sum.NEAR_FREEZING_DAYS));
      MonthNormal normal = new MonthNormal(m + 1, sums);
      assertEquals(count.temperatureC(), normal.temperatureC(), 5e-4);
      assertEquals(count.relativeHumidityPct(), normal.relativeHumidityPct(), 5e-4);
      assertEquals(count.diurnalRangeC(), normal.diurnalRangeK(), 5e-4);
      long byClass = 0;
      for (int c = 0; c < MonthSums.HUMIDITY_CLASSES; c++) {
        byClass += sums.humidityClass(c);
      }
      assertEquals(count.hours(), byClass);
      long bySector = sums.get(Sum.CALM);
      for (int s = 0; s < MonthSums.SECTORS; s++) {
        bySector += sums.sector(s);
      }
      assertEquals(sums.get(Sum.WIND), bySector);
      from = to;
    }
  }

  @Test
  void theOrderOfRowsDoesNotMatter() {
    weather();
    List<String> rows = rows();
    YearStatistics inOrder = count(rows);
    List<String> mixed = new ArrayList<>(rows);
    Collections.shuffle(mixed, new Random(3));
    assertEquals(inOrder.months(), count(mixed).months());
  }

  @Test
  void aLeapOfOneHourIsStruckOutAndAFrontIsNot() {
    weather();
    temperature[1000] += 30;
    for (int i = 2000; i < 2200; i++) {
      temperature[i] -= 15;
    }
    YearStatistics statistics = count(rows());
    assertEquals(1, statistics.quality().spikes());
    assertEquals(HOURS - 1, statistics.quality().reports());
  }

  @Test
  void aStuckSensorIsStruckOutAndFogIsNot() {
    weather();
    java.util.Arrays.fill(temperature, 3000, 3030, 12.3);
    java.util.Arrays.fill(humidity, 5000, 5150, 100);
    YearStatistics statistics = count(rows());
    assertEquals(30, statistics.quality().stuck());
    java.util.Arrays.fill(humidity, 5000, 5150, 55);
    assertEquals(180, count(rows()).quality().stuck());
  }

  @Test
  void theReportNearestToTheHourCounts() {
    weather();
    List<String> rows = rows();
    rows.add("2019-01-01T00:10,25,10,0,1");
    rows.add("2019-01-01T00:50,26,10,0,1");
    YearStatistics statistics = count(rows);
    assertEquals(2, statistics.quality().duplicates());
    assertEquals(count(rows()).months(), statistics.months());
  }

  @Test
  void monthsWithFewReportsOrALongGapAreDroppedAndSynopticOnesKept() {
    weather();
    // January: every other hour at random; May: six days without.
    Random random = new Random(1);
    for (int i = 0; i < 744; i++) {
      there[i] = random.nextBoolean();
    }
    int may = 24 * (31 + 28 + 31 + 30);
    for (int i = may + 100; i < may + 100 + 24 * 6; i++) {
      there[i] = false;
    }
    YearStatistics statistics = count(rows());
    assertEquals(1, statistics.quality().tooFew());
    assertEquals(1, statistics.quality().longGap());
    assertTrue(statistics.months().get(0).isEmpty());
    assertTrue(statistics.months().get(4).isEmpty());
    assertEquals(10, statistics.months().stream().filter(java.util.Optional::isPresent).count());
    weather();
    for (int i = 0; i < HOURS; i++) {
      there[i] = i % 3 == 0;
    }
    YearStatistics synoptic = count(rows());
    assertEquals(3, synoptic.quality().rhythm());
    assertEquals(12, synoptic.months().stream().filter(java.util.Optional::isPresent).count());
    MonthSums january = synoptic.months().get(0).orElseThrow();
    assertEquals(248, january.get(Sum.REPORTS));
    assertEquals(31, january.get(Sum.DAYS));
  }
}
