package perveance.engine.analysis;

import java.util.Map;
import java.util.OptionalDouble;
import perveance.engine.analysis.CleanSwing.Limit;

/** Puts both sides of a swing together. */
final class CleanSwings {
  private CleanSwings() {}

  /**
   * The clean swing of a stage.
   *
   * @param dynamic its characteristic
   * @param composite whether a section may be cut off while others go on
   * @param drive stated peak input, empty when none is stated [V]
   */
  static CleanSwing of(StageCurve dynamic, boolean composite, OptionalDouble drive) {
    SwingSearch search = new SwingSearch(dynamic, composite);
    SwingEnd up = search.end(dynamic.sense());
    SwingEnd down = search.end(-dynamic.sense());
    boolean upFirst = first(up, down);
    SwingEnd nearer = upFirst ? up : down;
    double peak = Math.abs(nearer.input());
    return new CleanSwing(
        peak,
        smallerOutput(dynamic, Math.abs(nearer.source())),
        nearer.limit(),
        nearer.at(),
        Math.abs(up.input()),
        up.limit(),
        Math.abs(down.input()),
        down.limit(),
        up.output(),
        down.output(),
        toZeroBias(dynamic, up, down),
        headroom(peak, drive),
        Map.of());
  }

  private static boolean first(SwingEnd up, SwingEnd down) {
    if ((up.limit() == Limit.NONE) != (down.limit() == Limit.NONE)) {
      return down.limit() == Limit.NONE;
    }
    return Math.abs(up.source()) <= Math.abs(down.source());
  }

  private static double smallerOutput(StageCurve dynamic, double source) {
    double smaller = Double.POSITIVE_INFINITY;
    for (int sign = -1; sign <= 1; sign += 2) {
      if (dynamic.move(sign * source)) {
        smaller = Math.min(smaller, Math.abs(dynamic.output(0)));
      }
    }
    return Double.isFinite(smaller) ? smaller : 0;
  }

  private static OptionalDouble headroom(double peak, OptionalDouble drive) {
    return drive.isPresent() && drive.getAsDouble() > 0 && peak > 0
        ? OptionalDouble.of(20 * Math.log10(peak / drive.getAsDouble()))
        : OptionalDouble.empty();
  }

  /** Goes on from the end on the side where a grid rises, along the slope it has there. */
  private static double toZeroBias(StageCurve dynamic, SwingEnd up, SwingEnd down) {
    double least = Double.POSITIVE_INFINITY;
    for (SwingEnd end : new SwingEnd[] {up, down}) {
      double step = 0.01 * end.source();
      for (int v = 0; v < dynamic.own() && step != 0; v++) {
        if (!dynamic.move(end.source() - step)) {
          continue;
        }
        double before = dynamic.gridVoltage(v);
        if (!dynamic.move(end.source())) {
          continue;
        }
        double at = dynamic.gridVoltage(v);
        double rate = (at - before) / 0.01;
        if (rate > 0) {
          least = Math.min(least, Math.abs(end.input()) * (1 - at / rate));
        }
      }
    }
    return Double.isFinite(least) && least > 0 ? least : 0;
  }
}
