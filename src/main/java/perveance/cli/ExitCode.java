package perveance.cli;

/** How the program ends. */
public enum ExitCode {
  /** Done. */
  DONE(0),
  /** Done, with an over-limit or danger finding other than the standing caution. */
  OVER_LIMIT(1),
  /** Bad input. */
  BAD_INPUT(2),
  /** Could not solve. */
  NOT_SOLVED(3),
  /** A fault of the program. */
  INTERNAL_ERROR(70);

  private final int number;

  ExitCode(int number) {
    this.number = number;
  }

  /**
   * Number handed to the system.
   *
   * @return exit status
   */
  public int number() {
    return number;
  }
}
