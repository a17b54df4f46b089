package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.ANODE_VOLTAGE;
import static perveance.engine.stage.StageKeys.PRIMARY;
import static perveance.engine.stage.StageKeys.SCREEN_BYPASS;
import static perveance.engine.stage.StageKeys.SCREEN_RESISTOR;
import static perveance.engine.stage.StageKeys.SCREEN_SUPPLY;
import static perveance.engine.stage.StageKeys.SCREEN_VOLTAGE;
import static perveance.engine.stage.StageKeys.SECONDARY_LOAD;
import static perveance.engine.stage.StageKeys.SUPPLY;

import perveance.engine.device.LawKind;
import perveance.engine.stage.Drawing.Side;
import perveance.engine.stage.Drawing.SymbolType;

/** The drawing of a single-ended output stage: valves on the left, transformer on the right. */
final class SingleEndedSketch {
  private static final int X = 20;
  private static final int Y = 16;
  private static final int ANODE = 9;
  private static final int JOINT = 8;

  /** How far right of its valve a screen's lead turns up. */
  private static final int SCREEN = 16;

  private SingleEndedSketch() {}

  static boolean screened(StageValues values) {
    return values.device().law().kind() == LawKind.PENTODE;
  }

  static void draw(Sketch sketch) {
    StageValues values = sketch.values();
    GridInput.sketch(sketch, JOINT, Y);
    int last = Sections.sketch(sketch, X, Y, JOINT, ANODE);
    CathodeBias.sketch(sketch, X, Y + 4);
    Sections.sketchCathodes(sketch, X, Y + 4);
    int core = last + (screened(values) ? SCREEN + 6 : 14);
    sketch.mark(X, ANODE, "anode", Side.LEFT);
    sketch.wire(X, ANODE, core - 2, ANODE);
    transformer(sketch, core);
    if (screened(values)) {
      int step = Sections.step(values);
      for (int x = X; x <= last; x += step) {
        screen(sketch, x, Sections.suffix((x - X) / step));
      }
      rail(sketch, core, last + SCREEN);
    }
  }

  private static void transformer(Sketch sketch, int core) {
    int y = ANODE - 4;
    sketch.symbol(SymbolType.TRANSFORMER, core, y, PRIMARY.key(), Side.BELOW, "");
    anodeSupply(sketch, core - 2, y - 5);
    sketch.wire(core - 2, y - 5, core - 2, y - 4);
    load(sketch, core, y);
  }

  /** Draws the rail that feeds the anodes. */
  static void anodeSupply(Sketch sketch, int x, int y) {
    if (OutputIdle.stated(sketch.values())) {
      sketch.source(SymbolType.SUPPLY, x, y, ANODE_VOLTAGE, Side.ABOVE, "anode");
    } else {
      sketch.supply(x, y, SUPPLY, Side.ABOVE);
    }
  }

  /** Draws what hangs on the secondary. */
  static void load(Sketch sketch, int core, int y) {
    sketch.wire(core + 2, y - 2, core + 8, y - 2);
    sketch.output(core + 8, y - 2, false, "out");
    sketch.wire(core + 2, y + 2, core + 4, y + 2);
    if (sketch.values().has(SECONDARY_LOAD.key())) {
      sketch.upright(SymbolType.RESISTOR, core + 6, y, SECONDARY_LOAD.key(), Side.RIGHT);
      sketch.wire(core + 4, y + 2, core + 6, y + 2);
    }
    sketch.wire(core + 4, y + 2, core + 4, y + 3);
    sketch.ground(core + 4, y + 3);
  }

  private static void screen(Sketch sketch, int valve, String suffix) {
    int x = valve + SCREEN;
    if (sketch.values().has(SCREEN_BYPASS.key())) {
      SymbolType type = StageWiring.capacitorSymbol(sketch.values(), SCREEN_BYPASS);
      sketch.wire(valve + 4, Y, x, Y, x, Y + 2);
      sketch.upright(type, x, Y + 4, SCREEN_BYPASS.key(), Side.RIGHT);
      sketch.ground(x, Y + 6);
      sketch.wire(x, Y, x, Y - 1);
      sketch.upright(SymbolType.RESISTOR, x, Y - 3, SCREEN_RESISTOR.key(), Side.RIGHT);
      sketch.wire(x, Y - 5, x, joining(sketch.values()));
    } else {
      resistor(sketch, valve, Y, suffix);
      sketch.wire(x, Y, x, joining(sketch.values()));
    }
  }

  /** Draws the lead of a screen with its resistor, if there is one, to sixteen units right. */
  static void resistor(Sketch sketch, int valve, int y, String suffix) {
    int x = valve + SCREEN;
    if (sketch.values().has(SCREEN_RESISTOR.key())) {
      sketch.wire(valve + 4, y, valve + 8, y);
      String local = SCREEN_RESISTOR.key() + suffix;
      sketch.lying(SymbolType.RESISTOR, valve + 10, y, local, Side.ABOVE);
      sketch.wire(valve + 12, y, x, y);
    } else {
      sketch.wire(valve + 4, y, x, y);
    }
  }

  /** Height at which the leads of the screens end. */
  private static int joining(StageValues values) {
    return switch (ValveWiring.connection(values, values.device())) {
      case ValveWiring.TRIODE -> ANODE;
      case ValveWiring.ULTRA_LINEAR -> ANODE - 4;
      default -> OutputFeed.ownScreenRail(values) ? ANODE - 6 : ANODE - 8;
    };
  }

  /** Joins the leads of the screens and takes them to what feeds them. */
  private static void rail(Sketch sketch, int core, int last) {
    StageValues values = sketch.values();
    String connection = ValveWiring.connection(values, values.device());
    int y = joining(values);
    if (connection.equals(ValveWiring.TRIODE)) {
      return;
    }
    boolean own = connection.equals(ValveWiring.PENTODE) && OutputFeed.ownScreenRail(values);
    sketch.wire(X + SCREEN, y, own ? last : core - 2, y);
    if (own) {
      screenSupply(sketch, X + SCREEN, y);
    }
  }

  /** Draws the source of the screens. */
  static void screenSupply(Sketch sketch, int x, int y) {
    if (sketch.values().has(SCREEN_SUPPLY.key())) {
      sketch.supply(x, y, SCREEN_SUPPLY, Side.ABOVE);
    } else {
      sketch.source(SymbolType.SUPPLY, x, y, SCREEN_VOLTAGE, Side.ABOVE, "screen");
    }
  }
}
