package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.SCREEN_BYPASS;
import static perveance.engine.stage.StageKeys.SCREEN_DROPPER;

import java.util.List;
import perveance.engine.stage.Drawing.Side;
import perveance.engine.stage.Drawing.SymbolType;
import perveance.engine.stage.StageKind.Complaint;

/** The one resistor, with its bypass, through which the screens of a push-pull stage are fed. */
final class ScreenDropper {
  /** Node behind the dropper. */
  static final String FEED = "screen_feed";

  private ScreenDropper() {}

  static boolean stated(StageValues values) {
    return values.has(SCREEN_DROPPER.key());
  }

  static List<Complaint> check(StageValues values) {
    if (values.has(SCREEN_BYPASS.key()) && !stated(values)) {
      return List.of(
          new Complaint(
              SCREEN_BYPASS.key(),
              "a bypass without a screen_dropper before it",
              "a screen_dropper with it"));
    }
    String connection = ValveWiring.connection(values, values.device());
    return stated(values) && !connection.equals(ValveWiring.PENTODE)
        ? List.of(
            new Complaint(
                SCREEN_DROPPER.key(), "a feed for a screen joined elsewhere", "no such key here"))
        : List.of();
  }

  /** Voltage that it takes when every valve is at rest [V]. */
  static double drop(StageValues values, double screenCurrent) {
    return values.number(SCREEN_DROPPER.key(), 0) * 2 * Sections.count(values) * screenCurrent;
  }

  /** Wires what feeds the screens; gives the node where their own leads start. */
  static int wire(StageWiring wiring, OutputIdle idle, int anodeRail, String connection) {
    if (!connection.equals(ValveWiring.PENTODE)) {
      return anodeRail;
    }
    int rail = OutputFeed.screenRail(wiring, idle, anodeRail);
    if (!stated(wiring.values())) {
      return rail;
    }
    int feed = wiring.node(FEED);
    wiring.resistor(SCREEN_DROPPER, rail, feed, "screen dropper");
    if (wiring.values().has(SCREEN_BYPASS.key())) {
      wiring.capacitor(SCREEN_BYPASS, feed, 0, "screen bypass");
    }
    return feed;
  }

  /**
   * Draws it lying between the screens and what feeds them.
   *
   * @param screens where a lead that joins the screens stands
   * @param supply where what feeds them is
   * @param y height of the resistor
   */
  static void sketch(Sketch sketch, int screens, int supply, int y) {
    int middle = (screens + supply) / 2;
    int way = supply > screens ? 1 : -1;
    sketch.wire(screens, y, middle - 2 * way, y);
    sketch.lying(SymbolType.RESISTOR, middle, y, SCREEN_DROPPER.key(), Side.BELOW);
    sketch.wire(middle + 2 * way, y, supply, y);
  }

  /** Draws the bypass from a lead of the screens to its right. */
  static void sketchBypass(Sketch sketch, int screens, int y) {
    if (sketch.values().has(SCREEN_BYPASS.key())) {
      SymbolType type = StageWiring.capacitorSymbol(sketch.values(), SCREEN_BYPASS);
      int x = screens + 3;
      sketch.wire(screens, y, x, y, x, y + 1);
      sketch.upright(type, x, y + 3, SCREEN_BYPASS.key(), Side.RIGHT);
      sketch.ground(x, y + 5);
    }
  }
}
