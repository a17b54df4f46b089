package perveance.engine.analysis;

import perveance.engine.numeric.SeededNormal;

/**
 * Normal deviates for the causes of spread, stratified: each cause takes every one of the samples'
 * equally likely slices once, in a random order of its own (Latin hypercube: M. D. McKay, R. J.
 * Beckman and W. J. Conover, Technometrics 21, 239, 1979). A band then needs far fewer samples than
 * with independent draws, and no cause is off centre by chance.
 */
final class SampleDraws {
  private final int samples;
  private final double[] deviate;

  /**
   * Draws all deviates.
   *
   * @param seed start of the random numbers
   * @param samples number of specimens
   * @param causes number of independent causes
   */
  SampleDraws(long seed, int samples, int causes) {
    this.samples = samples;
    this.deviate = new double[samples * causes];
    double[] slice = new double[samples];
    for (int i = 0; i < samples; i++) {
      slice[i] = SeededNormal.quantile((i + 0.5) / samples);
    }
    for (int cause = 0; cause < causes; cause++) {
      // A stream a cause: an added part leaves the draws of the others as they were.
      shuffleInto(slice, new SeededNormal(seed, cause), cause * samples);
    }
  }

  private SampleDraws(int samples, double[] deviate) {
    this.samples = samples;
    this.deviate = deviate;
  }

  /**
   * One cause at a time: in each sample the cause of its number is one standard deviation up and no
   * other moves; in one sample more nothing does.
   *
   * @param causes number of causes
   */
  static SampleDraws oneByOne(int causes) {
    int samples = causes + 1;
    double[] deviate = new double[samples * causes];
    for (int cause = 0; cause < causes; cause++) {
      deviate[cause * samples + cause] = 1;
    }
    return new SampleDraws(samples, deviate);
  }

  private void shuffleInto(double[] slice, SeededNormal random, int first) {
    for (int i = 0; i < samples; i++) {
      int j = (int) (random.nextUniform() * (i + 1));
      deviate[first + i] = deviate[first + j];
      deviate[first + j] = slice[i];
    }
  }

  /** Deviate of a cause in a sample, in standard deviations. */
  double of(int cause, int sample) {
    return deviate[cause * samples + sample];
  }

  /** Sum over the samples of a cause's deviate times a figure. */
  double product(int cause, double[] figure) {
    int first = cause * samples;
    double sum = 0;
    for (int s = 0; s < samples; s++) {
      sum += deviate[first + s] * figure[s];
    }
    return sum;
  }

  int samples() {
    return samples;
  }
}
