package perveance.engine.device.geometry;

import perveance.engine.base.PhysicalConstants;
import perveance.engine.device.SpreadTriodeParameters;
import perveance.engine.device.fit.GridClass;

/**
 * A triode from its dimensions: the equivalent diode.
 *
 * <p>The grid and the anode act on the cathode like one electrode in the grid's place at {@code Vd
 * = (Vg + Va / mu) / F}, {@code F = 1 + (1/mu) (Ggk / Gak)^(2/3)} (B. D. H. Tellegen 1925; for
 * planes the bracket is {@code (dak / dgk)^(4/3)}), where Ggk and Gak are the perveances of the
 * diodes that cathode and grid, and cathode and anode would make. Then {@code Ik = Ggk Vd^(3/2)},
 * which is the device law with the perveance {@code Ggk / F^(3/2)}. End effects, supports and
 * electrons that land on the grid are left out.
 *
 * @param cathodeToGrid diode with its collector at the grid's wires
 * @param cathodeToAnode diode without the grid
 * @param grid wires between
 */
public record TriodeGeometry(
    DiodeGeometry cathodeToGrid, DiodeGeometry cathodeToAnode, GridWires grid) {
  /** Perveance of a control grid over that of its cathode, a usual value [1]. */
  private static final double USUAL_GRID_SHARE = 0.35;

  /** Spread of an oxide cathode's own potential, a usual value [V]. */
  private static final double USUAL_CATHODE_SPREAD = 0.3;

  /** Checks the order of the electrodes. */
  public TriodeGeometry {
    if (!(cathodeToAnode.gap() > cathodeToGrid.gap())) {
      throw new IllegalArgumentException(
          "the anode must be beyond the grid, found gaps "
              + cathodeToAnode.gap()
              + " and "
              + cathodeToGrid.gap());
    }
  }

  /**
   * A plane triode.
   *
   * @param area of the cathode, above 0 [m^2]
   * @param gap cathode to grid, above 0 [m]
   * @param grid its wires and the distance to the anode
   * @return the geometry
   */
  public static TriodeGeometry plane(double area, double gap, PlaneGrid grid) {
    return new TriodeGeometry(
        new PlaneDiode(area, gap), new PlaneDiode(area, gap + grid.gridToAnode()), grid);
  }

  /**
   * A cylindrical triode with its cathode inside.
   *
   * @param cathodeRadius above 0, below the grid's radius [m]
   * @param length of the cathode, above 0 [m]
   * @param grid its helix and the anode's radius
   * @return the geometry
   */
  public static TriodeGeometry cylinder(double cathodeRadius, double length, CylinderGrid grid) {
    return new TriodeGeometry(
        new CylinderDiode(cathodeRadius, grid.gridRadius(), length),
        new CylinderDiode(cathodeRadius, grid.anodeRadius(), length),
        grid);
  }

  /**
   * F, by how much the anode weakens the grid's rule over the cathode.
   *
   * @param amplificationFactor mu, by formula or measured, above 0 [1]
   * @return loading factor, above 1 [1]
   */
  public double loadingFactor(double amplificationFactor) {
    Dimension.positive("amplificationFactor", amplificationFactor);
    double ratio = cathodeToGrid.perveance() / cathodeToAnode.perveance();
    return 1 + Math.cbrt(ratio * ratio) / amplificationFactor;
  }

  /**
   * Constants and working point with mu by the wires' formula.
   *
   * @param anodeVoltage anode to cathode, above 0 [V]
   * @param gridVoltage grid to cathode [V]
   * @return the report
   */
  public GeometryReport report(double anodeVoltage, double gridVoltage) {
    return report(anodeVoltage, gridVoltage, grid.amplificationFactor());
  }

  /**
   * Constants and working point with a given mu.
   *
   * @param anodeVoltage anode to cathode, above 0 [V]
   * @param gridVoltage grid to cathode [V]
   * @param amplificationFactor mu, above 0 [1]
   * @return the report
   */
  public GeometryReport report(
      double anodeVoltage, double gridVoltage, double amplificationFactor) {
    Dimension.positive("anodeVoltage", anodeVoltage);
    double factor = loadingFactor(amplificationFactor);
    double effective = (gridVoltage + anodeVoltage / amplificationFactor) / factor;
    double diode = cathodeToGrid.perveance();
    double root = Math.sqrt(Math.max(0, effective));
    double slope = 1.5 * diode * root / factor;
    return new GeometryReport(
        diode / (factor * Math.sqrt(factor)),
        amplificationFactor,
        factor,
        grid.spread(cathodeToGrid.gap(), cathodeToAnode.gap(), factor),
        effective,
        diode * root * root * root,
        slope,
        diode * root * root * root / cathodeToGrid.cathodeArea());
  }

  /**
   * Constants of the device law of an oxide cathode, with the usual values of its class for what
   * dimensions do not tell (grid current, unevenness of the cathode; contact potential 0).
   *
   * @param cathodeTemperature for the tails of the currents [K]
   * @return constants for the triode law
   */
  public SpreadTriodeParameters law(double cathodeTemperature) {
    GeometryReport constants = report(1, 0);
    GridClass usual = GridClass.of(false, constants.amplificationFactor());
    return new SpreadTriodeParameters(
        constants.perveance(),
        0,
        1 / constants.amplificationFactor(),
        constants.spread(),
        USUAL_CATHODE_SPREAD,
        usual.turnBack(),
        USUAL_GRID_SHARE * constants.perveance(),
        usual.gridOnset(),
        PhysicalConstants.thermalVoltage(cathodeTemperature));
  }
}
