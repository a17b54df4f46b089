package perveance.engine.device.fit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.device.Evidence;
import perveance.engine.device.SpreadTriodeLaw;
import perveance.engine.device.SpreadTriodeParameters;

/** Scaling a typical law to one valve. All derived: the factor is a quotient of two currents. */
class SpecimenFitTest {
  private static final DeviceLaw TYPICAL =
      new SpreadTriodeLaw(
          new SpreadTriodeParameters(1.13e-3, 0.59, 0.0096, 0.21, 0.3, 3, 3.9e-4, -0.6, 0.0862));

  private static Evidence measured(double va, OptionalDouble vg, OptionalDouble current) {
    OptionalDouble none = OptionalDouble.empty();
    return new Evidence(
        "triode", "point", va, vg, none, current, none, none, none, none, true, "bench", "", "",
        "");
  }

  private static double current(DeviceLaw law, double va, double vg) {
    ElectrodeCurrents out = new ElectrodeCurrents();
    law.evaluate(va, vg, 0, out);
    return out.current(ElectrodeCurrents.ANODE);
  }

  @Test
  void oneCurrentTellsTheConduction() {
    double typical = current(TYPICAL, 250, -2);
    SpecimenFit.Scaled scaled =
        assertInstanceOf(
            SpecimenFit.Scaled.class,
            SpecimenFit.scale(
                TYPICAL, measured(250, OptionalDouble.of(-2), OptionalDouble.of(0.8 * typical))));
    assertEquals(80, scaled.percentOfTypical(), 1e-9);
    assertEquals(typical, scaled.typicalCurrent(), 1e-15);
    assertEquals(0.8 * typical, current(scaled.law(), 250, -2), 1e-12);
    assertEquals(0.8 * current(TYPICAL, 100, -1), current(scaled.law(), 100, -1), 1e-12);
  }

  @Test
  void aPointThatTellsNothingIsRefusedWithTheReason() {
    OptionalDouble none = OptionalDouble.empty();
    assertTrue(reason(measured(250, OptionalDouble.of(-2), none)).contains("no anode current"));
    assertTrue(reason(measured(250, none, OptionalDouble.of(1e-3))).contains("no grid voltage"));
    assertTrue(
        reason(measured(250, OptionalDouble.of(-50), OptionalDouble.of(1e-3))).contains("cut off"));
  }

  private static String reason(Evidence measured) {
    return assertInstanceOf(SpecimenFit.NotScaled.class, SpecimenFit.scale(TYPICAL, measured))
        .reason();
  }
}
