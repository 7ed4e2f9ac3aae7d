package saltspoke.faces.json;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.math.BigDecimal;
import java.util.List;
import java.util.Map;
import saltspoke.advice.StateShares;
import saltspoke.atlas.stock.CustomerAnswer;
import saltspoke.atlas.stock.Pieces;
import saltspoke.atlas.stock.RefusedRow;
import saltspoke.atlas.stock.Split;
import saltspoke.atlas.stock.Splits;
import saltspoke.atlas.stock.StockQuestion;

/** The JSON form of what comes of a customer list. */
public final class StockJson {
  private StockJson() {}

  /**
   * @param refused number of rows that were not understood
   */
  public static ObjectNode of(Splits splits, List<Pieces.Line> orders, long refused) {
    ObjectNode node = Json.object();
    node.put("answered", splits.all().customers());
    node.put("mended", splits.mended());
    node.put("refused", refused);
    node.set("all", split(splits.all()));
    ArrayNode regions = node.putArray("regions");
    splits
        .byRegion()
        .forEach(
            (key, split) -> {
              ObjectNode region = split(split);
              region.put("country", key.countryCode());
              region.put("region", key.regionName());
              regions.add(region);
            });
    ArrayNode lines = node.putArray("orders");
    orders.forEach(line -> lines.add(order(line)));
    return node;
  }

  private static ObjectNode split(Split split) {
    ObjectNode node = Json.object();
    node.put("customers", split.customers());
    node.put("wheels", split.wheels());
    node.put("wheelsShortOfWanted", split.notEnough());
    node.set("byClass", parts(split.byClass()));
    node.set("byProfile", parts(split.byProfile()));
    node.set("byPairing", parts(split.byPairing()));
    ArrayNode states = node.putArray("states");
    for (int year = 1; year <= StockQuestion.YEARS; year++) {
      StateShares at = split.wheelsByState(year);
      ObjectNode of = states.addObject();
      of.put("year", year);
      Json.number(of, "sound", at.sound());
      Json.number(of, "attacked", at.attacked());
      Json.number(of, "seized", at.seized());
      Json.number(of, "lost", at.lost());
    }
    ArrayNode demand = node.putArray("demand");
    for (int month = 1; month <= 12; month++) {
      ObjectNode of = demand.addObject();
      of.put("month", month);
      Json.number(of, "looks", split.looks(month));
      Json.number(of, "rebuilds", split.rebuilds(month));
    }
    return node;
  }

  private static ObjectNode parts(Map<?, BigDecimal> parts) {
    ObjectNode node = Json.object();
    parts.forEach((key, wheels) -> node.put(String.valueOf(key), wheels));
    return node;
  }

  private static ObjectNode order(Pieces.Line line) {
    ObjectNode node = Json.object();
    node.put("kind", line.article().kind());
    node.put("id", line.article().id());
    node.put("piecesNeeded", line.needed());
    node.put("piecesInHand", line.inHand());
    node.put("packs", line.packs());
    line.orderMonth()
        .ifPresentOrElse(m -> node.put("orderByMonth", m), () -> node.putNull("orderByMonth"));
    return node;
  }

  /** One customer, in short. */
  public static ObjectNode row(CustomerAnswer answer) {
    ObjectNode node = Json.object();
    node.put("line", answer.customer().line());
    node.put("place", answer.place());
    node.put("region", answer.regionName());
    node.put("country", answer.countryCode());
    node.put("wheels", answer.customer().wheels());
    node.put("profile", answer.customer().profile());
    node.put("class", answer.steelCategory().name());
    node.put("recommended", Split.pairingName(answer.taken()));
    Json.number(node, "firstLookMonths", answer.firstLookMonths());
    Json.number(node, "everyMonths", answer.everyMonths());
    return node;
  }

  /** One row that was not understood. */
  public static ObjectNode refused(RefusedRow row) {
    ObjectNode node = Json.error(row.reason());
    node.put("line", row.row().line());
    return node;
  }
}
