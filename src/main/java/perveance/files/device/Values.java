package perveance.files.device;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.Unit;
import perveance.files.toml.TomlText;

/** Gathers the values of one table to be written; what is absent or empty is left out. */
final class Values {
  private final Map<String, String> values = new LinkedHashMap<>();

  Values text(String key, String text) {
    if (!text.isEmpty()) {
      values.put(key, TomlText.text(text));
    }
    return this;
  }

  Values texts(String key, List<String> texts) {
    if (!texts.isEmpty()) {
      values.put(key, TomlText.list(texts));
    }
    return this;
  }

  Values raw(String key, String value) {
    values.put(key, value);
    return this;
  }

  Values quantity(String key, double value, Unit unit) {
    // a ratio reads better as a number than as a text
    boolean plain = unit == Unit.RATIO;
    String text = QuantityFormat.PLAIN.part(value, unit);
    values.put(key, plain ? text : TomlText.text(text));
    return this;
  }

  Values quantity(String key, OptionalDouble value, Unit unit) {
    return value.isPresent() ? quantity(key, value.getAsDouble(), unit) : this;
  }

  Map<String, String> map() {
    return values;
  }

  String block(String header) {
    return TomlText.block(header, values, "\n");
  }
}
