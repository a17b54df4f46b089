package perveance.engine.base;

/** Findings about the maker's limits of a device. */
public enum RatingMessage implements MessageCode {
  ANODE_VOLTAGE_OVER("{0}: anode voltage {1} is over the maker's limit of {2} ({3})."),
  ANODE_VOLTAGE_NEAR("{0}: anode voltage {1} uses {2} of the maker's limit of {3}."),
  ANODE_DISSIPATION_OVER("{0}: anode dissipation {1} is over the maker's limit of {2} ({3})."),
  ANODE_DISSIPATION_NEAR("{0}: anode dissipation {1} uses {2} of the maker's limit of {3}."),
  SCREEN_VOLTAGE_OVER("{0}: screen voltage {1} is over the maker's limit of {2} ({3})."),
  SCREEN_VOLTAGE_NEAR("{0}: screen voltage {1} uses {2} of the maker's limit of {3}."),
  SCREEN_DISSIPATION_OVER("{0}: screen dissipation {1} is over the maker's limit of {2} ({3})."),
  SCREEN_DISSIPATION_NEAR("{0}: screen dissipation {1} uses {2} of the maker's limit of {3}."),
  CATHODE_CURRENT_OVER("{0}: cathode current {1} is over the maker's limit of {2} ({3})."),
  CATHODE_CURRENT_NEAR("{0}: cathode current {1} uses {2} of the maker's limit of {3}."),
  HEATER_CATHODE_OVER("{0}: heater to cathode {1} is over the maker's limit of {2} ({3})."),
  HEATER_CATHODE_NEAR("{0}: heater to cathode {1} uses {2} of the maker's limit of {3}."),
  GRID_LEAK_OVER("{0}: grid circuit resistance {1} is over the maker's limit of {2} ({3})."),
  HEATER_VOLTAGE_OUTSIDE("{0}: heater voltage {1} is outside {2} of the rated {3}."),
  BOTH_ANODES_OVER("{0}: both anodes together dissipate {1}, over the maker's limit of {2} ({3})."),
  COLD_START_ANODE_OVER("{0}: before the cathode warms the anode sees {1}, over its limit of {2}."),
  NO_RATING("{0}: the device file has no limit for {1}, so none was checked.");

  private final String template;

  RatingMessage(String template) {
    this.template = template;
  }

  @Override
  public String template() {
    return template;
  }
}
