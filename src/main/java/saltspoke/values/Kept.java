package saltspoke.values;

import java.util.Iterator;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.function.Function;
import java.util.function.ToLongFunction;

/**
 * Values that cost work to make, kept up to a total weight; those not asked for longest go first.
 * Safe for many threads, none of which waits for another's making: a value that two miss at once is
 * made twice.
 *
 * @param <K> key with equals and hashCode
 * @param <V> value
 */
public final class Kept<K, V> {
  private final long mostWeight;
  private final ToLongFunction<V> weight;
  private final Map<K, V> values = new LinkedHashMap<>(16, 0.75f, true);
  private long total;

  /**
   * @param mostWeight total weight, at least 1
   * @param weight of one value, at least 0 and never changing
   */
  public Kept(long mostWeight, ToLongFunction<V> weight) {
    if (mostWeight < 1) {
      throw new IllegalArgumentException("the total weight is at least 1");
    }
    this.mostWeight = mostWeight;
    this.weight = weight;
  }

  /** The value of a key, made if it is not kept. */
  public V get(K key, Function<K, V> maker) {
    synchronized (values) {
      V value = values.get(key);
      if (value != null) {
        return value;
      }
    }
    V made = maker.apply(key);
    keep(key, made);
    return made;
  }

  /** Total weight of what is kept now, at most the limit. */
  public long weight() {
    synchronized (values) {
      return total;
    }
  }

  private void keep(K key, V made) {
    synchronized (values) {
      V before = values.put(key, made);
      total += weight.applyAsLong(made) - (before == null ? 0 : weight.applyAsLong(before));
      Iterator<V> eldest = values.values().iterator();
      while (total > mostWeight) {
        total -= weight.applyAsLong(eldest.next());
        eldest.remove();
      }
    }
  }
}
