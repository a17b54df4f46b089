package perveance.plot;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;
import java.util.stream.Stream;
import perveance.engine.analysis.DevicePoint;
import perveance.engine.analysis.LoadLineView;
import perveance.engine.analysis.StageAnswer;
import perveance.engine.device.CurveFamily;
import perveance.engine.device.Device;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.device.Ratings;
import perveance.engine.stage.StageCircuit;

/** The plots of one stage, described from its answer. */
public final class StagePlots {
  private static final int EDGE_POINTS = 80;

  /** Ends of load lines beyond so many times the operating point are left out of the picture. */
  private static final double FARTHEST_VOLTAGE = 2.5;

  private static final double FARTHEST_CURRENT = 5;

  private StagePlots() {}

  /**
   * Characteristics with load lines, operating point and swing.
   *
   * @param answer the stage's answer
   * @return description, empty when the kind has no load line
   */
  public static Optional<PlotDescription> characteristics(StageAnswer answer) {
    return answer
        .loadLine()
        .flatMap(
            view ->
                section(answer, view.ref()).map(section -> characteristics(answer, view, section)));
  }

  private static PlotDescription characteristics(
      StageAnswer answer, LoadLineView view, StageCircuit.StageDevice section) {
    return CharacteristicsPlot.of(family(answer, view, section), limit(section.device()), view);
  }

  /**
   * The characteristics alone, with room for the stage's load lines: what stands still while the
   * lines move.
   *
   * @param answer the stage's answer
   * @return description, empty when the kind has no load line
   */
  public static Optional<PlotDescription> frame(StageAnswer answer) {
    return answer
        .loadLine()
        .flatMap(
            view ->
                section(answer, view.ref())
                    .map(
                        section ->
                            CharacteristicsPlot.under(
                                family(answer, view, section), limit(section.device()), view)));
  }

  /**
   * The curve at which grid current begins, within the frame.
   *
   * @param answer the stage's answer
   * @param frame characteristics of the stage
   * @return points from low to high anode voltage, in axis units; empty where no grid current
   *     begins within the picture
   */
  public static List<PlotPoint> gridCurrentEdge(StageAnswer answer, PlotDescription frame) {
    Optional<StageCircuit.StageDevice> section =
        answer.loadLine().flatMap(view -> section(answer, view.ref()));
    if (section.isEmpty()) {
      return List.of();
    }
    DeviceLaw law = section.get().device().law();
    double onset = law.gridCurrentOnset();
    if (!Double.isFinite(onset)) {
      return List.of();
    }
    double screen = screen(answer, section.get());
    ElectrodeCurrents out = new ElectrodeCurrents();
    List<PlotPoint> points = new ArrayList<>();
    for (int i = 0; i <= EDGE_POINTS; i++) {
      double anode = frame.x().high() * i / EDGE_POINTS;
      law.evaluate(anode, onset, screen < 0 ? anode : screen, out);
      points.add(new PlotPoint(anode, 1e3 * Math.max(0, out.current(ElectrodeCurrents.ANODE))));
    }
    return points;
  }

  private static CurveFamily family(
      StageAnswer answer, LoadLineView view, StageCircuit.StageDevice section) {
    double volts = room(view, view.anode(), FARTHEST_VOLTAGE, LoadLineView.Point::voltage);
    double amperes = room(view, view.current(), FARTHEST_CURRENT, LoadLineView.Point::current);
    return CurveFamily.of(
        section.device(),
        screen(answer, section),
        roundUp(Math.max(volts, 1.3 * view.anode()) * 1.05),
        roundUp(Math.max(amperes, 1.8 * view.current()) * 1.08));
  }

  /**
   * How far an axis has to reach: all of the swing, and the load lines as far as that leaves the
   * curves legible.
   */
  private static double room(
      LoadLineView view, double point, double farthest, ToDoubleFunction<LoadLineView.Point> axis) {
    double lines =
        Stream.of(view.dc(), view.ac()).flatMap(List::stream).mapToDouble(axis).max().orElse(0);
    double swing =
        Stream.of(view.excursion(), view.reactive())
            .flatMap(List::stream)
            .mapToDouble(axis)
            .max()
            .orElse(0);
    return Math.max(swing, Math.min(lines, farthest * point));
  }

  private static OptionalDouble limit(Device device) {
    return device.defaultRatings().map(Ratings::anodeDissipation).orElse(OptionalDouble.empty());
  }

  private static double screen(StageAnswer answer, StageCircuit.StageDevice section) {
    if (section.connection().equals("triode")) {
      return CurveFamily.SCREEN_TIED;
    }
    return answer.points().stream()
        .filter(p -> p.ref().equals(section.ref()))
        .map(DevicePoint::screen)
        .flatMap(s -> s.stream().boxed())
        .findFirst()
        .orElse(0.0);
  }

  /**
   * The section of a stage with a reference.
   *
   * @param answer the stage's answer
   * @param ref reference
   * @return the section, or empty
   */
  public static Optional<StageCircuit.StageDevice> section(StageAnswer answer, String ref) {
    return answer.circuit().devices().stream().filter(d -> d.ref().equals(ref)).findFirst();
  }

  /**
   * Next round end of an axis.
   *
   * @param value above zero [1]
   * @return the value or a little more, with five or so even steps to it [1]
   */
  static double roundUp(double value) {
    double step = ChartFactory.roundStep(value / 6);
    return step * Math.ceil(value / step - 1e-9);
  }
}
