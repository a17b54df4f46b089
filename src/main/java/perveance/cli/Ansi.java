package perveance.cli;

/**
 * Bold and colour on a terminal; nothing elsewhere. Words carry the meaning, never colour alone.
 */
final class Ansi {
  private final boolean on;

  Ansi(boolean on) {
    this.on = on;
  }

  /** For the place the program runs in: only on a terminal, and not where NO_COLOR is set. */
  static Ansi detected() {
    return new Ansi(System.console() != null && System.getenv("NO_COLOR") == null);
  }

  String bold(String text) {
    return wrap("1", text);
  }

  String red(String text) {
    return wrap("1;31", text);
  }

  String amber(String text) {
    return wrap("33", text);
  }

  String soft(String text) {
    return wrap("2", text);
  }

  private String wrap(String code, String text) {
    return on ? "\u001b[" + code + "m" + text + "\u001b[0m" : text;
  }
}
