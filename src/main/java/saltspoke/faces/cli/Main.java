package saltspoke.faces.cli;

/** Entry point of the runnable jar. */
public final class Main {
  private Main() {}

  public static void main(String[] args) {
    System.out.println("saltspoke");
  }
}
