package saltspoke.atmosphere;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import saltspoke.values.Note;

/**
 * Local measurements that move the model's answers near them: the rows of a correction file, by
 * quantity and site. Immutable; safe for use by many threads.
 */
public final class SiteCorrections {
  /** Nothing measured: every answer stays as the model gives it. */
  public static final SiteCorrections NONE = of(List.of());

  /** Sites that are blended at most, the most alike first; the next would add next to nothing. */
  private static final int MOST_SITES = 16;

  /** Weight under which a site is not named among those that moved an answer. */
  private static final double NAMED_FROM = 0.005;

  private static final double[] NO_MOVE = new double[PlaceFields.MONTHS];

  private final Map<CorrectedQuantity, List<Station>> stations;
  private final int siteCount;
  private final List<Note> provenance;

  private SiteCorrections(
      Map<CorrectedQuantity, List<Station>> stations, int siteCount, List<Note> provenance) {
    this.stations = stations;
    this.siteCount = siteCount;
    this.provenance = List.copyOf(provenance);
  }

  /** The same with what is to be said of its source wherever it moves the climate. */
  public SiteCorrections from(List<Note> notes) {
    return new SiteCorrections(stations, siteCount, notes);
  }

  List<Note> provenance() {
    return provenance;
  }

  /**
   * One quantity at one site.
   *
   * @param departure per month, NaN where nothing was measured
   * @param noise per month, variance of the measurement over the model's
   */
  record Station(String site, CorrectionSpot spot, double[] departure, double[] noise) {}

  private record Key(String site, CorrectionSpot spot) {}

  /**
   * From the rows of a file. A month's own row goes before the row of the whole year.
   *
   * @param rows at most one per site, quantity and month
   */
  public static SiteCorrections of(List<SiteCorrection> rows) {
    Map<CorrectedQuantity, Map<Key, Station>> byKey = new EnumMap<>(CorrectedQuantity.class);
    List<SiteCorrection> yearFirst = new ArrayList<>(rows);
    yearFirst.sort(Comparator.comparingInt(SiteCorrection::month));
    for (SiteCorrection row : yearFirst) {
      Station station =
          byKey
              .computeIfAbsent(row.quantity(), k -> new LinkedHashMap<>())
              .computeIfAbsent(new Key(row.site(), row.spot()), SiteCorrections::blank);
      double relative = row.spread() / row.quantity().priorSpread();
      int from = row.month() == 0 ? 0 : row.month() - 1;
      int to = row.month() == 0 ? PlaceFields.MONTHS : row.month();
      Arrays.fill(station.departure(), from, to, row.quantity().departure(row.amount()));
      Arrays.fill(station.noise(), from, to, relative * relative);
    }
    Map<CorrectedQuantity, List<Station>> stations = new EnumMap<>(CorrectedQuantity.class);
    byKey.forEach((quantity, sites) -> stations.put(quantity, List.copyOf(sites.values())));
    long sites =
        byKey.values().stream()
            .flatMap(sitesOfOne -> sitesOfOne.keySet().stream())
            .distinct()
            .count();
    return new SiteCorrections(stations, (int) sites, List.of());
  }

  private static Station blank(Key key) {
    double[] none = new double[PlaceFields.MONTHS];
    Arrays.fill(none, Double.NaN);
    return new Station(key.site(), key.spot(), none, new double[PlaceFields.MONTHS]);
  }

  /** Number of different sites. */
  public int siteCount() {
    return siteCount;
  }

  List<Station> stations(CorrectedQuantity quantity) {
    return stations.getOrDefault(quantity, List.of());
  }

  /** How a quantity moves at a spot. */
  SiteMove at(CorrectedQuantity quantity, CorrectionSpot spot) {
    return at(quantity, spot, null);
  }

  /** The same as if one site had not been measured. */
  SiteMove at(CorrectedQuantity quantity, CorrectionSpot spot, Station without) {
    List<Near> near = near(quantity, spot, without);
    double[] departure = NO_MOVE.clone();
    double[] left = NO_MOVE.clone();
    double[] heaviest = new double[near.size()];
    Arrays.fill(left, 1);
    Month before = null;
    for (int m = 0; m < PlaceFields.MONTHS && !near.isEmpty(); m++) {
      Month month = Month.of(near, m, quantity, spot, before);
      if (!month.present().isEmpty()) {
        departure[m] = month.departure(near, m);
        left[m] = month.blend().varianceLeft();
        month.heaviest(heaviest);
      }
      before = month;
    }
    List<SiteMove.Mover> movers = new ArrayList<>();
    for (int i = 0; i < near.size(); i++) {
      if (heaviest[i] >= NAMED_FROM) {
        Station station = near.get(i).station();
        movers.add(new SiteMove.Mover(station.site(), station.spot().chordKm(spot), heaviest[i]));
      }
    }
    movers.sort(Comparator.comparingDouble(SiteMove.Mover::weight).reversed());
    return new SiteMove(departure, left, List.copyOf(movers));
  }

  private record Near(Station station, double closeness) {}

  private List<Near> near(CorrectedQuantity quantity, CorrectionSpot spot, Station without) {
    List<Near> near = new ArrayList<>();
    for (Station station : stations(quantity)) {
      double closeness = quantity.reach().closeness(station.spot(), spot);
      if (closeness > 0 && station != without) {
        near.add(new Near(station, closeness));
      }
    }
    near.sort(Comparator.comparingDouble(Near::closeness).reversed());
    return near.size() > MOST_SITES ? near.subList(0, MOST_SITES) : near;
  }

  /** The sites that measured in a month, by index into those near, and their blend. */
  private record Month(List<Integer> present, double[] noise, double doubt, SiteBlend blend) {
    /** Takes over the blend of the month before where the same sites measured as surely. */
    static Month of(
        List<Near> near, int m, CorrectedQuantity quantity, CorrectionSpot spot, Month before) {
      List<Integer> present = new ArrayList<>();
      for (int i = 0; i < near.size(); i++) {
        if (!Double.isNaN(near.get(i).station().departure()[m])) {
          present.add(i);
        }
      }
      double[] noise =
          present.stream().mapToDouble(i -> near.get(i).station().noise()[m]).toArray();
      double doubt = doubt(near, present, m, quantity.priorSpread());
      if (before != null
          && before.present.equals(present)
          && Arrays.equals(before.noise, noise)
          && before.doubt == doubt) {
        return before;
      }
      List<CorrectionSpot> spots = present.stream().map(i -> near.get(i).station().spot()).toList();
      return new Month(
          present, noise, doubt, SiteBlend.of(quantity.reach(), spots, noise, doubt, spot));
    }

    /**
     * The part of the noise that lessens the weights: all of it while the departures are such as
     * the model's usual error explains, less where a site close by lies farther off. A frost hollow
     * is no slip of the thermometer.
     */
    private static double doubt(List<Near> near, List<Integer> present, int m, double prior) {
      double farthest = 1;
      for (int i : present) {
        Near site = near.get(i);
        double off = site.closeness() * site.station().departure()[m] / prior;
        farthest = Math.max(farthest, off * off);
      }
      return 1 / farthest;
    }

    double departure(List<Near> near, int m) {
      return blend.of(
          present.stream().mapToDouble(i -> near.get(i).station().departure()[m]).toArray());
    }

    void heaviest(double[] weights) {
      for (int k = 0; k < present.size(); k++) {
        int i = present.get(k);
        weights[i] = Math.max(weights[i], Math.abs(blend.weights()[k]));
      }
    }
  }
}
