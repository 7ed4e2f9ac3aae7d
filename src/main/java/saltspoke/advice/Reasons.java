package saltspoke.advice;

import java.util.ArrayList;
import java.util.List;
import saltspoke.values.Note;
import saltspoke.wheel.Material;
import saltspoke.wheel.Nipple;
import saltspoke.wheel.Sealant;
import saltspoke.wheel.WheelYear;
import saltspoke.wheel.damage.Site;

/** Why an interval is what it is, and what else a mechanic should know of a pairing. */
final class Reasons {
  private Reasons() {}

  static List<Note> of(Case worked, AdviceRequest request) {
    List<Note> notes = new ArrayList<>();
    Interval interval = worked.interval();
    if (interval.freeFirstMonths() <= 0) {
      notes.add(Note.of("advice-look-now"));
    }
    if (request.lastFinding() == Finding.ONE_STIFF) {
      notes.add(Note.of("advice-seized-already"));
    }
    if (worked.fate().surprising()) {
      notes.add(Note.of("advice-finding-unexpected"));
    }
    limit(worked, interval, notes);
    practice(interval, request, notes);
    cause(worked, notes);
    Nipple nipple = worked.parts().nipple();
    if (nipple.material() == Material.POLYMER) {
      notes.add(Note.of("advice-polymer-not-modelled"));
    }
    if (nipple.gallsOnSpoke()) {
      notes.add(Note.of("advice-galling", "nipple", nipple.id()));
    }
    if (nipple.cracksInAmmonia() && request.profile().sealant() == Sealant.AMMONIATED) {
      notes.add(Note.of("advice-ammonia-cracking"));
    }
    double stressMpa = nipple.coreStressMpa(request.build().tensionN());
    if (nipple.stressCorrosionMpa().isPresent()
        && stressMpa > nipple.stressCorrosionMpa().getAsDouble()
        && worked.leader(State.ATTACKED) != null) {
      notes.add(
          Note.of(
              "advice-stress-corrosion",
              "stressMpa",
              (int) Math.rint(stressMpa),
              "thresholdMpa",
              (int) Math.rint(nipple.stressCorrosionMpa().getAsDouble())));
    }
    return notes;
  }

  private static void limit(Case worked, Interval interval, List<Note> notes) {
    Site limiting = worked.limiting();
    boolean wears = worked.leader(State.SEIZED) != null || worked.leader(State.LOST) != null;
    if (limiting == null || !wears) {
      notes.add(Note.of("advice-nothing-corrodes"));
    } else if (interval.freeFirstMonths() >= RiskLimits.HORIZON_MONTHS) {
      notes.add(Note.of("advice-beyond-horizon", "months", (int) RiskLimits.HORIZON_MONTHS));
    } else {
      boolean seized = !interval.limitedBy().equals("head-loss-risk");
      notes.add(
          Note.of(
              seized ? "advice-seized-risk" : "advice-head-loss-risk",
              "months",
              Answer.rounded(interval.freeFirstMonths()),
              "part",
              limiting.part()));
    }
    if (interval.everyLimitedBy().equals("warning-time")) {
      notes.add(
          Note.of("advice-warning-time", "months", Answer.rounded(2 * interval.freeEveryMonths())));
    }
  }

  private static void practice(Interval interval, AdviceRequest request, List<Note> notes) {
    if (!request.practiceLimits()) {
      return;
    }
    if (interval.firstMonths() < interval.freeFirstMonths()) {
      notes.add(
          Note.of(
              "advice-practice-upper",
              "months",
              (int) RiskLimits.PRACTICE_MOST_MONTHS,
              "free",
              Answer.rounded(interval.freeFirstMonths())));
    }
    if (interval.firstMonths() > interval.freeFirstMonths()) {
      notes.add(
          Note.of(
              "advice-practice-lower",
              "months",
              (int) RiskLimits.PRACTICE_LEAST_MONTHS,
              "free",
              Answer.rounded(interval.freeFirstMonths())));
    }
  }

  private static void cause(Case worked, List<Note> notes) {
    Site limiting = worked.limiting();
    if (limiting == null) {
      return;
    }
    String code =
        switch (limiting.cause()) {
          case "thread" ->
              limiting.part().equals("spoke") ? "advice-cause-spoke" : "advice-cause-thread";
          case "wear" ->
              worked.parts().nipple().gallsOnSpoke() ? "advice-cause-galling" : "advice-cause-wear";
          case "open-air" -> "advice-cause-open-air";
          default ->
              switch (limiting.part()) {
                case "rim" -> "advice-cause-rim";
                case "interface" -> "advice-cause-interface";
                default -> "advice-cause-seat";
              };
        };
    notes.add(
        Note.of(
            code,
            "rim",
            worked.pairing().rim(),
            "umPerYear",
            Answer.rounded(limiting.dose().steady().um(12))));
  }

  /**
   * What of place, salt and storage decides for the pairing in focus, and how many salted rides.
   */
  static List<Note> whatDecides(
      Case worked, List<Change> changes, WheelYear year, AdviceRequest request) {
    List<Note> notes = new ArrayList<>();
    if (worked.limiting() != null) {
      double storage = best(changes, "storage");
      double salt = Math.max(best(changes, "saltedRoads"), best(changes, "rinsing"));
      notes.add(
          storage >= 1.5
              ? Note.of("advice-storage-decides", "factor", Answer.rounded(storage))
              : Note.of("advice-storage-hardly-matters"));
      notes.add(
          salt >= 1.5
              ? Note.of("advice-salt-decides", "factor", Answer.rounded(salt))
              : Note.of("advice-salt-hardly-matters"));
    }
    notes.addAll(saltSource(year));
    double rides =
        year.months().stream().mapToDouble(WheelYear.Month::saltedWetRides).sum()
            * worked.interval().firstMonths()
            / 12;
    if (rides >= 1) {
      notes.add(Note.of("advice-salted-rides", "rides", (int) Math.rint(rides)));
    }
    return notes;
  }

  private static List<Note> saltSource(WheelYear year) {
    double sea = 0;
    double road = 0;
    double sweat = 0;
    for (WheelYear.Month month : year.months()) {
      sea += month.salt().seaMgClPerM2();
      road += month.salt().rockMgClPerM2() + month.salt().brineMgClPerM2();
      sweat += month.salt().sweatMgClPerM2();
    }
    double all = sea + road + sweat;
    // Twelve months of 10 mg/m² each: too thin to hold a film.
    if (all < 120) {
      return List.of(Note.of("advice-salt-little"));
    }
    if (sweat > 0.8 * all) {
      return List.of(Note.of("advice-salt-from-sweat"), Note.of("advice-place-hardly-matters"));
    }
    return List.of(
        Note.of(
            sea > road ? "advice-salt-from-sea" : "advice-salt-from-roads",
            "pct",
            (int) Math.rint(100 * Math.max(sea, road) / all)));
  }

  private static double best(List<Change> changes, String field) {
    return changes.stream()
        .filter(change -> change.field().equals(field))
        .mapToDouble(change -> Math.max(change.factor(), 1 / Math.max(change.factor(), 1e-9)))
        .max()
        .orElse(1);
  }
}
