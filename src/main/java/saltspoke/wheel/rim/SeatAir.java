package saltspoke.wheel.rim;

import java.util.ArrayList;
import java.util.List;
import saltspoke.atmosphere.SaturationPressure;
import saltspoke.wheel.SaltMix;
import saltspoke.wheel.ThinFilm;

/**
 * Humidity at a nipple seat from the humidity where the wheel is kept. The cavity breathes through
 * narrow gaps while the salt film inside takes up or gives off water, so it follows changes with a
 * time constant τ = C/G (C the film's water per hPa, G the gaps' conductance) and a swing of
 * angular frequency ω is damped by 1/√(1 + (ωτ)²): ω of a day for day and night, of {@link
 * #SPELL_DAYS} for the run of day types. A hidden seat feels the cavity; a seat with its gap open
 * to the outside follows the outside humidity by a stated share and the cavity for the rest.
 */
final class SeatAir {
  /** Length of a weather cycle, days; common practice in mid-latitudes, 3 to 7. */
  static final double SPELL_DAYS = 5;

  private static final double RH_STEP_PCT = 5;
  private static final double LEAST_PROBED_PCT = 55;
  private static final double MOST_PROBED_PCT = 92;

  private SeatAir() {}

  /** The states with the humidity at the seat; temperatures and shares stay. */
  static List<KeptAir> at(
      List<KeptAir> kept,
      SaltMix salt,
      double conductanceM3PerS,
      double bedM2,
      double openSeatShare) {
    int slots = StorageClimate.SLOTS;
    int days = kept.size() / slots;
    double[] dayRh = new double[days];
    double meanRh = 0;
    double meanC = 0;
    for (KeptAir s : kept) {
      dayRh[s.day()] += s.relativeHumidityPct() / slots;
      meanRh += s.share() * s.relativeHumidityPct();
      meanC += s.share() * s.temperatureC();
    }
    double tauDays = tauDays(salt, meanRh, meanC, conductanceM3PerS, bedM2);
    double daily = openSeatShare + (1 - openSeatShare) * damping(tauDays, 1);
    double spells = openSeatShare + (1 - openSeatShare) * damping(tauDays, SPELL_DAYS);
    List<KeptAir> seat = new ArrayList<>(kept.size());
    for (KeptAir s : kept) {
      double rh =
          meanRh
              + spells * (dayRh[s.day()] - meanRh)
              + daily * (s.relativeHumidityPct() - dayRh[s.day()]);
      double inRange = Math.max(0, Math.min(100, rh));
      seat.add(
          new KeptAir(
              s.share(),
              s.day(),
              s.temperatureC(),
              inRange / 100 * SaturationPressure.overWaterHpa(s.temperatureC()),
              inRange));
    }
    return seat;
  }

  static double damping(double tauDays, double periodDays) {
    double x = 2 * Math.PI * tauDays / periodDays;
    return 1 / Math.sqrt(1 + x * x);
  }

  /** Time constant of the cavity, days; 0 without salt. */
  static double tauDays(
      SaltMix salt, double rhPct, double temperatureC, double conductanceM3PerS, double bedM2) {
    double probe = Math.max(LEAST_PROBED_PCT, Math.min(MOST_PROBED_PCT, rhPct));
    double wetter =
        ThinFilm.inEquilibrium(salt, probe + RH_STEP_PCT, temperatureC, true).thicknessUm();
    double drier =
        ThinFilm.inEquilibrium(salt, probe - RH_STEP_PCT, temperatureC, true).thicknessUm();
    // 1 µm of film is about 1 g of water per m².
    double grams = Math.max(0, wetter - drier) * bedM2;
    double hpa = 2 * RH_STEP_PCT / 100 * SaturationPressure.overWaterHpa(temperatureC);
    double gPerDayHpa = conductanceM3PerS * Vapour.densityGPerM3(1, temperatureC) * 86400;
    return grams / hpa / gPerDayHpa;
  }
}
