package perveance.files.toml;

/** The shapes of a TOML number, without regular expressions, which are slow on a cold start. */
final class NumberForm {
  private final String word;
  private int at;

  private NumberForm(String word) {
    this.word = word;
  }

  /** The base in which a number is written. */
  static int radix(String word) {
    if (word.startsWith("0x")) {
      return 16;
    }
    if (word.startsWith("0o")) {
      return 8;
    }
    return word.startsWith("0b") ? 2 : 10;
  }

  static boolean isNumber(String word) {
    NumberForm form = new NumberForm(word);
    int radix = radix(word);
    if (radix != 10) {
      form.at = 2;
      return form.digits(radix) && form.done();
    }
    return form.decimal() && form.done();
  }

  private boolean decimal() {
    if (is('+') || is('-')) {
      at++;
    }
    int first = at;
    if (!digits(10) || (word.charAt(first) == '0' && at > first + 1)) {
      return false;
    }
    if (is('.')) {
      at++;
      if (!digits(10)) {
        return false;
      }
    }
    if (is('e') || is('E')) {
      at++;
      if (is('+') || is('-')) {
        at++;
      }
      return digits(10);
    }
    return true;
  }

  /** Digits, with single underscores between two of them only. */
  private boolean digits(int radix) {
    boolean digitBefore = false;
    while (!done()) {
      char c = word.charAt(at);
      if (Character.digit(c, radix) >= 0) {
        digitBefore = true;
      } else if (c == '_' && digitBefore) {
        digitBefore = false;
      } else {
        break;
      }
      at++;
    }
    return digitBefore;
  }

  private boolean is(char c) {
    return !done() && word.charAt(at) == c;
  }

  private boolean done() {
    return at == word.length();
  }
}
