package saltspoke.atlas;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;
import saltspoke.advice.PairingAdvice;
import saltspoke.atmosphere.AirClimate;
import saltspoke.atmosphere.AirGlance;
import saltspoke.atmosphere.AirModel;
import saltspoke.atmosphere.AirOverrides;
import saltspoke.atmosphere.Category;
import saltspoke.atmosphere.Metal;
import saltspoke.places.Area;
import saltspoke.places.Place;
import saltspoke.places.PlaceDirectory;
import saltspoke.places.PlaceHit;
import saltspoke.values.Note;
import saltspoke.values.Quantiles;
import saltspoke.values.Refusal;

/**
 * What an area is like for the people who live in it. Classes are counted over all its towns, each
 * with its people; what costs more is worked out at a sample of towns, every one standing for the
 * same number of people.
 *
 * @param towns shipped towns inside
 * @param people who live in them
 * @param classShare per metal, the share of people in each category
 * @param sampled towns in the sample
 * @param chlorideMgPerM2Day 10, 50 and 90 % of the people have at most this
 * @param wetHours likewise
 * @param nearFreezingDays likewise
 * @param pairings best first; empty when no profile was given
 * @param flags what to know beside it
 */
public record RegionOutlook(
    Area area,
    int towns,
    long people,
    Map<Metal, Map<Category, Double>> classShare,
    int sampled,
    Quantiles chlorideMgPerM2Day,
    Quantiles wetHours,
    Quantiles nearFreezingDays,
    List<PairingOutlook> pairings,
    List<Note> flags) {
  /** Towns in the sample unless more are asked for: shares then move in steps of 3 %. */
  public static final int USUAL_SAMPLE = 32;

  private record Peopled(PlaceHit town, Place place, AirGlance air, double weight) {}

  /**
   * @param towns those that belong to the area
   * @param sample most towns of the sample
   * @param pairings advice in an air; nothing leaves the wheels out
   * @throws Refusal when no shipped town lies in the area
   */
  public static RegionOutlook of(
      Area area,
      List<PlaceHit> towns,
      PlaceDirectory places,
      AirModel air,
      int sample,
      Optional<Function<AirClimate, List<PairingAdvice>>> pairings) {
    if (towns.isEmpty()) {
      throw Refusal.notFound(
          "no-towns", "region", area.name(), "an area with a town of at least 1,000 people");
    }
    long people = towns.stream().mapToLong(PlaceHit::population).sum();
    List<Peopled> all =
        towns.parallelStream()
            .map(
                town -> {
                  Place place = places.of(town);
                  double weight =
                      people > 0 ? town.population() / (double) people : 1.0 / towns.size();
                  return new Peopled(town, place, air.glance(place), weight);
                })
            .toList();
    List<Peopled> chosen = systematic(all, sample);
    List<AirClimate> climates =
        chosen.parallelStream().map(p -> air.at(p.place, AirOverrides.NONE)).toList();
    List<List<PairingAdvice>> advice =
        pairings.map(of -> climates.parallelStream().map(of).toList()).orElse(List.of());
    List<Note> flags = new ArrayList<>();
    flags.add(Note.of("region-weighted", "towns", towns.size(), "people", people));
    flags.add(Note.of("region-sampled", "sampled", chosen.size()));
    flags.add(Note.of("region-outline"));
    return new RegionOutlook(
        area,
        towns.size(),
        people,
        classShare(all),
        chosen.size(),
        overPeople(climates, c -> c.chlorideDepositionMgPerM2Day().median()),
        overPeople(climates, c -> c.annual().wetHours()),
        overPeople(climates, c -> c.annual().nearFreezingDays()),
        PairingOutlook.ranked(advice),
        flags);
  }

  /**
   * Towns in the order of their steel loss, one taken at the middle of every equal share of the
   * people: a large city may be taken more than once, and no random number is needed.
   */
  private static List<Peopled> systematic(List<Peopled> all, int sample) {
    List<Peopled> ordered = new ArrayList<>(all);
    ordered.sort(
        Comparator.<Peopled>comparingDouble(p -> p.air.loss(Metal.CARBON_STEEL).um())
            .thenComparing(p -> p.town.name()));
    List<Peopled> chosen = new ArrayList<>();
    double below = 0;
    for (Peopled each : ordered) {
      below += each.weight;
      while (chosen.size() < sample && (chosen.size() + 0.5) / sample < below) {
        chosen.add(each);
      }
    }
    return chosen;
  }

  private static Map<Metal, Map<Category, Double>> classShare(List<Peopled> all) {
    Map<Metal, Map<Category, Double>> shares = new EnumMap<>(Metal.class);
    for (Metal metal : Metal.values()) {
      Map<Category, Double> share = new EnumMap<>(Category.class);
      for (Category category : Category.values()) {
        share.put(category, 0.0);
      }
      all.forEach(p -> share.merge(p.air.category(metal), p.weight, Double::sum));
      shares.put(metal, share);
    }
    return shares;
  }

  private static Quantiles overPeople(
      List<AirClimate> climates, ToDoubleFunction<AirClimate> value) {
    return quantiles(climates.stream().mapToDouble(value).sorted().toArray());
  }

  /** Of sorted values that count alike; between two values a straight line. */
  static Quantiles quantiles(double[] sorted) {
    return new Quantiles(quantile(sorted, 0.1), quantile(sorted, 0.5), quantile(sorted, 0.9));
  }

  private static double quantile(double[] sorted, double p) {
    double at = Math.max(0, Math.min(sorted.length - 1, p * sorted.length - 0.5));
    int low = (int) at;
    int high = Math.min(sorted.length - 1, low + 1);
    return sorted[low] + (at - low) * (sorted[high] - sorted[low]);
  }
}
