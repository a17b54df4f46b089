package perveance.engine.analysis;

import java.util.Optional;
import perveance.engine.base.Finding;
import perveance.engine.base.PreferredSeries;
import perveance.engine.base.Remedy;
import perveance.engine.base.Severity;
import perveance.engine.base.SignalMessage;
import perveance.engine.base.Unit;
import perveance.engine.circuit.Element;
import perveance.engine.circuit.Element.Capacitor;
import perveance.engine.circuit.MidbandSolution;

/**
 * Blocking: a drive of twice the clean input lets grid current charge the capacitor before the
 * grid; when the drive has gone, the bias is too deep until the charge has leaked away.
 *
 * @param capacitor the capacitor before the grid
 * @param charge volts that the overload adds across it [V]
 * @param resistance through which they leak away [ohm]
 * @param seconds until the bias is within a tenth of itself [s]
 */
record Blocking(InputCapacitor capacitor, double charge, double resistance, double seconds) {
  /** An overload of 6 dB, usual in instrument amplifiers [1]. */
  private static final double OVERLOAD = 2;

  /** The bias has recovered when it is within this share of itself [1]. */
  private static final double RECOVERED = 0.1;

  /** A gap of less than this after an overload is not heard as one, common practice [s]. */
  private static final double HEARD = 0.05;

  /** What is left of the low end when the capacitor is made smaller [Hz]. */
  private static final double LOW = 20;

  /** What blocking does to a stage; empty where no stated capacitor stands before the grid. */
  static Optional<Blocking> of(FindingContext context) {
    StageModel model = context.model();
    Optional<Capacitor> before = before(model);
    if (before.isEmpty() || context.inputCapacitor().isEmpty()) {
      return Optional.empty();
    }
    Capacitor c = before.get();
    InputCapacitor stated = context.inputCapacitor().get();
    Optional<MidbandSolution> overload =
        new DrivenLevels(model).cycle(OVERLOAD * context.answer().clean().inputPeak());
    Optional<Double> resistance =
        WithoutCapacitor.signal(model, c).map(s -> s.midbandOutputResistance(c.a(), c.b()));
    if (overload.isEmpty() || resistance.isEmpty()) {
      return Optional.empty();
    }
    double idle = model.dc().voltage(c.a()) - model.dc().voltage(c.b());
    double charge = overload.get().meanVoltage(c.a(), c.b()) - idle;
    double left = RECOVERED * Math.abs(context.answer().points().get(0).grid());
    double time =
        charge > left ? resistance.get() * stated.capacitance() * Math.log(charge / left) : 0;
    return Optional.of(new Blocking(stated, charge, resistance.get(), time));
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
    return of(context).filter(b -> b.seconds() > HEARD).map(b -> b.told(context));
  }

  private Finding told(FindingContext context) {
    Finding finding =
        Finding.of(
                SignalMessage.BLOCKING,
                Severity.NOTE,
                context.ref(),
                context.ref(),
                name(),
                Words.roughly(charge, Unit.VOLT),
                Words.roughly(seconds, Unit.SECOND))
            .withValue(seconds, HEARD, Unit.SECOND)
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
            ? Remedy.set(
                text,
                capacitor.key(),
                perveance.engine.base.QuantityFormat.PLAIN.part(value, Unit.FARAD))
            : Remedy.byHand(text));
  }
}
