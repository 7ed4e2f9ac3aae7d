package saltspoke.faces.cli;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.PrintWriter;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;
import saltspoke.faces.Texts;
import saltspoke.faces.json.CatalogueJson;
import saltspoke.faces.json.Json;
import saltspoke.wheel.Catalogue;
import saltspoke.wheel.Profiles;

/** {@code pairings}: the parts that can be asked for, what fits what, and the ready profiles. */
@Command(
    name = "pairings",
    description = "List rims, nipples, interfaces, spokes, valid pairings, and riding profiles.",
    footer = {"", "Example:", "  saltspoke pairings --json"})
final class PairingsCommand implements Callable<Integer> {
  @Spec private CommandSpec spec;
  @Mixin private CommonOptions common;

  @Override
  public Integer call() {
    Catalogue catalogue = Catalogue.shipped();
    Profiles profiles = Profiles.shipped();
    PrintWriter out = spec.commandLine().getOut();
    if (common.json) {
      ObjectNode node = CatalogueJson.of(catalogue);
      node.set("profiles", CatalogueJson.of(profiles).get("profiles"));
      out.println(Json.pretty(node));
      return ExitCode.DONE;
    }
    Texts texts = Texts.in(common.language == null ? "en" : common.language);
    out.println("Rims");
    catalogue.rims().forEach(rim -> line(out, texts, "rim", rim.id()));
    out.println("Nipples");
    catalogue.nipples().forEach(nipple -> line(out, texts, "nipple", nipple.id()));
    out.println("Interfaces");
    catalogue.interfaces().forEach(between -> line(out, texts, "interface", between.id()));
    out.println("Spokes");
    catalogue.spokes().forEach(spoke -> line(out, texts, "spoke", spoke.id()));
    out.println("Profiles");
    profiles.all().forEach(profile -> out.printf("  %-26s %s%n", profile.name(), profile.title()));
    out.printf("%d valid pairings; --json lists them.%n", catalogue.pairings().size());
    return ExitCode.DONE;
  }

  private static void line(PrintWriter out, Texts texts, String kind, String id) {
    out.printf("  %-26s %s%n", id, texts.say(kind + "-" + id));
  }
}
