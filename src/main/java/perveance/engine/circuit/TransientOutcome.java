package perveance.engine.circuit;

/** What came of a transient. */
public sealed interface TransientOutcome {
  /**
   * The end was reached.
   *
   * @param solution the course of everything
   * @param steps steps taken
   * @param rejected steps that were too long and taken again
   */
  record Completed(TransientSolution solution, int steps, int rejected)
      implements TransientOutcome {}

  /**
   * It stopped before.
   *
   * @param reason why, in a sentence
   * @param time where it stopped [s]
   * @param soFar the course up to there
   */
  record Stopped(String reason, double time, TransientSolution soFar) implements TransientOutcome {}
}
