package perveance.engine.base;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Puts findings in order: equal ones merged to their worst, the worst first. */
public final class Findings {
  private Findings() {}

  /** What makes two findings equal: the same kind at the same place and part. */
  private record Place(MessageCode code, String where, Optional<String> part) {}

  /**
   * Merges equal findings, keeping the worst of each, and sorts by severity, the worst first;
   * within a severity the order in which they came stays.
   *
   * @param findings findings in the order they were made
   * @return the merged findings, worst first
   */
  public static List<Finding> worstFirst(Collection<Finding> findings) {
    Map<Place, Finding> worst = new LinkedHashMap<>();
    for (Finding finding : findings) {
      worst.merge(
          new Place(finding.code(), finding.where(), finding.part()), finding, Findings::worse);
    }
    List<Finding> sorted = new ArrayList<>(worst.values());
    sorted.sort(Comparator.comparing(Finding::severity).reversed());
    return List.copyOf(sorted);
  }

  /**
   * Returns the worst severity among findings.
   *
   * @param findings any findings
   * @return the worst severity; empty when there are no findings
   */
  public static Optional<Severity> worstSeverity(Collection<Finding> findings) {
    return findings.stream().map(Finding::severity).max(Comparator.naturalOrder());
  }

  private static Finding worse(Finding earlier, Finding later) {
    int bySeverity = later.severity().compareTo(earlier.severity());
    if (bySeverity != 0) {
      return bySeverity > 0 ? later : earlier;
    }
    double excess = badness(later) - badness(earlier);
    return excess > 0 ? later : earlier;
  }

  /** Share of the limit, or the size where there is no limit; turned round where low is worse. */
  private static double badness(Finding finding) {
    if (finding.value().isEmpty()) {
      return finding.code().lowerIsWorse() ? -Double.MAX_VALUE : 0;
    }
    double size = Math.abs(finding.value().getAsDouble());
    double limit = Math.abs(finding.limit().orElse(1));
    double share = limit > 0 ? size / limit : size;
    return finding.code().lowerIsWorse() ? -share : share;
  }
}
