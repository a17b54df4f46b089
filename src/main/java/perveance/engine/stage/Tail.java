package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.CATHODE_RESISTOR;
import static perveance.engine.stage.StageKeys.CURRENT_SOURCE_RESISTANCE;
import static perveance.engine.stage.StageKeys.FEEDBACK_SHUNT;
import static perveance.engine.stage.StageKeys.GRID_BIAS;
import static perveance.engine.stage.StageKeys.TAIL_CURRENT;
import static perveance.engine.stage.StageKeys.TAIL_RESISTOR;
import static perveance.engine.stage.StageKeys.TAIL_SUPPLY;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.stage.Drawing.Side;
import perveance.engine.stage.Drawing.SymbolType;
import perveance.engine.stage.StageKind.Complaint;

/**
 * What joins the cathodes of a long-tailed pair to chassis or to a negative supply: a bias resistor
 * if there is one, the tail, and a shunt at its foot where feedback enters.
 */
final class Tail {
  /** Keys. */
  static final List<KeySpec> KEYS =
      List.of(TAIL_RESISTOR, TAIL_CURRENT, CURRENT_SOURCE_RESISTANCE, TAIL_SUPPLY, FEEDBACK_SHUNT);

  /** Where the valves stand in the drawing, and the points between them. */
  static final int LEFT = 20;

  static final int RIGHT = 44;
  static final int MIDDLE = 32;
  static final int VALVES = 21;
  static final int CATHODES = VALVES + 6;
  static final int FOOT = CATHODES + 7;
  static final int END = FOOT + 5;
  static final int SHUNT = END + 2;

  private Tail() {}

  /** Where the leak hangs; further left where the second grid is fed from there. */
  static int joint(StageValues values) {
    return GridInput.direct(values) ? LEFT - 14 : LEFT - 11;
  }

  /** Whether the grids rest at the joint of a bias resistor and the tail. */
  static boolean selfBiased(StageValues values) {
    return values.has(CATHODE_RESISTOR.key())
        && !values.has(GRID_BIAS.key())
        && GridInput.hasLeak(values);
  }

  static List<Complaint> check(StageValues values) {
    List<Complaint> complaints = new ArrayList<>();
    boolean resistor = values.has(TAIL_RESISTOR.key());
    boolean source = values.has(TAIL_CURRENT.key());
    if (resistor == source) {
      complaints.add(
          new Complaint(
              TAIL_RESISTOR.key(),
              resistor ? "a tail_resistor as well as a tail_current" : "no tail",
              "either a tail_resistor or a tail_current"));
    }
    if (values.has(FEEDBACK_SHUNT.key()) && values.has(TAIL_SUPPLY.key())) {
      complaints.add(
          new Complaint(
              FEEDBACK_SHUNT.key(),
              "a feedback entry as well as a tail_supply",
              "a tail that ends at chassis"));
    }
    return complaints;
  }

  /** Wires it; gives the node to which the grid leaks return. */
  static int wire(StageWiring wiring, int cathode) {
    StageValues values = wiring.values();
    int top = cathode;
    if (values.has(CATHODE_RESISTOR.key())) {
      top = wiring.node("tail");
      wiring.resistor(CATHODE_RESISTOR, cathode, top, "bias resistor");
    }
    int end = end(wiring);
    if (values.has(TAIL_RESISTOR.key())) {
      wiring.resistor(TAIL_RESISTOR, top, end, "tail");
    } else {
      wiring.currentSource(TAIL_CURRENT, top, end);
    }
    return selfBiased(values) ? top : GridInput.biasFoot(wiring);
  }

  private static int end(StageWiring wiring) {
    if (wiring.values().has(FEEDBACK_SHUNT.key())) {
      int end = wiring.node("feedback");
      wiring.resistor(FEEDBACK_SHUNT, end, 0, "feedback shunt");
      return end;
    }
    return wiring.values().has(TAIL_SUPPLY.key()) ? wiring.supply(TAIL_SUPPLY) : 0;
  }

  /** The node where the second grid's capacitor returns: where feedback enters, or chassis. */
  static int signalGround(StageWiring wiring) {
    return wiring.values().has(FEEDBACK_SHUNT.key()) ? wiring.node("feedback") : 0;
  }

  static void sketch(Sketch sketch) {
    StageValues values = sketch.values();
    sketch.wire(LEFT, VALVES + 4, LEFT, CATHODES, RIGHT, CATHODES, RIGHT, VALVES + 4);
    sketch.mark(MIDDLE, CATHODES, "cathode", Side.ABOVE);
    if (values.has(CATHODE_RESISTOR.key())) {
      sketch.wire(MIDDLE, CATHODES, MIDDLE, CATHODES + 1);
      sketch.upright(SymbolType.RESISTOR, MIDDLE, CATHODES + 3, CATHODE_RESISTOR.key(), Side.RIGHT);
      sketch.wire(MIDDLE, CATHODES + 5, MIDDLE, FOOT + 1);
    } else {
      sketch.wire(MIDDLE, CATHODES, MIDDLE, FOOT + 1);
    }
    if (values.has(TAIL_RESISTOR.key())) {
      sketch.upright(SymbolType.RESISTOR, MIDDLE, FOOT + 3, TAIL_RESISTOR.key(), Side.RIGHT);
    } else {
      int y = FOOT + 3;
      sketch.source(SymbolType.CURRENT_SOURCE, MIDDLE, y, TAIL_CURRENT, Side.RIGHT, "");
    }
    if (values.has(FEEDBACK_SHUNT.key())) {
      sketch.wire(MIDDLE, END, MIDDLE, SHUNT + 1);
      sketch.upright(SymbolType.RESISTOR, MIDDLE, SHUNT + 3, FEEDBACK_SHUNT.key(), Side.RIGHT);
      sketch.ground(MIDDLE, SHUNT + 5);
      sketch.mark(MIDDLE, SHUNT, "feedback", Side.LEFT);
    } else if (values.has(TAIL_SUPPLY.key())) {
      sketch.negativeSupply(MIDDLE, END, TAIL_SUPPLY);
    } else {
      sketch.ground(MIDDLE, END);
    }
  }
}
