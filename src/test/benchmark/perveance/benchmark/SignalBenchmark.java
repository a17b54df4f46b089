package perveance.benchmark;

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
import perveance.engine.circuit.Circuit;
import perveance.engine.circuit.Complex;
import perveance.engine.circuit.Corners;
import perveance.engine.circuit.DcOutcome;
import perveance.engine.circuit.DcSolution;
import perveance.engine.circuit.DcSolver;
import perveance.engine.circuit.Drive;
import perveance.engine.circuit.MidbandOutcome;
import perveance.engine.circuit.MidbandSolver;
import perveance.engine.circuit.Noise;
import perveance.engine.circuit.NoiseAnswer;
import perveance.engine.circuit.NoiseBand;
import perveance.engine.circuit.ReactiveOutcome;
import perveance.engine.circuit.ReactiveSolver;
import perveance.engine.circuit.SmallSignal;
import perveance.engine.circuit.Transient;
import perveance.engine.circuit.TransientOutcome;
import perveance.engine.circuit.TransientSetup;
import perveance.engine.circuit.Waveform;

/** What one stage costs beyond its dc point: signals small and large, noise, courses in time. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(1)
public class SignalBenchmark {
  private static final int LEVELS = 20;

  private Circuit circuit;
  private DcSolution rest;
  private SmallSignal signals;
  private int input;
  private int output;
  private double frequency = 1000;

  /** Solves the point at rest. */
  @Setup
  public void rest() {
    circuit = BenchmarkCircuits.oneStage();
    rest = ((DcOutcome.Converged) new DcSolver(circuit).solve()).solution();
    signals = new SmallSignal(rest);
    input = circuit.element("in");
    output = circuit.node("o1");
  }

  /** Gain at one frequency. */
  @Benchmark
  public Complex gainAtAFrequency() {
    frequency = frequency > 2000 ? 1000 : frequency + 1;
    return signals.transfer(input, output, 0, frequency);
  }

  /** Both -3 dB points. */
  @Benchmark
  public Corners corners() {
    return signals.corners(input, output, 0);
  }

  /** Noise in the audio band with every part's share. */
  @Benchmark
  public NoiseAnswer noise() {
    return new Noise(rest).between(input, output, 0, NoiseBand.of(20, 20e3));
  }

  /** Twenty levels up to clipping, 64 samples. */
  @Benchmark
  public MidbandOutcome twentyLevels() {
    MidbandSolver solver = new MidbandSolver(rest, Drive.of(Waveform.cosine(64), input));
    MidbandOutcome last = solver.solve(0.1);
    for (int level = 1; level < LEVELS; level++) {
      last = solver.solve(0.1 * Math.pow(1.2, level));
    }
    return last;
  }

  /** Intermodulation, 60 and 7000 Hz. */
  @Benchmark
  public MidbandOutcome intermodulation() {
    return new MidbandSolver(rest, Drive.of(Waveform.smpte(), input)).solve(1);
  }

  /** A cycle at 50 Hz with every part as it is, 64 samples. */
  @Benchmark
  public ReactiveOutcome cycleAtAFrequency() {
    return new ReactiveSolver(rest, Drive.of(Waveform.cosine(64), input), 50).solve(1);
  }

  /** One second from cold. */
  @Benchmark
  public TransientOutcome coldStart() {
    return Transient.fromCold(circuit, TransientSetup.until(1));
  }
}
