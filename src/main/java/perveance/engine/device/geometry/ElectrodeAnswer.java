package perveance.engine.device.geometry;

import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What dimensions tell of a diode or a triode at one point.
 *
 * @param design the electrodes
 * @param triode constants and working point of a triode; empty for a diode
 * @param working the diode whose space charge decides: the design's own, or of a triode the one
 *     from the cathode to the grid's place
 * @param workingVoltage its voltage; of a triode that of the equivalent diode, zero or below when
 *     it is cut off [V]
 * @param current of the cathode, limited by space charge and by emission alone [A]
 * @param currentDensity at the cathode [A m^-2]
 * @param emission the most current density that the cathode gives [A m^-2]
 * @param thermal the state with initial velocities of a plane gap; empty for cylinders, where no
 *     current flows and where the cathode is saturated
 * @param profile the gap from place to place; empty where no current flows
 */
public record ElectrodeAnswer(
    ElectrodeDesign design,
    Optional<GeometryReport> triode,
    DiodeGeometry working,
    double workingVoltage,
    double current,
    double currentDensity,
    double emission,
    Optional<ThermalDiode.State> thermal,
    Optional<GapProfile> profile) {
  private static final int PLACES = 200;

  /**
   * Works a design out.
   *
   * @param design electrodes, voltages and cathode
   * @return the answer
   */
  public static ElectrodeAnswer of(ElectrodeDesign design) {
    Optional<GeometryReport> triode =
        design.triode().map(t -> t.report(design.anodeVoltage(), design.gridVoltage()));
    DiodeGeometry working =
        design.triode().map(TriodeGeometry::cathodeToGrid).orElse(design.diode());
    double voltage = triode.map(GeometryReport::effectiveVoltage).orElse(design.anodeVoltage());
    double emission = design.emitter().currentDensity(design.temperature());
    double limited = voltage > 0 ? working.current(voltage) : 0;
    double current = Math.min(limited, emission * working.cathodeArea());
    return new ElectrodeAnswer(
        design,
        triode,
        working,
        voltage,
        current,
        current / working.cathodeArea(),
        emission,
        thermal(design, working, voltage, emission),
        voltage > 0 ? Optional.of(GapProfile.across(working, voltage, PLACES)) : Optional.empty());
  }

  private static Optional<ThermalDiode.State> thermal(
      ElectrodeDesign design, DiodeGeometry working, double voltage, double emission) {
    return working instanceof PlaneDiode plane && voltage > 0
        ? new ThermalDiode(plane.gap(), design.temperature(), emission).atVoltage(voltage)
        : Optional.empty();
  }

  /**
   * Whether the cathode's emission ends the current before space charge does.
   *
   * @return true when the cathode is saturated
   */
  public boolean saturated() {
    return workingVoltage > 0 && working.current(workingVoltage) > emission * working.cathodeArea();
  }

  /**
   * Perveance of the device law: of a diode its own, of a triode that of grid and anode together.
   *
   * @return G [A V^-1.5]
   */
  public double perveance() {
    return triode.map(GeometryReport::perveance).orElse(design.diode().perveance());
  }

  /**
   * Voltage over current of a diode.
   *
   * @return effective resistance; empty for a triode and where emission decides [ohm]
   */
  public OptionalDouble effectiveResistance() {
    return triode.isPresent() || saturated()
        ? OptionalDouble.empty()
        : OptionalDouble.of(working.effectiveResistance(workingVoltage));
  }

  /**
   * Change of anode voltage over change of current.
   *
   * @return slope resistance, of a triode its anode resistance; empty where no current follows the
   *     voltage [ohm]
   */
  public OptionalDouble slopeResistance() {
    if (saturated() || !(workingVoltage > 0)) {
      return OptionalDouble.empty();
    }
    return OptionalDouble.of(
        triode
            .map(GeometryReport::anodeResistance)
            .orElseGet(() -> working.slopeResistance(workingVoltage)));
  }
}
