package perveance.app.wording;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import perveance.engine.base.Finding;
import perveance.engine.base.MessageCode;
import perveance.engine.base.Remedy;
import perveance.engine.base.Severity;

/**
 * Findings for a reader: what is true of two twins in the same words is told once and names both.
 */
public final class FindingLines {
  /** A valve section or a part with its role, as sentences begin. */
  private static final Pattern NAME = Pattern.compile("[A-Z]+[0-9]+[a-z]?(?: \\([^)]*\\))?");

  private FindingLines() {}

  /**
   * Merges findings that differ in the name at their beginning alone.
   *
   * @param findings findings, worst first
   * @return lines in the same order, each where its first finding stood
   */
  public static List<FindingLine> of(List<Finding> findings) {
    Map<Kind, List<Told>> groups = new LinkedHashMap<>();
    for (Finding finding : findings) {
      Told told = Told.of(finding);
      Kind kind =
          new Kind(
              finding.code(),
              finding.severity(),
              told.rest,
              finding.remedy().map(Remedy::text).orElse(""));
      groups.computeIfAbsent(kind, k -> new ArrayList<>()).add(told);
    }
    return groups.entrySet().stream().map(e -> line(e.getKey(), e.getValue())).toList();
  }

  private static FindingLine line(Kind kind, List<Told> group) {
    TreeSet<String> places = new TreeSet<>();
    group.forEach(t -> places.add(t.where));
    List<String> others =
        group.stream().skip(1).map(t -> t.name).filter(n -> !n.isEmpty()).distinct().toList();
    String text = group.get(0).name + kind.rest;
    return new FindingLine(
        kind.severity,
        String.join(", ", places),
        others.isEmpty() ? text : text + " The same holds for " + list(others) + ".",
        kind.remedy);
  }

  private static String list(List<String> names) {
    int last = names.size() - 1;
    return last == 0
        ? names.get(0)
        : String.join(", ", names.subList(0, last)) + " and " + names.get(last);
  }

  private record Kind(MessageCode code, Severity severity, String rest, String remedy) {}

  private record Told(String where, String name, String rest) {
    static Told of(Finding finding) {
      Matcher matcher = NAME.matcher(finding.text());
      int end = matcher.lookingAt() ? matcher.end() : 0;
      return new Told(
          finding.where(), finding.text().substring(0, end), finding.text().substring(end));
    }
  }
}
