/**
 * The outside air at a place: monthly climate, wetness, salt, SO2, and the ISO 9223/9224
 * corrosivity that follows. Pure functions; no files, no clock.
 */
package saltspoke.atmosphere;
