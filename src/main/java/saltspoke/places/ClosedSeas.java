package saltspoke.places;

import java.util.List;
import saltspoke.sources.CsvTable;

/**
 * Salinity of seas that are much fresher than the ocean, as a ratio to it. Boxes with their sources
 * stand in {@code closed-seas.csv}; the first that holds a point counts, and outside all the ratio
 * is 1.
 */
final class ClosedSeas {
  private static final String FILE = "closed-seas.csv";

  private record Box(double west, double south, double east, double north, double ratio) {}

  private final List<Box> boxes =
      CsvTable.read(ClosedSeas.class.getResourceAsStream(FILE), FILE).stream()
          .map(
              row ->
                  new Box(
                      row.number("west_deg"),
                      row.number("south_deg"),
                      row.number("east_deg"),
                      row.number("north_deg"),
                      row.number("salinity_ratio")))
          .toList();

  double ratioAt(double latitudeDeg, double longitudeDeg) {
    for (Box box : boxes) {
      if (longitudeDeg >= box.west
          && longitudeDeg <= box.east
          && latitudeDeg >= box.south
          && latitudeDeg <= box.north) {
        return box.ratio;
      }
    }
    return 1;
  }
}
