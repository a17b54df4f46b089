package perveance.engine.analysis;

import perveance.engine.base.Unit;
import perveance.engine.device.RatingSystem;

/**
 * How much of one maker's limit is used.
 *
 * @param ref valve section
 * @param what {@code anode voltage}, {@code anode dissipation}, ...
 * @param when {@code idle}, {@code cold start}, {@code drive}
 * @param value in the unit [1]
 * @param limit in the unit [1]
 * @param unit unit of both
 * @param system rating system
 * @param source publication of the limit
 */
public record LimitUse(
    String ref,
    String what,
    String when,
    double value,
    double limit,
    Unit unit,
    RatingSystem system,
    String source) {
  /**
   * Share of the limit.
   *
   * @return value over limit [1]
   */
  public double share() {
    return value / limit;
  }
}
