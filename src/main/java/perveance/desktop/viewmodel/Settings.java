package perveance.desktop.viewmodel;

import perveance.app.wording.Vocabulary;

/**
 * What a person has set for all documents; kept between runs.
 *
 * @param dark whether the window is dark
 * @param textSize size of text against the usual one [1]
 * @param vocabulary which words are shown
 * @param letter whether the sheet is printed on Letter instead of A4
 * @param zigzag whether resistors are drawn as zigzags
 * @param mainsFrequency for new documents [Hz]
 * @param meter input resistance of the meter, for new documents [ohm]
 */
public record Settings(
    boolean dark,
    double textSize,
    Vocabulary vocabulary,
    boolean letter,
    boolean zigzag,
    double mainsFrequency,
    double meter) {
  /** Smallest text [1]. */
  public static final double SMALLEST = 0.8;

  /** Largest text [1]. */
  public static final double LARGEST = 1.8;

  /** What holds before anything was set. */
  public static final Settings USUAL =
      new Settings(false, 1, Vocabulary.BRITISH, false, false, 50, 10e6);

  /** Brings the text size into its range. */
  public Settings {
    textSize = Math.max(SMALLEST, Math.min(LARGEST, textSize));
  }

  /**
   * The same, dark or light.
   *
   * @param on true for dark
   * @return changed settings
   */
  public Settings withDark(boolean on) {
    return new Settings(on, textSize, vocabulary, letter, zigzag, mainsFrequency, meter);
  }

  /**
   * The same with another size of text.
   *
   * @param size against the usual one [1]
   * @return changed settings
   */
  public Settings withTextSize(double size) {
    return new Settings(dark, size, vocabulary, letter, zigzag, mainsFrequency, meter);
  }

  /**
   * The same in other words.
   *
   * @param words which
   * @return changed settings
   */
  public Settings withVocabulary(Vocabulary words) {
    return new Settings(dark, textSize, words, letter, zigzag, mainsFrequency, meter);
  }

  /**
   * The same on other paper.
   *
   * @param on true for Letter
   * @return changed settings
   */
  public Settings withLetter(boolean on) {
    return new Settings(dark, textSize, vocabulary, on, zigzag, mainsFrequency, meter);
  }

  /**
   * The same with another resistor symbol.
   *
   * @param on true for zigzags
   * @return changed settings
   */
  public Settings withZigzag(boolean on) {
    return new Settings(dark, textSize, vocabulary, letter, on, mainsFrequency, meter);
  }

  /**
   * The same with other conditions for new documents.
   *
   * @param frequency of the mains [Hz]
   * @param resistance of the meter [ohm]
   * @return changed settings
   */
  public Settings withConditions(double frequency, double resistance) {
    return new Settings(dark, textSize, vocabulary, letter, zigzag, frequency, resistance);
  }
}
