package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.GRID_BIAS;
import static perveance.engine.stage.StageKeys.GRID_LEAK;
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

  /** Height of the centre of what feeds the anode. */
  static final int LOAD = 5;

  private static final int RAIL = 2;
  private static final int ANODE = 9;
  private static final int GRID = 16;
  private static final int JOINT = 8;

  /** Taken where a stage stands without a supply, to choose a diode's working current [V]. */
  private static final double USUAL_SUPPLY = 250;

  private GroundedCathode() {}

  static List<Complaint> check(StageValues values) {
    List<Complaint> complaints = new ArrayList<>(CathodeBias.check(values));
    complaints.addAll(ScreenFeed.check(values));
    complaints.addAll(Sections.check(values));
    boolean biased = CathodeBias.raised(values) || values.has(GRID_BIAS.key());
    if (!biased && !values.has(GRID_LEAK.key()) && !GridInput.direct(values)) {
      complaints.add(
          new Complaint(
              GRID_LEAK.key(),
              "nothing that makes the bias",
              "a cathode_resistor, a cathode_voltage, a grid_bias, or a grid_leak for grid-leak"
                  + " bias"));
    }
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
    double supply = values.around().supplyVoltage().orElse(USUAL_SUPPLY);
    double cathode = values.number(StageKeys.CATHODE_VOLTAGE.key(), 0);
    double grid = values.number(GRID_BIAS.key(), 0) - cathode;
    double screen = values.number(StageKeys.SCREEN_VOLTAGE.key(), 0.5 * supply);
    int sections = Sections.count(values);
    double each =
        RestingCurrent.onLine(
            values.device().law(), supply - cathode, loadResistance * sections, grid, screen);
    return Math.max(1e-6, sections * each);
  }

  /** Draws all but the load itself. */
  static void sketch(Sketch sketch) {
    StageValues values = sketch.values();
    boolean fed = ScreenFeed.fed(values);
    sketch.supply(X, RAIL, SUPPLY, Side.ABOVE);
    sketch.wire(X, RAIL, X, LOAD - 2);
    sketch.wire(X, LOAD + 2, X, ANODE);
    sketch.mark(X, ANODE, "anode", Side.LEFT);
    GridInput.sketch(sketch, JOINT, GRID);
    int last = Sections.sketch(sketch, X, GRID, JOINT, ANODE);
    CathodeBias.sketch(sketch, X, GRID + 4);
    if (fed) {
      ScreenFeed.sketch(sketch, X, GRID, RAIL);
    }
    if (ScreenFeed.tied(values)) {
      sketch.wire(X + 4, GRID, X + 5, GRID, X + 5, ANODE + 1, X, ANODE + 1);
    }
    int from = fed ? X + 16 : last;
    sketch.wire(X, ANODE, from, ANODE);
    OutputCoupling.sketch(sketch, from, ANODE);
  }
}
