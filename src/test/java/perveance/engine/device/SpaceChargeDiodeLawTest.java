package perveance.engine.device;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;

/** The contract, for one anode of an indirectly heated rectifier, and the law's two limits. */
class SpaceChargeDiodeLawTest extends DeviceLawContractTest {
  private final DeviceLaw law = new SpaceChargeDiodeLaw(3e-3, 0.5, 0.09);

  @Override
  protected DeviceLaw law() {
    return law;
  }

  @Override
  protected double highestAnodeVoltage() {
    return 60;
  }

  @Override
  protected double lowestGridVoltage() {
    return 0;
  }

  @Override
  protected double highestGridVoltage() {
    return 0;
  }

  @Override
  protected double distanceToJoint(double anode, double grid, double screen) {
    return Double.POSITIVE_INFINITY;
  }

  /*
   * Derived. Case: 20 V, far above kT/e. Expected: G (V + Vc)^1.5 = 3e-3 * 20.5^1.5 = 0.278454 A.
   * Tolerance: six digits printed.
   */
  @Test
  @DisplayName("far above zero it is the three-halves law")
  void threeHalves() {
    ElectrodeCurrents out = new ElectrodeCurrents();
    law.evaluate(20, 0, 0, out);
    assertEquals(3e-3 * Math.pow(20.5, 1.5), out.current(ElectrodeCurrents.ANODE), 1e-12);
  }

  /*
   * Derived. Case: two voltages 0.1 V apart at -2 V and -2.1 V. Expected: a factor exp(0.1/0.09),
   * the retarding law. Tolerance 2e-5 relative: the joint's own remainder exp(-1.5/(1.5*0.09))
   * = 1.5e-5 times 3/4.
   */
  @Test
  @DisplayName("in the retarding region current falls by e for every kT/e")
  void retarding() {
    ElectrodeCurrents high = new ElectrodeCurrents();
    ElectrodeCurrents low = new ElectrodeCurrents();
    law.evaluate(-2, 0, 0, high);
    law.evaluate(-2.1, 0, 0, low);
    double factor = high.current(ElectrodeCurrents.ANODE) / low.current(ElectrodeCurrents.ANODE);
    assertEquals(1, factor / Math.exp(0.1 / 0.09), 2e-5);
  }
}
