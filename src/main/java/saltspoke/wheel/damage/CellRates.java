package saltspoke.wheel.damage;

import saltspoke.wheel.CellCurrents;
import saltspoke.wheel.CellSpec;
import saltspoke.wheel.Film;

/** Where the currents of a cell in a film come from: the solver, its table, or a test's hand. */
@FunctionalInterface
public interface CellRates {
  CellCurrents at(CellSpec spec, Film film);
}
