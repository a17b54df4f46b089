package perveance.engine.device;

/** The contract, for a beam tetrode with aligned grids and a sharp knee. */
class SpreadBeamLawTest extends DeviceLawContractTest {
  private final DeviceLaw law =
      new SpreadPentodeLaw(
          new SpreadPentodeParameters(
              1.12e-3, 0.5, 1 / 8.8, 0.42, 0.3, 0.04, 0.075, 1, 0.8, 0.35, 0.12, 3, 4e-4, -0.5,
              0.09));

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
    return -100;
  }

  @Override
  protected double highestGridVoltage() {
    return 10;
  }

  @Override
  protected double highestScreenVoltage() {
    return 400;
  }
}
