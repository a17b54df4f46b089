package perveance.accuracy;

import java.util.List;
import java.util.Locale;
import perveance.engine.numeric.Statistics;

/**
 * One line of the accuracy table.
 *
 * @param type device type
 * @param kind what was compared
 * @param fitted whether the law was fitted to these figures or predicts them
 * @param count how many figures
 * @param median median size of the error, in the unit
 * @param worst largest error, in the unit
 * @param unit {@code %} of the published figure, or {@code points} of per cent
 * @param source publication, short
 */
public record AccuracyLine(
    String type,
    String kind,
    boolean fitted,
    int count,
    double median,
    double worst,
    String unit,
    String source) {
  /** From relative errors. */
  public static AccuracyLine relative(
      String type, String kind, boolean fitted, List<Double> errors, String source) {
    return of(type, kind, fitted, errors.stream().map(e -> 100 * e).toList(), "%", source);
  }

  /** From errors in percentage points. */
  public static AccuracyLine points(
      String type, String kind, boolean fitted, List<Double> errors, String source) {
    return of(type, kind, fitted, errors, "points", source);
  }

  private static AccuracyLine of(
      String type, String kind, boolean fitted, List<Double> errors, String unit, String source) {
    double[] sizes = errors.stream().mapToDouble(Math::abs).toArray();
    double worst = 0;
    for (double size : sizes) {
      worst = Math.max(worst, size);
    }
    return new AccuracyLine(
        type, kind, fitted, sizes.length, Statistics.median(sizes), worst, unit, source);
  }

  /** As a row of a Markdown table. */
  String row() {
    return String.format(
        Locale.ROOT,
        "| %s | %s | %s | %d | %.1f %s | %.1f %s | %s |",
        type,
        kind,
        fitted ? "fitted" : "predicted",
        count,
        median,
        unit,
        worst,
        unit,
        source);
  }
}
