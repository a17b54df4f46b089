package perveance.engine.device.geometry;

/**
 * What dimensions tell about a triode, and its state at one pair of voltages.
 *
 * @param perveance G of the device law [A V^-1.5]
 * @param amplificationFactor mu [1]
 * @param loadingFactor F of the equivalent diode [1]
 * @param spread of the penetration factor from the wires' pattern, as the device law counts it [1]
 * @param effectiveVoltage of the equivalent diode in the grid's place [V]
 * @param cathodeCurrent space-charge-limited [A]
 * @param mutualConductance gm [S]
 * @param currentDensity at the cathode, to be compared with the emission [A m^-2]
 */
public record GeometryReport(
    double perveance,
    double amplificationFactor,
    double loadingFactor,
    double spread,
    double effectiveVoltage,
    double cathodeCurrent,
    double mutualConductance,
    double currentDensity) {
  /**
   * Anode resistance, mu over gm.
   *
   * @return ra [ohm]; infinite where no current flows
   */
  public double anodeResistance() {
    return amplificationFactor / mutualConductance;
  }

  /**
   * Part of an emitter's ceiling that the working point takes.
   *
   * @param emitter surface of the cathode
   * @param temperature of the cathode [K]
   * @return current density over emission [1]
   */
  public double emissionUse(Emitter emitter, double temperature) {
    return currentDensity / emitter.currentDensity(temperature);
  }
}
