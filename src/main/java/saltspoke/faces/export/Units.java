package saltspoke.faces.export;

/** Systems of units that a sheet for people can use. */
public enum Units {
  METRIC("metric"),
  US("us");

  private static final double KM_PER_MILE = 1.609344; // exact by definition
  private static final double M_PER_FOOT = 0.3048; // exact by definition

  private final String id;

  Units(String id) {
    this.id = id;
  }

  /** Name used in options and addresses. */
  public String id() {
    return id;
  }

  /** A height above the sea with its unit. */
  String height(double metres) {
    return this == US ? Math.round(metres / M_PER_FOOT) + " ft" : Math.round(metres) + " m";
  }

  /** A distance along the ground with its unit. */
  String distance(double km, java.util.Locale locale) {
    if (this == US) {
      double miles = km / KM_PER_MILE;
      return String.format(locale, miles < 10 ? "%.1f mi" : "%.0f mi", miles);
    }
    return km < 1
        ? Math.round(km * 1000) + " m"
        : String.format(locale, km < 10 ? "%.1f km" : "%.0f km", km);
  }
}
