package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.circuit.Element;
import perveance.engine.circuit.Element.Resistor;
import perveance.engine.circuit.SmallSignal;
import perveance.engine.stage.StageCircuit.Output;
import perveance.engine.stage.StageCircuit.PartType;

/** What hangs on an output from outside, and the output's resistance without it. */
final class OutputLoad {
  private OutputLoad() {}

  /**
   * Resistors across an output that are no part of the stage: its named load and what stands for
   * the next stage, by their place in the circuit.
   */
  static List<Integer> loads(StageModel model, Output output) {
    List<Integer> found = new ArrayList<>();
    List<Element> elements = model.circuit().elements();
    for (int i = 0; i < elements.size(); i++) {
      if (elements.get(i) instanceof Resistor r
          && across(r, output.plus(), output.minus())
          && outside(model, output, r)) {
        found.add(i);
      }
    }
    return found;
  }

  /** Conductance of all loads of an output [S]. */
  static double conductance(StageModel model, Output output) {
    double sum = 0;
    for (int load : loads(model, output)) {
      sum += 1 / ((Resistor) model.circuit().elements().get(load)).resistance();
    }
    return sum;
  }

  private static boolean across(Resistor r, int plus, int minus) {
    return (r.a() == plus && r.b() == minus) || (r.b() == plus && r.a() == minus);
  }

  private static boolean outside(StageModel model, Output output, Resistor r) {
    boolean named = output.load().equals(Optional.of(r.name()));
    boolean own = r.name().startsWith(model.stage().ref() + ".");
    return named || (own && !PartRoles.isPart(model, r));
  }

  /**
   * Resistance that takes the output power of a stage with a transformer; empty for any other
   * stage, whose output is a voltage [ohm].
   */
  static OptionalDouble powerTaker(StageModel model, Output output) {
    boolean transformer =
        model.stage().parts().stream().anyMatch(p -> p.type() == PartType.TRANSFORMER);
    if (!transformer || output.load().isEmpty()) {
      return OptionalDouble.empty();
    }
    int load = model.circuit().element(output.load().get());
    return model.circuit().elements().get(load) instanceof Resistor r
        ? OptionalDouble.of(r.resistance())
        : OptionalDouble.empty();
  }

  /** Power of a sine of a given peak in what takes the output power; empty without one [W]. */
  static OptionalDouble cleanPower(StageModel model, double peak) {
    OptionalDouble taker = powerTaker(model, model.mainOutput());
    return taker.isPresent()
        ? OptionalDouble.of(0.5 * peak * peak / taker.getAsDouble())
        : OptionalDouble.empty();
  }

  /** Mid-band resistance of an output with its load lifted off [ohm]. */
  static double sourceResistance(StageModel model, SmallSignal signal, Output output) {
    double loaded = signal.midbandOutputResistance(output.plus(), output.minus());
    return 1 / (1 / loaded - conductance(model, output));
  }
}
