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
   * Spread of the penetration factor along the cathode that the wires' pattern makes, relative half
   * width for the {@code spread} of a device law.
   *
   * <p>Field at the cathode of thin wires: {@code E = E0 S + (Va / dak)(1 - S)} with S from tanh(pi
   * q) under a wire's gap to coth(pi q), q = dgk / a. The place where E vanishes has the
   * penetration {@code D + (deff / dak)(1 - S) / S}; its half width over D is {@code mu (deff /
   * dak) / sinh(2 pi q)}, deff = F dgk with F the loading factor of the equivalent diode. Derived
   * here.
   *
   * @param cathodeToGrid dgk, above 0 [m]
   * @param cathodeToAnode dak [m]
   * @param loadingFactor F [1]
   * @return half width of the spread over its mean, at most 1 [1]
   */
  default double spread(double cathodeToGrid, double cathodeToAnode, double loadingFactor) {
    double q = cathodeToGrid / pitch();
    double effective = loadingFactor * cathodeToGrid / cathodeToAnode;
    return Math.min(1, amplificationFactor() * effective / Math.sinh(2 * Math.PI * q));
  }
}
