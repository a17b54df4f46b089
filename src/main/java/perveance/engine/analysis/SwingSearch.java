package perveance.engine.analysis;

import java.util.function.DoubleUnaryOperator;
import perveance.engine.analysis.SwingEnd.Sign;

/**
 * Follows the mid-band characteristic outward from idle until the swing stops being clean, by the
 * signs of {@link SwingMargins}.
 */
final class SwingSearch {
  private static final double FIRST_STEP = 0.25;
  private static final double GROWTH = 1.4;
  private static final int MOST_STEPS = 24;
  private static final int REFINEMENTS = 30;
  private static final double ACCURACY = 1e-5;

  private final StageCurve curve;
  private final SwingMargins margins;

  /**
   * Starts at idle.
   *
   * @param curve the characteristic
   * @param composite whether a section may be cut off while others go on
   */
  SwingSearch(StageCurve curve, boolean composite) {
    this.curve = curve;
    this.margins = new SwingMargins(curve, composite);
  }

  SwingMargins margins() {
    return margins;
  }

  /** A stretch of the characteristic, by the source's distance from idle, in which an end lies. */
  private record Stretch(double before, double clean, double next, boolean output, boolean input) {}

  /**
   * Searches one side.
   *
   * @param sign 1 for a rising input, -1 for a falling one
   */
  SwingEnd end(int sign) {
    double step = FIRST_STEP * margins.scaleOfSource();
    double before = 0;
    double clean = 0;
    double output = 0;
    double input = 0;
    for (int i = 0; i < MOST_STEPS; i++) {
      double next = clean + step;
      if (!curve.move(sign * next)) {
        break;
      }
      double reached = curve.output(0);
      double entered = curve.input();
      boolean outputFell = margins.outputFell(reached - output, entered - input);
      boolean inputFell = margins.inputFell(entered - input, sign * step);
      if (margins.gridRoom() <= 0 || margins.cutOffRoom() <= 0 || outputFell || inputFell) {
        SwingEnd end = nearest(sign, new Stretch(before, clean, next, outputFell, inputFell));
        if (end.sign() != Sign.NONE) {
          return end;
        }
        curve.move(sign * next);
      }
      before = clean;
      clean = next;
      output = reached;
      input = entered;
      step *= GROWTH;
    }
    return at(sign * clean, Sign.NONE);
  }

  /** Which of the ends in a stretch comes first. */
  private SwingEnd nearest(int sign, Stretch stretch) {
    curve.move(sign * stretch.next());
    boolean grid = margins.gridRoom() <= 0;
    boolean cutOff = margins.cutOffRoom() <= 0;
    double end = Double.POSITIVE_INFINITY;
    Sign first = Sign.NONE;
    for (Sign candidate : Sign.values()) {
      double from =
          switch (candidate) {
            case GRID -> grid ? stretch.clean() : Double.NaN;
            case CUT_OFF -> cutOff ? stretch.clean() : Double.NaN;
            case OUTPUT -> stretch.output() ? stretch.before() : Double.NaN;
            case INPUT -> stretch.input() ? stretch.before() : Double.NaN;
            case NONE -> Double.NaN;
          };
      if (!Double.isNaN(from)) {
        double at = zero(from, stretch.next(), x -> margins.margin(candidate, sign * x));
        // near cut-off the gain falls by that, and cut-off is what ends the swing
        boolean counts = candidate != Sign.OUTPUT || (curve.move(sign * at) && margins.whole());
        first = counts && at < end ? candidate : first;
        end = counts ? Math.min(at, end) : end;
      }
    }
    return at(first == Sign.NONE ? 0 : sign * end, first);
  }

  /** Where a margin falls through zero: false position, Illinois variant. */
  private static double zero(double from, double to, DoubleUnaryOperator margin) {
    double low = from;
    double high = to;
    double atLow = margin.applyAsDouble(low);
    double atHigh = margin.applyAsDouble(high);
    if (!(atLow > 0)) {
      return low;
    }
    int side = 0;
    for (int i = 0; i < REFINEMENTS && high - low > ACCURACY * high; i++) {
      double x = atHigh < 0 ? low + (high - low) * atLow / (atLow - atHigh) : high;
      double at = margin.applyAsDouble(x);
      if (Math.abs(at) < 1e-7) {
        return x;
      } else if (at > 0) {
        low = x;
        atLow = at;
        atHigh = side > 0 ? atHigh / 2 : atHigh;
        side = 1;
      } else {
        high = x;
        atHigh = at;
        atLow = side < 0 ? atLow / 2 : atLow;
        side = -1;
      }
    }
    return low;
  }

  private SwingEnd at(double source, Sign sign) {
    curve.move(source);
    SwingCause cause = SwingCause.of(curve, margins, sign);
    return new SwingEnd(source, curve.input(), curve.output(0), sign, cause.limit(), cause.at());
  }
}
