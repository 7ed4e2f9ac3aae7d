/** Builds the raster layers of the default world from source packages; used by the ingest only. */
package saltspoke.fields.build;
