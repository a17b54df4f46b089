package perveance.files.toml;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;

/** Values as they stand in a TOML file. */
public final class TomlText {
  private TomlText() {}

  /**
   * A text in quotes.
   *
   * @param text the text
   * @return the text quoted and escaped
   */
  public static String text(String text) {
    return QuotedText.write(text);
  }

  /**
   * A key, quoted where it must be.
   *
   * @param key the key
   * @return the key
   */
  public static String key(String key) {
    return KeyReader.write(key);
  }

  /**
   * A list of texts.
   *
   * @param texts the texts
   * @return the list in brackets
   */
  public static String list(List<String> texts) {
    return texts.stream().map(TomlText::text).collect(Collectors.joining(", ", "[", "]"));
  }

  /**
   * A plain number, rounded.
   *
   * @param number the number, finite [1]
   * @param figures significant figures
   * @return the number, such as {@code 0.00116123}
   */
  public static String number(double number, int figures) {
    if (!Double.isFinite(number)) {
      throw new IllegalArgumentException("number is not finite: " + number);
    }
    double rounded = new BigDecimal(number).round(new MathContext(figures)).doubleValue();
    boolean whole = rounded == Math.rint(rounded) && Math.abs(rounded) < 1e9;
    return whole ? Long.toString((long) rounded) : Double.toString(rounded).replace("E", "e");
  }

  /**
   * A header with its keys.
   *
   * @param header the header with its brackets; empty for the keys at the top of a file
   * @param values values as they stand in a file, by key, in order
   * @param separator line end
   * @return whole lines
   */
  public static String block(String header, Map<String, String> values, String separator) {
    StringBuilder out = new StringBuilder();
    if (!header.isEmpty()) {
      out.append(header).append(separator);
    }
    values.forEach(
        (key, value) -> out.append(key(key)).append(" = ").append(value).append(separator));
    return out.toString();
  }
}
