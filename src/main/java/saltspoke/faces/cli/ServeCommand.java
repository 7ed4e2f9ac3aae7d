package saltspoke.faces.cli;

import java.io.PrintWriter;
import java.net.BindException;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;
import saltspoke.faces.Answers;
import saltspoke.faces.web.Api;
import saltspoke.faces.web.WebServer;
import saltspoke.values.Refusal;

/** {@code serve}: the page and the API on the loopback address. */
@Command(
    name = "serve",
    description = "Serve the page and the HTTP API on this machine (loopback only).",
    footer = {"", "Example:", "  saltspoke serve --port 8080"})
final class ServeCommand implements Callable<Integer> {
  @Spec private CommandSpec spec;
  @Mixin private CorrectionsOption corrections;
  @Mixin private CommonOptions common;

  @Option(names = "--port", paramLabel = "N", description = "TCP port, 0 for any free one (8080).")
  private int port = 8080;

  @Override
  public Integer call() throws Exception {
    if (port < 0 || port > 65535) {
      throw Refusal.outOfRange("port", port, "0..65535");
    }
    Answers answers = Opening.answers(common.data, corrections).prepare();
    PrintWriter out = spec.commandLine().getOut();
    try (WebServer server = Api.server(port, answers)) {
      Runtime.getRuntime().addShutdownHook(new Thread(() -> stop(server), "stop"));
      out.println(server.start());
      out.flush();
      server.join();
    } catch (java.io.IOException e) {
      if (e.getCause() instanceof BindException) {
        throw Refusal.outOfRange("port", port, "a port that no other program holds, or 0");
      }
      throw e;
    }
    return ExitCode.DONE;
  }

  private static void stop(WebServer server) {
    try {
      server.close();
    } catch (Exception e) {
      System.err.println("saltspoke: the server did not stop cleanly: " + e.getMessage());
    }
  }
}
