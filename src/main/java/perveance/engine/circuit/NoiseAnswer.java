package perveance.engine.circuit;

import java.util.List;

/**
 * Noise between two nodes over a band, and who makes it.
 *
 * @param output rms over the band [V]
 * @param gain mid-band gain by which the output noise is referred to the input, without sign [1]
 * @param shares largest first; their squares add to the square of the output
 */
public record NoiseAnswer(double output, double gain, List<Share> shares) {
  /** Copies the list. */
  public NoiseAnswer {
    shares = List.copyOf(shares);
  }

  /**
   * Noise referred to the source: output noise over mid-band gain.
   *
   * @return rms over the band [V]
   */
  public double input() {
    return output / gain;
  }

  /**
   * What one element contributes.
   *
   * @param element name
   * @param output rms at the output [V]
   * @param fraction of the total power [1]
   */
  public record Share(String element, double output, double fraction) {}
}
