package perveance.engine.base;

/** Findings about resistors, capacitors and other parts. */
public enum PartMessage implements MessageCode {
  RESISTOR_POWER_OVER("{0} dissipates {1}, over its rating of {2}."),
  RESISTOR_POWER_NEAR("{0} dissipates {1}, {2} of its rating of {3}."),
  RESISTOR_FAULT_OVER("{0} takes {1} with {2}, over its rating of {3}."),
  RESISTOR_VOLTAGE_OVER("{0} sees {1}, over its voltage limit of {2}."),
  CAPACITOR_VOLTAGE_OVER("{0} sees {1}, over its rating of {2}."),
  CAPACITOR_COLD_START("{0} sees {1} before the valves warm; it must be rated for that."),
  NOT_PREFERRED("{0} is {1}, which is not a preferred value; the nearest is {2}.");

  private final String template;

  PartMessage(String template) {
    this.template = template;
  }

  @Override
  public String template() {
    return template;
  }
}
