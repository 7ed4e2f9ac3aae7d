package saltspoke.faces.cli;

import saltspoke.values.Refusal;

/** The exit codes that the help documents. */
final class ExitCode {
  static final int DONE = 0;
  static final int BUG = 1;
  static final int WRONG_USE = 2;
  static final int NOT_FOUND = 3;
  static final int DATA_DAMAGED = 4;

  private ExitCode() {}

  static int of(Refusal refusal) {
    return switch (refusal.kind()) {
      case WRONG_USE -> WRONG_USE;
      case NOT_FOUND, OUT_OF_RANGE -> NOT_FOUND;
      case DATA_DAMAGED -> DATA_DAMAGED;
    };
  }
}
