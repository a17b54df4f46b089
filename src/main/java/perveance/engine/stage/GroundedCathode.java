package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.GRID_BIAS;
import static perveance.engine.stage.StageKeys.SECTIONS;
import static perveance.engine.stage.StageKeys.SUPPLY;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.stage.Drawing.Side;
import perveance.engine.stage.StageCircuit.LoadLineSpec;
import perveance.engine.stage.StageKind.Complaint;

/**
 * Everything of a stage with its signal on the grid, its output at the anode and its cathode at
 * chassis for signals, apart from what feeds the anode.
 */
final class GroundedCathode {
  /** Keys before those of the load. */
  static final List<KeySpec> FIRST_KEYS = List.of(StageKeys.DEVICE, SECTIONS, SUPPLY.asRequired());

  /** Keys after those of the load. */
  static final List<KeySpec> LAST_KEYS =
      KeyList.of(
          List.of(
              CathodeBias.KEYS,
              List.of(GRID_BIAS),
              ScreenFeed.KEYS,
              GridInput.KEYS,
              OutputCoupling.KEYS,
              CommonKeys.LIST));

  /** Where the valve stands. */
  static final int X = 20;

  private static final int GRID = 16;
  private static final int JOINT = 8;

  private GroundedCathode() {}

  static List<Complaint> check(StageValues values) {
    List<Complaint> complaints = new ArrayList<>(CathodeBias.checkBias(values));
    complaints.addAll(ScreenFeed.check(values));
    complaints.addAll(Sections.check(values));
    return complaints;
  }

  /** Wires all but the load, whose dc resistance is given. */
  static StageCircuit wire(StageWiring wiring, int anode, double loadResistance) {
    StageValues values = wiring.values();
    int joint = GridInput.wire(wiring, GridInput.biasFoot(wiring));
    int cathode = CathodeBias.wire(wiring, restingCurrent(values, loadResistance));
    int screen = ScreenFeed.wire(wiring, anode, cathode);
    String connection = ValveWiring.connection(values, values.device());
    boolean biased = values.has(StageKeys.CATHODE_RESISTOR.key());
    int sections = Sections.count(values);
    for (int i = 0; i < sections; i++) {
      String ref = Sections.ref(values, i);
      int grid = GridInput.stopper(wiring, joint, Sections.suffix(i));
      ValveWiring.Nodes nodes = new ValveWiring.Nodes(anode, grid, screen, cathode);
      ValveWiring.add(wiring, ref, StageKeys.DEVICE.key(), nodes, connection, biased);
    }
    OutputCoupling.wire(wiring, "output", anode);
    String first = Sections.ref(values, 0);
    wiring.testPoint(anode, first, "anode");
    if (ScreenFeed.fed(values)) {
      wiring.testPoint(screen, first, "screen");
    }
    if (cathode != 0) {
      wiring.testPoint(cathode, first, "cathode");
    }
    wiring.testPoint(joint, first, "grid");
    return wiring.finish(new LoadLineSpec(first, false));
  }

  private static double restingCurrent(StageValues values, double loadResistance) {
    double supply = values.around().supplyVoltage().orElse(StageWiring.USUAL_SUPPLY);
    double cathode = values.number(StageKeys.CATHODE_VOLTAGE.key(), 0);
    double grid = values.number(GRID_BIAS.key(), 0) - cathode;
    double screen = values.number(StageKeys.SCREEN_VOLTAGE.key(), 0.5 * supply);
    int sections = Sections.count(values);
    double each =
        RestingCurrent.onLine(
            values.device().law(), supply - cathode, loadResistance * sections, grid, screen);
    return Math.max(StageWiring.LEAST_CURRENT, sections * each);
  }

  /** Draws all but the load itself. */
  static void sketch(Sketch sketch) {
    StageValues values = sketch.values();
    boolean fed = ScreenFeed.fed(values);
    sketch.supply(X, AnodeLoad.RAIL, SUPPLY, Side.ABOVE);
    sketch.wire(X, AnodeLoad.RAIL, X, AnodeLoad.LOAD - 2);
    sketch.wire(X, AnodeLoad.LOAD + 2, X, AnodeLoad.ANODE);
    sketch.mark(X, AnodeLoad.ANODE, "anode", Side.LEFT);
    GridInput.sketch(sketch, JOINT, GRID);
    int last = Sections.sketch(sketch, X, GRID, JOINT, AnodeLoad.ANODE);
    CathodeBias.sketch(sketch, X, GRID + 4);
    Sections.sketchCathodes(sketch, X, GRID + 4);
    for (int x = X; x <= last; x += Sections.step(values)) {
      screen(sketch, x, last);
    }
    int from = fed ? last + 16 : last;
    sketch.wire(X, AnodeLoad.ANODE, from, AnodeLoad.ANODE);
    OutputCoupling.sketch(sketch, from, AnodeLoad.ANODE);
  }

  /** Draws the screen's lead to the feed of the first valve's screen, or to the anode. */
  private static void screen(Sketch sketch, int x, int last) {
    if (ScreenFeed.tied(sketch.values())) {
      sketch.wire(x + 4, GRID, x + 5, GRID, x + 5, AnodeLoad.ANODE + 1, x, AnodeLoad.ANODE + 1);
    } else if (ScreenFeed.fed(sketch.values()) && x == X) {
      ScreenFeed.sketch(sketch, X, last, GRID, AnodeLoad.RAIL);
    } else if (ScreenFeed.fed(sketch.values())) {
      ScreenFeed.join(sketch, X, x, GRID);
    }
  }
}
