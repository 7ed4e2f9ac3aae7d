package saltspoke.advice;

import saltspoke.wheel.Pairing;
import saltspoke.wheel.damage.Parts;
import saltspoke.wheel.damage.Site;

/**
 * One pairing worked out under one request.
 *
 * @param fate what becomes of such a wheel
 */
record Case(Pairing pairing, Parts parts, Fate fate) {

  Interval interval() {
    return fate.interval();
  }

  LookKind look() {
    return fate.look();
  }

  /** The site that brings a state about first; null when none can. */
  Site leader(State state) {
    return fate.leader(state);
  }

  /** The site that decides the interval: what seizes first, else what is lost, else what shows. */
  Site limiting() {
    for (State state : new State[] {State.SEIZED, State.LOST, State.ATTACKED}) {
      Site site = leader(state);
      if (site != null) {
        return site;
      }
    }
    return null;
  }
}
