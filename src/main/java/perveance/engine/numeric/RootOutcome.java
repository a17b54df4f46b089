package perveance.engine.numeric;

/** What came of the search for a root. */
public sealed interface RootOutcome {
  /**
   * A root was found.
   *
   * @param x where the function crosses zero [unit of the argument]
   * @param residual the function's value there [unit of the function]
   * @param iterations how many times the function was evaluated
   */
  record Found(double x, double residual, int iterations) implements RootOutcome {}

  /**
   * No root was found.
   *
   * @param reason why, in words
   * @param lastPoint the last argument tried [unit of the argument]
   */
  record NotFound(String reason, double lastPoint) implements RootOutcome {}
}
