package perveance.engine.numeric;

/**
 * Where a fitted parameter may lie. The fit works on an inner variable that may be any number, so
 * that a parameter can never leave its domain.
 */
public sealed interface ParameterDomain {
  /**
   * Tells whether a value lies inside.
   *
   * @param value the parameter [unit of the parameter]
   * @return true if it lies strictly inside
   */
  boolean contains(double value);

  /**
   * Maps a parameter to the inner variable.
   *
   * @param value the parameter, inside the domain [unit of the parameter]
   * @return the inner variable [1]
   */
  double toInner(double value);

  /**
   * Maps the inner variable to the parameter.
   *
   * @param inner the inner variable [1]
   * @return the parameter [unit of the parameter]
   */
  double toOuter(double inner);

  /**
   * Returns how fast the parameter follows the inner variable.
   *
   * @param inner the inner variable [1]
   * @return the derivative, above 0 or 0 at a bound [unit of the parameter]
   */
  double slope(double inner);

  /**
   * Tells whether the inner variable has run so far out that the parameter stands at a bound.
   *
   * @param inner the inner variable [1]
   * @return true if the bound holds the parameter
   */
  boolean atBound(double inner);

  /**
   * Any number; the inner variable is the parameter in multiples of its scale.
   *
   * @param scale a change of the parameter that matters, above 0 [unit of the parameter]
   */
  record Free(double scale) implements ParameterDomain {
    /** Refuses scales that are no scale. */
    public Free {
      if (!(scale > 0) || Double.isInfinite(scale)) {
        throw new IllegalArgumentException("scale is not above 0 and finite: " + scale);
      }
    }

    @Override
    public boolean contains(double value) {
      return Double.isFinite(value);
    }

    @Override
    public double toInner(double value) {
      return value / scale;
    }

    @Override
    public double toOuter(double inner) {
      return inner * scale;
    }

    @Override
    public double slope(double inner) {
      return scale;
    }

    @Override
    public boolean atBound(double inner) {
      return false;
    }
  }

  /** Above zero; the inner variable is the logarithm. */
  record Positive() implements ParameterDomain {
    @Override
    public boolean contains(double value) {
      return value > 0 && Double.isFinite(value);
    }

    @Override
    public double toInner(double value) {
      return Math.log(value);
    }

    @Override
    public double toOuter(double inner) {
      return Math.exp(inner);
    }

    @Override
    public double slope(double inner) {
      return Math.exp(inner);
    }

    @Override
    public boolean atBound(double inner) {
      return false;
    }
  }

  /**
   * Between two bounds; the inner variable is the logit, ln((p - low) / (high - p)).
   *
   * @param low the lower bound, finite [unit of the parameter]
   * @param high the upper bound, above low, finite [unit of the parameter]
   */
  record Between(double low, double high) implements ParameterDomain {
    /** Nearer to a bound than this share of the range counts as at the bound. */
    private static final double BOUND_SHARE = 1e-6;

    /** Refuses empty ranges. */
    public Between {
      if (!(low < high) || !Double.isFinite(high - low)) {
        throw new IllegalArgumentException("low is not below high: " + low + ", " + high);
      }
    }

    @Override
    public boolean contains(double value) {
      return value > low && value < high;
    }

    @Override
    public double toInner(double value) {
      return Math.log((value - low) / (high - value));
    }

    @Override
    public double toOuter(double inner) {
      return low + (high - low) * share(inner);
    }

    @Override
    public double slope(double inner) {
      return (high - low) * share(inner) * share(-inner);
    }

    @Override
    public boolean atBound(double inner) {
      return Math.min(share(inner), share(-inner)) < BOUND_SHARE;
    }

    private static double share(double inner) {
      return 1.0 / (1.0 + Math.exp(-inner));
    }
  }
}
