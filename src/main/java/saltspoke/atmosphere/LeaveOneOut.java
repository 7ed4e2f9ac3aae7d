package saltspoke.atmosphere;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/**
 * How well the sites of a correction file foresee one another: each is left out in turn and worked
 * out from the rest. Errors are in the unit of the amount; of its logarithm for a factor.
 *
 * @param sites sites with this quantity
 * @param withNeighbours those that others reach; only they are judged
 * @param rmseBefore root mean square of the model's error at them, uncorrected
 * @param rmseAfter the same, corrected by the others; 0 when none has neighbours
 * @param bandCoveragePct share of the errors after correction inside the 10–90 % band that the
 *     correction claims for them, measurement included
 * @param spread written with each of the rows
 */
public record LeaveOneOut(
    CorrectedQuantity quantity,
    int sites,
    int withNeighbours,
    double rmseBefore,
    double rmseAfter,
    double bandCoveragePct,
    double spread) {
  /** Fewer judged sites than this say nothing about their spread; our choice, no source. */
  private static final int LEAST_JUDGED = 5;

  /** Each spread that is tried over the one before. */
  private static final double STEP = 1.25;

  private static final double WANTED_PCT = 80;

  /** What leaving sites out says, in one plain sentence; errors in the unit of the amount. */
  public String sentence() {
    if (withNeighbours == 0) {
      return String.format(
          Locale.ROOT,
          "%s (%s): %d sites, none near enough to another to be judged by; spread %.3g",
          quantity.id(),
          quantity.kind(),
          sites,
          spread);
    }
    return String.format(
        Locale.ROOT,
        "%s (%s): %d sites, %d with neighbours; each left out in turn: error %.3g before, %.3g"
            + " after; %.0f %% inside the claimed 10–90 %% band; spread %.3g",
        quantity.id(),
        quantity.kind(),
        sites,
        withNeighbours,
        rmseBefore,
        rmseAfter,
        bandCoveragePct,
        spread);
  }

  /**
   * Rows with honest spreads: the usual one of the quantity, or a larger one until the bands that
   * come with the corrections hold 80 % of the sites left out.
   */
  public record Drafted(List<SiteCorrection> rows, List<LeaveOneOut> errors) {
    public Drafted {
      rows = List.copyOf(rows);
      errors = List.copyOf(errors);
    }
  }

  /** Sets the spread of every row by leaving out one site after the other. */
  public static Drafted draft(List<SiteCorrection> rows) {
    List<SiteCorrection> all = new ArrayList<>();
    List<LeaveOneOut> errors = new ArrayList<>();
    for (CorrectedQuantity quantity : CorrectedQuantity.values()) {
      List<SiteCorrection> own = rows.stream().filter(r -> r.quantity() == quantity).toList();
      if (own.isEmpty()) {
        continue;
      }
      double spread = quantity.usualSpread();
      LeaveOneOut judged = of(own, quantity, spread);
      while (judged.withNeighbours >= LEAST_JUDGED
          && judged.bandCoveragePct < WANTED_PCT
          && spread * STEP <= quantity.largestSpread()) {
        spread *= STEP;
        judged = of(own, quantity, spread);
      }
      errors.add(judged);
      for (SiteCorrection row : own) {
        all.add(row.withSpread(spread));
      }
    }
    return new Drafted(all, errors);
  }

  private static LeaveOneOut of(
      List<SiteCorrection> rows, CorrectedQuantity quantity, double spread) {
    SiteCorrections corrections =
        SiteCorrections.of(rows.stream().map(row -> row.withSpread(spread)).toList());
    List<SiteCorrections.Station> stations = corrections.stations(quantity);
    int judged = 0;
    int months = 0;
    int inside = 0;
    double before = 0;
    double after = 0;
    double prior = quantity.priorSpread();
    for (SiteCorrections.Station station : stations) {
      SiteMove move = corrections.at(quantity, station.spot(), station);
      if (move.isNone()) {
        continue;
      }
      judged++;
      for (int m = 0; m < PlaceFields.MONTHS; m++) {
        double departure = station.departure()[m];
        if (!Double.isNaN(departure)) {
          double error = departure - move.departure()[m];
          double claimed = Math.hypot(prior * Math.sqrt(move.varianceLeft()[m]), spread);
          months++;
          before += departure * departure;
          after += error * error;
          inside += Math.abs(error) <= NormalLaw.Z90 * claimed ? 1 : 0;
        }
      }
    }
    return new LeaveOneOut(
        quantity,
        stations.size(),
        judged,
        months == 0 ? 0 : Math.sqrt(before / months),
        months == 0 ? 0 : Math.sqrt(after / months),
        months == 0 ? 0 : 100.0 * inside / months,
        spread);
  }
}
