package saltspoke.atlas.stock;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.Function;
import saltspoke.sources.LooseTable;
import saltspoke.values.Note;
import saltspoke.values.Refusal;
import saltspoke.wheel.Catalogue;
import saltspoke.wheel.Pairing;
import saltspoke.wheel.Profiles;

/**
 * Reads the rows of a customer list. What is sure is mended and noted: a postcode that a
 * spreadsheet took for a number, a country written out, a decimal comma. What is not sure is
 * refused with the column and what may stand there.
 */
public final class CustomerReader {
  /** What a column may hold. */
  enum Column {
    POSTCODE(
        "postcode",
        "postalcode",
        "zip",
        "zipcode",
        "plz",
        "postleitzahl",
        "codepostal",
        "cap",
        "codigopostal",
        "cp",
        "pincode"),
    TOWN(
        "place",
        "town",
        "city",
        "ort",
        "stadt",
        "ville",
        "citta",
        "ciudad",
        "localita",
        "localidad"),
    COUNTRY("country", "countrycode", "land", "pays", "paese", "pais"),
    WHEELS(
        "wheels",
        "weight",
        "quantity",
        "qty",
        "laufrader",
        "anzahl",
        "menge",
        "gewicht",
        "roues",
        "quantite",
        "ruote",
        "quantita",
        "ruedas",
        "cantidad"),
    PROFILE("profile", "profil", "profilo", "perfil"),
    RIM("rim", "felge", "jante", "cerchio", "llanta"),
    NIPPLE("nipple", "nippel", "ecrou", "nipplo", "cabecilla"),
    INTERFACE("interface", "washer"),
    SPOKE("spoke", "speiche", "rayon", "raggio", "radio");

    private final Set<String> names;

    Column(String... names) {
      this.names = Set.of(names);
    }
  }

  private final Catalogue catalogue;
  private final Profiles profiles;
  private final StockQuestion question;
  private final Map<Column, Integer> places = new EnumMap<>(Column.class);

  /**
   * @throws Refusal when the header has neither postcode nor place
   */
  public CustomerReader(
      LooseTable table, Catalogue catalogue, Profiles profiles, StockQuestion question) {
    this.catalogue = catalogue;
    this.profiles = profiles;
    this.question = question;
    List<String> header = table.header();
    for (int i = 0; i < header.size(); i++) {
      String name = plain(header.get(i));
      for (Column column : Column.values()) {
        if (column.names.contains(name)) {
          places.putIfAbsent(column, i);
        }
      }
    }
    if (!places.containsKey(Column.POSTCODE) && !places.containsKey(Column.TOWN)) {
      throw Refusal.wrongUse(
          "missing-column",
          table.fileName() + ":1",
          String.join(", ", header),
          "a column postcode (with country) or place; also wheels, profile, rim, nipple, interface,"
              + " spoke");
    }
  }

  /** Columns that no meaning is known for, as they stand in the header. */
  public List<String> ignored(List<String> header) {
    List<String> others = new ArrayList<>();
    for (int i = 0; i < header.size(); i++) {
      if (!places.containsValue(i)) {
        others.add(header.get(i));
      }
    }
    return others;
  }

  /**
   * The customer of a row.
   *
   * @throws Refusal for what is not sure
   */
  public Customer read(LooseTable.Row row) {
    for (String cell : row.cells()) {
      if (cell.indexOf('\uFFFD') >= 0) {
        throw Refusal.wrongUse(
            "undecodable", "row", cell, "letters in the encoding that the file begins with");
      }
    }
    List<Note> mends = new ArrayList<>();
    String country = country(text(row, Column.COUNTRY), mends);
    String postcode = postcode(text(row, Column.POSTCODE), mends);
    String town = text(row, Column.TOWN);
    if (postcode.isEmpty() && town.isEmpty()) {
      throw Refusal.wrongUse("no-place", "postcode", "", "a postcode with its country, or a town");
    }
    if (!postcode.isEmpty() && country.isEmpty()) {
      throw Refusal.wrongUse("no-country", "country", "", "the country of postcode " + postcode);
    }
    Pairing today = question.today();
    Customer customer =
        new Customer(
            row.line(),
            postcode,
            town,
            country,
            wheels(text(row, Column.WHEELS), mends),
            known(row, Column.PROFILE, question.profile().name(), n -> profiles.get(n).name()),
            known(row, Column.RIM, today.rim(), id -> catalogue.rim(id).id()),
            known(row, Column.NIPPLE, today.nipple(), id -> catalogue.nipple(id).id()),
            known(row, Column.INTERFACE, today.between(), id -> catalogue.between(id).id()),
            known(row, Column.SPOKE, today.spoke(), id -> catalogue.spoke(id).id()),
            mends);
    Pairing pairing =
        new Pairing(customer.rim(), customer.nipple(), customer.between(), customer.spoke());
    Optional<Note> why = catalogue.refusal(pairing);
    if (why.isPresent()) {
      throw Refusal.wrongUse(
          "parts-do-not-fit", "nipple", pairing, "parts that fit: " + why.get().code());
    }
    return customer;
  }

  private String text(LooseTable.Row row, Column column) {
    return row.cell(places.getOrDefault(column, -1));
  }

  private String known(
      LooseTable.Row row, Column column, String otherwise, Function<String, String> find) {
    String text = text(row, column);
    return text.isEmpty() ? otherwise : find.apply(text.toLowerCase(Locale.ROOT));
  }

  private static String country(String written, List<Note> mends) {
    if (written.isEmpty()) {
      return "";
    }
    String code =
        CountryCodes.of(written)
            .orElseThrow(
                () ->
                    Refusal.notFound(
                        "unknown-country", "country", written, "a two-letter code such as DE"));
    if (!code.equals(written)) {
      mends.add(Note.of("stock-mended-country", "was", written, "now", code));
    }
    return code;
  }

  /** Takes off what spreadsheets and address books add: ".0", a country's letter and dash. */
  private static String postcode(String written, List<Note> mends) {
    String code = written.replaceFirst("\\.0+$", "").replaceFirst("^[A-Za-z]{1,3}-(?=\\d)", "");
    if (code.matches("\\d+(\\.\\d+)?[eE]\\+?\\d+")) {
      throw Refusal.wrongUse(
          "postcode-in-powers", "postcode", written, "the postcode as text, not as a number");
    }
    if (!code.equals(written)) {
      mends.add(Note.of("stock-mended-postcode", "was", written, "now", code));
    }
    return code;
  }

  private static BigDecimal wheels(String written, List<Note> mends) {
    if (written.isEmpty()) {
      return BigDecimal.ONE;
    }
    String number = written.replace("\u00A0", "").replace(" ", "").replace("'", "");
    if (number.matches("\\d{1,3}([.,])\\d{3}(\\1\\d{3})*") && !number.startsWith("0")) {
      throw Refusal.wrongUse(
          "ambiguous-number", "wheels", written, "a number without separators of thousands");
    }
    number = number.replace(',', '.');
    BigDecimal wheels;
    try {
      wheels = new BigDecimal(number);
    } catch (NumberFormatException e) {
      throw Refusal.wrongUse("not-a-number", "wheels", written, "a number above 0");
    }
    if (wheels.signum() <= 0
        || wheels.compareTo(BigDecimal.valueOf(1_000_000_000)) > 0
        || wheels.scale() > 9) {
      throw Refusal.outOfRange("wheels", written, "above 0, up to 1000000000, nine decimals");
    }
    if (!number.equals(written)) {
      mends.add(Note.of("stock-mended-number", "was", written, "now", number));
    }
    return wheels;
  }

  private static String plain(String header) {
    return java.text.Normalizer.normalize(header, java.text.Normalizer.Form.NFD)
        .replaceAll("\\p{M}", "")
        .replaceAll("[^\\p{L}]", "")
        .toLowerCase(Locale.ROOT);
  }
}
