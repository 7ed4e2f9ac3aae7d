package saltspoke.advice;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import saltspoke.wheel.Pairing;

/**
 * New wheels at one place under one profile, pairing by pairing; what pairings share is worked out
 * once. Serves one thread.
 */
public final class WheelsAt {
  private final Workshop shop;
  private final AdviceRequest request;

  WheelsAt(Workshop shop, AdviceRequest request) {
    this.shop = shop;
    this.request = request;
  }

  /** When to look at a pairing. */
  public PairingAdvice advice(Pairing pairing) {
    return Answer.of(shop.of(pairing), request);
  }

  /**
   * What becomes of a pairing.
   *
   * @param years how many years ahead, 1..20
   */
  public Prospect prospect(Pairing pairing, int years) {
    Fate fate = shop.of(pairing).fate();
    List<StateShares> shares = new ArrayList<>();
    for (int year = 1; year <= years; year++) {
      shares.add(fate.shares(12 * year));
    }
    Double[] byMonth = new Double[12];
    Arrays.fill(byMonth, 0.0);
    double before = 0;
    for (int k = 1; k <= 12; k++) {
      StateShares at = fate.shares(k);
      double gone = at.seized() + at.lost();
      byMonth[(request.buildMonth() - 1 + k - 1) % 12] = Math.max(0, gone - before);
      before = gone;
    }
    return new Prospect(fate.interval().freeFirstMonths(), shares, List.of(byMonth));
  }
}
