package perveance.engine.analysis;

import java.util.List;

/** Hand sums of overload. */
final class SwingSums {
  private SwingSums() {}

  /** Second harmonic from the two swings (three-ordinate formula, E. W. Espley 1933 and others). */
  static List<HandSum> of(CleanSwing clean) {
    double down = Math.abs(clean.outputDown());
    double up = Math.abs(clean.outputUp());
    if (!(down > 0) || !(up > 0)) {
      return List.of();
    }
    return List.of(
        new HandSum(
            "second harmonic from the swings",
            "H2 = |down - up| / (2 (down + up))",
            "|"
                + Sum.volts(down)
                + " - "
                + Sum.volts(up)
                + "| / (2 x ("
                + Sum.volts(down)
                + " + "
                + Sum.volts(up)
                + "))",
            Sum.percent(Math.abs(down - up) / (2 * (down + up))),
            "only where both swings belong to the same input; here they are the two clean ends"));
  }
}
