package perveance.engine.numeric;

import java.util.Arrays;

/**
 * A curve through tabulated points, of piecewise third degree: either monotonic wherever the points
 * are, or smooth to the second derivative. Beyond the first and the last point the curve is not
 * continued; {@link #covers} tells where it stands.
 */
public final class Interpolation {
  private final double[] x;
  private final double[] y;
  private final double[] slope;

  private Interpolation(double[] x, double[] y, double[] slope) {
    this.x = x;
    this.y = y;
    this.slope = slope;
  }

  /**
   * Makes the curve that rises and falls only where the points do (F. N. Fritsch and J. Butland,
   * SIAM J. Sci. Stat. Comput. 5, 300, 1984: weighted harmonic means of the neighbouring chords).
   *
   * @param x two or more finite places, strictly ascending [unit of the argument]
   * @param y a finite value at each [unit of the value]
   * @return the curve
   */
  public static Interpolation monotone(double[] x, double[] y) {
    requireTable(x, y);
    int last = x.length - 1;
    double[] slope = new double[x.length];
    if (last == 1) {
      Arrays.fill(slope, chord(x, y, 0));
      return new Interpolation(x.clone(), y.clone(), slope);
    }
    for (int i = 1; i < last; i++) {
      double before = chord(x, y, i - 1);
      double after = chord(x, y, i);
      if (before * after > 0) {
        double weightBefore = 2 * (x[i + 1] - x[i]) + (x[i] - x[i - 1]);
        double weightAfter = (x[i + 1] - x[i]) + 2 * (x[i] - x[i - 1]);
        slope[i] = (weightBefore + weightAfter) / (weightBefore / before + weightAfter / after);
      }
    }
    slope[0] = endSlope(x[1] - x[0], x[2] - x[1], chord(x, y, 0), chord(x, y, 1));
    slope[last] =
        endSlope(
            x[last] - x[last - 1],
            x[last - 1] - x[last - 2],
            chord(x, y, last - 1),
            chord(x, y, last - 2));
    return new Interpolation(x.clone(), y.clone(), slope);
  }

  /**
   * Makes the natural cubic spline: smooth to the second derivative, which is zero at both ends (C.
   * de Boor, A Practical Guide to Splines, 1978, chapter IV). It may swing beyond the points.
   *
   * @param x two or more finite places, strictly ascending [unit of the argument]
   * @param y a finite value at each [unit of the value]
   * @return the curve
   */
  public static Interpolation spline(double[] x, double[] y) {
    requireTable(x, y);
    int count = x.length;
    double[] matrix = new double[count * count];
    double[] slope = new double[count];
    matrix[0] = 2;
    matrix[1] = 1;
    slope[0] = 3 * chord(x, y, 0);
    for (int i = 1; i < count - 1; i++) {
      double before = x[i] - x[i - 1];
      double after = x[i + 1] - x[i];
      matrix[i * count + i - 1] = after;
      matrix[i * count + i] = 2 * (before + after);
      matrix[i * count + i + 1] = before;
      slope[i] = 3 * (after * chord(x, y, i - 1) + before * chord(x, y, i));
    }
    matrix[count * count - 2] = 1;
    matrix[count * count - 1] = 2;
    slope[count - 1] = 3 * chord(x, y, count - 2);
    DenseLu lu = new DenseLu(count);
    if (!lu.factor(matrix)) {
      throw new IllegalArgumentException("x is too uneven for a spline");
    }
    lu.solve(slope);
    return new Interpolation(x.clone(), y.clone(), slope);
  }

  /**
   * Tells whether the curve stands at a place.
   *
   * @param at the place [unit of the argument]
   * @return true from the first to the last tabulated place
   */
  public boolean covers(double at) {
    return at >= x[0] && at <= x[x.length - 1];
  }

  /**
   * Returns the curve's value.
   *
   * @param at a place that the curve covers [unit of the argument]
   * @return the value [unit of the value]
   */
  public double value(double at) {
    int i = piece(at);
    double width = x[i + 1] - x[i];
    double t = (at - x[i]) / width;
    double u = 1 - t;
    // Hermite's form, in which each tabulated value comes out exactly
    return y[i] * u * u * (1 + 2 * t)
        + y[i + 1] * t * t * (3 - 2 * t)
        + width * t * u * (slope[i] * u - slope[i + 1] * t);
  }

  /**
   * Returns the curve's slope.
   *
   * @param at a place that the curve covers [unit of the argument]
   * @return the first derivative [unit of the value per unit of the argument]
   */
  public double slope(double at) {
    int i = piece(at);
    double width = x[i + 1] - x[i];
    double t = (at - x[i]) / width;
    double u = 1 - t;
    return 6 * t * u * (y[i + 1] - y[i]) / width
        + slope[i] * u * (1 - 3 * t)
        + slope[i + 1] * t * (3 * t - 2);
  }

  private int piece(double at) {
    if (!covers(at)) {
      throw new IllegalArgumentException(
          "at is not between " + x[0] + " and " + x[x.length - 1] + ": " + at);
    }
    int found = Arrays.binarySearch(x, at);
    int below = found >= 0 ? found : -found - 2;
    return Math.min(below, x.length - 2);
  }

  /** Three-point slope at an end, held back where it would leave the points' direction. */
  private static double endSlope(double near, double far, double nearChord, double farChord) {
    double slope = ((2 * near + far) * nearChord - near * farChord) / (near + far);
    if (slope * nearChord <= 0) {
      return 0;
    }
    boolean turns = nearChord * farChord <= 0;
    return turns && Math.abs(slope) > 3 * Math.abs(nearChord) ? 3 * nearChord : slope;
  }

  private static double chord(double[] x, double[] y, int i) {
    return (y[i + 1] - y[i]) / (x[i + 1] - x[i]);
  }

  private static void requireTable(double[] x, double[] y) {
    if (x.length < 2 || x.length != y.length) {
      throw new IllegalArgumentException(
          "x and y have " + x.length + " and " + y.length + " entries");
    }
    for (int i = 0; i < x.length; i++) {
      if (!Double.isFinite(x[i]) || !Double.isFinite(y[i])) {
        throw new IllegalArgumentException("entry " + i + " is not finite: " + x[i] + ", " + y[i]);
      }
      if (i > 0 && !(x[i] > x[i - 1])) {
        throw new IllegalArgumentException("x does not ascend at " + x[i]);
      }
    }
  }
}
