package perveance.engine.circuit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import com.sun.management.ThreadMXBean;
import java.lang.management.ManagementFactory;
import org.junit.jupiter.api.Test;
import perveance.engine.device.SpreadTriodeLaw;
import perveance.engine.device.SpreadTriodeParameters;

/** The inner loops allocate nothing: bytes counted by the virtual machine for this thread. */
class AllocationTest {
  private static final int ROUNDS = 200;

  private static final SpreadTriodeLaw LAW =
      new SpreadTriodeLaw(
          new SpreadTriodeParameters(1.13e-3, 0.59, 0.0096, 0.21, 0.3, 3, 3.9e-4, -0.6, 0.0862));

  private static Circuit stage() {
    return new CircuitSketch()
        .source("supply", "B", "0", 300)
        .source("in", "in", "0", 0)
        .resistor("source", "in", "g", 10e3)
        .resistor("grid_leak", "g", "0", 1e6)
        .resistor("anode_load", "B", "a", 100e3)
        .triode("V1", LAW, "a", "g", "k")
        .resistor("cathode_resistor", "k", "0", 1.5e3)
        .holds("bypass", "k", "0", 22e-6)
        .build();
  }

  /** Bytes of one round, the smallest of several measurements: other work may disturb some. */
  private static long bytes(Runnable round) {
    assumeTrue(
        ManagementFactory.getThreadMXBean() instanceof ThreadMXBean bean
            && bean.isThreadAllocatedMemorySupported(),
        "this virtual machine does not count allocated bytes");
    ThreadMXBean bean = (ThreadMXBean) ManagementFactory.getThreadMXBean();
    long least = Long.MAX_VALUE;
    for (int attempt = 0; attempt < 5; attempt++) {
      long before = bean.getCurrentThreadAllocatedBytes();
      for (int i = 0; i < ROUNDS; i++) {
        round.run();
      }
      least = Math.min(least, bean.getCurrentThreadAllocatedBytes() - before);
    }
    return least / ROUNDS;
  }

  @Test
  void operatingPointAllocatesNothing() {
    Circuit circuit = stage();
    DcSolver solver = new DcSolver(circuit);
    double[] point = new double[solver.pointLength()];
    int load = circuit.element("anode_load");
    int[] turn = {0};
    long used =
        bytes(
            () -> {
              solver.setResistance(load, 90e3 + 100 * (turn[0]++ % 100));
              assertTrue(solver.solveInto(point));
            });
    assertEquals(0, used);
  }

  @Test
  void operatingPointFromNothingAllocatesNothing() {
    Circuit circuit = stage();
    DcSolver solver = new DcSolver(circuit);
    double[] point = new double[solver.pointLength()];
    long used =
        bytes(
            () -> {
              java.util.Arrays.fill(point, 0);
              assertTrue(solver.solveInto(point));
            });
    assertEquals(0, used);
  }

  @Test
  void midbandGainAllocatesNothing() {
    Circuit circuit = stage();
    DcSolver solver = new DcSolver(circuit);
    double[] point = new double[solver.pointLength()];
    assertTrue(solver.solveInto(point));
    SmallSignal signals = new SmallSignal(solver);
    int in = circuit.element("in");
    int anode = circuit.node("a");
    long used =
        bytes(
            () -> {
              signals.take(solver);
              assertTrue(signals.midbandGain(in, anode, 0) < 0);
            });
    assertEquals(0, used);
  }
}
