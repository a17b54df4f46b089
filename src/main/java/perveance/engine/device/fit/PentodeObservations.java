package perveance.engine.device.fit;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import perveance.engine.device.Evidence;

/**
 * Chooses from the evidence of a pentode what a fit answers to, and how much each figure counts.
 *
 * <p>Deviations, the same for every type: tabulated anode current and gm 2 %, mu of grid over
 * screen 4 % (printed to two figures), screen current 8 % (to half a milliampere), anode resistance
 * 10 % (rounded guesses, "greater than"); tied as a triode, current 4 %, gm 5 %, ra 6 %; chart
 * readings 6 %; the gm printed for a remote cut-off 30 %. Figures of medium confidence count with
 * these over 0.6, those marked low not at all.
 */
final class PentodeObservations {
  private static final double MEDIUM = 1 / 0.6;
  private static final double CHART = 0.06;
  private static final double CUT_OFF_SLOPE = 0.3;

  private PentodeObservations() {}

  /** Evidence that counts for the fit. */
  static List<Evidence> usable(List<Evidence> evidence) {
    List<Evidence> usable = new ArrayList<>();
    for (Evidence entry : evidence) {
      boolean counts = entry.fit() && !entry.confidence().equals("low");
      boolean placed =
          entry.gridVoltage().isPresent()
              && (entry.screenVoltage().isPresent() || entry.connection().equals("triode"));
      if (counts && placed && (entry.anodeCurrent().isPresent() || isCutOff(entry))) {
        usable.add(entry);
      }
    }
    return usable;
  }

  private static boolean isCutOff(Evidence entry) {
    return entry.kind().equals("cut-off") && entry.mutualConductance().isPresent();
  }

  static List<Observation> of(List<Evidence> used) {
    List<Observation> observations = new ArrayList<>();
    for (Evidence entry : used) {
      double factor = entry.confidence().equals("medium") ? MEDIUM : 1;
      for (Figure figure : Figure.values()) {
        OptionalDouble value = LawReadings.published(entry, figure);
        if (value.isEmpty() || !(value.getAsDouble() > 0)) {
          continue;
        }
        double published = value.getAsDouble();
        double relative = factor * deviation(entry, figure);
        observations.add(
            Observation.logarithmic(figure)
                ? new Observation(entry, figure, Math.log(published), relative)
                : new Observation(entry, figure, published, relative * published));
      }
    }
    return observations;
  }

  private static double deviation(Evidence entry, Figure figure) {
    boolean tied = entry.connection().equals("triode");
    return switch (figure) {
      case CURRENT -> entry.kind().equals("curve") ? CHART : tied ? 0.04 : 0.02;
      case SCREEN_CURRENT -> 0.08;
      case AMPLIFICATION, CUT_OFF -> 0.04;
      case ANODE_RESISTANCE -> tied ? 0.06 : 0.1;
      case MUTUAL_CONDUCTANCE -> isCutOff(entry) ? CUT_OFF_SLOPE : tied ? 0.05 : 0.02;
    };
  }
}
