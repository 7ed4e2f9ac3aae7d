package saltspoke.sources.hourly;

/**
 * A station of an archive.
 *
 * @param id as the archive names it
 * @param name for people; may be the id
 * @param latitudeDeg −90..90
 * @param longitudeDeg −180..180
 * @param elevationM metres above sea level
 * @param kind what its rows stand for
 * @param utc whether its clock is UTC; else local standard time
 */
public record HourlyStation(
    String id,
    String name,
    double latitudeDeg,
    double longitudeDeg,
    double elevationM,
    Kind kind,
    boolean utc) {
  /** What a row stands for. */
  public enum Kind {
    /** One hour of a real year. */
    HOURLY,
    /** One day of a real year: means, and where given the lowest and highest temperature. */
    DAILY,
    /** One hour of a typical year, put together from months of several years. */
    TYPICAL
  }

  /** The same station with rows of another kind and clock. */
  public HourlyStation as(Kind other, boolean otherUtc) {
    return new HourlyStation(id, name, latitudeDeg, longitudeDeg, elevationM, other, otherUtc);
  }
}
