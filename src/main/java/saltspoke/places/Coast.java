package saltspoke.places;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import net.sf.geographiclib.Geodesic;
import net.sf.geographiclib.GeodesicData;
import net.sf.geographiclib.GeodesicMask;
import saltspoke.fields.DataSet;
import saltspoke.values.Kept;

/**
 * The coast of the world: which points are land, how far the nearest shore is, and what the sea
 * looks like from a place. Near the place the fine coast decides (about 0.2 km), beyond {@value
 * #FINE_M} m the coarse one (1.2 km).
 */
final class Coast {
  /** Within this distance the fine coast is used, m. */
  private static final double FINE_M = 40_000;

  /** Error of the coarse coast with some room, m. */
  private static final double COARSE_ERROR_M = 4_000;

  /** Coast beyond this is never seen, m. */
  private static final double HORIZON_M = SeaRays.SHORE_LIMIT_M + SeaRays.FETCH_LIMIT_M;

  /** Water this far beyond the shore, at most, tells which sea it is, km. */
  private static final double SEA_SAMPLE_KM = 20;

  /**
   * A shore point.
   *
   * @param distanceKm geodesic distance
   * @param azimuthDeg direction towards it, clockwise from north
   */
  record Shore(double latitudeDeg, double longitudeDeg, double distanceKm, double azimuthDeg) {}

  /**
   * The bins of one tile.
   *
   * @param bytes about as much memory as they take once parsed: a vertex has some 20 characters in
   *     the table and 20 bytes as numbers
   */
  private record FineTile(Map<Integer, CoastBin> bins, long bytes) {}

  private final TiledTable fineTable;
  private final DataSet data;

  /** Tiles in use, within a quarter of the heap: the whole world's where there is room. */
  private final Kept<Integer, FineTile> fineTiles =
      new Kept<>(Runtime.getRuntime().maxMemory() / 4, FineTile::bytes);

  private final ClosedSeas closedSeas = new ClosedSeas();
  private volatile CoarseCoast coarse;

  Coast(DataSet data) {
    this.data = data;
    this.fineTable = new TiledTable(data, "coast-fine");
  }

  boolean isLand(double latitudeDeg, double longitudeDeg) {
    double lon = longitudeDeg >= 180 ? longitudeDeg - 360 : longitudeDeg;
    CoastBin bin = fineBin(CoastBin.keyOf(latitudeDeg, lon), TiledTable.tileOf(latitudeDeg, lon));
    return bin != null && bin.contains(latitudeDeg, lon);
  }

  /** The nearest shore in any direction, seen from land or from the sea. */
  Shore nearest(double latitudeDeg, double longitudeDeg) {
    Vantage from = new Vantage(latitudeDeg, longitudeDeg);
    NearestShore search = new NearestShore(from);
    search.offer(coarse().from(latitudeDeg, longitudeDeg));
    if (search.bestM() < FINE_M + COARSE_ERROR_M) {
      double reach = search.bestM() + COARSE_ERROR_M;
      NearestShore fine = new NearestShore(from);
      fine.offer(fineBins(latitudeDeg, longitudeDeg, reach));
      search = fine;
    } else {
      NearestShore fine = new NearestShore(from);
      fine.offer(fineBins(search.latitudeDeg(), search.longitudeDeg(), COARSE_ERROR_M));
      if (fine.bestM() < search.bestM() + COARSE_ERROR_M) {
        search = fine;
      }
    }
    GeodesicData line =
        Geodesic.WGS84.Inverse(
            latitudeDeg,
            longitudeDeg,
            search.latitudeDeg(),
            search.longitudeDeg(),
            GeodesicMask.DISTANCE | GeodesicMask.AZIMUTH);
    return new Shore(
        search.latitudeDeg(), search.longitudeDeg(), line.s12 / 1000, (line.azi1 + 360) % 360);
  }

  /** The sea as seen from a place, by the geodesic distance and 36 rays. */
  SeaView view(double latitudeDeg, double longitudeDeg) {
    boolean land = isLand(latitudeDeg, longitudeDeg);
    double distanceKm = land ? nearest(latitudeDeg, longitudeDeg).distanceKm() : 0;
    SeaRays rays = rays(latitudeDeg, longitudeDeg, distanceKm);
    double[] shoreKm = new double[SeaView.DIRECTIONS];
    double[] fetchKm = new double[SeaView.DIRECTIONS];
    double[] salinityRatio = new double[SeaView.DIRECTIONS];
    for (int k = 0; k < SeaView.DIRECTIONS; k++) {
      double[] water = rays.openWater(k, land);
      if (water == null) {
        shoreKm[k] = Double.POSITIVE_INFINITY;
      } else {
        shoreKm[k] = water[0] / 1000;
        fetchKm[k] = (water[1] - water[0]) / 1000;
        salinityRatio[k] =
            salinity(latitudeDeg, longitudeDeg, 10 * k, shoreKm[k] + seaSampleKm(fetchKm[k]));
      }
    }
    return new SeaView(distanceKm, shoreKm, fetchKm, salinityRatio);
  }

  private static double seaSampleKm(double fetchKm) {
    return Math.min(fetchKm / 2, SEA_SAMPLE_KM);
  }

  private SeaRays rays(double latitudeDeg, double longitudeDeg, double distanceKm) {
    Vantage from = new Vantage(latitudeDeg, longitudeDeg);
    SeaRays rays = new SeaRays(from);
    double fineM = 0;
    if (distanceKm * 1000 < FINE_M) {
      fineM = FINE_M;
      for (CoastBin bin : fineBins(latitudeDeg, longitudeDeg, FINE_M)) {
        rays.add(bin.shape(), 0, FINE_M);
      }
    }
    double chord = Vantage.chordOfArcM(HORIZON_M);
    CoarseCoast.Order order = coarse().from(latitudeDeg, longitudeDeg);
    for (int b = 0; b < order.bins().length && order.leastM()[b] < chord; b++) {
      if (order.bins()[b].leastM(from) < chord) {
        rays.add(order.bins()[b].shape(), fineM, HORIZON_M);
      }
    }
    return rays;
  }

  private double salinity(double latitudeDeg, double longitudeDeg, double azimuthDeg, double km) {
    double phi = Math.toRadians(latitudeDeg);
    double arc = km * 1000 / Vantage.MEAN_RADIUS_M;
    double azimuth = Math.toRadians(azimuthDeg);
    double sin = Math.sin(phi) * Math.cos(arc) + Math.cos(phi) * Math.sin(arc) * Math.cos(azimuth);
    double lon =
        longitudeDeg
            + Math.toDegrees(
                Math.atan2(
                    Math.sin(azimuth) * Math.sin(arc) * Math.cos(phi),
                    Math.cos(arc) - Math.sin(phi) * sin));
    double wrapped = lon - 360 * Math.floor((lon + 180) / 360);
    return closedSeas.ratioAt(Math.toDegrees(Vantage.arcSine(sin)), wrapped);
  }

  private CoarseCoast coarse() {
    if (coarse == null) {
      readCoarse();
    }
    return coarse;
  }

  private synchronized void readCoarse() {
    if (coarse != null) {
      return;
    }
    List<CoastBin> bins = new ArrayList<>();
    new TiledTable(data, "coast-coarse")
        .all(
            line -> {
              // A row without a fraction is a whole bin of land and has no coast.
              if (line.indexOf('.') >= 0) {
                bins.add(CoastBin.parse(line));
              }
            });
    coarse = new CoarseCoast(bins, Vantage.chordOfArcM(HORIZON_M));
  }

  private CoastBin fineBin(int key, int tile) {
    return fineTiles.get(tile, this::readTile).bins().get(key);
  }

  private FineTile readTile(int tile) {
    Map<Integer, CoastBin> bins = new HashMap<>();
    long[] bytes = {0};
    fineTable.tile(
        tile,
        line -> {
          CoastBin bin = CoastBin.parse(line);
          bins.put(bin.key(), bin);
          bytes[0] += line.length();
        });
    return new FineTile(bins, bytes[0]);
  }

  private List<CoastBin> fineBins(double latitudeDeg, double longitudeDeg, double reachM) {
    double high = Math.toDegrees(reachM / Vantage.MEAN_RADIUS_M) + 0.01;
    double south = Math.max(-90, latitudeDeg - high);
    double north = Math.min(90, latitudeDeg + high);
    double most = Math.max(Math.abs(south), Math.abs(north));
    double wide = most > 89 ? 180 : Math.min(180, high / Math.cos(Math.toRadians(most)));
    int columns = wide >= 179 ? 180 : columnsBetween(longitudeDeg - wide, longitudeDeg + wide);
    List<CoastBin> bins = new ArrayList<>();
    for (double lat = floorToBin(south); lat <= Math.min(north, 89.9); lat += CoastBin.SIZE_DEG) {
      for (int c = 0; c < columns; c++) {
        double lon = floorToBin(longitudeDeg - wide) + c * (double) CoastBin.SIZE_DEG;
        CoastBin bin = fineBin(CoastBin.keyOf(lat, lon), TiledTable.tileOf(lat, lon));
        if (bin != null) {
          bins.add(bin);
        }
      }
    }
    return bins;
  }

  private static int columnsBetween(double westDeg, double eastDeg) {
    return Math.min(
        180, (int) ((floorToBin(eastDeg) - floorToBin(westDeg)) / CoastBin.SIZE_DEG) + 1);
  }

  private static double floorToBin(double deg) {
    return Math.floor(deg / CoastBin.SIZE_DEG) * CoastBin.SIZE_DEG;
  }
}
