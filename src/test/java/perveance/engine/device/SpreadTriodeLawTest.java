package perveance.engine.device;

/** The contract, for a small-signal double triode of high mu. */
class SpreadTriodeLawTest extends DeviceLawContractTest {
  private final DeviceLaw law =
      new SpreadTriodeLaw(
          new SpreadTriodeParameters(1.16e-3, 0.62, 1 / 107.5, 0.41, 0.3, 3, 4e-4, -0.6, 0.0862));

  @Override
  protected DeviceLaw law() {
    return law;
  }

  @Override
  protected double highestAnodeVoltage() {
    return 400;
  }

  @Override
  protected double lowestGridVoltage() {
    return -7;
  }

  @Override
  protected double highestGridVoltage() {
    return 3;
  }
}
