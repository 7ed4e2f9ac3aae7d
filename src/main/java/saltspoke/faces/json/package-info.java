/** The JSON form of every answer, and of a riding profile as a question. */
package saltspoke.faces.json;
