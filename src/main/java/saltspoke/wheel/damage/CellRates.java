package saltspoke.wheel.damage;

import java.util.function.Function;
import saltspoke.wheel.CellCurrents;
import saltspoke.wheel.CellSpec;
import saltspoke.wheel.CellTable;
import saltspoke.wheel.CellTables;
import saltspoke.wheel.Film;

/** Where the currents of a cell in a film come from: the solver's tables, or a test's hand. */
@FunctionalInterface
public interface CellRates {
  /** What a cell does, film by film. */
  Function<Film, CellCurrents> of(CellSpec spec);

  /** The shipped cell, from tables that are filled as films are asked for, and kept. */
  static CellRates tabled(CellTables tables) {
    return spec -> {
      CellTable table = tables.table(spec);
      return film -> table.currents(film, spec.ringWidthMm(), 1);
    };
  }
}
