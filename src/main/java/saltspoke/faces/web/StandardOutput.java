package saltspoke.faces.web;

import org.eclipse.jetty.server.RequestLog;

/** Writes the access log to the program's standard output. */
final class StandardOutput implements RequestLog.Writer {
  @Override
  public void write(String line) {
    System.out.println(line);
  }
}
