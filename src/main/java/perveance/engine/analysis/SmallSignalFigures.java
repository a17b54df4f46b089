package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import perveance.engine.analysis.SmallSignalAnswer.ResponsePoint;
import perveance.engine.circuit.CapacitorRole;
import perveance.engine.circuit.Complex;
import perveance.engine.circuit.Corners;
import perveance.engine.circuit.Element;
import perveance.engine.circuit.Element.Capacitor;
import perveance.engine.circuit.Element.Inductor;
import perveance.engine.circuit.Element.Transformer;
import perveance.engine.stage.StageCircuit.Output;

/** Gathers a stage's small-signal figures under its real load. */
final class SmallSignalFigures {
  private static final double LOWEST = 1;
  private static final double HIGHEST = 1e6;
  private static final int PER_DECADE = 12;

  /** Nothing takes current from an output that sees more than this [ohm]. */
  private static final double UNLOADED = 100e6;

  private final StageModel model;
  private final Output main;
  private final int plus;
  private final int minus;

  SmallSignalFigures(StageModel model) {
    this.model = model;
    this.main = model.mainOutput();
    this.plus = main.plus();
    this.minus = main.minus();
  }

  SmallSignalAnswer answer(boolean response) {
    Corners corners = corners();
    NoiseFigures noise = NoiseFigures.of(model);
    return new SmallSignalAnswer(
        model.gain(main),
        model.stage().outputs().size() > 1
            ? OptionalDouble.of(model.gain(model.stage().outputs().get(1)))
            : OptionalDouble.empty(),
        OutputLoad.sourceResistance(model, model.signal(), main),
        InputAdmittance.capacitance(model),
        limitedBelow() ? corners.low() : OptionalDouble.empty(),
        corners.high(),
        BypassShelf.of(model),
        couplingCorner(),
        noise.input(),
        noise.shares(),
        Map.of(),
        response ? response() : List.of());
  }

  /** Corners from the stage's input on; where nothing reaches it, from the source on. */
  private Corners corners() {
    return model.atSource() || !model.reached()
        ? model.signal().corners(model.source(), plus, minus)
        : model.signal().corners(model.source(), model.stage().inputNode(), plus, minus);
  }

  /** Whether anything a person has put in limits the low end; stand-ins do not count. */
  private boolean limitedBelow() {
    for (Element element : model.circuit().elements()) {
      boolean limits =
          element instanceof Inductor
              || element instanceof Transformer
              || (element instanceof Capacitor c && c.role() == CapacitorRole.HOLDS);
      if (limits && PartRoles.isPart(model, element)) {
        return true;
      }
    }
    return false;
  }

  private ResponsePoint point(double frequency, Complex gain) {
    if (model.atSource()) {
      return new ResponsePoint(frequency, gain.magnitude(), gain.phase());
    }
    Complex input =
        model.signal().transfer(model.source(), model.stage().inputNode(), 0, frequency);
    double magnitude = gain.magnitude() / input.magnitude();
    double phase = Math.IEEEremainder(gain.phase() - input.phase(), 2 * Math.PI);
    return Double.isFinite(magnitude)
        ? new ResponsePoint(frequency, magnitude, phase)
        : new ResponsePoint(frequency, 0, 0);
  }

  private OptionalDouble couplingCorner() {
    return PartRoles.coupling(model, main)
        .flatMap(
            c ->
                WithoutCapacitor.signal(model, c)
                    .map(open -> open.midbandOutputResistance(c.a(), c.b()))
                    .filter(seen -> seen < UNLOADED)
                    .map(seen -> OptionalDouble.of(1 / (2 * Math.PI * seen * c.capacitance()))))
        .orElse(OptionalDouble.empty());
  }

  private List<ResponsePoint> response() {
    List<ResponsePoint> points = new ArrayList<>();
    int count = (int) Math.round(Math.log10(HIGHEST / LOWEST) * PER_DECADE);
    for (int i = 0; i <= count; i++) {
      double frequency = LOWEST * Math.pow(10, (double) i / PER_DECADE);
      Complex gain = model.signal().transfer(model.source(), plus, minus, frequency);
      points.add(point(frequency, gain));
    }
    return points;
  }
}
