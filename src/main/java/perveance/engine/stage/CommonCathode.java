package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.ANODE_CURRENT;
import static perveance.engine.stage.StageKeys.ANODE_LOAD;
import static perveance.engine.stage.StageKeys.CURRENT_SOURCE_RESISTANCE;
import static perveance.engine.stage.StageKeys.SUPPLY;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.circuit.Circuit;
import perveance.engine.stage.Drawing.Side;
import perveance.engine.stage.Drawing.SymbolType;

/**
 * Common cathode: a triode or small pentode with a resistor or a current source to its anode, bias
 * by whatever stands in the cathode or at the foot of the grid leak.
 */
final class CommonCathode implements StageKind {
  private static final List<KeySpec> KEYS =
      KeyList.of(
          List.of(
              GroundedCathode.FIRST_KEYS,
              List.of(ANODE_LOAD, ANODE_CURRENT, CURRENT_SOURCE_RESISTANCE),
              GroundedCathode.LAST_KEYS));

  @Override
  public String name() {
    return "common-cathode";
  }

  @Override
  public String title() {
    return "common cathode";
  }

  @Override
  public List<KeySpec> keys() {
    return KEYS;
  }

  @Override
  public List<Complaint> check(StageValues values) {
    List<Complaint> complaints = new ArrayList<>();
    boolean resistor = values.has(ANODE_LOAD.key());
    boolean source = values.has(ANODE_CURRENT.key());
    if (resistor == source) {
      complaints.add(
          new Complaint(
              ANODE_LOAD.key(),
              resistor
                  ? "an anode_load as well as an anode_current"
                  : "nothing that feeds the anode",
              "either an anode_load or an anode_current"));
    }
    complaints.addAll(GroundedCathode.check(values));
    return complaints;
  }

  @Override
  public StageCircuit build(StageValues values, Circuit.Builder circuit) {
    StageWiring wiring = new StageWiring(values, circuit);
    int anode = wiring.node("anode");
    int supply = wiring.supply(SUPPLY);
    if (values.has(ANODE_LOAD.key())) {
      wiring.resistor(ANODE_LOAD, supply, anode, "anode load");
      return GroundedCathode.wire(wiring, anode, values.number(ANODE_LOAD.key()));
    }
    wiring.currentSource(ANODE_CURRENT, supply, anode);
    double resistance =
        values.number(CURRENT_SOURCE_RESISTANCE.key(), StageWiring.USUAL_SOURCE_RESISTANCE);
    return GroundedCathode.wire(wiring, anode, resistance);
  }

  @Override
  public Drawing draw(StageValues values) {
    Sketch sketch = new Sketch(values);
    int x = GroundedCathode.X;
    boolean resistor = values.has(ANODE_LOAD.key());
    if (resistor) {
      sketch.upright(SymbolType.RESISTOR, x, AnodeLoad.LOAD, ANODE_LOAD.key(), Side.RIGHT);
    } else {
      int y = AnodeLoad.LOAD;
      sketch.source(SymbolType.CURRENT_SOURCE, x, y, ANODE_CURRENT, Side.RIGHT, "");
    }
    GroundedCathode.sketch(sketch);
    return sketch.finish();
  }
}
