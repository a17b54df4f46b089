package perveance.engine.analysis;

import java.util.Optional;
import perveance.engine.circuit.Drive;
import perveance.engine.circuit.MidbandOutcome;
import perveance.engine.circuit.MidbandSolver;
import perveance.engine.circuit.Waveform;
import perveance.engine.numeric.Harmonics;

/**
 * Drives a stage with two tones at once. At mid-band nothing depends on the tones' frequencies but
 * where their products fall, so tones of few cycles stand for 60 Hz with 7 kHz and for 19 with 20
 * kHz: no product up to the fifth order falls on one that is counted.
 */
final class TwoTones {
  private static final int SAMPLES = 64;

  /** Cycles of the high tone to one of the low. */
  private static final int HIGH = 12;

  /** Cycles of the lower of the two near tones; the other has one more. */
  private static final int NEAR = 7;

  private static final Waveform FAR_APART = Waveform.twoTone(SAMPLES, 1, 4, HIGH, 1);
  private static final Waveform TOGETHER = Waveform.twoTone(SAMPLES, NEAR, 1, NEAR + 1, 1);

  private final StageModel model;
  private final MidbandSolver farApart;
  private final MidbandSolver together;

  TwoTones(StageModel model) {
    this.model = model;
    this.farApart = new MidbandSolver(model.dc(), new Drive(FAR_APART, model.shares()));
    this.together = new MidbandSolver(model.dc(), new Drive(TOGETHER, model.shares()));
  }

  /**
   * What the tones make at one level; best asked upward.
   *
   * @param peak peak of the two tones together at the stage's input [V]
   * @return what comes of it; empty where there is no steady cycle
   */
  Optional<Intermodulation> at(double peak) {
    if (!(peak > 0) || !model.reached()) {
      return Optional.empty();
    }
    Optional<Harmonics> far = output(farApart, peak);
    Optional<Harmonics> near = far.isEmpty() ? far : output(together, peak);
    return near.map(n -> new Intermodulation(sideTones(far.get()), differences(n)));
  }

  private Optional<Harmonics> output(MidbandSolver solver, double peak) {
    return solver.solve(peak / Math.abs(model.inputShare()))
            instanceof MidbandOutcome.Converged solved
        ? Optional.of(
            solved.solution().harmonics(model.mainOutput().plus(), model.mainOutput().minus()))
        : Optional.empty();
  }

  /** Both side tones of an order beat together on the high tone, so their amplitudes add. */
  private static double sideTones(Harmonics h) {
    double square = 0;
    for (int order = 1; order <= 2; order++) {
      double pair = h.amplitude(HIGH - order) + h.amplitude(HIGH + order);
      square += pair * pair;
    }
    return share(Math.sqrt(square), h.amplitude(HIGH));
  }

  private static double differences(Harmonics h) {
    double square = 0;
    for (int tone : new int[] {1, NEAR - 1, NEAR + 2}) {
      square += h.amplitude(tone) * h.amplitude(tone);
    }
    return share(Math.sqrt(square), h.amplitude(NEAR) + h.amplitude(NEAR + 1));
  }

  private static double share(double products, double tones) {
    return tones > 0 ? products / tones : 0;
  }
}
