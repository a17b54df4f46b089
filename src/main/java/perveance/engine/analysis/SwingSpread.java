package perveance.engine.analysis;

import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.Map;
import perveance.engine.analysis.CleanSwing.Limit;
import perveance.engine.circuit.DcSolver;

/**
 * The clean swing over specimens: starts from where the nominal stage ends each way and follows the
 * same limit to where the specimen meets it. One specimen in four is followed, since a swing costs
 * as much as all the rest.
 */
final class SwingSpread {
  /** One specimen in so many is followed. */
  static final int STRIDE = 4;

  private static final int STEPS = 4;
  private static final double ACCURACY = 1e-3;

  private final StageModel model;
  private final int samples;
  private final SwingSearch nominal;
  private final SwingEnd up;
  private final SwingEnd down;
  private final double upSlope;
  private final double downSlope;
  private final Map<String, double[]> figures = new LinkedHashMap<>();
  private StageCurve curve;
  private SwingSearch margins;

  /**
   * Finds the nominal ends.
   *
   * @param model the nominal stage
   * @param composite whether a section may be cut off while others go on
   * @param samples how many specimens there are
   */
  SwingSpread(StageModel model, boolean composite, int samples) {
    this.model = model;
    this.samples = samples;
    this.curve = new StageCurve(model);
    this.nominal = new SwingSearch(curve, composite);
    this.margins = nominal;
    this.up = nominal.end(1);
    this.down = nominal.end(-1);
    this.upSlope = slope(up);
    this.downSlope = slope(down);
  }

  /** Change of a margin for a change of the source, around a nominal end [1/V]. */
  private double slope(SwingEnd end) {
    double step = 0.02 * end.source();
    if (step == 0 || end.limit() == Limit.NONE) {
      return 0;
    }
    double inside = margin(end, end.source() - step);
    return (margin(end, end.source()) - inside) / step;
  }

  private double margin(SwingEnd end, double source) {
    return margins.margin(end.limit(), source);
  }

  /** Prepares to follow specimens of a solver. */
  void follow(DcSolver solver, double[] point) {
    curve = new StageCurve(model, solver, point);
  }

  /** Follows one specimen, the solver's last point. */
  void read(int sample, DcSolver solver, double[] point, double[] contactShift) {
    if (!curve.take(solver, point, contactShift)) {
      return;
    }
    margins = nominal.on(curve, up.limit() == Limit.KNEE || down.limit() == Limit.KNEE);
    double above = end(up, upSlope);
    double outputDown = at(above);
    double inputUp = Math.abs(curve.input());
    double below = end(down, downSlope);
    double outputUp = at(below);
    double inputDown = Math.abs(curve.input());
    put("positivePeak", sample, inputUp);
    put("negativePeak", sample, inputDown);
    put("outputDown", sample, outputDown);
    put("outputUp", sample, outputUp);
    boolean upFirst = Math.abs(above) <= Math.abs(below);
    double other = at(upFirst ? -above : -below);
    put("inputPeak", sample, upFirst ? inputUp : inputDown);
    double nearer = Math.abs(upFirst ? outputDown : outputUp);
    put("outputPeak", sample, Math.min(nearer, Math.abs(other)));
  }

  private double at(double source) {
    return curve.move(source) ? curve.output(0) : Double.NaN;
  }

  /** Follows a limit from its nominal place, by the secant through the last two points. */
  private double end(SwingEnd from, double slope) {
    if (from.limit() == Limit.NONE || slope == 0) {
      return from.source();
    }
    double x = from.source();
    double at = margin(from, x);
    double rate = slope;
    for (int i = 0; i < STEPS && Math.abs(at / rate) > ACCURACY * Math.abs(x); i++) {
      double next = x - at / rate;
      if (!(Math.signum(next) == Math.signum(from.source()))) {
        return 0;
      }
      double reached = margin(from, next);
      double newRate = (reached - at) / (next - x);
      rate = newRate != 0 && Double.isFinite(newRate) ? newRate : rate;
      x = next;
      at = reached;
    }
    return x;
  }

  private void put(String figure, int sample, double value) {
    figures.computeIfAbsent(figure, f -> empty())[sample] = value;
  }

  private double[] empty() {
    double[] values = new double[samples];
    Arrays.fill(values, Double.NaN);
    return values;
  }

  /** Figures by component name, not-a-number where a specimen was not followed. */
  Map<String, double[]> figures() {
    return figures;
  }
}
