/**
 * From damage over time to what a person should do: when to look, how, what limits, what one change
 * buys. Pure functions; no files, no clock.
 */
package saltspoke.advice;
