package saltspoke.wheel;

import java.util.ArrayList;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import saltspoke.sources.CsvTable;
import saltspoke.sources.ShippedTable;
import saltspoke.values.Note;
import saltspoke.values.Refusal;

/**
 * The parts that a wheel can be built of, and which of them fit together. What fits is what can be
 * built, not what is wise: a brass washer under an aluminium nipple fits, and the advice says what
 * becomes of it.
 */
public final class Catalogue {
  private final Map<String, Rim> rims;
  private final Map<String, Nipple> nipples;
  private final Map<String, SeatInterface> interfaces;
  private final Map<String, Spoke> spokes;
  private final List<Pairing> pairings;

  private Catalogue(
      List<Rim> rims, List<Nipple> nipples, List<SeatInterface> interfaces, List<Spoke> spokes) {
    this.rims = byId(rims, Rim::id);
    this.nipples = byId(nipples, Nipple::id);
    this.interfaces = byId(interfaces, SeatInterface::id);
    this.spokes = byId(spokes, Spoke::id);
    List<Pairing> valid = new ArrayList<>();
    for (Rim rim : rims) {
      for (Nipple nipple : nipples) {
        for (SeatInterface between : interfaces) {
          for (Spoke spoke : spokes) {
            Pairing pairing = new Pairing(rim.id(), nipple.id(), between.id(), spoke.id());
            if (refusal(pairing).isEmpty()) {
              valid.add(pairing);
            }
          }
        }
      }
    }
    this.pairings = List.copyOf(valid);
  }

  /** The catalogue from the rows of its four tables; a faulty row is refused with its line. */
  public static Catalogue from(
      List<CsvTable.Row> rims,
      List<CsvTable.Row> nipples,
      List<CsvTable.Row> interfaces,
      List<CsvTable.Row> spokes) {
    return new Catalogue(
        PartRows.all(rims, PartRows::rim),
        PartRows.all(nipples, PartRows::nipple),
        PartRows.all(interfaces, PartRows::between),
        PartRows.all(spokes, PartRows::spoke));
  }

  /** The catalogue that ships with the program. */
  public static Catalogue shipped() {
    return from(
        ShippedTable.rows("wheel/rims.csv"),
        ShippedTable.rows("wheel/nipples.csv"),
        ShippedTable.rows("wheel/interfaces.csv"),
        ShippedTable.rows("wheel/spokes.csv"));
  }

  /** The rim of that id; refused with the ids there are when there is none. */
  public Rim rim(String id) {
    return get("rim", rims, id);
  }

  /** The nipple of that id; refused with the ids there are when there is none. */
  public Nipple nipple(String id) {
    return get("nipple", nipples, id);
  }

  /** The interface of that id; refused with the ids there are when there is none. */
  public SeatInterface between(String id) {
    return get("interface", interfaces, id);
  }

  /** The spoke of that id; refused with the ids there are when there is none. */
  public Spoke spoke(String id) {
    return get("spoke", spokes, id);
  }

  /** All rims, in the table's order. */
  public List<Rim> rims() {
    return List.copyOf(rims.values());
  }

  /** All nipples, in the table's order. */
  public List<Nipple> nipples() {
    return List.copyOf(nipples.values());
  }

  /** All interfaces, in the table's order. */
  public List<SeatInterface> interfaces() {
    return List.copyOf(interfaces.values());
  }

  /** All spokes, in the table's order. */
  public List<Spoke> spokes() {
    return List.copyOf(spokes.values());
  }

  /** Every pairing that can be built. */
  public List<Pairing> pairings() {
    return pairings;
  }

  /**
   * Every pairing that can be built and has the given parts.
   *
   * @param rim id, or null for any; likewise the others
   * @throws Refusal when an id is unknown, or when the parts given can never be built together
   */
  public List<Pairing> pairings(String rim, String nipple, String between, String spoke) {
    Rim askedRim = rim == null ? null : rim(rim);
    Nipple askedNipple = nipple == null ? null : nipple(nipple);
    SeatInterface askedBetween = between == null ? null : between(between);
    Spoke askedSpoke = spoke == null ? null : spoke(spoke);
    List<Pairing> found = new ArrayList<>();
    for (Pairing p : pairings) {
      if ((askedRim == null || askedRim.id().equals(p.rim()))
          && (askedNipple == null || askedNipple.id().equals(p.nipple()))
          && (askedBetween == null || askedBetween.id().equals(p.between()))
          && (askedSpoke == null || askedSpoke.id().equals(p.spoke()))) {
        found.add(p);
      }
    }
    if (found.isEmpty()) {
      throw Refusal.wrongUse(
          "parts-do-not-fit",
          "interface",
          rim + " + " + nipple + " + " + between,
          PartRules.explain(askedRim, askedNipple, askedBetween));
    }
    return found;
  }

  /** Why a pairing cannot be built, or nothing when it can. Unknown ids are refused. */
  public Optional<Note> refusal(Pairing pairing) {
    spoke(pairing.spoke());
    return PartRules.refusal(
        rim(pairing.rim()), nipple(pairing.nipple()), between(pairing.between()));
  }

  private static <P> Map<String, P> byId(List<P> parts, Function<P, String> id) {
    Map<String, P> map = new LinkedHashMap<>();
    for (P part : parts) {
      if (map.put(id.apply(part), part) != null) {
        throw Refusal.dataDamaged(
            "double-id", "catalogue", id.apply(part), "every id once in its table");
      }
    }
    return map;
  }

  private static <P> P get(String field, Map<String, P> parts, String id) {
    P part = parts.get(id);
    if (part == null) {
      throw Refusal.wrongUse("unknown-part", field, id, names(parts.keySet()));
    }
    return part;
  }

  private static String names(Collection<String> ids) {
    return String.join(", ", ids);
  }
}
