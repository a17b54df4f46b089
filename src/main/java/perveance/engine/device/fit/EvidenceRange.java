package perveance.engine.device.fit;

import java.util.List;
import perveance.engine.device.Evidence;
import perveance.engine.device.Validity;

/**
 * The region in which a law may be trusted on the strength of its evidence.
 *
 * <p>The three-halves law carries a little beyond the outermost points: the ECC83 law, fitted at
 * 100 V and 250 V, meets published stages between 70 V and 230 V at half and at twice the currents
 * of its points. So the region reaches from half the lowest to 1.25 times the highest anode
 * voltage, from half the lowest to twice the highest current, and from 1.25 times the most negative
 * grid voltage to zero. Where cut-off is published, small currents count as covered.
 */
final class EvidenceRange {
  private static final double LOW = 0.5;
  private static final double HIGH_VOLTAGE = 1.25;
  private static final double HIGH_CURRENT = 2;

  private EvidenceRange() {}

  static Validity of(List<Evidence> used) {
    double lowVoltage = Double.POSITIVE_INFINITY;
    double highVoltage = 0;
    double lowCurrent = Double.POSITIVE_INFINITY;
    double highCurrent = 0;
    double lowGrid = 0;
    double highGrid = 0;
    for (Evidence entry : used) {
      if (entry.anodeVoltage() > 0) {
        lowVoltage = Math.min(lowVoltage, entry.anodeVoltage());
        highVoltage = Math.max(highVoltage, entry.anodeVoltage());
      }
      double current = entry.anodeCurrent().orElse(0);
      if (current > 0) {
        lowCurrent = Math.min(lowCurrent, current);
        highCurrent = Math.max(highCurrent, current);
      }
      lowGrid = Math.min(lowGrid, entry.gridVoltage().orElse(0));
      highGrid = Math.max(highGrid, entry.gridVoltage().orElse(0));
    }
    return new Validity(
        LOW * Math.min(lowVoltage, highVoltage),
        HIGH_VOLTAGE * highVoltage,
        LOW * Math.min(lowCurrent, highCurrent),
        HIGH_CURRENT * highCurrent,
        HIGH_VOLTAGE * lowGrid,
        highGrid);
  }
}
