package perveance.launch;

/** Starts Perveance. */
public final class Main {
  private Main() {}

  /**
   * Starts the program; no command is wired yet, so it only returns.
   *
   * @param args the command line
   */
  public static void main(String[] args) {}
}
