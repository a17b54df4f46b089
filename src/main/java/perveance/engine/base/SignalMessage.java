package perveance.engine.base;

/** Findings about signal: headroom, distortion, response, noise. */
public enum SignalMessage implements MessageCode {
  GRID_CURRENT_FIRST("{0} overloads by grid current first, at {1} peak in; {2}."),
  CUT_OFF_FIRST("{0} overloads by cut-off first, at {1} peak in; {2}."),
  KNEE_FIRST("{0} overloads at the anode knee first, at {1} peak in."),
  BOTTOMING_FIRST(
      "{0} overloads by bottoming first, at {1} peak in: its anode can fall no further."),
  SUPPLY_FIRST(
      "{0} overloads first by the end of its supply, at {1} peak in: its anode can rise no"
          + " further."),
  NO_HEADROOM("{0} is driven with {1} peak but is clean only to {2}."),
  LITTLE_HEADROOM("{0} has only {1} of headroom over the stated drive."),
  HIGH_DISTORTION("{0} distorts {1} at the stated drive."),
  LOW_CORNER_HIGH("{0}: the low corner is {1}."),
  HIGH_CORNER_LOW("{0}: the high corner is {1}, set by {2} and {3}."),
  BYPASS_SHELF("{0}: below {1} the gain falls by {2} because {3} stops bypassing."),
  BLOCKING("{0}: twice the clean input charges {1} by {2}; the bias then takes {3} to recover."),
  DRIVER_THIN("{0} has only {1} in hand over what drives {2} to its limit."),
  DRIVER_SHORT("{0} overloads before {1}: it gives {2} peak cleanly where {1} wants {3} of it."),
  ROW_OVERDRIVEN("{0}: the stated drive of {1} overloads {2}; the row is clean to {3}."),
  HIGH_NOISE("{0}: noise at the input is {1}, most of it from {2}.");

  private final String template;

  SignalMessage(String template) {
    this.template = template;
  }

  @Override
  public String template() {
    return template;
  }

  @Override
  public boolean lowerIsWorse() {
    return this == LITTLE_HEADROOM
        || this == NO_HEADROOM
        || this == HIGH_CORNER_LOW
        || this == DRIVER_THIN
        || this == DRIVER_SHORT;
  }
}
