package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.ANODE_LOAD;
import static perveance.engine.stage.StageKeys.ANODE_LOAD2;
import static perveance.engine.stage.StageKeys.CATHODE_BYPASS;
import static perveance.engine.stage.StageKeys.COUPLING;
import static perveance.engine.stage.StageKeys.DIVIDER_BOTTOM;
import static perveance.engine.stage.StageKeys.DIVIDER_SECOND;
import static perveance.engine.stage.StageKeys.DIVIDER_TOP;
import static perveance.engine.stage.StageKeys.DRIVES;
import static perveance.engine.stage.StageKeys.LOAD;
import static perveance.engine.stage.StageKeys.LOAD2;
import static perveance.engine.stage.StageKeys.SUPPLY;

import perveance.engine.stage.Drawing.Side;
import perveance.engine.stage.Drawing.SymbolType;

/** The drawing of a paraphase pair: one valve above the other, the divider between the outputs. */
final class ParaphaseSketch {
  private static final int X = 20;
  private static final int FIRST = 16;
  private static final int DOWN = 32;
  private static final int SECOND = FIRST + DOWN;
  private static final int OUT = 36;
  private static final int TAP = 30;

  private ParaphaseSketch() {}

  static void draw(Sketch sketch) {
    StageValues values = sketch.values();
    AnodeLoad.sketch(sketch, X, ANODE_LOAD.key());
    sketch.wire(X, AnodeLoad.ANODE, X, FIRST - 4);
    ValvePair.sketch(sketch, values.device(), X, FIRST, false, ValvePair.first(values));
    GridInput.sketch(sketch, 8, FIRST);
    GridInput.sketchStopper(sketch, 8, X - 4, FIRST, "");
    int rail = AnodeLoad.RAIL + DOWN;
    sketch.supply(X, rail, SUPPLY, Side.ABOVE);
    sketch.wire(X, rail, X, rail + 1);
    sketch.upright(SymbolType.RESISTOR, X, AnodeLoad.LOAD + DOWN, ANODE_LOAD2.key(), Side.RIGHT);
    int anode = AnodeLoad.ANODE + DOWN;
    sketch.wire(X, AnodeLoad.LOAD + 2 + DOWN, X, SECOND - 4);
    sketch.mark(X, anode, "anode2", Side.LEFT);
    ValvePair.sketch(sketch, values.secondDevice(), X, SECOND, false, ValvePair.second(values));
    cathodes(sketch);
    output(sketch, AnodeLoad.ANODE, LOAD, "");
    output(sketch, anode, LOAD2, "2");
    divider(sketch, anode);
  }

  private static void cathodes(Sketch sketch) {
    if (PairedCathodes.apart(sketch.values())) {
      CathodeBias.sketch(sketch, X, FIRST + 4, "");
      CathodeBias.sketch(sketch, X, SECOND + 4, "2");
      return;
    }
    CathodeBias.sketch(sketch, X, SECOND + 4, "");
    boolean bypassed = sketch.values().has(CATHODE_BYPASS.key());
    int end = bypassed ? X + CathodeBias.BYPASS : X;
    int bus = X + 13;
    sketch.wire(X, FIRST + 4, X, FIRST + 6, bus, FIRST + 6, bus, SECOND + 6, end, SECOND + 6);
  }

  private static void output(Sketch sketch, int y, KeySpec load, String suffix) {
    sketch.wire(X, y, X + 4, y);
    sketch.lying(SymbolType.CAPACITOR, X + 6, y, COUPLING.key() + suffix, Side.ABOVE);
    sketch.wire(X + 8, y, OUT + 22, y);
    if (OutputCoupling.loaded(sketch.values(), load)) {
      int at = OUT + 18;
      sketch.wire(at, y, at, y + 2);
      sketch.upright(SymbolType.RESISTOR, at, y + 4, LOAD.key() + suffix, Side.RIGHT);
      sketch.ground(at, y + 6);
    }
    String text = sketch.values().word(DRIVES.key()).map(ref -> "to " + ref).orElse("out");
    sketch.output(OUT + 22, y, false, text);
  }

  private static void divider(Sketch sketch, int anode2) {
    sketch.wire(OUT, AnodeLoad.ANODE, OUT, AnodeLoad.ANODE + 2);
    sketch.upright(SymbolType.RESISTOR, OUT, AnodeLoad.ANODE + 4, DIVIDER_TOP.key(), Side.RIGHT);
    sketch.wire(OUT, AnodeLoad.ANODE + 6, OUT, TAP);
    sketch.wire(OUT, TAP, X - 14, TAP, X - 14, SECOND, X - 4, SECOND);
    sketch.wire(OUT, TAP, OUT + 12, TAP, OUT + 12, TAP + 1);
    sketch.upright(SymbolType.RESISTOR, OUT + 12, TAP + 3, DIVIDER_BOTTOM.key(), Side.RIGHT);
    sketch.ground(OUT + 12, TAP + 5);
    if (sketch.values().has(DIVIDER_SECOND.key())) {
      sketch.wire(OUT, TAP, OUT, anode2 - 6);
      sketch.upright(SymbolType.RESISTOR, OUT, anode2 - 4, DIVIDER_SECOND.key(), Side.RIGHT);
      sketch.wire(OUT, anode2 - 2, OUT, anode2);
    }
  }
}
