package saltspoke.faces.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.net.BindException;
import java.net.InetAddress;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;
import saltspoke.faces.Answers;
import saltspoke.faces.web.Api;
import saltspoke.faces.web.ServerSettings;
import saltspoke.faces.web.WebServer;
import saltspoke.values.Refusal;

/** {@code serve}: the page and the API, on the loopback address unless told otherwise. */
@Command(
    name = "serve",
    description = "Serve the page and the HTTP API on this machine (loopback unless --bind).",
    footer = {"", "Example:", "  saltspoke serve --port 8080"})
final class ServeCommand implements Callable<Integer> {
  @Spec private CommandSpec spec;
  @Mixin private CorrectionsOption corrections;
  @Mixin private CommonOptions common;

  @Option(names = "--port", paramLabel = "N", description = "TCP port, 0 for any free one (8080).")
  private int port = 8080;

  @Option(
      names = "--bind",
      paramLabel = "ADDRESS",
      description = "Serve on this address of the machine too, so that others can reach it.")
  private String address = ServerSettings.LOOPBACK;

  @Option(
      names = "--tls-keystore",
      paramLabel = "FILE",
      description = "Serve HTTPS with the key and certificate in this PKCS #12 file.")
  private Path keystore;

  @Option(
      names = "--tls-password-file",
      paramLabel = "FILE",
      description = "File whose first line is the keystore's password.")
  private Path passwordFile;

  @Option(
      names = "--access-log",
      paramLabel = "FILE",
      description = "Write one line per request in the common log format; - for standard output.")
  private String accessLog;

  @Override
  public Integer call() throws Exception {
    if (port < 0 || port > 65535) {
      throw Refusal.outOfRange("port", port, "0..65535");
    }
    Answers answers = Opening.answers(common.data, corrections).prepare();
    PrintWriter out = spec.commandLine().getOut();
    ServerSettings settings =
        new ServerSettings(address, port, tls(), Optional.ofNullable(accessLog));
    if (!InetAddress.getByName(address).isLoopbackAddress()) {
      spec.commandLine().getErr().println(openWarning());
    }
    try (WebServer server = Api.server(settings, answers)) {
      Runtime.getRuntime().addShutdownHook(new Thread(() -> stop(server), "stop"));
      out.println(server.start());
      out.flush();
      server.join();
    } catch (IOException e) {
      if (e.getCause() instanceof BindException) {
        throw Refusal.outOfRange(
            "port",
            address + ":" + port,
            "an address of this machine and a port that no other program holds, or 0");
      }
      throw e;
    }
    return ExitCode.DONE;
  }

  private String openWarning() {
    return "saltspoke: serving on "
        + address
        + ": whoever reaches this machine over the network can use it; there are no accounts."
        + (keystore == null ? " Questions and answers travel unencrypted." : "");
  }

  private Optional<ServerSettings.Tls> tls() throws IOException {
    if ((keystore == null) != (passwordFile == null)) {
      throw Refusal.wrongUse(
          "tls-half-given", "tls-keystore", "", "--tls-keystore and --tls-password-file together");
    }
    if (keystore == null) {
      return Optional.empty();
    }
    for (Path file : new Path[] {keystore, passwordFile}) {
      if (!Files.isReadable(file)) {
        throw Refusal.notFound("no-such-file", "tls", file.toString(), "a file that can be read");
      }
    }
    String password = Files.readString(passwordFile).lines().findFirst().orElse("");
    return Optional.of(new ServerSettings.Tls(keystore, password));
  }

  private static void stop(WebServer server) {
    try {
      server.close();
    } catch (Exception e) {
      System.err.println("saltspoke: the server did not stop cleanly: " + e.getMessage());
    }
  }
}
