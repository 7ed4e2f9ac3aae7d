package saltspoke.faces.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.zip.GZIPInputStream;
import javax.imageio.ImageIO;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import saltspoke.atlas.AtlasLayer;
import saltspoke.faces.Texts;
import saltspoke.faces.picture.LayerStyles;

@Tag("law")
class AtlasCommandTest {
  private final StringWriter err = new StringWriter();
  private final StringWriter out = new StringWriter();

  @TempDir Path folder;

  private int run(String... args) {
    return Main.run(args, new PrintWriter(out), new PrintWriter(err));
  }

  @Test
  void writesAllThreeFormsAndLeavesNothingElse() throws IOException {
    Path tif = folder.resolve("a.tif");
    Path png = folder.resolve("a.png");
    Path json = folder.resolve("a.geojson");
    int code =
        run(
            "atlas",
            "--layer",
            "class-zinc",
            "--box",
            "-6,46,0,50",
            "--step",
            "0.5",
            "--out",
            tif.toString(),
            "--out",
            png.toString(),
            "--out",
            json.toString());
    assertEquals(ExitCode.DONE, code, err.toString());
    try (var files = Files.list(folder)) {
      assertEquals(3, files.count());
    }
    assertTrue(ImageIO.read(png.toFile()).getWidth() >= 900);
    JsonNode collection = new ObjectMapper().readTree(json.toFile());
    assertGeoJson(collection);
    boolean finistere = false;
    for (JsonNode feature : collection.path("features")) {
      JsonNode about = feature.path("properties");
      double shares = 0;
      for (String c : new String[] {"C1", "C2", "C3", "C4", "C5", "CX"}) {
        shares += about.path("share_" + c).asDouble();
      }
      assertEquals(1, shares, 6 * 0.00005, about.toString());
      finistere |= about.path("name").asText().equals("Finistère");
    }
    assertTrue(finistere);
  }

  @Test
  void theShippedRegionsKeepTheRulesToo() throws IOException {
    try (GZIPInputStream in =
        new GZIPInputStream(
            Files.newInputStream(Path.of("climate-data/regions/regions.geojson.gz")))) {
      assertGeoJson(new ObjectMapper().readTree(in));
    }
  }

  /** Rules of RFC 7946 that a program can check: sections 3, 3.1.1, 3.1.6, 4 and 7.1. */
  private static void assertGeoJson(JsonNode collection) {
    assertEquals("FeatureCollection", collection.path("type").asText());
    assertFalse(collection.has("crs"), "a crs member");
    assertFalse(
        collection.has("geometry") || collection.has("properties") || collection.has("coordinates"),
        "members of other types");
    assertTrue(collection.path("features").isArray() && collection.path("features").size() > 0);
    for (JsonNode feature : collection.path("features")) {
      String name = feature.path("properties").path("name").asText();
      assertEquals("Feature", feature.path("type").asText());
      assertTrue(feature.path("properties").isObject(), name);
      assertEquals("MultiPolygon", feature.at("/geometry/type").asText());
      for (JsonNode polygon : feature.at("/geometry/coordinates")) {
        for (int r = 0; r < polygon.size(); r++) {
          assertRing(polygon.get(r), r == 0, name);
        }
      }
    }
  }

  private static void assertRing(JsonNode ring, boolean outer, String name) {
    assertTrue(ring.size() >= 4, name + ": a ring of " + ring.size());
    assertEquals(ring.get(0), ring.get(ring.size() - 1), name + ": not closed");
    double twiceArea = 0;
    for (int i = 0; i < ring.size(); i++) {
      JsonNode at = ring.get(i);
      assertEquals(2, at.size(), name);
      assertTrue(Math.abs(at.get(0).asDouble()) <= 180, name + ": longitude " + at);
      assertTrue(Math.abs(at.get(1).asDouble()) <= 90, name + ": latitude " + at);
      if (i > 0) {
        JsonNode before = ring.get(i - 1);
        twiceArea +=
            before.get(0).asDouble() * at.get(1).asDouble()
                - at.get(0).asDouble() * before.get(1).asDouble();
      }
    }
    // A sliver of no area to the last digit has no direction.
    assertTrue(outer ? twiceArea > -1e-6 : twiceArea < 1e-6, name + ": left-handed " + twiceArea);
  }

  @Test
  void aRegionIsTakenByNameOrPolygon() throws IOException {
    assertEquals(ExitCode.DONE, run("region", "Cornwall", "--json"), err.toString());
    JsonNode named = new ObjectMapper().readTree(out.toString());
    assertTrue(named.path("people").asLong() > 300_000, named.toString());
    assertEquals(0, named.path("pairings").size());

    Path file = folder.resolve("drawn.geojson");
    Files.writeString(
        file,
        "{\"type\":\"Feature\",\"properties\":null,\"geometry\":{\"type\":\"Polygon\","
            + "\"coordinates\":[[[-6,49.9],[-4,49.9],[-4,50.7],[-6,50.7],[-6,49.9]]]}}");
    out.getBuffer().setLength(0);
    int code =
        run(
            "region",
            "--polygon",
            file.toString(),
            "--profile",
            "all-winter-commuter",
            "--rim",
            "carbon-bare",
            "--nipple",
            "brass-nickel",
            "--sample",
            "4",
            "--json");
    assertEquals(ExitCode.DONE, code, err.toString());
    JsonNode drawn = new ObjectMapper().readTree(out.toString());
    assertTrue(drawn.path("pairings").size() > 0);
    JsonNode first = drawn.at("/pairings/0/firstLookMonths");
    assertTrue(first.path("p10").asDouble() <= first.path("p90").asDouble());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {
        "2; atlas --layer class-zinc",
        "2; atlas --layer class-tin --out x.tif",
        "2; atlas --layer class-zinc --out x.jpg",
        "2; atlas --layer class-zinc --out x.tif --crs WGS84",
        "2; atlas --layer class-zinc --out x.tif --box 1,2,3",
        "3; atlas --layer class-zinc --out x.tif --box 1,50,3,40",
        "3; atlas --layer class-zinc --out x.tif --step 0",
        "3; atlas --layer class-zinc --out x.tif --step 0.001",
        "3; atlas --layer class-zinc --out x.tif --crs EPSG:99999",
        "2; atlas --layer first-look --out x.tif",
        "2; atlas --layer first-look --out x.tif --profile all-winter-commuter",
        "2; region",
        "2; region Nord",
        "3; region Nowhereland",
        "3; region --polygon missing.geojson"
      })
  void wrongQuestionsEndWithTheirCode(int code, String line) {
    assertEquals(code, run(line.split(" ")), err.toString());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {
        "[1,2]",
        "{\"type\":\"Polygon\",\"coordinates\":[[[0,0],[1,0],[1,1]]]}",
        "{\"type\":\"Polygon\",\"coordinates\":[[[0,0],[900,0],[1,1],[0,0]]]}",
        "{\"type\":\"Polygon\",\"coordinates\":[0,1]}",
        "{\"type\":\"Point\",\"coordinates\":[0,1]}",
        "{\"type\":\"Polygon\",\"coordinates\":[[[0,0],"
      })
  void brokenPolygonsAreRefusedAndNoFault(String text) throws IOException {
    Path file = folder.resolve("broken.geojson");
    Files.writeString(file, text);
    int code = run("region", "--polygon", file.toString());
    assertTrue(code == 2 || code == 3, code + ": " + err);
  }

  @Test
  void everyLayerHasAStyleAndATitleInEveryLanguage() {
    for (AtlasLayer layer : AtlasLayer.values()) {
      assertEquals(layer.id(), LayerStyles.of(layer).layer());
      for (String language : Texts.LANGUAGES) {
        String code = "page-layer-" + layer.id();
        assertFalse(Texts.in(language).say(code).equals(code), language + " " + code);
      }
    }
  }
}
