package perveance.engine.stage;

import static perveance.engine.stage.StageKeys.SECTIONS;

import java.util.ArrayList;
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
  static List<Complaint> checkCount(StageValues values) {
    double sections = values.number(SECTIONS.key(), 1);
    return sections == Math.rint(sections)
        ? List.of()
        : List.of(
            new Complaint(SECTIONS.key(), Double.toString(sections), "a whole number of sections"));
  }

  static List<Complaint> check(StageValues values) {
    List<Complaint> complaints = new ArrayList<>(checkCount(values));
    double sections = values.number(SECTIONS.key(), 1);
    if (sections > 1 && values.device().law().kind() == LawKind.PENTODE) {
      complaints.add(
          new Complaint(
              SECTIONS.key(), "several pentodes in parallel", "triodes, or one pentode, here"));
    }
    return complaints;
  }

  /**
   * Draws the valves side by side with their stoppers, anodes and cathodes joined.
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
        cathode(sketch, at, y + 4);
      }
    }
    int last = x + (count - 1) * step(values);
    if (count > 1) {
      sketch.wire(joint, y, joint, y - 5);
      sketch.wire(joint, y - 5, last - 12, y - 5);
    }
    return last;
  }

  /** Joins the cathode of a further valve to the one on its left, or to chassis as that one is. */
  private static void cathode(Sketch sketch, int x, int y) {
    if (!CathodeBias.raised(sketch.values())) {
      sketch.ground(x, y);
      return;
    }
    int step = step(sketch.values());
    boolean first = x == GroundedCathode.X + step;
    boolean bypassed = sketch.values().has(StageKeys.CATHODE_BYPASS.key());
    int from = first && bypassed ? CathodeBias.BYPASS : 0;
    sketch.wire(x, y, x, y + 2, x - step + from, y + 2);
  }
}
