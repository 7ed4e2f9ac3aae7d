package saltspoke.faces.web;

import java.nio.file.Path;
import java.util.Optional;

/**
 * Where and how to serve.
 *
 * @param address address or host name to bind
 * @param port TCP port, 0 for any free one
 * @param tls key for HTTPS, plain HTTP without
 * @param accessLog file for one line per request, {@code -} for standard output, none without
 */
public record ServerSettings(
    String address, int port, Optional<Tls> tls, Optional<String> accessLog) {
  /** The address that only programs of the same machine can reach. */
  public static final String LOOPBACK = "127.0.0.1";

  /**
   * A key and certificate.
   *
   * @param keystore PKCS #12 or JKS file
   * @param password what opens it
   */
  public record Tls(Path keystore, String password) {}

  /** Plain HTTP on the loopback address without a log. */
  public static ServerSettings local(int port) {
    return new ServerSettings(LOOPBACK, port, Optional.empty(), Optional.empty());
  }

  String scheme() {
    return tls.isPresent() ? "https" : "http";
  }
}
