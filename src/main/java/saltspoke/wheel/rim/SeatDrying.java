package saltspoke.wheel.rim;

import java.util.List;
import saltspoke.atmosphere.SaturationPressure;

/** How long an open seat stays wet after rain or spray, apart from water in the cavity. */
public final class SeatDrying {
  /**
   * Mass transfer from an open film in nearly still air, m/s. Common practice 3–8 mm/s; with 5 mm/s
   * a 100 µm film dries in 0.8 h at 20 °C and 60 % and in 7.6 h at 0 °C and 85 %.
   */
  public static final double MASS_TRANSFER_M_PER_S = 5e-3;

  private SeatDrying() {}

  /** Loss of an open film, g/(m² h), to air of that vapour pressure at its own temperature. */
  public static double openFilmGPerM2Hour(double temperatureC, double vapourPressureHpa) {
    double deficit = Math.max(0, SaturationPressure.overWaterHpa(temperatureC) - vapourPressureHpa);
    return MASS_TRANSFER_M_PER_S * 3600 * Vapour.densityGPerM3(deficit, temperatureC);
  }

  /**
   * Hours for which a crevice stays wet after one wetting, mean over the states, at most a week.
   */
  static double creviceHours(List<KeptAir> kept, RimAssumptions a) {
    double loss = 0;
    for (KeptAir s : kept) {
      loss += s.share() * openFilmGPerM2Hour(s.temperatureC(), s.vapourPressureHpa());
    }
    double film = a.get(RimAssumption.CREVICE_FILM_UM);
    return film / Math.max(film / MOST_HOURS, loss * a.get(RimAssumption.CREVICE_DRYING));
  }

  /** Longest time counted for one wetting, h: by then the next weather has come. */
  private static final double MOST_HOURS = 168;
}
