package perveance.engine.device.geometry;

/**
 * Two electrodes with space charge between them: current, and the field across the gap.
 *
 * <p>What it predicts: the current limited by space charge when the cathode gives more than enough
 * electrons, all starting at rest (C. D. Child, Phys. Rev. 32, 492, 1911; I. Langmuir, Phys. Rev.
 * 2, 450, 1913),
 *
 * <pre>{@code I = G V^(3/2)}</pre>
 *
 * <p>Range: voltages well above the thermal voltage and currents below the cathode's emission
 * ({@link Emitter}); for small voltages see {@link InitialVelocities}. Voltages must be above zero.
 */
public sealed interface DiodeGeometry permits PlaneDiode, CylinderDiode {
  /**
   * Current for one volt.
   *
   * @return G [A V^-1.5]
   */
  double perveance();

  /**
   * Distance between the electrodes.
   *
   * @return gap [m]
   */
  double gap();

  /**
   * Surface that emits.
   *
   * @return cathode area [m^2]
   */
  double cathodeArea();

  /**
   * State at a place in the gap.
   *
   * @param distance from the cathode, above 0, at most the gap [m]
   * @param voltage of the anode, above 0 [V]
   * @return potential, field, charge and speed there
   */
  GapPoint at(double distance, double voltage);

  /**
   * Space-charge-limited current.
   *
   * @param voltage of the anode, zero or more [V]
   * @return current [A]
   */
  default double current(double voltage) {
    if (!(voltage >= 0)) {
      throw new IllegalArgumentException("voltage must be 0 or more, found " + voltage);
    }
    return perveance() * voltage * Math.sqrt(voltage);
  }

  /**
   * Voltage over current.
   *
   * @param voltage of the anode, above 0 [V]
   * @return effective resistance [ohm]
   */
  default double effectiveResistance(double voltage) {
    return Dimension.positive("voltage", voltage) / current(voltage);
  }

  /**
   * Change of voltage over change of current, two thirds of the effective resistance.
   *
   * @param voltage of the anode, above 0 [V]
   * @return slope resistance [ohm]
   */
  default double slopeResistance(double voltage) {
    return 2.0 / 3.0 * effectiveResistance(voltage);
  }
}
