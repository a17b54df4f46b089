package perveance.engine.base;

import java.math.BigDecimal;

/**
 * A unit and what makes the written number into one without prefix: n * factor * 10^power + offset.
 *
 * @param unit the unit
 * @param power the power of ten
 * @param factor a further factor as a decimal, nothing where there is none
 * @param offset what is added as a decimal, nothing where there is none
 */
record UnitMeaning(Unit unit, int power, String factor, String offset) {
  static UnitMeaning tenTo(Unit unit, int power) {
    return new UnitMeaning(unit, power, "", "");
  }

  static UnitMeaning times(Unit unit, String factor) {
    return new UnitMeaning(unit, 0, factor, "");
  }

  static UnitMeaning plus(Unit unit, String offset) {
    return new UnitMeaning(unit, 0, "", offset);
  }

  /** The written number in the unit, rounded once, from the decimal text as a whole. */
  double apply(WrittenNumber written, int exponent) {
    String decimal = written.decimal(power + exponent);
    if (factor.isEmpty() && offset.isEmpty()) {
      return Double.parseDouble(decimal);
    }
    BigDecimal number = new BigDecimal(decimal);
    BigDecimal scaled = factor.isEmpty() ? number : number.multiply(new BigDecimal(factor));
    return (offset.isEmpty() ? scaled : scaled.add(new BigDecimal(offset))).doubleValue();
  }
}
