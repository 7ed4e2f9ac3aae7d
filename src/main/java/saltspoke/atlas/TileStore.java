package saltspoke.atlas;

import java.io.IOException;

/** Keeps the tiles of an atlas; what is kept outlives a run that is cut short. */
public interface TileStore {
  /** Whether a tile is there already. */
  boolean has(int tile);

  /** Keeps a tile: {@link AtlasFrame#TILE} squared values, row by row, NaN where there is none. */
  void put(int tile, float[] values) throws IOException;

  /** A kept tile. */
  float[] get(int tile) throws IOException;
}
