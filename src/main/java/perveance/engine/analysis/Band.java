package perveance.engine.analysis;

import java.util.List;
import java.util.Optional;

/**
 * A 95 % band and where it comes from.
 *
 * @param low 2.5 % quantile, in the unit of the figure [1]
 * @param high 97.5 % quantile, in the unit of the figure [1]
 * @param shares share of the variance by cause, largest first
 * @param histogram how the samples lie, empty where all are alike or none were drawn
 */
public record Band(double low, double high, List<Share> shares, Optional<Histogram> histogram) {
  /** Copies the list. */
  public Band {
    shares = List.copyOf(shares);
  }

  /**
   * A band that does not come from samples.
   *
   * @param low lower end, in the unit of the figure [1]
   * @param high upper end, in the unit of the figure [1]
   * @param shares share of the variance by cause, largest first
   */
  public Band(double low, double high, List<Share> shares) {
    this(low, high, shares, Optional.empty());
  }

  /**
   * One cause.
   *
   * @param cause for example {@code valve conduction} or {@code anode_load}
   * @param fraction of the variance, 0 to 1 [1]
   */
  public record Share(String cause, double fraction) {}
}
