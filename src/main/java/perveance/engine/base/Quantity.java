package perveance.engine.base;

import java.util.Objects;

/**
 * A finite number with its unit, in the unit itself and never in a multiple of it.
 *
 * @param value the number, finite [in the unit]
 * @param unit the unit
 */
public record Quantity(double value, Unit unit) {
  /** Refuses numbers that are not finite. */
  public Quantity {
    Objects.requireNonNull(unit, "unit");
    if (!Double.isFinite(value)) {
      throw new IllegalArgumentException("value is not finite: " + value);
    }
  }
}
