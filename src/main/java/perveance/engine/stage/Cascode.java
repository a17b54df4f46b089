package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.ANODE_LOAD;
import static perveance.engine.stage.StageKeys.DEVICE;
import static perveance.engine.stage.StageKeys.GRID_BIAS;
import static perveance.engine.stage.StageKeys.SUPPLY;
import static perveance.engine.stage.StageKeys.UPPER_GRID_BOTTOM;
import static perveance.engine.stage.StageKeys.UPPER_GRID_BYPASS;
import static perveance.engine.stage.StageKeys.UPPER_GRID_TOP;
import static perveance.engine.stage.StageKeys.UPPER_GRID_VOLTAGE;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.circuit.Circuit;
import perveance.engine.stage.Drawing.Side;
import perveance.engine.stage.Drawing.SymbolType;
import perveance.engine.stage.StageCircuit.LoadLineSpec;

/**
 * Cascode: a common cathode below, a grounded grid above. The upper grid stands at a stated voltage
 * or on a divider from the supply with a capacitor to chassis.
 */
final class Cascode implements StageKind {
  private static final int X = 20;
  private static final int UPPER = 16;
  private static final int LOWER = 28;
  private static final int DIVIDER = 4;

  private static final List<KeySpec> KEYS =
      KeyList.of(
          List.of(
              ValvePair.KEYS,
              List.of(ANODE_LOAD.asRequired(), UPPER_GRID_VOLTAGE),
              List.of(UPPER_GRID_TOP, UPPER_GRID_BOTTOM, UPPER_GRID_BYPASS),
              CathodeBias.KEYS,
              List.of(GRID_BIAS),
              GridInput.KEYS,
              OutputCoupling.KEYS,
              CommonKeys.LIST));

  @Override
  public String name() {
    return "cascode";
  }

  @Override
  public String title() {
    return "cascode";
  }

  @Override
  public List<KeySpec> keys() {
    return KEYS;
  }

  @Override
  public List<Complaint> check(StageValues values) {
    List<Complaint> complaints = new ArrayList<>(ValvePair.check(values));
    complaints.addAll(CathodeBias.checkBias(values));
    boolean top = values.has(UPPER_GRID_TOP.key());
    boolean bottom = values.has(UPPER_GRID_BOTTOM.key());
    boolean stated = values.has(UPPER_GRID_VOLTAGE.key());
    if (stated == (top || bottom)) {
      complaints.add(
          new Complaint(
              UPPER_GRID_VOLTAGE.key(),
              stated
                  ? "a stated voltage as well as a divider"
                  : "nothing that holds the upper grid",
              "an upper_grid_voltage, or upper_grid_top and upper_grid_bottom"));
    } else if (top != bottom) {
      String missing = top ? UPPER_GRID_BOTTOM.key() : UPPER_GRID_TOP.key();
      complaints.add(new Complaint(missing, "half a divider", "both of its resistors"));
    }
    if (values.has(UPPER_GRID_BYPASS.key()) && stated) {
      complaints.add(
          new Complaint(
              UPPER_GRID_BYPASS.key(), "a bypass for a stated voltage", "no bypass, or a divider"));
    }
    return complaints;
  }

  @Override
  public StageCircuit build(StageValues values, Circuit.Builder circuit) {
    StageWiring wiring = new StageWiring(values, circuit);
    int supply = wiring.supply(SUPPLY);
    int anode = wiring.node("anode");
    int middle = wiring.node("middle");
    wiring.resistor(ANODE_LOAD, supply, anode, "anode load");
    int upperGrid = upperGrid(wiring, supply);
    int joint = GridInput.wire(wiring, GridInput.biasFoot(wiring));
    int grid = GridInput.stopper(wiring, joint, "");
    int cathode = CathodeBias.wire(wiring, restingCurrent(values));
    String lower = ValvePair.first(values);
    String upper = ValvePair.second(values);
    boolean biased = CathodeBias.raised(values);
    ValvePair.Triode lowerNodes = new ValvePair.Triode(middle, grid, cathode);
    ValvePair.add(wiring, lower, DEVICE.key(), lowerNodes, biased);
    ValvePair.Triode upperNodes = new ValvePair.Triode(anode, upperGrid, middle);
    ValvePair.add(wiring, upper, ValvePair.secondKey(values), upperNodes, false);
    OutputCoupling.wire(wiring, "output", anode);
    wiring.testPoint(anode, upper, "anode");
    wiring.testPoint(upperGrid, upper, "grid");
    wiring.testPoint(middle, upper, "cathode");
    if (cathode != 0) {
      wiring.testPoint(cathode, lower, "cathode");
    }
    wiring.testPoint(joint, lower, "grid");
    return wiring.finish(new LoadLineSpec(upper, false));
  }

  private static int upperGrid(StageWiring wiring, int supply) {
    StageValues values = wiring.values();
    int grid = wiring.node("upper_grid");
    if (values.has(UPPER_GRID_VOLTAGE.key())) {
      wiring.voltageSource(
          UPPER_GRID_VOLTAGE.key(), grid, 0, values.number(UPPER_GRID_VOLTAGE.key()));
      return grid;
    }
    wiring.resistor(UPPER_GRID_TOP, supply, grid, "upper grid divider, top");
    wiring.resistor(UPPER_GRID_BOTTOM, grid, 0, "upper grid divider, bottom");
    if (values.has(UPPER_GRID_BYPASS.key())) {
      wiring.capacitor(UPPER_GRID_BYPASS, grid, 0, "upper grid bypass");
    } else {
      wiring.idealCapacitor(UPPER_GRID_BYPASS.key(), grid, 0);
      wiring.assume("The upper grid's bypass is not stated; it sets no corner here.");
    }
    return grid;
  }

  /** What the lower valve takes with its anode near the upper grid's voltage. */
  private static double restingCurrent(StageValues values) {
    double supply = values.around().supplyVoltage().orElse(StageWiring.USUAL_SUPPLY);
    double anode = values.number(UPPER_GRID_VOLTAGE.key(), 0.4 * supply);
    double cathode = values.number(StageKeys.CATHODE_VOLTAGE.key(), 0);
    double grid = values.number(GRID_BIAS.key(), 0) - cathode;
    double current =
        RestingCurrent.onLine(values.device().law(), anode - cathode, 0, grid, anode - cathode);
    return Math.max(StageWiring.LEAST_CURRENT, current);
  }

  @Override
  public Drawing draw(StageValues values) {
    Sketch sketch = new Sketch(values);
    AnodeLoad.sketch(sketch, X, ANODE_LOAD.key());
    sketch.wire(X, AnodeLoad.ANODE, X, UPPER - 4);
    ValvePair.sketch(sketch, values.secondDevice(), X, UPPER, false, ValvePair.second(values));
    sketchUpperGrid(sketch);
    sketch.wire(X, UPPER + 4, X, LOWER - 4);
    sketch.mark(X, UPPER + 6, "middle", Side.LEFT);
    ValvePair.sketch(sketch, values.device(), X, LOWER, false, ValvePair.first(values));
    GridInput.sketch(sketch, 8, LOWER);
    GridInput.sketchStopper(sketch, 8, X - 4, LOWER, "");
    CathodeBias.sketch(sketch, X, LOWER + 4);
    OutputCoupling.sketch(sketch, X, AnodeLoad.ANODE);
    return sketch.finish();
  }

  private static void sketchUpperGrid(Sketch sketch) {
    if (sketch.values().has(UPPER_GRID_VOLTAGE.key())) {
      sketch.wire(X - 4, UPPER, X - 12, UPPER, X - 12, UPPER - 3);
      KeySpec key = UPPER_GRID_VOLTAGE;
      sketch.source(SymbolType.SUPPLY, X - 12, UPPER - 3, key, Side.ABOVE, "grid");
      return;
    }
    sketch.wire(X - 4, UPPER, DIVIDER, UPPER);
    sketch.mark(X - 9, UPPER, "upper_grid", Side.ABOVE);
    sketch.wire(X, AnodeLoad.RAIL, DIVIDER, AnodeLoad.RAIL, DIVIDER, AnodeLoad.LOAD - 2);
    sketch.upright(SymbolType.RESISTOR, DIVIDER, AnodeLoad.LOAD, UPPER_GRID_TOP.key(), Side.RIGHT);
    sketch.wire(DIVIDER, AnodeLoad.LOAD + 2, DIVIDER, UPPER + 2);
    sketch.upright(SymbolType.RESISTOR, DIVIDER, UPPER + 4, UPPER_GRID_BOTTOM.key(), Side.RIGHT);
    sketch.ground(DIVIDER, UPPER + 6);
    SymbolType type = StageWiring.capacitorSymbol(sketch.values(), UPPER_GRID_BYPASS);
    sketch.wire(DIVIDER, UPPER, DIVIDER - 8, UPPER, DIVIDER - 8, UPPER + 2);
    sketch.upright(type, DIVIDER - 8, UPPER + 4, UPPER_GRID_BYPASS.key(), Side.LEFT);
    sketch.ground(DIVIDER - 8, UPPER + 6);
  }
}
