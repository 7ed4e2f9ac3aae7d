package saltspoke.atlas.stock;

import java.util.List;
import saltspoke.advice.RiskLevel;
import saltspoke.wheel.Pairing;
import saltspoke.wheel.RidingProfile;
import saltspoke.wheel.WheelBuild;

/**
 * What is asked of a customer list.
 *
 * @param profile of rows that name none
 * @param today pairing of rows that name none, and of the parts that a row leaves open
 * @param build of every wheel
 * @param risk accepted risk
 * @param buildMonth month in which wheels go into service, 1..12
 * @param wantedMonths a pairing is good enough when its first look, by the accepted risk alone,
 *     lies at least so far away, months
 * @param preference order in which pairings are tried
 */
public record StockQuestion(
    RidingProfile profile,
    Pairing today,
    WheelBuild build,
    RiskLevel risk,
    int buildMonth,
    double wantedMonths,
    List<Preference> preference) {
  /** A look a year, common practice. */
  public static final double USUAL_WANTED_MONTHS = 12;

  /** Years for which shares of states are given. */
  public static final int YEARS = 5;

  public StockQuestion {
    preference = List.copyOf(preference);
  }
}
