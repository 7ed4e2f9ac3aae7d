/** What people take away: customer sheet, calendar, table. Pure functions of an answer. */
package saltspoke.faces.export;
