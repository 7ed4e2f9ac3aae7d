/**
 * The wheel: parts and materials, how it is ridden and kept, the weather inside its rim, the
 * galvanic cell at each nipple, and the damage that follows. Pure functions; no files, no clock.
 */
package saltspoke.wheel;
