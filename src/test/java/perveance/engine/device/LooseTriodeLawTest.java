package perveance.engine.device;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

/** The contract, for a triode with loose places in its grid. */
class LooseTriodeLawTest extends DeviceLawContractTest {
  private static final double SHARE = 0.025;
  private static final double RATIO = 2.2;

  private final DeviceLaw law = law(SHARE, RATIO);

  private static DeviceLaw law(double share, double ratio) {
    return new SpreadTriodeLaw(
        new SpreadTriodeParameters(
            2.7e-3, 0.57, 1 / 70.0, 0.45, 0.3, share, ratio, 3, 9.6e-4, -0.6, 0.0862));
  }

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
    return 3;
  }

  /**
   * Derived: the law is the sum of an even grid on most of the cathode and of one that is RATIO
   * times as open on the rest. Exact but for rounding.
   */
  @Test
  void itIsTheSumOfTwoEvenGrids() {
    ElectrodeCurrents both = new ElectrodeCurrents();
    ElectrodeCurrents most = new ElectrodeCurrents();
    ElectrodeCurrents rest = new ElectrodeCurrents();
    for (double grid = -14; grid <= -1; grid += 0.5) {
      law.evaluate(250, grid, 0, both);
      law(0, 1).evaluate(250, grid, 0, most);
      law(1, RATIO).evaluate(250, grid, 0, rest);
      double expected =
          (1 - SHARE) * most.current(ElectrodeCurrents.ANODE)
              + SHARE * rest.current(ElectrodeCurrents.ANODE);
      assertEquals(expected, both.current(ElectrodeCurrents.ANODE), 1e-12);
    }
  }

  /** Derived: beyond the even grid's cut-off the loose places alone conduct. */
  @Test
  void aLittleCurrentFlowsBeyondTheEvenGridsCutOff() {
    ElectrodeCurrents even = new ElectrodeCurrents();
    ElectrodeCurrents loose = new ElectrodeCurrents();
    law(0, 1).evaluate(250, -9, 0, even);
    law.evaluate(250, -9, 0, loose);
    assertEquals(0, even.current(ElectrodeCurrents.ANODE), 1e-9);
    double current = loose.current(ElectrodeCurrents.ANODE);
    assertTrue(current > 1e-6 && current < 1e-3, "" + current);
  }
}
