package saltspoke.atlas;

import java.io.InputStream;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.function.DoubleBinaryOperator;
import saltspoke.atmosphere.AirModel;
import saltspoke.atmosphere.AirOverrides;
import saltspoke.atmosphere.CorrectedQuantity;
import saltspoke.atmosphere.CorrectionSpot;
import saltspoke.atmosphere.HourlyCount;
import saltspoke.atmosphere.MonthClimate;
import saltspoke.atmosphere.MonthMeans;
import saltspoke.atmosphere.MonthlyClimate;
import saltspoke.atmosphere.SiteCorrection;
import saltspoke.atmosphere.WetHours;
import saltspoke.places.Place;
import saltspoke.places.PlaceDirectory;
import saltspoke.places.PlaceOverrides;
import saltspoke.sources.StationFiles;
import saltspoke.sources.StationFiles.ChlorideSite;
import saltspoke.sources.StationFiles.ClimateStation;
import saltspoke.values.Refusal;

/**
 * How far the measurements of a station file lie from what the program answers there: the rows of a
 * correction file, before their spreads are set by leaving sites out.
 *
 * @param rows with the usual spread of their quantity
 * @param refused rows that were read but give no correction, with what is missing
 */
public record SiteDepartures(List<SiteCorrection> rows, List<Refusal> refused) {
  public SiteDepartures {
    rows = List.copyOf(rows);
    refused = List.copyOf(refused);
  }

  /** Monthly temperature and humidity of climate stations; closes the stream. */
  public static SiteDepartures climate(
      MonthlyClimate climate, DoubleBinaryOperator seaDistanceKm, InputStream in, String fileName) {
    StationRows<ClimateStation> stations = StationRows.read(in, fileName, StationFiles::climate);
    Gather gather = new Gather();
    for (ClimateStation station : stations.rows()) {
      gather.addMonths(
          station.name(),
          spot(station.latitudeDeg(), station.longitudeDeg(), station.elevationM(), seaDistanceKm),
          station.temperatureC(),
          station.relativeHumidityPct(),
          climate);
    }
    return gather.departures();
  }

  /** Monthly temperature and humidity of hourly records; closes the stream. */
  public static SiteDepartures wetness(
      MonthlyClimate climate, DoubleBinaryOperator seaDistanceKm, InputStream in, String fileName) {
    StationRows<StationYear> stations = StationYear.read(in, fileName);
    Gather gather = new Gather();
    for (StationYear station : stations.rows()) {
      gather.addMonths(
          station.first().station(),
          spot(
              station.first().latitudeDeg(),
              station.first().longitudeDeg(),
              station.first().elevationM(),
              seaDistanceKm),
          station.monthly(HourlyCount::temperatureC),
          station.monthly(HourlyCount::relativeHumidityPct),
          climate);
    }
    return gather.departures();
  }

  /**
   * A station's hours, counted month by month; NaN in a month that does not count.
   *
   * @param wetHours by definition; NaN as well where only days are known
   */
  public record Counted(
      String site,
      CorrectionSpot spot,
      double[] temperatureC,
      double[] relativeHumidityPct,
      double[] wetHours) {}

  /** Monthly temperature, humidity and wet hours of counted stations. */
  public static SiteDepartures counted(MonthlyClimate climate, List<Counted> stations) {
    Gather gather = new Gather();
    for (Counted station : stations) {
      MonthMeans modelled = modelled(climate, station.spot());
      MonthMeans own =
          new MonthMeans(
              filled(station.temperatureC(), modelled.temperatureC()),
              filled(station.relativeHumidityPct(), modelled.relativeHumidityPct()),
              modelled.diurnalRangeC(),
              modelled.rainMm(),
              modelled.windMPerS());
      List<MonthClimate> fromOwn = own.climate(station.spot().latitudeDeg());
      List<SiteCorrection> ofSite =
          months(
              station.site(),
              station.spot(),
              station.temperatureC(),
              station.relativeHumidityPct(),
              modelled);
      for (int m = 0; m < fromOwn.size(); m++) {
        double measured = station.wetHours()[m];
        if (!Double.isNaN(measured)) {
          double factor = WetHours.quotient(measured, fromOwn.get(m).wetHours());
          ofSite.add(
              row(station.site(), station.spot(), CorrectedQuantity.WET_HOURS, m + 1, factor, 1));
        }
      }
      gather.addSite(ofSite);
    }
    return gather.departures();
  }

  private static double[] filled(double[] measured, double[] modelled) {
    double[] filled = modelled.clone();
    for (int m = 0; m < filled.length; m++) {
      filled[m] = Double.isNaN(measured[m]) ? filled[m] : measured[m];
    }
    return filled;
  }

  private static MonthMeans modelled(MonthlyClimate climate, CorrectionSpot spot) {
    return climate.means(
        spot.latitudeDeg(), spot.longitudeDeg(), spot.elevationM(), spot.seaDistanceKm());
  }

  private static List<SiteCorrection> months(
      String site,
      CorrectionSpot spot,
      double[] temperatureC,
      double[] humidityPct,
      MonthMeans modelled) {
    List<SiteCorrection> rows = new ArrayList<>();
    for (CorrectedQuantity quantity :
        List.of(CorrectedQuantity.TEMPERATURE, CorrectedQuantity.RELATIVE_HUMIDITY)) {
      boolean warmth = quantity == CorrectedQuantity.TEMPERATURE;
      double[] measured = warmth ? temperatureC : humidityPct;
      double[] estimated = warmth ? modelled.temperatureC() : modelled.relativeHumidityPct();
      for (int m = 0; m < measured.length; m++) {
        if (!Double.isNaN(measured[m])) {
          rows.add(row(site, spot, quantity, m + 1, measured[m], estimated[m]));
        }
      }
    }
    return rows;
  }

  /**
   * Annual chloride deposition, against what {@code air} answers at the site's coordinates with the
   * file's height and distance to the coast; closes the stream.
   *
   * @throws Refusal when no row has coordinates
   */
  public static SiteDepartures chloride(
      AirModel air, PlaceDirectory places, InputStream in, String fileName) {
    StationRows<ChlorideSite> sites = StationRows.read(in, fileName, StationFiles::chloride);
    Gather gather = new Gather();
    for (ChlorideSite site : sites.rows()) {
      try {
        gather.addSite(List.of(chloride(air, places, site)));
      } catch (Refusal refusal) {
        gather.refused.add(refusal);
      }
    }
    SiteDepartures departures = gather.departures();
    if (departures.rows().isEmpty()) {
      throw departures.refused().get(0);
    }
    return departures;
  }

  private static SiteCorrection chloride(AirModel air, PlaceDirectory places, ChlorideSite site) {
    if (site.latitudeDeg().isEmpty() || site.longitudeDeg().isEmpty()) {
      throw Refusal.dataDamaged(
          "no-coordinates",
          site.where() + " latitude_deg, longitude_deg",
          "",
          "both columns filled: a correction belongs to a point on the map");
    }
    Place place = place(places, site);
    double estimated = air.at(place, AirOverrides.NONE).chlorideDepositionMgPerM2Day().median();
    return row(
        site.name(),
        new CorrectionSpot(
            place.latitudeDeg(), place.longitudeDeg(), site.elevationM(), site.distanceKm()),
        CorrectedQuantity.CHLORIDE,
        0,
        site.chlorideMgPerM2Day(),
        estimated);
  }

  private static Place place(PlaceDirectory places, ChlorideSite site) {
    PlaceOverrides known =
        new PlaceOverrides(
            OptionalDouble.of(site.elevationM()), OptionalDouble.of(site.distanceKm()));
    try {
      return places.at(site.latitudeDeg().getAsDouble(), site.longitudeDeg().getAsDouble(), known);
    } catch (Refusal refusal) {
      throw Refusal.dataDamaged(
          refusal.error(), site.where() + " " + refusal.field(), refusal.was(), refusal.allowed());
    }
  }

  private static CorrectionSpot spot(
      double latitudeDeg,
      double longitudeDeg,
      double elevationM,
      DoubleBinaryOperator seaDistanceKm) {
    return new CorrectionSpot(
        latitudeDeg,
        longitudeDeg,
        elevationM,
        seaDistanceKm.applyAsDouble(latitudeDeg, longitudeDeg));
  }

  private static SiteCorrection row(
      String site,
      CorrectionSpot spot,
      CorrectedQuantity quantity,
      int month,
      double measured,
      double estimated) {
    return new SiteCorrection(
        site, spot, quantity, month, quantity.amount(measured, estimated), quantity.usualSpread());
  }

  /** Gathers sites; a site that stands in the file twice counts once. */
  private static final class Gather {
    private final List<SiteCorrection> rows = new ArrayList<>();
    private final List<Refusal> refused = new ArrayList<>();
    private final Set<List<Object>> seen = new HashSet<>();

    void addMonths(
        String site,
        CorrectionSpot spot,
        double[] temperatureC,
        double[] humidityPct,
        MonthlyClimate climate) {
      addSite(months(site, spot, temperatureC, humidityPct, modelled(climate, spot)));
    }

    void addSite(List<SiteCorrection> ofSite) {
      SiteCorrection first = ofSite.get(0);
      if (seen.add(List.of(first.site(), first.spot()))) {
        rows.addAll(ofSite);
      } else {
        refused.add(
            Refusal.dataDamaged(
                "duplicate-row", first.site(), "", "each site once, or another name for it"));
      }
    }

    SiteDepartures departures() {
      return new SiteDepartures(rows, refused);
    }
  }
}
