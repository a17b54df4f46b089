package perveance.engine.device.fit;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.device.Evidence;
import perveance.engine.device.SpreadPentodeLaw;
import perveance.engine.numeric.FitOutcome;
import perveance.engine.numeric.Statistics;

/**
 * Fits a {@link SpreadPentodeLaw}: perveance, contact potential, penetration factor and spread of
 * the grid, the anode's influence, the screen's share and how it falls as the anode is raised; of
 * beam tetrodes also the width of the beams, of remote cut-off types (those with a mutual
 * conductance published as cut-off) the part of the grid with wide turns.
 *
 * <p>Weighted least squares over the figures of the evidence ({@link PentodeObservations}); triode
 * connected points count too. What the evidence leaves open is held by the usual values of the
 * class ({@link PentodeClass}), which take part as observations with the scatter of the class as
 * their deviation. The knee is set by class and never fitted.
 *
 * @param beam true for beam plates, false for a suppressor grid
 */
public record PentodeFitter(boolean beam) implements LawFitter {
  private static final double[] MU_STARTS = {6, 10, 18, 30, 50};

  @Override
  public FitResult fit(List<Evidence> evidence, FitConditions conditions) {
    List<Evidence> used = PentodeObservations.usable(evidence);
    List<Observation> observations = PentodeObservations.of(used);
    if (observations.size() < 4) {
      return new FitResult.NotFitted(
          "a pentode needs four figures at least, such as one point with anode current, screen"
              + " current, gm and ra; found "
              + observations.size());
    }
    PentodeClass pentodeClass = PentodeClass.of(beam, isRemote(used), highestCurrent(used));
    PentodeTrial best = null;
    String reason = "";
    for (double mu : starts(used)) {
      PentodeTrial trial = new PentodeTrial(used, observations, conditions, pentodeClass, mu);
      if (trial.outcome() instanceof FitOutcome.NotFitted notFitted) {
        reason = notFitted.reason();
      } else if (best == null || trial.fitted().rms() < best.fitted().rms()) {
        best = trial;
      }
    }
    return best == null ? new FitResult.NotFitted(reason) : new FitResult.Fitted(best.result());
  }

  private static boolean isRemote(List<Evidence> used) {
    return used.stream().anyMatch(entry -> entry.kind().equals("cut-off"));
  }

  private static double highestCurrent(List<Evidence> used) {
    double highest = 0;
    for (Evidence entry : used) {
      double cathode = entry.anodeCurrent().orElse(0) + entry.screenCurrent().orElse(0);
      highest = Math.max(highest, cathode);
    }
    return highest;
  }

  private static double[] starts(List<Evidence> used) {
    List<Double> stated = new ArrayList<>();
    for (Evidence entry : used) {
      entry.amplificationFactor().ifPresent(stated::add);
    }
    return stated.isEmpty()
        ? MU_STARTS
        : new double[] {
          Statistics.median(stated.stream().mapToDouble(Double::doubleValue).toArray())
        };
  }
}
