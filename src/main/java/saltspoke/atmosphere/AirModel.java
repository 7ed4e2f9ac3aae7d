package saltspoke.atmosphere;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import saltspoke.fields.DataSet;
import saltspoke.fields.FieldStack;
import saltspoke.places.Place;
import saltspoke.sources.CsvTable;
import saltspoke.values.Note;
import saltspoke.values.Quantiles;

/** The whole answer about the outside air of a place, from a data set and a monthly climate. */
public final class AirModel {
  private final MonthlyClimate climate;
  private final CountryAir countries;
  private final FieldStack elevation;
  private final WindFields winds;
  private final SiteCorrections corrections;

  private AirModel(
      MonthlyClimate climate,
      CountryAir countries,
      FieldStack elevation,
      WindFields winds,
      SiteCorrections corrections) {
    this.climate = climate;
    this.countries = countries;
    this.elevation = elevation;
    this.winds = winds;
    this.corrections = corrections;
  }

  /** Over the layers of a data set. */
  public static AirModel from(DataSet data) {
    return from(data, SiteCorrections.NONE);
  }

  /** Over the layers of a data set, moved by local measurements near their sites. */
  public static AirModel from(DataSet data, SiteCorrections corrections) {
    return new AirModel(
        MonthlyClimate.from(data),
        CountryAir.read(CsvTable.read(data.open(CountryAir.LAYER), CountryAir.LAYER + ".csv")),
        data.stack("elevation"),
        WindFields.from(data),
        corrections);
  }

  /** The air at a place. */
  public AirClimate at(Place place, AirOverrides overrides) {
    Set<Note> flags = new LinkedHashSet<>();
    flags.addAll(climate.notes(place));
    Optional<CountryAir.Country> country = countries.find(place.countryCode());
    Setting setting = overrides.setting().orElseGet(() -> Settings.guess(place.surroundings()));

    MovedClimate moved = climate(place, flags);
    List<MonthClimate> months = moved.months();
    Salt salt = salt(place, setting, months, overrides, flags);
    Sulfur sulfur = sulfur(setting, country, overrides, flags);
    AnnualAir annual = annual(salt.months());
    Exposure exposure = exposure(annual, sulfur, salt, overrides, flags);
    InputSpread spread =
        new InputSpread(
            overrides.temperatureC().isPresent() ? 0 : temperatureSpreadK(moved, place),
            overrides.relativeHumidityPct().isPresent() ? 0 : humiditySpreadPct(moved, place),
            sulfur.lnSpread(),
            salt.lnSpread());
    List<MetalCorrosivity> corrosivity = Corrosion.assess(exposure, spread);
    flags.addAll(Corrosion.flags(exposure, corrosivity));
    RoadSaltModel.Result road = RoadSaltModel.of(salt.months(), country);
    flags.addAll(road.flags());
    return new AirClimate(
        place,
        salt.months(),
        annual,
        salt.annual(),
        sulfur.annual(),
        setting,
        overrides.setting().isPresent(),
        AirClasses.wetness(annual.wetHours()),
        AirClasses.salinity(salt.annual().median()),
        AirClasses.sulfur(sulfur.annual().median()),
        corrosivity,
        road.roadSalt(),
        ClassSummary.of(corrosivity.get(Metal.CARBON_STEEL.ordinal()), exposure, spread),
        List.copyOf(flags));
  }

  /** The climate at a place as local measurements move it, said in the flags where they do. */
  private MovedClimate climate(Place place, Set<Note> flags) {
    MovedClimate moved =
        MovedClimate.of(climate.means(place), corrections, CorrectionSpot.of(place));
    flags.addAll(moved.notes());
    if (moved.isMoved()) {
      flags.addAll(corrections.provenance());
    }
    return moved;
  }

  private static double temperatureSpreadK(MovedClimate moved, Place place) {
    return moved.temperatureSpreadFactor() * ClimateSpread.annualTemperatureK(place.elevationM());
  }

  private static double humiditySpreadPct(MovedClimate moved, Place place) {
    return moved.humiditySpreadFactor() * ClimateSpread.annualHumidityPct(place.elevationM());
  }

  /**
   * The annual means at a place that the class follows from, as in {@link #at} without overrides,
   * to the last bit: no wet hours, no probabilities, a fraction of the work. For maps.
   */
  public AirGlance glance(Place place) {
    Set<Note> flags = new LinkedHashSet<>();
    Setting setting = Settings.guess(place.surroundings());
    MovedClimate moved = climate(place, flags);
    MonthMeans means = moved.means();
    double temperatureC = 0;
    double humidityPct = 0;
    for (int m = 0; m < PlaceFields.MONTHS; m++) {
      temperatureC += means.temperatureC()[m] / PlaceFields.MONTHS;
      humidityPct += means.relativeHumidityPct()[m] / PlaceFields.MONTHS;
    }
    double rainMmPerYear = Arrays.stream(means.rainMm()).sum();
    List<Double> monthly =
        monthlySalt(seaSalt(place, setting, rainMmPerYear), place, means.windMPerS());
    double saltSpread = SeaSalt.LN_SPREAD * moveSalt(monthly, place, flags);
    Settings.So2 so2 = Settings.so2(setting, false, countries.find(place.countryCode()));
    return new AirGlance(
        new Exposure(
            temperatureC,
            humidityPct,
            so2.depositionMgPerM2Day().median(),
            SeaSalt.annual(monthly, saltSpread).median()),
        new InputSpread(
            temperatureSpreadK(moved, place),
            humiditySpreadPct(moved, place),
            so2.lnSpread(),
            saltSpread));
  }

  /** The climate of {@link #at}, January to December, alone. */
  public List<MonthClimate> months(Place place) {
    return climate(place, new LinkedHashSet<>()).months();
  }

  private SeaSalt seaSalt(Place place, Setting setting, double rainMmPerYear) {
    return new SeaSalt(
        place.sea(),
        SaltPaths.crestsAboveLowAirM(place, elevation),
        SaltPaths.roughness(setting, place.sea().distanceKm()),
        place.elevationM(),
        rainMmPerYear);
  }

  private List<Double> monthlySalt(SeaSalt model, Place place, double[] windMPerS) {
    List<Double> monthly = new ArrayList<>();
    for (WindMonth wind : winds.year(place, windMPerS)) {
      monthly.add(model.monthMgPerM2Day(wind));
    }
    return monthly;
  }

  /** Moves salt by local measurements; gives what is left of its spread, 0..1 and a little more. */
  private double moveSalt(List<Double> monthly, Place place, Set<Note> flags) {
    SiteMove saltier = corrections.at(CorrectedQuantity.CHLORIDE, CorrectionSpot.of(place));
    if (!saltier.isNone()) {
      flags.add(saltier.note(CorrectedQuantity.CHLORIDE));
    }
    for (int m = 0; m < monthly.size(); m++) {
      monthly.set(m, monthly.get(m) * Math.exp(saltier.departure()[m]));
    }
    return saltier.spreadFactor();
  }

  private record Salt(List<MonthAir> months, Quantiles annual, double lnSpread) {}

  private record Sulfur(Quantiles annual, double lnSpread) {}

  private Salt salt(
      Place place,
      Setting setting,
      List<MonthClimate> months,
      AirOverrides overrides,
      Set<Note> flags) {
    double rainMmPerYear = months.stream().mapToDouble(MonthClimate::rainMm).sum();
    SeaSalt model = seaSalt(place, setting, rainMmPerYear);
    double calmestHeld = Double.POSITIVE_INFINITY;
    for (MonthClimate month : months) {
      if (SaltKernel.heldWind(month.windMPerS()) != month.windMPerS()) {
        calmestHeld = Math.min(calmestHeld, month.windMPerS());
      }
    }
    double[] windMPerS = months.stream().mapToDouble(MonthClimate::windMPerS).toArray();
    List<Double> monthly = monthlySalt(model, place, windMPerS);
    if (calmestHeld < Double.POSITIVE_INFINITY) {
      flags.add(SaltKernel.windHeld(calmestHeld));
    }
    ChlorideFromSite.distanceFlag(place.sea().distanceKm()).ifPresent(flags::add);
    double scale = 1;
    double lnSpread = SeaSalt.LN_SPREAD;
    if (overrides.chlorideMgPerM2Day().isEmpty()) {
      lnSpread *= moveSalt(monthly, place, flags);
    }
    Quantiles annual = SeaSalt.annual(monthly, lnSpread);
    if (overrides.chlorideMgPerM2Day().isPresent()) {
      double given = overrides.chlorideMgPerM2Day().getAsDouble();
      scale = given / annual.median();
      annual = new Quantiles(given, given, given);
      lnSpread = 0;
      flags.add(Note.of("air-chloride-given", "mgPerM2Day", given));
    }
    List<MonthAir> salted = new ArrayList<>();
    for (int m = 0; m < months.size(); m++) {
      salted.add(months.get(m).withChloride(scale * monthly.get(m)));
    }
    return new Salt(salted, annual, lnSpread);
  }

  private static Sulfur sulfur(
      Setting setting,
      Optional<CountryAir.Country> country,
      AirOverrides overrides,
      Set<Note> flags) {
    if (overrides.so2MgPerM2Day().isPresent()) {
      double given = overrides.so2MgPerM2Day().getAsDouble();
      flags.add(Note.of("air-so2-given", "mgPerM2Day", given));
      return new Sulfur(new Quantiles(given, given, given), 0);
    }
    Settings.So2 so2 = Settings.so2(setting, overrides.setting().isPresent(), country);
    flags.addAll(so2.flags());
    return new Sulfur(so2.depositionMgPerM2Day(), so2.lnSpread());
  }

  private static Exposure exposure(
      AnnualAir annual, Sulfur sulfur, Salt salt, AirOverrides overrides, Set<Note> flags) {
    overrides
        .temperatureC()
        .ifPresent(given -> flags.add(Note.of("air-temperature-given", "celsius", given)));
    overrides
        .relativeHumidityPct()
        .ifPresent(given -> flags.add(Note.of("air-humidity-given", "pct", given)));
    return new Exposure(
        overrides.temperatureC().orElse(annual.temperatureC()),
        overrides.relativeHumidityPct().orElse(annual.relativeHumidityPct()),
        sulfur.annual().median(),
        salt.annual().median());
  }

  /** Sums of the months, and means over them (each month counts alike). */
  static AnnualAir annual(List<MonthAir> months) {
    double temperature = 0;
    double humidity = 0;
    double wet = 0;
    double rain = 0;
    double frost = 0;
    double nearFreezing = 0;
    for (MonthAir month : months) {
      temperature += month.temperatureC() / months.size();
      humidity += month.relativeHumidityPct() / months.size();
      wet += month.wetHours();
      rain += month.rainMm();
      frost += month.frostDays();
      nearFreezing += month.nearFreezingDays();
    }
    return new AnnualAir(temperature, humidity, wet, rain, frost, nearFreezing);
  }
}
