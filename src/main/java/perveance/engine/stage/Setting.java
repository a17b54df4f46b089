package perveance.engine.stage;

/** The value of one key of a stage, as it is written and as it is meant. */
public sealed interface Setting {
  /**
   * The value as written in the file.
   *
   * @return text
   */
  String text();

  /**
   * A quantity.
   *
   * @param text as written, for example {@code 4k7}
   * @param value in the SI unit of the key [1]
   */
  record Number(String text, double value) implements Setting {}

  /**
   * A word: a device, a node, a choice.
   *
   * @param text the word
   */
  record Word(String text) implements Setting {}

  /**
   * Yes or no.
   *
   * @param flag true or false
   */
  record Flag(boolean flag) implements Setting {
    @Override
    public String text() {
      return Boolean.toString(flag);
    }
  }
}
