package saltspoke.bench;

import java.io.BufferedOutputStream;
import java.io.DataInputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.stream.IntStream;
import saltspoke.atlas.AtlasFrame;
import saltspoke.atmosphere.AirModel;
import saltspoke.atmosphere.Metal;
import saltspoke.fields.DataSet;
import saltspoke.places.Place;
import saltspoke.places.PlaceDirectory;
import saltspoke.places.PlaceOverrides;
import saltspoke.places.SeaView;
import saltspoke.places.Surroundings;

/**
 * The program's half of the comparison with NumPy and SciPy (see {@code src/bench}). {@code points}
 * writes the land points of a world grid with what is seen from them; {@code classes} reads them
 * back and works out the class of steel from the fields, as the atlas does.
 */
final class SteelClassRun {
  private static final int HEAD = 8;
  private static final int NUMBERS = HEAD + 3 * SeaView.DIRECTIONS;

  /** Points read, worked out and let go at once. */
  private static final int PIECE = 4096;

  private SteelClassRun() {}

  public static void main(String[] args) throws IOException {
    DataSet data = DataSet.in(Path.of(args[1]));
    Path points = Path.of(args[2]);
    if (args[0].equals("points")) {
      points(data, points, Double.parseDouble(args[3]));
    } else {
      classes(data, points, Path.of(args[3]));
    }
  }

  private static void points(DataSet data, Path out, double step) throws IOException {
    PlaceDirectory places = PlaceDirectory.open(data);
    AtlasFrame frame = AtlasFrame.over(new double[] {-180, -90, 180, 90}, step, 4326, true);
    try (OutputStream stream = new BufferedOutputStream(Files.newOutputStream(out), 1 << 20)) {
      for (int row = 0; row < frame.rows(); row++) {
        double lat = frame.y(row);
        List<byte[]> line =
            IntStream.range(0, frame.columns())
                .parallel()
                .filter(column -> places.isLand(lat, frame.x(column)))
                .mapToObj(column -> places.at(lat, frame.x(column), PlaceOverrides.NONE))
                .map(SteelClassRun::bytes)
                .toList();
        for (byte[] point : line) {
          stream.write(point);
        }
      }
    }
  }

  private static byte[] bytes(Place place) {
    ByteBuffer bytes = ByteBuffer.allocate(NUMBERS * Float.BYTES).order(ByteOrder.LITTLE_ENDIAN);
    String country = place.countryCode();
    double[] head = {
      place.latitudeDeg(),
      place.longitudeDeg(),
      place.elevationM(),
      place.sea().distanceKm(),
      place.surroundings().populationWithin5Km(),
      place.surroundings().populationWithin25Km(),
      place.surroundings().nightLight(),
      country.isEmpty() ? 0 : country.charAt(0) * 256 + country.charAt(1)
    };
    for (double[] part :
        List.of(head, place.sea().shoreKm(), place.sea().fetchKm(), place.sea().salinityRatio())) {
      for (double value : part) {
        bytes.putFloat((float) value);
      }
    }
    return bytes.array();
  }

  private static void classes(DataSet data, Path points, Path out) throws IOException {
    long start = System.nanoTime();
    AirModel air = AirModel.from(data);
    long n = Files.size(points) / (NUMBERS * Float.BYTES);
    try (DataInputStream in = new DataInputStream(Files.newInputStream(points));
        OutputStream stream = Files.newOutputStream(out)) {
      byte[] raw = new byte[PIECE * NUMBERS * Float.BYTES];
      for (long done = 0; done < n; done += PIECE) {
        int size = (int) Math.min(PIECE, n - done);
        in.readFully(raw, 0, size * NUMBERS * Float.BYTES);
        byte[] classes = new byte[size];
        IntStream.range(0, size)
            .parallel()
            .forEach(
                i ->
                    classes[i] =
                        (byte)
                            (air.glance(place(raw, i)).category(Metal.CARBON_STEEL).ordinal() + 1));
        stream.write(classes);
      }
    }
    System.out.printf(
        Locale.ROOT,
        "%d points in %.2f s, start of the machine not counted%n",
        n,
        (System.nanoTime() - start) / 1e9);
  }

  private static Place place(byte[] raw, int index) {
    ByteBuffer bytes =
        ByteBuffer.wrap(raw, index * NUMBERS * Float.BYTES, NUMBERS * Float.BYTES)
            .order(ByteOrder.LITTLE_ENDIAN);
    double[] head = take(bytes, HEAD);
    double[] shoreKm = take(bytes, SeaView.DIRECTIONS);
    double[] fetchKm = take(bytes, SeaView.DIRECTIONS);
    double[] salinity = take(bytes, SeaView.DIRECTIONS);
    int country = (int) head[7];
    return new Place(
        "",
        "",
        country == 0 ? "" : "" + (char) (country / 256) + (char) (country % 256),
        head[0],
        head[1],
        head[2],
        new SeaView(head[3], shoreKm, fetchKm, salinity),
        new Surroundings(head[4], head[5], head[6]),
        List.of());
  }

  private static double[] take(ByteBuffer bytes, int count) {
    double[] values = new double[count];
    for (int i = 0; i < count; i++) {
      values[i] = bytes.getFloat();
    }
    return values;
  }
}
