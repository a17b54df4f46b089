package perveance.engine.device.fit;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.base.PhysicalConstants;
import perveance.engine.device.Evidence;
import perveance.engine.device.SpaceChargeDiodeLaw;
import perveance.engine.device.Validity;
import perveance.engine.numeric.FitOutcome;
import perveance.engine.numeric.FitParameter;
import perveance.engine.numeric.LeastSquares;

/**
 * Fits a {@link SpaceChargeDiodeLaw} to published drops: the perveance of one anode.
 *
 * <p>The contact potential is set by class: with an oxide cathode 0.5 V, with a filament 0, because
 * the voltage along it swings as far either way. Every drop counts alike, by its relative current;
 * those marked low count only where there is no other.
 */
public record RectifierFitter() implements LawFitter {
  private static final double CONTACT_POTENTIAL = 0.5;

  /** Relative deviation of the current at a printed drop: two figures, three-halves power. */
  private static final double DEVIATION = 0.05;

  private static final double START = 1e-3;

  private static final double PEAK = 3;

  @Override
  public FitResult fit(List<Evidence> evidence, FitConditions conditions) {
    boolean onlyLow = usable(evidence, false).isEmpty();
    List<Evidence> used = usable(evidence, onlyLow);
    if (used.isEmpty()) {
      return new FitResult.NotFitted("a rectifier needs a drop: anode voltage with its current");
    }
    double contact = conditions.filament().isPresent() ? 0 : CONTACT_POTENTIAL;
    double[] observed = new double[used.size()];
    double[] deviation = new double[used.size()];
    List<Observation> observations = new ArrayList<>();
    for (int i = 0; i < observed.length; i++) {
      observed[i] = used.get(i).anodeCurrent().orElseThrow();
      deviation[i] = DEVIATION * observed[i];
      observations.add(new Observation(used.get(i), Figure.CURRENT, observed[i], deviation[i]));
    }
    FitOutcome outcome =
        LeastSquares.fit(
            (p, predicted) -> {
              LawReadings readings = new LawReadings(law(p[0], contact));
              for (int i = 0; i < predicted.length; i++) {
                predicted[i] = observations.get(i).predicted(readings);
              }
            },
            List.of(FitParameter.positive("perveance", START)),
            observed,
            deviation);
    return outcome instanceof FitOutcome.Fitted fitted
        ? new FitResult.Fitted(result(used, observations, fitted, contact, onlyLow))
        : new FitResult.NotFitted(((FitOutcome.NotFitted) outcome).reason());
  }

  private static LawFit result(
      List<Evidence> used,
      List<Observation> observations,
      FitOutcome.Fitted fitted,
      double contact,
      boolean onlyLow) {
    SpaceChargeDiodeLaw law = law(fitted.parameters()[0], contact);
    List<Residual> residuals = new LawReadings(law).compare(used);
    return new LawFit(
        law,
        FitReport.summary(observations, residuals, fitted, assumptions(contact, onlyLow)),
        range(used),
        residuals,
        List.of("perveance"),
        fitted.covariance(),
        List.of());
  }

  private static List<Evidence> usable(List<Evidence> evidence, boolean low) {
    return evidence.stream()
        .filter(entry -> entry.fit() && entry.confidence().equals("low") == low)
        .filter(entry -> entry.anodeVoltage() > 0 && entry.anodeCurrent().orElse(0) > 0)
        .toList();
  }

  /** From no current to the rated peaks, which are three times the direct current. */
  private static Validity range(List<Evidence> used) {
    double voltage = 0;
    double current = 0;
    for (Evidence entry : used) {
      voltage = Math.max(voltage, entry.anodeVoltage());
      current = Math.max(current, entry.anodeCurrent().orElse(0));
    }
    return new Validity(0, Math.cbrt(PEAK * PEAK) * voltage, 0, PEAK * current, 0, 0);
  }

  private static SpaceChargeDiodeLaw law(double perveance, double contact) {
    return new SpaceChargeDiodeLaw(
        perveance, contact, PhysicalConstants.thermalVoltage(TriodeTrial.CATHODE_TEMPERATURE));
  }

  private static List<String> assumptions(double contact, boolean onlyLow) {
    List<String> assumptions = new ArrayList<>();
    if (onlyLow) {
      assumptions.add("no drop of its own is published here: a rough guide only");
    }
    assumptions.add(
        FitReport.text("contact potential %.1f V: class value; cathode at 1000 K", contact));
    return assumptions;
  }
}
