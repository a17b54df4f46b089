package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.CONNECTION;
import static perveance.engine.stage.StageKeys.DEVICE;
import static perveance.engine.stage.StageKeys.DEVICE2;
import static perveance.engine.stage.StageKeys.REF2;
import static perveance.engine.stage.StageKeys.SUPPLY;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.device.Device;
import perveance.engine.device.LawKind;
import perveance.engine.stage.Drawing.Side;
import perveance.engine.stage.StageKind.Complaint;

/** Two valves of a stage used as triodes: how they are called, wired and drawn. */
final class ValvePair {
  /** Keys of a stage with two valves, fed from one supply. */
  static final List<KeySpec> KEYS = List.of(DEVICE, DEVICE2, REF2, CONNECTION, SUPPLY.asRequired());

  private ValvePair() {}

  /** Reference of the first valve: the stage's own when the second has a name of its own. */
  static String first(StageValues values) {
    return values.has(REF2.key()) ? values.ref() : ChassisNames.section(values.ref(), 0);
  }

  /** Reference of the second valve. */
  static String second(StageValues values) {
    return values.word(REF2.key()).orElseGet(() -> ChassisNames.section(values.ref(), 1));
  }

  /** Key under which the second valve's device stands. */
  static String secondKey(StageValues values) {
    return values.has(DEVICE2.key()) ? DEVICE2.key() : DEVICE.key();
  }

  /** A pentode among the valves must be said to be used as a triode. */
  static List<Complaint> check(StageValues values) {
    List<Complaint> complaints = new ArrayList<>();
    boolean screens =
        values.device().law().kind() == LawKind.PENTODE
            || values.secondDevice().law().kind() == LawKind.PENTODE;
    String stated = values.word(CONNECTION.key()).orElse("");
    if (screens && !stated.equals(ValveWiring.TRIODE)) {
      String found = stated.isEmpty() ? "a pentode" : "\"" + stated + "\"";
      complaints.add(new Complaint(CONNECTION.key(), found, "\"triode\": this kind uses triodes"));
    }
    if (!screens && !stated.isEmpty() && !stated.equals(ValveWiring.TRIODE)) {
      complaints.add(
          new Complaint(CONNECTION.key(), "\"" + stated + "\" for a triode", "no such key"));
    }
    complaints.addAll(checkNames(values));
    return complaints;
  }

  /** The second valve's name must be one, and another than the first's. */
  static List<Complaint> checkNames(StageValues values) {
    String second = values.word(REF2.key()).orElse("");
    if (!values.has(REF2.key())
        || (ChassisNames.wellFormed(second) && !second.equals(values.ref()))) {
      return List.of();
    }
    String expected = "a name of its own: " + ChassisNames.FORM;
    return List.of(new Complaint(REF2.key(), "\"" + second + "\"", expected));
  }

  /** Adds a valve, its screen tied to its anode if it has one. */
  static void add(StageWiring wiring, String ref, String key, Triode nodes, boolean cathodeBiased) {
    Device device =
        key.equals(DEVICE.key()) ? wiring.values().device() : wiring.values().secondDevice();
    boolean screened = device.law().kind() == LawKind.PENTODE;
    int screen = screened ? nodes.anode() : nodes.cathode();
    ValveWiring.Nodes all =
        new ValveWiring.Nodes(nodes.anode(), nodes.grid(), screen, nodes.cathode());
    ValveWiring.add(wiring, ref, key, all, ValveWiring.TRIODE, cathodeBiased);
  }

  /**
   * Nodes of a triode.
   *
   * @param anode node
   * @param grid node
   * @param cathode node
   */
  record Triode(int anode, int grid, int cathode) {}

  /** Draws a valve; a tied screen goes round to the anode's terminal. */
  static void sketch(Sketch sketch, Device device, int x, int y, boolean mirrored, String ref) {
    sketch.valve(
        ValveWiring.symbol(device), x, y, mirrored, ref, mirrored ? Side.LEFT : Side.RIGHT);
    if (device.law().kind() == LawKind.PENTODE) {
      int side = mirrored ? -1 : 1;
      sketch.wire(x + 4 * side, y, x + 5 * side, y, x + 5 * side, y - 4, x, y - 4);
    }
  }
}
