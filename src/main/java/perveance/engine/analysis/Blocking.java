package perveance.engine.analysis;

import java.util.List;
import java.util.Optional;
import perveance.engine.base.Finding;
import perveance.engine.base.PreferredSeries;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.Remedy;
import perveance.engine.base.Severity;
import perveance.engine.base.SignalMessage;
import perveance.engine.base.Unit;
import perveance.engine.circuit.Element;
import perveance.engine.circuit.Element.Capacitor;
import perveance.engine.circuit.MidbandSolution;

/**
 * Blocking: what an overload of 6 dB over the clean input leaves on the capacitor before a grid.
 */
final class Blocking {
  /** An overload of 6 dB, usual in instrument amplifiers [1]. */
  private static final double OVERLOAD = 2;

  /** The bias has recovered when it is within this share of itself [1]. */
  private static final double RECOVERED = 0.1;

  /** A gap of less than this after an overload is not heard as one, common practice [s]. */
  private static final double HEARD = 0.05;

  /** What is left of the low end when the capacitor is made smaller [Hz]. */
  private static final double LOW = 20;

  private final Recovery recovery;
  private final InputCapacitor capacitor;

  private Blocking(Recovery recovery) {
    this.recovery = recovery;
    this.capacitor = recovery.capacitor();
  }

  /**
   * Recovery of a stage; empty where no stated capacitor stands before the grid.
   *
   * @param model the stage
   * @param levels drives it
   * @param clean peak of its clean input [V]
   * @param bias grid to cathode at rest [V]
   * @param stated capacitor through which it is driven, where one is stated
   */
  static Optional<Recovery> recovery(
      StageModel model,
      DrivenLevels levels,
      double clean,
      double bias,
      Optional<InputCapacitor> stated) {
    Optional<Capacitor> before = before(model);
    if (before.isEmpty() || stated.isEmpty()) {
      return Optional.empty();
    }
    Capacitor c = before.get();
    Optional<MidbandSolution> overload = levels.cycle(OVERLOAD * clean);
    Optional<Double> resistance =
        WithoutCapacitor.signal(model, c).map(s -> s.midbandOutputResistance(c.a(), c.b()));
    if (overload.isEmpty() || resistance.isEmpty()) {
      return Optional.empty();
    }
    double idle = model.dc().voltage(c.a()) - model.dc().voltage(c.b());
    double charge = overload.get().meanVoltage(c.a(), c.b()) - idle;
    double left = RECOVERED * Math.abs(bias);
    double time =
        charge > left ? resistance.get() * stated.get().capacitance() * Math.log(charge / left) : 0;
    return Optional.of(
        new Recovery(stated.get(), OVERLOAD * clean, charge, resistance.get(), left, time));
  }

  private static Optional<Capacitor> before(StageModel model) {
    String name = model.stage().ref() + ".input_coupling";
    for (Element element : model.circuit().elements()) {
      if (element instanceof Capacitor c && c.name().equals(name)) {
        return Optional.of(c);
      }
    }
    return Optional.empty();
  }

  static Optional<Finding> finding(FindingContext context) {
    return context
        .answer()
        .large()
        .recovery()
        .filter(r -> r.seconds() > HEARD)
        .map(r -> new Blocking(r).told(context));
  }

  /** The hand sum of a recovery that takes any time. */
  static List<HandSum> sums(Optional<Recovery> recovery) {
    return recovery
        .filter(r -> r.seconds() > 0)
        .map(
            r ->
                new HandSum(
                    "recovery after overload",
                    "t = R C ln(charge / rest)",
                    Sum.ohms(r.resistance())
                        + " x "
                        + Sum.farads(r.capacitor().capacitance())
                        + " x ln("
                        + Sum.volts(r.charge())
                        + " / "
                        + Sum.volts(r.left())
                        + ")",
                    QuantityFormat.TYPESET.reading(r.seconds(), Unit.SECOND, 3),
                    "after "
                        + Sum.volts(r.inputPeak())
                        + " peak in, until the bias is within a tenth of itself"))
        .stream()
        .toList();
  }

  private Finding told(FindingContext context) {
    Finding finding =
        Finding.of(
                SignalMessage.BLOCKING,
                Severity.NOTE,
                context.ref(),
                context.ref(),
                name(),
                Words.roughly(recovery.charge(), Unit.VOLT),
                Words.roughly(recovery.seconds(), Unit.SECOND))
            .withValue(recovery.seconds(), HEARD, Unit.SECOND)
            .onPart(capacitor.owner() + "." + capacitor.key());
    return remedy(context).map(finding::withRemedy).orElse(finding);
  }

  private String name() {
    return "the "
        + Words.part(capacitor.capacitance(), Unit.FARAD)
        + " "
        + capacitor.key().replace('_', ' ')
        + " of "
        + capacitor.owner();
  }

  /** A smaller capacitor that shortens the gap and still passes the lowest notes. */
  private Optional<Remedy> remedy(FindingContext context) {
    double seconds = recovery.seconds();
    double resistance = recovery.resistance();
    double enough = capacitor.capacitance() * HEARD / seconds;
    double least = 1 / (2 * Math.PI * LOW * resistance);
    double value = PreferredSeries.E6.above(Math.max(enough, least));
    if (value > 0.75 * capacitor.capacitance()) {
      return Optional.empty();
    }
    String text =
        Words.part(value, Unit.FARAD)
            + " there shortens it to "
            + Words.roughly(seconds * value / capacitor.capacitance(), Unit.SECOND)
            + ", with a corner of "
            + Words.roughly(1 / (2 * Math.PI * resistance * value), Unit.HERTZ)
            + ".";
    return Optional.of(
        capacitor.owner().equals(context.ref())
            ? Remedy.set(text, capacitor.key(), QuantityFormat.PLAIN.part(value, Unit.FARAD))
            : Remedy.byHand(text));
  }
}
