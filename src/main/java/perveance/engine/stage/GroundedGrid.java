package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.ANODE_LOAD;
import static perveance.engine.stage.StageKeys.CATHODE_RESISTOR;
import static perveance.engine.stage.StageKeys.CONNECTION;
import static perveance.engine.stage.StageKeys.DEVICE;
import static perveance.engine.stage.StageKeys.GRID_BIAS;
import static perveance.engine.stage.StageKeys.INPUT_COUPLING;
import static perveance.engine.stage.StageKeys.SOURCE;
import static perveance.engine.stage.StageKeys.SUPPLY;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.circuit.Circuit;
import perveance.engine.stage.Drawing.Side;
import perveance.engine.stage.Drawing.SymbolType;
import perveance.engine.stage.StageCircuit.LoadLineSpec;

/**
 * Grounded grid: the signal comes to the cathode, the grid stands still at chassis or at a stated
 * bias. The low input resistance loads whatever drives it.
 */
final class GroundedGrid implements StageKind {
  private static final List<KeySpec> KEYS =
      KeyList.of(
          List.of(
              List.of(DEVICE, CONNECTION, SUPPLY.asRequired(), ANODE_LOAD.asRequired()),
              List.of(CATHODE_RESISTOR, GRID_BIAS, SOURCE, INPUT_COUPLING),
              OutputCoupling.KEYS,
              CommonKeys.LIST));

  @Override
  public String name() {
    return "grounded-grid";
  }

  @Override
  public String title() {
    return "grounded grid";
  }

  @Override
  public List<KeySpec> keys() {
    return KEYS;
  }

  @Override
  public List<Complaint> check(StageValues values) {
    List<Complaint> complaints = new ArrayList<>(ValvePair.check(values));
    if (!values.has(CATHODE_RESISTOR.key()) && !GridInput.direct(values)) {
      complaints.add(
          new Complaint(
              CATHODE_RESISTOR.key(), "no way for the cathode current", "a cathode_resistor"));
    }
    return complaints;
  }

  @Override
  public StageCircuit build(StageValues values, Circuit.Builder circuit) {
    StageWiring wiring = new StageWiring(values, circuit);
    int anode = wiring.node("anode");
    wiring.resistor(ANODE_LOAD, wiring.supply(SUPPLY), anode, "anode load");
    int cathode = GridInput.entry(wiring, "cathode");
    if (values.has(CATHODE_RESISTOR.key())) {
      wiring.resistor(CATHODE_RESISTOR, cathode, 0, "cathode resistor");
    }
    int grid = GridInput.biasFoot(wiring);
    ValvePair.Triode nodes = new ValvePair.Triode(anode, grid, cathode);
    ValvePair.add(wiring, values.ref(), DEVICE.key(), nodes, true);
    OutputCoupling.wire(wiring, "output", anode);
    wiring.testPoint(anode, values.ref(), "anode");
    wiring.testPoint(cathode, values.ref(), "cathode");
    return wiring.finish(new LoadLineSpec(values.ref(), false));
  }

  @Override
  public Drawing draw(StageValues values) {
    Sketch sketch = new Sketch(values);
    int x = 20;
    int y = 16;
    AnodeLoad.sketch(sketch, x, ANODE_LOAD.key());
    sketch.wire(x, AnodeLoad.ANODE, x, y - 4);
    ValvePair.sketch(sketch, values.device(), x, y, false, values.ref());
    sketch.wire(x - 4, y, x - 8, y, x - 8, y + 1);
    GridInput.foot(sketch, x - 8, y + 1);
    sketch.wire(x, y + 4, x, y + 6);
    GridInput.terminal(sketch, x - 12, y + 6);
    sketch.wire(x - 12, y + 6, x, y + 6);
    if (!GridInput.direct(values)) {
      sketch.mark(x, y + 6, "cathode", Side.RIGHT);
    }
    if (values.has(CATHODE_RESISTOR.key())) {
      sketch.wire(x, y + 6, x, y + 8);
      sketch.upright(SymbolType.RESISTOR, x, y + 10, CATHODE_RESISTOR.key(), Side.RIGHT);
      sketch.ground(x, y + 12);
    }
    OutputCoupling.sketch(sketch, x, AnodeLoad.ANODE);
    return sketch.finish();
  }
}
