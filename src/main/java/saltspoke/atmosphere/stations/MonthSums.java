package saltspoke.atmosphere.stations;

import java.util.Arrays;

/**
 * Counts and sums of one calendar month, of one year or of several added up. All are whole numbers
 * (sums in thousandths), so that adding in any order, on any number of machines, gives the same.
 */
public final class MonthSums {
  /** Classes of relative humidity, each 5 points wide; 100 % is in the last. */
  public static final int HUMIDITY_CLASSES = 20;

  /** Directions of the wind rose, each 10° wide about 0°, 10°, … */
  public static final int SECTORS = 36;

  /** One number of the sums; the order is the order in which they are stored. */
  public enum Sum {
    /** Years added up. */
    YEARS,
    /** Places of the month, reported or not: hours, of daily records days. */
    PLACES,
    /** Reports with temperature and humidity. */
    REPORTS,
    /** Thousandths of °C. */
    TEMPERATURE,
    /** Thousandths of a point. */
    HUMIDITY,
    WET,
    ABOVE_33,
    ABOVE_75,
    ABOVE_80,
    BELOW_0,
    /** Days with enough reports to tell their extremes. */
    DAYS,
    /** Thousandths of K. */
    RANGE,
    FROST_DAYS,
    NEAR_FREEZING_DAYS,
    /** Reports with wind. */
    WIND,
    CALM
  }

  private static final int HUMIDITY_AT = Sum.values().length;
  private static final int SECTORS_AT = HUMIDITY_AT + HUMIDITY_CLASSES;
  private static final int SPEEDS_AT = SECTORS_AT + SECTORS;

  /** How many numbers there are. */
  public static final int SIZE = SPEEDS_AT + SECTORS;

  private final long[] numbers;

  MonthSums() {
    this(new long[SIZE]);
  }

  private MonthSums(long[] numbers) {
    this.numbers = numbers;
  }

  /** From stored numbers, as many as {@link #SIZE}. */
  public static MonthSums of(long[] stored) {
    if (stored.length != SIZE) {
      throw new IllegalArgumentException("sums have " + SIZE + " numbers");
    }
    return new MonthSums(stored.clone());
  }

  /** The numbers to be stored. */
  public long[] stored() {
    return numbers.clone();
  }

  /** Both together. */
  public MonthSums plus(MonthSums other) {
    long[] sum = numbers.clone();
    for (int i = 0; i < SIZE; i++) {
      sum[i] += other.numbers[i];
    }
    return new MonthSums(sum);
  }

  public long get(Sum sum) {
    return numbers[sum.ordinal()];
  }

  /** Reports in a class of humidity, 0..19. */
  public long humidityClass(int index) {
    return numbers[HUMIDITY_AT + index];
  }

  /** Reports of wind from a sector, 0..35. */
  public long sector(int index) {
    return numbers[SECTORS_AT + index];
  }

  /** Sum of the speeds from a sector, mm/s. */
  public long sectorMmPerS(int index) {
    return numbers[SPEEDS_AT + index];
  }

  void add(Sum sum, long number) {
    numbers[sum.ordinal()] += number;
  }

  void count(Sum sum, boolean counts) {
    numbers[sum.ordinal()] += counts ? 1 : 0;
  }

  void humidity(double pct) {
    int index = (int) (pct * HUMIDITY_CLASSES / 100);
    numbers[HUMIDITY_AT + Math.min(HUMIDITY_CLASSES - 1, index)]++;
  }

  void wind(double fromDeg, double metresPerS) {
    add(Sum.WIND, 1);
    if (metresPerS == 0) {
      add(Sum.CALM, 1);
      return;
    }
    int sector = (int) Math.rint(fromDeg * SECTORS / 360) % SECTORS;
    numbers[SECTORS_AT + sector]++;
    numbers[SPEEDS_AT + sector] += Math.round(1000 * metresPerS);
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof MonthSums sums && Arrays.equals(numbers, sums.numbers);
  }

  @Override
  public int hashCode() {
    return Arrays.hashCode(numbers);
  }
}
