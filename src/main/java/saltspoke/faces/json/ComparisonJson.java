package saltspoke.faces.json;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import saltspoke.atlas.Comparison;
import saltspoke.atlas.Judgement;
import saltspoke.atlas.Pair;
import saltspoke.values.Refusal;

/** A comparison with a station file as JSON. */
public final class ComparisonJson {
  private ComparisonJson() {}

  public static ObjectNode of(Comparison comparison, int worst) {
    ObjectNode node = Json.object();
    node.put("kind", comparison.kind());
    ArrayNode results = node.putArray("results");
    for (Comparison.Series series : comparison.series()) {
      ObjectNode result = judgement(series.judgement());
      ArrayNode list = result.putArray("worst");
      for (Pair pair : series.worst(worst)) {
        ObjectNode each = list.addObject();
        each.put("station", pair.station());
        Json.number(each, "measured", pair.measured());
        Json.number(each, "estimated", pair.estimated());
      }
      results.add(result);
    }
    ArrayNode refused = node.putArray("refused");
    for (Refusal refusal : comparison.refused()) {
      refused.add(Json.error(refusal));
    }
    return node;
  }

  private static ObjectNode judgement(Judgement judgement) {
    ObjectNode node = Json.object();
    node.put("quantity", judgement.quantity());
    node.put("n", judgement.n());
    Json.number(node, "bias", judgement.bias());
    Json.number(node, "mae", judgement.mae());
    Json.number(node, "rmse", judgement.rmse());
    Json.numberOrNull(node, "lnRmse", judgement.lnRmse());
    Json.numberOrNull(node, "withinFactor2Pct", judgement.withinFactor2Pct());
    Json.numberOrNull(node, "withinFactor3Pct", judgement.withinFactor3Pct());
    Json.numberOrNull(node, "bandCoveragePct", judgement.bandCoveragePct());
    Json.numberOrNull(node, "medianAbsErrorPct", judgement.medianAbsErrorPct());
    Json.numberOrNull(node, "correlation", judgement.correlation());
    return node;
  }
}
