package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.SECTIONS;

import java.util.List;
import perveance.engine.device.LawKind;
import perveance.engine.stage.Drawing.Side;
import perveance.engine.stage.Drawing.SymbolType;
import perveance.engine.stage.StageKind.Complaint;

/** Sections of a valve in parallel, each with its own grid stopper. */
final class Sections {
  /** Distance between the valves of parallel sections; leaves room for a stopper and texts. */
  private static final int STEP = 24;

  /** The same where the screens have leads of their own. */
  private static final int SCREENED_STEP = 34;

  private Sections() {}

  static int count(StageValues values) {
    return (int) values.number(SECTIONS.key(), 1);
  }

  /** Distance between the valves in a drawing. */
  static int step(StageValues values) {
    return values.device().law().kind() == LawKind.PENTODE ? SCREENED_STEP : STEP;
  }

  /** Reference of a section: the stage's own where there is only one. */
  static String ref(StageValues values, int index) {
    return count(values) == 1 ? values.ref() : ChassisNames.section(values.ref(), index);
  }

  /** Behind the names of what each section has for itself: nothing, 2, 3. */
  static String suffix(int index) {
    return index == 0 ? "" : Integer.toString(index + 1);
  }

  /** The number must be whole. */
  static List<Complaint> check(StageValues values) {
    double sections = values.number(SECTIONS.key(), 1);
    return sections == Math.rint(sections)
        ? List.of()
        : List.of(
            new Complaint(SECTIONS.key(), Double.toString(sections), "a whole number of sections"));
  }

  /**
   * Draws the valves side by side with their stoppers, joined grids and leads of the anodes.
   *
   * @return where the last valve stands
   */
  static int sketch(Sketch sketch, int x, int y, int joint, int anode) {
    StageValues values = sketch.values();
    SymbolType type = ValveWiring.symbol(values.device());
    int count = count(values);
    for (int i = 0; i < count; i++) {
      int at = x + i * step(values);
      sketch.valve(type, at, y, false, ref(values, i), Side.RIGHT);
      sketch.wire(at, anode, at, y - 4);
      if (i == 0) {
        GridInput.sketchStopper(sketch, joint, at - 4, y, "");
      } else {
        int riser = at - 12;
        sketch.wire(riser, y - 5, riser, y);
        GridInput.sketchStopper(sketch, riser, at - 4, y, suffix(i));
      }
    }
    int last = x + (count - 1) * step(values);
    if (count > 1) {
      sketch.wire(joint, y, joint, y - 5);
      sketch.wire(joint, y - 5, last - 12, y - 5);
    }
    return last;
  }

  /** Joins the cathodes of further valves to the first, or each to chassis as the first is. */
  static void sketchCathodes(Sketch sketch, int x, int y) {
    StageValues values = sketch.values();
    boolean bypassed = values.has(StageKeys.CATHODE_BYPASS.key());
    for (int i = 1; i < count(values); i++) {
      int at = x + i * step(values);
      if (CathodeBias.raised(values)) {
        int from = i == 1 && bypassed ? CathodeBias.BYPASS : 0;
        sketch.wire(at, y, at, y + 2, at - step(values) + from, y + 2);
      } else {
        sketch.ground(at, y);
      }
    }
  }
}
