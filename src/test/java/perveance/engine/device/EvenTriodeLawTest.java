package perveance.engine.device;

/** The contract, for a triode without any spread: the plain three-halves law, sharp at cut-off. */
class EvenTriodeLawTest extends DeviceLawContractTest {
  private static final double MU = 20;

  private final DeviceLaw law =
      new SpreadTriodeLaw(
          new SpreadTriodeParameters(9e-4, 0.6, 1 / MU, 0, 0, 3, 3e-4, -0.6, 0.0862));

  @Override
  protected DeviceLaw law() {
    return law;
  }

  @Override
  protected double highestAnodeVoltage() {
    return 300;
  }

  @Override
  protected double lowestGridVoltage() {
    return -16;
  }

  @Override
  protected double highestGridVoltage() {
    return 5;
  }

  /** The slope is continuous at cut-off but its own slope is infinite there. */
  @Override
  protected double distanceToJoint(double anode, double grid, double screen) {
    double effective = grid + 0.6 + Math.max(0, anode) / MU;
    return Math.min(Math.abs(anode), Math.abs(effective) < 0.01 ? 0 : 1);
  }
}
