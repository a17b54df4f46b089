package perveance.accuracy;

import perveance.engine.device.DeviceLaw;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.numeric.Harmonics;
import perveance.engine.numeric.RootOutcome;
import perveance.engine.numeric.Roots;

/**
 * One triode stage, solved here by root finding alone so that a law can be judged without the
 * circuit engine: anode fed through a resistance that direct current sees, a load that alternating
 * current sees, bias fixed or from a bypassed cathode resistor. All capacitors and the transformer
 * are ideal. The mean current at drive settles to its own bias.
 *
 * @param law the valve
 * @param supply to the stage's foot [V]
 * @param feed resistance between supply and anode for direct current [ohm]
 * @param load resistance at the anode for alternating current [ohm]
 * @param cathodeResistor bypassed cathode resistor, 0 for fixed bias [ohm]
 * @param fixedBias grid to the stage's foot [V]
 */
public record TestStage(
    DeviceLaw law,
    double supply,
    double feed,
    double load,
    double cathodeResistor,
    double fixedBias) {
  private static final int SAMPLES = 32;

  /** A resistance-coupled stage with a bypassed cathode resistor. */
  public static TestStage resistanceCoupled(
      DeviceLaw law, double supply, double anodeLoad, double nextLeak, double cathodeResistor) {
    double load = anodeLoad * nextLeak / (anodeLoad + nextLeak);
    return new TestStage(law, supply, anodeLoad, load, cathodeResistor, 0);
  }

  /** A stage behind an ideal output transformer with fixed bias. */
  public static TestStage transformerCoupled(
      DeviceLaw law, double anodeVoltage, double bias, double load) {
    return new TestStage(law, anodeVoltage, 0, load, 0, bias);
  }

  /** The current at rest [A]. */
  public double current() {
    return root(
        i -> at(supply - i * (feed + cathodeResistor), fixedBias - i * cathodeResistor) - i,
        0,
        highestMean());
  }

  /** Small-signal gain without its sign, everything bypassed [1]. */
  public double gain() {
    double i = current();
    ElectrodeCurrents out = new ElectrodeCurrents();
    law.evaluate(supply - i * (feed + cathodeResistor), fixedBias - i * cathodeResistor, 0, out);
    double gm = out.slope(ElectrodeCurrents.ANODE, ElectrodeCurrents.GRID);
    double ga = out.slope(ElectrodeCurrents.ANODE, ElectrodeCurrents.ANODE);
    return gm * load / (1 + ga * load);
  }

  /**
   * The stage driven by a sine.
   *
   * @param amplitude peak at the grid [V]
   */
  public Driven driven(double amplitude) {
    double mean = root(m -> harmonics(m, amplitude).mean() - m, 1e-9, highestMean());
    return new Driven(amplitude, mean, load, harmonics(mean, amplitude));
  }

  /** The drive at which the output has a stated effective value [V]. */
  public Driven atOutput(double rms) {
    double guess = rms * Math.sqrt(2) / gain();
    double amplitude = root(a -> driven(a).outputRms() - rms, 0.6 * guess, 2 * guess);
    return driven(amplitude);
  }

  /** Grid to cathode at rest under a mean current [V]. */
  public double bias(double mean) {
    return fixedBias - mean * cathodeResistor;
  }

  private double highestMean() {
    return feed + cathodeResistor > 0 ? supply / (feed + cathodeResistor) : 10;
  }

  private Harmonics harmonics(double mean, double amplitude) {
    double anode = supply - mean * (feed + cathodeResistor);
    double[] currents = new double[SAMPLES];
    for (int k = 0; k <= SAMPLES / 2; k++) {
      double grid = bias(mean) + amplitude * Math.cos(2 * Math.PI * k / SAMPLES);
      currents[k] = onLoadLine(anode, mean, grid);
      currents[(SAMPLES - k) % SAMPLES] = currents[k];
    }
    return Harmonics.of(currents);
  }

  private double onLoadLine(double anode, double mean, double grid) {
    double highest = mean + Math.max(anode, 0) / load;
    return root(i -> at(anode - (i - mean) * load, grid) - i, 0, highest);
  }

  private double at(double anode, double grid) {
    ElectrodeCurrents out = new ElectrodeCurrents();
    law.evaluate(anode, grid, 0, out);
    return out.current(ElectrodeCurrents.ANODE);
  }

  private static double root(
      java.util.function.DoubleUnaryOperator function, double low, double high) {
    RootOutcome outcome = Roots.bracketed(function, low, high, 1e-10);
    if (outcome instanceof RootOutcome.Found found) {
      return found.x();
    }
    throw new IllegalStateException(outcome.toString());
  }

  /**
   * The stage at a drive.
   *
   * @param amplitude peak at the grid [V]
   * @param mean mean current [A]
   * @param load for alternating current [ohm]
   * @param harmonics of the anode current
   */
  public record Driven(double amplitude, double mean, double load, Harmonics harmonics) {
    /** Gain at the fundamental [1]. */
    public double gain() {
      return harmonics.amplitude(1) * load / amplitude;
    }

    /** All harmonics together as an effective voltage at the load [V]. */
    public double outputRms() {
      double sum = 0;
      for (int n = 1; n <= harmonics.highest(); n++) {
        sum += Math.pow(harmonics.amplitude(n), 2);
      }
      return load * Math.sqrt(sum / 2);
    }

    /** Power of the fundamental in the load [W]. */
    public double power() {
      return Math.pow(harmonics.amplitude(1), 2) * load / 2;
    }

    /** A harmonic in per cent of the fundamental [%]. */
    public double percent(int order) {
      return 100 * harmonics.amplitude(order) / harmonics.amplitude(1);
    }

    /** All harmonics but the fundamental, in per cent of it [%]. */
    public double distortion() {
      double sum = 0;
      for (int n = 2; n <= harmonics.highest(); n++) {
        sum += Math.pow(percent(n), 2);
      }
      return Math.sqrt(sum);
    }
  }
}
