/**
 * Small immutable values that every room shares: quantiles, coded notes, refusals. Imports the JDK
 * only.
 */
package saltspoke.values;
