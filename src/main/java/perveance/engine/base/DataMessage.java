package perveance.engine.base;

/** Findings about how far the answer can be trusted. */
public enum DataMessage implements MessageCode {
  OUTSIDE_EVIDENCE("{0} works outside its published data: {1}."),
  SPREAD_ASSUMED(
      "{0}: one published point only; the spread of its grid is the usual one of its class, {1}."),
  BAND_CAUSE("{0}: {1} of the doubt in the {2} comes from {3}; measured, the band is {4}."),
  FIT_LOOSE("{0}: the law misses the {1} at {2}, one of the figures it was fitted to, by {3}."),
  NOT_SOLVED("{0}: no operating point was found: {1}.");

  private final String template;

  DataMessage(String template) {
    this.template = template;
  }

  @Override
  public String template() {
    return template;
  }
}
