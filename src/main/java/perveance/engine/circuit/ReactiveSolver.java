package perveance.engine.circuit;

import java.util.Arrays;
import java.util.Locale;
import perveance.engine.numeric.DenseLu;

/**
 * Large signals at a stated frequency, with every capacitor, inductor and transformer as it is: the
 * elliptical load line of a reactive load, the bypass that does not quite hold. All samples of the
 * period are solved together by harmonic balance. What a waveform has at half the samples and above
 * is folded and leaves currents over (see {@link PeriodicState#residual}); where that is more than
 * 1 uA the samples are doubled, and where there is no room for more of them there is no answer.
 *
 * <p>The work grows with the cube of samples times device nodes: 64 samples serve one or two
 * valves, 32 a push-pull pair. Not for use by two threads at once.
 */
public final class ReactiveSolver {
  private static final int LARGEST = 1536;

  /** To double the samples beyond this takes longer than anyone waits for an answer. */
  private static final int LARGEST_REFINED = LARGEST / 2;

  /** Most that folding may leave over of the currents into a node [A]. */
  private static final double FOLDED = 1e-6;

  private static final int MOST_ITERATIONS = 40;
  private static final double SHORTEST = 1.0 / 64;
  private static final double SMALLEST_STRIDE = 1.0 / 128;

  private final DcSolution rest;
  private final Drive drive;
  private final double frequency;
  private final HarmonicNetwork network;
  private final HarmonicEquations equations;
  private final double[][] known;
  private final double[] x;
  private final double[] kept;
  private final double[] trial;
  private final double[] residual;
  private final double[] step;
  private final double[] correction;
  private int iterations;

  /**
   * Prepares a signal about a dc point.
   *
   * @param rest dc point without signal
   * @param drive signal; its waveform is one period
   * @param frequency one over the period, above zero [Hz]
   */
  public ReactiveSolver(DcSolution rest, Drive drive, double frequency) {
    ElementChecks.positive("frequency", frequency);
    this.rest = rest;
    this.drive = drive;
    this.frequency = frequency;
    int samples = drive.waveform().count();
    this.network = new HarmonicNetwork(rest.circuit(), drive, frequency, samples / 2);
    this.known = knownVoltages();
    this.equations = new HarmonicEquations(network, drive.waveform(), known);
    int size = samples * equations.nodes;
    this.x = new double[size];
    this.kept = new double[size];
    this.trial = new double[size];
    this.residual = new double[size];
    this.step = new double[size];
    this.correction = new double[size];
    atRest();
  }

  /** Voltages of known nodes: quiet, then for each sample what a drive of one adds [V]. */
  private double[][] knownVoltages() {
    Topology topology = network.topology;
    int samples = drive.waveform().count();
    double[][] voltages = new double[samples + 1][topology.nodeCount];
    topology.writeKnown(new ElementValues(network.circuit), 1, voltages[0]);
    double[] unit = new double[topology.nodeCount];
    drive
        .shares()
        .forEach(
            (source, share) -> {
              topology.writeUnit(source, unit);
              for (int k = 0; k < samples; k++) {
                for (int node = 0; node < unit.length; node++) {
                  voltages[k + 1][node] += share * unit[node] * drive.waveform().sample(k);
                }
              }
            });
    return voltages;
  }

  private void atRest() {
    for (int i = 0; i < x.length; i++) {
      x[i] = rest.voltage(network.deviceNode[i % equations.nodes]);
    }
  }

  /**
   * Finds the steady cycle at a level.
   *
   * @param peak peak of the waveform; each source gets its share of it, zero or above [V] or [A]
   * @return the cycle, at the drive's samples or a power of two more, or why there is none
   */
  public ReactiveOutcome solve(double peak) {
    ElementChecks.notNegative("peak", peak);
    if (x.length > LARGEST) {
      return new ReactiveOutcome.NotConverged(
          "samples times device nodes is " + x.length + ", more than " + LARGEST, peak, 0);
    }
    if (!network.determined()) {
      return new ReactiveOutcome.NotConverged(
          "the linear part of the circuit has no single answer", peak, 0);
    }
    iterations = 0;
    atRest();
    double reached = 0;
    double stride = 1;
    while (reached < 1) {
      System.arraycopy(x, 0, kept, 0, x.length);
      double next = Math.min(1, reached + stride);
      if (balance(next * peak)) {
        reached = next;
        stride *= 2;
      } else {
        System.arraycopy(kept, 0, x, 0, x.length);
        stride /= 2;
        if (stride < SMALLEST_STRIDE) {
          return new ReactiveOutcome.NotConverged(
              "no steady cycle was found at this drive", peak, reached * peak);
        }
      }
    }
    ReactiveSolution cycle =
        new ReactiveSolution(network, equations, drive, known, peak, frequency);
    return cycle.residual() <= FOLDED
        ? new ReactiveOutcome.Converged(cycle, iterations)
        : finer(peak, cycle.residual());
  }

  /** Solves with twice the samples what folding has spoiled. */
  private ReactiveOutcome finer(double peak, double leftOver) {
    if (2 * x.length > LARGEST_REFINED) {
      return new ReactiveOutcome.NotConverged(
          String.format(
              Locale.ROOT,
              "the waveforms are too sharp for %d samples: %.2g A is left over",
              drive.waveform().count(),
              leftOver),
          peak,
          0);
    }
    Drive denser = new Drive(drive.waveform().finer(), drive.shares());
    ReactiveOutcome outcome = new ReactiveSolver(rest, denser, frequency).solve(peak);
    return outcome instanceof ReactiveOutcome.Converged found
        ? new ReactiveOutcome.Converged(found.solution(), iterations + found.iterations())
        : outcome;
  }

  private boolean balance(double peak) {
    int size = x.length;
    if (size == 0) {
      return true;
    }
    DenseLu lu = new DenseLu(size);
    double[] matrix = new double[size * size];
    equations.residual(x, peak, residual);
    for (int i = 0; i < MOST_ITERATIONS; i++) {
      iterations++;
      equations.jacobian(matrix);
      if (!lu.factor(matrix)) {
        return false;
      }
      solveFor(lu, step);
      double length = norm(step);
      if (!(length < Double.MAX_VALUE) || !advance(lu, peak, length)) {
        return false;
      }
      if (length <= 1) {
        return true;
      }
    }
    return false;
  }

  private void solveFor(DenseLu lu, double[] out) {
    for (int i = 0; i < out.length; i++) {
      out[i] = -residual[i];
    }
    lu.solve(out);
  }

  private boolean advance(DenseLu lu, double peak, double length) {
    for (double damping = 1; damping >= SHORTEST; damping /= 2) {
      for (int i = 0; i < x.length; i++) {
        trial[i] = x[i] + damping * step[i];
      }
      equations.residual(trial, peak, residual);
      solveFor(lu, correction);
      if (norm(correction) <= Math.max(1, (1 - damping / 4) * length)) {
        System.arraycopy(trial, 0, x, 0, x.length);
        return true;
      }
    }
    return false;
  }

  /** Largest change of a voltage, 1 where it no longer matters. */
  private double norm(double[] change) {
    return Arrays.stream(change).map(Math::abs).max().orElse(0) / 1e-7;
  }
}
