/**
 * From films and cells to damage: which couples meet at a spoke hole, how deep each eats over the
 * years, and how deep is too deep. Depths here are median figures; the spread is carried beside
 * them as the sensitivity to each {@link saltspoke.wheel.damage.Assumption} and turned into chances
 * in the advice package.
 */
package saltspoke.wheel.damage;
