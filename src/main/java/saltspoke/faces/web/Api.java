package saltspoke.faces.web;

import static java.nio.charset.StandardCharsets.UTF_8;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.time.LocalDate;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import saltspoke.advice.Advice;
import saltspoke.faces.About;
import saltspoke.faces.Answers;
import saltspoke.faces.Parameters;
import saltspoke.faces.PlaceQuestion;
import saltspoke.faces.Questions;
import saltspoke.faces.Resources;
import saltspoke.faces.Texts;
import saltspoke.faces.export.AdviceCsv;
import saltspoke.faces.export.CustomerSheetPdf;
import saltspoke.faces.export.LookCalendar;
import saltspoke.faces.export.Units;
import saltspoke.faces.json.AdviceJson;
import saltspoke.faces.json.AirJson;
import saltspoke.faces.json.CatalogueJson;
import saltspoke.faces.json.Json;
import saltspoke.faces.json.PlacesJson;
import saltspoke.faces.json.ProfileJson;
import saltspoke.faces.json.RegionJson;
import saltspoke.values.Refusal;

/** The resources under {@code /api}, each a function from a request to a reply. */
public final class Api {
  private static final Set<String> GET = Set.of("GET");
  private static final int TEXT_AGE_SECONDS = 3600;

  private final Answers answers;

  private Api(Answers answers) {
    this.answers = answers;
  }

  /** A server for these answers on a port of the loopback address, 0 for any free one. */
  public static WebServer server(int port, Answers answers) {
    return server(ServerSettings.local(port), answers);
  }

  /** A server for these answers under the usual limits. */
  public static WebServer server(ServerSettings settings, Answers answers) {
    return new WebServer(settings, ServerLimits.USUAL, resources(answers), answers::ready);
  }

  private static Map<String, ResourceHandler> resources(Answers answers) {
    Api api = new Api(answers);
    Map<String, ResourceHandler> resources = new LinkedHashMap<>();
    resources.put("/api/air", new ResourceHandler(GET, api::air));
    resources.put("/api/advice", new ResourceHandler(Set.of("GET", "POST"), api::advice));
    resources.put("/api/places", new ResourceHandler(GET, api::places));
    resources.put("/api/region", new ResourceHandler(GET, api::region));
    resources.put("/api/profiles", new ResourceHandler(GET, api::profiles));
    resources.put("/api/pairings", new ResourceHandler(GET, api::pairings));
    resources.put("/api/about", new ResourceHandler(GET, api::about));
    resources.put("/api/texts", new ResourceHandler(GET, api::texts));
    MapResources map = new MapResources(answers);
    resources.put("/api/tiles/*", new ResourceHandler(GET, map::tile));
    resources.put("/api/legend/*", new ResourceHandler(GET, map::legend));
    resources.put("/api/value", new ResourceHandler(GET, map::value));
    resources.put("/api/map/spot", new ResourceHandler(GET, map::spot));
    resources.put("/api/map/names.json", new ResourceHandler(GET, map::names));
    resources.put("/api/advice.pdf", new ResourceHandler(Set.of("GET", "POST"), api::sheet));
    resources.put("/api/advice.ics", new ResourceHandler(Set.of("GET", "POST"), api::calendar));
    resources.put("/api/advice.csv", new ResourceHandler(Set.of("GET", "POST"), api::table));
    resources.put("/api/openapi.json", new ResourceHandler(GET, api::document));
    resources.put("/*", new ResourceHandler(GET, new StaticFiles()::serve));
    return resources;
  }

  private Reply air(Ask ask) {
    Parameters parameters = new Parameters(ask.query(), Questions.AIR);
    Texts texts = Answers.textsFor(parameters);
    return Reply.json(AirJson.of(answers.air(PlaceQuestion.from(parameters)), texts));
  }

  /** An answer about a wheel and how it is to be told. */
  private record Told(Advice advice, Texts texts, Units units) {}

  private Reply advice(Ask ask) {
    Told told = told(ask);
    return Reply.json(AdviceJson.of(told.advice(), told.texts()));
  }

  private Reply sheet(Ask ask) {
    Told told = told(ask);
    byte[] pdf =
        CustomerSheetPdf.render(told.advice(), told.texts(), told.units(), LocalDate.now());
    return Reply.file("application/pdf", pdf, "saltspoke.pdf");
  }

  private Reply calendar(Ask ask) {
    Told told = told(ask);
    String text = LookCalendar.render(told.advice(), told.texts(), LocalDate.now());
    return Reply.file("text/calendar;charset=utf-8", text.getBytes(UTF_8), "saltspoke.ics");
  }

  private Reply table(Ask ask) {
    byte[] csv = AdviceCsv.render(told(ask).advice()).getBytes(UTF_8);
    return Reply.file("text/csv;charset=utf-8", csv, "saltspoke.csv");
  }

  private Told told(Ask ask) {
    if (ask.method().equals("POST")) {
      return posted(ask.body());
    }
    Parameters parameters = new Parameters(ask.query(), Questions.ADVICE);
    return told(answers.advise(parameters), parameters);
  }

  private static Told told(Advice advice, Parameters parameters) {
    Units units = parameters.choice("units", Units.values(), Units::id).orElse(Units.METRIC);
    return new Told(advice, Answers.textsFor(parameters), units);
  }

  private Told posted(String body) {
    JsonNode node;
    try {
      node = Json.MAPPER.readTree(body);
    } catch (JsonProcessingException e) {
      throw Refusal.wrongUse("not-json", "body", "", "a JSON object");
    }
    if (node == null || !node.isObject()) {
      throw Refusal.wrongUse("not-json", "body", "", "a JSON object");
    }
    Map<String, String> values = new TreeMap<>();
    for (Map.Entry<String, JsonNode> field : node.properties()) {
      if (field.getValue().isValueNode()) {
        values.put(field.getKey(), field.getValue().asText());
      } else if (!field.getKey().equals("profile")) {
        throw Refusal.wrongUse(
            "not-a-value",
            Parameters.shortened(field.getKey()),
            "",
            "a text, number or truth value");
      }
    }
    Parameters parameters = new Parameters(values, Questions.ADVICE);
    JsonNode profile = node.get("profile");
    Advice advice =
        profile != null && profile.isObject()
            ? answers.advise(parameters, ProfileJson.read(profile))
            : answers.advise(parameters);
    return told(advice, parameters);
  }

  private Reply places(Ask ask) {
    Parameters parameters = new Parameters(ask.query(), Questions.PLACES);
    String query =
        parameters
            .text("q")
            .orElseThrow(() -> Refusal.wrongUse("empty", "q", "", "the beginning of a name"));
    return Reply.json(PlacesJson.of(answers.search(query, parameters.whole("limit", 1, 50, 10))));
  }

  private Reply region(Ask ask) {
    Parameters parameters = new Parameters(ask.query(), Questions.REGION);
    Texts texts = Answers.textsFor(parameters);
    return Reply.json(RegionJson.of(answers.outlook(parameters), texts));
  }

  private Reply profiles(Ask ask) {
    return Reply.json(CatalogueJson.of(answers.profiles()));
  }

  private Reply pairings(Ask ask) {
    return Reply.json(CatalogueJson.of(answers.catalogue()));
  }

  private Reply about(Ask ask) {
    ObjectNode node = About.json(answers.dataSet());
    ArrayNode countries = node.putArray("postcodeCountries");
    answers.postcodeCountries().forEach(countries::add);
    node.set("corrections", answers.corrections().json());
    return Reply.json(node);
  }

  private Reply texts(Ask ask) {
    Texts texts = Answers.textsFor(new Parameters(ask.query(), Set.of("lang")));
    ObjectNode node = Json.object();
    texts.all().forEach(node::put);
    byte[] body = Json.compact(node).getBytes(UTF_8);
    return Reply.kept(Reply.JSON, body, TEXT_AGE_SECONDS);
  }

  private Reply document(Ask ask) {
    return Reply.kept(Reply.JSON, Resources.bytes("saltspoke/openapi.json"), TEXT_AGE_SECONDS);
  }
}
