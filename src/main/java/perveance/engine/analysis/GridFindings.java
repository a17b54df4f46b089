package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.base.BiasMessage;
import perveance.engine.base.Finding;
import perveance.engine.base.PreferredSeries;
import perveance.engine.base.Remedy;
import perveance.engine.base.Severity;
import perveance.engine.base.Unit;
import perveance.engine.stage.StageCircuit.Part;

/** Findings about what grid current does at idle to the resistance before the grid. */
final class GridFindings {
  /** A shift of the grid by less than this is within any valve's contact potential [V]. */
  private static final double SHIFT = 0.1;

  private final FindingContext context;
  private final List<Finding> findings = new ArrayList<>();

  private GridFindings(FindingContext context) {
    this.context = context;
  }

  static List<Finding> of(FindingContext context) {
    GridFindings all = new GridFindings(context);
    context.answer().points().forEach(all::leak);
    Blocking.finding(context).ifPresent(all.findings::add);
    return all.findings;
  }

  private void leak(DevicePoint point) {
    OptionalDouble before = GridCircuit.resistance(context.model().circuit(), point.ref());
    double shift = point.gridCurrent() * before.orElse(0);
    if (shift < SHIFT) {
      return;
    }
    Finding finding =
        Finding.of(
                BiasMessage.GRID_LEAK_VOLTAGE,
                Severity.NOTE,
                context.ref(),
                point.ref(),
                Words.part(before.orElse(0), Unit.OHM),
                Words.roughly(-shift, Unit.VOLT))
            .withValue(shift, SHIFT, Unit.VOLT)
            .onPart(point.ref());
    findings.add(remedy(point, shift).map(finding::withRemedy).orElse(finding));
  }

  /** A lower leak; where the shift is the only bias there is, care in measuring it. */
  private Optional<Remedy> remedy(DevicePoint point, double shift) {
    boolean onlyBias = point.cathodeChassis() == 0 && !context.values().has("grid_bias");
    if (onlyBias) {
      return Optional.of(
          Remedy.byHand(
              "It is the stage's bias and differs from valve to valve; judge it at the anode, since"
                  + " a meter on the grid takes it away."));
    }
    Remedies remedies = context.remedies();
    int grid = context.model().valve(point.ref()).grid();
    for (Part part : remedies.resistors()) {
      if (part.role().contains("grid leak") || PartRoles.touches(context.model(), part, grid)) {
        double value = PreferredSeries.E12.below(0.9 * part.value() * SHIFT / shift);
        Optional<Remedies.Trial> trial = remedies.trial(part, value);
        if (trial.filter(t -> lower(t.answer(), point, value, shift)).isPresent()) {
          return trial.map(remedies::remedy);
        }
      }
    }
    return Optional.empty();
  }

  private static boolean lower(Variant variant, DevicePoint point, double leak, double shift) {
    return variant.points().stream()
        .filter(p -> p.ref().equals(point.ref()))
        .allMatch(p -> p.gridCurrent() * leak < 0.5 * shift);
  }
}
