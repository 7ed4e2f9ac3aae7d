package saltspoke.wheel.rim;

import saltspoke.atmosphere.AirClimate;
import saltspoke.wheel.Profiles;
import saltspoke.wheel.RidingProfile;
import saltspoke.wheel.WheelBuild;
import saltspoke.wheel.WheelYear;

/** Prints wet hours, salt and water for the six ready profiles in six invented climates. */
public final class WorkedTable {
  private WorkedTable() {}

  public static void main(String[] args) {
    System.out.println("climate,profile,wetHours,saltGClPerM2,waterG,saltedWetRides,films,meanUm");
    InventedClimates.all()
        .forEach(
            (name, air) -> {
              for (RidingProfile profile : Profiles.shipped().all()) {
                line(name, air, profile);
              }
            });
  }

  private static void line(String name, AirClimate air, RidingProfile profile) {
    WheelYear year = WheelWeather.over(air, profile, WheelBuild.USUAL);
    double wet = 0;
    double salt = 0;
    double water = 0;
    double rides = 0;
    double filmHours = 0;
    int films = 0;
    for (WheelYear.Month month : year.months()) {
      wet += month.wetHours();
      salt += month.salt().totalMgClPerM2() / 12000;
      water += month.waterG() / 12;
      rides += month.saltedWetRides();
      films = Math.max(films, month.films().size());
      for (WheelYear.FilmHours film : month.films()) {
        filmHours += film.hours() * film.film().thicknessUm();
      }
    }
    System.out.printf(
        "%s,%s,%.0f,%.3f,%.2f,%.0f,%d,%.1f%n",
        name, profile.name(), wet, salt, water, rides, films, wet > 0 ? filmHours / wet : 0);
  }
}
