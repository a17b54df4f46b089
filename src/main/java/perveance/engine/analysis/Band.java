package perveance.engine.analysis;

import java.util.List;

/**
 * A 95 % band and where it comes from.
 *
 * @param low 2.5 % quantile, in the unit of the figure [1]
 * @param high 97.5 % quantile, in the unit of the figure [1]
 * @param shares share of the variance by cause, largest first
 */
public record Band(double low, double high, List<Share> shares) {
  /** Copies the list. */
  public Band {
    shares = List.copyOf(shares);
  }

  /**
   * One cause.
   *
   * @param cause for example {@code valve conduction} or {@code anode_load}
   * @param fraction of the variance, 0 to 1 [1]
   */
  public record Share(String cause, double fraction) {}
}
