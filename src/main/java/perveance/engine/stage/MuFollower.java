package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.ANODE_LOAD;
import static perveance.engine.stage.StageKeys.DEVICE;
import static perveance.engine.stage.StageKeys.GRID_BIAS;
import static perveance.engine.stage.StageKeys.SUPPLY;
import static perveance.engine.stage.StageKeys.UPPER_COUPLING;
import static perveance.engine.stage.StageKeys.UPPER_GRID_LEAK;
import static perveance.engine.stage.StageKeys.UPPER_RESISTOR;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.circuit.Circuit;
import perveance.engine.stage.Drawing.Side;
import perveance.engine.stage.Drawing.SymbolType;
import perveance.engine.stage.StageCircuit.LoadLineSpec;

/**
 * Mu-follower: a common cathode whose load hangs on the cathode of an upper valve that follows the
 * lower anode through a capacitor, so that the load carries a constant current; output at the upper
 * cathode.
 */
final class MuFollower implements StageKind {
  private static final int X = 20;
  private static final int UPPER = 10;
  private static final int LOWER = 34;
  private static final int LEAK = 8;
  private static final int COUPLING = 2;

  /** Upper grid leak where none is stated [ohm]. */
  private static final double USUAL_LEAK = 1e6;

  private static final List<KeySpec> KEYS =
      KeyList.of(
          List.of(
              ValvePair.KEYS,
              List.of(ANODE_LOAD.asRequired(), UPPER_RESISTOR.asRequired()),
              List.of(UPPER_GRID_LEAK, UPPER_COUPLING),
              CathodeBias.KEYS,
              List.of(GRID_BIAS),
              GridInput.KEYS,
              OutputCoupling.KEYS,
              CommonKeys.LIST));

  @Override
  public String name() {
    return "mu-follower";
  }

  @Override
  public String title() {
    return "mu-follower";
  }

  @Override
  public List<KeySpec> keys() {
    return KEYS;
  }

  @Override
  public List<Complaint> check(StageValues values) {
    List<Complaint> complaints = new ArrayList<>(ValvePair.check(values));
    complaints.addAll(CathodeBias.checkBias(values));
    return complaints;
  }

  @Override
  public StageCircuit build(StageValues values, Circuit.Builder circuit) {
    StageWiring wiring = new StageWiring(values, circuit);
    int upperCathode = wiring.node("upper_cathode");
    int foot = wiring.node("upper_foot");
    int lowerAnode = wiring.node("lower_anode");
    int upperGrid = upperGrid(wiring, foot, lowerAnode);
    wiring.resistor(UPPER_RESISTOR, upperCathode, foot, "upper bias resistor");
    wiring.resistor(ANODE_LOAD, foot, lowerAnode, "anode load");
    int joint = GridInput.wire(wiring, GridInput.biasFoot(wiring));
    int grid = GridInput.stopper(wiring, joint, "");
    int cathode = CathodeBias.wire(wiring, StackedPair.restingCurrent(values));
    String lower = ValvePair.first(values);
    ValvePair.Triode lowerNodes = new ValvePair.Triode(lowerAnode, grid, cathode);
    ValvePair.add(wiring, lower, DEVICE.key(), lowerNodes, CathodeBias.raised(values));
    ValvePair.Triode upperNodes =
        new ValvePair.Triode(wiring.supply(SUPPLY), upperGrid, upperCathode);
    String upper = ValvePair.second(values);
    ValvePair.add(wiring, upper, ValvePair.secondKey(values), upperNodes, true);
    OutputCoupling.wire(wiring, "output", upperCathode);
    StackedPair.testPoints(wiring, upperCathode, lowerAnode, cathode, joint);
    return wiring.finish(new LoadLineSpec(lower, false));
  }

  private static int upperGrid(StageWiring wiring, int foot, int lowerAnode) {
    StageValues values = wiring.values();
    int grid = wiring.node("upper_grid");
    double leak = values.number(UPPER_GRID_LEAK.key(), USUAL_LEAK);
    wiring.resistor(UPPER_GRID_LEAK.key(), UPPER_GRID_LEAK, leak, grid, foot, "upper grid leak");
    if (!values.has(UPPER_GRID_LEAK.key())) {
      wiring.assume("The upper grid leak is not stated; taken as 1 Mohm.");
    }
    if (values.has(UPPER_COUPLING.key())) {
      wiring.capacitor(UPPER_COUPLING, lowerAnode, grid, "upper coupling");
    } else {
      wiring.idealCapacitor(UPPER_COUPLING.key(), lowerAnode, grid);
      wiring.assume("The capacitor to the upper grid is not stated; it sets no corner here.");
    }
    return grid;
  }

  @Override
  public Drawing draw(StageValues values) {
    Sketch sketch = new Sketch(values);
    sketch.supply(X, UPPER - 7, SUPPLY, Side.ABOVE);
    sketch.wire(X, UPPER - 7, X, UPPER - 4);
    ValvePair.sketch(sketch, values.secondDevice(), X, UPPER, false, ValvePair.second(values));
    sketch.wire(X, UPPER + 4, X, UPPER + 7);
    sketch.mark(X, UPPER + 6, "upper_cathode", Side.LEFT);
    sketch.upright(SymbolType.RESISTOR, X, UPPER + 9, UPPER_RESISTOR.key(), Side.RIGHT);
    sketch.wire(X, UPPER + 11, X, UPPER + 13);
    sketch.upright(SymbolType.RESISTOR, X, UPPER + 15, ANODE_LOAD.key(), Side.RIGHT);
    sketch.wire(X, UPPER + 17, X, LOWER - 4);
    sketch.mark(X, UPPER + 19, "lower_anode", Side.RIGHT);
    sketchUpperGrid(sketch);
    ValvePair.sketch(sketch, values.device(), X, LOWER, false, ValvePair.first(values));
    GridInput.sketch(sketch, LEAK, LOWER);
    GridInput.sketchStopper(sketch, LEAK, X - 4, LOWER, "");
    CathodeBias.sketch(sketch, X, LOWER + 4);
    OutputCoupling.sketchFromCathode(sketch, X, UPPER + 6);
    return sketch.finish();
  }

  private static void sketchUpperGrid(Sketch sketch) {
    sketch.wire(X - 4, UPPER, LEAK, UPPER, LEAK, UPPER + 1);
    sketch.upright(SymbolType.RESISTOR, LEAK, UPPER + 3, UPPER_GRID_LEAK.key(), Side.RIGHT);
    sketch.wire(LEAK, UPPER + 5, LEAK, UPPER + 12, X, UPPER + 12);
    sketch.wire(LEAK, UPPER, COUPLING, UPPER);
    SymbolType type = StageWiring.capacitorSymbol(sketch.values(), UPPER_COUPLING);
    sketch.wire(COUPLING, UPPER, COUPLING, UPPER + 13);
    sketch.upright(type, COUPLING, UPPER + 15, UPPER_COUPLING.key(), Side.LEFT);
    sketch.wire(COUPLING, UPPER + 17, COUPLING, UPPER + 19, X, UPPER + 19);
  }
}
