package saltspoke.faces.export;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVPrinter;
import saltspoke.advice.Advice;
import saltspoke.advice.PairingAdvice;
import saltspoke.advice.StateTimes;
import saltspoke.atmosphere.MetalCorrosivity;
import saltspoke.places.Place;

/**
 * An answer as a table (RFC 4180, UTF-8): one row per pairing, metric units named in the header, an
 * empty cell where a time lies beyond 240 months or a state cannot occur.
 */
public final class AdviceCsv {
  private static final List<String> STATES = List.of("first_attack", "seized", "head_loss");

  private AdviceCsv() {}

  /** The whole answer as CSV with a header line. */
  public static String render(Advice advice) {
    StringBuilder out = new StringBuilder();
    try (CSVPrinter printer = new CSVPrinter(out, CSVFormat.RFC4180)) {
      printer.printRecord(header(advice));
      for (PairingAdvice pairing : advice.pairings()) {
        printer.printRecord(row(advice, pairing));
      }
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return out.toString();
  }

  private static List<String> header(Advice advice) {
    List<String> header =
        new ArrayList<>(
            List.of("place", "country", "latitude_deg", "longitude_deg", "elevation_m"));
    header.addAll(List.of("sea_distance_km", "profile", "risk"));
    for (MetalCorrosivity metal : advice.air().corrosivity()) {
      header.add("class_" + metal.metal().id().replace('-', '_'));
    }
    header.addAll(List.of("rim", "nipple", "interface", "spoke"));
    header.addAll(List.of("first_look_months", "every_months", "replace_by_months"));
    header.addAll(List.of("look_kind", "look_minutes", "limited_by"));
    for (String state : STATES) {
      header.addAll(
          List.of(
              state + "_part",
              state + "_p10_months",
              state + "_median_months",
              state + "_p90_months",
              state + "_note"));
    }
    header.add("mean_penetration_um_per_year");
    return header;
  }

  private static List<String> row(Advice advice, PairingAdvice pairing) {
    Place place = advice.air().place();
    List<String> row = new ArrayList<>();
    row.add(Plain.of(place.name()));
    row.add(place.countryCode());
    row.add(String.format(Locale.ROOT, "%.5f", place.latitudeDeg()));
    row.add(String.format(Locale.ROOT, "%.5f", place.longitudeDeg()));
    row.add(number(place.elevationM()));
    row.add(number(place.sea().distanceKm()));
    row.add(Plain.of(advice.request().profile().name()));
    row.add(advice.request().risk().id());
    for (MetalCorrosivity metal : advice.air().corrosivity()) {
      row.add(metal.category().name());
    }
    row.add(pairing.pairing().rim());
    row.add(pairing.pairing().nipple());
    row.add(pairing.pairing().between());
    row.add(pairing.pairing().spoke());
    row.add(number(pairing.firstLookMonths()));
    row.add(number(pairing.everyMonths()));
    row.add(number(pairing.replaceByMonths()));
    row.add(pairing.lookKind());
    row.add(Integer.toString(pairing.lookMinutes()));
    row.add(pairing.limitedBy());
    for (StateTimes times :
        List.of(pairing.firstAttackMonths(), pairing.seizedMonths(), pairing.headLossMonths())) {
      row.add(times.part());
      row.add(number(times.p10()));
      row.add(number(times.median()));
      row.add(number(times.p90()));
      row.add(times.notApplicable() ? "not-applicable" : times.beyondHorizon() ? "beyond-240" : "");
    }
    row.add(number(pairing.meanPenetrationUmPerYear()));
    return row;
  }

  private static String number(Double value) {
    return value == null ? "" : String.format(Locale.ROOT, "%.4g", value);
  }
}
