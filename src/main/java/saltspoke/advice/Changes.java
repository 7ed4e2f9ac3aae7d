package saltspoke.advice;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.function.Function;
import java.util.regex.Pattern;
import saltspoke.values.Note;
import saltspoke.values.Stopped;
import saltspoke.wheel.Catalogue;
import saltspoke.wheel.Pairing;
import saltspoke.wheel.RidingProfile;
import saltspoke.wheel.Rinsing;
import saltspoke.wheel.SaltedRoads;
import saltspoke.wheel.Storage;
import saltspoke.wheel.ThreadCompound;
import saltspoke.wheel.WheelBuild;

/** What one change of habit or part buys for the pairing in focus. */
final class Changes {
  /** A change: one other request, or one other pairing under the same one. */
  private record Option(String field, String value, String cost, AdviceRequest request) {}

  private static final Pattern CAPITAL = Pattern.compile("([A-Z])");

  private final Catalogue catalogue;
  private final AdviceRequest request;
  private final Function<AdviceRequest, Workshop> opener;

  Changes(Catalogue catalogue, AdviceRequest request, Function<AdviceRequest, Workshop> opener) {
    this.catalogue = catalogue;
    this.request = request;
    this.opener = opener;
  }

  /** All changes, those that buy most first. */
  List<Change> of(Case now, Workshop open, boolean south) {
    List<Change> found = new ArrayList<>();
    for (Option option : habits(south)) {
      Stopped.check();
      Case then = opener.apply(option.request()).of(now.pairing());
      found.add(change(option.field(), option.value(), option.cost(), now, then));
    }
    parts(now, open, found);
    found.sort(
        Comparator.comparingDouble(Change::factor)
            .reversed()
            .thenComparing(Change::field)
            .thenComparing(Change::value));
    return found;
  }

  private List<Option> habits(boolean south) {
    RidingProfile p = request.profile();
    List<Option> options = new ArrayList<>();
    for (Storage storage : Storage.values()) {
      if (storage != p.storage()) {
        add(options, "storage", storage.id(), "free", Profiled.storage(p, storage));
      }
    }
    for (Rinsing rinsing : Rinsing.values()) {
      if (rinsing != p.rinsing()) {
        add(options, "rinsing", rinsing.id(), "minutes", Profiled.rinsing(p, rinsing));
      }
    }
    boolean dried = !p.driedAfterWet();
    add(options, "driedAfterWet", yesNo(dried), "minutes", Profiled.dried(p, dried));
    boolean holes = !p.drainHoles();
    add(options, "drainHoles", yesNo(holes), "parts", Profiled.drained(p, holes));
    for (ThreadCompound compound : ThreadCompound.values()) {
      if (compound != p.threadCompound()) {
        add(options, "threadCompound", compound.id(), "rebuild", Profiled.compound(p, compound));
      }
    }
    if (p.saltedRoads() != SaltedRoads.NO && !p.months().isEmpty()) {
      add(options, "saltedRoads", "no", "free", Profiled.roads(p, SaltedRoads.NO));
    }
    if (p.saltedRoads() == SaltedRoads.NO && !p.months().isEmpty()) {
      add(options, "saltedRoads", "yes", "free", Profiled.roads(p, SaltedRoads.YES));
    }
    if (p.seaRideShare() > 0) {
      add(options, "seaRideShare", "0", "free", Profiled.awayFromSea(p));
    }
    if (p.wetRideShare() != 0 && !p.months().isEmpty()) {
      add(options, "wetRideShare", "0", "free", Profiled.neverWet(p));
    }
    RidingProfile noWinter = Profiled.noWinter(p, south);
    if (!noWinter.months().equals(p.months())) {
      add(options, "months", "no-winter", "free", noWinter);
    }
    WheelBuild b = request.build();
    WheelBuild tape =
        new WheelBuild(b.spokeCount(), b.tensionN(), !b.tapeSound(), b.hiddenNipples());
    options.add(new Option("tapeSound", yesNo(tape.tapeSound()), "parts", with(p, tape)));
    return options;
  }

  private void add(
      List<Option> options, String field, String value, String cost, RidingProfile profile) {
    options.add(new Option(field, value, cost, with(profile, request.build())));
  }

  private AdviceRequest with(RidingProfile profile, WheelBuild build) {
    return new AdviceRequest(
        profile,
        build,
        request.rim(),
        request.nipple(),
        request.between(),
        request.spoke(),
        request.risk(),
        request.buildMonth(),
        request.ageMonths(),
        request.lastFinding(),
        request.practiceLimits());
  }

  private void parts(Case now, Workshop open, List<Change> found) {
    Pairing p = now.pairing();
    for (Pairing other : catalogue.pairings()) {
      boolean rim = !other.rim().equals(p.rim());
      boolean nipple = !other.nipple().equals(p.nipple());
      boolean between = !other.between().equals(p.between());
      boolean spoke = !other.spoke().equals(p.spoke());
      int differences = (rim ? 1 : 0) + (nipple ? 1 : 0) + (between ? 1 : 0) + (spoke ? 1 : 0);
      if (differences != 1) {
        continue;
      }
      String field = rim ? "rim" : nipple ? "nipple" : between ? "interface" : "spoke";
      String value =
          rim ? other.rim() : nipple ? other.nipple() : between ? other.between() : other.spoke();
      found.add(change(field, value, "rebuild", now, open.of(other)));
    }
  }

  private static Change change(String field, String value, String cost, Case now, Case then) {
    Note what = Note.of("change-" + dashed(field), "value", value);
    return new Change(
        what,
        field,
        value,
        Answer.rounded(then.interval().firstMonths()),
        Answer.rounded(then.interval().everyMonths()),
        Answer.rounded(
            Math.max(then.interval().freeFirstMonths(), SiteTable.FIRST_MONTHS)
                / Math.max(now.interval().freeFirstMonths(), SiteTable.FIRST_MONTHS)),
        cost);
  }

  private static String dashed(String field) {
    return CAPITAL.matcher(field).replaceAll("-$1").toLowerCase(Locale.ROOT);
  }

  private static String yesNo(boolean value) {
    return value ? "yes" : "no";
  }
}
