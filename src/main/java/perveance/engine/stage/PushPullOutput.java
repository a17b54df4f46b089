package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.CATHODE_BYPASS;
import static perveance.engine.stage.StageKeys.CATHODE_RESISTOR;
import static perveance.engine.stage.StageKeys.DEVICE;
import static perveance.engine.stage.StageKeys.DEVICE2;
import static perveance.engine.stage.StageKeys.GRID_BIAS;
import static perveance.engine.stage.StageKeys.REF2;
import static perveance.engine.stage.StageKeys.SCREEN_BYPASS;
import static perveance.engine.stage.StageKeys.SCREEN_DROPPER;
import static perveance.engine.stage.StageKeys.SECTIONS;
import static perveance.engine.stage.StageKeys.SHARED;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.circuit.Circuit;
import perveance.engine.stage.StageCircuit.LoadLineSpec;

/**
 * Push-pull output stage with transformer: one or more valves a side, triode, pentode or
 * ultra-linear, fixed bias, a cathode resistor for each side or one for both.
 */
final class PushPullOutput implements StageKind {
  private static final List<KeySpec> KEYS =
      KeyList.of(
          List.of(
              List.of(DEVICE, DEVICE2, REF2, SECTIONS),
              OutputFeed.KEYS,
              List.of(SCREEN_DROPPER, SCREEN_BYPASS),
              OutputTransformer.KEYS,
              List.of(CATHODE_RESISTOR, CATHODE_BYPASS, SHARED, GRID_BIAS),
              BiasControl.KEYS,
              GridInput.KEYS,
              CommonKeys.LIST));

  @Override
  public String name() {
    return "push-pull-output";
  }

  @Override
  public String title() {
    return "push-pull output";
  }

  @Override
  public List<KeySpec> keys() {
    return KEYS;
  }

  @Override
  public List<Complaint> check(StageValues values) {
    List<Complaint> complaints = new ArrayList<>(OutputFeed.check(values));
    complaints.addAll(ScreenDropper.check(values));
    complaints.addAll(CathodeBias.check(values));
    complaints.addAll(BiasControl.check(values));
    complaints.addAll(ValvePair.checkNames(values));
    complaints.addAll(Sections.check(values));
    if (values.device().law().kind() != values.secondDevice().law().kind()) {
      complaints.add(
          new Complaint(
              DEVICE2.key(),
              "a valve of another sort than the first",
              "two triodes or two pentodes"));
    }
    if (values.has(SHARED.key()) && !values.has(CATHODE_RESISTOR.key())) {
      complaints.add(
          new Complaint(SHARED.key(), "shared without a cathode_resistor", "a cathode_resistor"));
    }
    if (values.has(REF2.key()) && Sections.count(values) > 1) {
      complaints.add(
          new Complaint(REF2.key(), "a name for one of several valves", "one valve a side"));
    }
    if (GridInput.direct(values) && values.around().directInput2().isEmpty()) {
      complaints.add(
          new Complaint(
              StageKeys.INPUT_COUPLING.key(),
              "a stage of one output wired straight to two grids",
              "a splitter, or a coupling in the stage that drives it"));
    }
    return complaints;
  }

  /** Reference of a valve: the sections of the first side, then those of the second. */
  static String ref(StageValues values, int index) {
    if (Sections.count(values) == 1) {
      return index == 0 ? ValvePair.first(values) : ValvePair.second(values);
    }
    return ChassisNames.section(values.ref(), index);
  }

  @Override
  public StageCircuit build(StageValues values, Circuit.Builder circuit) {
    StageWiring wiring = new StageWiring(values, circuit);
    int sections = Sections.count(values);
    String connection = ValveWiring.connection(values, values.device());
    int sharing = sections * (values.flag(SHARED.key()) ? 2 : 1);
    OutputIdle idle =
        OutputIdle.stated(values)
            ? OutputIdle.of(values, connection, sharing)
            : new OutputIdle(0, 0, 0);
    double drop = OutputTransformer.drop(values, sections * idle.anodeCurrent(), 2);
    int rail = OutputFeed.anodeRail(wiring, idle, drop);
    int screenRail = ScreenDropper.wire(wiring, idle, rail, connection);
    AntiphaseInput.Joints joints = AntiphaseInput.wire(wiring);
    PairedCathodes.Nodes cathodes = PairedCathodes.wire(wiring);
    OutputTransformer transformer = new OutputTransformer(wiring, 2);
    PushPullSide first =
        new PushPullSide(0, wiring.node("anode"), joints.first(), cathodes.first());
    PushPullSide second =
        new PushPullSide(sections, wiring.node("anode2"), joints.second(), cathodes.second());
    int foot = joints.foot().orElseGet(() -> GridInput.biasFoot(wiring));
    first.wire(wiring, transformer.primary(rail, first.anode(), 1, ""), screenRail, foot);
    second.wire(wiring, transformer.primary(rail, second.anode(), -1, "2"), screenRail, foot);
    transformer.finish();
    first.testPoints(wiring);
    second.testPoints(wiring);
    return wiring.finish(new LoadLineSpec(ref(values, 0), true));
  }

  @Override
  public Drawing draw(StageValues values) {
    Sketch sketch = new Sketch(values);
    PushPullSketch.draw(sketch);
    return sketch.finish();
  }
}
