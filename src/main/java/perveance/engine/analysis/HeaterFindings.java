package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import perveance.engine.analysis.Envelopes.Envelope;
import perveance.engine.base.Finding;
import perveance.engine.base.RatingMessage;
import perveance.engine.base.Remedy;
import perveance.engine.base.Severity;
import perveance.engine.base.SupplyMessage;
import perveance.engine.base.Unit;
import perveance.engine.device.Heater;
import perveance.engine.stage.Conditions;

/** Findings about the heaters: their voltage at today's mains, and the winding that feeds them. */
final class HeaterFindings {
  private static final String WHERE = "heaters";

  /** What makers want: heaters within 5 % of their rating, and never beyond 10 % [1]. */
  private static final double WANTED = 0.05;

  private static final double MOST = 0.10;

  /** Windings are sold in steps of this [A]. */
  private static final double STEP = 0.5;

  private final Conditions conditions;
  private final List<Envelope> envelopes;
  private final List<Finding> findings = new ArrayList<>();

  private HeaterFindings(ChassisModel model) {
    this.conditions = model.chassis().conditions();
    this.envelopes = Envelopes.of(model);
  }

  static List<Finding> of(ChassisModel model) {
    HeaterFindings all = new HeaterFindings(model);
    all.voltage();
    all.budget();
    return all.findings;
  }

  private Optional<Heater> onWinding(Envelope envelope) {
    return conditions.heaters().suited(envelope.device().heaters());
  }

  private void voltage() {
    double actual = conditions.heaters().voltage() * conditions.mainsRatio();
    Map<Double, List<String>> valves = new LinkedHashMap<>();
    for (Envelope envelope : envelopes) {
      onWinding(envelope)
          .filter(h -> Math.abs(actual / h.voltage() - 1) > WANTED)
          .ifPresent(
              h ->
                  valves.computeIfAbsent(h.voltage(), v -> new ArrayList<>()).add(envelope.name()));
    }
    valves.forEach((rated, names) -> findings.add(outside(names, actual, rated)));
  }

  private static Finding outside(List<String> names, double actual, double rated) {
    boolean far = Math.abs(actual / rated - 1) > MOST;
    double share = far ? MOST : WANTED;
    double bound = rated * (1 + Math.copySign(share, actual - rated));
    return Finding.of(
            RatingMessage.HEATER_VOLTAGE_OUTSIDE,
            far ? Severity.CAUTION : Severity.NOTE,
            WHERE,
            String.join(", ", names),
            Words.of(actual, Unit.VOLT),
            "±" + Words.percent(share),
            Words.of(rated, Unit.VOLT))
        .withValue(actual, bound, Unit.VOLT);
  }

  private void budget() {
    conditions.heaters().winding().ifPresent(this::budget);
  }

  private void budget(double winding) {
    double taken = conditions.heaters().other();
    for (Envelope envelope : envelopes) {
      taken += onWinding(envelope).map(Heater::current).orElse(0.0);
    }
    if (taken > winding) {
      double enough = STEP * Math.ceil(taken / STEP);
      findings.add(
          Finding.of(
                  SupplyMessage.HEATER_BUDGET_OVER,
                  Severity.OVER_LIMIT,
                  WHERE,
                  Words.of(taken, Unit.AMPERE),
                  Words.of(winding, Unit.AMPERE))
              .withValue(taken, winding, Unit.AMPERE)
              .withRemedy(
                  Remedy.byHand(
                      "A winding of "
                          + Words.part(enough, Unit.AMPERE)
                          + " carries them; what is over now heats the transformer.")));
    }
  }
}
