/**
 * The weather inside a rim: the air where the bicycle is kept, the water and the salt that get in
 * and out, and the films that lie at the nipple seats. Pure functions; no files, no clock.
 */
package saltspoke.wheel.rim;
