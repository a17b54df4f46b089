package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.CATHODE_VOLTAGE;
import static perveance.engine.stage.StageKeys.DEVICE;
import static perveance.engine.stage.StageKeys.GRID_BIAS;
import static perveance.engine.stage.StageKeys.SCREEN_BYPASS;
import static perveance.engine.stage.StageKeys.SCREEN_RESISTOR;
import static perveance.engine.stage.StageKeys.SECTIONS;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.circuit.Circuit;
import perveance.engine.stage.StageCircuit.LoadLineSpec;

/** Single-ended output stage with transformer: triode, pentode or ultra-linear. */
final class SingleEndedOutput implements StageKind {
  private static final List<KeySpec> KEYS =
      KeyList.of(
          List.of(
              List.of(DEVICE, SECTIONS),
              OutputFeed.KEYS,
              List.of(SCREEN_BYPASS),
              OutputTransformer.KEYS,
              CathodeBias.KEYS,
              List.of(GRID_BIAS),
              BiasControl.KEYS,
              GridInput.KEYS,
              CommonKeys.LIST));

  @Override
  public String name() {
    return "single-ended-output";
  }

  @Override
  public String title() {
    return "single-ended output";
  }

  @Override
  public List<KeySpec> keys() {
    return KEYS;
  }

  @Override
  public List<Complaint> check(StageValues values) {
    List<Complaint> complaints = new ArrayList<>(OutputFeed.check(values));
    complaints.addAll(CathodeBias.check(values));
    complaints.addAll(BiasControl.check(values));
    complaints.addAll(Sections.check(values));
    boolean dropped = values.has(SCREEN_RESISTOR.key());
    if (values.has(SCREEN_BYPASS.key()) && (!dropped || !ScreenFeed.fed(values))) {
      complaints.add(
          new Complaint(
              SCREEN_BYPASS.key(),
              "a bypass without a screen_resistor to a supply",
              "a screen_resistor with it"));
    }
    if (values.has(SCREEN_BYPASS.key()) && Sections.count(values) > 1) {
      complaints.add(
          new Complaint(
              SCREEN_BYPASS.key(), "a bypass for several screens", "no bypass, or one valve"));
    }
    return complaints;
  }

  @Override
  public StageCircuit build(StageValues values, Circuit.Builder circuit) {
    StageWiring wiring = new StageWiring(values, circuit);
    int sections = Sections.count(values);
    String connection = ValveWiring.connection(values, values.device());
    OutputIdle idle =
        OutputIdle.stated(values)
            ? OutputIdle.of(values, connection, sections)
            : new OutputIdle(0, 0, 0);
    double drop = OutputTransformer.drop(values, sections * idle.anodeCurrent(), 1);
    int rail = OutputFeed.anodeRail(wiring, idle, drop);
    int anode = wiring.node("anode");
    OutputTransformer transformer = new OutputTransformer(wiring, 1);
    int tap = transformer.primary(rail, anode, 1, "");
    int screens =
        connection.equals(ValveWiring.PENTODE) ? OutputFeed.screenRail(wiring, idle, rail) : tap;
    int foot = GridInput.biasFoot(wiring);
    int joint = GridInput.outputEntry(wiring, foot);
    if (GridInput.hasLeak(values)) {
      GridInput.leak(wiring, joint, foot, "", OutputFeed.usualLeak(values));
    }
    int cathode = CathodeBias.wire(wiring, current(values, idle, sections));
    for (int i = 0; i < sections; i++) {
      valve(wiring, i, anode, joint, screens, cathode, connection);
    }
    transformer.finish();
    testPoints(wiring, anode, cathode, joint);
    return wiring.finish(new LoadLineSpec(Sections.ref(values, 0), false));
  }

  private static void valve(
      StageWiring wiring,
      int index,
      int anode,
      int joint,
      int screens,
      int cathode,
      String connection) {
    StageValues values = wiring.values();
    String suffix = Sections.suffix(index);
    int grid = GridInput.stopper(wiring, joint, suffix);
    int screen = cathode;
    if (SingleEndedSketch.screened(values)) {
      screen = OutputFeed.screen(wiring, screens, suffix);
    }
    if (values.has(SCREEN_BYPASS.key())) {
      wiring.capacitor(SCREEN_BYPASS, screen, 0, "screen bypass");
    }
    ValveWiring.Nodes nodes = new ValveWiring.Nodes(anode, grid, screen, cathode);
    boolean biased = values.has(StageKeys.CATHODE_RESISTOR.key());
    ValveWiring.add(wiring, Sections.ref(values, index), DEVICE.key(), nodes, connection, biased);
  }

  /** Roughly what flows in the cathode, where a diode there has its stated voltage [A]. */
  private static double current(StageValues values, OutputIdle idle, int sections) {
    if (OutputIdle.stated(values)) {
      double all = sections * (idle.anodeCurrent() + idle.screenCurrent());
      return Math.max(StageWiring.LEAST_CURRENT, all);
    }
    double supply = values.around().supplyVoltage().orElse(StageWiring.USUAL_SUPPLY);
    double cathode = values.number(CATHODE_VOLTAGE.key(), 0);
    double grid = values.number(GRID_BIAS.key(), 0) - cathode;
    double each =
        RestingCurrent.onLine(values.device().law(), supply - cathode, 0, grid, supply - cathode);
    return Math.max(StageWiring.LEAST_CURRENT, sections * each);
  }

  private static void testPoints(StageWiring wiring, int anode, int cathode, int joint) {
    String first = Sections.ref(wiring.values(), 0);
    wiring.testPoint(anode, first, "anode");
    if (wiring.values().has(SCREEN_RESISTOR.key())) {
      wiring.testPoint(wiring.node("screen"), first, "screen");
    }
    if (cathode != 0) {
      wiring.testPoint(cathode, first, "cathode");
    }
    wiring.testPoint(joint, first, "grid");
  }

  @Override
  public Drawing draw(StageValues values) {
    Sketch sketch = new Sketch(values);
    SingleEndedSketch.draw(sketch);
    return sketch.finish();
  }
}
