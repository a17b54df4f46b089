package perveance.engine.analysis;

/**
 * How much is worked out.
 *
 * @param samples how many specimens of the chassis the bands are drawn from; 0 for no bands
 * @param seed start of the random numbers: the same seed gives the same bands
 * @param levels whether harmonics against level are worked out
 * @param details whether everything beyond operating point, small signal, load line, clean swing
 *     and drive is worked out: parts, readings, hand sums, findings with their remedies
 */
public record AnalysisOptions(int samples, long seed, boolean levels, boolean details) {
  /** Everything, with bands by 1,000 samples. */
  public static final AnalysisOptions FULL = new AnalysisOptions(1000, 1, true, true);

  /** While something is dragged: no bands, no levels, no findings. */
  public static final AnalysisOptions LIVE = new AnalysisOptions(0, 1, false, false);

  /** Refuses a negative number of samples and too few for a 95 % band. */
  public AnalysisOptions {
    if (samples < 0 || (samples > 0 && samples < 40)) {
      throw new IllegalArgumentException("samples is neither 0 nor 40 or more: " + samples);
    }
  }

  /**
   * The same with another number of samples.
   *
   * @param count how many, 0 for no bands
   * @return changed options
   */
  public AnalysisOptions withSamples(int count) {
    return new AnalysisOptions(count, seed, levels, details);
  }
}
