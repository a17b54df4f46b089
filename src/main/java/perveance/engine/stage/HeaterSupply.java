package perveance.engine.stage;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.device.Heater;

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

  /** A heater rated within this of the winding's voltage is taken to hang on it [1]. */
  private static final double SAME = 0.2;

  /**
   * The way of wiring a heater that suits the winding.
   *
   * @param ways the ways in which a type's heater can be wired
   * @return the nearest in voltage; empty where none hangs on this winding
   */
  public Optional<Heater> suited(List<Heater> ways) {
    return ways.stream()
        .filter(way -> Math.abs(way.voltage() / voltage - 1) <= SAME)
        .min(Comparator.comparingDouble(way -> Math.abs(way.voltage() / voltage - 1)));
  }
}
