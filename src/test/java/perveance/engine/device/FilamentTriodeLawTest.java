package perveance.engine.device;

/** The contract, for a directly heated power triode of low mu. */
class FilamentTriodeLawTest extends DeviceLawContractTest {
  private final DeviceLaw law =
      new SpreadTriodeLaw(
          new SpreadTriodeParameters(9.19e-4, 0.1, 1 / 3.9, 0.088, 2.8, 5, 3.2e-4, 0, 0.0862));

  @Override
  protected DeviceLaw law() {
    return law;
  }

  @Override
  protected double highestAnodeVoltage() {
    return 500;
  }

  @Override
  protected double lowestGridVoltage() {
    return -190;
  }

  @Override
  protected double highestGridVoltage() {
    return 40;
  }
}
