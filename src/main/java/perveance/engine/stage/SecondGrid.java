package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.FEEDBACK_SHUNT;
import static perveance.engine.stage.StageKeys.SECOND_GRID_BYPASS;
import static perveance.engine.stage.StageKeys.SECOND_GRID_LEAK;

import perveance.engine.stage.Drawing.Side;
import perveance.engine.stage.Drawing.SymbolType;

/** The grid of a long-tailed pair that is not driven: where it rests and what holds it still. */
final class SecondGrid {
  /** Leak of the second grid where none is stated [ohm]. */
  private static final double USUAL_LEAK = 1e6;

  /** Where leak and bypass stand, to the right of the second valve. */
  private static final int GRID = Tail.RIGHT + 4;

  private static final int LEAK = Tail.RIGHT + 6;

  private SecondGrid() {}

  /** The bypass stands beyond the text of the leak, or close by where there is none. */
  private static int bypassAt(StageValues values) {
    return GridInput.direct(values) ? Tail.RIGHT + 8 : Tail.RIGHT + 18;
  }

  /** Whether it stands straight at chassis or at a stated bias, without a leak. */
  static boolean tied(StageValues values) {
    return !GridInput.direct(values)
        && !Tail.selfBiased(values)
        && !values.has(SECOND_GRID_LEAK.key());
  }

  /** Wires it. */
  static int wire(StageWiring wiring, int firstGrid, int foot) {
    StageValues values = wiring.values();
    if (tied(values)) {
      return foot;
    }
    int grid = wiring.node("second_grid");
    int rest = GridInput.direct(values) ? firstGrid : foot;
    double leak = values.number(SECOND_GRID_LEAK.key(), USUAL_LEAK);
    wiring.resistor(SECOND_GRID_LEAK.key(), SECOND_GRID_LEAK, leak, grid, rest, "second grid leak");
    if (!values.has(SECOND_GRID_LEAK.key())) {
      wiring.assume("The second grid leak is not stated; taken as 1 Mohm.");
    }
    if (values.has(SECOND_GRID_BYPASS.key())) {
      int ground = Tail.signalGround(wiring);
      wiring.capacitor(SECOND_GRID_BYPASS, grid, ground, "second grid bypass");
    } else {
      wiring.idealCapacitor(SECOND_GRID_BYPASS.key(), grid, Tail.signalGround(wiring));
      wiring.assume("The second grid's bypass is not stated; it sets no corner here.");
    }
    return grid;
  }

  static void sketch(Sketch sketch) {
    StageValues values = sketch.values();
    int y = Tail.VALVES;
    if (tied(values)) {
      sketch.wire(GRID, y, LEAK, y, LEAK, y + 2);
      GridInput.foot(sketch, LEAK, y + 2, Side.RIGHT);
      return;
    }
    if (GridInput.direct(values)) {
      int above = y - 5;
      int joint = Tail.joint(values);
      sketch.wire(joint, y, joint, above, Tail.MIDDLE - 2, above);
      sketch.lying(SymbolType.RESISTOR, Tail.MIDDLE, above, SECOND_GRID_LEAK.key(), Side.ABOVE);
      sketch.wire(Tail.MIDDLE + 2, above, GRID + 4, above, GRID + 4, y);
    } else {
      sketch.wire(LEAK, y, LEAK, y + 3);
      sketch.upright(SymbolType.RESISTOR, LEAK, y + 5, SECOND_GRID_LEAK.key(), Side.RIGHT);
      if (Tail.selfBiased(values)) {
        sketch.wire(LEAK, y + 7, LEAK, Tail.FOOT, Tail.MIDDLE, Tail.FOOT);
      } else {
        GridInput.foot(sketch, LEAK, y + 7, Side.RIGHT);
      }
    }
    bypass(sketch, y);
  }

  private static void bypass(Sketch sketch, int y) {
    SymbolType type = StageWiring.capacitorSymbol(sketch.values(), SECOND_GRID_BYPASS);
    int end = y + 7;
    int at = bypassAt(sketch.values());
    sketch.wire(GRID, y, at, y, at, y + 3);
    sketch.upright(type, at, y + 5, SECOND_GRID_BYPASS.key(), Side.RIGHT);
    if (sketch.values().has(FEEDBACK_SHUNT.key())) {
      sketch.wire(at, end, at, Tail.SHUNT, Tail.MIDDLE, Tail.SHUNT);
    } else {
      sketch.ground(at, end);
    }
  }
}
