package saltspoke.atlas.stock;

import java.math.BigDecimal;
import java.util.List;
import saltspoke.values.Note;

/**
 * One row of a customer list, understood. Empty texts stand for what the row leaves open.
 *
 * @param line line in the file
 * @param postcode with its country, or empty
 * @param town name of a town, or empty; used when there is no postcode
 * @param country ISO 3166-1 alpha-2 in capitals, or empty
 * @param wheels how many wheels the row stands for, &gt; 0
 * @param profile name of a ready profile
 * @param rim catalogue id
 * @param nipple of today's wheels, catalogue id
 * @param between interface of today's wheels, catalogue id
 * @param spoke catalogue id
 * @param mends what was mended in the row
 */
public record Customer(
    long line,
    String postcode,
    String town,
    String country,
    BigDecimal wheels,
    String profile,
    String rim,
    String nipple,
    String between,
    String spoke,
    List<Note> mends) {
  public Customer {
    mends = List.copyOf(mends);
  }
}
