package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.COUPLING;
import static perveance.engine.stage.StageKeys.DRIVES;
import static perveance.engine.stage.StageKeys.LOAD;
import static perveance.engine.stage.StageKeys.LOAD2;
import static perveance.engine.stage.StageKeys.LOAD_CAPACITANCE;

import java.util.List;
import java.util.Optional;
import perveance.engine.stage.Drawing.Side;
import perveance.engine.stage.Drawing.SymbolType;
import perveance.engine.stage.Surroundings.NextInput;

/** What hangs on an output: a coupling capacitor, a load, the input network of the next stage. */
final class OutputCoupling {
  /** Keys. */
  static final List<KeySpec> KEYS = List.of(COUPLING, LOAD, LOAD_CAPACITANCE, DRIVES);

  /** Keys of a stage with two outputs. */
  static final List<KeySpec> KEYS_OF_TWO = List.of(COUPLING, LOAD, LOAD2, LOAD_CAPACITANCE, DRIVES);

  /** Keeps the free end of a coupling capacitor at chassis when nothing is stated there [ohm]. */
  private static final double OPEN = 1e12;

  private OutputCoupling() {}

  /** Whether anything stands behind a capacitor at the output. */
  static boolean coupled(StageValues values, KeySpec load) {
    return values.has(COUPLING.key())
        || loaded(values, load)
        || values.has(LOAD_CAPACITANCE.key())
        || values.around().next().isPresent();
  }

  /** Whether an output has a load of its own; what is stated for the first holds for both. */
  static boolean loaded(StageValues values, KeySpec load) {
    return values.has(load.key()) || values.has(LOAD.key());
  }

  /** Wires the main output from the node that makes it. */
  static void wire(StageWiring wiring, String name, int from) {
    wire(wiring, name, from, LOAD, "");
  }

  /**
   * Wires an output.
   *
   * @param load key of its load
   * @param suffix behind the names of its parts, empty for the main output
   */
  static void wire(StageWiring wiring, String name, int from, KeySpec load, String suffix) {
    StageValues values = wiring.values();
    if (!coupled(values, load)) {
      wiring.output(name, from, 0, Optional.empty());
      return;
    }
    wireAlways(wiring, name, from, load, suffix);
  }

  /** Wires an output behind its capacitor, even when nothing hangs on it; gives its node. */
  static int wireAlways(StageWiring wiring, String name, int from, KeySpec load, String suffix) {
    StageValues values = wiring.values();
    int out = wiring.node("output" + suffix);
    capacitor(wiring, from, out, suffix);
    Optional<String> taker = Optional.empty();
    if (loaded(values, load)) {
      String local = LOAD.key() + suffix;
      double resistance = values.number(load.key(), values.number(LOAD.key(), OPEN));
      wiring.resistor(local, load, resistance, out, 0, "load");
      taker = Optional.of(wiring.name(local));
    }
    if (values.has(LOAD_CAPACITANCE.key())) {
      double capacitance = values.number(LOAD_CAPACITANCE.key());
      wiring.stray(LOAD_CAPACITANCE.key() + suffix, out, 0, capacitance);
    }
    values.around().next().ifPresent(next -> next(wiring, next, out, suffix));
    if (taker.isEmpty() && values.around().next().isEmpty()) {
      wiring.outerResistor("open" + suffix, out, 0, OPEN);
    }
    boolean straight = suffix.isEmpty() && values.around().directOutput().isPresent();
    wiring.output(name, straight ? from : out, 0, taker);
    return out;
  }

  private static void capacitor(StageWiring wiring, int from, int out, String suffix) {
    String local = COUPLING.key() + suffix;
    if (wiring.values().has(COUPLING.key())) {
      double capacitance = wiring.values().number(COUPLING.key());
      wiring.capacitor(local, COUPLING, capacitance, from, out, "coupling");
    } else {
      wiring.idealCapacitor(local, from, out);
      wiring.assume("No coupling capacitor is stated; the load hangs on one that sets no corner.");
    }
  }

  private static void next(StageWiring wiring, NextInput next, int out, String suffix) {
    wiring.outerResistor("next_leak" + suffix, out, 0, next.leak());
    if (next.capacitance() <= 0) {
      return;
    }
    int grid = out;
    if (next.stopper() > 0) {
      grid = wiring.node("next_grid" + suffix);
      wiring.outerResistor("next_stopper" + suffix, out, grid, next.stopper());
    }
    wiring.stray("next_capacitance" + suffix, grid, 0, next.capacitance());
  }

  /** Draws the main output to the right of a point on the anode's line. */
  static void sketch(Sketch sketch, int x, int y) {
    sketch(sketch, x, y, LOAD, "");
  }

  /** Draws an output to the right of a point; needs ten units below it and three above. */
  static void sketch(Sketch sketch, int x, int y, KeySpec load, String suffix) {
    sketch(sketch, x, y, 1, load, suffix);
  }

  /** Draws an output from a cathode, clear of the text beside the valve above. */
  static void sketchFromCathode(Sketch sketch, int x, int y) {
    int from = coupled(sketch.values(), LOAD) ? x + 10 : x;
    sketch.wire(x, y, from, y);
    sketch(sketch, from, y, LOAD, "");
  }

  /** Draws an output to the left of a point. */
  static void sketchLeft(Sketch sketch, int x, int y, KeySpec load, String suffix) {
    sketch(sketch, x, y, -1, load, suffix);
  }

  private static void sketch(Sketch sketch, int x, int y, int way, KeySpec load, String suffix) {
    StageValues values = sketch.values();
    int at = x + 8 * way;
    if (coupled(values, load)) {
      sketch.wire(x, y, x + 4 * way, y);
      sketch.lying(SymbolType.CAPACITOR, x + 6 * way, y, COUPLING.key() + suffix, Side.ABOVE);
      at = x + 12 * way;
      sketch.wire(x + 8 * way, y, at, y);
    } else {
      sketch.wire(x, y, at, y);
    }
    if (loaded(values, load)) {
      Side side = way > 0 ? Side.RIGHT : Side.LEFT;
      sketch.wire(at, y, at, y + 2);
      sketch.upright(SymbolType.RESISTOR, at, y + 4, LOAD.key() + suffix, side);
      sketch.ground(at, y + 6);
    }
    sketch.wire(at, y, at + 4 * way, y);
    String text = values.word(DRIVES.key()).map(ref -> "to " + ref).orElse("out");
    sketch.output(at + 4 * way, y, way < 0, text);
  }
}
