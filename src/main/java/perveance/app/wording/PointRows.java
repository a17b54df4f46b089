package perveance.app.wording;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.analysis.DevicePoint;
import perveance.engine.analysis.StageAnswer;

/** The operating points of a stage; where it has several valves each row names its own. */
public final class PointRows {
  private PointRows() {}

  /**
   * Operating points of a stage.
   *
   * @param stage the stage's answer
   * @return rows; what two valves share in every figure stands once
   */
  public static List<FigureRow> of(StageAnswer stage) {
    if (stage.points().size() == 1) {
      return rows(stage.points().get(0));
    }
    Twins twins = new Twins();
    for (DevicePoint point : stage.points()) {
      rows(point).forEach(row -> twins.add(point.ref(), row));
    }
    return twins.rows();
  }

  private static List<FigureRow> rows(DevicePoint point) {
    List<FigureRow> rows = new ArrayList<>(StageFigures.point(point));
    point.outsideEvidence().ifPresent(t -> rows.add(new FigureRow("outside data", "", "", t)));
    return rows;
  }
}
