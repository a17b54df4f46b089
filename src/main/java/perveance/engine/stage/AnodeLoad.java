package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.SUPPLY;

import perveance.engine.stage.Drawing.Side;
import perveance.engine.stage.Drawing.SymbolType;

/** The upper part of most drawings: rail, anode load, anode. */
final class AnodeLoad {
  /** Height of the rail. */
  static final int RAIL = 1;

  /** Height of the centre of the load. */
  static final int LOAD = 4;

  /** Height of the anode's node. */
  static final int ANODE = 9;

  private AnodeLoad() {}

  /** Draws rail, load and the mark of the anode; the valve below joins at the anode's node. */
  static void sketch(Sketch sketch, int x, String local) {
    sketch.supply(x, RAIL, SUPPLY, Side.ABOVE);
    hanging(sketch, x, local, "anode", Side.LEFT);
  }

  /** Draws a load that hangs on a rail drawn elsewhere. */
  static void hanging(Sketch sketch, int x, String local, String node, Side mark) {
    sketch.wire(x, RAIL, x, LOAD - 2);
    sketch.upright(SymbolType.RESISTOR, x, LOAD, local, Side.RIGHT);
    sketch.wire(x, LOAD + 2, x, ANODE);
    sketch.mark(x, ANODE, node, mark);
  }
}
