package perveance.files.toml;

import java.util.Locale;
import java.util.Optional;

/** Reads what stands without quotes: numbers, true, false. */
final class BareValue {
  private BareValue() {}

  /** Reads the value at the cursor up to what ends it. */
  static TomlValue read(Cursor cursor) throws TomlFault {
    int start = cursor.offset();
    int line = cursor.line();
    while (isPart(cursor.peek())) {
      cursor.next();
    }
    String word = cursor.textSince(start);
    if (word.isEmpty()) {
      throw fault(cursor, start);
    }
    Span span = cursor.since(start, line);
    switch (word) {
      case "true":
        return new TomlValue.Flag(true, span);
      case "false":
        return new TomlValue.Flag(false, span);
      case "inf", "+inf":
        return new TomlValue.Real(Double.POSITIVE_INFINITY, span);
      case "-inf":
        return new TomlValue.Real(Double.NEGATIVE_INFINITY, span);
      case "nan", "+nan", "-nan":
        return new TomlValue.Real(Double.NaN, span);
      default:
        Optional<TomlValue> number = number(word, span);
        if (number.isEmpty()) {
          throw fault(cursor, start);
        }
        return number.get();
    }
  }

  private static boolean isPart(int c) {
    return (c >= '0' && c <= '9')
        || (c >= 'a' && c <= 'z')
        || (c >= 'A' && c <= 'Z')
        || c == '+'
        || c == '-'
        || c == '.'
        || c == '_'
        || c == ':';
  }

  private static Optional<TomlValue> number(String word, Span span) throws TomlFault {
    if (!NumberForm.isNumber(word)) {
      return Optional.empty();
    }
    String plain = word.replace("_", "");
    if (NumberForm.radix(word) != 10) {
      return Optional.of(whole(plain.substring(2), NumberForm.radix(word), span, word));
    }
    boolean real = plain.indexOf('.') >= 0 || plain.toLowerCase(Locale.ROOT).indexOf('e') >= 0;
    if (!real) {
      return Optional.of(whole(plain, 10, span, word));
    }
    double value = Double.parseDouble(plain);
    if (Double.isInfinite(value)) {
      throw tooLarge(span, word);
    }
    return Optional.of(new TomlValue.Real(value, span));
  }

  private static TomlValue whole(String digits, int radix, Span span, String word)
      throws TomlFault {
    try {
      return new TomlValue.Whole(Long.parseLong(digits, radix), span);
    } catch (NumberFormatException e) {
      throw tooLarge(span, word);
    }
  }

  private static TomlFault tooLarge(Span span, String word) {
    return new TomlFault(
        span.line(), Cursor.shorten(word) + ", which is too large", "a smaller number");
  }

  /** The usual slip is a quantity without quotes, so say how to mend it. */
  private static TomlFault fault(Cursor cursor, int start) {
    String rest = cursor.shown(start);
    if (rest.equals("nothing")) {
      return new TomlFault(cursor.line(), "nothing", "a value behind the equals sign");
    }
    if ("\u201C\u201D\u201E\u2018\u2019`".indexOf(rest.charAt(0)) >= 0) {
      String inner = rest.replaceAll("[\u201C\u201D\u201E\u2018\u2019`]", "");
      return new TomlFault(
          cursor.line(), rest, "text in straight quotes", QuotedText.lackingQuotes(inner));
    }
    if (isPart(rest.charAt(0)) || Character.isLetterOrDigit(rest.charAt(0))) {
      String word = rest.replaceAll("[,\\]}\"'].*", "").strip();
      return new TomlFault(
          cursor.line(),
          Cursor.shorten(word),
          "text in quotes, a plain number, true or false",
          QuotedText.lackingQuotes(word));
    }
    return new TomlFault(cursor.line(), rest, "a value: text in quotes, a number, true or false");
  }
}
