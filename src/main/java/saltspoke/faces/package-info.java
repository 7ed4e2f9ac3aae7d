/**
 * What the command line, the HTTP server and the exports share: one reading of a question, one
 * advisor, one wording and one JSON form of the answer, so that no two faces can disagree.
 */
package saltspoke.faces;
