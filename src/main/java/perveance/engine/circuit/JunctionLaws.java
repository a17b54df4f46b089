package perveance.engine.circuit;

/**
 * Laws of usual diodes at 25 degrees, from published values. Specimens differ: forward voltages by
 * 5 %, of light-emitting diodes by 10 %.
 */
public final class JunctionLaws {
  /** kT/e at 25 degrees Celsius [V]. */
  private static final double THERMAL = 0.025693;

  private static final double LED_CURRENT = 10e-3;
  private static final double LED_RESISTANCE = 3;
  private static final double LED_COEFFICIENT = 2;

  /**
   * 1 A silicon rectifier 1N4007. Constants in general use for its simulation (Is 7.03 nA, n 1.808,
   * Rs 34 mohm; common practice); 0.91 V at 1 A, data sheet at most 1.1 V.
   */
  public static final JunctionLaw RECTIFIER_1N4007 =
      forward("1N4007", 7.03e-9, 1.808, 0.0342, 1000);

  /**
   * Small-signal silicon diode 1N4148. Constants in general use for its simulation (Is 2.52 nA, n
   * 1.752, Rs 0.568 ohm; common practice); 0.66 V at 5 mA, data sheet of the selected 1N4448 0.62
   * to 0.72 V.
   */
  public static final JunctionLaw SIGNAL_1N4148 = forward("1N4148", 2.52e-9, 1.752, 0.568, 100);

  /** Red light-emitting diode: 1.7 V at 10 mA with 3 ohm (common practice). */
  public static final JunctionLaw LED_RED = led("red", 1.7);

  /** Yellow light-emitting diode: 2.0 V at 10 mA with 3 ohm (common practice). */
  public static final JunctionLaw LED_YELLOW = led("yellow", 2.0);

  /**
   * Green (gallium phosphide) light-emitting diode: 2.1 V at 10 mA with 3 ohm (common practice).
   */
  public static final JunctionLaw LED_GREEN = led("green", 2.1);

  /** Blue or white light-emitting diode: 3.0 V at 10 mA with 3 ohm (common practice). */
  public static final JunctionLaw LED_BLUE = led("blue", 3.0);

  private JunctionLaws() {}

  /**
   * A zener diode by its data-sheet values, for example 5.1 V, 40 ohm at 5 mA. Half of the
   * differential resistance is taken to be that of the exponential.
   *
   * @param voltage breakdown at the test current, above zero [V]
   * @param testCurrent test current, above zero [A]
   * @param differential differential resistance at the test current, above zero [ohm]
   * @return the law
   */
  public static JunctionLaw zener(double voltage, double testCurrent, double differential) {
    ElementChecks.positive("voltage", voltage);
    ElementChecks.positive("testCurrent", testCurrent);
    ElementChecks.positive("differential", differential);
    JunctionLaw forward = SIGNAL_1N4148;
    return new JunctionLaw(
        "zener",
        forward.saturation(),
        forward.emissionVoltage(),
        0.5 * differential,
        voltage,
        0.5 * differential * testCurrent,
        testCurrent);
  }

  private static JunctionLaw forward(
      String label, double saturation, double coefficient, double series, double breakdown) {
    double emission = coefficient * THERMAL;
    return new JunctionLaw(label, saturation, emission, series, breakdown, emission, 1e-5);
  }

  private static JunctionLaw led(String colour, double voltage) {
    double emission = LED_COEFFICIENT * THERMAL;
    double junction = voltage - LED_CURRENT * LED_RESISTANCE;
    double saturation = LED_CURRENT / Math.expm1(junction / emission);
    return new JunctionLaw(
        colour,
        saturation,
        emission,
        LED_RESISTANCE,
        Double.POSITIVE_INFINITY,
        emission,
        LED_CURRENT);
  }
}
