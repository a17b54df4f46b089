package perveance.engine.stage;

import java.util.OptionalDouble;

/**
 * What the parts of a supply node are rated for, where the file states it.
 *
 * @param reservoirVoltage rated voltage of the reservoir [V]
 * @param dropperPower rated power of the dropper [W]
 * @param bleederPower rated power of the bleeder [W]
 */
public record SupplyRatings(
    OptionalDouble reservoirVoltage, OptionalDouble dropperPower, OptionalDouble bleederPower) {
  /** Nothing stated. */
  public static final SupplyRatings NONE =
      new SupplyRatings(OptionalDouble.empty(), OptionalDouble.empty(), OptionalDouble.empty());
}
