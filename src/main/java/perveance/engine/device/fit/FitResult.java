package perveance.engine.device.fit;

/** What came of fitting a law. */
public sealed interface FitResult {
  /**
   * The fit stands.
   *
   * @param fit the law with its residuals
   */
  record Fitted(LawFit fit) implements FitResult {}

  /**
   * There is no law.
   *
   * @param reason why, in words
   */
  record NotFitted(String reason) implements FitResult {}
}
