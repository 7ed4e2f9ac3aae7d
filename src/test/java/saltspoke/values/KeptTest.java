package saltspoke.values;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Tag;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.api.Test;

@Tag("law")
class KeptTest {
  @Property(tries = 200)
  void theWeightNeverPassesTheLimit(@ForAll List<@IntRange(min = 0, max = 30) Integer> keys) {
    Kept<Integer, String> kept = new Kept<>(40, String::length);
    for (int key : keys) {
      assertEquals("x".repeat(key), kept.get(key, "x"::repeat));
      assertTrue(kept.weight() <= 40);
    }
  }

  @Test
  @org.junit.jupiter.api.Tag("law")
  void whatWasAskedForLastStays() {
    Kept<String, String> kept = new Kept<>(2, String::length);
    List<String> made = new ArrayList<>();
    for (String key : List.of("a", "b", "a", "c", "a", "b")) {
      kept.get(
          key,
          k -> {
            made.add(k);
            return k;
          });
    }
    assertEquals(List.of("a", "b", "c", "b"), made);
    assertEquals(2, kept.weight());
  }

  @Test
  @org.junit.jupiter.api.Tag("law")
  void aValueHeavierThanAllIsMadeAndNotKept() {
    Kept<String, String> kept = new Kept<>(2, String::length);
    assertEquals("long", kept.get("long", k -> k));
    assertEquals(0, kept.weight());
  }
}
