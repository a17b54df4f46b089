package perveance.benchmark;

import java.util.Arrays;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import perveance.engine.circuit.Circuit;
import perveance.engine.circuit.DcSolver;
import perveance.engine.circuit.SmallSignal;

/**
 * The dc operating point: from nothing, and from the last one after a change of a part, for one
 * stage, two direct-coupled stages, and chains of 8 to 60 nodes.
 */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(1)
public class DcPointBenchmark {
  /** Circuit; chain-n has n stages of seven nodes. */
  @Param({"one-stage", "two-stages", "chain-2", "chain-4", "chain-8"})
  public String circuit;

  private DcSolver solver;
  private SmallSignal signals;
  private double[] point;
  private int load;
  private int input;
  private int anode;
  private int turn;

  /** Compiles the circuit. */
  @Setup
  public void compile() {
    Circuit built =
        switch (circuit) {
          case "one-stage" -> BenchmarkCircuits.oneStage();
          case "two-stages" -> BenchmarkCircuits.twoStages();
          default -> BenchmarkCircuits.chain(Integer.parseInt(circuit.substring(6)));
        };
    solver = new DcSolver(built);
    point = new double[solver.pointLength()];
    load = built.element("load1");
    input = built.element("in");
    anode = built.node("a1");
    solve();
    signals = new SmallSignal(solver);
  }

  private void solve() {
    solver.setResistance(load, 90e3 + 200 * (turn++ % 100));
    if (!solver.solveInto(point)) {
      throw new IllegalStateException("no point");
    }
  }

  /** A point with nothing known. */
  @Benchmark
  public double fromNothing() {
    Arrays.fill(point, 0);
    solve();
    return point[0];
  }

  /** A point near the last one. */
  @Benchmark
  public double fromTheLast() {
    solve();
    return point[0];
  }

  /** A point near the last one and its mid-band gain. */
  @Benchmark
  public double withGain() {
    solve();
    signals.take(solver);
    return signals.midbandGain(input, anode, 0);
  }
}
