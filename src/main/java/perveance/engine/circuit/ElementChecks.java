package perveance.engine.circuit;

/** Checks of element values: a wrong one is a mistake of the caller and named as such. */
final class ElementChecks {
  private ElementChecks() {}

  static void named(String name) {
    if (name.isBlank()) {
      throw new IllegalArgumentException("name is blank");
    }
  }

  static void positive(String parameter, double value) {
    if (!(value > 0) || Double.isInfinite(value)) {
      throw new IllegalArgumentException(parameter + " is not above zero and finite: " + value);
    }
  }

  static void notNegative(String parameter, double value) {
    if (!(value >= 0) || Double.isInfinite(value)) {
      throw new IllegalArgumentException(parameter + " is negative or not finite: " + value);
    }
  }

  static void finite(String parameter, double value) {
    if (!Double.isFinite(value)) {
      throw new IllegalArgumentException(parameter + " is not finite: " + value);
    }
  }
}
