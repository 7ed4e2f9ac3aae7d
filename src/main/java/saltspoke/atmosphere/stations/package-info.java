/**
 * From the hours of a station to its monthly statistics: quality tests, coverage rule, counts. Pure
 * functions; every sum is one of whole numbers, so that no order of adding changes a result.
 */
package saltspoke.atmosphere.stations;
