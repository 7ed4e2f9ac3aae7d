package saltspoke.advice;

import java.util.List;
import saltspoke.values.Note;

/** The words that stand beside every answer: how to look, when to stop, what to be wary of. */
final class Looks {
  private Looks() {}

  static List<Note> steps(LookKind kind) {
    Note effort =
        new Note(
            "look-effort-" + kind.id(),
            java.util.Map.of(
                "minutes",
                kind.minutes(),
                "attackPct",
                pct(kind, State.ATTACKED),
                "seizedPct",
                pct(kind, State.SEIZED),
                "lostPct",
                pct(kind, State.LOST)));
    return kind == LookKind.OUTSIDE
        ? List.of(
            effort,
            Note.of("look-spin-true"),
            Note.of("look-tension"),
            Note.of("look-powder"),
            Note.of("look-quarter-turn"))
        : List.of(
            effort,
            Note.of("look-spin-true"),
            Note.of("look-tension"),
            Note.of("look-tape-off"),
            Note.of("look-heads-and-bed"),
            Note.of("look-quarter-turn"),
            Note.of("look-tape-back"));
  }

  private static int pct(LookKind kind, State state) {
    return (int) Math.rint(100 * kind.finds(state));
  }

  static List<Note> stopSigns() {
    return List.of(
        Note.of("stop-spoke-loose-or-broken"),
        Note.of("stop-head-gone"),
        Note.of("stop-crack-at-hole"),
        Note.of("stop-sudden-wobble"),
        Note.of("stop-seized-not-forced"));
  }

  static List<Note> cautions() {
    return List.of(
        Note.of("caution-estimate"),
        Note.of("caution-makers-limits"),
        Note.of("caution-qualified-mechanic"),
        Note.of("caution-wheels-hurt"));
  }

  static List<Note> assumptions() {
    return List.of(
        Note.of("advice-assumes-settled-year"),
        Note.of("advice-assumes-steel-crevices-left-out"),
        Note.of("advice-assumes-correlation", "scatter", WheelRisk.NIPPLE_SCATTER));
  }
}
