package saltspoke.wheel.damage;

import java.util.Arrays;
import java.util.Optional;
import saltspoke.atmosphere.AirClimate;
import saltspoke.atmosphere.Metal;
import saltspoke.atmosphere.MetalCorrosivity;
import saltspoke.wheel.Coating;
import saltspoke.wheel.Material;
import saltspoke.wheel.Nipple;
import saltspoke.wheel.RidingProfile;
import saltspoke.wheel.WheelBuild;

/** The outside of a nipple, which only the air attacks. */
final class OpenAir {
  private OpenAir() {}

  /** Whether the outside of a nipple can be seen to suffer from the air alone. */
  static boolean shows(Nipple nipple, WheelBuild build) {
    Material metal = SpokeHole.surface(nipple);
    return !build.hiddenNipples()
        && nipple.coating().kind() != Coating.Kind.ANODIC
        && standard(metal).isPresent()
        && Double.isFinite(Products.visibleInOpenUm(metal));
  }

  /** The outside of a nipple under the loss that the air model gives its metal. */
  static Site site(Nipple nipple, AirClimate air, RidingProfile profile) {
    Material metal = SpokeHole.surface(nipple);
    MetalCorrosivity loss =
        air.corrosivity().stream()
            .filter(entry -> entry.metal() == standard(metal).orElseThrow())
            .findFirst()
            .orElseThrow();
    PowerLawDose dose = PowerLawDose.of(loss, Shelter.share(profile));
    double[] monthly = new double[12];
    Arrays.fill(monthly, dose.firstYearUm() / 12);
    double[] ln = new double[Assumption.values().length];
    Sites.set(ln, Assumption.AIR_LOSS, Sites.lnSpread(loss.firstYearLossUm()));
    Sites.set(ln, Assumption.SHELTER, Assumption.SHELTER.lnSpread());
    return new Site(
        "nipple",
        "open-air",
        metal,
        dose,
        monthly,
        Products.visibleInOpenUm(metal),
        Double.POSITIVE_INFINITY,
        Double.POSITIVE_INFINITY,
        ln);
  }

  private static Optional<Metal> standard(Material material) {
    return switch (material) {
      case ALUMINIUM_WROUGHT, ALUMINIUM_HIGH_STRENGTH -> Optional.of(Metal.ALUMINIUM);
      case BRASS -> Optional.of(Metal.COPPER);
      case CARBON_STEEL -> Optional.of(Metal.CARBON_STEEL);
      case ZINC -> Optional.of(Metal.ZINC);
      default -> Optional.empty();
    };
  }
}
