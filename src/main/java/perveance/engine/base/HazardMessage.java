package perveance.engine.base;

/** Findings about what can hurt: voltages, stored energy, time to discharge. */
public enum HazardMessage implements MessageCode {
  STORED_CHARGE("{0} holds {1} ({2}) after switch-off; measure before touching."),
  SLOW_DISCHARGE("{0} takes {1} to fall below {2} after switch-off."),
  NO_DISCHARGE_PATH("{0} has no path to discharge: it can hold {1} for hours after switch-off."),
  VALVE_PULLED("With {0} out of its socket, {1} rises to {2}.");

  private final String template;

  HazardMessage(String template) {
    this.template = template;
  }

  @Override
  public String template() {
    return template;
  }
}
