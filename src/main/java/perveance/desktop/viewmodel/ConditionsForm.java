package perveance.desktop.viewmodel;

import java.util.List;
import java.util.Optional;
import perveance.app.Edit;
import perveance.engine.base.QuantityException;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.QuantityParser;
import perveance.engine.base.Unit;
import perveance.engine.stage.Conditions;

/** The conditions of a chassis as a form. */
public final class ConditionsForm {
  private static final List<String> WORDS =
      List.of(
          "Mains, nominal",
          "Mains, today",
          "Mains frequency",
          "Meter resistance",
          "Tolerance of resistors",
          "Tolerance of capacitors",
          "Doubt of a stated supply",
          "Measure again below (check your local rule)");

  private static final List<Unit> UNITS =
      List.of(
          Unit.VOLT,
          Unit.VOLT,
          Unit.HERTZ,
          Unit.OHM,
          Unit.RATIO,
          Unit.RATIO,
          Unit.RATIO,
          Unit.VOLT);

  private final Workbench bench;

  /**
   * The form of a workbench's chassis.
   *
   * @param bench the workbench
   */
  public ConditionsForm(Workbench bench) {
    this.bench = bench;
  }

  /**
   * One line of the form.
   *
   * @param words what it is
   * @param text present value
   */
  public record Row(String words, String text) {}

  /**
   * The lines.
   *
   * @return in the order in which {@link #take} wants them back
   */
  public List<Row> rows() {
    Conditions c = bench.chassis().conditions();
    double[] values = {
      c.mains(),
      c.mainsActual(),
      c.mainsFrequency(),
      c.meter(),
      c.resistorTolerance(),
      c.capacitorTolerance(),
      c.supplyTolerance(),
      c.threshold()
    };
    return java.util.stream.IntStream.range(0, values.length)
        .mapToObj(i -> new Row(WORDS.get(i), text(values[i], UNITS.get(i))))
        .toList();
  }

  private static String text(double value, Unit unit) {
    return unit == Unit.RATIO
        ? QuantityFormat.PLAIN.percent(value, 3)
        : QuantityFormat.PLAIN.part(value, unit);
  }

  /**
   * Takes the form back as one edit.
   *
   * @param texts in the order of {@link #rows}
   * @return why it cannot be, empty when it was done
   */
  public Optional<String> take(List<String> texts) {
    double[] v = new double[texts.size()];
    for (int i = 0; i < v.length; i++) {
      try {
        v[i] = QuantityParser.parse(texts.get(i), UNITS.get(i)).value();
      } catch (QuantityException e) {
        return Optional.of(
            WORDS.get(i) + ": found " + e.found() + ", expected " + e.expected() + ".");
      }
      if ((!(v[i] > 0) && UNITS.get(i) != Unit.RATIO) || v[i] < 0) {
        return Optional.of(WORDS.get(i) + ": found " + texts.get(i) + ", expected above zero.");
      }
    }
    return bench.edit(
        new Edit.SetConditions(
            new Conditions(v[0], v[1], v[2], v[3], v[4], v[5], v[6], v[7])
                .with(bench.chassis().conditions().heaters())));
  }
}
