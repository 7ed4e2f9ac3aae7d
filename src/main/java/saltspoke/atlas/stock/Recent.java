package saltspoke.atlas.stock;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.function.Function;

/**
 * Keeps the values asked for last, up to a number. A value may be made twice when two threads ask
 * for it at once; makers are pure, so both are the same.
 */
final class Recent<K, V> {
  private final Map<K, V> kept;

  Recent(int most) {
    this.kept =
        new LinkedHashMap<>(16, 0.75f, true) {
          private static final long serialVersionUID = 1L;

          @Override
          protected boolean removeEldestEntry(Map.Entry<K, V> eldest) {
            return size() > most;
          }
        };
  }

  V get(K key, Function<K, V> maker) {
    synchronized (kept) {
      V known = kept.get(key);
      if (known != null) {
        return known;
      }
    }
    V made = maker.apply(key);
    synchronized (kept) {
      kept.put(key, made);
    }
    return made;
  }
}
