package perveance.app.wording;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import perveance.engine.analysis.LimitUse;
import perveance.engine.analysis.StageAnswer;
import perveance.engine.device.Ratings;
import perveance.engine.stage.StageCircuit;

/** The limits worth reading: under the ratings named first, the worst moment of each. */
public final class LimitRows {
  /** Below this share a limit is not worth a line [1]. */
  private static final double LEAST = 0.005;

  private LimitRows() {}

  /**
   * Limits of a stage.
   *
   * @param answer the stage's answer
   * @return one row for each valve and kind of limit, as the answer orders them; twins share one
   */
  public static List<FigureRow> of(StageAnswer answer) {
    Map<String, LimitUse> worst = new LinkedHashMap<>();
    for (LimitUse use : answer.limits()) {
      if (usual(answer, use)) {
        worst.merge(use.ref() + use.what(), use, (a, b) -> a.share() >= b.share() ? a : b);
      }
    }
    Twins twins = new Twins();
    for (LimitUse use : worst.values()) {
      if (use.share() >= LEAST) {
        twins.add(use.ref(), row(use));
      }
    }
    return twins.rows();
  }

  private static boolean usual(StageAnswer answer, LimitUse use) {
    return answer.circuit().devices().stream()
        .filter(d -> d.ref().equals(use.ref()))
        .map(StageCircuit.StageDevice::device)
        .flatMap(d -> d.defaultRatings().stream())
        .anyMatch(r -> under(r, use));
  }

  private static boolean under(Ratings ratings, LimitUse use) {
    return use.system() == ratings.system()
        && use.source().endsWith(ratings.source())
        && (use.source().equals(ratings.source()) || use.source().startsWith(ratings.type()));
  }

  private static FigureRow row(LimitUse use) {
    String when = use.when().equals("idle") ? "" : " at " + use.when();
    return new FigureRow(
        use.what() + when,
        Figures.reading(use.value(), use.unit()) + " of " + Figures.part(use.limit(), use.unit()),
        Math.round(100 * use.share()) + " %",
        use.system().word());
  }
}
