package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.GRID_BIAS;
import static perveance.engine.stage.StageKeys.GRID_LEAK;
import static perveance.engine.stage.StageKeys.GRID_STOPPER;
import static perveance.engine.stage.StageKeys.INPUT_COUPLING;
import static perveance.engine.stage.StageKeys.SOURCE;

import java.util.List;
import java.util.Optional;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.Unit;
import perveance.engine.stage.Drawing.Side;
import perveance.engine.stage.Drawing.SymbolType;

/**
 * What leads to a grid: a source behind its resistance and a capacitor, or the wire from the stage
 * before; then the leak to its foot and a stopper.
 */
final class GridInput {
  /** Keys, in the order of the signal. */
  static final List<KeySpec> KEYS = List.of(SOURCE, INPUT_COUPLING, GRID_LEAK, GRID_STOPPER);

  /** Grid leak where none is stated; usual practice for receiving valves [ohm]. */
  private static final double USUAL_LEAK = 1e6;

  /** Stands for a source without resistance, small against any other part [ohm]. */
  private static final double NO_SOURCE_RESISTANCE = 1;

  private GridInput() {}

  /** Whether the stage before is wired straight to the grid. */
  static boolean direct(StageValues values) {
    return values.around().directInput().isPresent();
  }

  /** Whether a leak belongs to the circuit: always, but where the stage before holds the grid. */
  static boolean hasLeak(StageValues values) {
    return values.has(GRID_LEAK.key()) || !direct(values);
  }

  /** The node that a grid leak returns to: a stated bias, or chassis. */
  static int biasFoot(StageWiring wiring) {
    if (!wiring.values().has(GRID_BIAS.key())) {
      return 0;
    }
    int foot = wiring.node("bias");
    wiring.voltageSource(GRID_BIAS.key(), foot, 0, wiring.values().number(GRID_BIAS.key()));
    return foot;
  }

  /** Wires the input up to the node before the stopper. */
  static int wire(StageWiring wiring, int foot) {
    int joint = entry(wiring, "grid_in");
    if (hasLeak(wiring.values())) {
      leak(wiring, joint, foot, "");
    }
    return joint;
  }

  /** Wires a grid leak. */
  static void leak(StageWiring wiring, int joint, int foot, String suffix) {
    leak(wiring, joint, foot, suffix, USUAL_LEAK);
  }

  /** Wires a grid leak that has the usual value where none is stated. */
  static void leak(StageWiring wiring, int joint, int foot, String suffix, double usual) {
    double leak = wiring.values().number(GRID_LEAK.key(), usual);
    if (!wiring.values().has(GRID_LEAK.key())) {
      String taken = QuantityFormat.PLAIN.part(usual, Unit.OHM);
      wiring.assume("The grid leak is not stated; taken as " + taken + ".");
    }
    wiring.resistor(GRID_LEAK.key() + suffix, GRID_LEAK, leak, joint, foot, "grid leak");
  }

  /**
   * Wires the source, or takes the wire from the stage before.
   *
   * @param local name of the node that the signal is for
   * @return that node
   */
  static int entry(StageWiring wiring, String local) {
    Optional<String> straight = wiring.values().around().directInput();
    if (straight.isPresent()) {
      int node = wiring.outerNode(straight.get());
      wiring.input(Optional.empty(), node);
      return node;
    }
    int source = wiring.node("input");
    int entry = wiring.node("entry");
    int joint = wiring.node(local);
    wiring.voltageSource("input", source, 0, 0);
    wiring.outerResistor(SOURCE.key(), source, entry, sourceResistance(wiring));
    coupling(wiring, INPUT_COUPLING.key(), entry, joint);
    wiring.input(Optional.of(wiring.name("input")), entry);
    return joint;
  }

  /**
   * Whether an output stage is driven by a transformer, as data sheets with grid current assume:
   * neither a capacitor nor a grid leak stands before the grid, and no stage drives it.
   */
  static boolean byTransformer(StageValues values) {
    return !direct(values)
        && values.around().drivenBy().isEmpty()
        && !values.has(INPUT_COUPLING.key())
        && !values.has(GRID_LEAK.key());
  }

  /** Notes that the grid finds its bias through the winding of a driver transformer. */
  static void assumeTransformer(StageWiring wiring) {
    wiring.assume(
        "Neither input_coupling nor grid_leak is stated; the grid is taken as driven by a"
            + " transformer, so that its current does not shift the bias.");
  }

  /** Wires the source of an output stage up to the node before the stopper. */
  static int outputEntry(StageWiring wiring, int foot) {
    if (!byTransformer(wiring.values())) {
      return entry(wiring, "grid_in");
    }
    int source = wiring.node("input");
    int joint = wiring.node("grid_in");
    wiring.voltageSource("input", source, foot, 0);
    wiring.outerResistor(SOURCE.key(), source, joint, sourceResistance(wiring));
    wiring.input(Optional.of(wiring.name("input")), joint);
    assumeTransformer(wiring);
    return joint;
  }

  static double sourceResistance(StageWiring wiring) {
    StageValues values = wiring.values();
    if (values.has(SOURCE.key())) {
      return values.number(SOURCE.key());
    }
    if (values.around().sourceResistance().isEmpty()) {
      wiring.assume("The source is not stated; taken as 1 ohm.");
    }
    return Math.max(
        NO_SOURCE_RESISTANCE, values.around().sourceResistance().orElse(NO_SOURCE_RESISTANCE));
  }

  static void coupling(StageWiring wiring, String local, int entry, int joint) {
    if (wiring.values().has(INPUT_COUPLING.key())) {
      double capacitance = wiring.values().number(INPUT_COUPLING.key());
      wiring.capacitor(local, INPUT_COUPLING, capacitance, entry, joint, "input coupling");
    } else {
      wiring.idealCapacitor(local, entry, joint);
      wiring.assume("The capacitor before the grid is not stated; it sets no corner here.");
    }
  }

  /** Wires a stopper, if there is one, and gives the grid's node. */
  static int stopper(StageWiring wiring, int joint, String suffix) {
    if (!wiring.values().has(GRID_STOPPER.key())) {
      return joint;
    }
    int grid = wiring.node("grid" + suffix);
    double resistance = wiring.values().number(GRID_STOPPER.key());
    String local = GRID_STOPPER.key() + suffix;
    wiring.resistor(local, GRID_STOPPER, resistance, joint, grid, "grid stopper");
    return grid;
  }

  /**
   * Draws the input, from the terminal on the left to a joint twelve units left of the valve, and
   * the leak below the joint.
   *
   * @param joint where the leak hangs
   * @param y height of the grid
   */
  static void sketch(Sketch sketch, int joint, int y) {
    terminal(sketch, joint, y);
    if (hasLeak(sketch.values())) {
      sketchLeak(sketch, joint, y, "");
      foot(sketch, joint, y + 6);
    }
  }

  /** Draws an input whose leak, if there is one, returns to the point given. */
  static void sketchTo(Sketch sketch, int joint, int y, int footX, int footY) {
    terminal(sketch, joint, y);
    if (hasLeak(sketch.values())) {
      sketchLeak(sketch, joint, y, "");
      sketch.wire(joint, y + 6, joint, footY, footX, footY);
    }
  }

  static void sketchLeak(Sketch sketch, int joint, int y, String suffix) {
    sketch.wire(joint, y, joint, y + 2);
    sketch.upright(SymbolType.RESISTOR, joint, y + 4, GRID_LEAK.key() + suffix, Side.LEFT);
  }

  static void terminal(Sketch sketch, int joint, int y) {
    StageValues values = sketch.values();
    if (direct(values)) {
      sketch.input(joint - 4, y, Optional.empty(), "from " + driver(values));
      sketch.wire(joint - 4, y, joint, y);
    } else if (values.has(INPUT_COUPLING.key())) {
      sketch.input(joint - 12, y, Optional.of(SOURCE), "in");
      sketch.wire(joint - 12, y, joint - 7, y);
      sketch.lying(SymbolType.CAPACITOR, joint - 5, y, INPUT_COUPLING.key(), Side.ABOVE);
      sketch.wire(joint - 3, y, joint, y);
    } else {
      sketch.input(joint - 4, y, Optional.of(SOURCE), "in");
      sketch.wire(joint - 4, y, joint, y);
    }
  }

  /** The stage whose output is wired to the grid. */
  private static String driver(StageValues values) {
    String node = values.around().directInput().orElse("");
    int end = node.indexOf('.');
    return end < 0 ? node : node.substring(0, end);
  }

  /** Draws the foot of the grid leak: a bias or chassis. */
  static void foot(Sketch sketch, int x, int y) {
    foot(sketch, x, y, Side.LEFT);
  }

  /** Draws the foot of a grid leak with its text on a side. */
  static void foot(Sketch sketch, int x, int y, Side side) {
    if (sketch.values().has(GRID_BIAS.key())) {
      sketch.source(SymbolType.BIAS, x, y, GRID_BIAS, side, "bias");
    } else {
      sketch.ground(x, y);
    }
  }

  /** Draws from the joint to a grid terminal, with the stopper if there is one. */
  static void sketchStopper(Sketch sketch, int joint, int grid, int y, String suffix) {
    if (sketch.values().has(GRID_STOPPER.key())) {
      int centre = grid - 4;
      sketch.wire(joint, y, centre - 2, y);
      sketch.lying(SymbolType.RESISTOR, centre, y, GRID_STOPPER.key() + suffix, Side.ABOVE);
      sketch.wire(centre + 2, y, grid, y);
    } else {
      sketch.wire(joint, y, grid, y);
    }
  }
}
