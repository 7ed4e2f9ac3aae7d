package saltspoke.wheel;

import java.util.List;
import java.util.Optional;
import java.util.SortedSet;
import java.util.TreeSet;
import java.util.stream.Collectors;
import saltspoke.sources.CsvTable.Row;
import saltspoke.sources.ShippedTable;
import saltspoke.values.Refusal;

/** The ready riding profiles. */
public final class Profiles {
  private final List<RidingProfile> all;

  private Profiles(List<RidingProfile> all) {
    this.all = List.copyOf(all);
  }

  /** Profiles from the rows of their table; a faulty row is refused with its line. */
  public static Profiles from(List<Row> rows) {
    return new Profiles(rows.stream().map(Profiles::profile).toList());
  }

  /** The profiles that ship with the program. */
  public static Profiles shipped() {
    return from(ShippedTable.rows("wheel/profiles.csv"));
  }

  /** All profiles, in the table's order. */
  public List<RidingProfile> all() {
    return all;
  }

  public Optional<RidingProfile> find(String name) {
    return all.stream().filter(p -> p.name().equals(name)).findFirst();
  }

  /** The profile of that name; refused with the names there are when there is none. */
  public RidingProfile get(String name) {
    return find(name)
        .orElseThrow(
            () ->
                Refusal.wrongUse(
                    "unknown-profile",
                    "profile",
                    name,
                    all.stream().map(RidingProfile::name).collect(Collectors.joining(", "))));
  }

  private static RidingProfile profile(Row row) {
    try {
      return new RidingProfile(
          row.text("name"),
          row.text("title"),
          months(row),
          row.number("hours_per_week"),
          row.number("wet_ride_share"),
          SaltedRoads.of(row.text("salted_roads")),
          row.number("sea_ride_share"),
          row.number("trainer_hours_per_week"),
          Storage.of(row.text("storage")),
          Rinsing.of(row.text("rinsing")),
          PartRows.yes(row, "dried_after_wet"),
          PartRows.yes(row, "drain_holes"),
          ThreadCompound.of(row.text("thread_compound")),
          Sealant.of(row.text("sealant")));
    } catch (Refusal e) {
      if (e.kind() == Refusal.Kind.DATA_DAMAGED) {
        throw e;
      }
      throw Refusal.dataDamaged(e.error(), row.where() + " " + e.field(), e.was(), e.allowed());
    }
  }

  private static SortedSet<Integer> months(Row row) {
    String text = row.text("months");
    SortedSet<Integer> months = new TreeSet<>();
    if (text.equals("none")) {
      return months;
    }
    for (String part : text.split(" ")) {
      if (!part.matches("\\d{1,2}(-\\d{1,2})?")) {
        throw Refusal.dataDamaged(
            "bad-months", row.where() + " months", text, "such as 4-10, 1 2 12 or none");
      }
      String[] ends = part.split("-");
      int last = Integer.parseInt(ends[ends.length - 1]);
      for (int month = Integer.parseInt(ends[0]); month <= last; month++) {
        months.add(month);
      }
    }
    return months;
  }
}
