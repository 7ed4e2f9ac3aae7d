package saltspoke.places;

import java.util.Arrays;

/**
 * The land in one bin of the coast layer. Its text is parsed at first use. Rings run
 * counter-clockwise, so land lies on the left of every edge; edges along the bin's border are cuts
 * through land and no coast.
 */
final class CoastBin {
  /** Width and height of a bin, degrees; the coast layer's own. */
  static final int SIZE_DEG = 2;

  private static final int COLUMNS = 360 / SIZE_DEG;

  /** Coast edges to a chunk: few enough to skip cheaply, enough that the skipping costs little. */
  private static final int CHUNK_EDGES = 32;

  final int westDeg;
  final int southDeg;
  private final double centreX;
  private final double centreY;
  private final double centreZ;
  private final double radiusM;
  private String wkt;
  private volatile Shape shape;

  /** Parsed land: vertices in degrees and in metres from the earth's centre. */
  static final class Shape {
    final float[] lon;
    final float[] lat;
    final float[] x;
    final float[] y;
    final float[] z;

    /** Index of each ring's first vertex, and the number of vertices at the end. */
    final int[] ringStart;

    /** First and last vertex of each chunk of coast, in turn. */
    final int[] chunk;

    /** Centre x, y, z and radius of each chunk's sphere, m. */
    final float[] sphere;

    Shape(float[] lon, float[] lat, int[] ringStart, int[] chunk) {
      this.lon = lon;
      this.lat = lat;
      this.ringStart = ringStart;
      this.chunk = chunk;
      int n = lon.length;
      x = new float[n];
      y = new float[n];
      z = new float[n];
      for (int i = 0; i < n; i++) {
        Vantage v = new Vantage(lat[i], lon[i]);
        x[i] = (float) v.x;
        y[i] = (float) v.y;
        z[i] = (float) v.z;
      }
      sphere = new float[chunk.length * 2];
      for (int c = 0; c < chunk.length / 2; c++) {
        bound(c);
      }
    }

    private void bound(int c) {
      double[] low = {1e9, 1e9, 1e9};
      double[] high = {-1e9, -1e9, -1e9};
      for (int i = chunk[2 * c]; i <= chunk[2 * c + 1]; i++) {
        double[] p = {x[i], y[i], z[i]};
        for (int axis = 0; axis < 3; axis++) {
          low[axis] = Math.min(low[axis], p[axis]);
          high[axis] = Math.max(high[axis], p[axis]);
        }
      }
      double square = 0;
      for (int axis = 0; axis < 3; axis++) {
        sphere[4 * c + axis] = (float) ((low[axis] + high[axis]) / 2);
        square += Math.pow((high[axis] - low[axis]) / 2, 2);
      }
      sphere[4 * c + 3] = (float) (Math.sqrt(square) + 2);
    }

    int chunks() {
      return chunk.length / 2;
    }

    /** Least chord distance from a point to a chunk's sphere, m; 0 inside. */
    double leastM(int c, Vantage from) {
      double centre = from.chordM(sphere[4 * c], sphere[4 * c + 1], sphere[4 * c + 2]);
      return Math.max(0, centre - sphere[4 * c + 3]);
    }
  }

  CoastBin(int westDeg, int southDeg, String wkt) {
    this.westDeg = westDeg;
    this.southDeg = southDeg;
    this.wkt = wkt;
    Vantage centre = new Vantage(southDeg + SIZE_DEG / 2.0, westDeg + SIZE_DEG / 2.0);
    centreX = centre.x;
    centreY = centre.y;
    centreZ = centre.z;
    double widest = Math.abs(southDeg) < Math.abs(southDeg + SIZE_DEG) ? southDeg : southDeg + 2;
    Vantage corner = new Vantage(widest, westDeg);
    radiusM = centre.chordM(corner.x, corner.y, corner.z) + 100;
  }

  /** Reads a row of the layer: west, south, and well-known text in quotes. */
  static CoastBin parse(String row) {
    int first = row.indexOf(',');
    int second = row.indexOf(',', first + 1);
    return new CoastBin(
        Integer.parseInt(row.substring(0, first)),
        Integer.parseInt(row.substring(first + 1, second)),
        row.substring(second + 2, row.length() - 1));
  }

  /** Number by which a bin is found. */
  static int keyOf(double latitudeDeg, double longitudeDeg) {
    int row = (int) Math.floor(Math.min(latitudeDeg, 89.999999) / SIZE_DEG) + 45;
    int column = Math.floorMod((int) Math.floor(longitudeDeg / SIZE_DEG) + 90, COLUMNS);
    return row * COLUMNS + column;
  }

  int key() {
    return keyOf(southDeg + 1, westDeg + 1);
  }

  /** The bin that a point lies in, without any coast: for its place and size. */
  static CoastBin empty(double latitudeDeg, double longitudeDeg) {
    int key = keyOf(latitudeDeg, longitudeDeg);
    return new CoastBin(key % COLUMNS * SIZE_DEG - 180, key / COLUMNS * SIZE_DEG - 90, "");
  }

  /** Least chord distance between any points of two bins, m; 0 where they may touch. */
  double leastM(CoastBin other) {
    return Math.max(0, centresM(other) - radiusM - other.radiusM);
  }

  /** Most chord distance between any points of two bins, m. */
  double mostM(CoastBin other) {
    return centresM(other) + radiusM + other.radiusM;
  }

  private double centresM(CoastBin other) {
    double dx = centreX - other.centreX;
    double dy = centreY - other.centreY;
    double dz = centreZ - other.centreZ;
    return Math.sqrt(dx * dx + dy * dy + dz * dz);
  }

  /** Least chord distance from a point to anything in the bin, m; 0 inside. */
  double leastM(Vantage from) {
    return Math.max(0, from.chordM(centreX, centreY, centreZ) - radiusM);
  }

  Shape shape() {
    Shape parsed = shape;
    if (parsed == null) {
      synchronized (this) {
        parsed = shape;
        if (parsed == null) {
          parsed = parseText();
          shape = parsed;
          wkt = null;
        }
      }
    }
    return parsed;
  }

  /** Whether a point of this bin is on land (even–odd rule). */
  boolean contains(double latitudeDeg, double longitudeDeg) {
    Shape s = shape();
    boolean inside = false;
    for (int r = 0; r + 1 < s.ringStart.length; r++) {
      for (int i = s.ringStart[r]; i + 1 < s.ringStart[r + 1]; i++) {
        double lat0 = s.lat[i];
        double lat1 = s.lat[i + 1];
        if ((lat0 > latitudeDeg) != (lat1 > latitudeDeg)
            && longitudeDeg
                < s.lon[i] + (latitudeDeg - lat0) / (lat1 - lat0) * (s.lon[i + 1] - s.lon[i])) {
          inside = !inside;
        }
      }
    }
    return inside;
  }

  private Shape parseText() {
    String text = wkt;
    float[] lon = new float[text.length() / 4 + 4];
    float[] lat = new float[lon.length];
    int[] rings = new int[16];
    int ringCount = 0;
    int n = 0;
    int at = text.indexOf('(');
    int end = text.length();
    boolean open = false;
    while (at < end) {
      char c = text.charAt(at);
      if (c == '-' || (c >= '0' && c <= '9')) {
        if (!open) {
          if (ringCount + 2 > rings.length) {
            rings = Arrays.copyOf(rings, rings.length * 2);
          }
          rings[ringCount++] = n;
          open = true;
        }
        int space = text.indexOf(' ', at);
        lon[n] = (float) decimal(text, at, space);
        int stop = space + 1;
        while (text.charAt(stop) != ',' && text.charAt(stop) != ')') {
          stop++;
        }
        lat[n++] = (float) decimal(text, space + 1, stop);
        at = stop;
      } else {
        open = open && c != ')';
        at++;
      }
    }
    rings[ringCount] = n;
    lon = Arrays.copyOf(lon, n);
    lat = Arrays.copyOf(lat, n);
    return new Shape(
        lon, lat, Arrays.copyOf(rings, ringCount + 1), chunks(lon, lat, rings, ringCount));
  }

  private int[] chunks(float[] lon, float[] lat, int[] rings, int ringCount) {
    int[] chunk = new int[16];
    int count = 0;
    for (int r = 0; r < ringCount; r++) {
      int start = rings[r];
      for (int i = rings[r]; i + 1 < rings[r + 1]; i++) {
        boolean cut = isCut(lon[i], lat[i], lon[i + 1], lat[i + 1]);
        int last = cut ? i : i + 1;
        if (last > start && (cut || last - start == CHUNK_EDGES || i + 2 == rings[r + 1])) {
          if (count + 2 > chunk.length) {
            chunk = Arrays.copyOf(chunk, chunk.length * 2);
          }
          chunk[count++] = start;
          chunk[count++] = last;
          start = last;
        }
        if (cut) {
          start = i + 1;
        }
      }
    }
    return Arrays.copyOf(chunk, count);
  }

  private boolean isCut(float lon0, float lat0, float lon1, float lat1) {
    return (lon0 == lon1 && (lon0 == westDeg || lon0 == westDeg + SIZE_DEG))
        || (lat0 == lat1 && (lat0 == southDeg || lat0 == southDeg + SIZE_DEG));
  }

  /** A plain decimal such as −12.3456, far faster than the general parser. */
  private static double decimal(String text, int from, int to) {
    boolean minus = text.charAt(from) == '-';
    long digits = 0;
    long scale = 1;
    boolean fraction = false;
    for (int i = minus ? from + 1 : from; i < to; i++) {
      char c = text.charAt(i);
      if (c == '.') {
        fraction = true;
      } else {
        digits = digits * 10 + (c - '0');
        scale = fraction ? scale * 10 : scale;
      }
    }
    double value = (double) digits / scale;
    return minus ? -value : value;
  }
}
