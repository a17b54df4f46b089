package perveance.engine.device.geometry;

/**
 * A grid of round wires between cathode and anode: its amplification factor, and how far the wires'
 * own pattern reaches the cathode.
 *
 * <p>F. B. Vogdes and F. R. Elder, Phys. Rev. 24, 683, 1924: {@code mu = (R - ln cosh w) / ln coth
 * w}, with w the wire's circumference over the pitch and R = 2 pi dga / a for planes, {@code 2 pi N
 * rg ln(ra / rg)} for cylinders. The thin-wire limit is {@code R / ln(1 / w)}. Range: wires up to a
 * third of the pitch and distances above a pitch; against a boundary-element solution Vogdes and
 * Elder's mu is 1 to 5 % low for cathodes as near as half a pitch.
 */
public sealed interface GridWires permits PlaneGrid, CylinderGrid {
  /**
   * Distance between wires.
   *
   * @return pitch [m]
   */
  double pitch();

  /**
   * Radius of the wires.
   *
   * @return radius [m]
   */
  double wireRadius();

  /**
   * R, the anode's distance from the grid in pitches, made fit for the shape.
   *
   * @return reach [1]
   */
  double reach();

  /**
   * Amplification factor by Vogdes and Elder.
   *
   * @return mu [1]
   */
  default double amplificationFactor() {
    double w = 2 * Math.PI * wireRadius() / pitch();
    return (reach() - Math.log(Math.cosh(w))) / -Math.log(Math.tanh(w));
  }

  /**
   * Amplification factor in the limit of thin wires.
   *
   * @return mu [1]
   */
  default double thinWireFactor() {
    return reach() / -Math.log(2 * Math.PI * wireRadius() / pitch());
  }

  /**
   * Spread of the penetration factor along the cathode that the wires' pattern makes, as the {@code
   * spread} of a device law counts it (sqrt 3 times the standard deviation over the mean).
   *
   * <p>Field at the cathode of thin wires: {@code E = E0 S + (Va / dak)(1 - S)} with {@code S =
   * sinh x / (cosh x - cos(2 pi y / a))}, x = 2 pi dgk / a. The place where E vanishes has the
   * penetration {@code D + (deff / dak)(1 - S) / S}, and {@code (1 - S) / S = (exp(-x) - cos(2 pi y
   * / a)) / sinh x}: a sine of amplitude 1 / sinh x, whose standard deviation is that over sqrt 2.
   * With deff = F dgk, F the loading factor of the equivalent diode, the spread is {@code sqrt(3/2)
   * mu (deff / dak) / sinh x}. Derived here. Uneven winding comes on top.
   *
   * @param cathodeToGrid dgk, above 0 [m]
   * @param cathodeToAnode dak [m]
   * @param loadingFactor F [1]
   * @return spread, at most 1 [1]
   */
  default double spread(double cathodeToGrid, double cathodeToAnode, double loadingFactor) {
    double q = cathodeToGrid / pitch();
    double effective = loadingFactor * cathodeToGrid / cathodeToAnode;
    double amplitude = amplificationFactor() * effective / Math.sinh(2 * Math.PI * q);
    return Math.min(1, Math.sqrt(1.5) * amplitude);
  }
}
