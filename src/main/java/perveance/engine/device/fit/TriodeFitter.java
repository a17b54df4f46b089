package perveance.engine.device.fit;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import perveance.engine.device.Evidence;
import perveance.engine.device.SpreadTriodeLaw;
import perveance.engine.numeric.FitOutcome;
import perveance.engine.numeric.Statistics;

/**
 * Fits a {@link SpreadTriodeLaw}: perveance, contact potential, penetration factor and spread.
 *
 * <p>Weighted least squares over the figures of the evidence ({@link Observations}). The usual
 * spread and contact potential of the valve's class ({@link GridClass}) take part as two more
 * observations with the scatter of the class as their deviation: where a type's own evidence fixes
 * them they hardly matter, where only one point is known they decide, and the summary says so. What
 * tables do not tell is set by class: the cathode's own spread, the turn-back voltage, the grid's
 * perveance and, if unpublished, the onset of grid current.
 */
public final class TriodeFitter implements LawFitter {
  private static final double[] SPREAD_STARTS = {0.15, 0.35, 0.6};
  private static final double[] MU_STARTS = {3, 5, 8, 12, 20, 35, 60, 100};

  @Override
  public FitResult fit(List<Evidence> evidence, FitConditions conditions) {
    List<Evidence> used = Observations.usable(evidence, conditions);
    List<Observation> observations = Observations.of(used);
    if (observations.size() < 3) {
      return new FitResult.NotFitted(
          "a triode needs three figures at least, such as one point with current, mu and gm; there"
              + (observations.size() == 1 ? " is 1" : " are " + observations.size()));
    }
    Optional<Double> stated = statedAmplification(used);
    double[] starts = stated.map(mu -> new double[] {mu}).orElse(MU_STARTS);
    TriodeTrial best = null;
    String reason = "";
    for (double mu : starts) {
      GridClass gridClass = GridClass.of(conditions.filament().isPresent(), mu);
      for (double spread : SPREAD_STARTS) {
        TriodeTrial trial = new TriodeTrial(used, observations, conditions, gridClass, mu, spread);
        if (trial.outcome() instanceof FitOutcome.NotFitted notFitted) {
          reason = notFitted.reason();
        } else if (best == null || trial.rms() < best.rms()) {
          best = trial;
        }
      }
    }
    return best == null ? new FitResult.NotFitted(reason) : new FitResult.Fitted(best.result());
  }

  /** Nominal mu as the evidence states it: directly, or as gm times ra. */
  private static Optional<Double> statedAmplification(List<Evidence> used) {
    List<Double> stated = new ArrayList<>();
    for (Evidence entry : used) {
      if (entry.amplificationFactor().isPresent()) {
        stated.add(entry.amplificationFactor().getAsDouble());
      } else if (entry.anodeResistance().isPresent() && entry.mutualConductance().isPresent()) {
        stated.add(entry.anodeResistance().getAsDouble() * entry.mutualConductance().getAsDouble());
      }
    }
    return stated.isEmpty()
        ? Optional.empty()
        : Optional.of(
            Statistics.median(stated.stream().mapToDouble(Double::doubleValue).toArray()));
  }
}
