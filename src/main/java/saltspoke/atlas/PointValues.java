package saltspoke.atlas;

/** One number for any point of the earth. Safe for use by many threads. */
public interface PointValues {
  /** Whether there is a value; cheap. */
  boolean isLand(double latitudeDeg, double longitudeDeg);

  /** The value at a point, NaN at sea. */
  float at(double latitudeDeg, double longitudeDeg);
}
