package saltspoke.atlas.stock;

import java.util.ArrayList;
import java.util.List;
import saltspoke.advice.AdviceRequest;
import saltspoke.advice.Advisor;
import saltspoke.advice.Finding;
import saltspoke.advice.PairingAdvice;
import saltspoke.advice.Prospect;
import saltspoke.advice.WheelsAt;
import saltspoke.atmosphere.AirClimate;
import saltspoke.atmosphere.AirModel;
import saltspoke.atmosphere.AirOverrides;
import saltspoke.atmosphere.Category;
import saltspoke.atmosphere.Metal;
import saltspoke.places.Place;
import saltspoke.places.PlaceDirectory;
import saltspoke.places.PlaceOverrides;
import saltspoke.values.Note;
import saltspoke.values.Refusal;
import saltspoke.wheel.Catalogue;
import saltspoke.wheel.Pairing;
import saltspoke.wheel.Profiles;
import saltspoke.wheel.RidingProfile;

/**
 * Answers customers one by one. Places and wheels that come again are remembered, up to a bound, so
 * that memory does not grow with the list. Safe for use by many threads.
 */
public final class CustomerDesk {
  /** Places kept with their air: a few kB each. */
  private static final int MOST_PLACES = 4_000;

  /** Worked-out wheels kept: under 1 kB each. */
  private static final int MOST_WHEELS = 40_000;

  private record Spot(String postcode, String town, String country) {}

  /** Postcodes of one town often share its point, and so all that follows from it. */
  private record Point(double latitudeDeg, double longitudeDeg, double elevationM) {
    static Point of(Place place) {
      return new Point(place.latitudeDeg(), place.longitudeDeg(), place.elevationM());
    }
  }

  private record Weather(AirClimate air, Category steel) {}

  private record Wheel(Point point, String profile, Pairing today) {}

  private record Choice(
      Prospect today,
      Pairing taken,
      Prospect takenProspect,
      double firstLookMonths,
      double everyMonths,
      boolean enough) {}

  private final PlaceDirectory places;
  private final AirModel air;
  private final Advisor advisor;
  private final Catalogue catalogue;
  private final Profiles profiles;
  private final StockQuestion question;
  private final Recent<Spot, Place> found = new Recent<>(MOST_PLACES);
  private final Recent<Point, Weather> weathers = new Recent<>(MOST_PLACES);
  private final Recent<Wheel, Choice> choices = new Recent<>(MOST_WHEELS);

  public CustomerDesk(
      PlaceDirectory places,
      AirModel air,
      Advisor advisor,
      Catalogue catalogue,
      Profiles profiles,
      StockQuestion question) {
    this.places = places;
    this.air = air;
    this.advisor = advisor;
    this.catalogue = catalogue;
    this.profiles = profiles;
    this.question = question;
  }

  /**
   * What a customer gets.
   *
   * @throws Refusal when the place is not known
   */
  public CustomerAnswer answer(Customer customer) {
    Spot spot = new Spot(customer.postcode(), customer.town(), customer.country());
    Place place = found.get(spot, this::find);
    Point point = Point.of(place);
    Weather weather = weathers.get(point, p -> weather(place));
    Pairing today =
        new Pairing(customer.rim(), customer.nipple(), customer.between(), customer.spoke());
    RidingProfile profile = profile(customer.profile());
    Choice choice =
        choices.get(
            new Wheel(point, customer.profile(), today),
            wheel -> choose(weather.air(), profile, wheel.today()));
    List<Note> notes = new ArrayList<>(customer.mends());
    notes.addAll(place.flags());
    return new CustomerAnswer(
        customer,
        place.name(),
        place.regionName(),
        place.countryCode(),
        place.latitudeDeg(),
        place.longitudeDeg(),
        weather.steel(),
        today,
        choice.today(),
        choice.taken(),
        choice.takenProspect(),
        choice.firstLookMonths(),
        choice.everyMonths(),
        choice.enough(),
        notes);
  }

  private RidingProfile profile(String name) {
    return question.profile().name().equals(name) ? question.profile() : profiles.get(name);
  }

  private Place find(Spot spot) {
    return spot.postcode().isEmpty()
        ? places.byName(
            spot.country().isEmpty() ? spot.town() : spot.town() + ", " + spot.country(),
            PlaceOverrides.NONE)
        : places.byPostcode(spot.postcode(), spot.country(), PlaceOverrides.NONE);
  }

  private Weather weather(Place place) {
    AirClimate climate = air.at(place, AirOverrides.NONE);
    Category steel =
        climate.corrosivity().stream()
            .filter(entry -> entry.metal() == Metal.CARBON_STEEL)
            .findFirst()
            .orElseThrow()
            .category();
    return new Weather(climate, steel);
  }

  /** The first pairing of the order of preference that is good enough, else the longest lasting. */
  private Choice choose(AirClimate climate, RidingProfile profile, Pairing today) {
    WheelsAt wheels =
        advisor.wheels(
            climate,
            new AdviceRequest(
                profile,
                question.build(),
                null,
                null,
                null,
                null,
                question.risk(),
                question.buildMonth(),
                0,
                Finding.NOT_LOOKED,
                true));
    Pairing taken = null;
    Prospect best = null;
    for (Preference step : question.preference()) {
      Pairing pairing = new Pairing(today.rim(), step.nipple(), step.between(), today.spoke());
      if (catalogue.refusal(pairing).isEmpty()) {
        Prospect prospect = wheels.prospect(pairing, StockQuestion.YEARS);
        if (best == null || prospect.freeFirstLookMonths() > best.freeFirstLookMonths()) {
          taken = pairing;
          best = prospect;
        }
        if (prospect.freeFirstLookMonths() >= question.wantedMonths()) {
          break;
        }
      }
    }
    if (taken == null) {
      throw Refusal.wrongUse(
          "nothing-fits", "preference", today.rim(), "a nipple and interface that fit this rim");
    }
    PairingAdvice advice = wheels.advice(taken);
    return new Choice(
        wheels.prospect(today, StockQuestion.YEARS),
        taken,
        best,
        advice.firstLookMonths(),
        advice.everyMonths(),
        best.freeFirstLookMonths() >= question.wantedMonths());
  }
}
