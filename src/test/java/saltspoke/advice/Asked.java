package saltspoke.advice;

import java.util.Map;
import saltspoke.sources.CsvTable;
import saltspoke.wheel.Profiles;
import saltspoke.wheel.RidingProfile;
import saltspoke.wheel.WheelBuild;

/** Short ways to ask, for tests; limits of practice off. */
final class Asked {
  private Asked() {}

  static AdviceRequest of(RidingProfile profile, String... parts) {
    return new AdviceRequest(
        profile,
        WheelBuild.USUAL,
        part(parts, 0),
        part(parts, 1),
        part(parts, 2),
        part(parts, 3),
        RiskLevel.USUAL,
        10,
        0,
        Finding.NOT_LOOKED,
        false);
  }

  static AdviceRequest inService(AdviceRequest r, double ageMonths, Finding finding) {
    return new AdviceRequest(
        r.profile(),
        r.build(),
        r.rim(),
        r.nipple(),
        r.between(),
        r.spoke(),
        r.risk(),
        r.buildMonth(),
        ageMonths,
        finding,
        r.practiceLimits());
  }

  static AdviceRequest at(AdviceRequest r, RiskLevel risk, boolean practiceLimits) {
    return new AdviceRequest(
        r.profile(),
        r.build(),
        r.rim(),
        r.nipple(),
        r.between(),
        r.spoke(),
        risk,
        r.buildMonth(),
        r.ageMonths(),
        r.lastFinding(),
        practiceLimits);
  }

  static AdviceRequest built(AdviceRequest r, WheelBuild build) {
    return new AdviceRequest(
        r.profile(),
        build,
        r.rim(),
        r.nipple(),
        r.between(),
        r.spoke(),
        r.risk(),
        r.buildMonth(),
        r.ageMonths(),
        r.lastFinding(),
        r.practiceLimits());
  }

  static RidingProfile ready(String name) {
    return Profiles.shipped().get(name);
  }

  /** Riders of the trade cases. */
  static RidingProfile rider(String name) {
    String path = "/saltspoke/wheel/trade-profiles.csv";
    return Profiles.from(CsvTable.read(Asked.class.getResourceAsStream(path), path)).get(name);
  }

  static Map<String, saltspoke.atmosphere.AirClimate> climates() {
    return TestClimates.all();
  }

  private static String part(String[] parts, int i) {
    return parts.length > i ? parts[i] : null;
  }
}
