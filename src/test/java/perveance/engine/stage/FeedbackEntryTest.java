package perveance.engine.stage;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import perveance.engine.circuit.Circuit;
import perveance.engine.circuit.DcOutcome;
import perveance.engine.circuit.DcSolver;
import perveance.engine.circuit.Element;
import perveance.engine.circuit.SmallSignal;

/** The feedback entry of a long-tailed pair: a shunt at the foot of the tail. */
class FeedbackEntryTest {
  private static final double MU = 100;
  private static final double RA = 62.5e3;
  private static final double LOAD = 100e3;
  private static final double TAIL = 22e3;

  /**
   * Derived. A voltage f at the shunt stands on the second grid too, through its bypass, and on the
   * foot of the tail; the first grid is still. With y = 1 / (ra + RL): cathode k = f (mu y + 1 /
   * Rt) / (2 (mu + 1) y + 1 / Rt); currents -(mu + 1) k y and (mu f - (mu + 1) k) y; the anodes go
   * against them times RL. Tolerance: the grid leak of 10 Mohm beside what it bridges.
   */
  @Test
  void aSignalAtTheShuntDrivesBothAnodes() {
    StageBench bench =
        new StageBench("long-tailed-pair", LinearValve.triode(MU, RA))
            .with("anode_load", LOAD)
            .with("tail_resistor", TAIL)
            .with("feedback_shunt", 100)
            .with("grid_bias", 80)
            .with("grid_leak", 10e6)
            .with("second_grid_leak", 10e6)
            .with("second_grid_bypass", 1e-6);
    StageBench.Built built = bench.build(300);
    List<Element> elements = new ArrayList<>(built.circuit().elements());
    int entry = built.circuit().node("V1.feedback");
    elements.add(new Element.CurrentSource("feedback", 0, entry, 0));
    Circuit circuit = new Circuit(built.circuit().nodes(), elements);
    DcOutcome.Converged solved = (DcOutcome.Converged) new DcSolver(circuit).solve();
    SmallSignal small = new SmallSignal(solved.solution());
    int source = circuit.element("feedback");
    double at = small.midbandGain(source, entry, 0);
    double y = 1 / (RA + LOAD);
    double cathode = (MU * y + 1 / TAIL) / (2 * (MU + 1) * y + 1 / TAIL);
    double first = (MU + 1) * cathode * y * LOAD;
    double second = -(MU - (MU + 1) * cathode) * y * LOAD;
    assertEquals(first, small.midbandGain(source, circuit.node("V1.anode"), 0) / at, 1e-3 * first);
    assertEquals(
        second, small.midbandGain(source, circuit.node("V1.anode2"), 0) / at, -1e-3 * second);
  }
}
