package perveance.engine.circuit;

import perveance.engine.base.PhysicalConstants;
import perveance.engine.device.ElectrodeCurrents;

/**
 * Equivalent noise resistance of a valve: the resistor at 290 K that, in series with its grid,
 * makes the noise that its electrons make.
 *
 * <p>Req = Ia / (Ia + Ig2) (2.5 / gm + 20 Ig2 / gm^2), shot noise reduced by space charge and the
 * division of current between anode and screen; for a triode 2.5 / gm. Source: D. O. North, B. J.
 * Thompson, W. A. Harris, RCA Review 4 and 5, 1940-41. Valid for negative grids at audio and radio
 * frequencies below transit-time effects; flicker noise comes on top.
 */
public final class ValveNoise {
  private static final double SHOT = 2.5;
  private static final double PARTITION = 20;

  private ValveNoise() {}

  /**
   * Equivalent noise resistance.
   *
   * @param anodeCurrent Ia, above zero [A]
   * @param screenCurrent Ig2, zero for a triode [A]
   * @param mutualConductance gm, above zero [S]
   * @return Req at 290 K [ohm]
   */
  public static double resistance(
      double anodeCurrent, double screenCurrent, double mutualConductance) {
    ElementChecks.positive("anodeCurrent", anodeCurrent);
    ElementChecks.notNegative("screenCurrent", screenCurrent);
    ElementChecks.positive("mutualConductance", mutualConductance);
    double shot = SHOT / mutualConductance;
    double partition = PARTITION * screenCurrent / (mutualConductance * mutualConductance);
    return anodeCurrent / (anodeCurrent + screenCurrent) * (shot + partition);
  }

  /** Square of the noise voltage in series with the grid, zero for a cut-off valve [V^2/Hz]. */
  static double density(ValvePoint point, double flicker) {
    double anode = point.current(ElectrodeCurrents.ANODE);
    double gm = point.mutualConductance();
    if (!(anode > 0) || !(gm > 0)) {
      return 0;
    }
    double screen = Math.max(0, point.current(ElectrodeCurrents.SCREEN));
    return 4
        * PhysicalConstants.BOLTZMANN
        * PhysicalConstants.STANDARD_NOISE_TEMPERATURE
        * resistance(anode, screen, gm)
        * (1 + flicker);
  }
}
