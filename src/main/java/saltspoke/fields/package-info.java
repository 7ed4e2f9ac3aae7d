/** Gridded fields with their unit and provenance, and the data set that holds them. */
package saltspoke.fields;
