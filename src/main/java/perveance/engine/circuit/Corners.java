package perveance.engine.circuit;

import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;
import perveance.engine.numeric.RootOutcome;
import perveance.engine.numeric.Roots;

/**
 * The frequencies at which a gain has fallen by 3 dB (to 1/sqrt 2) from its reference.
 *
 * @param reference magnitude that counts as 0 dB, in the unit of the gain [1]
 * @param low lower corner, empty when the gain holds down to 1 mHz [Hz]
 * @param high upper corner, empty when the gain holds up to 1 GHz [Hz]
 */
public record Corners(double reference, OptionalDouble low, OptionalDouble high) {
  private static final double LOWEST = 1e-3;
  private static final double HIGHEST = 1e9;
  private static final int PER_DECADE = 10;
  private static final double ACCURACY = 1e-7;

  /**
   * Searches outward from the frequency whose gain is nearest the reference; when the gain reaches
   * it nowhere, from the highest gain, which is then the reference.
   */
  static Corners search(DoubleUnaryOperator magnitude, double midband) {
    int count = (int) Math.round(Math.log10(HIGHEST / LOWEST) * PER_DECADE) + 1;
    double[] gain = new double[count];
    int best = 0;
    int highest = 0;
    for (int i = 0; i < count; i++) {
      gain[i] = magnitude.applyAsDouble(frequency(i));
      if (Math.abs(gain[i] - midband) < Math.abs(gain[best] - midband)) {
        best = i;
      }
      highest = gain[i] > gain[highest] ? i : highest;
    }
    boolean reached = gain[best] >= midband / Math.sqrt(2);
    int start = reached ? best : highest;
    double reference = reached ? midband : gain[highest];
    double level = reference / Math.sqrt(2);
    OptionalDouble low = OptionalDouble.empty();
    for (int i = start; i > 0 && low.isEmpty(); i--) {
      if (gain[i - 1] < level) {
        low = between(magnitude, level, frequency(i - 1), frequency(i));
      }
    }
    OptionalDouble high = OptionalDouble.empty();
    for (int i = start; i < count - 1 && high.isEmpty(); i++) {
      if (gain[i + 1] < level) {
        high = between(magnitude, level, frequency(i), frequency(i + 1));
      }
    }
    return new Corners(reference, low, high);
  }

  private static double frequency(int step) {
    return LOWEST * Math.pow(10, (double) step / PER_DECADE);
  }

  private static OptionalDouble between(
      DoubleUnaryOperator magnitude, double level, double below, double above) {
    RootOutcome outcome =
        Roots.bracketed(
            logarithm -> magnitude.applyAsDouble(Math.exp(logarithm)) / level - 1,
            Math.log(below),
            Math.log(above),
            ACCURACY);
    return outcome instanceof RootOutcome.Found found
        ? OptionalDouble.of(Math.exp(found.x()))
        : OptionalDouble.empty();
  }
}
