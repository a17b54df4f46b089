package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.CATHODE_BYPASS;
import static perveance.engine.stage.StageKeys.INPUT_COUPLING;
import static perveance.engine.stage.StageKeys.PRIMARY;
import static perveance.engine.stage.StageKeys.SOURCE;

import perveance.engine.device.Device;
import perveance.engine.device.LawKind;
import perveance.engine.stage.Drawing.Side;
import perveance.engine.stage.Drawing.SymbolType;

/** The drawing of a push-pull stage: one side above the other, the transformer on the right. */
final class PushPullSketch {
  private static final int X = 20;
  private static final int JOINT = 8;
  private static final int TOP = 16;
  private static final int BOTTOM = 40;
  private static final int CORE = 28;
  private static final int SCREEN = 16;

  private final Sketch sketch;
  private final StageValues values;
  private final int sections;
  private final int step;
  private final int last;
  private final boolean screened;
  private final String connection;

  private PushPullSketch(Sketch sketch) {
    this.sketch = sketch;
    this.values = sketch.values();
    this.sections = Sections.count(values);
    this.step = Sections.step(values);
    this.last = X + (sections - 1) * step;
    this.screened = values.device().law().kind() == LawKind.PENTODE;
    this.connection = ValveWiring.connection(values, values.device());
  }

  static void draw(Sketch sketch) {
    PushPullSketch drawing = new PushPullSketch(sketch);
    drawing.side(TOP, 0, "");
    drawing.side(BOTTOM, drawing.sections, "2");
    drawing.cathodes();
    drawing.transformer();
    if (drawing.screened) {
      drawing.screens();
    }
  }

  private void side(int y, int start, String suffix) {
    Device device = start == 0 ? values.device() : values.secondDevice();
    input(y, suffix);
    for (int i = 0; i < sections; i++) {
      int x = X + i * step;
      String number = Sections.suffix(start + i);
      String ref = PushPullOutput.ref(values, start + i);
      sketch.valve(ValveWiring.symbol(device), x, y, false, ref, Side.RIGHT);
      sketch.wire(x, y - 7, x, y - 4);
      if (i == 0) {
        GridInput.sketchStopper(sketch, JOINT, x - 4, y, number);
      } else {
        sketch.wire(x - 12, y - 5, x - 12, y);
        GridInput.sketchStopper(sketch, x - 12, x - 4, y, number);
      }
    }
    if (sections > 1) {
      sketch.wire(JOINT, y, JOINT, y - 5, last - 12, y - 5);
    }
    sketch.mark(X, y - 7, "anode" + suffix, Side.LEFT);
  }

  private void input(int y, String suffix) {
    String text = suffix.isEmpty() ? "in" : "in, inverted";
    if (GridInput.direct(values)) {
      GridInput.terminal(sketch, JOINT, y);
    } else if (values.has(INPUT_COUPLING.key())) {
      sketch.input(JOINT - 12, y, SOURCE.key() + suffix, text);
      sketch.wire(JOINT - 12, y, JOINT - 6, y);
      String local = INPUT_COUPLING.key() + suffix;
      sketch.lying(SymbolType.CAPACITOR, JOINT - 4, y, local, Side.ABOVE);
      sketch.wire(JOINT - 2, y, JOINT, y);
    } else {
      sketch.input(JOINT - 4, y, SOURCE.key() + suffix, text);
      sketch.wire(JOINT - 4, y, JOINT, y);
    }
    if (GridInput.hasLeak(values)) {
      GridInput.sketchLeak(sketch, JOINT, y, suffix);
      GridInput.foot(sketch, JOINT, y + 6);
    }
  }

  private void cathodes() {
    boolean raised = CathodeBias.raised(values);
    boolean apart = PairedCathodes.apart(values);
    bus(TOP, raised);
    bus(BOTTOM, raised);
    if (raised && !apart) {
      int right = last + 14;
      int start = sections > 1 ? last : X;
      boolean bypassed = sections == 1 && values.has(CATHODE_BYPASS.key());
      int end = bypassed ? X + CathodeBias.BYPASS : start;
      sketch.wire(X, TOP + 4, X, TOP + 6);
      sketch.wire(start, TOP + 6, right, TOP + 6, right, BOTTOM + 6, end, BOTTOM + 6);
    } else {
      CathodeBias.sketch(sketch, X, TOP + 4, "");
    }
    CathodeBias.sketch(sketch, X, BOTTOM + 4, apart ? "2" : "");
  }

  /** Joins the cathodes of one side, or takes each to chassis. */
  private void bus(int y, boolean raised) {
    boolean bypassed =
        values.has(CATHODE_BYPASS.key()) && (PairedCathodes.apart(values) || y == BOTTOM);
    for (int x = X + step; x <= last; x += step) {
      if (raised) {
        int from = x == X + step && bypassed ? X + CathodeBias.BYPASS : x - step;
        sketch.wire(x, y + 4, x, y + 6, from, y + 6);
      } else {
        sketch.ground(x, y + 4);
      }
    }
  }

  private int core() {
    int right = last + (screened ? 30 : 28);
    return ScreenDropper.stated(values) ? right + 6 : right;
  }

  private void transformer() {
    int x = core();
    sketch.symbol(SymbolType.CENTRE_TAPPED_TRANSFORMER, x, CORE, PRIMARY.key(), Side.BELOW, "");
    sketch.wire(X, TOP - 7, x - 6, TOP - 7, x - 6, CORE - 8, x - 2, CORE - 8);
    sketch.wire(X, BOTTOM - 7, x - 6, BOTTOM - 7, x - 6, CORE + 8, x - 2, CORE + 8);
    SingleEndedSketch.anodeSupply(sketch, x - 8, CORE - 2);
    sketch.wire(x - 8, CORE - 2, x - 8, CORE, x - 2, CORE);
    SingleEndedSketch.load(sketch, x, CORE);
  }

  private void screens() {
    boolean triode = connection.equals(ValveWiring.TRIODE);
    boolean tapped = connection.equals(ValveWiring.ULTRA_LINEAR);
    for (int i = 0; i < sections; i++) {
      int x = X + i * step;
      SingleEndedSketch.resistor(sketch, x, TOP, Sections.suffix(i));
      SingleEndedSketch.resistor(sketch, x, BOTTOM, Sections.suffix(sections + i));
    }
    int first = X + SCREEN;
    int right = last + SCREEN;
    if (triode) {
      for (int x = first; x <= right; x += step) {
        sketch.wire(x, TOP, x, TOP - 7);
        sketch.wire(x, BOTTOM, x, BOTTOM - 7);
      }
    } else if (tapped) {
      toTap(TOP, CORE - 4, CORE - 5);
      toTap(BOTTOM, CORE + 4, CORE + 6);
    } else {
      for (int x = first; x <= right; x += step) {
        sketch.wire(x, TOP, x, BOTTOM);
      }
      screenRail(first, right);
    }
  }

  /** Joins the screens of one side and takes them to their tap. */
  private void toTap(int y, int tap, int bus) {
    int first = X + SCREEN;
    int right = last + SCREEN;
    for (int x = first; x <= right; x += step) {
      sketch.wire(x, y, x, bus);
    }
    sketch.wire(first, bus, core() - 4, bus, core() - 4, tap, core() - 2, tap);
  }

  private void screenRail(int first, int right) {
    boolean own = OutputFeed.ownScreenRail(values);
    boolean dropped = ScreenDropper.stated(values);
    int y = own ? CORE + 4 : CORE;
    int from = own ? first : right;
    int to = own ? first - (dropped ? 8 : 6) : core() - 8;
    rungs(first, right, y);
    if (dropped) {
      ScreenDropper.sketch(sketch, from, to, y);
      ScreenDropper.sketchBypass(sketch, right, BOTTOM - 4);
    } else {
      sketch.wire(from, y, to, y);
    }
    if (own) {
      SingleEndedSketch.screenSupply(sketch, to, y);
    }
  }

  /** Joins the upright leads of the screens at a height. */
  private void rungs(int first, int right, int y) {
    for (int x = first; x < right; x += step) {
      sketch.wire(x, y, x + step, y);
    }
  }
}
