/** One reader per outside format. Everything that reads bytes from outside starts here. */
package saltspoke.sources;
