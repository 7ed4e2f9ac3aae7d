package saltspoke.sources.hourly;

/** A published layout of station archives. */
interface HourlyFormat {
  /** One line for people: name and how it is told apart. */
  String description();

  /** Whether a file that begins with this line has the layout. */
  boolean fits(String firstLine);

  /**
   * Reads the rows that follow; the first line is the current one of {@code lines}.
   *
   * @param fileName last part of the name, which some layouts keep the station in
   */
  void read(LineReader lines, String fileName, StationList stations, HourlySink sink);
}
