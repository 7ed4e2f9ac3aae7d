package saltspoke.wheel.rim;

import java.util.ArrayList;
import java.util.List;
import saltspoke.wheel.Film;
import saltspoke.wheel.SaltMix;
import saltspoke.wheel.ThinFilm;
import saltspoke.wheel.WheelYear.FilmHours;

/**
 * Gathers the hours of a month into a few kinds of air and of water, and makes one film of each at
 * its mean humidity, temperature and water.
 */
final class FilmBins {
  /** Edges of the humidity classes, % RH: close where a film's thickness changes fast. */
  private static final double[] EDGES_PCT = {35, 48, 62, 76, 82, 87, 91, 95, 98};

  private static final int CLASSES = EDGES_PCT.length + 1;
  private static final double LEAST_HOURS = 0.01;

  private final SaltMix salt;
  private final double leastUm;
  private final double[] hours = new double[2 * CLASSES];
  private final double[] rhHours = new double[2 * CLASSES];
  private final double[] degreeHours = new double[2 * CLASSES];
  private final List<FilmHours> liquid = new ArrayList<>();

  /**
   * @param leastUm films thinner than this are left out as dry
   */
  FilmBins(SaltMix salt, double leastUm) {
    this.salt = salt;
    this.leastUm = leastUm;
  }

  /** Hours in air of this kind, with the sodium chloride dissolved or not. */
  void addAir(double addedHours, double rhPct, double temperatureC, boolean dissolved) {
    int bin = dissolved ? CLASSES : 0;
    for (double edge : EDGES_PCT) {
      bin += rhPct >= edge ? 1 : 0;
    }
    hours[bin] += addedHours;
    rhHours[bin] += addedHours * rhPct;
    degreeHours[bin] += addedHours * temperatureC;
  }

  /** Hours with liquid water beyond what the salt holds in equilibrium, g/m². */
  void addWater(double addedHours, double freeGPerM2, double rhPct, double temperatureC) {
    if (addedHours < LEAST_HOURS) {
      return;
    }
    // 1 µm of film is about 1 g of water per m².
    double heldGPerM2 = ThinFilm.inEquilibrium(salt, rhPct, temperatureC, true).thicknessUm();
    add(liquid, ThinFilm.ofWater(salt, freeGPerM2 + heldGPerM2, temperatureC), addedHours);
  }

  /** The films and their hours. */
  List<FilmHours> films() {
    List<FilmHours> films = new ArrayList<>(liquid);
    for (int bin = 0; bin < hours.length; bin++) {
      if (hours[bin] >= LEAST_HOURS) {
        double rh = rhHours[bin] / hours[bin];
        double celsius = degreeHours[bin] / hours[bin];
        add(films, ThinFilm.inEquilibrium(salt, rh, celsius, bin >= CLASSES), hours[bin]);
      }
    }
    return films;
  }

  private void add(List<FilmHours> films, Film film, double filmHours) {
    if (film.thicknessUm() < leastUm) {
      return;
    }
    int last = films.size() - 1;
    if (last >= 0 && films.get(last).film().equals(film)) {
      films.set(last, new FilmHours(film, films.get(last).hours() + filmHours));
    } else {
      films.add(new FilmHours(film, filmHours));
    }
  }
}
