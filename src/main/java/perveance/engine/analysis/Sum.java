package perveance.engine.analysis;

import perveance.engine.base.QuantityFormat;
import perveance.engine.base.Unit;

/** Prints the numbers of hand sums. */
final class Sum {
  private static final QuantityFormat FORMAT = QuantityFormat.TYPESET;

  private Sum() {}

  static String volts(double value) {
    return FORMAT.reading(value, Unit.VOLT, 3);
  }

  static String amperes(double value) {
    return FORMAT.reading(value, Unit.AMPERE, 3);
  }

  static String ohms(double value) {
    return FORMAT.reading(value, Unit.OHM, 3);
  }

  static String farads(double value) {
    return FORMAT.reading(value, Unit.FARAD, 3);
  }

  static String hertz(double value) {
    return FORMAT.reading(value, Unit.HERTZ, 3);
  }

  static String watts(double value) {
    return FORMAT.reading(value, Unit.WATT, 3);
  }

  static String siemens(double value) {
    return FORMAT.reading(value, Unit.SIEMENS, 3);
  }

  static String plain(double value) {
    return FORMAT.reading(value, Unit.RATIO, 3);
  }

  static String percent(double ratio) {
    return FORMAT.percent(ratio, 2);
  }
}
