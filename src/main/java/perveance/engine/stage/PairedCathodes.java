package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.CATHODE_BYPASS;
import static perveance.engine.stage.StageKeys.CATHODE_RESISTOR;
import static perveance.engine.stage.StageKeys.SHARED;

/** The cathodes of two valves with a bias resistor each, or one for both. */
final class PairedCathodes {
  private PairedCathodes() {}

  /**
   * Nodes of the two cathodes.
   *
   * @param first node
   * @param second node, the same when they are joined
   */
  record Nodes(int first, int second) {}

  /** Whether both cathodes have their own way to chassis. */
  static boolean apart(StageValues values) {
    return CathodeBias.raised(values) && !values.flag(SHARED.key());
  }

  /** Wires resistors with their bypasses, named with 2 at the second valve. */
  static Nodes wire(StageWiring wiring) {
    int first = one(wiring, "");
    return new Nodes(first, apart(wiring.values()) ? one(wiring, "2") : first);
  }

  private static int one(StageWiring wiring, String suffix) {
    StageValues values = wiring.values();
    if (!values.has(CATHODE_RESISTOR.key())) {
      return 0;
    }
    int cathode = wiring.node("cathode" + suffix);
    double resistance = values.number(CATHODE_RESISTOR.key());
    String local = CATHODE_RESISTOR.key() + suffix;
    wiring.resistor(local, CATHODE_RESISTOR, resistance, cathode, 0, "cathode resistor");
    if (values.has(CATHODE_BYPASS.key())) {
      String bypass = CATHODE_BYPASS.key() + suffix;
      double capacitance = values.number(CATHODE_BYPASS.key());
      wiring.capacitor(bypass, CATHODE_BYPASS, capacitance, cathode, 0, "cathode bypass");
    }
    return cathode;
  }
}
