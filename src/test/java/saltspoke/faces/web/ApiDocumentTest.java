package saltspoke.faces.web;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import com.networknt.schema.JsonSchemaFactory;
import com.networknt.schema.SpecVersion;
import com.networknt.schema.ValidationMessage;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.util.HashSet;
import java.util.Set;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import saltspoke.faces.Answers;
import saltspoke.faces.Questions;
import saltspoke.faces.json.Json;
import saltspoke.fields.DataSet;

/** The served OpenAPI 3.1 document against the real handlers on the shipped data. */
@Tag("law")
class ApiDocumentTest {
  private static final String PLACE = "at=54.32,10.13";
  private static final String WHEEL =
      PLACE
          + "&profile=all-winter-commuter&rim=carbon-bare&nipple=aluminium-bare&interface=none"
          + "&spoke=stainless";
  private static final HttpClient CLIENT = HttpClient.newHttpClient();
  private static WebServer server;
  private static String base;
  private static JsonNode document;

  @BeforeAll
  static void start() throws Exception {
    server = Api.server(0, new Answers(DataSet.shipped()));
    base = server.start();
    document = Json.MAPPER.readTree(get("api/openapi.json").body());
  }

  @AfterAll
  static void stop() throws Exception {
    server.close();
  }

  private static HttpResponse<String> get(String path) throws Exception {
    return CLIENT.send(
        HttpRequest.newBuilder(URI.create(base + path)).build(),
        HttpResponse.BodyHandlers.ofString());
  }

  private static HttpResponse<String> post(String path, String body) throws Exception {
    return CLIENT.send(
        HttpRequest.newBuilder(URI.create(base + path))
            .POST(HttpRequest.BodyPublishers.ofString(body))
            .build(),
        HttpResponse.BodyHandlers.ofString());
  }

  private static void validate(JsonNode schema, String body) throws Exception {
    ObjectNode whole = (ObjectNode) schema.deepCopy();
    whole.set("components", document.get("components"));
    Set<ValidationMessage> faults =
        JsonSchemaFactory.getInstance(SpecVersion.VersionFlag.V202012)
            .getSchema(whole)
            .validate(Json.MAPPER.readTree(body));
    assertTrue(faults.isEmpty(), faults.toString());
  }

  private static JsonNode answerSchema(String path, String method, String status) {
    return document
        .at("/paths")
        .get(path)
        .get(method)
        .get("responses")
        .get(status)
        .get("content")
        .get("application/json")
        .get("schema");
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "/api/air|" + PLACE,
        "/api/advice|" + WHEEL,
        "/api/advice|" + PLACE + "&profile=trainer-only",
        "/api/places|q=Kiel",
        "/api/region|region=Cornwall&profile=trainer-only&rim=carbon-bare&sample=4",
        "/api/profiles|",
        "/api/pairings|",
        "/api/about|",
        "/api/texts|lang=en",
        "/api/value|layer=class-carbon-steel&" + PLACE,
        "/api/map/spot|" + PLACE,
        "/api/map/names.json|"
      })
  void anAnswerHasTheDocumentedForm(String path, String query) throws Exception {
    HttpResponse<String> response = get(path.substring(1) + (query == null ? "" : "?" + query));
    assertEquals(200, response.statusCode(), response.body());
    validate(answerSchema(path, "get", "200"), response.body());
  }

  @Test
  void aProfileOfOnesOwnIsPosted() throws Exception {
    String body =
        "{\"at\":\"54.32,10.13\",\"rim\":\"carbon-bare\",\"nipple\":\"brass-nickel\","
            + "\"profile\":{\"name\":\"mine\",\"months\":[5,6,7],\"storage\":\"heated-room\"}}";
    HttpResponse<String> response = post("api/advice", body);
    assertEquals(200, response.statusCode(), response.body());
    validate(answerSchema("/api/advice", "post", "200"), response.body());
    assertEquals("mine", Json.MAPPER.readTree(response.body()).at("/profile/name").asText());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "400|api/air",
        "400|api/air?at=NaN,10",
        "404|api/air?at=95,10",
        "400|api/air?postcode=&country=US",
        "404|api/air?postcode=00000&country=US",
        "404|api/air?postcode=1010&country=ZZ",
        "404|api/air?place=Qqqqqqx",
        "404|api/air?at=45,-40",
        "400|api/air?at=54.32,10.13&elevation=2026-12-01",
        "404|api/air?at=54.32,10.13&elevation=9000",
        "400|api/air?at=54.32,10.13&colour=red",
        "400|api/advice?at=54.32,10.13",
        "400|api/advice?at=54.32,10.13&profile=no-such-profile",
        "400|api/advice?at=54.32,10.13&profile=trainer-only&risk=none",
        "400|api/region",
        "400|api/region?region=Nord",
        "404|api/region?region=Nowhereland",
        "404|api/no-such-thing"
      })
  void badInputGetsItsStatusAndTheOneErrorForm(int status, String path) throws Exception {
    HttpResponse<String> response = get(path);
    assertEquals(status, response.statusCode(), path + " " + response.body());
    validate(Json.object().put("$ref", "#/components/schemas/Error"), response.body());
  }

  @ParameterizedTest
  @ValueSource(strings = {"", "[]", "{", "{\"profile\":[]}", "{\"profile\":{\"months\":[13]}}"})
  void aBadBodyIsRefused(String body) throws Exception {
    int status = post("api/advice", body).statusCode();
    assertTrue(status == 400 || status == 404, body + " gave " + status);
  }

  @Test
  void theDocumentListsTheParametersThatTheHandlersTake() {
    assertEquals(Questions.AIR, parameters("/api/air"));
    assertEquals(Questions.ADVICE, parameters("/api/advice"));
    assertEquals(Questions.PLACES, parameters("/api/places"));
    assertEquals(Questions.REGION, parameters("/api/region"));
  }

  private static Set<String> parameters(String path) {
    Set<String> names = new HashSet<>();
    document
        .at("/paths")
        .get(path)
        .at("/get/parameters")
        .forEach(parameter -> names.add(parameter.get("name").asText()));
    return names;
  }
}
