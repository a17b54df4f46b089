package perveance.engine.analysis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import perveance.engine.circuit.DcOutcome;
import perveance.engine.circuit.DcSolver;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.ChassisCircuits;

/** Chassis whose dc point is found by the last of the fallbacks alone. */
class HardPointsTest {
  /**
   * A lower valve cut off to nothing, and an upper grid tied by 0.01 ohm to its foot: what flows is
   * the upper grid's own current of some 0.2 uA through the upper resistor. Derived: Kirchhoff's
   * law, and the upper valve, which nothing loads, stands with its cathode at its anode's voltage,
   * to a volt.
   */
  @Test
  void anUpperValveOverALowerOneThatIsCutOff() {
    Chassis chassis =
        Bench.on(100.76454861672178)
            .dropped("B", "A", 5015.193807042464, 4e-4)
            .stage(
                "V1",
                "mu-follower",
                "device",
                "6SL7GT",
                "supply",
                "B",
                "anode_load",
                "19371.240787908413",
                "upper_resistor",
                "721.6285793184873",
                "upper_grid_leak",
                "0.01",
                "cathode_resistor",
                "0.01",
                "grid_bias",
                "-21.177063195338718")
            .chassis();
    DcOutcome outcome =
        new DcSolver(new ChassisCircuits(chassis, Bench.LIBRARY).whole().circuit()).solve();
    DcOutcome.Converged found = assertInstanceOf(DcOutcome.Converged.class, outcome);
    assertEquals(DcOutcome.Method.PSEUDO_TIME, found.method());
    assertTrue(found.residual() < 1e-9, found.toString());
    assertEquals(100.76, found.solution().voltage("V1.upper_cathode"), 1);
    assertEquals(0, found.solution().current("V1a"), 1e-9);
  }
}
