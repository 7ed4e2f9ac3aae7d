package saltspoke.wheel.damage;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import saltspoke.wheel.Film;
import saltspoke.wheel.WheelYear;

/**
 * The films of a year gathered into kinds that a cell can hardly tell apart, so that every cell is
 * asked once per kind and not once per month and film. A kind spans a factor 2 in thickness and in
 * chloride and 8 K; it is represented by its mean, logarithms for all but temperature, weighted by
 * hours. Against asking for every film, a year's loss differs by under 5 % (tested).
 */
public final class FilmPool {
  private static final double KELVIN = 8;
  private static final double LN_FACTOR = Math.log(2);

  private final List<Film> films = new ArrayList<>();
  private final List<double[]> hours = new ArrayList<>();

  private FilmPool() {}

  /** Gathers a year. */
  public static FilmPool of(WheelYear year) {
    Map<List<Integer>, Sum> sums = new HashMap<>();
    List<Sum> order = new ArrayList<>();
    for (WheelYear.Month month : year.months()) {
      for (WheelYear.FilmHours part : month.films()) {
        Film film = part.film();
        if (part.hours() > 0 && film.thicknessUm() > 0) {
          Sum sum =
              sums.computeIfAbsent(
                  kind(film),
                  k -> {
                    Sum fresh = new Sum();
                    order.add(fresh);
                    return fresh;
                  });
          sum.add(film, part.hours(), month.month() - 1);
        }
      }
    }
    FilmPool pool = new FilmPool();
    for (Sum sum : order) {
      pool.films.add(sum.mean());
      pool.hours.add(sum.hours);
    }
    return pool;
  }

  /** Kinds of film. */
  public int size() {
    return films.size();
  }

  Film film(int i) {
    return films.get(i);
  }

  /** Hours of kind i in January to December. */
  double[] hours(int i) {
    return hours.get(i);
  }

  private static List<Integer> kind(Film film) {
    return List.of(
        (int) Math.floor(Math.log(film.thicknessUm()) / LN_FACTOR),
        (int) Math.floor(Math.log(Math.max(film.chlorideMolPerKg(), 1e-6)) / LN_FACTOR),
        (int) Math.floor(film.temperatureC() / KELVIN));
  }

  private static final class Sum {
    private final double[] hours = new double[12];
    private final double[] sums = new double[6];
    private double all;

    void add(Film film, double h, int month) {
      hours[month] += h;
      all += h;
      sums[0] += h * Math.log(film.thicknessUm());
      sums[1] += h * film.temperatureC();
      sums[2] += h * Math.log(Math.max(film.chlorideMolPerKg(), 1e-6));
      sums[3] += h * Math.log(Math.max(film.conductivityMSPerCm(), 1e-9));
      sums[4] += h * Math.log(Math.max(film.oxygenUmolPerL(), 1e-9));
      sums[5] += h * Math.log(Math.max(film.oxygenDiffusivityCm2PerS(), 1e-12));
    }

    Film mean() {
      return new Film(
          Math.exp(sums[0] / all),
          sums[1] / all,
          Math.exp(sums[2] / all),
          Math.exp(sums[3] / all),
          Math.exp(sums[4] / all),
          Math.exp(sums[5] / all));
    }
  }
}
