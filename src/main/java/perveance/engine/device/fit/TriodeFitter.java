package perveance.engine.device.fit;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
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
 *
 * <p>Where two or more published cut-off points all lie beyond what an evenly wound grid gives, a
 * small share of the cathode is put behind loose places of the grid and fitted too.
 */
public final class TriodeFitter implements LawFitter {
  /** Cut-off points are printed as approximate; a tenth is within the print [1]. */
  private static final double APPROXIMATE = 0.1;

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
    Search even = new Search(used, observations, conditions, false);
    Optional<TriodeTrial> best = even.best();
    if (best.isEmpty()) {
      return new FitResult.NotFitted(even.reason);
    }
    LawFit fit = best.get().result();
    if (!missesCutOff(fit)) {
      return new FitResult.Fitted(fit);
    }
    return new FitResult.Fitted(
        new Search(used, observations, conditions, true)
            .best()
            .filter(loose -> loose.rms() < best.get().rms())
            .map(TriodeTrial::result)
            .orElse(fit));
  }

  /** Whether an even grid is cut off well before the published cut-off, more points than one. */
  private static boolean missesCutOff(LawFit fit) {
    List<Residual> cutOffs =
        fit.residuals().stream().filter(r -> r.figure() == Figure.CUT_OFF).toList();
    return cutOffs.size() > 1
        && cutOffs.stream().allMatch(r -> r.predicted() - r.published() > APPROXIMATE * r.scale());
  }

  /** The best of many starts, with or without loose places in the grid. */
  private static final class Search {
    private @Nullable TriodeTrial best;
    private String reason = "";

    Search(
        List<Evidence> used,
        List<Observation> observations,
        FitConditions conditions,
        boolean loose) {
      Optional<Double> stated = statedAmplification(used);
      double[] starts = stated.map(mu -> new double[] {mu}).orElse(MU_STARTS);
      for (double mu : starts) {
        GridClass gridClass = GridClass.of(conditions.filament().isPresent(), mu);
        for (double spread : SPREAD_STARTS) {
          take(new TriodeTrial(used, observations, conditions, gridClass, mu, spread, loose));
        }
      }
    }

    Optional<TriodeTrial> best() {
      return Optional.ofNullable(best);
    }

    private void take(TriodeTrial trial) {
      if (trial.outcome() instanceof FitOutcome.NotFitted notFitted) {
        reason = notFitted.reason();
      } else if (best == null || trial.rms() < best.rms()) {
        best = trial;
      }
    }
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
