package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.CONNECTION;
import static perveance.engine.stage.StageKeys.SCREEN_BYPASS;
import static perveance.engine.stage.StageKeys.SCREEN_RESISTOR;
import static perveance.engine.stage.StageKeys.SCREEN_SUPPLY;
import static perveance.engine.stage.StageKeys.SCREEN_VOLTAGE;
import static perveance.engine.stage.StageKeys.SUPPLY;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.device.LawKind;
import perveance.engine.stage.Drawing.Side;
import perveance.engine.stage.Drawing.SymbolType;
import perveance.engine.stage.StageKind.Complaint;

/**
 * What feeds the screen of a small pentode: a dropper with its bypass, a stated voltage, a node.
 */
final class ScreenFeed {
  /** Keys. */
  static final List<KeySpec> KEYS =
      List.of(CONNECTION, SCREEN_RESISTOR, SCREEN_BYPASS, SCREEN_VOLTAGE, SCREEN_SUPPLY);

  /** How far to the right of its valve the feed of a screen stands. */
  private static final int FEED = 14;

  private ScreenFeed() {}

  /** Whether the screen is fed by itself. */
  static boolean fed(StageValues values) {
    return ValveWiring.connection(values, values.device()).equals(ValveWiring.PENTODE);
  }

  /** Whether the device has a screen that is tied to its anode. */
  static boolean tied(StageValues values) {
    return values.device().law().kind() == LawKind.PENTODE && !fed(values);
  }

  static List<Complaint> check(StageValues values) {
    List<Complaint> complaints = new ArrayList<>();
    boolean feed =
        values.has(SCREEN_RESISTOR.key())
            || values.has(SCREEN_VOLTAGE.key())
            || values.has(SCREEN_SUPPLY.key());
    if (values.device().law().kind() != LawKind.PENTODE) {
      noScreen(values, complaints);
      return complaints;
    }
    if (fed(values) && !feed) {
      complaints.add(
          new Complaint(
              SCREEN_RESISTOR.key(),
              "nothing that feeds the screen",
              "a screen_resistor, a screen_voltage, or connection = \"triode\""));
    }
    if (!fed(values)) {
      noFeed(values, complaints);
    }
    if (values.has(SCREEN_VOLTAGE.key())
        && (values.has(SCREEN_RESISTOR.key()) || values.has(SCREEN_SUPPLY.key()))) {
      complaints.add(
          new Complaint(
              SCREEN_VOLTAGE.key(),
              "a stated voltage as well as a feed from a supply",
              "one of the two for the screen"));
    }
    return complaints;
  }

  private static void noScreen(StageValues values, List<Complaint> complaints) {
    for (KeySpec key : KEYS) {
      boolean harmless =
          key.key().equals(CONNECTION.key()) && values.word(key.key()).orElse("").equals("triode");
      if (values.has(key.key()) && !harmless) {
        complaints.add(
            new Complaint(
                key.key(), "a screen for a valve that has none", "no such key with a triode"));
      }
    }
  }

  private static void noFeed(StageValues values, List<Complaint> complaints) {
    for (KeySpec key : List.of(SCREEN_RESISTOR, SCREEN_BYPASS, SCREEN_VOLTAGE, SCREEN_SUPPLY)) {
      if (values.has(key.key())) {
        complaints.add(
            new Complaint(
                key.key(),
                "a feed for a screen that is tied to the anode",
                "connection = \"pentode\""));
      }
    }
    if (values.word(CONNECTION.key()).orElse("").equals(ValveWiring.ULTRA_LINEAR)) {
      complaints.add(
          new Complaint(
              CONNECTION.key(), "ultra-linear", "\"triode\" or \"pentode\" without a transformer"));
    }
  }

  /** Wires the screen and gives its node; the cathode's where the device has none. */
  static int wire(StageWiring wiring, int anode, int cathode) {
    StageValues values = wiring.values();
    if (values.device().law().kind() != LawKind.PENTODE) {
      return cathode;
    }
    if (!fed(values)) {
      return anode;
    }
    KeySpec rail = values.has(SCREEN_SUPPLY.key()) ? SCREEN_SUPPLY : SUPPLY;
    int screen;
    if (values.has(SCREEN_RESISTOR.key())) {
      screen = wiring.node("screen");
      wiring.resistor(SCREEN_RESISTOR, wiring.supply(rail), screen, "screen resistor");
    } else if (values.has(SCREEN_VOLTAGE.key())) {
      screen = wiring.node("screen");
      wiring.voltageSource(SCREEN_VOLTAGE.key(), screen, 0, values.number(SCREEN_VOLTAGE.key()));
    } else {
      screen = wiring.supply(rail);
    }
    if (values.has(SCREEN_BYPASS.key())) {
      wiring.capacitor(SCREEN_BYPASS, screen, 0, "screen bypass");
    }
    return screen;
  }

  /** Draws from the screen of a further valve to that on its left, or to the first one's feed. */
  static void join(Sketch sketch, int first, int x, int y) {
    int left = x - Sections.step(sketch.values());
    int to = left == first ? first + FEED : left + 6;
    sketch.wire(x + 4, y, x + 6, y, x + 6, y - 6, to, y - 6);
  }

  /**
   * Draws the feed of a screen, fourteen units to the right of its valve, and its bypass as far to
   * the right of the last valve.
   *
   * @param rail height of the rail from which the anode load hangs
   */
  static void sketch(Sketch sketch, int valve, int last, int y, int rail) {
    StageValues values = sketch.values();
    int x = valve + FEED;
    sketch.wire(valve + 4, y, x, y);
    int top = y - 12;
    if (values.has(SCREEN_RESISTOR.key())) {
      sketch.wire(x, top + 2, x, y);
      sketch.upright(SymbolType.RESISTOR, x, top, SCREEN_RESISTOR.key(), Side.RIGHT);
      sketch.wire(x, top - 2, x, rail);
    } else {
      sketch.wire(x, y, x, rail);
    }
    if (values.has(SCREEN_VOLTAGE.key())) {
      sketch.source(SymbolType.SUPPLY, x, rail, SCREEN_VOLTAGE, Side.ABOVE, "screen");
    } else if (values.has(SCREEN_SUPPLY.key())) {
      sketch.supply(x, rail, SCREEN_SUPPLY, Side.ABOVE);
    } else {
      sketch.wire(valve, rail, x, rail);
    }
    if (values.has(SCREEN_RESISTOR.key()) || values.has(SCREEN_VOLTAGE.key())) {
      sketch.mark(x, y, "screen", Side.RIGHT);
    }
    if (values.has(SCREEN_BYPASS.key())) {
      SymbolType type = StageWiring.capacitorSymbol(values, SCREEN_BYPASS);
      int at = last + FEED;
      if (last > valve) {
        sketch.wire(last + 6, y, at, y);
      }
      sketch.wire(at, y, at, y + 2);
      sketch.upright(type, at, y + 4, SCREEN_BYPASS.key(), Side.RIGHT);
      sketch.ground(at, y + 6);
    }
  }
}
