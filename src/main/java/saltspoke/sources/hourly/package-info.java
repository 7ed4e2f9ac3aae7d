/**
 * Readers of station archives: one class per published format, all streaming, all giving {@link
 * saltspoke.sources.hourly.HourlyRow rows} in the same units.
 */
package saltspoke.sources.hourly;
