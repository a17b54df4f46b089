package perveance.engine.stage;

import java.util.Locale;
import java.util.Optional;
import perveance.engine.circuit.JunctionLaw;
import perveance.engine.stage.Drawing.SymbolType;

/**
 * The kinds of diode that hold a cathode at a voltage. Each turns a stated voltage at a working
 * current into a junction law, so that its resistance for signals (emission voltage over current)
 * is right too.
 */
enum BiasDiode {
  /**
   * Silicon junctions in series, each near 0.65 V. Emission coefficient 1.8, between diffusion (1)
   * and recombination (2): Sah, Noyce and Shockley, Proc. IRE 45, 1228 (1957).
   */
  SILICON("diode", "silicon junctions", SymbolType.DIODE),
  /** Light-emitting diode; recombination, emission coefficient 2 (same source). */
  LED("LED", "a light-emitting diode", SymbolType.LED),
  /** Zener or avalanche diode, conducting backwards. */
  ZENER("zener", "a zener diode", SymbolType.ZENER);

  /** Thermal voltage at 300 K [V]. */
  private static final double THERMAL = 0.02585;

  private static final double SILICON_DROP = 0.65;
  private static final double SILICON_COEFFICIENT = 1.8;
  private static final double LED_COEFFICIENT = 2.0;

  /** Above this a stated voltage is more than silicon pairs usually give [V]. */
  private static final double LED_FROM = 1.45;

  /** Above this it is more than a light-emitting diode gives [V]. */
  private static final double ZENER_FROM = 4.0;

  /** Below this zeners are soft [V]. */
  private static final double SOFT_BELOW = 5.1;

  private final String word;
  private final String inWords;
  private final SymbolType symbol;

  BiasDiode(String word, String inWords, SymbolType symbol) {
    this.word = word;
    this.inWords = inWords;
    this.symbol = symbol;
  }

  /** The kind that a stage names, or the usual one for a voltage. */
  static BiasDiode choose(double voltage, Optional<String> stated) {
    if (stated.isPresent()) {
      return valueOf(stated.get().toUpperCase(Locale.ROOT));
    }
    if (voltage < LED_FROM) {
      return SILICON;
    }
    return voltage < ZENER_FROM ? LED : ZENER;
  }

  String word() {
    return word;
  }

  String inWords() {
    return inWords;
  }

  SymbolType symbol() {
    return symbol;
  }

  /**
   * The law that has the voltage at the current.
   *
   * @param voltage stated [V]
   * @param current at which it holds, above zero [A]
   * @return the law
   */
  JunctionLaw law(double voltage, double current) {
    double junctions = Math.max(1, Math.rint(voltage / SILICON_DROP));
    return switch (this) {
      case SILICON -> forward(voltage, current, junctions * SILICON_COEFFICIENT, junctions * 0.5);
      case LED -> forward(voltage, current, LED_COEFFICIENT, 2);
      case ZENER ->
          new JunctionLaw(
              word, 1e-14, SILICON_COEFFICIENT * THERMAL, 1, voltage, slope(voltage), current);
    };
  }

  /** A forward law with a bulk resistance of an order usual for small diodes [ohm]. */
  private JunctionLaw forward(
      double voltage, double current, double coefficient, double resistance) {
    double emission = coefficient * THERMAL;
    double junction = Math.max(0.5 * voltage, voltage - current * resistance);
    double series = (voltage - junction) / current;
    double saturation = Math.max(Double.MIN_NORMAL, current / Math.expm1(junction / emission));
    return new JunctionLaw(
        word, saturation, emission, series, Double.POSITIVE_INFINITY, emission, current);
  }

  /**
   * Slope voltage (resistance times current) in the order of small zeners' data sheets: 0.4 V for
   * the soft ones below 5.1 V, 60 mV near 6 V, 0.6 % of the voltage higher up.
   */
  private static double slope(double voltage) {
    return voltage < SOFT_BELOW ? 0.4 : Math.max(0.06, 0.006 * voltage);
  }
}
