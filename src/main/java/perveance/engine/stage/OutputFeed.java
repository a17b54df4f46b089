package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.ANODE_VOLTAGE;
import static perveance.engine.stage.StageKeys.CATHODE_RESISTOR;
import static perveance.engine.stage.StageKeys.CATHODE_VOLTAGE;
import static perveance.engine.stage.StageKeys.CONNECTION;
import static perveance.engine.stage.StageKeys.GRID_BIAS;
import static perveance.engine.stage.StageKeys.SCREEN_RESISTOR;
import static perveance.engine.stage.StageKeys.SCREEN_SUPPLY;
import static perveance.engine.stage.StageKeys.SCREEN_VOLTAGE;
import static perveance.engine.stage.StageKeys.SUPPLY;
import static perveance.engine.stage.StageKeys.TAP;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.device.LawKind;
import perveance.engine.device.Ratings;
import perveance.engine.stage.StageKind.Complaint;

/**
 * What feeds the anodes and screens of an output stage: supply nodes, or electrode voltages as a
 * data sheet states them.
 */
final class OutputFeed {
  /** Keys. */
  static final List<KeySpec> KEYS =
      List.of(
          SUPPLY, ANODE_VOLTAGE, CONNECTION, TAP, SCREEN_SUPPLY, SCREEN_VOLTAGE, SCREEN_RESISTOR);

  /** Grid leak of an output valve where none is stated, if its maker allows as much [ohm]. */
  private static final double USUAL_LEAK = 220e3;

  private OutputFeed() {}

  static List<Complaint> check(StageValues values) {
    List<Complaint> complaints = new ArrayList<>();
    if (values.has(SUPPLY.key()) == OutputIdle.stated(values)) {
      boolean both = values.has(SUPPLY.key());
      complaints.add(
          new Complaint(
              both ? ANODE_VOLTAGE.key() : SUPPLY.key(),
              both ? "an anode_voltage as well as a supply" : "nothing that feeds the anode",
              "either a supply or an anode_voltage"));
    }
    checkConnection(values, complaints);
    boolean biased =
        values.has(CATHODE_RESISTOR.key())
            || values.has(CATHODE_VOLTAGE.key())
            || values.has(GRID_BIAS.key());
    if (!biased) {
      complaints.add(
          new Complaint(
              GRID_BIAS.key(), "nothing that makes the bias", "a grid_bias or a cathode_resistor"));
    }
    return complaints;
  }

  private static void checkConnection(StageValues values, List<Complaint> complaints) {
    String stated = values.word(CONNECTION.key()).orElse("");
    boolean screened = values.device().law().kind() == LawKind.PENTODE;
    String connection = ValveWiring.connection(values, values.device());
    if (!screened && !stated.isEmpty() && !stated.equals(ValveWiring.TRIODE)) {
      complaints.add(
          new Complaint(CONNECTION.key(), "\"" + stated + "\" for a triode", "no such key"));
    }
    boolean tapped = connection.equals(ValveWiring.ULTRA_LINEAR);
    if (tapped != values.has(TAP.key())) {
      complaints.add(
          new Complaint(
              TAP.key(),
              tapped ? "no tap for the ultra-linear connection" : "a tap that nothing is joined to",
              tapped ? "a share such as \"43 %\"" : "connection = \"ultra-linear\" with it"));
    }
    for (KeySpec key : List.of(SCREEN_SUPPLY, SCREEN_VOLTAGE)) {
      if (values.has(key.key()) && !connection.equals(ValveWiring.PENTODE)) {
        complaints.add(
            new Complaint(key.key(), "a feed for a screen joined elsewhere", "no such key here"));
      }
    }
    if (values.has(SCREEN_SUPPLY.key()) && values.has(SCREEN_VOLTAGE.key())) {
      complaints.add(
          new Complaint(
              SCREEN_VOLTAGE.key(), "a voltage as well as a screen_supply", "one of the two"));
    }
    if (values.has(SCREEN_RESISTOR.key()) && !screened) {
      complaints.add(
          new Complaint(
              SCREEN_RESISTOR.key(), "a screen for a valve that has none", "no such key"));
    }
  }

  /**
   * The node that feeds the anodes through the transformer.
   *
   * @param drop what the winding takes of it at rest [V]
   */
  static int anodeRail(StageWiring wiring, OutputIdle idle, double drop) {
    if (!OutputIdle.stated(wiring.values())) {
      return wiring.supply(SUPPLY);
    }
    int rail = wiring.node("anode_supply");
    double voltage = wiring.values().number(ANODE_VOLTAGE.key()) + idle.cathode() + drop;
    wiring.voltageSource(ANODE_VOLTAGE.key(), rail, 0, voltage);
    wiring.assume("The anode voltage holds from anode to cathode at rest; the supply gives it.");
    return rail;
  }

  /** Whether the screens hang on a source of their own and not on the anodes' rail. */
  static boolean ownScreenRail(StageValues values) {
    return values.has(SCREEN_SUPPLY.key())
        || values.has(SCREEN_VOLTAGE.key())
        || OutputIdle.stated(values);
  }

  /** The node that feeds the screens of pentodes. */
  static int screenRail(StageWiring wiring, OutputIdle idle, int anodeRail) {
    StageValues values = wiring.values();
    if (values.has(SCREEN_SUPPLY.key())) {
      return wiring.supply(SCREEN_SUPPLY);
    }
    if (!ownScreenRail(values)) {
      return anodeRail;
    }
    int rail = wiring.node("screen_supply");
    wiring.voltageSource(SCREEN_VOLTAGE.key(), rail, 0, screenSource(values, idle));
    if (!values.has(SCREEN_VOLTAGE.key())) {
      wiring.assume("The screen voltage is not stated; taken equal to the anode's.");
    }
    return rail;
  }

  /** With electrode voltages to cathode, else to chassis. */
  private static double screenSource(StageValues values, OutputIdle idle) {
    if (!OutputIdle.stated(values)) {
      return values.number(SCREEN_VOLTAGE.key());
    }
    double drop =
        values.number(SCREEN_RESISTOR.key(), 0) * idle.screenCurrent()
            + ScreenDropper.drop(values, idle.screenCurrent());
    return OutputIdle.screenVoltage(values, ValveWiring.PENTODE) + idle.cathode() + drop;
  }

  /** Wires the resistor at a screen, if there is one, and gives the screen's node. */
  static int screen(StageWiring wiring, int from, String suffix) {
    if (!wiring.values().has(SCREEN_RESISTOR.key())) {
      return from;
    }
    int screen = wiring.node("screen" + suffix);
    double resistance = wiring.values().number(SCREEN_RESISTOR.key());
    String local = SCREEN_RESISTOR.key() + suffix;
    wiring.resistor(local, SCREEN_RESISTOR, resistance, from, screen, "screen resistor");
    return screen;
  }

  /** Grid leak where none is stated: the usual one, or what the maker allows if that is less. */
  static double usualLeak(StageValues values) {
    boolean cathodeBiased = values.has(CATHODE_RESISTOR.key());
    return values
        .device()
        .defaultRatings()
        .map(r -> Math.min(USUAL_LEAK, limit(r, cathodeBiased)))
        .orElse(USUAL_LEAK);
  }

  private static double limit(Ratings ratings, boolean cathodeBiased) {
    double fixed = ratings.gridLeakFixed().orElse(USUAL_LEAK);
    return cathodeBiased ? ratings.gridLeakCathode().orElse(fixed) : fixed;
  }
}
