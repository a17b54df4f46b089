package perveance.engine.analysis;

import java.util.List;
import java.util.OptionalDouble;
import perveance.engine.analysis.CleanSwing.Limit;

/**
 * Stages in a row: each with its gain into what the next one really is, the levels between them,
 * and which of them overloads first. The levels follow from the small-signal gains, so they are
 * those of stages that still work cleanly.
 *
 * @param links stages in signal order
 * @param gain from the input of the first to the output of the last, signed [1]
 * @param clipsFirst reference of the stage whose clean swing ends first
 * @param limitedBy what ends it there
 * @param limitedAt valve section where it ends
 * @param inputPeak peak input of the first stage at which it ends [V]
 * @param outputPeak peak output of the last stage at that input [V]
 * @param drive stated peak input of the first stage, empty when none is [V]
 */
public record SignalChain(
    List<Link> links,
    double gain,
    String clipsFirst,
    Limit limitedBy,
    String limitedAt,
    double inputPeak,
    double outputPeak,
    OptionalDouble drive) {
  /** Copies the list. */
  public SignalChain {
    links = List.copyOf(links);
  }

  /**
   * One stage of the row.
   *
   * @param ref reference
   * @param gain from its input to its main output under its real load, signed [1]
   * @param inputPeak peak at its input when the first stage to clip is at its end [V]
   * @param outputPeak peak at its main output then [V]
   * @param spare how much more its own clean swing would take, zero for the first to clip [dB]
   * @param drivenInput peak at its input at the stated drive of the first stage, empty without [V]
   * @param drivenOutput peak at its main output then, empty without [V]
   */
  public record Link(
      String ref,
      double gain,
      double inputPeak,
      double outputPeak,
      double spare,
      OptionalDouble drivenInput,
      OptionalDouble drivenOutput) {}
}
