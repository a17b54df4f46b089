package perveance.accuracy;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import perveance.engine.numeric.Statistics;

/** The accuracy table over all types: one row for each kind of figure. */
final class AccuracySummary {
  private AccuracySummary() {}

  static String of(List<AccuracyLine> lines) {
    Map<String, List<AccuracyLine>> kinds = new LinkedHashMap<>();
    lines.stream()
        .sorted(
            Comparator.comparing(AccuracyLine::fitted).reversed().thenComparing(AccuracyLine::kind))
        .forEach(
            line ->
                kinds
                    .computeIfAbsent(line.fitted() + line.kind(), k -> new ArrayList<>())
                    .add(line));
    StringBuilder table =
        new StringBuilder(
            """
            | compared | law | types | figures | median error | worst error |
            | --- | --- | --- | --- | --- | --- |
            """);
    kinds.values().forEach(kind -> table.append(row(kind)));
    return table.toString();
  }

  private static String row(List<AccuracyLine> kind) {
    AccuracyLine first = kind.get(0);
    AccuracyLine worst =
        kind.stream().max(Comparator.comparingDouble(AccuracyLine::worst)).orElseThrow();
    return String.format(
        Locale.ROOT,
        "| %s | %s | %d | %d | %.1f %s | %.1f %s (%s) |\n",
        first.kind(),
        first.fitted() ? "fitted" : "predicted",
        kind.size(),
        kind.stream().mapToInt(AccuracyLine::count).sum(),
        Statistics.median(kind.stream().mapToDouble(AccuracyLine::median).toArray()),
        first.unit(),
        worst.worst(),
        worst.unit(),
        worst.type());
  }
}
