/**
 * The command line: one class per command; results to standard output, complaints to standard
 * error.
 */
package saltspoke.faces.cli;
