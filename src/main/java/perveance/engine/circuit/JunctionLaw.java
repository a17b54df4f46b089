package perveance.engine.circuit;

/**
 * Law of a rectifier diode, zener or LED.
 *
 * <p>Predicts the current from the voltage between anode and cathode, at one temperature.
 *
 * <p>Forward I = Is (exp((V - I Rs) / (n VT)) - 1); reverse, added to it, -I with V = -(Vz + nz
 * ln(I / Iz) + (I - Iz) Rs), so that the stated breakdown Vz is met at the test current Iz. Both
 * are solved in closed form by the function w + ln w = y (Lambert's W of exp y).
 *
 * <p>Valid from leakage to the rated current; self-heating is not told. Source: W. Shockley, Bell
 * Syst. Tech. J. 28, 435, 1949, with the series resistance and the exponential breakdown that are
 * common practice in circuit simulation. Beyond the rated current the law goes on as a resistance.
 *
 * @param label type or colour, for reports
 * @param saturation Is, above zero [A]
 * @param emissionVoltage n VT, above zero [V]
 * @param series series resistance Rs, zero allowed [ohm]
 * @param breakdown reverse breakdown Vz, positive; positive infinity for none [V]
 * @param breakdownEmission slope voltage of the breakdown exponential nz, above zero [V]
 * @param breakdownCurrent test current Iz at which the breakdown is stated, above zero [A]
 */
public record JunctionLaw(
    String label,
    double saturation,
    double emissionVoltage,
    double series,
    double breakdown,
    double breakdownEmission,
    double breakdownCurrent) {
  /** An exponential without series resistance goes on straight from here, in emission voltages. */
  private static final double STRAIGHT_FROM = 45.0;

  /** Checks the values. */
  public JunctionLaw {
    ElementChecks.positive("saturation", saturation);
    ElementChecks.positive("emissionVoltage", emissionVoltage);
    ElementChecks.notNegative("series", series);
    if (!(breakdown > 0)) {
      throw new IllegalArgumentException("breakdown is not above zero: " + breakdown);
    }
    ElementChecks.positive("breakdownEmission", breakdownEmission);
    ElementChecks.positive("breakdownCurrent", breakdownCurrent);
  }

  /**
   * Current through the junction.
   *
   * @param voltage anode to cathode [V]
   * @return current from anode to cathode [A]
   */
  public double current(double voltage) {
    return branchCurrent(saturation, emissionVoltage, voltage)
        - saturation
        - reverseCurrent(voltage);
  }

  /**
   * Slope of the current.
   *
   * @param voltage anode to cathode [V]
   * @return dI/dV [S]
   */
  public double conductance(double voltage) {
    double forward = branchCurrent(saturation, emissionVoltage, voltage);
    double slope = branchSlope(saturation, emissionVoltage, forward);
    if (Double.isInfinite(breakdown)) {
      return slope;
    }
    return slope + branchSlope(breakdownCurrent, breakdownEmission, reverseCurrent(voltage));
  }

  private double reverseCurrent(double voltage) {
    if (Double.isInfinite(breakdown)) {
      return 0;
    }
    double drive = -(voltage + breakdown) + breakdownCurrent * series;
    return branchCurrent(breakdownCurrent, breakdownEmission, drive);
  }

  /** Current I of scale exp((V - I Rs) / slope), exact for any V. */
  private double branchCurrent(double scale, double slope, double voltage) {
    double exponent = voltage / slope;
    if (series == 0) {
      return exponent < STRAIGHT_FROM
          ? scale * Math.exp(exponent)
          : scale * Math.exp(STRAIGHT_FROM) * (1 + exponent - STRAIGHT_FROM);
    }
    double ratio = scale * series / slope;
    double y = exponent + Math.log(ratio);
    return y < -30 ? scale * Math.exp(exponent) : slope / series * omega(y);
  }

  private double branchSlope(double scale, double slope, double current) {
    if (series == 0) {
      return Math.min(current, scale * Math.exp(STRAIGHT_FROM)) / slope;
    }
    return current / (slope + current * series);
  }

  /** Wright's omega: w with w + ln w = y, for y of -30 and more, by Newton from a close start. */
  private static double omega(double y) {
    double w = y > 1 ? y - Math.log(y) : Math.exp(y) / (1 + Math.exp(y));
    for (int i = 0; i < 5; i++) {
      w *= (1 + y - Math.log(w)) / (1 + w);
    }
    return w;
  }
}
