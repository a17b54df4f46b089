package perveance.engine.device;

/** The three rating systems of valve data (IEC 60134), and the case where the sheet is silent. */
public enum RatingSystem {
  /** Limits for a bogey valve at nominal conditions; normal mains swing is already allowed for. */
  DESIGN_CENTRE("design-centre"),
  /** Limits for a bogey valve under the worst probable conditions. */
  DESIGN_MAXIMUM("design-maximum"),
  /** Limits that no valve may exceed under any condition. */
  ABSOLUTE("absolute"),
  /** The sheet does not say. */
  UNSTATED("unstated");

  private final String word;

  RatingSystem(String word) {
    this.word = word;
  }

  /**
   * Name used in files and reports.
   *
   * @return for example {@code design-centre}
   */
  public String word() {
    return word;
  }
}
