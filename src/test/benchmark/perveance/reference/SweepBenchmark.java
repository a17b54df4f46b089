package perveance.reference;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import perveance.engine.circuit.DcSolver;

/**
 * Ten thousand dc points of the bypassed common-cathode stage, the supply going from 200 to 300 V:
 * ours, and the simulator's own dc sweep in the same run (its start, some 20 ms, included).
 */
@State(Scope.Thread)
@BenchmarkMode(Mode.SingleShotTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 3)
@Measurement(iterations = 5)
@Fork(1)
public class SweepBenchmark {
  private static final int POINTS = 10_000;

  private ReferenceCase stage = ReferenceCases.all().get(1);
  private DcSolver solver = new DcSolver(stage.circuit());
  private double[] point = new double[solver.pointLength()];
  private int supply;
  private List<String> netlist = List.of();
  private Path folder = Path.of(".");

  /** Compiles the circuit and writes the netlist. */
  @Setup
  public void prepare() throws IOException {
    supply = stage.circuit().element("supply.A");
    netlist = SpiceNetlist.linear(stage.circuit(), stage.input(), EngineAnswers.rest(stage));
    folder = Files.createTempDirectory("sweep");
  }

  /** Our engine. */
  @Benchmark
  public double engine() {
    double sum = 0;
    for (int i = 0; i <= POINTS; i++) {
      solver.setVoltage(supply, 200 + 100.0 * i / POINTS);
      if (!solver.solveInto(point)) {
        throw new IllegalStateException("no point at step " + i);
      }
      sum += point[0];
    }
    return sum;
  }

  /** The simulator. */
  @Benchmark
  public int simulator() {
    String sweep = "dc v" + supply + " 200 300 " + 100.0 / POINTS;
    return new Simulator(folder).run(netlist, sweep, List.of("v(4)")).size();
  }
}
