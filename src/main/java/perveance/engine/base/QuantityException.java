package perveance.engine.base;

/** A text that is not the quantity that was asked for. */
public final class QuantityException extends Exception {
  private static final long serialVersionUID = 1L;

  private final String found;
  private final String expected;

  /**
   * Creates the refusal of a text.
   *
   * @param found what stands there, in words that follow "found"
   * @param expected what should stand there, in words that follow "expected"
   */
  public QuantityException(String found, String expected) {
    super("found " + found + ", expected " + expected);
    this.found = found;
    this.expected = expected;
  }

  /**
   * Returns what was found, fit to follow the word "found".
   *
   * @return the text found and what is wrong with it
   */
  public String found() {
    return found;
  }

  /**
   * Returns what was expected, fit to follow the word "expected".
   *
   * @return the quantity expected, its unit and an example
   */
  public String expected() {
    return expected;
  }

  /**
   * Says both in one line.
   *
   * @return the sentence, the same as {@link #getMessage()}
   */
  public String message() {
    return "found " + found + ", expected " + expected;
  }
}
