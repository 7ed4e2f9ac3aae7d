package saltspoke.wheel.rim;

import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import saltspoke.atmosphere.AirClimate;
import saltspoke.values.Note;
import saltspoke.wheel.RidingProfile;
import saltspoke.wheel.SaltedRoads;
import saltspoke.wheel.Storage;
import saltspoke.wheel.ThinFilm;
import saltspoke.wheel.WheelBuild;
import saltspoke.wheel.WheelYear;

/** What a person should know about how the wheel's weather was found. */
final class WeatherFlags {
  /** Salt that takes longer than this to settle is worth a word, years. */
  private static final double SLOW_YEARS = 2;

  /** A cavity with water for more of the month than this counts as never dry. */
  private static final double NEVER_DRY_SHARE = 0.95;

  private WeatherFlags() {}

  static List<Note> of(
      AirClimate air,
      RidingProfile profile,
      WheelBuild build,
      RideMonth[] rides,
      WaterStore water,
      SaltStore salt,
      List<WheelYear.Month> months) {
    List<Note> flags = new ArrayList<>();
    double rideHours = 0;
    double wetHours = 0;
    double rinses = 0;
    for (RideMonth month : rides) {
      rideHours += month.rideHours();
      wetHours += month.wetRideHours();
      rinses += month.rinses();
    }
    if (profile.wetRideShare() < 0 && rideHours > 0) {
      flags.add(
          Note.of(
              "wheel-wet-share-from-climate", "percent", Math.rint(100 * wetHours / rideHours)));
    }
    boolean saltedHere =
        air.roadSalt().months().stream().anyMatch(month -> month.saltOnRoadGPerM2() > 0);
    if (profile.saltedRoads() == SaltedRoads.YES && !saltedHere) {
      flags.add(Note.of("wheel-salted-against-climate"));
    }
    if (profile.saltedRoads() == SaltedRoads.NO && saltedHere && rideHours > 0) {
      flags.add(Note.of("wheel-unsalted-against-climate"));
    }
    int neverDry = 0;
    for (double share : water.wetShare) {
      neverDry += share > NEVER_DRY_SHARE ? 1 : 0;
    }
    if (neverDry > 0) {
      flags.add(Note.of("wheel-cavity-never-dry", "months", neverDry));
    }
    if (rinses > 0 && !profile.drainHoles()) {
      flags.add(
          Note.of(
              "wheel-rinse-without-drain",
              "gramsPerYear",
              Math.rint(rinses * RimAssumption.INGRESS_G_PER_RINSE.median())));
    }
    if (!build.tapeSound()) {
      flags.add(Note.of("wheel-tape-leaks"));
    }
    if (salt.settlingYears > SLOW_YEARS) {
      flags.add(Note.of("wheel-salt-settles-slowly", "years", Math.rint(salt.settlingYears)));
    }
    if (profile.storage() == Storage.HEATED_ROOM
        && air.annual().temperatureC() > RimAssumption.ROOM_C.median()) {
      flags.add(Note.of("wheel-room-not-heated"));
    }
    flags.addAll(filmFlags(months));
    return flags;
  }

  /** The films' own flags, each once, for the film that lies there longest of those it concerns. */
  private static Collection<Note> filmFlags(List<WheelYear.Month> months) {
    Map<String, Note> flags = new TreeMap<>();
    Map<String, Double> longest = new TreeMap<>();
    for (WheelYear.Month month : months) {
      for (WheelYear.FilmHours film : month.films()) {
        for (Note note : ThinFilm.flags(film.film())) {
          if (film.hours() > longest.getOrDefault(note.code(), 0.0)) {
            longest.put(note.code(), film.hours());
            flags.put(note.code(), note);
          }
        }
      }
    }
    return flags.values();
  }
}
