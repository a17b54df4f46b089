package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.ANODE_CHOKE;
import static perveance.engine.stage.StageKeys.CHOKE_RESISTANCE;
import static perveance.engine.stage.StageKeys.SUPPLY;

import java.util.List;
import perveance.engine.circuit.Circuit;
import perveance.engine.circuit.Element;
import perveance.engine.stage.Drawing.Side;
import perveance.engine.stage.Drawing.SymbolType;
import perveance.engine.stage.StageCircuit.PartType;

/** Common cathode with a choke to its anode: nearly the whole supply at rest, gain near mu. */
final class ChokeLoad implements StageKind {
  private static final List<KeySpec> KEYS =
      KeyList.of(
          List.of(
              GroundedCathode.FIRST_KEYS,
              List.of(ANODE_CHOKE.asRequired(), CHOKE_RESISTANCE),
              GroundedCathode.LAST_KEYS));

  @Override
  public String name() {
    return "choke-load";
  }

  @Override
  public String title() {
    return "choke load";
  }

  @Override
  public List<KeySpec> keys() {
    return KEYS;
  }

  @Override
  public List<Complaint> check(StageValues values) {
    return GroundedCathode.check(values);
  }

  @Override
  public StageCircuit build(StageValues values, Circuit.Builder circuit) {
    StageWiring wiring = new StageWiring(values, circuit);
    int anode = wiring.node("anode");
    double resistance = values.number(CHOKE_RESISTANCE.key(), 0);
    double inductance = values.number(ANODE_CHOKE.key());
    String name = wiring.name(ANODE_CHOKE.key());
    wiring.element(
        new Element.Inductor(name, wiring.supply(SUPPLY), anode, inductance, resistance));
    wiring.part(ANODE_CHOKE.key(), ANODE_CHOKE, PartType.INDUCTOR, inductance, "anode choke");
    if (!values.has(CHOKE_RESISTANCE.key())) {
      wiring.assume("The choke's winding resistance is not stated; taken as none.");
    }
    return GroundedCathode.wire(wiring, anode, resistance);
  }

  @Override
  public Drawing draw(StageValues values) {
    Sketch sketch = new Sketch(values);
    sketch.upright(
        SymbolType.INDUCTOR, GroundedCathode.X, AnodeLoad.LOAD, ANODE_CHOKE.key(), Side.RIGHT);
    GroundedCathode.sketch(sketch);
    return sketch.finish();
  }
}
