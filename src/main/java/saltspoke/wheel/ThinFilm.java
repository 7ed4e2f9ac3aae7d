package saltspoke.wheel;

import java.util.ArrayList;
import java.util.List;
import saltspoke.values.Note;

/**
 * Makes the {@link Film} that a salt load holds in given air, or that given water makes with it.
 *
 * <p>The film is in equilibrium with its surroundings: water activity equals relative humidity;
 * below 0 °C it is never wetter than ice allows, and below the mixture's eutectic there is none.
 * Between the onset of MgCl2 or CaCl2 and that of NaCl the sodium chloride lies there as crystals;
 * what little of it dissolves in the strong brine is neglected (the film is then thinner than in
 * truth by up to a third near 75 %).
 */
public final class ThinFilm {
  /** Rain's own conductivity, mS/cm at 20 °C: 0.005–0.05 from memory, geometric mean. */
  static final double RAIN_MS_PER_CM = 0.016;

  /** Relative rise of conductivity per K about 20 °C (common practice for salt solutions). */
  static final double CONDUCTIVITY_PER_K = 0.02;

  /** Wettest air for which equilibrium is solved, % RH: beyond, condensation decides. */
  static final double WETTEST_RH_PCT = 99;

  /** The law i = 4FDC/δ is measured above this thickness, µm (published). */
  static final double LAW_HOLDS_ABOVE_UM = 50;

  /** Oxygen reduction is capped near this, µA/cm² (published: near 1 mA/cm²). */
  static final double OXYGEN_CAP_UA_PER_CM2 = 1000;

  /** Below this thickness, µm, the total falls with it (published). */
  static final double FALLS_BELOW_UM = 10;

  private ThinFilm() {}

  /** A dry surface at a temperature; its other values are those of pure water. */
  public static Film dry(double temperatureC) {
    return water(0, temperatureC);
  }

  private static Film water(double thicknessUm, double temperatureC) {
    return new Film(
        thicknessUm,
        temperatureC,
        0,
        RAIN_MS_PER_CM * conductivityFactor(temperatureC),
        Oxygen.freshUmolPerL(temperatureC),
        Oxygen.diffusivityCm2PerS(temperatureC));
  }

  /** The film on salt that was dry before: wet only above the onset of deliquescence. */
  public static Film inEquilibrium(SaltMix salt, double rhPct, double temperatureC) {
    return inEquilibrium(salt, rhPct, temperatureC, false);
  }

  /**
   * The film that a salt load holds in equilibrium with air.
   *
   * @param salt chloride by kind
   * @param rhPct relative humidity over liquid water, 0..100; above 99 the film of 99 is given (see
   *     {@link #flags})
   * @param temperatureC −60..60
   * @param wasWet whether the film was wet before, so that drying hysteresis keeps it so
   */
  public static Film inEquilibrium(
      SaltMix salt, double rhPct, double temperatureC, boolean wasWet) {
    BrineMix mix = BrineMix.of(salt);
    double threshold =
        wasWet
            ? Deliquescence.dryingRhPct(salt, temperatureC)
            : Deliquescence.onsetRhPct(salt, temperatureC);
    if (mix.molPerM2() == 0 || rhPct < threshold || temperatureC < Deliquescence.eutecticC(salt)) {
      return dry(temperatureC);
    }
    double sodiumWetFrom =
        wasWet ? Deliquescence.NACL_DRYING_RH_PCT : Deliquescence.sodiumOnsetRhPct(temperatureC);
    boolean sodiumDissolved = rhPct >= sodiumWetFrom && temperatureC >= Brine.NACL.eutecticC();
    BrineMix dissolved = sodiumDissolved ? mix : mix.withoutSodium();
    double x =
        Math.max(
            -Math.log(Math.min(rhPct, WETTEST_RH_PCT) / 100),
            -Deliquescence.lnIceActivity(temperatureC));
    double waterKgPerM2 = dissolved.molPerM2() > 0 ? dissolved.waterKgPerM2(x) : 0;
    return brine(dissolved, waterKgPerM2, temperatureC);
  }

  /**
   * The film that a given amount of liquid water makes with the salt lying there. What the water
   * cannot hold stays undissolved, sodium chloride first; below the brine's freezing line part of
   * the water is ice and the rest is the stronger brine beside it.
   *
   * @param waterGPerM2 liquid (or frozen) water, ≥ 0
   */
  public static Film ofWater(SaltMix salt, double waterGPerM2, double temperatureC) {
    if (!(waterGPerM2 > 0)) {
      return dry(temperatureC);
    }
    BrineMix mix = BrineMix.of(salt);
    if (mix.molPerM2() == 0) {
      return water(temperatureC < 0 ? 0 : waterGPerM2 / Brine.WATER_G_PER_CM3, temperatureC);
    }
    if (temperatureC < Deliquescence.eutecticC(salt)) {
      return dry(temperatureC);
    }
    double waterKgPerM2 = waterGPerM2 / 1000;
    if (temperatureC < 0) {
      waterKgPerM2 =
          Math.min(waterKgPerM2, mix.waterKgPerM2(-Deliquescence.lnIceActivity(temperatureC)));
    }
    return brine(dissolvedIn(mix, waterKgPerM2), waterKgPerM2, temperatureC);
  }

  private static BrineMix dissolvedIn(BrineMix mix, double waterKgPerM2) {
    double left = waterKgPerM2;
    double mg = Math.min(mix.mgMolPerM2(), left * Brine.MGCL2.saturatedMolPerKg());
    left -= mg / Brine.MGCL2.saturatedMolPerKg();
    double ca = Math.min(mix.caMolPerM2(), left * Brine.CACL2.saturatedMolPerKg());
    left -= ca / Brine.CACL2.saturatedMolPerKg();
    double na = Math.min(mix.naMolPerM2(), left * Brine.NACL.saturatedMolPerKg());
    return new BrineMix(na, mg, ca, mix.seaShareOfNa());
  }

  private static Film brine(BrineMix mix, double waterKgPerM2, double temperatureC) {
    if (!(waterKgPerM2 > 0)) {
      return dry(temperatureC);
    }
    double saltG = mix.saltGPerM2();
    double totalG = saltG + 1000 * waterKgPerM2;
    double massFraction = saltG / totalG;
    double density = 0;
    double conductivity = 0;
    double lnViscosity = 0;
    double strength = 0;
    for (Brine brine : Brine.values()) {
      double mol = mix.molPerM2(brine);
      double share = saltG > 0 ? mol * brine.gPerMolChloride() / saltG : 0;
      density += share * brine.relativeDensity(massFraction);
      conductivity += share * brine.conductivityAt20CMSPerCm(massFraction);
      lnViscosity += brine.lnRelativeViscosity(mol / waterKgPerM2);
      strength += mol / waterKgPerM2 * saltingStrength(brine, mix.seaShareOfNa());
    }
    return new Film(
        totalG / (Brine.WATER_G_PER_CM3 * density),
        temperatureC,
        mix.molPerM2() / waterKgPerM2,
        (RAIN_MS_PER_CM + conductivity) * conductivityFactor(temperatureC),
        Oxygen.freshUmolPerL(temperatureC) * Oxygen.saltingOut(strength, temperatureC),
        // ASSUMPTION: Stokes–Einstein, D·η constant; spread: exponent of η 0.6 to 1.
        Oxygen.diffusivityCm2PerS(temperatureC) * Math.exp(-lnViscosity));
  }

  private static double saltingStrength(Brine brine, double seaShareOfNa) {
    return brine == Brine.NACL
        ? 1 + seaShareOfNa * (Oxygen.SEA_SODIUM_STRENGTH - 1)
        : Oxygen.HYGROSCOPIC_STRENGTH;
  }

  /**
   * Conductivity over that at 20 °C: +2 %/K above 0 °C; below, the same relative slope as at 0 °C
   * goes on (ASSUMPTION: the straight line would reach zero at −30 °C).
   */
  static double conductivityFactor(double temperatureC) {
    double atZero = 1 - 20 * CONDUCTIVITY_PER_K;
    return temperatureC >= 0
        ? 1 + CONDUCTIVITY_PER_K * (temperatureC - 20)
        : atZero * Math.exp(CONDUCTIVITY_PER_K / atZero * temperatureC);
  }

  /**
   * Oxygen limit of the film, µA/cm²; 0 when dry. Above 50 µm it is 4FDC/δ. The same law, joined to
   * the cap as (i⁻⁴ + cap⁻⁴)^(−1/4), is used below 50 µm, and below 10 µm the result falls in
   * proportion to thickness: both ASSUMPTION in form, after the published cap near 1 mA/cm² and the
   * published fall of the total below 10 µm.
   */
  public static double oxygenLimitUAPerCm2(Film film) {
    if (!(film.thicknessUm() > 0)) {
      return 0;
    }
    double free =
        Oxygen.diffusionLimitUAPerCm2(
            film.oxygenDiffusivityCm2PerS(), film.oxygenUmolPerL(), film.thicknessUm());
    double overCap = free / OXYGEN_CAP_UA_PER_CM2;
    double squared = overCap * overCap;
    double capped = free / Math.sqrt(Math.sqrt(1 + squared * squared));
    return capped * Math.min(1, film.thicknessUm() / FALLS_BELOW_UM);
  }

  /** Conductance of a square of the film, µS (σδ). */
  static double sheetMicroS(Film film) {
    return 0.1 * film.conductivityMSPerCm() * film.thicknessUm();
  }

  /** What of a film lies outside measured ranges, for the answer's flags. */
  public static List<Note> flags(Film film) {
    List<Note> notes = new ArrayList<>();
    if (film.thicknessUm() > 0 && film.thicknessUm() < LAW_HOLDS_ABOVE_UM) {
      notes.add(Note.of("cell-film-below-50-um", "um", film.thicknessUm()));
    }
    if (film.thicknessUm() > 0 && film.temperatureC() < 0) {
      notes.add(Note.of("cell-film-below-zero", "temperatureC", film.temperatureC()));
    }
    return notes;
  }

  /** What was assumed in making an equilibrium film in air of this humidity. */
  public static List<Note> flags(double rhPct) {
    return rhPct > WETTEST_RH_PCT
        ? List.of(Note.of("cell-air-near-saturation", "rhPct", rhPct))
        : List.of();
  }
}
