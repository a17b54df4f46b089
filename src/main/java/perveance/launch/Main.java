package perveance.launch;

import perveance.cli.CommandLines;

/** Starts Perveance. */
public final class Main {
  private Main() {}

  /**
   * Runs one command and ends with its exit code.
   *
   * @param args the command line
   */
  public static void main(String[] args) {
    System.exit(CommandLines.create().execute(args));
  }
}
