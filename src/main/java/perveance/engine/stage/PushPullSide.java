package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.DEVICE;

import perveance.engine.device.LawKind;

/**
 * One side of a push-pull stage.
 *
 * @param start number of its first valve, from 0
 * @param anode node
 * @param joint node before the stoppers
 * @param cathode node
 */
record PushPullSide(int start, int anode, int joint, int cathode) {
  /** Wires the grid leak and the valves. */
  void wire(StageWiring wiring, int tap, int screenRail, int foot) {
    StageValues values = wiring.values();
    String side = start == 0 ? "" : "2";
    if (GridInput.hasLeak(values)) {
      GridInput.leak(wiring, joint, foot, side, OutputFeed.usualLeak(values));
    }
    int sections = Sections.count(values);
    String key = start == 0 ? DEVICE.key() : ValvePair.secondKey(values);
    String connection = ValveWiring.connection(values, values.device());
    boolean own = connection.equals(ValveWiring.PENTODE);
    boolean screened = values.device().law().kind() == LawKind.PENTODE;
    for (int i = start; i < start + sections; i++) {
      String suffix = Sections.suffix(i);
      int grid = GridInput.stopper(wiring, joint, suffix);
      int screen = screened ? OutputFeed.screen(wiring, own ? screenRail : tap, suffix) : cathode;
      ValveWiring.Nodes nodes = new ValveWiring.Nodes(anode, grid, screen, cathode);
      String ref = PushPullOutput.ref(values, i);
      ValveWiring.add(wiring, ref, key, nodes, connection, cathode != 0);
    }
  }

  /** Names the points to measure. */
  void testPoints(StageWiring wiring) {
    StageValues values = wiring.values();
    String ref = PushPullOutput.ref(values, start);
    wiring.testPoint(anode, ref, "anode");
    if (values.has(StageKeys.SCREEN_RESISTOR.key())) {
      wiring.testPoint(wiring.node("screen" + Sections.suffix(start)), ref, "screen");
    } else if (start == 0 && ScreenDropper.stated(values)) {
      wiring.testPoint(wiring.node(ScreenDropper.FEED), ref, "screen");
    }
    if (cathode != 0 && (start == 0 || PairedCathodes.apart(values))) {
      wiring.testPoint(cathode, ref, "cathode");
    }
    wiring.testPoint(joint, ref, "grid");
  }
}
