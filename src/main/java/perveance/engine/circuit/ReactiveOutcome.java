package perveance.engine.circuit;

/** What came of the search for a periodic state at a stated frequency. */
public sealed interface ReactiveOutcome {
  /**
   * A cycle that repeats itself.
   *
   * @param solution the cycle
   * @param iterations Newton iterations, all levels together
   */
  record Converged(ReactiveSolution solution, int iterations) implements ReactiveOutcome {}

  /**
   * No cycle was found.
   *
   * @param reason why, in a sentence
   * @param peak drive that was asked for [V] or [A]
   * @param reached highest drive below it that was solved on the way [V] or [A]
   */
  record NotConverged(String reason, double peak, double reached) implements ReactiveOutcome {}
}
