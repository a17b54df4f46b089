package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.ANODE_LOAD;
import static perveance.engine.stage.StageKeys.CONNECTION;
import static perveance.engine.stage.StageKeys.DEVICE;
import static perveance.engine.stage.StageKeys.GRID_BIAS;
import static perveance.engine.stage.StageKeys.SECTIONS;
import static perveance.engine.stage.StageKeys.SUPPLY;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.circuit.Circuit;
import perveance.engine.device.LawKind;
import perveance.engine.stage.Drawing.Side;
import perveance.engine.stage.Drawing.SymbolType;
import perveance.engine.stage.StageCircuit.LoadLineSpec;

/**
 * Cathode follower: grid driven, output at the cathode. With a bias resistor above the load the
 * grid leak returns to the joint of the two (self bias); else to chassis or a stated bias; or the
 * grid hangs on the anode before.
 */
final class CathodeFollower implements StageKind {
  private static final List<KeySpec> KEYS =
      KeyList.of(
          List.of(
              List.of(DEVICE, SECTIONS, CONNECTION, SUPPLY.asRequired(), ANODE_LOAD),
              CathodeLoad.KEYS,
              List.of(GRID_BIAS),
              GridInput.KEYS,
              OutputCoupling.KEYS,
              CommonKeys.LIST));

  @Override
  public String name() {
    return "cathode-follower";
  }

  @Override
  public String title() {
    return "cathode follower";
  }

  @Override
  public List<KeySpec> keys() {
    return KEYS;
  }

  @Override
  public List<Complaint> check(StageValues values) {
    List<Complaint> complaints = new ArrayList<>(ValvePair.check(values));
    complaints.addAll(CathodeLoad.check(values));
    complaints.addAll(Sections.check(values));
    return complaints;
  }

  @Override
  public StageCircuit build(StageValues values, Circuit.Builder circuit) {
    StageWiring wiring = new StageWiring(values, circuit);
    int supply = wiring.supply(SUPPLY);
    int anode = values.has(ANODE_LOAD.key()) ? wiring.node("anode") : supply;
    if (values.has(ANODE_LOAD.key())) {
      wiring.resistor(ANODE_LOAD, supply, anode, "anode resistor");
    }
    int cathode = wiring.node("cathode");
    int foot = CathodeLoad.wire(wiring, cathode);
    int joint = GridInput.wire(wiring, foot);
    for (int i = 0; i < Sections.count(values); i++) {
      int grid = GridInput.stopper(wiring, joint, Sections.suffix(i));
      ValvePair.Triode nodes = new ValvePair.Triode(anode, grid, cathode);
      ValvePair.add(wiring, Sections.ref(values, i), DEVICE.key(), nodes, true);
    }
    OutputCoupling.wire(wiring, "output", cathode);
    String first = Sections.ref(values, 0);
    wiring.testPoint(cathode, first, "cathode");
    wiring.testPoint(joint, first, "grid");
    if (anode != supply) {
      wiring.testPoint(anode, first, "anode");
    }
    return wiring.finish(new LoadLineSpec(first, false));
  }

  @Override
  public Drawing draw(StageValues values) {
    Sketch sketch = new Sketch(values);
    int x = 20;
    int y = 16;
    if (values.has(ANODE_LOAD.key())) {
      sketch.supply(x, y - 14, SUPPLY, Side.ABOVE);
      sketch.wire(x, y - 14, x, y - 13);
      sketch.upright(SymbolType.RESISTOR, x, y - 11, ANODE_LOAD.key(), Side.RIGHT);
      sketch.wire(x, y - 9, x, y - 6);
      sketch.mark(x, y - 7, "anode", Side.LEFT);
    } else {
      sketch.supply(x, y - 7, SUPPLY, Side.ABOVE);
      sketch.wire(x, y - 7, x, y - 6);
    }
    int last = valves(sketch, x, y);
    int joint = CathodeLoad.sketch(sketch, x, y + 6);
    sketch.wire(x, y + 4, x, y + 6);
    sketch.mark(x, y + 6, "cathode", Side.LEFT);
    if (CathodeLoad.divided(values)) {
      sketch.mark(x, joint, "joint", Side.RIGHT);
    }
    if (CathodeLoad.selfBiased(values)) {
      GridInput.sketchTo(sketch, 8, y, x, joint);
    } else {
      GridInput.sketch(sketch, 8, y);
    }
    OutputCoupling.sketchFromCathode(sketch, last, y + 6);
    return sketch.finish();
  }

  /** Draws the valves, anodes and cathodes joined; gives where the last one stands. */
  private static int valves(Sketch sketch, int x, int y) {
    int last = Sections.sketch(sketch, x, y, 8, y - 6);
    boolean tied = sketch.values().device().law().kind() == LawKind.PENTODE;
    for (int at = x; at <= last; at += Sections.step(sketch.values())) {
      if (tied) {
        sketch.wire(at + 4, y, at + 5, y, at + 5, y - 4, at, y - 4);
      }
      if (at > x) {
        sketch.wire(at, y + 4, at, y + 6);
      }
    }
    if (last > x) {
      sketch.wire(x, y - 6, last, y - 6);
      sketch.wire(x, y + 6, last, y + 6);
    }
    return last;
  }
}
