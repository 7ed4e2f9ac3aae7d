package saltspoke.wheel;

import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import saltspoke.sources.CsvTable.Row;
import saltspoke.values.Quantiles;
import saltspoke.values.Refusal;

/** Reads parts from the rows of the catalogue's tables; every fault names file and line. */
final class PartRows {
  private PartRows() {}

  static <P> List<P> all(List<Row> rows, Function<Row, P> part) {
    return rows.stream()
        .map(
            row -> {
              try {
                return part.apply(row);
              } catch (IllegalArgumentException e) {
                throw Refusal.dataDamaged("bad-part", row.where(), e.getMessage(), "a sound row");
              }
            })
        .toList();
  }

  static Rim rim(Row row) {
    return new Rim(
        row.text("id"),
        row.text("title"),
        material(row),
        coating(row),
        quantiles(row, "edge_bare_share"),
        row.number("bed_thickness_mm"),
        row.number("bed_width_mm"),
        row.number("hole_diameter_mm"),
        row.number("ring_width_mm"),
        row.text("source"));
  }

  static Nipple nipple(Row row) {
    return new Nipple(
        row.text("id"),
        row.text("title"),
        material(row),
        coating(row),
        row.number("head_diameter_mm"),
        row.number("head_wall_mm"),
        row.number("body_diameter_mm"),
        row.number("thread_diameter_mm"),
        row.number("thread_pitch_mm"),
        row.number("thread_wall_mm"),
        row.number("ring_circumference_mm"),
        row.number("ring_width_mm"),
        row.number("mass_g"),
        row.optionalNumber("stress_corrosion_mpa"),
        yes(row, "white_powder"),
        yes(row, "galls_on_spoke"),
        yes(row, "cracks_in_ammonia"),
        row.text("source"));
  }

  static SeatInterface between(Row row) {
    String fits = row.text("fits");
    if (!List.of("any", "aluminium", "carbon").contains(fits)) {
      throw Refusal.dataDamaged(
          "unknown-choice", row.where() + " fits", fits, "any, aluminium or carbon");
    }
    return new SeatInterface(
        row.text("id"),
        row.text("title"),
        row.text("material").isEmpty() ? Optional.empty() : Optional.of(material(row)),
        yes(row, "insulating"),
        row.number("thickness_mm"),
        row.number("outer_diameter_mm"),
        row.number("skirt_mm"),
        row.number("hole_wall_covered"),
        row.number("leakage_resistance_ohm"),
        fits.equals("aluminium"),
        fits.equals("carbon"),
        row.text("source"));
  }

  static Spoke spoke(Row row) {
    return new Spoke(
        row.text("id"),
        row.text("title"),
        material(row),
        coating(row),
        row.number("diameter_mm"),
        row.number("thread_diameter_mm"),
        row.number("wetted_area_cm2"),
        row.number("thread_resistance_ohm"),
        row.text("source"));
  }

  /** A cell that says yes or no. */
  static boolean yes(Row row, String column) {
    String text = row.text(column);
    if (!text.equals("yes") && !text.equals("no")) {
      throw Refusal.dataDamaged("unknown-choice", row.where() + " " + column, text, "yes or no");
    }
    return text.equals("yes");
  }

  private static Coating coating(Row row) {
    return new Coating(
        choice(row, "coating", Coating.Kind.class),
        row.number("coating_um"),
        quantiles(row, "seat_bare_share"),
        quantiles(row, "defect_share"));
  }

  private static Quantiles quantiles(Row row, String stem) {
    return new Quantiles(
        row.number(stem + "_p10"), row.number(stem + "_median"), row.number(stem + "_p90"));
  }

  private static Material material(Row row) {
    return choice(row, "material", Material.class);
  }

  private static <E extends Enum<E>> E choice(Row row, String column, Class<E> choices) {
    String text = row.text(column);
    for (E choice : choices.getEnumConstants()) {
      if (choice.name().equals(text)) {
        return choice;
      }
    }
    throw Refusal.dataDamaged(
        "unknown-choice",
        row.where() + " " + column,
        text,
        "one of " + List.of(choices.getEnumConstants()));
  }
}
