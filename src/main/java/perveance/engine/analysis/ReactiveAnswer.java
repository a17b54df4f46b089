package perveance.engine.analysis;

import java.util.List;
import java.util.OptionalDouble;

/**
 * An output stage into a reactive load at one frequency: its load line is an ellipse.
 *
 * @param frequency of the signal [Hz]
 * @param inputPeak peak input, the stated drive or the clean input [V]
 * @param output across the resistance of the load, rms [V]
 * @param power in that resistance [W]
 * @param anodePeak highest anode to cathode voltage of any section [V]
 * @param currentPeak largest anode current of any section [A]
 * @param anodeDissipation mean, of each section in order [W]
 * @param dissipationPeak highest of any section within the cycle [W]
 * @param dissipationLimit the maker's, empty where none is published [W]
 * @param cutOff whether a section is cut off in part of the cycle
 * @param path of the section that is drawn, over the whole cycle
 */
public record ReactiveAnswer(
    double frequency,
    double inputPeak,
    double output,
    double power,
    double anodePeak,
    double currentPeak,
    List<Double> anodeDissipation,
    double dissipationPeak,
    OptionalDouble dissipationLimit,
    boolean cutOff,
    List<LoadLineView.Point> path) {
  /** Copies the lists. */
  public ReactiveAnswer {
    anodeDissipation = List.copyOf(anodeDissipation);
    path = List.copyOf(path);
  }

  /**
   * Whether the path crosses the curve of the maker's dissipation in the characteristics. What
   * heats the anode is the mean.
   *
   * @return false where no limit is published
   */
  public boolean crossesDissipation() {
    return dissipationLimit.isPresent() && dissipationPeak > dissipationLimit.getAsDouble();
  }
}
