package perveance.engine.base;

import java.util.List;

/** The decimal prefixes the trade uses, with every spelling that is read. */
enum SiPrefix {
  PICO(-12, "p", "pico"),
  NANO(-9, "n", "nano"),
  // the micro sign U+00B5 and the Greek letter U+03BC look alike and are both typed
  MICRO(-6, "u", "\u00b5", "\u03bc", "micro"),
  MILLI(-3, "m", "milli"),
  CENTI(-2, "c", "centi"),
  NONE(0, ""),
  KILO(3, "k", "K", "kilo"),
  MEGA(6, "M", "meg", "Meg", "MEG", "mega"),
  GIGA(9, "G", "giga");

  private final int exponent;
  private final List<String> spellings;

  SiPrefix(int exponent, String... spellings) {
    this.exponent = exponent;
    this.spellings = List.of(spellings);
  }

  /** The power of ten. */
  int exponent() {
    return exponent;
  }

  /** The spelling in ASCII. */
  String plain() {
    return spellings.get(0);
  }

  /** The spelling in print. */
  String typeset() {
    return this == MICRO ? "\u00b5" : plain();
  }

  /** Every spelling that is read, the usual one first. */
  List<String> spellings() {
    return spellings;
  }

  /** Whether a unit takes this prefix at all. */
  boolean suits(Unit unit) {
    return switch (unit) {
      case RATIO, DECIBEL, KELVIN -> this == NONE;
      case METRE -> true;
      default -> this != CENTI;
    };
  }
}
