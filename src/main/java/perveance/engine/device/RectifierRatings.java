package perveance.engine.device;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What is published of a rectifier beside its law; the drop itself is evidence of the law.
 *
 * @param limits by filter and voltage, the ones used by default first
 * @param limitingResistances least resistance at each anode by voltage, lowest voltage first
 * @param outputs published operating points
 */
public record RectifierRatings(
    List<RectifierLimit> limits,
    List<LimitingResistance> limitingResistances,
    List<RectifierOutput> outputs) {
  /** Copies the lists and sorts the resistances. */
  public RectifierRatings {
    limits = List.copyOf(limits);
    List<LimitingResistance> byVoltage = new ArrayList<>(limitingResistances);
    byVoltage.sort(new LowestVoltageFirst());
    limitingResistances = List.copyOf(byVoltage);
    outputs = List.copyOf(outputs);
  }

  /**
   * The limits that hold at a voltage: of those for the filter the ones with the least voltage that
   * still covers it, or those without a voltage.
   *
   * @param filter what follows the rectifier
   * @param anodeVoltage transformer voltage at each anode, root mean square [V]
   * @return the limits; empty where none are published or the voltage is above all of them
   */
  public Optional<RectifierLimit> limitAt(RectifierFilter filter, double anodeVoltage) {
    return limits.stream()
        .filter(limit -> limit.filter() == filter)
        .filter(limit -> limit.anodeVoltage().orElse(Double.MAX_VALUE) >= anodeVoltage)
        .min(Comparator.comparingDouble(limit -> limit.anodeVoltage().orElse(Double.MAX_VALUE)));
  }

  /**
   * Least supply resistance at each anode for a reservoir capacitor, between the published voltages
   * by straight lines.
   *
   * @param anodeVoltage transformer voltage at each anode, root mean square [V]
   * @return least resistance [ohm]; below the lowest published voltage that voltage's; empty where
   *     nothing is published or the voltage is above the highest
   */
  public OptionalDouble leastResistance(double anodeVoltage) {
    for (int i = 0; i < limitingResistances.size(); i++) {
      LimitingResistance upper = limitingResistances.get(i);
      if (anodeVoltage <= upper.anodeVoltage()) {
        if (i == 0) {
          return OptionalDouble.of(upper.resistance());
        }
        LimitingResistance lower = limitingResistances.get(i - 1);
        double way = upper.anodeVoltage() - lower.anodeVoltage();
        double part = way > 0 ? (anodeVoltage - lower.anodeVoltage()) / way : 1;
        return OptionalDouble.of(
            lower.resistance() + part * (upper.resistance() - lower.resistance()));
      }
    }
    return OptionalDouble.empty();
  }

  /** Not a lambda: linking the first one costs more than the rest of reading a file. */
  private static final class LowestVoltageFirst implements Comparator<LimitingResistance> {
    @Override
    public int compare(LimitingResistance one, LimitingResistance other) {
      return Double.compare(one.anodeVoltage(), other.anodeVoltage());
    }
  }
}
