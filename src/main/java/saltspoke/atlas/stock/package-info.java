/** What a list of customers needs: classes, pairings, states, demand and orders. */
package saltspoke.atlas.stock;
