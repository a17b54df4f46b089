package perveance.engine.analysis;

import perveance.engine.base.QuantityFormat;
import perveance.engine.base.Unit;

/** Prints figures in sentences: three figures, percentages and decibels to two. */
final class Words {
  private static final QuantityFormat FORMAT = QuantityFormat.TYPESET;

  private Words() {}

  static String of(double value, Unit unit) {
    return FORMAT.reading(value, unit, 3);
  }

  static String roughly(double value, Unit unit) {
    return FORMAT.reading(value, unit, 2);
  }

  static String part(double value, Unit unit) {
    return FORMAT.part(value, unit, 3);
  }

  static String percent(double ratio) {
    return FORMAT.percent(ratio, 2);
  }

  static String level(double decibels) {
    return FORMAT.level(decibels, 1);
  }

  /** A node or element as a person would say it. */
  static String place(String name) {
    return name.replace('.', ' ');
  }

  /** The start of a sentence. */
  static String start(String text) {
    return text.substring(0, 1).toUpperCase(java.util.Locale.ROOT) + text.substring(1);
  }

  /** A time as a person would say it. */
  static String time(double seconds) {
    if (seconds < 120) {
      return roughly(seconds, Unit.SECOND);
    }
    return seconds < 7200 ? Math.round(seconds / 60) + " min" : Math.round(seconds / 3600) + " h";
  }
}
