package saltspoke.places;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.DoubleStream;
import net.sf.geographiclib.Geodesic;
import net.sf.geographiclib.GeodesicData;
import saltspoke.fields.DataSet;
import saltspoke.fields.FieldStack;
import saltspoke.values.Note;
import saltspoke.values.Refusal;

/** Puts a place together: moved to the shore where need be, its elevation, sea and surroundings. */
final class PlaceAssembly {
  /** Towns within this distance lend a bare point their country and region, km. */
  private static final double NAMING_REACH_KM = 150;

  /**
   * ASSUMPTION: a town's elevation within this distance, km, is nearer the truth than a grid of
   * some 10 km. No source; 2–5 km would serve as well.
   */
  private static final double TOWN_ELEVATION_REACH_KM = 3;

  /** Looked at first, so that a cold question rarely unpacks a second tile of towns, km. */
  private static final double FIRST_REACH_KM = 25;

  /** A point moved to the shore is set this far inland, km, so that it lies on land. */
  private static final double INLAND_KM = 0.03;

  /** Reaches of the two counts of people in {@link Surroundings}, km. */
  private static final double NARROW_KM = 5;

  private static final double WIDE_KM = 25;

  private final DataSet data;
  private final Gazetteer gazetteer;
  private final Coast coast;

  PlaceAssembly(DataSet data, Gazetteer gazetteer, Coast coast) {
    this.data = data;
    this.gazetteer = gazetteer;
    this.coast = coast;
  }

  private record Point(double latitudeDeg, double longitudeDeg) {}

  private record Named(String name, String regionName, String countryCode) {}

  /** A place with a name; where the coast map has water, the town is believed. */
  Place named(
      String name,
      String regionName,
      String countryCode,
      double latitudeDeg,
      double longitudeDeg,
      OptionalDouble elevationM,
      PlaceOverrides overrides,
      List<Note> flags) {
    Point point = new Point(latitudeDeg, longitudeDeg);
    if (!coast.isLand(latitudeDeg, longitudeDeg)) {
      Coast.Shore shore = coast.nearest(latitudeDeg, longitudeDeg);
      if (shore.distanceKm() <= PlaceDirectory.SHORE_REACH_KM) {
        point = movedTo(shore, flags);
      } else {
        flags.add(Note.of("place-missing-from-coast", "distanceKm", shore.distanceKm()));
      }
    }
    return finish(new Named(name, regionName, countryCode), point, elevationM, overrides, flags);
  }

  Place at(double latitudeDeg, double longitudeDeg, PlaceOverrides overrides) {
    List<Note> flags = new ArrayList<>();
    Point point = new Point(latitudeDeg, longitudeDeg);
    if (!coast.isLand(latitudeDeg, longitudeDeg)) {
      Coast.Shore shore = coast.nearest(latitudeDeg, longitudeDeg);
      if (shore.distanceKm() <= PlaceDirectory.SHORE_REACH_KM) {
        point = movedTo(shore, flags);
      } else if (nearestTown(point, PlaceDirectory.SHORE_REACH_KM).isPresent()) {
        flags.add(Note.of("place-missing-from-coast", "distanceKm", shore.distanceKm()));
      } else {
        throw new Refusal(
            Refusal.Kind.OUT_OF_RANGE,
            "at-sea",
            "at",
            String.format(
                Locale.ROOT,
                "%s,%s, %.1f km from land",
                latitudeDeg,
                longitudeDeg,
                shore.distanceKm()),
            "a point on land, or at most 2 km off the shore");
      }
    }
    Named named =
        nearestTown(point, NAMING_REACH_KM)
            .map(gazetteer::hit)
            .map(hit -> new Named("", hit.regionName(), hit.countryCode()))
            .orElse(new Named("", "", ""));
    return finish(named, point, OptionalDouble.empty(), overrides, flags);
  }

  /** See {@link PlaceDirectory#landBeside}. */
  Optional<double[]> landBeside(
      double latitudeDeg, double longitudeDeg, double reachKm, double inlandKm) {
    Coast.Shore shore = coast.nearest(latitudeDeg, longitudeDeg);
    if (shore.distanceKm() > reachKm) {
      return Optional.empty();
    }
    return DoubleStream.of(inlandKm, inlandKm / 4, INLAND_KM)
        .mapToObj(km -> behind(shore, km))
        .filter(point -> coast.isLand(point.latitudeDeg, point.longitudeDeg))
        .map(point -> new double[] {point.latitudeDeg, point.longitudeDeg})
        .findFirst();
  }

  private Point movedTo(Coast.Shore shore, List<Note> flags) {
    flags.add(Note.of("place-moved-to-shore", "distanceKm", shore.distanceKm()));
    return behind(shore, INLAND_KM);
  }

  private static Point behind(Coast.Shore shore, double km) {
    GeodesicData inland =
        Geodesic.WGS84.Direct(
            shore.latitudeDeg(), shore.longitudeDeg(), shore.azimuthDeg(), km * 1000);
    return new Point(inland.lat2, inland.lon2);
  }

  private Place finish(
      Named named,
      Point point,
      OptionalDouble elevationM,
      PlaceOverrides overrides,
      List<Note> flags) {
    double height = elevation(point, elevationM, overrides, flags);
    SeaView sea = coast.view(point.latitudeDeg, point.longitudeDeg);
    if (overrides.seaDistanceKm().isPresent()) {
      double given = overrides.seaDistanceKm().getAsDouble();
      flags.add(Note.of("place-sea-distance-given", "givenKm", given, "mapKm", sea.distanceKm()));
      sea = sea.movedTo(given);
    }
    return new Place(
        named.name,
        named.regionName,
        named.countryCode,
        point.latitudeDeg,
        point.longitudeDeg,
        height,
        sea,
        surroundings(point),
        flags);
  }

  private double elevation(
      Point point, OptionalDouble known, PlaceOverrides overrides, List<Note> flags) {
    if (overrides.elevationM().isPresent()) {
      return overrides.elevationM().getAsDouble();
    }
    if (known.isPresent()) {
      return known.getAsDouble();
    }
    Optional<Gazetteer.Town> town =
        nearestTown(point, TOWN_ELEVATION_REACH_KM).filter(t -> t.elevationM().isPresent());
    if (town.isPresent()) {
      flags.add(Note.of("place-elevation-from-town", "town", town.get().name()));
      return town.get().elevationM().getAsDouble();
    }
    FieldStack grid = data.stack("elevation");
    double height = grid.sample(0, point.latitudeDeg, point.longitudeDeg);
    flags.add(Note.of("place-elevation-from-grid", "stepDeg", grid.band(0).grid().stepLatDeg()));
    return Double.isNaN(height) ? 0 : height;
  }

  private Surroundings surroundings(Point point) {
    double within5 = 0;
    double within25 = 0;
    for (Gazetteer.Town town : gazetteer.near(point.latitudeDeg, point.longitudeDeg, WIDE_KM)) {
      within25 += town.population();
      if (Gazetteer.distanceKm(town, point.latitudeDeg, point.longitudeDeg) <= NARROW_KM) {
        within5 += town.population();
      }
    }
    double light = data.stack("night-lights").sample(0, point.latitudeDeg, point.longitudeDeg);
    return new Surroundings(within5, within25, Double.isNaN(light) ? 0 : light);
  }

  private Optional<Gazetteer.Town> nearestTown(Point point, double reachKm) {
    List<Gazetteer.Town> towns =
        gazetteer.near(point.latitudeDeg, point.longitudeDeg, Math.min(reachKm, FIRST_REACH_KM));
    if (towns.isEmpty() && reachKm > FIRST_REACH_KM) {
      towns = gazetteer.near(point.latitudeDeg, point.longitudeDeg, reachKm);
    }
    return towns.stream()
        .min(
            Comparator.comparingDouble(
                t -> Gazetteer.distanceKm(t, point.latitudeDeg, point.longitudeDeg)));
  }
}
