package perveance.engine.base;

/** Findings about bias and the operating point. */
public enum BiasMessage implements MessageCode {
  CUT_OFF_IDLE("{0} is cut off at idle: anode current {1}."),
  GRID_CURRENT_IDLE("{0} draws grid current at idle: {1} at {2} on the grid."),
  ANODE_NEAR_SUPPLY("{0} idles with the anode at {1}, close to its supply of {2}."),
  ANODE_BOTTOMED("{0} idles bottomed: only {1} from anode to cathode."),
  LOW_CURRENT("{0} idles at {1}; below {2} the law, and so the gain, is less certain."),
  GRID_LEAK_VOLTAGE("{0}: grid current through {1} moves the grid by {2}."),
  COLD_START_GRID("{0}: before the valves warm its grid stands {1} above its cathode."),
  FIXED_BIAS_SPREAD("{0}: idle current may lie anywhere from {1} to {2}; set it by measurement."),
  BIAS_OUT_OF_RANGE("{0}: the bias of {1} cannot be set, only {2} to {3}."),
  BIAS_RANGE_SMALL(
      "{0}: its bias can be set from {1} to {2}; valves as they differ want {3} to {4}."),
  BIAS_WIPER_OPEN(
      "{0}: when the wiper of its bias control opens, nothing holds the grids and the valves run"
          + " away.");

  private final String template;

  BiasMessage(String template) {
    this.template = template;
  }

  @Override
  public String template() {
    return template;
  }
}
