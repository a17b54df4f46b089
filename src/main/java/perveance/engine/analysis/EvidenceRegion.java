package perveance.engine.analysis;

import static perveance.engine.device.ElectrodeCurrents.ANODE;
import static perveance.engine.device.ElectrodeCurrents.GRID;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.Unit;
import perveance.engine.circuit.ValvePoint;
import perveance.engine.device.Validity;

/** Tells where an operating point leaves the region that the published evidence covers. */
final class EvidenceRegion {
  /** A point this little outside is still within the reading of a published curve [1]. */
  private static final double READING = 0.02;

  private EvidenceRegion() {}

  /** What lies outside, in words; empty when the point is inside. */
  static Optional<String> outside(Validity region, ValvePoint valve) {
    List<String> words = new ArrayList<>();
    compare(
        words,
        "anode voltage",
        valve.voltage(ANODE),
        region.lowestAnodeVoltage(),
        region.highestAnodeVoltage(),
        Unit.VOLT);
    compare(
        words,
        "anode current",
        valve.current(ANODE),
        region.lowestCurrent(),
        region.highestCurrent(),
        Unit.AMPERE);
    compare(
        words,
        "grid voltage",
        valve.voltage(GRID),
        region.lowestGridVoltage(),
        region.highestGridVoltage(),
        Unit.VOLT);
    return words.isEmpty() ? Optional.empty() : Optional.of(String.join(", ", words));
  }

  private static void compare(
      List<String> words, String what, double value, double low, double high, Unit unit) {
    double slack = READING * Math.max(Math.abs(low), Math.abs(high));
    if (value < low - slack) {
      words.add(what + " " + text(value, unit) + " is below " + text(low, unit));
    } else if (value > high + slack) {
      words.add(what + " " + text(value, unit) + " is above " + text(high, unit));
    }
  }

  private static String text(double value, Unit unit) {
    return QuantityFormat.TYPESET.reading(value, unit, 3);
  }
}
