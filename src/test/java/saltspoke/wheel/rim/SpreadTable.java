package saltspoke.wheel.rim;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import saltspoke.atmosphere.AirClimate;
import saltspoke.wheel.Profiles;
import saltspoke.wheel.RidingProfile;
import saltspoke.wheel.Rinsing;
import saltspoke.wheel.SaltedRoads;
import saltspoke.wheel.Storage;
import saltspoke.wheel.WheelBuild;
import saltspoke.wheel.WheelYear;

/**
 * Prints what each assumption moves: half the change of ln(wet hours) and of ln(salt) between its
 * 16 % and 84 % values, and the root of their squares' sum, for the ready profiles in the invented
 * climates; then what salt on the road adds to the wet hours in a shed.
 */
public final class SpreadTable {
  private SpreadTable() {}

  private record Move(String id, double wet, double salt) {}

  public static void main(String[] args) {
    InventedClimates.all()
        .forEach(
            (name, air) -> {
              for (RidingProfile profile : Profiles.shipped().all()) {
                line(name, air, profile);
              }
            });
    InventedClimates.all()
        .forEach(
            (name, air) -> {
              double with = WheelWeatherTest.wetHours(shed(air, SaltedRoads.YES));
              double without = WheelWeatherTest.wetHours(shed(air, SaltedRoads.NO));
              System.out.printf(
                  "shed %s: salted %.0f h, unsalted %.0f h, factor %.2f%n",
                  name, with, without, with / without);
            });
  }

  private static WheelYear shed(AirClimate air, SaltedRoads salted) {
    return WheelWeather.over(
        air,
        WheelWeatherTest.profile(6, -1, salted, Storage.UNHEATED_SHED, Rinsing.NEVER, false),
        WheelBuild.USUAL);
  }

  private static void line(String name, AirClimate air, RidingProfile profile) {
    List<Move> moves = new ArrayList<>();
    double wet2 = 0;
    double salt2 = 0;
    for (RimAssumption assumption : RimAssumption.values()) {
      WheelYear low = shifted(air, profile, assumption, -1);
      WheelYear high = shifted(air, profile, assumption, 1);
      double wet = half(WheelWeatherTest.wetHours(high), WheelWeatherTest.wetHours(low));
      double salt = half(WheelWeatherTest.meanSalt(high), WheelWeatherTest.meanSalt(low));
      moves.add(new Move(assumption.id(), wet, salt));
      wet2 += wet * wet;
      salt2 += salt * salt;
    }
    StringBuilder top = new StringBuilder();
    moves.sort(Comparator.comparingDouble(m -> -Math.abs(m.wet())));
    moves.stream().limit(4).forEach(m -> top.append(text(m.id(), m.wet())));
    top.append("| salt:");
    moves.sort(Comparator.comparingDouble(m -> -Math.abs(m.salt())));
    moves.stream().limit(4).forEach(m -> top.append(text(m.id(), m.salt())));
    System.out.printf(
        "%s %s: ln wet %.2f, ln salt %.2f; wet:%s%n",
        name, profile.name(), Math.sqrt(wet2), Math.sqrt(salt2), top);
  }

  private static String text(String id, double move) {
    return String.format(" %s %+.2f", id, move);
  }

  private static WheelYear shifted(
      AirClimate air, RidingProfile profile, RimAssumption assumption, double z) {
    return WheelWeather.over(
        air, profile, WheelBuild.USUAL, RimAssumptions.MEDIAN.shifted(assumption, z));
  }

  private static double half(double high, double low) {
    return 0.5 * Math.log(Math.max(1e-9, high) / Math.max(1e-9, low));
  }
}
