package perveance.report;

import java.util.ArrayList;
import java.util.List;
import perveance.app.wording.Figures;
import perveance.engine.analysis.DevicePoint;
import perveance.engine.analysis.LimitUse;
import perveance.engine.analysis.StageAnswer;

/** Limits of one valve section on the sheet: value, limit, rating system. */
final class PointRows {
  private PointRows() {}

  static List<Block> of(
      Typeface faces, SheetOptions options, StageAnswer stage, DevicePoint point) {
    List<Block> rows = new ArrayList<>();
    for (LimitUse use : stage.limits()) {
      if (use.ref().equals(point.ref()) && (use.when().equals("idle") || use.share() > 0.8)) {
        rows.add(row(faces, options, use));
      }
    }
    return rows;
  }

  private static Block row(Typeface faces, SheetOptions options, LimitUse use) {
    String when = use.when().equals("idle") ? "" : ", " + use.when();
    return new RowBlock(
        faces,
        new double[] {0.34, 0.66},
        List.of(
            Cell.soft(options.vocabulary().say(use.ref() + " " + use.what() + when)),
            Cell.bold(
                Figures.reading(use.value(), use.unit())
                    + " of "
                    + Figures.reading(use.limit(), use.unit())
                    + " ("
                    + use.system().word()
                    + ")")),
        9,
        13,
        0);
  }
}
