package perveance.engine.base;

/** Findings about the supply, the heaters and the chassis as a whole. */
public enum SupplyMessage implements MessageCode {
  SUPPLY_RIPPLE("Supply {0} carries {1} of ripple."),
  SUPPLY_SAGS("Supply {0} falls from {1} to {2} at full drive."),
  MAINS_HIGH("Mains at {0} against {1} nominal: every voltage, heaters too, is up by {2}."),
  HEATER_BUDGET_OVER("The heaters take {0}, over the winding's {1}."),
  RECTIFIER_OVER("{0}: {1} is over the maker's limit of {2} ({3})."),
  RESERVOIR_OVER("{0}: a reservoir of {1} is over the maker's limit of {2}.");

  private final String template;

  SupplyMessage(String template) {
    this.template = template;
  }

  @Override
  public String template() {
    return template;
  }
}
