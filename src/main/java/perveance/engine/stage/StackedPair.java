package perveance.engine.stage;

/** What two valves in series have in common: an equal share of the supply at rest. */
final class StackedPair {
  private StackedPair() {}

  /** What the lower valve takes with half the supply across it. */
  static double restingCurrent(StageValues values) {
    double supply = values.around().supplyVoltage().orElse(StageWiring.USUAL_SUPPLY);
    double cathode = values.number(StageKeys.CATHODE_VOLTAGE.key(), 0);
    double grid = values.number(StageKeys.GRID_BIAS.key(), 0) - cathode;
    double anode = 0.5 * supply - cathode;
    double current = RestingCurrent.onLine(values.device().law(), anode, 0, grid, anode);
    return Math.max(StageWiring.LEAST_CURRENT, current);
  }

  /** Names the points to measure, from the top down. */
  static void testPoints(
      StageWiring wiring, int upperCathode, int lowerAnode, int cathode, int grid) {
    String lower = ValvePair.first(wiring.values());
    wiring.testPoint(upperCathode, ValvePair.second(wiring.values()), "cathode");
    if (lowerAnode != upperCathode) {
      wiring.testPoint(lowerAnode, lower, "anode");
    }
    if (cathode != 0) {
      wiring.testPoint(cathode, lower, "cathode");
    }
    wiring.testPoint(grid, lower, "grid");
  }
}
