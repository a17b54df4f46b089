package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.base.Finding;
import perveance.engine.base.OutputMessage;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.Remedy;
import perveance.engine.base.Severity;
import perveance.engine.base.Unit;
import perveance.engine.stage.StageCircuit.Part;
import perveance.engine.stage.StageCircuit.PartType;

/** Findings about the load of an output stage: a better one, a wrong one, little power. */
final class OutputLoadFindings {
  /** More clean power than this is worth another transformer [1]. */
  private static final double WORTHWHILE = 1.15;

  /** A stage that turns less than this share of its idle input into clean power has little [1]. */
  private static final double SMALL = 0.1;

  /** Limits that a load is judged by: those that signal drives. */
  private static final List<String> DRIVEN =
      List.of("anode dissipation", "screen dissipation", "cathode current");

  private final FindingContext context;
  private final Part transformer;
  private final double power;
  private final List<Finding> findings = new ArrayList<>();

  private OutputLoadFindings(FindingContext context, Part transformer, double power) {
    this.context = context;
    this.transformer = transformer;
    this.power = power;
  }

  static List<Finding> of(FindingContext context) {
    Optional<Part> transformer =
        context.answer().circuit().parts().stream()
            .filter(p -> p.type() == PartType.TRANSFORMER)
            .findFirst();
    OptionalDouble power =
        OutputLoad.cleanPower(context.model(), context.answer().clean().outputPeak());
    if (transformer.isEmpty() || power.isEmpty() || !(power.getAsDouble() > 0)) {
      return List.of();
    }
    OutputLoadFindings all =
        new OutputLoadFindings(context, transformer.get(), power.getAsDouble());
    all.best();
    all.small();
    all.half();
    return all.findings;
  }

  private String load() {
    return Words.part(transformer.value(), Unit.OHM);
  }

  private void best() {
    if (!within(context.answer().limits())) {
      return;
    }
    context
        .remedies()
        .best(transformer, power, v -> within(v.limits()) ? v.cleanPower() : 0, WORTHWHILE)
        .ifPresent(
            t ->
                findings.add(
                    Finding.of(
                            OutputMessage.LOAD_OFF_BEST,
                            Severity.NOTE,
                            context.ref(),
                            context.ref(),
                            load(),
                            Words.part(t.value(), Unit.OHM))
                        .withValue(transformer.value(), t.value(), Unit.OHM)
                        .onPart(transformer.element())
                        .withRemedy(
                            Remedy.set(
                                "A primary of "
                                    + Words.part(t.value(), Unit.OHM)
                                    + " gives "
                                    + Words.roughly(t.answer().cleanPower(), Unit.WATT)
                                    + " clean where this one gives "
                                    + Words.roughly(power, Unit.WATT)
                                    + ".",
                                transformer.key(),
                                t.text()))));
  }

  private static boolean within(List<LimitUse> limits) {
    return limits.stream().filter(u -> DRIVEN.contains(u.what())).allMatch(u -> u.share() <= 1);
  }

  private void small() {
    double idle =
        context.answer().points().stream()
            .mapToDouble(p -> p.anodeDissipation() + p.screenDissipation().orElse(0))
            .sum();
    if (power < SMALL * idle) {
      Finding finding =
          Finding.of(
                  OutputMessage.POWER_SMALL,
                  Severity.NOTE,
                  context.ref(),
                  context.ref(),
                  Words.roughly(power, Unit.WATT),
                  load(),
                  Words.percent(power / idle),
                  Words.roughly(idle, Unit.WATT))
              .withValue(power, SMALL * idle, Unit.WATT);
      findings.add(SwingFindings.moreOutput(context).map(finding::withRemedy).orElse(finding));
    }
  }

  /** A speaker of half the resistance on the same tap: the direction that overloads valves. */
  private void half() {
    if (context.values().find("drive").isEmpty()) {
      return;
    }
    Map<String, String> edits = new LinkedHashMap<>();
    for (String key : List.of("primary", "secondary_load")) {
      context
          .values()
          .find(key)
          .ifPresent(v -> edits.put(key, QuantityFormat.PLAIN.part(0.5 * v, Unit.OHM)));
    }
    Optional<Variant> halved = context.retry().with(context.ref(), edits);
    if (halved.isPresent() && within(context.answer().limits())) {
      halved.get().limits().stream()
          .filter(u -> u.when().equals(LimitShares.DRIVE) && DRIVEN.contains(u.what()))
          .filter(u -> u.share() > 1)
          .findFirst()
          .ifPresent(this::lowerLoad);
    }
  }

  private void lowerLoad(LimitUse use) {
    findings.add(
        Finding.of(
                OutputMessage.LOWER_LOAD_OVER,
                Severity.NOTE,
                context.ref(),
                context.ref(),
                use.ref() + "'s " + use.what(),
                Words.of(use.value(), use.unit()),
                Words.of(use.limit(), use.unit()))
            .withValue(use.value(), use.limit(), use.unit())
            .onPart(use.ref())
            .withRemedy(
                Remedy.byHand("Give a speaker of lower resistance the tap that is meant for it.")));
  }
}
