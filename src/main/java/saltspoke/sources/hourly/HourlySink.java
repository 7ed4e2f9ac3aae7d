package saltspoke.sources.hourly;

/** Takes the rows of an archive in file order. */
public interface HourlySink {
  /** The station of the rows that follow. */
  void station(HourlyStation station);

  /** A row; the object is used again for the next. */
  void row(HourlyRow row);
}
