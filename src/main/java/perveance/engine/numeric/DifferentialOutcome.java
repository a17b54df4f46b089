package perveance.engine.numeric;

/** What came of following differential equations. */
public sealed interface DifferentialOutcome {
  /**
   * The end was reached.
   *
   * @param states the state at each point asked for, points x equations [unit of each equation]
   */
  record Reached(double[][] states) implements DifferentialOutcome {
    /** Copies the states. */
    public Reached {
      states = copy(states);
    }

    /**
     * Returns the state at each point asked for.
     *
     * @return a copy, points x equations [unit of each equation]
     */
    @Override
    public double[][] states() {
      return copy(states);
    }

    /**
     * Returns the state at the last point.
     *
     * @return a copy, one entry for each equation [unit of each equation]
     */
    public double[] last() {
      return states[states.length - 1].clone();
    }

    private static double[][] copy(double[][] matrix) {
      double[][] copy = new double[matrix.length][];
      for (int i = 0; i < matrix.length; i++) {
        copy[i] = matrix[i].clone();
      }
      return copy;
    }
  }

  /**
   * The end was not reached.
   *
   * @param reason why, in words
   * @param lastPoint the last point at which the slopes were asked for [unit of the argument]
   */
  record NotReached(String reason, double lastPoint) implements DifferentialOutcome {}
}
