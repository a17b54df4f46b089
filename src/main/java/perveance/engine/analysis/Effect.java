package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.base.QuantityFormat;

/** Says in words what an edit does to a stage: clean output, gain, anode current. */
final class Effect {
  /** Changes smaller than this are not worth a word [1]. */
  private static final double SLIGHT = 0.01;

  private Effect() {}

  static String of(StageAnswer before, Variant after) {
    List<String> words = new ArrayList<>();
    add(words, "clean output", before.clean().outputPeak(), after.clean().outputPeak());
    add(words, "gain", Math.abs(before.smallSignal().gain()), Math.abs(after.gain()));
    add(words, "anode current", current(before.points()), current(after.points()));
    return words.isEmpty() ? "changes little else" : "gives " + String.join(", ", words);
  }

  private static double current(List<DevicePoint> points) {
    return points.isEmpty() ? 0 : points.get(0).anodeCurrent();
  }

  private static void add(List<String> words, String what, double before, double after) {
    if (!(before > 0) || !(after > 0)) {
      return;
    }
    double change = after / before - 1;
    if (Math.abs(change) >= SLIGHT) {
      String percent =
          QuantityFormat.TYPESET.percent(Math.abs(change), Math.abs(change) >= 0.095 ? 2 : 1);
      words.add(percent + (change > 0 ? " more " : " less ") + what);
    }
  }
}
