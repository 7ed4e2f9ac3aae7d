/** The HTTP face: one handler per resource, one place where refusals become statuses. */
package saltspoke.faces.web;
