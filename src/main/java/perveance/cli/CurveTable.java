package perveance.cli;

import java.util.Locale;
import perveance.engine.device.CurveFamily;

/** A curve family as comma-separated values: one column a grid voltage. */
final class CurveTable {
  private CurveTable() {}

  static String csv(CurveFamily family) {
    StringBuilder out = new StringBuilder("anode_V");
    for (CurveFamily.Curve curve : family.curves()) {
      String grid = family.gridless() ? "" : " at grid " + plain(curve.grid()) + " V";
      out.append(",anode_A").append(grid);
    }
    out.append('\n');
    int points = family.curves().get(0).points().size();
    for (int i = 0; i < points; i++) {
      out.append(plain(family.curves().get(0).points().get(i).anode()));
      for (CurveFamily.Curve curve : family.curves()) {
        out.append(String.format(Locale.ROOT, ",%.6g", curve.points().get(i).current()));
      }
      out.append('\n');
    }
    return out.toString();
  }

  private static String plain(double value) {
    return java.math.BigDecimal.valueOf(value)
        .round(new java.math.MathContext(8))
        .stripTrailingZeros()
        .toPlainString();
  }
}
