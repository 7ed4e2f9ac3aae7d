/** The same answer for many places: judged against stations, rasters, lists. */
package saltspoke.atlas;
