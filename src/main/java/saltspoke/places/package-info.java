/** Finding a place and what lies around it: names, postcodes, elevation, coast, neighbours. */
package saltspoke.places;
