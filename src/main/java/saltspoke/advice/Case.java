package saltspoke.advice;

import saltspoke.wheel.Pairing;
import saltspoke.wheel.damage.Parts;
import saltspoke.wheel.damage.Site;

/**
 * One pairing worked out under one request.
 *
 * @param risk chances over time
 * @param look kind of look that shows it
 * @param interval the rule's answer
 */
record Case(Pairing pairing, Parts parts, WheelRisk risk, LookKind look, Interval interval) {

  /** The site that brings a state about first; null when none can. */
  Site leader(State state) {
    SiteRisk first = risk.leader(state);
    return first == null ? null : first.site();
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
