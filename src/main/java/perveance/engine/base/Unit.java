package perveance.engine.base;

/**
 * The units the engine counts in. Everything inside the engine is in these units without a prefix;
 * prefixes exist only where text is read or printed.
 */
public enum Unit {
  VOLT("V", "V", "volts", "a voltage", "300 V"),
  AMPERE("A", "A", "amperes", "a current", "1.5 mA"),
  OHM("Ω", "ohm", "ohms", "a resistance", "4k7"),
  FARAD("F", "F", "farads", "a capacitance", "22n"),
  HENRY("H", "H", "henries", "an inductance", "10 H"),
  WATT("W", "W", "watts", "a power", "0.5 W"),
  HERTZ("Hz", "Hz", "hertz", "a frequency", "50 Hz"),
  SIEMENS("S", "S", "siemens", "a conductance", "1.6 mA/V"),
  SECOND("s", "s", "seconds", "a time", "30 s"),
  JOULE("J", "J", "joules", "an energy", "10 J"),
  KELVIN("K", "K", "kelvins", "a temperature", "300 K"),
  METRE("m", "m", "metres", "a length", "1.2 mm"),
  RATIO("1", "1", "a plain number", "a ratio", "43 %"),
  DECIBEL("dB", "dB", "decibels", "a level", "6 dB"),
  PERVEANCE("A/V^1.5", "A/V^1.5", "amperes per volt to the 1.5", "a perveance", "1.4e-3");

  private final String symbol;
  private final String plainSymbol;
  private final String word;
  private final String quantityWord;
  private final String example;

  Unit(String symbol, String plainSymbol, String word, String quantityWord, String example) {
    this.symbol = symbol;
    this.plainSymbol = plainSymbol;
    this.word = word;
    this.quantityWord = quantityWord;
    this.example = example;
  }

  /**
   * Returns the symbol as printed, such as "Ω".
   *
   * @return the symbol
   */
  public String symbol() {
    return symbol;
  }

  /**
   * Returns the symbol in ASCII, as machine-readable output names it, such as "ohm".
   *
   * @return the symbol without signs beyond ASCII
   */
  public String plainSymbol() {
    return plainSymbol;
  }

  /**
   * Returns the unit as a word, such as "volts".
   *
   * @return the unit in words, plural
   */
  public String word() {
    return word;
  }

  /**
   * Returns what is measured in this unit, with its article, such as "a voltage".
   *
   * @return the kind of quantity in words
   */
  public String quantityWord() {
    return quantityWord;
  }

  /**
   * Returns a well-formed example that {@link QuantityParser} reads in this unit.
   *
   * @return an example, such as "300 V"
   */
  public String example() {
    return example;
  }
}
