package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import perveance.engine.base.Finding;
import perveance.engine.base.OutputMessage;
import perveance.engine.base.Remedy;
import perveance.engine.base.Severity;
import perveance.engine.base.Unit;

/** Findings about pairs, phase splitters and output stages. */
final class OutputFindings {
  /** Gains to two outputs that differ by more than this are told of [1]. */
  private static final double UNBALANCED = 0.03;

  /** Idle currents of two valves of one stage that differ by more than this [1]. */
  private static final double UNEQUAL = 0.10;

  /** Screens that take this many times more at drive are told of [1]. */
  private static final double RISE = 2;

  private final FindingContext context;
  private final List<Finding> findings = new ArrayList<>();

  private OutputFindings(FindingContext context) {
    this.context = context;
  }

  static List<Finding> of(FindingContext context) {
    OutputFindings all = new OutputFindings(context);
    all.gains();
    all.screens();
    all.pair();
    return all.findings;
  }

  private void gains() {
    SmallSignalAnswer small = context.answer().smallSignal();
    if (small.secondGain().isEmpty()) {
      return;
    }
    double difference = difference(small.gain(), small.secondGain().getAsDouble());
    if (difference > UNBALANCED) {
      Finding finding =
          Finding.of(
                  OutputMessage.OUTPUTS_UNBALANCED,
                  Severity.CAUTION,
                  context.ref(),
                  context.ref(),
                  Words.percent(difference))
              .withValue(difference, UNBALANCED, Unit.RATIO);
      findings.add(balance(difference).map(finding::withRemedy).orElse(finding));
    }
  }

  private static double difference(double first, double second) {
    double mean = 0.5 * (Math.abs(first) + Math.abs(second));
    return mean > 0 ? Math.abs(Math.abs(first) - Math.abs(second)) / mean : 0;
  }

  private Optional<Remedy> balance(double now) {
    Remedies remedies = context.remedies();
    return remedies.smallest(
        remedies.resistors().stream()
            .filter(p -> p.role().contains("load") || p.role().contains("divider"))
            .toList(),
        v ->
            v.secondGain().isPresent()
                && difference(v.gain(), v.secondGain().getAsDouble())
                    < Math.min(UNBALANCED, 0.8 * now)
                && v.clean().outputPeak()
                    > BiasFindings.KEPT * context.answer().clean().outputPeak());
  }

  private void screens() {
    double idle =
        context.answer().points().stream().mapToDouble(p -> p.screenCurrent().orElse(0)).sum();
    context
        .answer()
        .driven()
        .filter(d -> idle > 0 && d.meanScreenCurrent().orElse(0) > RISE * idle)
        .ifPresent(
            d ->
                findings.add(
                    Finding.of(
                            OutputMessage.SCREEN_RISES,
                            Severity.NOTE,
                            context.ref(),
                            context.ref(),
                            Words.of(d.meanScreenCurrent().orElse(0), Unit.AMPERE),
                            Words.of(idle, Unit.AMPERE))
                        .withValue(d.meanScreenCurrent().orElse(0), idle, Unit.AMPERE)));
  }

  private void pair() {
    List<DevicePoint> points = context.answer().points();
    boolean composite =
        context.answer().circuit().loadLine().filter(l -> l.composite()).isPresent();
    if (!composite || points.size() < 2) {
      return;
    }
    double difference = difference(points.get(0).anodeCurrent(), points.get(1).anodeCurrent());
    if (difference > UNEQUAL) {
      findings.add(
          Finding.of(
                  OutputMessage.PAIR_UNBALANCED,
                  Severity.CAUTION,
                  context.ref(),
                  context.ref(),
                  Words.percent(difference))
              .withValue(difference, UNEQUAL, Unit.RATIO));
    }
  }
}
