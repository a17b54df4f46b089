package perveance.engine.base;

/** Findings about the supply, the heaters and the chassis as a whole. */
public enum SupplyMessage implements MessageCode {
  SUPPLY_SAGS("Supply {0} falls from {1} to {2} at the stated drive."),
  MAINS_HIGH("Mains at {0} against {1} nominal: every voltage, heaters too, is up by {2}."),
  HEATER_BUDGET_OVER("The heaters take {0}, over the winding's {1}.");

  private final String template;

  SupplyMessage(String template) {
    this.template = template;
  }

  @Override
  public String template() {
    return template;
  }
}
