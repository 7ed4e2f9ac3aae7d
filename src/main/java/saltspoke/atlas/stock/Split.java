package saltspoke.atlas.stock;

import java.math.BigDecimal;
import java.util.Collections;
import java.util.EnumMap;
import java.util.Map;
import java.util.TreeMap;
import saltspoke.advice.Prospect;
import saltspoke.advice.StateShares;
import saltspoke.atmosphere.Category;
import saltspoke.wheel.Pairing;

/**
 * What the customers of one region, or of all, come to. Wheels are added up exactly, so that the
 * parts always make the whole.
 */
public final class Split {
  private long customers;
  private double latitudeDeg = Double.NaN;
  private double longitudeDeg = Double.NaN;
  private BigDecimal wheels = BigDecimal.ZERO;
  private BigDecimal notEnough = BigDecimal.ZERO;
  private final Map<Category, BigDecimal> byClass = new EnumMap<>(Category.class);
  private final Map<String, BigDecimal> byProfile = new TreeMap<>();
  private final Map<String, BigDecimal> byPairing = new TreeMap<>();
  private final double[][] states = new double[StockQuestion.YEARS][4];
  private final double[] looks = new double[12];
  private final double[] seized = new double[12];

  void add(CustomerAnswer answer, int buildMonth) {
    BigDecimal weight = answer.customer().wheels();
    if (customers == 0) {
      latitudeDeg = answer.latitudeDeg();
      longitudeDeg = answer.longitudeDeg();
    }
    customers++;
    wheels = wheels.add(weight);
    if (!answer.enough()) {
      notEnough = notEnough.add(weight);
    }
    byClass.merge(answer.steelCategory(), weight, BigDecimal::add);
    byProfile.merge(answer.customer().profile(), weight, BigDecimal::add);
    byPairing.merge(pairingName(answer.taken()), weight, BigDecimal::add);
    double share = weight.doubleValue();
    Prospect today = answer.todayProspect();
    for (int year = 0; year < states.length; year++) {
      StateShares at = today.atYearEnd().get(year);
      states[year][0] += share * at.sound();
      states[year][1] += share * at.attacked();
      states[year][2] += share * at.seized();
      states[year][3] += share * at.lost();
    }
    for (int m = 0; m < 12; m++) {
      seized[m] += share * today.seizedInMonth().get(m);
    }
    double step = Math.max(answer.everyMonths(), 1);
    for (double at = answer.firstLookMonths(); at <= 12; at += step) {
      looks[(buildMonth - 1 + (int) Math.floor(at)) % 12] += share;
    }
  }

  /** A pairing as one word for tables: rim, nipple, interface, spoke. */
  public static String pairingName(Pairing pairing) {
    return String.join("/", pairing.rim(), pairing.nipple(), pairing.between(), pairing.spoke());
  }

  /** Latitude of the first customer's place, to find the region on a map. */
  public double latitudeDeg() {
    return latitudeDeg;
  }

  /** Longitude of the first customer's place. */
  public double longitudeDeg() {
    return longitudeDeg;
  }

  /** Rows answered. */
  public long customers() {
    return customers;
  }

  /** Wheels they stand for. */
  public BigDecimal wheels() {
    return wheels;
  }

  /** Wheels for which no pairing reaches the wanted first look. */
  public BigDecimal notEnough() {
    return notEnough;
  }

  /** Wheels by class of the outside air for carbon steel. */
  public Map<Category, BigDecimal> byClass() {
    return Collections.unmodifiableMap(byClass);
  }

  /** Wheels by profile, in the order of names. */
  public Map<String, BigDecimal> byProfile() {
    return Collections.unmodifiableMap(byProfile);
  }

  /** Wheels by recommended pairing ({@link #pairingName}), in the order of names. */
  public Map<String, BigDecimal> byPairing() {
    return Collections.unmodifiableMap(byPairing);
  }

  /**
   * Wheels expected in a state at the end of a year if they stay with today's pairing and nobody
   * looks.
   *
   * @param year 1..{@link StockQuestion#YEARS}
   */
  public StateShares wheelsByState(int year) {
    double[] at = states[year - 1];
    return new StateShares(at[0], at[1], at[2], at[3]);
  }

  /** Looks falling due in a calendar month of the first year with the recommended pairing. */
  public double looks(int month) {
    return looks[month - 1];
  }

  /** Wheels of today's pairing expected to seize in a calendar month of their first year. */
  public double rebuilds(int month) {
    return seized[month - 1];
  }
}
