package perveance.engine.stage;

import java.util.OptionalDouble;

/**
 * The winding that feeds the heaters.
 *
 * @param voltage of the winding at nominal mains [V]
 * @param winding current that it is rated for, empty when not stated [A]
 * @param other current of what else hangs on it, pilot lamps for instance [A]
 */
public record HeaterSupply(double voltage, OptionalDouble winding, double other) {
  /** Used where the file is silent: 6.3 V, nothing else on it, rating unknown. */
  public static final HeaterSupply USUAL = new HeaterSupply(6.3, OptionalDouble.empty(), 0);
}
