package saltspoke.advice;

import java.util.List;
import saltspoke.atmosphere.AirClimate;
import saltspoke.values.Note;

/**
 * The whole answer about wheels at a place.
 *
 * @param pairings asked-for pairing or all valid ones, longest safe interval first
 * @param year the year of the pairing in focus (the asked-for one, else the most common of the
 *     answer)
 * @param changes what one change buys for the pairing in focus, best first
 * @param look what a look consists of, step by step
 * @param stopSigns signs to stop riding at once
 * @param cautions always shown
 * @param flags assumptions and ranges left
 */
public record Advice(
    AirClimate air,
    AdviceRequest request,
    List<PairingAdvice> pairings,
    YearPlan year,
    List<Change> changes,
    List<Note> look,
    List<Note> stopSigns,
    List<Note> cautions,
    List<Note> flags) {
  public Advice {
    pairings = List.copyOf(pairings);
    changes = List.copyOf(changes);
    look = List.copyOf(look);
    stopSigns = List.copyOf(stopSigns);
    cautions = List.copyOf(cautions);
    flags = List.copyOf(flags);
  }
}
