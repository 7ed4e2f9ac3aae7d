package saltspoke.atlas;

import java.io.InputStream;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import saltspoke.atmosphere.ChlorideFromSite;
import saltspoke.atmosphere.Corrosion;
import saltspoke.atmosphere.Exposure;
import saltspoke.atmosphere.InputSpread;
import saltspoke.atmosphere.Metal;
import saltspoke.sources.StationFiles;
import saltspoke.sources.StationFiles.ChlorideSite;
import saltspoke.sources.StationFiles.CorrosionSite;
import saltspoke.values.Refusal;

/** Judges chloride deposition and first-year losses from the inputs that site files give. */
public final class SiteComparison {
  private SiteComparison() {}

  /** Compares a file with the columns of {@link ChlorideSite}; closes the stream. */
  public static Comparison chloride(InputStream in, String fileName) {
    StationRows<ChlorideSite> sites = StationRows.read(in, fileName, StationFiles::chloride);
    List<Pair> pairs = new ArrayList<>();
    for (ChlorideSite site : sites.rows()) {
      pairs.add(
          Pair.of(
              site.name(),
              site.chlorideMgPerM2Day(),
              ChlorideFromSite.predict(
                  site.distanceKm(),
                  site.windMPerS(),
                  site.salineWindShare(),
                  site.roughness(),
                  site.elevationM())));
    }
    Comparison.Gather gather = new Comparison.Gather();
    gather.add("chloride deposition, mg/(m² d)", true, pairs);
    return gather.comparison("chloride", sites.refused());
  }

  /** Compares a file with the columns of {@link CorrosionSite}; closes the stream. */
  public static Comparison corrosion(InputStream in, String fileName) {
    StationRows<CorrosionSite> sites = StationRows.read(in, fileName, StationFiles::corrosion);
    Map<Metal, List<Pair>> pairs = new EnumMap<>(Metal.class);
    for (Metal metal : Metal.values()) {
      pairs.put(metal, new ArrayList<>());
    }
    for (CorrosionSite site : sites.rows()) {
      Exposure exposure =
          new Exposure(
              site.temperatureC(),
              site.relativeHumidityPct(),
              site.so2MgPerM2Day(),
              site.chlorideMgPerM2Day());
      for (Metal metal : Metal.values()) {
        OptionalDouble measured = loss(site, metal);
        if (measured.isPresent()) {
          pairs
              .get(metal)
              .add(
                  Pair.of(
                      site.name(),
                      measured.getAsDouble(),
                      Corrosion.firstYearUm(metal, exposure, InputSpread.NONE)));
        }
      }
    }
    Comparison.Gather gather = new Comparison.Gather();
    pairs.forEach((metal, list) -> gather.add("first-year loss, µm, " + metal.id(), true, list));
    Comparison comparison = gather.comparison("corrosion", sites.refused());
    if (comparison.series().isEmpty()) {
      throw Refusal.dataDamaged(
          "no-losses",
          fileName,
          "",
          "at least one of carbon_steel_um, zinc_um, copper_um, aluminium_um filled");
    }
    return comparison;
  }

  private static OptionalDouble loss(CorrosionSite site, Metal metal) {
    return switch (metal) {
      case CARBON_STEEL -> site.steelUm();
      case ZINC -> site.zincUm();
      case COPPER -> site.copperUm();
      case ALUMINIUM -> site.aluminiumUm();
    };
  }
}
