package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.base.Finding;
import perveance.engine.base.OutputMessage;
import perveance.engine.base.Remedy;
import perveance.engine.base.Severity;
import perveance.engine.base.Unit;

/** Findings about an output stage into a reactive load. */
final class ReactiveFindings {
  private final FindingContext context;
  private final ReactiveAnswer reactive;
  private final String frequency;

  private ReactiveFindings(FindingContext context, ReactiveAnswer reactive) {
    this.context = context;
    this.reactive = reactive;
    this.frequency = Words.of(reactive.frequency(), Unit.HERTZ);
  }

  static List<Finding> of(FindingContext context) {
    return context
        .answer()
        .large()
        .reactive()
        .map(reactive -> new ReactiveFindings(context, reactive).all())
        .orElse(List.of());
  }

  private List<Finding> all() {
    List<Finding> findings = new ArrayList<>();
    double most = reactive.anodeDissipation().stream().mapToDouble(w -> w).max().orElse(0);
    double limit = reactive.dissipationLimit().orElse(Double.POSITIVE_INFINITY);
    if (most > limit) {
      findings.add(hot(most, limit));
    }
    if (reactive.cutOff() && cleanIntoResistance()) {
      findings.add(
          Finding.of(
                  OutputMessage.REACTIVE_CUT_OFF,
                  Severity.NOTE,
                  context.ref(),
                  context.ref(),
                  frequency)
              .withRemedy(
                  Remedy.byHand("A smaller drive or a higher idle current keeps it conducting.")));
    }
    return findings;
  }

  private Finding hot(double most, double limit) {
    return Finding.of(
            OutputMessage.REACTIVE_DISSIPATION,
            Severity.OVER_LIMIT,
            context.ref(),
            context.ref(),
            frequency,
            Words.of(most, Unit.WATT),
            Words.of(limit, Unit.WATT))
        .withValue(most, limit, Unit.WATT);
  }

  /** Whether a single valve conducts all through the same drive into the resistance alone. */
  private boolean cleanIntoResistance() {
    boolean composite =
        context.answer().circuit().loadLine().filter(l -> l.composite()).isPresent();
    return !composite && reactive.inputPeak() <= context.answer().clean().inputPeak();
  }
}
