package saltspoke.faces;

import java.util.List;
import java.util.Optional;
import java.util.function.Supplier;
import saltspoke.advice.Advice;
import saltspoke.advice.AdviceRequest;
import saltspoke.advice.Advisor;
import saltspoke.advice.Sensitivity;
import saltspoke.advice.Tornado;
import saltspoke.atlas.AtlasLayer;
import saltspoke.atlas.LayerValues;
import saltspoke.atlas.PointValues;
import saltspoke.atlas.RegionOutlook;
import saltspoke.atmosphere.AirClimate;
import saltspoke.atmosphere.AirModel;
import saltspoke.atmosphere.AirOverrides;
import saltspoke.fields.DataSet;
import saltspoke.places.Area;
import saltspoke.places.Place;
import saltspoke.places.PlaceDirectory;
import saltspoke.places.PlaceHit;
import saltspoke.places.PlaceOverrides;
import saltspoke.places.Regions;
import saltspoke.values.Refusal;
import saltspoke.values.Stopped;
import saltspoke.wheel.Catalogue;
import saltspoke.wheel.Profiles;
import saltspoke.wheel.RidingProfile;

/**
 * The one advisor behind every face: finds the place, works out its air, and advises on the wheel.
 * Each part is made at its first use and kept; safe for use by many threads.
 */
public final class Answers {
  private final DataSet dataSet;
  private final LocalCorrections corrections;
  private final Once<PlaceDirectory> places;
  private final Once<AirModel> airModel;
  private final Catalogue catalogue = Catalogue.shipped();
  private final Profiles profiles = Profiles.shipped();
  private final Once<Advisor> advisor;
  private final Once<Regions> regions;

  public Answers(DataSet dataSet) {
    this(dataSet, LocalCorrections.NONE);
  }

  /** Answers that local measurements move near their sites. */
  public Answers(DataSet dataSet, LocalCorrections corrections) {
    this.dataSet = dataSet;
    this.corrections = corrections;
    this.places = new Once<>(() -> PlaceDirectory.open(dataSet));
    this.airModel = new Once<>(() -> AirModel.from(dataSet, corrections.sites()));
    this.advisor = new Once<>(() -> new Advisor(catalogue));
    this.regions = new Once<>(() -> Regions.from(dataSet));
  }

  /** Begins to make all parts in the background, while the place is sought. */
  public Answers prepare() {
    for (Once<?> part : List.of(places, airModel, advisor)) {
      Thread thread = new Thread(() -> tryToMake(part), "prepare");
      thread.setDaemon(true);
      thread.start();
    }
    return this;
  }

  /** Whether all parts are made, so that the next answer need not wait for any. */
  public boolean ready() {
    return places.isMade() && airModel.isMade() && advisor.isMade();
  }

  private static void tryToMake(Once<?> part) {
    try {
      part.get();
    } catch (RuntimeException e) {
      // The question that needs this part makes it again and meets the same refusal.
    }
  }

  public DataSet dataSet() {
    return dataSet;
  }

  public LocalCorrections corrections() {
    return corrections;
  }

  public Catalogue catalogue() {
    return catalogue;
  }

  public Profiles profiles() {
    return profiles;
  }

  /** Towns whose name begins so, most populous first. */
  public List<PlaceHit> search(String query, int limit) {
    return places.get().search(query, limit);
  }

  /** Whether a point is on land; lakes are land, the Caspian is sea. */
  public boolean isLand(double latitudeDeg, double longitudeDeg) {
    return places.get().isLand(latitudeDeg, longitudeDeg);
  }

  /** Land beside a point in the water, see {@link PlaceDirectory#landBeside}. */
  public Optional<double[]> landBeside(
      double latitudeDeg, double longitudeDeg, double reachKm, double inlandKm) {
    return places.get().landBeside(latitudeDeg, longitudeDeg, reachKm, inlandKm);
  }

  /** Codes of the countries whose postcodes are known. */
  public List<String> postcodeCountries() {
    return places.get().postcodeCountries();
  }

  /** The place of a question. */
  public Place place(PlaceQuestion question) {
    PlaceOverrides overrides = new PlaceOverrides(question.elevationM(), question.seaDistanceKm());
    if (question.name().isPresent()) {
      return places.get().byName(question.name().get(), overrides);
    }
    if (question.postcode().isPresent()) {
      return places
          .get()
          .byPostcode(question.postcode().get(), question.country().orElseThrow(), overrides);
    }
    return places
        .get()
        .at(question.latitudeDeg().getAsDouble(), question.longitudeDeg().getAsDouble(), overrides);
  }

  /** The air at the place of a question. */
  public AirClimate air(PlaceQuestion question) {
    Stopped.check();
    return airModel.get().at(place(question), AirOverrides.of(question.setting().orElse(null)));
  }

  /** Reads both parts of a wheel question and answers it; the profile is named in it. */
  public Advice advise(Parameters parameters) {
    return advise(parameters, profiles.get(profileName(parameters)));
  }

  /** The same for a profile of one's own. */
  public Advice advise(Parameters parameters, RidingProfile profile) {
    PlaceQuestion question = PlaceQuestion.from(parameters);
    AdviceRequest request = Questions.wheel(parameters, profile);
    return advisor.get().advise(air(question), request);
  }

  /** How far the interval of the one pairing in question moves with each assumption. */
  public Tornado sensitivity(Parameters parameters) {
    AirClimate air = air(PlaceQuestion.from(parameters));
    return new Sensitivity(catalogue)
        .of(air, Questions.wheel(parameters, profiles.get(profileName(parameters))));
  }

  /** The values of an atlas layer at any point. */
  public PointValues values(AtlasLayer layer) {
    return LayerValues.of(layer, places.get(), airModel.get());
  }

  /** The same for the ready profile that the question names. */
  public PointValues firstLook(Parameters parameters) {
    return firstLook(parameters, profiles.get(profileName(parameters)));
  }

  /** The months to the first look at any point, for the one pairing in question. */
  public PointValues firstLook(Parameters parameters, RidingProfile profile) {
    AdviceRequest request = Questions.wheel(parameters, profile);
    int pairings =
        catalogue
            .pairings(request.rim(), request.nipple(), request.between(), request.spoke())
            .size();
    if (pairings != 1) {
      throw Refusal.wrongUse(
          "not-one-pairing",
          "pairing",
          pairings + " pairings",
          "rim, nipple, interface and spoke of one pairing");
    }
    Advisor one = advisor.get();
    return LayerValues.firstLook(
        places.get(), airModel.get(), air -> one.pairings(air, request).get(0).firstLookMonths());
  }

  /** First-level regions of the world. */
  public Regions regions() {
    return regions.get();
  }

  /** What the region that a question names is like, for a ready profile if it names one. */
  public RegionOutlook outlook(Parameters parameters) {
    String name =
        parameters
            .text("region")
            .orElseThrow(() -> Refusal.wrongUse("empty", "region", "", "a region's name"));
    Area area = regions.get().find(name);
    return outlook(area, regions.get().belongingTo(area), parameters, namedProfile(parameters));
  }

  /**
   * What an area is like for the people who live in it.
   *
   * @param belongs which points are of the area
   * @param profile how they ride; nothing leaves the wheels out
   */
  public RegionOutlook outlook(
      Area area,
      Regions.PointTest belongs,
      Parameters parameters,
      Optional<RidingProfile> profile) {
    int sample = parameters.whole("sample", 4, 400, RegionOutlook.USUAL_SAMPLE);
    return RegionOutlook.of(
        area,
        places.get().within(belongs),
        places.get(),
        airModel.get(),
        sample,
        profile.map(
            ridden -> {
              AdviceRequest request = Questions.wheel(parameters, ridden);
              return air -> advisor.get().pairings(air, request);
            }));
  }

  /** The ready profile that a question names, if it names one. */
  public Optional<RidingProfile> namedProfile(Parameters parameters) {
    return parameters.text("profile").map(profiles::get);
  }

  private static String profileName(Parameters parameters) {
    return parameters
        .text("profile")
        .orElseThrow(
            () ->
                Refusal.wrongUse(
                    "no-profile", "profile", "", "the name of a ready profile or one of your own"));
  }

  /** Language of a question, English when none is named. */
  public static Texts textsFor(Parameters parameters) {
    Optional<String> language = parameters.text("lang");
    return Texts.in(language.orElse("en"));
  }

  /** A part that is made at its first use, by one thread. */
  private static final class Once<T> {
    private final Supplier<T> maker;
    private volatile T made;

    Once(Supplier<T> maker) {
      this.maker = maker;
    }

    T get() {
      return made == null ? make() : made;
    }

    boolean isMade() {
      return made != null;
    }

    private synchronized T make() {
      if (made == null) {
        made = maker.get();
      }
      return made;
    }
  }
}
