package perveance.benchmark;

import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.device.SpreadTriodeLaw;
import perveance.engine.device.SpreadTriodeParameters;

/** Currents and all slopes of a triode: 60 ns or less, without allocation. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
@Warmup(iterations = 4, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(1)
public class TriodeLawBenchmark {
  private static final int POINTS = 1024;

  private final DeviceLaw law =
      new SpreadTriodeLaw(
          new SpreadTriodeParameters(
              1.126e-3, 0.589, 9.62e-3, 0.209, 0.3, 3, 3.94e-4, -0.6, 0.0862));
  private final ElectrodeCurrents out = new ElectrodeCurrents();
  private final double[] anode = new double[POINTS];
  private final double[] grid = new double[POINTS];
  private int at;

  /** Working points along load lines, from grid current to beyond cut-off, in no simple order. */
  public TriodeLawBenchmark() {
    java.util.Random random = new java.util.Random(7);
    for (int i = 0; i < POINTS; i++) {
      grid[i] = 0.3 - 3.8 * random.nextDouble();
      anode[i] = 60 + 240 * random.nextDouble();
    }
  }

  /** One evaluation at a point that the processor cannot foresee. */
  @Benchmark
  public double currentsAndSlopes() {
    int i = at++ & (POINTS - 1);
    law.evaluate(anode[i], grid[i], 0, out);
    return out.current(ElectrodeCurrents.ANODE);
  }

  /** One evaluation at a resting point, as Newton's last steps see it. */
  @Benchmark
  public double atRest() {
    int i = at++ & (POINTS - 1);
    law.evaluate(150 + anode[i] * 1e-3, -1.2 + grid[i] * 1e-3, 0, out);
    return out.current(ElectrodeCurrents.ANODE);
  }
}
