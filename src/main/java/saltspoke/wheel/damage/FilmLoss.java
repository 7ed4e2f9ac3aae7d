package saltspoke.wheel.damage;

import java.util.function.Function;
import saltspoke.wheel.CellCurrents;
import saltspoke.wheel.CellSpec;
import saltspoke.wheel.Film;

/**
 * What one cell loses to the films of one year, as mean depth over its bare ring.
 *
 * @param monthlyUm loss in January to December, µm
 * @param galvanicShare share of the loss that is galvanic current, 0..1
 * @param localShare share that is local attack beyond it, 0..1
 */
public record FilmLoss(double[] monthlyUm, double galvanicShare, double localShare) {
  /** Hours of a year, as the cell's rates count it. */
  static final double HOURS_PER_YEAR = 8766;

  /** Adds up the year's films. */
  public static FilmLoss over(FilmPool films, CellSpec spec, CellRates rates) {
    Function<Film, CellCurrents> cell = rates.of(spec);
    double[] monthly = new double[12];
    double galvanic = 0;
    double local = 0;
    double all = 0;
    for (int i = 0; i < films.size(); i++) {
      CellCurrents now = cell.apply(films.film(i));
      double[] hours = films.hours(i);
      double umPerHour = now.penetrationUmPerYear() / HOURS_PER_YEAR;
      double um = 0;
      for (int m = 0; m < 12; m++) {
        monthly[m] += umPerHour * hours[m];
        um += umPerHour * hours[m];
      }
      double driven = Math.max(0, now.galvanicUAPerCm2());
      double sum = driven + now.selfUAPerCm2() + now.localUAPerCm2();
      if (sum > 0) {
        galvanic += um * driven / sum;
        local += um * now.localUAPerCm2() / sum;
        all += um;
      }
    }
    return new FilmLoss(monthly, all > 0 ? galvanic / all : 0, all > 0 ? local / all : 0);
  }

  /** The same loss times a factor, month by month. */
  double[] scaled(double factor) {
    double[] scaled = new double[12];
    for (int i = 0; i < 12; i++) {
      scaled[i] = monthlyUm[i] * factor;
    }
    return scaled;
  }
}
