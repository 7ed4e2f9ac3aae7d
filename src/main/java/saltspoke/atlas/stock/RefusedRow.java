package saltspoke.atlas.stock;

import saltspoke.sources.LooseTable;
import saltspoke.values.Refusal;

/** A row that was not understood, with what would mend it. */
public record RefusedRow(LooseTable.Row row, Refusal reason) {}
