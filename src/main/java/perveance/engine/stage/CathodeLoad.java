package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.CATHODE_BYPASS;
import static perveance.engine.stage.StageKeys.CATHODE_CURRENT;
import static perveance.engine.stage.StageKeys.CATHODE_LOAD;
import static perveance.engine.stage.StageKeys.CATHODE_RESISTOR;
import static perveance.engine.stage.StageKeys.CURRENT_SOURCE_RESISTANCE;
import static perveance.engine.stage.StageKeys.GRID_BIAS;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.stage.Drawing.Side;
import perveance.engine.stage.Drawing.SymbolType;
import perveance.engine.stage.StageKind.Complaint;

/** What stands below the cathode of a follower or a concertina. */
final class CathodeLoad {
  /** Keys. */
  static final List<KeySpec> KEYS =
      List.of(
          CATHODE_RESISTOR,
          CATHODE_BYPASS,
          CATHODE_LOAD,
          CATHODE_CURRENT,
          CURRENT_SOURCE_RESISTANCE);

  /** Keys of a load that must be a resistor. */
  static final List<KeySpec> RESISTIVE_KEYS =
      List.of(CATHODE_RESISTOR, CATHODE_BYPASS, CATHODE_LOAD);

  private CathodeLoad() {}

  private static boolean loaded(StageValues values) {
    return values.has(CATHODE_LOAD.key()) || values.has(CATHODE_CURRENT.key());
  }

  /** Whether a bias resistor stands above the load. */
  static boolean divided(StageValues values) {
    return values.has(CATHODE_RESISTOR.key()) && loaded(values);
  }

  static boolean selfBiased(StageValues values) {
    return divided(values) && !values.has(GRID_BIAS.key()) && GridInput.hasLeak(values);
  }

  static List<Complaint> check(StageValues values) {
    List<Complaint> complaints = new ArrayList<>();
    if (values.has(CATHODE_LOAD.key()) && values.has(CATHODE_CURRENT.key())) {
      complaints.add(
          new Complaint(
              CATHODE_CURRENT.key(),
              "a current source as well as a cathode_load",
              "one of the two below the cathode"));
    }
    if (!loaded(values) && !values.has(CATHODE_RESISTOR.key())) {
      complaints.add(
          new Complaint(
              CATHODE_LOAD.key(),
              "nothing below the cathode",
              "a cathode_load, a cathode_current or a cathode_resistor"));
    }
    if (values.has(CATHODE_BYPASS.key()) && !divided(values)) {
      complaints.add(
          new Complaint(
              CATHODE_BYPASS.key(),
              "a bypass across what carries the signal",
              "a cathode_resistor above a cathode_load for it to bypass"));
    }
    return complaints;
  }

  /** Wires it and gives the node to which the grid leak returns. */
  static int wire(StageWiring wiring, int cathode) {
    StageValues values = wiring.values();
    boolean both = divided(values);
    int joint = both ? wiring.node("joint") : 0;
    if (values.has(CATHODE_RESISTOR.key())) {
      String role = both ? "bias resistor" : "cathode load";
      wiring.resistor(CATHODE_RESISTOR, cathode, joint, role);
    }
    if (values.has(CATHODE_BYPASS.key())) {
      wiring.capacitor(CATHODE_BYPASS, cathode, joint, "bias bypass");
    }
    int top = both ? joint : cathode;
    if (values.has(CATHODE_LOAD.key())) {
      wiring.resistor(CATHODE_LOAD, top, 0, "cathode load");
    } else if (values.has(CATHODE_CURRENT.key())) {
      wiring.currentSource(CATHODE_CURRENT, top, 0);
    }
    return selfBiased(values) ? joint : GridInput.biasFoot(wiring);
  }

  /** Draws it below a point; gives the height of the joint to which a leak may return. */
  static int sketch(Sketch sketch, int x, int y) {
    StageValues values = sketch.values();
    boolean both = divided(values);
    int top = y;
    if (both) {
      sketch.wire(x, y, x, y + 2);
      sketch.upright(SymbolType.RESISTOR, x, y + 4, CATHODE_RESISTOR.key(), Side.LEFT);
      sketch.wire(x, y + 6, x, y + 8);
      top = y + 8;
      bypass(sketch, x, y);
    }
    sketch.wire(x, top, x, top + 2);
    if (values.has(CATHODE_CURRENT.key())) {
      sketch.source(SymbolType.CURRENT_SOURCE, x, top + 4, CATHODE_CURRENT, Side.LEFT, "");
    } else {
      String local = loaded(values) ? CATHODE_LOAD.key() : CATHODE_RESISTOR.key();
      sketch.upright(SymbolType.RESISTOR, x, top + 4, local, Side.LEFT);
    }
    sketch.ground(x, top + 6);
    return y + 8;
  }

  private static void bypass(Sketch sketch, int x, int y) {
    if (!sketch.values().has(CATHODE_BYPASS.key())) {
      return;
    }
    SymbolType type = StageWiring.capacitorSymbol(sketch.values(), CATHODE_BYPASS);
    sketch.wire(x, y + 1, x + 6, y + 1, x + 6, y + 2);
    sketch.upright(type, x + 6, y + 4, CATHODE_BYPASS.key(), Side.RIGHT);
    sketch.wire(x + 6, y + 6, x + 6, y + 7, x, y + 7);
  }
}
