package perveance.engine.analysis;

import java.util.List;
import java.util.OptionalDouble;
import perveance.engine.analysis.Band.Share;
import perveance.engine.circuit.Noise;
import perveance.engine.circuit.NoiseAnswer;
import perveance.engine.circuit.NoiseBand;

/**
 * Noise of a stage over the audio band, referred to its input. Flicker noise of the valves is not
 * in it: it differs too much from one specimen to the next.
 *
 * @param input equivalent input noise, 20 Hz to 20 kHz, rms; empty where the circuit leaves it
 *     undetermined [V]
 * @param shares share of the noise power by element, largest first
 */
record NoiseFigures(OptionalDouble input, List<Share> shares) {
  private static final NoiseBand AUDIO = NoiseBand.of(20, 20e3);
  private static final double LEAST_SHARE = 0.01;

  NoiseFigures {
    shares = List.copyOf(shares);
  }

  static NoiseFigures of(StageModel model) {
    if (!model.signal().answers(AUDIO.lowest()) || !model.signal().answers(AUDIO.highest())) {
      return new NoiseFigures(OptionalDouble.empty(), List.of());
    }
    NoiseAnswer noise =
        new Noise(model.dc())
            .between(model.source(), model.mainOutput().plus(), model.mainOutput().minus(), AUDIO);
    List<NoiseAnswer.Share> own =
        noise.shares().stream().filter(s -> owned(model, s.element())).toList();
    double fraction = own.stream().mapToDouble(NoiseAnswer.Share::fraction).sum();
    List<Share> shares =
        own.stream()
            .filter(s -> s.fraction() >= LEAST_SHARE * fraction)
            .map(s -> new Share(s.element(), s.fraction() / fraction))
            .toList();
    double input = noise.input() * Math.sqrt(fraction) * Math.abs(model.inputShare());
    return Double.isFinite(input)
        ? new NoiseFigures(OptionalDouble.of(input), shares)
        : new NoiseFigures(OptionalDouble.empty(), List.of());
  }

  /** Noise of a stage wired straight to this one is that stage's own. */
  private static boolean owned(StageModel model, String element) {
    return model.owns(model.circuit().elements().get(model.circuit().element(element)));
  }
}
