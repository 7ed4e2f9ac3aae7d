package saltspoke.atlas.stations;

import java.util.List;
import java.util.Optional;
import saltspoke.values.Refusal;

/**
 * What one file of an archive came to: its station years, or the reason why it was set aside.
 *
 * @param file its name in the archive
 */
public record FileOutcome(String file, List<StationYearRecord> years, Optional<Refusal> refusal) {
  public FileOutcome {
    years = List.copyOf(years);
  }

  /** Rows read. */
  public long rows() {
    return years.stream().mapToLong(y -> y.year().quality().rows()).sum();
  }
}
