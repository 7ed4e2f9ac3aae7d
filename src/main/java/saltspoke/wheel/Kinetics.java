package saltspoke.wheel;

import java.util.EnumMap;
import java.util.Map;

/**
 * What the surface of one material does at a potential: how fast it reduces oxygen, evolves
 * hydrogen, and dissolves. Potentials V(SCE), current densities µA/cm² at 25 °C.
 *
 * <p>Where the constants come from. Tafel slopes are effective ones, from memory of polarisation
 * curves in 3.5 % NaCl. Oxygen constants are set so that aluminium coupled 1:1 in sea water loses
 * what MIL-STD-889D data give (published, see CellPublishedTest), carbon's so that the film of a
 * salted shed gives 10–40 µA/cm² (from memory); anodic constants so that each metal alone rests in
 * its published range of potentials in flowing sea water (LaQue / ASTM G82). They are therefore
 * calibrated, not predicted. Spread of every oxygen constant: a factor 2 either way (one standard
 * deviation); ASSUMPTION.
 *
 * @param oxygen oxygen reduction without limit of supply, in air-saturated fresh water
 * @param hydrogen hydrogen evolution in neutral brine; from memory within a factor 3
 * @param active active dissolution, or for carbon and platinum the reverse branch by which they
 *     rest
 * @param passiveUAPerCm2 passive current
 * @param pitAtOneMolalV pitting potential at 1 mol/kg chloride, V
 * @param pitPerDecadeV its shift per decade of chloride, V
 * @param pitSlopeV anodic slope above the pitting potential, V per decade
 * @param umPerYearPerUAPerCm2 Faraday factor, 0 when the anodic current does not dissolve it
 * @param localPerGalvanic local attack per galvanic current under the cathode's alkali
 */
record Kinetics(
    Tafel oxygen,
    Tafel hydrogen,
    Tafel active,
    double passiveUAPerCm2,
    double pitAtOneMolalV,
    double pitPerDecadeV,
    double pitSlopeV,
    double umPerYearPerUAPerCm2,
    double localPerGalvanic) {

  /** Potential at which oxygen constants are given, V(SCE): that of aluminium in a couple. */
  private static final double OXYGEN_AT_V = -0.75;

  /** Potential at which hydrogen constants are given, V(SCE). */
  private static final double HYDROGEN_AT_V = -1.0;

  /** Slope of hydrogen evolution, V per decade (textbook value 0.118). */
  private static final double HYDROGEN_SLOPE_V = -0.12;

  /** Current density at the pitting potential, µA/cm²: the usual criterion, from memory. */
  static final double PIT_CRITERION_UA_PER_CM2 = 1;

  /**
   * Local attack per galvanic current on aluminium, 0.7/0.3: outdoors under 30 % of the loss of
   * aluminium coupled to carbon is galvanic current (published: Quiambao and Hihara 2019). That it
   * goes with the galvanic current is an ASSUMPTION; spread 1..4.
   */
  static final double LOCAL_PER_GALVANIC_ALUMINIUM = 0.7 / 0.3;

  /**
   * Local attack cannot exceed what the cathode's alkali can dissolve: ASSUMPTION, µA/cm², spread
   * 10..90.
   */
  static final double LOCAL_LIMIT_UA_PER_CM2 = 30;

  /** Alkali stays under films up to this, µm, and is diluted in thicker ones; ASSUMPTION. */
  static final double LOCAL_CONFINED_UM = 100;

  /** Activation energy of the couple, J/mol: 7075/graphite-epoxy, published (Bellucci 1991). */
  static final double ACTIVATION_J_PER_MOL = 24300;

  /**
   * Order of oxygen's kinetics in its salted-out solubility: 1 if concentration decides, 0 if
   * activity does (which salt does not lower). ASSUMPTION 0.5, spread 0..1.
   */
  static final double SALTING_ORDER = 0.5;

  /** No chloride in truth; the pitting potential of cleaner water is held, mol/kg; ASSUMPTION. */
  static final double CLEANEST_CHLORIDE_MOL_PER_KG = 1e-4;

  private static final double NEVER_V = 9;
  private static final Tafel NO_ANODIC = new Tafel(0, 0, 0.1);

  /** Brass dissolves between Cu⁺ and Cu²⁺: mean of both, ASSUMPTION, spread 12.3..19.0. */
  private static final double BRASS_UM =
      0.5 * (Faraday.BRASS_1.umPerYearPerUAPerCm2() + Faraday.BRASS_2.umPerYearPerUAPerCm2());

  private static final Map<Material, Kinetics> ALL = new EnumMap<>(Material.class);

  static {
    for (Material material : Material.values()) {
      ALL.put(material, constants(material));
    }
  }

  /** Constants of a material. */
  static Kinetics of(Material material) {
    return ALL.get(material);
  }

  /** The table, with the reason for each row beside it. */
  private static Kinetics constants(Material material) {
    return switch (material) {
      // Poor oxygen electrode, passive at 0.5 µA/cm² (5 µm/a in sea water, from memory). Pitting
      // −0.75 V at 1 mol/kg: Kaesche −0.746 V from memory; slope −0.09 V per decade, from memory of
      // −0.06 to −0.124.
      case ALUMINIUM_WROUGHT ->
          passive(0.3, 0.20, 0.02, 0.5, -0.745, -0.09, 0.03, Faraday.ALUMINIUM, true);
      // Copper-rich particles reduce oxygen; pits 30 mV lower; from memory.
      case ALUMINIUM_HIGH_STRENGTH ->
          passive(0.8, 0.20, 0.05, 1.0, -0.775, -0.09, 0.025, Faraday.ALUMINIUM_7075, true);
      // Rests at −0.36 V (G82 −0.40…−0.31) at 1.25 µA/cm² (20 µm/a in sea water, from memory).
      case BRASS -> active(25, 0.30, 1, -0.36, 1.25, 0.06, BRASS_UM);
      // 129 µm/a of aluminium (MIL-STD-889D data); rests at −0.15 V (G82 −0.20…−0.10).
      case NICKEL -> passive(19, 0.25, 5, 0.08, -0.05, -0.07, 0.06, Faraday.NICKEL, false);
      // Rests at −0.66 V (G82 −0.72…−0.60) at 80 µm/a in sea water (handbook 100, from memory).
      case CARBON_STEEL ->
          active(20, 0.20, 2, -0.66, 7.1, 0.06, Faraday.IRON.umPerYearPerUAPerCm2());
      // Rests at −1.0 V (G82 −1.03…−0.98) at 45 µm/a in sea water (from memory 20–60).
      case ZINC -> active(0.17, 0.20, 0.1, -1.0, 3.0, 0.04, Faraday.ZINC.umPerYearPerUAPerCm2());
      // 304: passive 0.02 µA/cm²; rests at −0.06 V (G82 −0.10…−0.04); pits +0.15 V, from memory.
      case STAINLESS -> passive(60, 0.20, 2, 0.02, 0.15, -0.09, 0.06, Faraday.STAINLESS_304, false);
      // 19 µm/a of aluminium (MIL-STD-889D data); rests at 0.00 V (G82 −0.04…+0.06); no pits.
      case TITANIUM ->
          passive(1.2, 0.25, 0.05, 0.0012, NEVER_V, 0, 0.06, Faraday.TITANIUM_4, false);
      // 15–20 µA/cm² in a shed's brine at 8 °C; rests near +0.25 V (G82 graphite +0.2…+0.3).
      case CARBON_FIBRE -> noble(75, 0.20, 0.5, 0.25, 0.10);
      // 267 µm/a of aluminium, all the oxygen there is (MIL-STD-889D data).
      case PLATINUM -> noble(1e4, 0.15, 100, 0.30, 0.10);
      case POLYMER -> noble(0, 0.20, 0, 0, 0.10);
      // 140 µm/a of aluminium (MIL-STD-889D data); rests at −0.22 V, from memory.
      case NICKEL_ALUMINIUM_BRONZE -> active(22, 0.30, 2, -0.22, 0.38, 0.07, BRASS_UM);
      // 240–257 µm/a of aluminium (MIL-STD-889D data).
      case STAINLESS_PH ->
          passive(150, 0.20, 3, 0.06, 0.0, -0.09, 0.06, Faraday.STAINLESS_304, false);
    };
  }

  private static Kinetics passive(
      double oxygenUA,
      double oxygenSlopeV,
      double hydrogenUA,
      double passiveUA,
      double pitV,
      double pitPerDecadeV,
      double pitSlopeV,
      Faraday faraday,
      boolean dissolvesInAlkali) {
    return new Kinetics(
        new Tafel(OXYGEN_AT_V, oxygenUA, -oxygenSlopeV),
        new Tafel(HYDROGEN_AT_V, hydrogenUA, HYDROGEN_SLOPE_V),
        NO_ANODIC,
        passiveUA,
        pitV,
        pitPerDecadeV,
        pitSlopeV,
        faraday.umPerYearPerUAPerCm2(),
        dissolvesInAlkali ? LOCAL_PER_GALVANIC_ALUMINIUM : 0);
  }

  private static Kinetics active(
      double oxygenUA,
      double oxygenSlopeV,
      double hydrogenUA,
      double restV,
      double restUA,
      double anodicSlopeV,
      double umPerYear) {
    return new Kinetics(
        new Tafel(OXYGEN_AT_V, oxygenUA, -oxygenSlopeV),
        new Tafel(HYDROGEN_AT_V, hydrogenUA, HYDROGEN_SLOPE_V),
        new Tafel(restV, restUA, anodicSlopeV),
        0,
        NEVER_V,
        0,
        0.06,
        umPerYear,
        0);
  }

  private static Kinetics noble(
      double oxygenUA, double oxygenSlopeV, double hydrogenUA, double restV, double reverseSlopeV) {
    Tafel oxygen = new Tafel(OXYGEN_AT_V, oxygenUA, -oxygenSlopeV);
    return active(oxygenUA, oxygenSlopeV, hydrogenUA, restV, oxygen.at(restV), reverseSlopeV, 0);
  }

  /** Pitting potential in brine of a chloride molality, V(SCE). */
  double pitV(double chlorideMolPerKg) {
    return pitAtOneMolalV
        + pitPerDecadeV * Math.log10(Math.max(chlorideMolPerKg, CLEANEST_CHLORIDE_MOL_PER_KG));
  }

  /** Where a search for the potential of this metal as an anode may start, V(SCE). */
  double startV(double chlorideMolPerKg) {
    return active.atReference() > 0 ? active.referenceV() : pitV(chlorideMolPerKg);
  }

  /** Arrhenius factor of all charge-transfer currents against 25 °C. */
  static double temperatureFactor(double temperatureC) {
    return Math.exp(-ACTIVATION_J_PER_MOL / 8.314462 * (1 / (temperatureC + 273.15) - 1 / 298.15));
  }
}
