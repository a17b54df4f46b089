package perveance.engine.circuit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import perveance.engine.circuit.DcOutcome.Cause;
import perveance.engine.circuit.DcOutcome.Converged;
import perveance.engine.circuit.DcOutcome.NotConverged;
import perveance.engine.device.ElectrodeCurrents;

/** The dc point against closed forms, and circuits that have none. */
class DcSolverTest {
  private static final ThreeHalvesTriode LAW = new ThreeHalvesTriode(1.6e-3, 100, 0.6, 1e-5, 0.1);

  private static DcSolution point(Circuit circuit) {
    return assertInstanceOf(Converged.class, new DcSolver(circuit).solve()).solution();
  }

  /** derived: divider 300 V, 220 k over 80 k, so 80 V at the tap and 1 mA; exact but rounding. */
  @Test
  void dividerHalvesAsComputed() {
    DcSolution point =
        point(
            new CircuitSketch()
                .source("supply", "B", "0", 300)
                .resistor("upper", "B", "tap", 220e3)
                .resistor("lower", "tap", "0", 80e3)
                .build());
    assertEquals(80, point.voltage("tap"), 1e-10);
    assertEquals(1e-3, point.current("lower"), 1e-15);
    assertEquals(-0.3, point.power("supply"), 1e-12);
    assertEquals(-1e-3, point.current("supply"), 1e-15);
  }

  /**
   * derived: a source between two unknown nodes, 10 V up from a 1 k / 1 k divider of 20 V. The
   * branch equations give va = 10 V + vb; Kirchhoff at both nodes: (20 - va)/1k = vb/1k, vb = 5 V.
   */
  @Test
  void sourceBetweenUnknownNodes() {
    DcSolution point =
        point(
            new CircuitSketch()
                .source("supply", "in", "0", 20)
                .resistor("r1", "in", "a", 1e3)
                .source("shift", "a", "b", 10)
                .resistor("r2", "b", "0", 1e3)
                .build());
    assertEquals(5, point.voltage("b"), 1e-12);
    assertEquals(15, point.voltage("a"), 1e-12);
    assertEquals(5e-3, point.current("shift"), 1e-15);
  }

  /** derived: a winding without resistance is a short at dc: 100 V / 10 k = 10 mA through it. */
  @Test
  void windingWithoutResistanceIsAShort() {
    DcSolution point =
        point(
            new CircuitSketch()
                .source("supply", "B", "0", 100)
                .inductor("choke", "B", "a", 10, 0)
                .resistor("load", "a", "0", 10e3)
                .holds("reservoir", "a", "0", 1e-6)
                .build());
    assertEquals(100, point.voltage("a"), 1e-12);
    assertEquals(10e-3, point.current("choke"), 1e-15);
    assertEquals(0, point.current("reservoir"));
  }

  /**
   * derived: cathode bias. The point must satisfy Ia = G (Vc + Vg - Ia Rk + (Vb - Ia (Ra + Rk)) /
   * mu)^1.5 by itself; the law is put in by hand with the current that was found. Tolerance:
   * rounding.
   */
  @Test
  void cathodeBiasedStageObeysItsLaw() {
    DcSolution point = point(stage(300, 100e3, 1.5e3));
    double ia = point.current("V1");
    double vk = (ia + point.valve("V1").current(ElectrodeCurrents.GRID)) * 1.5e3;
    double va = 300 - ia * 100e3 - vk;
    double drive = 0.6 + point.voltage("g") - vk + va / 100;
    assertEquals(1.6e-3 * Math.pow(drive, 1.5), ia, 1e-12);
    assertEquals(vk, point.valve("V1").cathodeVoltage(), 1e-6);
    assertEquals(0, point.powerBalance(), 1e-12);
    assertTrue(point.residual() < 1e-10);
  }

  /** A point that is already solved needs no more than two iterations. */
  @Test
  void warmStartIsShort() {
    DcSolver solver = new DcSolver(stage(300, 100e3, 1.5e3));
    Converged cold = assertInstanceOf(Converged.class, solver.solve());
    solver.setVoltage(solver.circuit().element("supply"), 301);
    Converged warm = assertInstanceOf(Converged.class, solver.solveFrom(cold.solution()));
    assertTrue(warm.iterations() <= 4, "iterations " + warm.iterations());
    assertEquals(301, warm.solution().voltage("B"));
  }

  /**
   * derived: 1 A at 100 kV through two milliohm: a voltage there is told to 1.5e-11 V, which is 15
   * nA in a milliohm, more than an answer may leave over.
   */
  @Test
  void whatRoundingLeavesOverIsRefusedAsThat() {
    Circuit circuit =
        new CircuitSketch()
            .source("supply", "in", "0", 1e5)
            .resistor("r1", "in", "a", 1e-3)
            .resistor("r2", "a", "b", 1e-3)
            .resistor("load", "b", "0", 1e5)
            .build();
    NotConverged outcome = assertInstanceOf(NotConverged.class, new DcSolver(circuit).solve());
    assertEquals(Cause.ROUNDING, outcome.cause());
    assertTrue(outcome.residual() > 1e-9 && outcome.residual() < 1e-7, outcome.toString());
  }

  @Test
  void gridBehindACapacitorIsRefusedByName() {
    Circuit circuit =
        new CircuitSketch()
            .source("supply", "B", "0", 300)
            .resistor("anode_load", "B", "a", 100e3)
            .triode("V1", LAW, "a", "g", "0")
            .source("in", "in", "0", 0)
            .holds("coupling", "in", "g", 22e-9)
            .build();
    NotConverged refused = assertInstanceOf(NotConverged.class, new DcSolver(circuit).solve());
    assertEquals(Cause.FLOATING_NODE, refused.cause());
    assertEquals("g", refused.place());
  }

  @Test
  void twoSourcesInParallelAreRefusedByName() {
    Circuit circuit =
        new CircuitSketch()
            .source("one", "B", "0", 300)
            .source("two", "B", "0", 200)
            .resistor("r", "B", "0", 1e3)
            .build();
    NotConverged refused = assertInstanceOf(NotConverged.class, new DcSolver(circuit).solve());
    assertEquals(Cause.SOURCE_LOOP, refused.cause());
    assertEquals("two", refused.place());
  }

  private static Circuit stage(double supply, double anodeLoad, double cathodeResistor) {
    return new CircuitSketch()
        .source("supply", "B", "0", supply)
        .source("in", "in", "0", 0)
        .resistor("anode_load", "B", "a", anodeLoad)
        .resistor("cathode_resistor", "k", "0", cathodeResistor)
        .resistor("grid_leak", "g", "0", 1e6)
        .resistor("source", "in", "g", 10e3)
        .triode("V1", LAW, "a", "g", "k")
        .build();
  }
}
