package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.ANODE_LOAD;
import static perveance.engine.stage.StageKeys.CONNECTION;
import static perveance.engine.stage.StageKeys.DEVICE;
import static perveance.engine.stage.StageKeys.GRID_BIAS;
import static perveance.engine.stage.StageKeys.LOAD;
import static perveance.engine.stage.StageKeys.LOAD2;
import static perveance.engine.stage.StageKeys.SUPPLY;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.circuit.Circuit;
import perveance.engine.stage.Drawing.Side;
import perveance.engine.stage.StageCircuit.LoadLineSpec;

/**
 * Concertina phase splitter: equal loads in anode and cathode, an output from each. With a bias
 * resistor above the cathode load the lower output is taken below it, where the signal of the load
 * stands, and the grid leak returns there.
 */
final class Concertina implements StageKind {
  private static final int X = 20;
  private static final int Y = 16;

  private static final List<KeySpec> KEYS =
      KeyList.of(
          List.of(
              List.of(DEVICE, CONNECTION, SUPPLY.asRequired(), ANODE_LOAD.asRequired()),
              CathodeLoad.RESISTIVE_KEYS,
              List.of(GRID_BIAS),
              GridInput.KEYS,
              OutputCoupling.KEYS_OF_TWO,
              CommonKeys.LIST));

  @Override
  public String name() {
    return "concertina";
  }

  @Override
  public String title() {
    return "concertina";
  }

  @Override
  public List<KeySpec> keys() {
    return KEYS;
  }

  @Override
  public List<Complaint> check(StageValues values) {
    List<Complaint> complaints = new ArrayList<>(ValvePair.check(values));
    complaints.addAll(CathodeLoad.check(values));
    return complaints;
  }

  @Override
  public StageCircuit build(StageValues values, Circuit.Builder circuit) {
    StageWiring wiring = new StageWiring(values, circuit);
    int anode = wiring.node("anode");
    wiring.resistor(ANODE_LOAD, wiring.supply(SUPPLY), anode, "anode load");
    int cathode = wiring.node("cathode");
    int foot = CathodeLoad.wire(wiring, cathode);
    int joint = GridInput.wire(wiring, foot);
    int grid = GridInput.stopper(wiring, joint, "");
    ValvePair.Triode nodes = new ValvePair.Triode(anode, grid, cathode);
    ValvePair.add(wiring, values.ref(), DEVICE.key(), nodes, true);
    OutputCoupling.wire(wiring, "anode", anode, LOAD, "");
    int lower = CathodeLoad.divided(values) ? wiring.node("joint") : cathode;
    OutputCoupling.wire(wiring, "cathode", lower, LOAD2, "2");
    wiring.testPoint(anode, values.ref(), "anode");
    wiring.testPoint(cathode, values.ref(), "cathode");
    wiring.testPoint(joint, values.ref(), "grid");
    return wiring.finish(new LoadLineSpec(values.ref(), false));
  }

  @Override
  public Drawing draw(StageValues values) {
    Sketch sketch = new Sketch(values);
    AnodeLoad.sketch(sketch, X, ANODE_LOAD.key());
    sketch.wire(X, AnodeLoad.ANODE, X, Y - 4);
    ValvePair.sketch(sketch, values.device(), X, Y, false, values.ref());
    GridInput.sketchStopper(sketch, 8, X - 4, Y, "");
    sketch.wire(X, Y + 4, X, Y + 6);
    sketch.mark(X, Y + 6, "cathode", Side.LEFT);
    int joint = CathodeLoad.sketch(sketch, X, Y + 6);
    if (CathodeLoad.selfBiased(values)) {
      GridInput.sketchTo(sketch, 8, Y, X, joint);
    } else {
      GridInput.sketch(sketch, 8, Y);
    }
    OutputCoupling.sketch(sketch, X, AnodeLoad.ANODE);
    int lower = CathodeLoad.divided(values) ? joint : Y + 6;
    if (CathodeLoad.divided(values)) {
      sketch.mark(X + 4, joint, "joint", Side.BELOW);
    }
    // clear of a bypass across the bias resistor
    int from = CathodeLoad.divided(values) ? X + 14 : X + 10;
    sketch.wire(X, lower, from, lower);
    OutputCoupling.sketch(sketch, from, lower, LOAD2, "2");
    return sketch.finish();
  }
}
