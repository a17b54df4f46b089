package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import perveance.engine.analysis.SmallSignalAnswer.Shelf;
import perveance.engine.base.Finding;
import perveance.engine.base.PreferredSeries;
import perveance.engine.base.Severity;
import perveance.engine.base.SignalMessage;
import perveance.engine.base.Unit;
import perveance.engine.circuit.Element.Capacitor;
import perveance.engine.stage.StageCircuit.Part;

/** Findings about corners, the bypass shelf and noise. */
final class ResponseFindings {
  /** Lowest frequency of music that is taken for granted [Hz]. */
  private static final double LOW = 20;

  /** Highest [Hz]. */
  private static final double HIGH = 20e3;

  /** A corner that the grid alone makes within this of the whole is the grid's [1]. */
  private static final double NEARBY = 2;

  /** A shelf of less than this is not heard as one [dB]. */
  private static final double SLIGHT_STEP = 1;

  /** Input noise above this is told of where the source makes less than half of it [V]. */
  private static final double NOISY = 5e-6;

  /** A clean input so many times the noise leaves it without meaning: 100 dB [1]. */
  private static final double QUIET = 1e5;

  private final FindingContext context;
  private final SmallSignalAnswer small;
  private final List<Finding> findings = new ArrayList<>();

  private ResponseFindings(FindingContext context) {
    this.context = context;
    this.small = context.answer().smallSignal();
  }

  static List<Finding> of(FindingContext context) {
    ResponseFindings all = new ResponseFindings(context);
    all.shelf();
    all.lowCorner();
    all.highCorner();
    all.noise();
    return all.findings;
  }

  private void shelf() {
    Optional<Part> part =
        BypassShelf.capacitor(context.model()).flatMap(c -> PartRoles.part(stage(), c.name()));
    Optional<Shelf> shelf = small.shelf().filter(s -> s.pole() > LOW && s.step() > SLIGHT_STEP);
    if (part.isEmpty() || shelf.isEmpty()) {
      return;
    }
    Finding finding =
        Finding.of(
                SignalMessage.BYPASS_SHELF,
                Severity.NOTE,
                context.ref(),
                context.ref(),
                Words.of(shelf.get().pole(), Unit.HERTZ),
                Words.roughly(shelf.get().step(), Unit.DECIBEL),
                context.named(part.get()))
            .withValue(shelf.get().pole(), LOW, Unit.HERTZ)
            .onPart(part.get().element());
    double wanted = part.get().value() * shelf.get().pole() / (LOW / 2);
    add(finding, part.get(), PreferredSeries.E6.above(wanted));
  }

  private void lowCorner() {
    Optional<Capacitor> coupling =
        PartRoles.coupling(context.model(), context.model().mainOutput());
    Optional<Part> part = coupling.flatMap(c -> PartRoles.part(stage(), c.name()));
    if (small.lowCorner().isEmpty() || small.lowCorner().getAsDouble() <= 1.5 * LOW) {
      return;
    }
    double corner = small.lowCorner().getAsDouble();
    Finding finding =
        Finding.of(
                SignalMessage.LOW_CORNER_HIGH,
                Severity.NOTE,
                context.ref(),
                context.ref(),
                Words.of(corner, Unit.HERTZ))
            .withValue(corner, LOW, Unit.HERTZ);
    boolean couplingDecides =
        small.couplingCorner().isPresent() && small.couplingCorner().getAsDouble() > corner / 2;
    if (part.isPresent() && couplingDecides) {
      double wanted = part.get().value() * small.couplingCorner().getAsDouble() / LOW;
      add(finding.onPart(part.get().element()), part.get(), PreferredSeries.E6.above(wanted));
    } else {
      findings.add(finding);
    }
  }

  private void highCorner() {
    if (small.highCorner().isEmpty() || small.highCorner().getAsDouble() >= HIGH) {
      return;
    }
    double corner = small.highCorner().getAsDouble();
    StageModel model = context.model();
    int grid = model.valve(context.answer().points().get(0).ref()).grid();
    double before = model.signal().midbandOutputResistance(grid, 0);
    boolean input = 1 / (2 * Math.PI * before * small.inputCapacitance()) < NEARBY * corner;
    double resistance =
        input
            ? before
            : model
                .signal()
                .midbandOutputResistance(model.mainOutput().plus(), model.mainOutput().minus());
    Finding finding =
        Finding.of(
                SignalMessage.HIGH_CORNER_LOW,
                Severity.NOTE,
                context.ref(),
                context.ref(),
                Words.of(corner, Unit.HERTZ),
                Words.roughly(resistance, Unit.OHM)
                    + (input ? " before the grid" : " at the output"),
                "about "
                    + Words.roughly(1 / (2 * Math.PI * corner * resistance), Unit.FARAD)
                    + (input ? " at it" : " there"))
            .withValue(corner, HIGH, Unit.HERTZ);
    findings.add(input ? stopper(finding) : finding);
  }

  /** The stopper that restores the top, where it is what costs it. */
  private Finding stopper(Finding finding) {
    Remedies remedies = context.remedies();
    return remedies.resistors().stream()
        .filter(p -> p.role().contains("stopper"))
        .findFirst()
        .flatMap(
            p -> remedies.smallest(List.of(p), v -> v.small().highCorner().orElse(HIGH) >= HIGH))
        .map(finding::withRemedy)
        .orElse(finding);
  }

  private void noise() {
    Optional<Band.Share> most = small.noiseShares().stream().findFirst();
    boolean source = most.filter(s -> s.cause().endsWith(".source")).isPresent();
    if (small.noiseInput().isEmpty() || most.isEmpty() || source) {
      return;
    }
    double input = small.noiseInput().getAsDouble();
    double room = context.answer().clean().inputPeak() / input;
    if (input > NOISY && room < QUIET) {
      String cause = most.get().cause();
      findings.add(
          Finding.of(
                  SignalMessage.HIGH_NOISE,
                  Severity.NOTE,
                  context.ref(),
                  context.ref(),
                  Words.roughly(input, Unit.VOLT),
                  PartRoles.part(stage(), cause).map(context::named).orElse(cause))
              .withValue(input, Unit.VOLT));
    }
  }

  private perveance.engine.stage.StageCircuit stage() {
    return context.model().stage();
  }

  private void add(Finding finding, Part part, double value) {
    Remedies remedies = context.remedies();
    Optional<Remedies.Trial> trial =
        value > part.value() ? remedies.trial(part, value) : Optional.empty();
    findings.add(
        trial.map(t -> finding.withRemedy(remedies.corner(t, small.lowCorner()))).orElse(finding));
  }
}
