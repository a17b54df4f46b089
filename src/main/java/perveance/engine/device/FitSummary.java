package perveance.engine.device;

import java.util.List;

/**
 * How a law was obtained and how well it meets its evidence.
 *
 * @param method one sentence
 * @param medianError median relative error over the evidence used and trusted [1]
 * @param worstError largest relative error over the evidence used and trusted [1]
 * @param standardErrors one standard error of each law parameter, in the order of {@link
 *     DeviceLaw#parameters()}, in that parameter's unit; empty where a parameter was assumed [1]
 * @param assumptions what had to be assumed, may be empty
 */
public record FitSummary(
    String method,
    double medianError,
    double worstError,
    List<Double> standardErrors,
    List<String> assumptions) {
  /** Copies the lists. */
  public FitSummary {
    standardErrors = List.copyOf(standardErrors);
    assumptions = List.copyOf(assumptions);
  }
}
