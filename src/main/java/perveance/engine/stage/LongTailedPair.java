package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.ANODE_LOAD;
import static perveance.engine.stage.StageKeys.ANODE_LOAD2;
import static perveance.engine.stage.StageKeys.CATHODE_RESISTOR;
import static perveance.engine.stage.StageKeys.DEVICE;
import static perveance.engine.stage.StageKeys.GRID_BIAS;
import static perveance.engine.stage.StageKeys.LOAD;
import static perveance.engine.stage.StageKeys.LOAD2;
import static perveance.engine.stage.StageKeys.SECOND_GRID_BYPASS;
import static perveance.engine.stage.StageKeys.SECOND_GRID_LEAK;
import static perveance.engine.stage.StageKeys.SUPPLY;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.circuit.Circuit;
import perveance.engine.stage.Drawing.Side;
import perveance.engine.stage.StageCircuit.LoadLineSpec;

/**
 * Long-tailed pair: two valves share a tail, the first grid is driven, the second stands still for
 * signals. Where the grids rest decides the bias: at the joint of a bias resistor and the tail, at
 * a stated voltage, at chassis, or both at the anode of the stage before.
 */
final class LongTailedPair implements StageKind {
  private static final List<KeySpec> KEYS =
      KeyList.of(
          List.of(
              ValvePair.KEYS,
              List.of(ANODE_LOAD.asRequired(), ANODE_LOAD2),
              List.of(CATHODE_RESISTOR),
              Tail.KEYS,
              List.of(GRID_BIAS, SECOND_GRID_LEAK, SECOND_GRID_BYPASS),
              GridInput.KEYS,
              OutputCoupling.KEYS_OF_TWO,
              CommonKeys.LIST));

  @Override
  public String name() {
    return "long-tailed-pair";
  }

  @Override
  public String title() {
    return "long-tailed pair";
  }

  @Override
  public List<KeySpec> keys() {
    return KEYS;
  }

  @Override
  public List<Complaint> check(StageValues values) {
    List<Complaint> complaints = new ArrayList<>(ValvePair.check(values));
    complaints.addAll(Tail.check(values));
    boolean still = SecondGrid.tied(values) && values.has(SECOND_GRID_BYPASS.key());
    if (still) {
      complaints.add(
          new Complaint(
              SECOND_GRID_BYPASS.key(),
              "a bypass for a grid that stands at its bias",
              "a second_grid_leak for it, or no bypass"));
    }
    return complaints;
  }

  @Override
  public StageCircuit build(StageValues values, Circuit.Builder circuit) {
    StageWiring wiring = new StageWiring(values, circuit);
    int supply = wiring.supply(SUPPLY);
    int anode = wiring.node("anode");
    int anode2 = wiring.node("anode2");
    double load2 = values.number(ANODE_LOAD2.key(), values.number(ANODE_LOAD.key()));
    wiring.resistor(ANODE_LOAD, supply, anode, "anode load");
    wiring.resistor(ANODE_LOAD2.key(), ANODE_LOAD2, load2, supply, anode2, "anode load");
    int cathode = wiring.node("cathode");
    int foot = Tail.wire(wiring, cathode);
    int joint = GridInput.wire(wiring, foot);
    int grid = GridInput.stopper(wiring, joint, "");
    int second = SecondGrid.wire(wiring, joint, foot);
    String left = ValvePair.first(values);
    String right = ValvePair.second(values);
    ValvePair.Triode leftNodes = new ValvePair.Triode(anode, grid, cathode);
    ValvePair.add(wiring, left, DEVICE.key(), leftNodes, true);
    ValvePair.Triode rightNodes = new ValvePair.Triode(anode2, second, cathode);
    ValvePair.add(wiring, right, ValvePair.secondKey(values), rightNodes, true);
    OutputCoupling.wire(wiring, "anode", anode, LOAD, "");
    OutputCoupling.wire(wiring, "second anode", anode2, LOAD2, "2");
    wiring.testPoint(anode, left, "anode");
    wiring.testPoint(anode2, right, "anode");
    wiring.testPoint(cathode, left, "cathode");
    wiring.testPoint(joint, left, "grid");
    if (second != 0) {
      wiring.testPoint(second, right, "grid");
    }
    return wiring.finish(new LoadLineSpec(left, false));
  }

  @Override
  public Drawing draw(StageValues values) {
    Sketch sketch = new Sketch(values);
    int left = Tail.LEFT;
    int right = Tail.RIGHT;
    int y = Tail.VALVES;
    int joint = Tail.joint(values);
    sketch.supply((left + right) / 2, AnodeLoad.RAIL, SUPPLY, Side.ABOVE);
    sketch.wire(left, AnodeLoad.RAIL, right, AnodeLoad.RAIL);
    AnodeLoad.hanging(sketch, left, ANODE_LOAD.key(), "anode", Side.RIGHT);
    AnodeLoad.hanging(sketch, right, ANODE_LOAD2.key(), "anode2", Side.LEFT);
    sketch.wire(left, AnodeLoad.ANODE, left, y - 4);
    sketch.wire(right, AnodeLoad.ANODE, right, y - 4);
    ValvePair.sketch(sketch, values.device(), left, y, false, ValvePair.first(values));
    ValvePair.sketch(sketch, values.secondDevice(), right, y, true, ValvePair.second(values));
    Tail.sketch(sketch);
    if (Tail.selfBiased(values)) {
      GridInput.sketchTo(sketch, joint, y, Tail.MIDDLE, Tail.FOOT);
    } else {
      GridInput.sketch(sketch, joint, y);
    }
    GridInput.sketchStopper(sketch, joint, left - 4, y, "");
    SecondGrid.sketch(sketch);
    OutputCoupling.sketchLeft(sketch, left, AnodeLoad.ANODE, LOAD, "");
    OutputCoupling.sketch(sketch, right, AnodeLoad.ANODE, LOAD2, "2");
    return sketch.finish();
  }
}
