package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.ANODE_LOAD;
import static perveance.engine.stage.StageKeys.DEVICE;
import static perveance.engine.stage.StageKeys.GRID_BIAS;
import static perveance.engine.stage.StageKeys.LOWER_COUPLING;
import static perveance.engine.stage.StageKeys.LOWER_GRID_LEAK;
import static perveance.engine.stage.StageKeys.SUPPLY;
import static perveance.engine.stage.StageKeys.UPPER_RESISTOR;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.circuit.Circuit;
import perveance.engine.stage.Drawing.Side;
import perveance.engine.stage.Drawing.SymbolType;
import perveance.engine.stage.StageCircuit.LoadLineSpec;

/**
 * White follower: an upper valve follows, a lower one below its cathode is driven from a resistor
 * in the upper anode and takes the other half of the load current.
 */
final class WhiteFollower implements StageKind {
  private static final int X = 20;
  private static final int UPPER = 16;
  private static final int RIGHT = 34;

  /** Lower grid leak where none is stated [ohm]. */
  private static final double USUAL_LEAK = 1e6;

  private static final List<KeySpec> KEYS =
      KeyList.of(
          List.of(
              ValvePair.KEYS,
              List.of(ANODE_LOAD.asRequired(), UPPER_RESISTOR),
              List.of(LOWER_COUPLING, LOWER_GRID_LEAK),
              CathodeBias.KEYS,
              List.of(GRID_BIAS),
              GridInput.KEYS,
              OutputCoupling.KEYS,
              CommonKeys.LIST));

  @Override
  public String name() {
    return "white-follower";
  }

  @Override
  public String title() {
    return "White follower";
  }

  @Override
  public List<KeySpec> keys() {
    return KEYS;
  }

  @Override
  public List<Complaint> check(StageValues values) {
    List<Complaint> complaints = new ArrayList<>(ValvePair.check(values));
    complaints.addAll(CathodeBias.check(values));
    boolean upperHeld =
        values.has(GRID_BIAS.key()) || values.has(UPPER_RESISTOR.key()) || GridInput.direct(values);
    if (!upperHeld) {
      complaints.add(
          new Complaint(
              GRID_BIAS.key(),
              "nothing that biases the upper valve",
              "a grid_bias, an upper_resistor, or a stage wired to the grid"));
    }
    return complaints;
  }

  /** Whether the upper grid leak returns to the foot of a bias resistor. */
  private static boolean selfBiased(StageValues values) {
    return values.has(UPPER_RESISTOR.key()) && !values.has(GRID_BIAS.key());
  }

  @Override
  public StageCircuit build(StageValues values, Circuit.Builder circuit) {
    StageWiring wiring = new StageWiring(values, circuit);
    int anode = wiring.node("anode");
    wiring.resistor(ANODE_LOAD, wiring.supply(SUPPLY), anode, "upper anode resistor");
    int upperCathode = wiring.node("upper_cathode");
    int lowerAnode = upperCathode;
    if (values.has(UPPER_RESISTOR.key())) {
      lowerAnode = wiring.node("lower_anode");
      wiring.resistor(UPPER_RESISTOR, upperCathode, lowerAnode, "upper bias resistor");
    }
    int foot = selfBiased(values) ? lowerAnode : GridInput.biasFoot(wiring);
    int joint = GridInput.wire(wiring, foot);
    int grid = GridInput.stopper(wiring, joint, "");
    int cathode = CathodeBias.wire(wiring, StackedPair.restingCurrent(values));
    int lowerGrid = lowerGrid(wiring, anode);
    String upper = ValvePair.first(values);
    String lower = ValvePair.second(values);
    ValvePair.Triode upperNodes = new ValvePair.Triode(anode, grid, upperCathode);
    ValvePair.add(wiring, upper, DEVICE.key(), upperNodes, true);
    ValvePair.Triode lowerNodes = new ValvePair.Triode(lowerAnode, lowerGrid, cathode);
    String key = ValvePair.secondKey(values);
    ValvePair.add(wiring, lower, key, lowerNodes, CathodeBias.raised(values));
    OutputCoupling.wire(wiring, "output", upperCathode);
    wiring.testPoint(anode, upper, "anode");
    wiring.testPoint(upperCathode, upper, "cathode");
    if (cathode != 0) {
      wiring.testPoint(cathode, lower, "cathode");
    }
    wiring.testPoint(joint, upper, "grid");
    return wiring.finish(new LoadLineSpec(upper, false));
  }

  private static int lowerGrid(StageWiring wiring, int anode) {
    StageValues values = wiring.values();
    int grid = wiring.node("lower_grid");
    double leak = values.number(LOWER_GRID_LEAK.key(), USUAL_LEAK);
    wiring.resistor(LOWER_GRID_LEAK.key(), LOWER_GRID_LEAK, leak, grid, 0, "lower grid leak");
    if (!values.has(LOWER_GRID_LEAK.key())) {
      wiring.assume("The lower grid leak is not stated; taken as 1 Mohm.");
    }
    if (values.has(LOWER_COUPLING.key())) {
      wiring.capacitor(LOWER_COUPLING, anode, grid, "lower coupling");
    } else {
      wiring.idealCapacitor(LOWER_COUPLING.key(), anode, grid);
      wiring.assume("The capacitor to the lower grid is not stated; it sets no corner here.");
    }
    return grid;
  }

  @Override
  public Drawing draw(StageValues values) {
    Sketch sketch = new Sketch(values);
    AnodeLoad.sketch(sketch, X, ANODE_LOAD.key());
    sketch.wire(X, AnodeLoad.ANODE, X, UPPER - 4);
    ValvePair.sketch(sketch, values.device(), X, UPPER, false, ValvePair.first(values));
    GridInput.sketchStopper(sketch, 8, X - 4, UPPER, "");
    sketch.mark(X, UPPER + 6, "upper_cathode", Side.LEFT);
    int joint = UPPER + 6;
    if (values.has(UPPER_RESISTOR.key())) {
      sketch.wire(X, UPPER + 4, X, UPPER + 7);
      sketch.upright(SymbolType.RESISTOR, X, UPPER + 9, UPPER_RESISTOR.key(), Side.RIGHT);
      joint = UPPER + 13;
      sketch.wire(X, UPPER + 11, X, joint + 2);
    } else {
      sketch.wire(X, UPPER + 4, X, joint + 2);
    }
    if (selfBiased(values)) {
      GridInput.sketchTo(sketch, 8, UPPER, X, joint);
    } else {
      GridInput.sketch(sketch, 8, UPPER);
    }
    int lower = joint + 6;
    ValvePair.sketch(sketch, values.secondDevice(), X, lower, true, ValvePair.second(values));
    CathodeBias.sketch(sketch, X, lower + 4);
    sketchLowerGrid(sketch, lower);
    // the output begins beyond the wire that comes down to the lower grid
    sketch.wire(X, UPPER + 6, RIGHT + 4, UPPER + 6);
    OutputCoupling.sketch(sketch, RIGHT + 4, UPPER + 6);
    return sketch.finish();
  }

  private static void sketchLowerGrid(Sketch sketch, int lower) {
    sketch.wire(X, AnodeLoad.ANODE, RIGHT, AnodeLoad.ANODE);
    SymbolType type = StageWiring.capacitorSymbol(sketch.values(), LOWER_COUPLING);
    sketch.wire(RIGHT, AnodeLoad.ANODE, RIGHT, AnodeLoad.ANODE + 2);
    sketch.upright(type, RIGHT, AnodeLoad.ANODE + 4, LOWER_COUPLING.key(), Side.RIGHT);
    sketch.wire(RIGHT, AnodeLoad.ANODE + 6, RIGHT, lower, X + 4, lower);
    sketch.wire(RIGHT, lower, RIGHT, lower + 2);
    sketch.upright(SymbolType.RESISTOR, RIGHT, lower + 4, LOWER_GRID_LEAK.key(), Side.RIGHT);
    sketch.ground(RIGHT, lower + 6);
  }
}
