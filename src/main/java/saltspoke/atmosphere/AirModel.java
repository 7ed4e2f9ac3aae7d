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

  private AirModel(
      MonthlyClimate climate, CountryAir countries, FieldStack elevation, WindFields winds) {
    this.climate = climate;
    this.countries = countries;
    this.elevation = elevation;
    this.winds = winds;
  }

  /** One standard deviation of the modelled annual mean temperature, K (judged on stations). */
  private static final double TEMPERATURE_SPREAD_K = 1.0;

  /** One standard deviation of the modelled annual mean humidity, points (judged on stations). */
  private static final double HUMIDITY_SPREAD_PCT = 5.0;

  /** Over the layers of a data set. */
  public static AirModel from(DataSet data) {
    return new AirModel(
        MonthlyClimate.from(data),
        CountryAir.read(CsvTable.read(data.open(CountryAir.LAYER), CountryAir.LAYER + ".csv")),
        data.stack("elevation"),
        WindFields.from(data));
  }

  /** The air at a place. */
  public AirClimate at(Place place, AirOverrides overrides) {
    Set<Note> flags = new LinkedHashSet<>();
    flags.addAll(climate.notes(place));
    Optional<CountryAir.Country> country = countries.find(place.countryCode());
    Setting setting = overrides.setting().orElseGet(() -> Settings.guess(place.surroundings()));

    Salt salt = salt(place, setting, climate.at(place), overrides, flags);
    Sulfur sulfur = sulfur(setting, country, overrides, flags);
    AnnualAir annual = annual(salt.months());
    Exposure exposure = exposure(annual, sulfur, salt, overrides, flags);
    InputSpread spread =
        new InputSpread(
            overrides.temperatureC().isPresent() ? 0 : TEMPERATURE_SPREAD_K,
            overrides.relativeHumidityPct().isPresent() ? 0 : HUMIDITY_SPREAD_PCT,
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

  /**
   * The annual means at a place that the class follows from, as in {@link #at} without overrides,
   * to the last bit: no wet hours, no probabilities, a fraction of the work. For maps.
   */
  public AirGlance glance(Place place) {
    Setting setting = Settings.guess(place.surroundings());
    MonthMeans means = climate.means(place);
    SeaSalt model = seaSalt(place, setting, Arrays.stream(means.rainMm()).sum());
    List<Double> monthly = new ArrayList<>();
    double temperatureC = 0;
    double humidityPct = 0;
    for (int m = 0; m < PlaceFields.MONTHS; m++) {
      temperatureC += means.temperatureC()[m] / PlaceFields.MONTHS;
      humidityPct += means.relativeHumidityPct()[m] / PlaceFields.MONTHS;
    }
    for (WindMonth wind : winds.year(place, means.windMPerS())) {
      monthly.add(model.monthMgPerM2Day(wind));
    }
    Settings.So2 so2 = Settings.so2(setting, false, countries.find(place.countryCode()));
    return new AirGlance(
        new Exposure(
            temperatureC,
            humidityPct,
            so2.depositionMgPerM2Day().median(),
            SeaSalt.annual(monthly).median()),
        new InputSpread(
            TEMPERATURE_SPREAD_K, HUMIDITY_SPREAD_PCT, so2.lnSpread(), SeaSalt.LN_SPREAD));
  }

  private SeaSalt seaSalt(Place place, Setting setting, double rainMmPerYear) {
    return new SeaSalt(
        place.sea(),
        SaltPaths.crestsAboveLowAirM(place, elevation),
        SaltPaths.roughness(setting, place.sea().distanceKm()),
        place.elevationM(),
        rainMmPerYear);
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
    List<Double> monthly = new ArrayList<>();
    double calmestHeld = Double.POSITIVE_INFINITY;
    for (MonthClimate month : months) {
      if (SaltKernel.heldWind(month.windMPerS()) != month.windMPerS()) {
        calmestHeld = Math.min(calmestHeld, month.windMPerS());
      }
    }
    double[] windMPerS = months.stream().mapToDouble(MonthClimate::windMPerS).toArray();
    for (WindMonth wind : winds.year(place, windMPerS)) {
      monthly.add(model.monthMgPerM2Day(wind));
    }
    if (calmestHeld < Double.POSITIVE_INFINITY) {
      flags.add(SaltKernel.windHeld(calmestHeld));
    }
    Quantiles annual = SeaSalt.annual(monthly);
    ChlorideFromSite.distanceFlag(place.sea().distanceKm()).ifPresent(flags::add);
    double scale = 1;
    double lnSpread = SeaSalt.LN_SPREAD;
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
