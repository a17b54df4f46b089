package perveance.engine.device.geometry;

import java.util.Objects;
import java.util.Optional;

/**
 * Electrodes with the voltages and the cathode that they are tried with.
 *
 * @param title what the design is called
 * @param diode cathode and anode without a grid
 * @param triode the same electrodes with a grid between them; empty for a diode
 * @param anodeVoltage anode to cathode, above 0 [V]
 * @param gridVoltage grid to cathode, of no account without a grid [V]
 * @param emitter surface of the cathode
 * @param temperature of the cathode, above 0 [K]
 */
public record ElectrodeDesign(
    String title,
    DiodeGeometry diode,
    Optional<TriodeGeometry> triode,
    double anodeVoltage,
    double gridVoltage,
    Emitter emitter,
    double temperature) {
  /** Checks the values. */
  public ElectrodeDesign {
    Objects.requireNonNull(title, "title");
    Objects.requireNonNull(diode, "diode");
    Objects.requireNonNull(triode, "triode");
    Objects.requireNonNull(emitter, "emitter");
    Dimension.positive("anodeVoltage", anodeVoltage);
    Dimension.positive("temperature", temperature);
    if (!Double.isFinite(gridVoltage)) {
      throw new IllegalArgumentException("gridVoltage must be finite, found " + gridVoltage);
    }
  }
}
