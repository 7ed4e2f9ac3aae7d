/** Station archives into a data set of monthly statistics beside the shipped one. */
package saltspoke.atlas.stations;
