package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.CATHODE_RESISTOR;
import static perveance.engine.stage.StageKeys.DEVICE;
import static perveance.engine.stage.StageKeys.GRID_BIAS;
import static perveance.engine.stage.StageKeys.SUPPLY;
import static perveance.engine.stage.StageKeys.UPPER_RESISTOR;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.circuit.Circuit;
import perveance.engine.stage.Drawing.Side;
import perveance.engine.stage.Drawing.SymbolType;
import perveance.engine.stage.StageCircuit.LoadLineSpec;

/**
 * Totem pole (shunt-regulated push-pull): two valves in series, the upper one driven by the drop
 * across the resistor between them; output at the upper cathode.
 */
final class TotemPole implements StageKind {
  private static final int X = 20;
  private static final int UPPER = 10;
  private static final int LOWER = 28;

  private static final List<KeySpec> KEYS =
      KeyList.of(
          List.of(
              ValvePair.KEYS,
              List.of(UPPER_RESISTOR),
              CathodeBias.KEYS,
              List.of(GRID_BIAS),
              GridInput.KEYS,
              OutputCoupling.KEYS,
              CommonKeys.LIST));

  @Override
  public String name() {
    return "totem-pole";
  }

  @Override
  public String title() {
    return "totem pole";
  }

  @Override
  public List<KeySpec> keys() {
    return KEYS;
  }

  @Override
  public List<Complaint> check(StageValues values) {
    List<Complaint> complaints = new ArrayList<>(ValvePair.check(values));
    complaints.addAll(CathodeBias.checkBias(values));
    if (!values.has(UPPER_RESISTOR.key()) && !values.has(CATHODE_RESISTOR.key())) {
      complaints.add(
          new Complaint(
              UPPER_RESISTOR.key(), "nothing between the two valves", "an upper_resistor"));
    }
    return complaints;
  }

  @Override
  public StageCircuit build(StageValues values, Circuit.Builder circuit) {
    StageWiring wiring = new StageWiring(values, circuit);
    int middle = wiring.node("upper_cathode");
    int lowerAnode = wiring.node("lower_anode");
    double between = values.number(UPPER_RESISTOR.key(), values.number(CATHODE_RESISTOR.key(), 1));
    wiring.resistor(
        UPPER_RESISTOR.key(), UPPER_RESISTOR, between, middle, lowerAnode, "upper resistor");
    if (!values.has(UPPER_RESISTOR.key())) {
      wiring.assume("The upper resistor is not stated; taken equal to the cathode resistor.");
    }
    int joint = GridInput.wire(wiring, GridInput.biasFoot(wiring));
    int grid = GridInput.stopper(wiring, joint, "");
    int cathode = CathodeBias.wire(wiring, StackedPair.restingCurrent(values));
    String lower = ValvePair.first(values);
    String upper = ValvePair.second(values);
    ValvePair.Triode lowerNodes = new ValvePair.Triode(lowerAnode, grid, cathode);
    ValvePair.add(wiring, lower, DEVICE.key(), lowerNodes, CathodeBias.raised(values));
    ValvePair.Triode upperNodes = new ValvePair.Triode(wiring.supply(SUPPLY), lowerAnode, middle);
    ValvePair.add(wiring, upper, ValvePair.secondKey(values), upperNodes, true);
    OutputCoupling.wire(wiring, "output", middle);
    StackedPair.testPoints(wiring, middle, lowerAnode, cathode, joint);
    return wiring.finish(new LoadLineSpec(lower, false));
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
    sketch.wire(X, UPPER + 11, X, LOWER - 4);
    sketch.mark(X, UPPER + 13, "lower_anode", Side.RIGHT);
    sketch.wire(X - 4, UPPER, X - 8, UPPER, X - 8, UPPER + 13, X, UPPER + 13);
    ValvePair.sketch(sketch, values.device(), X, LOWER, false, ValvePair.first(values));
    GridInput.sketch(sketch, 8, LOWER);
    GridInput.sketchStopper(sketch, 8, X - 4, LOWER, "");
    CathodeBias.sketch(sketch, X, LOWER + 4);
    OutputCoupling.sketchFromCathode(sketch, X, UPPER + 6);
    return sketch.finish();
  }
}
