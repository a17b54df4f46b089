package perveance.engine.base;

/** Findings about output stages and their loads. */
public enum OutputMessage implements MessageCode {
  LOAD_OFF_BEST("{0} works into {1}; the most power within limits comes near {2}."),
  POWER_SMALL("{0} gives {1} clean into {2}, only {3} of the {4} its valves take idle."),
  LOWER_LOAD_OVER("{0} into half its load: {1} is {2} at drive, over the maker's limit of {3}."),
  SCREEN_RISES("{0}: at drive the screens take {1}, against {2} at idle."),
  REACTIVE_DISSIPATION(
      "{0} into its reactive load at {1}: mean anode dissipation is {2}, over the maker's limit of"
          + " {3}."),
  REACTIVE_CUT_OFF(
      "{0} is cut off in part of the cycle into its reactive load at {1}, which it is not into the"
          + " resistance."),
  PAIR_UNBALANCED("{0}: the two sides differ by {1} at idle."),
  OUTPUTS_UNBALANCED("{0}: the gains to its two outputs differ by {1}.");

  private final String template;

  OutputMessage(String template) {
    this.template = template;
  }

  @Override
  public String template() {
    return template;
  }
}
