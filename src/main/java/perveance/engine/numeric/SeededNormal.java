package perveance.engine.numeric;

/**
 * A reproducible stream of normally distributed numbers: the same seed and stream give the same
 * numbers on every machine, whatever ran before. Streams of one seed are independent, so that each
 * sample of a spread can have its own and the work can be shared out in any order.
 *
 * <p>Uniform numbers come from the SplitMix64 generator (G. L. Steele, D. Lea and C. H. Flood,
 * OOPSLA 2014), normal ones from them by the inverse distribution function (M. J. Wichura,
 * algorithm AS 241, Applied Statistics 37, 477, 1988, accurate to about 1e-16).
 */
public final class SeededNormal {
  private static final long GOLDEN_GAMMA = 0x9E3779B97F4A7C15L;
  private static final double UNIT = 0x1.0p-53;

  private static final double[] CENTRE_TOP = {
    3.3871328727963666080, 133.14166789178437745, 1971.5909503065514427, 13731.693765509461125,
    45921.953931549871457, 67265.770927008700853, 33430.575583588128105, 2509.0809287301226727
  };
  private static final double[] CENTRE_BOTTOM = {
    1.0, 42.313330701600911252, 687.18700749205790830, 5394.1960214247511077,
    21213.794301586595867, 39307.895800092710610, 28729.085735721942674, 5226.4952788528545610
  };
  private static final double[] SHOULDER_TOP = {
    1.42343711074968357734, 4.63033784615654529590, 5.76949722146069140550,
    3.64784832476320460504, 1.27045825245236838258, 0.241780725177450611770,
    0.0227238449892691845833, 7.74545014278341407640e-4
  };
  private static final double[] SHOULDER_BOTTOM = {
    1.0,
    2.05319162663775882187,
    1.67638483018380384940,
    0.689767334985100004550,
    0.148103976427480074590,
    0.0151986665636164571966,
    5.47593808499534494600e-4,
    1.05075007164441684324e-9
  };
  private static final double[] TAIL_TOP = {
    6.65790464350110377720, 5.46378491116411436990, 1.78482653991729133580,
    0.296560571828504891230, 0.0265321895265761230930, 1.24266094738807843860e-3,
    2.71155556874348757815e-5, 2.01033439929228813265e-7
  };
  private static final double[] TAIL_BOTTOM = {
    1.0,
    0.599832206555887937690,
    0.136929880922735805310,
    0.0148753612908506148525,
    7.86869131145613259100e-4,
    1.84631831751005468180e-5,
    1.42151175831644588870e-7,
    2.04426310338993978564e-15
  };

  private long state;

  /**
   * Creates a stream.
   *
   * @param seed what makes the whole spread reproducible
   * @param stream which of the seed's streams
   */
  public SeededNormal(long seed, long stream) {
    restart(seed, stream);
  }

  /**
   * Begins another stream without making a new object.
   *
   * @param seed what makes the whole spread reproducible
   * @param stream which of the seed's streams
   */
  public void restart(long seed, long stream) {
    // mixed twice, so that neighbouring seeds and streams do not run along one another
    state = mix(mix(seed + GOLDEN_GAMMA) + stream * GOLDEN_GAMMA);
  }

  /**
   * Draws the next number of the standard normal distribution.
   *
   * @return mean 0, standard deviation 1 [1]
   */
  public double next() {
    return quantile(nextUniform());
  }

  /**
   * Draws the next number of the even distribution.
   *
   * @return strictly between 0 and 1 [1]
   */
  public double nextUniform() {
    state += GOLDEN_GAMMA;
    return ((mix(state) >>> 11) + 0.5) * UNIT;
  }

  private static long mix(long bits) {
    long mixed = (bits ^ (bits >>> 30)) * 0xBF58476D1CE4E5B9L;
    mixed = (mixed ^ (mixed >>> 27)) * 0x94D049BB133111EBL;
    return mixed ^ (mixed >>> 31);
  }

  /**
   * Returns the standard normal number below which a share of the distribution lies.
   *
   * @param probability the share, strictly between 0 and 1 [1]
   * @return the quantile [1]
   */
  public static double quantile(double probability) {
    if (!(probability > 0 && probability < 1)) {
      throw new IllegalArgumentException("probability is not between 0 and 1: " + probability);
    }
    double fromCentre = probability - 0.5;
    if (Math.abs(fromCentre) <= 0.425) {
      double r = 0.180625 - fromCentre * fromCentre;
      return fromCentre * polynomial(CENTRE_TOP, r) / polynomial(CENTRE_BOTTOM, r);
    }
    double tail = fromCentre < 0 ? probability : 1 - probability;
    // the strict logarithm, because the fast one may differ in the last place between machines
    double r = Math.sqrt(-StrictMath.log(tail));
    double size =
        r <= 5
            ? polynomial(SHOULDER_TOP, r - 1.6) / polynomial(SHOULDER_BOTTOM, r - 1.6)
            : polynomial(TAIL_TOP, r - 5) / polynomial(TAIL_BOTTOM, r - 5);
    return fromCentre < 0 ? -size : size;
  }

  private static double polynomial(double[] coefficients, double x) {
    double sum = 0;
    for (int k = coefficients.length - 1; k >= 0; k--) {
      sum = sum * x + coefficients[k];
    }
    return sum;
  }
}
