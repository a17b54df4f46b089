package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.ANODE_LOAD;
import static perveance.engine.stage.StageKeys.ANODE_LOAD2;
import static perveance.engine.stage.StageKeys.CATHODE_BYPASS;
import static perveance.engine.stage.StageKeys.CATHODE_RESISTOR;
import static perveance.engine.stage.StageKeys.DEVICE;
import static perveance.engine.stage.StageKeys.DIVIDER_BOTTOM;
import static perveance.engine.stage.StageKeys.DIVIDER_SECOND;
import static perveance.engine.stage.StageKeys.DIVIDER_TOP;
import static perveance.engine.stage.StageKeys.GRID_BIAS;
import static perveance.engine.stage.StageKeys.SHARED;
import static perveance.engine.stage.StageKeys.SUPPLY;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.circuit.Circuit;
import perveance.engine.stage.StageCircuit.LoadLineSpec;

/**
 * Paraphase: the second valve inverts a share of the first one's output, taken from a divider
 * behind the coupling capacitor. With a resistor from the second output to the same point as well
 * it balances itself (floating paraphase).
 */
final class Paraphase implements StageKind {
  private static final List<KeySpec> KEYS =
      KeyList.of(
          List.of(
              ValvePair.KEYS,
              List.of(ANODE_LOAD.asRequired(), ANODE_LOAD2),
              List.of(DIVIDER_TOP.asRequired(), DIVIDER_BOTTOM.asRequired(), DIVIDER_SECOND),
              List.of(CATHODE_RESISTOR, CATHODE_BYPASS, SHARED, GRID_BIAS),
              GridInput.KEYS,
              OutputCoupling.KEYS_OF_TWO,
              CommonKeys.LIST));

  @Override
  public String name() {
    return "paraphase";
  }

  @Override
  public String title() {
    return "paraphase";
  }

  @Override
  public List<KeySpec> keys() {
    return KEYS;
  }

  @Override
  public List<Complaint> check(StageValues values) {
    List<Complaint> complaints = new ArrayList<>(ValvePair.check(values));
    complaints.addAll(CathodeBias.check(values));
    if (!values.has(CATHODE_RESISTOR.key())) {
      complaints.add(
          new Complaint(
              CATHODE_RESISTOR.key(),
              "nothing that biases the second valve",
              "a cathode_resistor for each valve, or one with shared = true"));
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
    int joint = GridInput.wire(wiring, GridInput.biasFoot(wiring));
    int grid = GridInput.stopper(wiring, joint, "");
    int tap = wiring.node("tap");
    PairedCathodes.Nodes cathodes = PairedCathodes.wire(wiring);
    String first = ValvePair.first(values);
    String second = ValvePair.second(values);
    ValvePair.Triode firstNodes = new ValvePair.Triode(anode, grid, cathodes.first());
    ValvePair.add(wiring, first, DEVICE.key(), firstNodes, true);
    ValvePair.Triode secondNodes = new ValvePair.Triode(anode2, tap, cathodes.second());
    ValvePair.add(wiring, second, ValvePair.secondKey(values), secondNodes, true);
    outputs(wiring, anode, anode2, tap);
    wiring.testPoint(anode, first, "anode");
    wiring.testPoint(anode2, second, "anode");
    wiring.testPoint(cathodes.first(), first, "cathode");
    if (cathodes.first() != cathodes.second()) {
      wiring.testPoint(cathodes.second(), second, "cathode");
    }
    wiring.testPoint(joint, first, "grid");
    return wiring.finish(new LoadLineSpec(first, false));
  }

  private static void outputs(StageWiring wiring, int anode, int anode2, int tap) {
    StageValues values = wiring.values();
    int out = OutputCoupling.wireAlways(wiring, "anode", anode, StageKeys.LOAD, "");
    int out2 = OutputCoupling.wireAlways(wiring, "second anode", anode2, StageKeys.LOAD2, "2");
    wiring.resistor(DIVIDER_TOP, out, tap, "divider, top");
    wiring.resistor(DIVIDER_BOTTOM, tap, 0, "divider, bottom");
    if (values.has(DIVIDER_SECOND.key())) {
      wiring.resistor(DIVIDER_SECOND, out2, tap, "divider, second");
    }
  }

  @Override
  public Drawing draw(StageValues values) {
    Sketch sketch = new Sketch(values);
    ParaphaseSketch.draw(sketch);
    return sketch.finish();
  }
}
