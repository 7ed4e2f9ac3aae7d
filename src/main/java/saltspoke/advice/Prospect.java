package saltspoke.advice;

import java.util.List;

/**
 * What becomes of new wheels of one pairing, practice limits aside.
 *
 * @param freeFirstLookMonths months to the first look by the accepted risk alone, at most 240
 * @param atYearEnd shares in each state after one year, two years and so on
 * @param seizedInMonth share of wheels that seizes (or worse) in each calendar month of the first
 *     year in service, January first
 */
public record Prospect(
    double freeFirstLookMonths, List<StateShares> atYearEnd, List<Double> seizedInMonth) {
  public Prospect {
    atYearEnd = List.copyOf(atYearEnd);
    seizedInMonth = List.copyOf(seizedInMonth);
  }
}
