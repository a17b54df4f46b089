package perveance.engine.base;

/** How much a finding matters, from the mildest to the worst; compare with the natural order. */
public enum Severity {
  NOTE("note"),
  CAUTION("caution"),
  OVER_LIMIT("over-limit"),
  DANGER("danger");

  private final String code;

  Severity(String code) {
    this.code = code;
  }

  /**
   * Returns the name used in machine-readable output.
   *
   * @return the name in lower case with hyphens, such as "over-limit"
   */
  public String code() {
    return code;
  }

  /**
   * Tells whether this severity means that the command line ends with status 1.
   *
   * @return true for over-limit and danger
   */
  public boolean breaksLimit() {
    return compareTo(OVER_LIMIT) >= 0;
  }
}
