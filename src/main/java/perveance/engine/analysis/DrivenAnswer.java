package perveance.engine.analysis;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The stage at one level of a sine.
 *
 * @param inputPeak peak input; for push-pull the peak on each grid [V]
 * @param output fundamental and harmonics at the main output, rms [V]
 * @param power in the reflected load, empty where the stage is no output stage [W]
 * @param distortion total harmonic distortion [1]
 * @param harmonics second, third, ... relative to the fundamental [1]
 * @param meanAnodeCurrent mean anode current, of the pair for push-pull [A]
 * @param meanScreenCurrent mean screen current, empty for triodes [A]
 * @param anodeDissipation mean, of each section in order [W]
 * @param screenDissipation mean, of each section in order, empty for triodes [W]
 * @param peakAnodeCurrent largest anode current of any section [A]
 * @param intermodulation of two tones at this level, empty where not worked out
 * @param gridCurrentFlows whether grid current beyond its onset flows in the cycle
 */
public record DrivenAnswer(
    double inputPeak,
    double output,
    OptionalDouble power,
    double distortion,
    List<Double> harmonics,
    double meanAnodeCurrent,
    OptionalDouble meanScreenCurrent,
    List<Double> anodeDissipation,
    List<Double> screenDissipation,
    double peakAnodeCurrent,
    Optional<Intermodulation> intermodulation,
    boolean gridCurrentFlows) {
  /** Copies the lists. */
  public DrivenAnswer {
    harmonics = List.copyOf(harmonics);
    anodeDissipation = List.copyOf(anodeDissipation);
    screenDissipation = List.copyOf(screenDissipation);
  }

  /**
   * The same with what two tones make at this level.
   *
   * @param twoTones of two tones, empty where not worked out
   * @return the changed answer
   */
  public DrivenAnswer with(Optional<Intermodulation> twoTones) {
    return new DrivenAnswer(
        inputPeak,
        output,
        power,
        distortion,
        harmonics,
        meanAnodeCurrent,
        meanScreenCurrent,
        anodeDissipation,
        screenDissipation,
        peakAnodeCurrent,
        twoTones,
        gridCurrentFlows);
  }
}
