package saltspoke.sources;

import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.simplify.DouglasPeuckerSimplifier;

/**
 * Builds the coast: land polygons cut at the lines of a 2° grid, in a fine form (as the source has
 * them, about 0.2 km) gathered by 10° tiles, and a coarse form for what is far away. Lakes are
 * land, the Caspian is sea.
 *
 * <p>A row of either table is one bin with its land as well-known text. Rings run
 * counter-clockwise, so that land lies on the left of every edge; edges along a bin's border are
 * cuts and no coast.
 */
public final class CoastBuilder implements LayerBuilder {
  private static final String PACKAGE = "gmt-gshhg-high";
  private static final String HEADER = "bin_west_deg,bin_south_deg,wkt";
  private static final String LICENCE = "LGPL-3.0-or-later";

  /** Tolerance of the coarse coast, degrees of latitude: 1.2 km at 111.2 km per degree. */
  static final double COARSE_TOLERANCE_DEG = 1.2 / 111.2;

  /** Islands smaller than this across are left out of the coarse coast, degrees of latitude. */
  static final double COARSE_LEAST_ISLAND_DEG = 5.0 / 111.2;

  /** Longest edge of the coarse coast, degrees: a chord over it stays within 0.1 km of the arc. */
  private static final double COARSE_LONGEST_DEG = 0.5;

  @Override
  public String id() {
    return "coast";
  }

  @Override
  public List<String> needs() {
    return List.of(PACKAGE);
  }

  @Override
  public void build(SourcePackages in, LayerSink out) throws IOException {
    List<GshhgBins.Bin> bins = read(in);
    String attribution = in.get(PACKAGE).declared().attribution();
    TiledTableWriter fine = new TiledTableWriter(HEADER);
    StringBuilder coarse = new StringBuilder(HEADER).append('\n');
    FreshWaters freshWaters = new FreshWaters();
    for (GshhgBins.Bin plain : bins) {
      GshhgBins.Bin bin = freshWaters.addTo(plain);
      fine.row(bin.southDeg(), bin.westDeg(), row(bin, bin.rings(), "%.4f"));
      List<double[]> rings = coarse(bin);
      if (!rings.isEmpty()) {
        coarse.append(row(bin, rings, "%.3f")).append('\n');
      }
    }
    fine.write(
        out,
        new LayerFile(
            "coast-fine",
            "coast-gshhg/coast-fine.csv.gz",
            "Coast, land polygons by 2° bins, about 0.2 km",
            "",
            "",
            List.of(),
            LICENCE,
            attribution,
            "changed: level 1 closed per bin, Caspian cut out as sea, lakes behind dams added to"
                + " the land, coordinates to 0.0001°"));
    licence(out, "lgpl-3.0", "GNU Lesser General Public License 3, for this folder", attribution);
    licence(out, "gpl-3.0", "GNU General Public License 3, which it builds on", attribution);
    try (OutputStream stream =
        out.file(
            new LayerFile(
                "coast-coarse",
                "coast-gshhg/coast-coarse.csv.gz",
                "Coast, land polygons by 2° bins, simplified to 1.2 km",
                "",
                "",
                List.of(),
                LICENCE,
                attribution,
                "changed: as the fine coast, then Douglas-Peucker to 1.2 km, islands under 5 km"
                    + " across left out"))) {
      stream.write(coarse.toString().getBytes(StandardCharsets.UTF_8));
    }
  }

  private static void licence(LayerSink out, String name, String title, String attribution)
      throws IOException {
    LayerFile file =
        new LayerFile(
            "coast-" + name.substring(0, name.indexOf('-')),
            "coast-gshhg/" + name + ".txt",
            title,
            "",
            "",
            List.of(),
            LICENCE,
            attribution,
            "");
    try (OutputStream stream = out.file(file);
        InputStream text = CoastBuilder.class.getResourceAsStream(name + ".txt")) {
      text.transferTo(stream);
    }
  }

  private static List<GshhgBins.Bin> read(SourcePackages in) throws IOException {
    Path netcdf = Files.createTempFile("gshhg", ".nc");
    try {
      Files.write(netcdf, in.bytes(PACKAGE, "binned_GSHHS_h.nc"));
      return new GshhgBins(netcdf).bins();
    } finally {
      Files.delete(netcdf);
    }
  }

  static String row(GshhgBins.Bin bin, List<double[]> rings, String format) {
    StringBuilder text = new StringBuilder();
    text.append((int) bin.westDeg()).append(',').append((int) bin.southDeg()).append(",\"");
    text.append("MULTIPOLYGON (");
    String separator = "";
    for (double[] ring : rings) {
      List<String> points = new ArrayList<>();
      for (int i = 0; i < ring.length; i += 2) {
        String point = number(ring[i], format) + " " + number(ring[i + 1], format);
        if (points.isEmpty() || !point.equals(points.get(points.size() - 1))) {
          points.add(point);
        }
      }
      if (points.size() >= 4) {
        text.append(separator).append("((").append(String.join(",", points)).append("))");
        separator = ",";
      }
    }
    return text.append(")\"").toString();
  }

  private static String number(double value, String format) {
    String text = String.format(Locale.ROOT, format, value);
    int end = text.length();
    while (text.charAt(end - 1) == '0') {
      end--;
    }
    text = text.substring(0, text.charAt(end - 1) == '.' ? end - 1 : end);
    return text.equals("-0") ? "0" : text;
  }

  private static List<double[]> coarse(GshhgBins.Bin bin) {
    List<double[]> rings = new ArrayList<>();
    for (double[] ring : bin.rings()) {
      double[] simple = new RingSimplifier(bin).simplify(ring);
      if (simple.length >= 8) {
        rings.add(simple);
      }
    }
    return rings;
  }

  /**
   * Simplifies the parts of a ring that are coast and leaves its cuts along the bin as they are.
   */
  private record RingSimplifier(GshhgBins.Bin bin) {
    double[] simplify(double[] ring) {
      int n = ring.length / 2 - 1;
      int start = 0;
      while (start < n && !isCut(ring, start)) {
        start++;
      }
      if (start == n) {
        return island(ring);
      }
      List<Coordinate> out = new ArrayList<>();
      List<Coordinate> run = new ArrayList<>();
      for (int k = 1; k <= n; k++) {
        int i = (start + k) % n;
        run.add(new Coordinate(ring[2 * i], ring[2 * i + 1]));
        if (isCut(ring, i) || k == n) {
          out.addAll(line(run));
          run.clear();
        }
      }
      out.add(out.get(0).copy());
      return flat(out);
    }

    private boolean isCut(double[] ring, int i) {
      double lon0 = ring[2 * i];
      double lat0 = ring[2 * i + 1];
      double lon1 = ring[2 * i + 2];
      double lat1 = ring[2 * i + 3];
      boolean meridian = lon0 == lon1 && (lon0 == bin.westDeg() || lon0 == eastDeg());
      boolean parallel = lat0 == lat1 && (lat0 == bin.southDeg() || lat0 == northDeg());
      return meridian || parallel;
    }

    private double eastDeg() {
      return bin.westDeg() + bin.sizeDeg();
    }

    private double northDeg() {
      return bin.southDeg() + bin.sizeDeg();
    }

    private double[] island(double[] ring) {
      int n = ring.length / 2 - 1;
      int far = 0;
      double most = 0;
      for (int i = 1; i < n; i++) {
        double across =
            Math.hypot((ring[2 * i] - ring[0]) * cosLatitude(), ring[2 * i + 1] - ring[1]);
        if (across > most) {
          most = across;
          far = i;
        }
      }
      if (most < COARSE_LEAST_ISLAND_DEG) {
        return new double[0];
      }
      List<Coordinate> first = new ArrayList<>();
      List<Coordinate> second = new ArrayList<>();
      for (int i = 0; i <= n; i++) {
        Coordinate c = new Coordinate(ring[2 * i], ring[2 * i + 1]);
        if (i <= far) {
          first.add(c);
        }
        if (i >= far) {
          second.add(c);
        }
      }
      List<Coordinate> out = new ArrayList<>(line(first));
      out.addAll(line(second).subList(1, line(second).size()));
      return flat(out);
    }

    private double cosLatitude() {
      double middle = bin.southDeg() + bin.sizeDeg() / 2;
      return Math.max(0.01, Math.cos(Math.toRadians(middle)));
    }

    private List<Coordinate> line(List<Coordinate> points) {
      if (points.size() < 3) {
        return List.copyOf(points);
      }
      double scale = cosLatitude();
      Coordinate[] scaled =
          points.stream().map(c -> new Coordinate(c.x * scale, c.y)).toArray(Coordinate[]::new);
      Coordinate[] kept =
          DouglasPeuckerSimplifier.simplify(
                  new GeometryFactory().createLineString(scaled), COARSE_TOLERANCE_DEG)
              .getCoordinates();
      List<Coordinate> out = new ArrayList<>();
      int at = 0;
      for (Coordinate c : kept) {
        while (scaled[at] != c && !(scaled[at].x == c.x && scaled[at].y == c.y)) {
          if (out.size() > 0
              && distance(out.get(out.size() - 1), points.get(at)) > COARSE_LONGEST_DEG) {
            out.add(points.get(at));
          }
          at++;
        }
        out.add(points.get(at));
      }
      return out;
    }

    private double distance(Coordinate a, Coordinate b) {
      return Math.hypot((a.x - b.x) * cosLatitude(), a.y - b.y);
    }

    private static double[] flat(List<Coordinate> points) {
      double[] flat = new double[2 * points.size()];
      for (int i = 0; i < points.size(); i++) {
        flat[2 * i] = points.get(i).x;
        flat[2 * i + 1] = points.get(i).y;
      }
      return flat;
    }
  }
}
