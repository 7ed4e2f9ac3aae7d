package saltspoke.atmosphere;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import saltspoke.values.Note;
import saltspoke.values.Quantiles;

/**
 * De-icing salt on a salted main road, from near-freezing days with moisture, what the country
 * does, and the cold limit of rock salt. Outside the standard's classification: nothing here feeds
 * {@link Corrosion}.
 */
public final class RoadSaltModel {
  /** NaCl loses its use between −7 and −10 °C (published); the middle, °C. */
  static final double ROCK_SALT_LIMIT_C = -8.5;

  /** Half the published width of that limit, K. */
  private static final double ROCK_SALT_LIMIT_WIDTH_K = 1.5;

  /**
   * Salt per treatment, g/m². Published: Scotland 8–40, Germany usually 15, Finland 5–40, USA 8–39;
   * ASSUMPTION: this middle for all.
   */
  static final double SALT_PER_TREATMENT_G_PER_M2 = 12;

  /** Gone after 2 h and after 25 h, shares; TRL PPR392, published. */
  private static final double GONE_2_H = 0.59;

  private static final double GONE_25_H = 0.73;

  /** 2–3 g/m² stays up to two weeks without rain (published): e-folding of the rest, days. */
  private static final double DRY_REST_DAYS = 7;

  /** ASSUMPTION: share of the rest that one day of rain or snow takes; spread 0.4–0.9. */
  private static final double REST_TAKEN_BY_WET_DAY = 0.7;

  /**
   * ASSUMPTION: share of dry near-freezing days on which roads are damp (frost, dew, melt): 0 at 60
   * % and 1 at 100 % monthly humidity.
   */
  private static final double DAMP_FROM_PCT = 60;

  private static final double DAMP_TO_PCT = 100;

  /** ASSUMPTION: ln spread between winters of one place; a mild winter has a third (published). */
  private static final double WINTER_LN_SPREAD = 0.45;

  /**
   * ASSUMPTION: share of confidence's spread that applies, practice being better known than SO2.
   */
  private static final double PRACTICE_SPREAD_SHARE = 0.5;

  /** ASSUMPTION: treatments a moist day where the country is not in the table; "rare". */
  private static final CountryAir.Country UNKNOWN =
      new CountryAir.Country("", 0, Confidence.LOW, "rare", Confidence.LOW, 0.3, 0);

  private RoadSaltModel() {}

  /** The estimate and what to mind about it. */
  public record Result(RoadSalt roadSalt, List<Note> flags) {
    public Result {
      flags = List.copyOf(flags);
    }
  }

  /**
   * @param months the twelve months of outside air
   * @param country the row of the place's country, if there is one
   */
  public static Result of(List<MonthAir> months, Optional<CountryAir.Country> country) {
    CountryAir.Country practice = country.orElse(UNKNOWN);
    List<RoadSalt.Month> out = new ArrayList<>();
    double total = 0;
    double withMagnesium = 0;
    double tooCold = 0;
    for (MonthAir month : months) {
      double asked = moistDays(month) * practice.treatmentsPerMoistDay();
      double works = rockSaltWorks(month);
      double magnesium = practice.magnesiumShare();
      double treatments = asked * (works + (1 - works) * magnesium);
      total += treatments;
      withMagnesium += asked * magnesium;
      tooCold += asked - treatments;
      out.add(new RoadSalt.Month(month.month(), treatments, load(month, treatments)));
    }
    List<Note> flags = new ArrayList<>();
    if (country.isEmpty()) {
      flags.add(Note.of("road-practice-unknown"));
    } else if (practice.roadSaltConfidence() == Confidence.LOW) {
      flags.add(Note.of("road-practice-unsure", "country", practice.countryCode()));
    }
    if (total > 0) {
      flags.add(Note.of("road-outside-standard"));
    }
    if (tooCold > 0.1 * (total + tooCold)) {
      flags.add(Note.of("road-too-cold-for-salt", "lostTreatments", Math.round(tooCold)));
    }
    double spread =
        Math.hypot(
            WINTER_LN_SPREAD, PRACTICE_SPREAD_SHARE * practice.roadSaltConfidence().lnSpread());
    RoadSalt roadSalt =
        new RoadSalt(
            practice.roadSaltPractice(),
            practice.roadSaltConfidence().id(),
            total > 0 ? SeaSalt.spread(total, spread) : new Quantiles(0, 0, 0),
            total > 0 ? withMagnesium / total : 0,
            out);
    return new Result(roadSalt, flags);
  }

  /** Near-freezing days of the month on which roads are wet, white or damp. */
  static double moistDays(MonthAir month) {
    double wet = Math.min(1, month.wetDays() / daysIn(month.month()));
    double damp =
        Math.max(
            0,
            Math.min(
                1, (month.relativeHumidityPct() - DAMP_FROM_PCT) / (DAMP_TO_PCT - DAMP_FROM_PCT)));
    return month.nearFreezingDays() * (1 - (1 - wet) * (1 - damp));
  }

  /** Share of the month's near-freezing days warm enough for rock salt, 0..1. */
  static double rockSaltWorks(MonthAir month) {
    double share = 0;
    double works = 0;
    for (DayType day : month.dayTypes()) {
      double low = day.meanTemperatureC() - day.diurnalRangeC() / 2;
      double high = day.meanTemperatureC() + day.diurnalRangeC() / 2;
      if (low < 1 && high > -5) {
        share += day.share();
        works += day.share() * warmEnough(day.meanTemperatureC());
      }
    }
    return share > 0 ? works / share : warmEnough(month.temperatureC());
  }

  private static double warmEnough(double meanC) {
    return 1 / (1 + Math.exp(-2 * (meanC - ROCK_SALT_LIMIT_C) / ROCK_SALT_LIMIT_WIDTH_K));
  }

  /** Mean salt lying on the road over the month, g NaCl-equivalent per m². */
  private static double load(MonthAir month, double treatments) {
    int days = daysIn(month.month());
    double wet = Math.min(1, month.wetDays() / days);
    double firstHours = 2 / 24.0 * (1 - GONE_2_H / 2);
    double firstDay = 23 / 24.0 * (1 - (GONE_2_H + GONE_25_H) / 2);
    double restDays = 1 / (1 / DRY_REST_DAYS + wet * -Math.log(1 - REST_TAKEN_BY_WET_DAY));
    double meanDaysOfFullDose = firstHours + firstDay + (1 - GONE_25_H) * restDays;
    return treatments / days * SALT_PER_TREATMENT_G_PER_M2 * meanDaysOfFullDose;
  }

  private static int daysIn(int month) {
    return switch (month) {
      case 2 -> 28;
      case 4, 6, 9, 11 -> 30;
      default -> 31;
    };
  }
}
