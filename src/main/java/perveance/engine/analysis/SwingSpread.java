package perveance.engine.analysis;

import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.Map;
import perveance.engine.analysis.SwingEnd.Sign;
import perveance.engine.circuit.DcSolver;

/**
 * The clean swing over specimens: starts from where the nominal stage ends each way and follows the
 * same sign to where the specimen meets it, or to where its grid current or cut-off comes earlier.
 * One specimen in four is followed, since a swing costs as much as all the rest.
 */
final class SwingSpread {
  /** One specimen in so many is followed. */
  static final int STRIDE = 4;

  private static final int STEPS = 8;
  private static final double ACCURACY = 2e-3;

  /** A step of the search goes no further than by this factor, either way [1]. */
  private static final double FURTHEST = 1.6;

  private final StageModel model;
  private final int samples;
  private final SwingMargins nominal;
  private final SwingEnd up;
  private final SwingEnd down;
  private final boolean slopes;
  private final Map<String, double[]> figures = new LinkedHashMap<>();
  private StageCurve curve;
  private SwingMargins margins;

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
    SwingSearch search = new SwingSearch(curve, composite);
    this.nominal = search.margins();
    this.margins = nominal;
    this.up = search.end(curve.sense());
    this.down = search.end(-curve.sense());
    this.slopes = bySlope(up.sign()) || bySlope(down.sign());
  }

  private static boolean bySlope(Sign sign) {
    return sign == Sign.OUTPUT || sign == Sign.INPUT;
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
    margins = nominal.on(curve, slopes);
    double above = end(up);
    double outputDown = at(above);
    double inputUp = Math.abs(curve.input());
    double below = end(down);
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

  /** Where a specimen ends: by the nominal sign, or by one that comes earlier. */
  private double end(SwingEnd from) {
    if (from.sign() == Sign.NONE || from.source() == 0) {
      return from.source();
    }
    double x = cross(from.sign(), from.source());
    if (bySlope(from.sign()) && curve.move(x)) {
      x = margins.gridRoom() < 0 ? cross(Sign.GRID, x) : x;
      x = margins.cutOffRoom() < 0 ? cross(Sign.CUT_OFF, x) : x;
    }
    return x;
  }

  /**
   * Where a margin falls through zero, by false position. It is positive at idle; where it is not,
   * the specimen has no clean swing that way.
   */
  private double cross(Sign sign, double start) {
    double inside = 0;
    double marginInside = margins.margin(sign, 0);
    if (!(marginInside > 0)) {
      return 0;
    }
    double outside = Double.NaN;
    double marginOutside = Double.NaN;
    double x = start;
    for (int i = 0; i < STEPS; i++) {
      double reached = margins.margin(sign, x);
      if (reached > 0) {
        double rate = (reached - marginInside) / (x - inside);
        boolean open = Double.isNaN(outside);
        inside = x;
        marginInside = reached;
        x = open ? outward(x, reached, rate) : between(inside, reached, outside, marginOutside);
      } else {
        outside = x;
        marginOutside = reached;
        x = between(inside, marginInside, outside, reached);
      }
      if (Math.abs(x - inside) < ACCURACY * Math.abs(x)
          || Math.abs(x - outside) < ACCURACY * Math.abs(x)) {
        break;
      }
    }
    return x;
  }

  private static double outward(double x, double margin, double rate) {
    double next = x - margin / rate;
    boolean further = next / x > 1;
    return further ? Math.min(next / x, FURTHEST) * x : FURTHEST * x;
  }

  private static double between(double a, double atA, double b, double atB) {
    double share = atA / (atA - atB);
    return a + Math.max(0.02, Math.min(0.98, share)) * (b - a);
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
