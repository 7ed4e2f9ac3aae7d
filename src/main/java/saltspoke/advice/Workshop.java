package saltspoke.advice;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;
import saltspoke.atmosphere.AirClimate;
import saltspoke.wheel.Catalogue;
import saltspoke.wheel.Pairing;
import saltspoke.wheel.RidingProfile;
import saltspoke.wheel.WheelBuild;
import saltspoke.wheel.WheelYear;
import saltspoke.wheel.damage.CellRates;
import saltspoke.wheel.damage.Parts;
import saltspoke.wheel.damage.Site;
import saltspoke.wheel.damage.Sites;

/**
 * Works out pairings under one air, one profile and one build; what pairings share is worked out
 * once. Serves one thread.
 */
final class Workshop {
  private final Catalogue catalogue;
  private final AdviceRequest request;
  private final WheelYear year;
  private final Sites sites;
  private final Draws draws;
  private final double scatter;
  private final WorstOf worst;
  private final Repeats repeats;
  private final Map<Site, SiteRisk> ready = new IdentityHashMap<>();
  private final Map<List<SiteRisk>, Fate> fates = new HashMap<>();
  private final Map<Pairing, Case> worked = new HashMap<>();

  Workshop(
      Catalogue catalogue,
      AirClimate air,
      AdviceRequest request,
      WheelYears weather,
      CellRates rates,
      Draws draws,
      double scatter) {
    this.catalogue = catalogue;
    this.request = request;
    this.draws = draws;
    this.scatter = scatter;
    RidingProfile profile = request.profile();
    WheelBuild build = request.build();
    this.year = weather.over(air, profile, build);
    this.sites = new Sites(air, profile, build, request.buildMonth(), year, rates);
    this.worst = draws.worstOf(build.spokeCount());
    this.repeats = new Repeats(RiskLimits.of(request.risk()), worst);
  }

  WheelYear year() {
    return year;
  }

  /** The pairing with its chances and its interval. */
  Case of(Pairing pairing) {
    return worked.computeIfAbsent(pairing, this::workOut);
  }

  private Case workOut(Pairing pairing) {
    Parts parts =
        new Parts(
            catalogue.rim(pairing.rim()),
            catalogue.nipple(pairing.nipple()),
            catalogue.between(pairing.between()),
            catalogue.spoke(pairing.spoke()));
    List<SiteRisk> found = new ArrayList<>();
    for (Site site : sites.of(parts)) {
      found.add(ready.computeIfAbsent(site, s -> new SiteRisk(s, draws, scatter)));
    }
    Fate fate = fates.computeIfAbsent(found, f -> new Fate(f, worst, repeats, request));
    return new Case(pairing, parts, fate);
  }
}
