package perveance.files.toml;

import java.util.OptionalDouble;
import perveance.engine.base.QuantityException;
import perveance.engine.base.QuantityParser;

/** Reads a value as a quantity: text with a unit, or a plain number in the unit expected. */
final class QuantityValue {
  private QuantityValue() {}

  /** The value in the unit of the range; empty after a complaint. */
  static OptionalDouble read(TomlValue value, String key, Range range, Complaints complaints) {
    double number;
    if (value instanceof TomlValue.Text text) {
      try {
        number = QuantityParser.parse(text.text(), range.unit()).value();
      } catch (QuantityException e) {
        complaints.add(value.span(), key, e.found(), e.expected());
        return OptionalDouble.empty();
      }
    } else if (value instanceof TomlValue.Whole whole) {
      number = whole.number();
    } else if (value instanceof TomlValue.Real real) {
      number = real.number();
    } else {
      complaints.add(value.span(), key, complaints.shown(value), range.inWords());
      return OptionalDouble.empty();
    }
    if (!range.holds(number)) {
      complaints.add(value.span(), key, complaints.shown(value), range.inWords());
      return OptionalDouble.empty();
    }
    return OptionalDouble.of(number);
  }
}
