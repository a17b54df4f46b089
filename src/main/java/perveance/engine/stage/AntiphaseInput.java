package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.INPUT_COUPLING;
import static perveance.engine.stage.StageKeys.SOURCE;

import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import perveance.engine.circuit.Element;
import perveance.engine.circuit.Element.Winding;

/**
 * The input of a push-pull stage: one source drives both grids with opposite sign, each through the
 * source resistance. The splitting is that of an ideal transformer, so that the peak of the source
 * is the peak on each grid.
 */
final class AntiphaseInput {
  /** Keeps the splitting winding apart from the source for dc; makes no difference [ohm]. */
  private static final double TRACE = 1e-6;

  private AntiphaseInput() {}

  /**
   * The nodes before the stoppers.
   *
   * @param first node of the grid in phase
   * @param second node of the grid in opposite phase
   * @param foot node of the bias, where it is wired already
   */
  record Joints(int first, int second, OptionalInt foot) {}

  /** Wires it; the winding of a driver transformer returns to the bias, else to chassis. */
  static Joints wire(StageWiring wiring) {
    if (GridInput.direct(wiring.values())) {
      return direct(wiring);
    }
    boolean transformer = GridInput.byTransformer(wiring.values());
    int foot = transformer ? GridInput.biasFoot(wiring) : 0;
    int source = wiring.node("input");
    int phase = wiring.node("phase");
    int phase2 = wiring.node("phase2");
    wiring.voltageSource("input", source, 0, 0);
    List<Winding> windings =
        List.of(
            new Winding(source, 0, 1, TRACE, 0),
            new Winding(phase, foot, 1, 0, 0),
            new Winding(foot, phase2, 1, 0, 0));
    wiring.element(
        new Element.Transformer(wiring.name("splitter"), windings, Double.POSITIVE_INFINITY));
    if (transformer) {
      GridInput.assumeTransformer(wiring);
    }
    int entry = side(wiring, phase, "");
    side(wiring, phase2, "2");
    wiring.input(Optional.of(wiring.name("input")), entry);
    OptionalInt bias = transformer ? OptionalInt.of(foot) : OptionalInt.empty();
    return new Joints(wiring.node("grid_in"), wiring.node("grid_in2"), bias);
  }

  /** Both grids hang on the outputs of the splitter before. */
  private static Joints direct(StageWiring wiring) {
    Surroundings around = wiring.values().around();
    int first = wiring.outerNode(around.directInput().orElseThrow());
    int second = wiring.outerNode(around.directInput2().orElseThrow());
    wiring.input(Optional.empty(), first);
    return new Joints(first, second, OptionalInt.empty());
  }

  private static int side(StageWiring wiring, int phase, String suffix) {
    boolean transformer = GridInput.byTransformer(wiring.values());
    int entry = wiring.node((transformer ? "grid_in" : "entry") + suffix);
    double resistance = GridInput.sourceResistance(wiring);
    wiring.outerResistor(SOURCE.key() + suffix, phase, entry, resistance);
    if (!transformer) {
      int joint = wiring.node("grid_in" + suffix);
      GridInput.coupling(wiring, INPUT_COUPLING.key() + suffix, entry, joint);
    }
    return entry;
  }
}
