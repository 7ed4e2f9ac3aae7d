package saltspoke.sources;

import io.jhdf.HdfFile;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;

/**
 * Reads the binned netCDF-4 form of the Global Self-consistent Hierarchical High-resolution
 * Geography and closes its shoreline pieces to land polygons, bin by bin.
 *
 * <p>Format: GSHHG 2.3.7 (Wessel and Smith 1996, J. Geophys. Res. 101, 8741–8743), as the Generic
 * Mapping Tools store it: bins row by row from the north-west; points as unsigned 16-bit shares of
 * the bin's width from its south-west corner; per segment one integer holding (bits 0–2) the exit
 * side, (3–5) the entry side, (6–8) the level and (9–) the number of points, sides counted south,
 * east, north, west, 4 for a ring inside the bin; per bin the levels of its corners, three bits
 * each. Level 1 is land in the sea, 2 a lake, 3 land in a lake. All segments have land on the left.
 *
 * <p>Kept as land: level 1 (for Antarctica the ice front). Lakes are land, save the {@value
 * #CASPIAN_NAME}, which is sea with its own islands.
 */
final class GshhgBins {
  static final String CASPIAN_NAME = "Caspian";

  /**
   * The Caspian is the largest lake; its area in the file is 397,052 km². Any polygon of level 2
   * above this limit is taken for it (the next lake, with Michigan and Huron as one, has 208,200).
   */
  private static final double CASPIAN_LEAST_KM2 = 300_000;

  /** Box around the Caspian, degrees: bins in it without a shore and with lake corners are sea. */
  private static final double[] CASPIAN_BOX_WSEN_DEG = {46, 36, 56, 48};

  private static final int INSIDE = 4;

  /**
   * Land in one bin.
   *
   * @param westDeg west edge, −180..180
   * @param southDeg south edge
   * @param sizeDeg width and height
   * @param rings closed, counter-clockwise, as longitude and latitude in turn, first point repeated
   */
  record Bin(double westDeg, double southDeg, double sizeDeg, List<double[]> rings) {}

  private final int columns;
  private final int rows;
  private final double sizeDeg;
  private final int[] firstSegment;
  private final short[] segments;
  private final short[] cornerLevels;
  private final int[] info;
  private final int[] firstPoint;
  private final int[] polygon;
  private final short[] x;
  private final short[] y;
  private final boolean[] seaLake;
  private final int[] parent;

  GshhgBins(Path netcdf) throws IOException {
    try (HdfFile file = new HdfFile(netcdf)) {
      columns = ((int[]) data(file, "N_bins_in_360_longitude_range"))[0];
      rows = ((int[]) data(file, "N_bins_in_180_degree_latitude_range"))[0];
      sizeDeg = ((int[]) data(file, "Bin_size_in_minutes"))[0] / 60.0;
      firstSegment = (int[]) data(file, "Id_of_first_segment_in_a_bin");
      segments = (short[]) data(file, "N_segments_in_a_bin");
      cornerLevels = (short[]) data(file, "Embedded_node_levels_in_a_bin");
      info = (int[]) data(file, "Embedded_npts_levels_exit_entry_for_a_segment");
      firstPoint = (int[]) data(file, "Id_of_first_point_in_a_segment");
      polygon = (int[]) data(file, "Id_of_GSHHS_ID");
      x = (short[]) data(file, "Relative_longitude_from_SW_corner_of_bin");
      y = (short[]) data(file, "Relative_latitude_from_SW_corner_of_bin");
      parent = (int[]) data(file, "Id_of_parent_polygons");
      double[] areaKm2 = (double[]) data(file, "The_km_squared_area_of_polygons");
      seaLake = new boolean[areaKm2.length];
      for (int s = 0; s < info.length; s++) {
        if (level(s) == 2 && areaKm2[polygon[s]] > CASPIAN_LEAST_KM2) {
          seaLake[polygon[s]] = true;
        }
      }
    }
  }

  private static Object data(HdfFile file, String name) {
    return file.getDatasetByPath("/" + name).getData();
  }

  /** All bins that hold land, row by row from the north, west to east from the Greenwich line. */
  List<Bin> bins() {
    List<Bin> bins = new ArrayList<>();
    for (int row = 0; row < rows; row++) {
      for (int column = 0; column < columns; column++) {
        Bin bin = bin(row, column);
        if (!bin.rings().isEmpty()) {
          bins.add(bin);
        }
      }
    }
    return bins;
  }

  private Bin bin(int row, int column) {
    int id = row * columns + column;
    double west = column * sizeDeg;
    west = west >= 180 ? west - 360 : west;
    double south = 90 - (row + 1) * sizeDeg;
    List<double[]> rings = new ArrayList<>();
    List<double[]> open = new ArrayList<>();
    for (int s = firstSegment[id]; s < firstSegment[id] + segments[id]; s++) {
      if (isShore(s)) {
        double[] points = points(s, west, south);
        if ((info[s] & 7) == INSIDE) {
          rings.add(points);
        } else {
          open.add(points);
        }
      }
    }
    if (open.isEmpty()) {
      if (allLand(id, west, south)) {
        rings.add(0, square(west, south));
      }
    } else {
      rings.addAll(new BinAssembly(west, south, sizeDeg).close(open));
    }
    return new Bin(west, south, sizeDeg, rings);
  }

  private int level(int s) {
    return (info[s] >> 6) & 7;
  }

  private boolean isShore(int s) {
    int id = polygon[s];
    return switch (level(s)) {
      case 1 -> true;
      case 2 -> seaLake[id];
      case 3 -> parent[id] >= 0 && seaLake[parent[id]];
      default -> false;
    };
  }

  private double[] points(int s, double west, double south) {
    int n = info[s] >> 9;
    double[] points = new double[2 * n];
    for (int i = 0; i < n; i++) {
      points[2 * i] = west + Short.toUnsignedInt(x[firstPoint[s] + i]) / 65535.0 * sizeDeg;
      points[2 * i + 1] = south + Short.toUnsignedInt(y[firstPoint[s] + i]) / 65535.0 * sizeDeg;
    }
    return points;
  }

  private boolean allLand(int id, double west, double south) {
    int level = cornerLevels[id] & 7;
    boolean caspian =
        west >= CASPIAN_BOX_WSEN_DEG[0]
            && west < CASPIAN_BOX_WSEN_DEG[2]
            && south >= CASPIAN_BOX_WSEN_DEG[1]
            && south < CASPIAN_BOX_WSEN_DEG[3];
    return level == 1 || (level >= 2 && !caspian);
  }

  private double[] square(double west, double south) {
    double east = west + sizeDeg;
    double north = south + sizeDeg;
    return new double[] {west, south, east, south, east, north, west, north, west, south};
  }

  /** Joins pieces of shore that cross a bin to rings along the bin's edge. */
  private record BinAssembly(double west, double south, double size) {
    List<double[]> close(List<double[]> pieces) {
      List<double[]> byEntry = new ArrayList<>(pieces);
      byEntry.sort(Comparator.comparingDouble(p -> along(p[0], p[1])));
      double[] entries = byEntry.stream().mapToDouble(p -> along(p[0], p[1])).toArray();
      boolean[] used = new boolean[entries.length];
      List<double[]> rings = new ArrayList<>();
      for (int start = 0; start < entries.length; start++) {
        if (!used[start]) {
          rings.add(ring(byEntry, entries, used, start));
        }
      }
      return rings;
    }

    private double[] ring(List<double[]> pieces, double[] entries, boolean[] used, int start) {
      List<Double> ring = new ArrayList<>();
      int current = start;
      do {
        used[current] = true;
        double[] piece = pieces.get(current);
        for (double v : piece) {
          ring.add(v);
        }
        double exit = along(piece[piece.length - 2], piece[piece.length - 1]);
        int next = nextEntry(entries, used, exit, start);
        addCorners(ring, exit, entries[next]);
        current = next;
      } while (current != start);
      ring.add(ring.get(0));
      ring.add(ring.get(1));
      return ring.stream().mapToDouble(Double::doubleValue).toArray();
    }

    /**
     * The first entry counter-clockwise from an exit that is still free, or the ring's own start.
     */
    private static int nextEntry(double[] entries, boolean[] used, double exit, int start) {
      int from = Arrays.binarySearch(entries, exit);
      from = from < 0 ? -from - 1 : from;
      for (int i = 0; i < entries.length; i++) {
        int candidate = (from + i) % entries.length;
        if (candidate == start || !used[candidate]) {
          return candidate;
        }
      }
      return start;
    }

    private void addCorners(List<Double> ring, double exit, double entry) {
      double until = entry >= exit ? entry : entry + 4;
      for (int corner = (int) Math.floor(exit) + 1; corner < until; corner++) {
        int c = corner % 4;
        ring.add(c == 1 || c == 2 ? west + size : west);
        ring.add(c == 2 || c == 3 ? south + size : south);
      }
    }

    /** Place on the edge: 0..1 along the south, 1..2 east, 2..3 north (westwards), 3..4 west. */
    private double along(double lon, double lat) {
      double fromSouth = Math.abs(lat - south);
      double fromEast = Math.abs(lon - west - size);
      double fromNorth = Math.abs(south + size - lat);
      double fromWest = Math.abs(lon - west);
      double least = Math.min(Math.min(fromSouth, fromEast), Math.min(fromNorth, fromWest));
      if (least == fromSouth) {
        return (lon - west) / size;
      }
      if (least == fromEast) {
        return 1 + (lat - south) / size;
      }
      if (least == fromNorth) {
        return 2 + (west + size - lon) / size;
      }
      return 3 + (south + size - lat) / size;
    }
  }
}
