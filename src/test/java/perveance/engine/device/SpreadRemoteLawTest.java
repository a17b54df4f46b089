package perveance.engine.device;

/** The contract, for a small pentode whose grid has wide turns on a part of its length. */
class SpreadRemoteLawTest extends DeviceLawContractTest {
  private final DeviceLaw law =
      new SpreadPentodeLaw(
          new SpreadPentodeParameters(
              8e-4, 0.4, 0.072, 0.57, 0.3, 0.05, 3, 0.001, 0.3, 0.2, 0.5, 0, 0.08, 1.5, 2.8e-4,
              -0.6, 0.0862));

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
    return -60;
  }

  @Override
  protected double highestGridVoltage() {
    return 2;
  }

  @Override
  protected double highestScreenVoltage() {
    return 125;
  }
}
