package perveance.engine.base;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Locale;
import java.util.Random;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

class QuantityFormatTest {
  private Locale machine = Locale.getDefault();

  @BeforeEach
  void keepLocale() {
    machine = Locale.getDefault();
  }

  @AfterEach
  void restoreLocale() {
    Locale.setDefault(machine);
  }

  @ParameterizedTest
  @CsvSource({
    "4700, OHM, 4k7",
    "100e3, OHM, 100k",
    "0.47, OHM, 0R47",
    "470, OHM, 470R",
    "4.7, OHM, 4R7",
    "1e6, OHM, 1M",
    "2.2e6, OHM, 2M2",
    "22e6, OHM, 22M",
    "1540, OHM, 1k54",
    "0, OHM, 0R",
    "22e-9, FARAD, 22n",
    "2.2e-9, FARAD, 2n2",
    "0.1e-6, FARAD, 100n",
    "22e-6, FARAD, 22\u00b5",
    "1000e-6, FARAD, 1000\u00b5",
    "0.5e-12, FARAD, 0p5",
    "6.3, VOLT, 6.3 V",
    "-2, VOLT, \u22122 V",
    "1.5e-3, AMPERE, 1.5 mA",
    "10, HENRY, 10 H",
    "0.43, RATIO, 0.43",
    "0.5, WATT, 0.5 W",
    "1e-30, OHM, 1e\u221230 \u03a9",
  })
  void printsPartsInLetterCode(double value, Unit unit, String expected) {
    assertEquals(expected, QuantityFormat.TYPESET.part(value, unit));
  }

  @Test
  void printsPlainPartsInAsciiAlone() {
    assertEquals("22u", QuantityFormat.PLAIN.part(22e-6, Unit.FARAD));
    assertEquals("-2 V", QuantityFormat.PLAIN.part(-2, Unit.VOLT));
    assertEquals("38 kohm", QuantityFormat.PLAIN.reading(38e3, Unit.OHM, 2));
    assertEquals("187-206 V", QuantityFormat.PLAIN.range(187, 206, Unit.VOLT));
  }

  @Test
  void roundsPartsToFigures() {
    assertEquals("4k71", QuantityFormat.TYPESET.part(4712.345, Unit.OHM, 3));
    assertEquals("4k7", QuantityFormat.TYPESET.part(4701, Unit.OHM, 3));
    assertEquals("1M", QuantityFormat.TYPESET.part(999_900, Unit.OHM, 2));
  }

  @ParameterizedTest
  @CsvSource({
    "1.0712e-3, AMPERE, 3, 1.07 mA",
    "0.97e-3, AMPERE, 2, 0.97 mA",
    "45e-6, AMPERE, 2, 45 \u00b5A",
    "0.3, AMPERE, 2, 300 mA",
    "2, AMPERE, 2, 2.0 A",
    "203.261, VOLT, 3, 203 V",
    "1.6, VOLT, 3, 1.60 V",
    "-1.6, VOLT, 2, \u22121.6 V",
    "0.045, VOLT, 2, 45 mV",
    "1234, VOLT, 2, 1200 V",
    "0.11, WATT, 2, 0.11 W",
    "0.0042, WATT, 2, 4.2 mW",
    "38e3, OHM, 2, 38 k\u03a9",
    "999.6, OHM, 3, 1.00 k\u03a9",
    "0.47, OHM, 2, 0.47 \u03a9",
    "1000e-6, FARAD, 4, 1000 \u00b5F",
    "22e-9, FARAD, 2, 22 nF",
    "1.7e-12, FARAD, 2, 1.7 pF",
    "1.6e-3, SIEMENS, 2, 1.6 mA/V",
    "5.2, HERTZ, 2, 5.2 Hz",
    "38000, HERTZ, 2, 38 kHz",
    "0.02, SECOND, 2, 20 ms",
    "30, SECOND, 2, 30 s",
    "10.1, JOULE, 2, 10 J",
    "290, KELVIN, 3, 290 K",
    "1.2e-3, METRE, 2, 1.2 mm",
    "54.61, RATIO, 2, 55",
    "6, DECIBEL, 2, 6.0 dB",
    "1.4e-3, PERVEANCE, 2, 1.4 mA/V^1.5",
    "0, VOLT, 3, 0 V",
    "1e-200, RATIO, 2, 1e\u2212200",
  })
  void printsReadingsAsAMeterShowsThem(double value, Unit unit, int figures, String expected) {
    assertEquals(expected, QuantityFormat.TYPESET.reading(value, unit, figures));
  }

  /**
   * Bands as a careful engineer prints them: the 95 % bands of a 12AX7 stage (300 V, 100 k, 1k5)
   * with parts of four tolerances.
   */
  @ParameterizedTest
  @CsvSource({
    "203.261, 196.1, 212.4, VOLT, 203 V, 196–212 V",
    "203.261, 187.6, 219.2, VOLT, 203 V, 188–219 V",
    "1.602, 1.4711, 1.7149, VOLT, 1.60 V, 1.47–1.71 V",
    "1.0674e-3, 0.9812e-3, 1.1388e-3, AMPERE, 1.07 mA, 0.98–1.14 mA",
    "55.2, 48.71, 62.4, RATIO, 55, 49–62",
    "1063, 512, 1822, OHM, 1.1 k\u03a9, 0.5–1.8 k\u03a9",
    "203.261, 203.2611, 203.2612, VOLT, 203.3 V, 203.3 V",
    "203.261, 203.261, 203.261, VOLT, 203 V, 203 V",
    "-1.95, -2.1, -1.8, VOLT, \u22121.95 V, \u22122.10 to \u22121.80 V",
    "0.01, -0.5, 0.5, VOLT, 0.0 V, \u22120.5 to 0.5 V",
    "0, 0, 0, VOLT, 0 V, 0 V",
  })
  void printsNoFinerThanTheBand(
      double value, double low, double high, Unit unit, String central, String range) {
    assertEquals(central, QuantityFormat.TYPESET.toBand(value, low, high, unit));
    assertEquals(range, QuantityFormat.TYPESET.range(low, high, unit));
  }

  @Test
  void printsPercentAndLevels() {
    assertEquals("3.9 %", QuantityFormat.TYPESET.percent(0.039, 2));
    assertEquals("100 %", QuantityFormat.TYPESET.percent(0.9999, 2));
    assertEquals("0 %", QuantityFormat.TYPESET.percent(0, 2));
    assertEquals("+6.0 dB", QuantityFormat.TYPESET.level(6.02, 1));
    assertEquals("\u22123 dB", QuantityFormat.TYPESET.level(-3.01, 0));
    assertEquals("0.0 dB", QuantityFormat.TYPESET.level(-0.01, 1));
  }

  /** Property: a part printed and read again is the same number, bit for bit, in every unit. */
  @ParameterizedTest
  @EnumSource(QuantityFormat.class)
  void partsReadBackAsTheyWere(QuantityFormat format) throws QuantityException {
    Random random = new Random(1923);
    for (int round = 0; round < 20_000; round++) {
      Unit unit = Unit.values()[random.nextInt(Unit.values().length)];
      double size = Math.pow(10, random.nextDouble() * 40 - 20);
      double value = random.nextBoolean() ? size : -Math.rint(size * 1e3) / 1e3;
      String text = format.part(value, unit);
      assertEquals(
          new Quantity(value == 0 ? 0 : value, unit), QuantityParser.parse(text, unit), text);
    }
  }

  /** Property: extreme numbers too are printed so that they read back. */
  @Test
  void extremesReadBackAsTheyWere() throws QuantityException {
    double[] extremes = {
      Double.MIN_VALUE, Double.MIN_NORMAL, Double.MAX_VALUE, -Double.MAX_VALUE, 1e-15, 1e12, 1e15
    };
    for (double value : extremes) {
      for (Unit unit : Unit.values()) {
        String text = QuantityFormat.TYPESET.part(value, unit);
        assertEquals(value, QuantityParser.parse(text, unit).value(), text);
      }
    }
  }

  /** Property: a reading printed to n figures reads back within half of the last figure. */
  @ParameterizedTest
  @EnumSource(QuantityFormat.class)
  void readingsReadBackWithinTheirFigures(QuantityFormat format) throws QuantityException {
    Random random = new Random(41);
    for (int round = 0; round < 20_000; round++) {
      Unit unit = Unit.values()[random.nextInt(Unit.values().length)];
      int figures = 1 + random.nextInt(5);
      double value = Math.pow(10, random.nextDouble() * 24 - 14) * (random.nextBoolean() ? 1 : -1);
      String text = format.reading(value, unit, figures);
      double again = QuantityParser.parse(text, unit).value();
      double half = 0.5 * Math.pow(10, 1 - figures) * Math.abs(value) * (1 + 1e-9);
      assertEquals(value, again, half, text);
    }
  }

  @Test
  void preferredValuesPrintShortAndReadBack() throws QuantityException {
    for (PreferredSeries series : PreferredSeries.values()) {
      for (double first : series.list()) {
        double value = series.nearest(first * 1e3);
        String text = QuantityFormat.PLAIN.part(value, Unit.OHM);
        assertTrue(text.length() <= 4, text);
        assertEquals(value, QuantityParser.parse(text, Unit.OHM).value());
      }
    }
  }

  @ParameterizedTest
  @ValueSource(strings = {"tr-TR", "de-DE", "ar-EG", "hi-IN-u-nu-deva"})
  void printsTheSameOnEveryMachine(String tag) {
    Locale.setDefault(Locale.forLanguageTag(tag));
    assertEquals("1k5", QuantityFormat.TYPESET.part(1500, Unit.OHM));
    assertEquals("1.07 mA", QuantityFormat.TYPESET.reading(1.0712e-3, Unit.AMPERE, 3));
    assertEquals("1.47–1.71 V", QuantityFormat.TYPESET.range(1.4711, 1.7149, Unit.VOLT));
    assertEquals("12.5 %", QuantityFormat.TYPESET.percent(0.125, 3));
    assertEquals("1.5e−30 Ω", QuantityFormat.TYPESET.part(1.5e-30, Unit.OHM));
  }

  @Test
  void refusesMisuse() {
    QuantityFormat format = QuantityFormat.TYPESET;
    assertThrows(IllegalArgumentException.class, () -> format.part(Double.NaN, Unit.OHM));
    assertThrows(IllegalArgumentException.class, () -> format.reading(1, Unit.OHM, 0));
    assertThrows(IllegalArgumentException.class, () -> format.range(2, 1, Unit.OHM));
    assertThrows(IllegalArgumentException.class, () -> format.toBand(1, Double.NaN, 1, Unit.OHM));
    assertThrows(IllegalArgumentException.class, () -> format.level(1, -1));
  }
}
