package perveance.engine.base;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.util.Locale;
import java.util.Random;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Every expected number is exact: the text is a decimal, read to the nearest double. */
class QuantityParserTest {
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
    "100k, OHM, 100e3",
    "4k7, OHM, 4700",
    "1k5, OHM, 1500",
    "0R47, OHM, 0.47",
    "R47, OHM, 0.47",
    "470R, OHM, 470",
    "470 R, OHM, 470",
    "1M, OHM, 1e6",
    "2M2, OHM, 2.2e6",
    "10M, OHM, 10e6",
    "47K, OHM, 47e3",
    "100, OHM, 100",
    "100 ohm, OHM, 100",
    "100 ohms, OHM, 100",
    "100 Ohm, OHM, 100",
    "4.7 kohm, OHM, 4700",
    "4.7 k ohm, OHM, 4700",
    "4k7 ohm, OHM, 4700",
    "4k7\u03a9, OHM, 4700",
    "4.7 k\u2126, OHM, 4700",
    "2 Meg, OHM, 2e6",
    "1 megohm, OHM, 1e6",
    "22n, FARAD, 22e-9",
    "2n2, FARAD, 2.2e-9",
    "n22, FARAD, 0.22e-9",
    "22nF, FARAD, 22e-9",
    "22nf, FARAD, 22e-9",
    "22u, FARAD, 22e-6",
    "22\u00b5, FARAD, 22e-6",
    "22\u03bcF, FARAD, 22e-6",
    "4u7, FARAD, 4.7e-6",
    "4\u00b57F, FARAD, 4.7e-6",
    "p68, FARAD, 0.68e-12",
    "1.7 pF, FARAD, 1.7e-12",
    "0.02 mfd, FARAD, 0.02e-6",
    "50 mmfd, FARAD, 50e-12",
    "300 V, VOLT, 300",
    "6.3V, VOLT, 6.3",
    "6V3, VOLT, 6.3",
    "-2 V, VOLT, -2",
    "\u22122 V, VOLT, -2",
    "300\u00a0V, VOLT, 300",
    "300, VOLT, 300",
    "300 volts, VOLT, 300",
    "2 millivolts, VOLT, 2e-3",
    "1.5 mA, AMPERE, 1.5e-3",
    "1.5ma, AMPERE, 1.5e-3",
    "50 uA, AMPERE, 50e-6",
    "0.3 amp, AMPERE, 0.3",
    "10 H, HENRY, 10",
    "100mH, HENRY, 0.1",
    "0.5W, WATT, 0.5",
    "250 mW, WATT, 0.25",
    "50 Hz, HERTZ, 50",
    "20 kHz, HERTZ, 20e3",
    "1.6 mA/V, SIEMENS, 1.6e-3",
    "1600 umho, SIEMENS, 1.6e-3",
    "1.6mS, SIEMENS, 1.6e-3",
    "30 s, SECOND, 30",
    "2 min, SECOND, 120",
    "10 J, JOULE, 10",
    "290 K, KELVIN, 290",
    "25 \u00b0C, KELVIN, 298.15",
    "1.2 mm, METRE, 1.2e-3",
    "0.5 cm, METRE, 5e-3",
    "2 m, METRE, 2",
    "3 thou, METRE, 76.2e-6",
    "43 %, RATIO, 0.43",
    "43%, RATIO, 0.43",
    "0.43, RATIO, 0.43",
    "6 dB, DECIBEL, 6",
    "-3.5dB, DECIBEL, -3.5",
    "1.4e-3, PERVEANCE, 1.4e-3",
    "1.4 mA/V^1.5, PERVEANCE, 1.4e-3",
    "2.2e-8, FARAD, 2.2e-8",
    "1E3, OHM, 1000",
    "+5, OHM, 5",
    ".5, OHM, 0.5",
    "5., OHM, 5",
    "'  100k  ', OHM, 100e3",
    "0, OHM, 0",
    "0R, OHM, 0",
  })
  void readsWhatTheTradeWrites(String text, Unit unit, double expected) throws QuantityException {
    assertEquals(new Quantity(expected, unit), QuantityParser.parse(text, unit));
  }

  @ParameterizedTest
  @CsvSource({
    "'6,3 V', VOLT, 6.3",
    "'4,7k', OHM, 4700",
    "'0,470', AMPERE, 0.47",
    "',5', RATIO, 0.5",
    "'12,5 %', RATIO, 0.125",
  })
  void readsTheDecimalComma(String text, Unit unit, double expected) throws QuantityException {
    assertEquals(expected, QuantityParser.parse(text, unit).value(), 0);
  }

  @ParameterizedTest
  @ValueSource(strings = {"1,500", "47,000 ", "220,000", "-1,500"})
  void refusesTheCommaThatMayMeanThousands(String text) {
    assertTrue(refusal(text, Unit.OHM).found().contains("two things"), text);
  }

  @ParameterizedTest
  @CsvSource({
    "1.5 mA, VOLT, a current in amperes (A), a voltage in volts (V)",
    "300 V, AMPERE, a voltage in volts (V), a current in amperes (A)",
    "4k7 ohm, FARAD, a resistance in ohms (Ω), a capacitance in farads (F)",
    "6V3, OHM, a voltage in volts (V), a resistance in ohms (Ω)",
    "22n F, OHM, a capacitance in farads (F), a resistance in ohms (Ω)",
    "43 %, OHM, a ratio (a plain number or %), a resistance in ohms (Ω)",
    "1.6 mA/V, AMPERE, a conductance in siemens (S), a current in amperes (A)",
    "5 W, RATIO, a power in watts (W), a ratio (a plain number or %)",
    "3 dB, VOLT, a level in decibels (dB), a voltage in volts (V)",
    "20 mm, VOLT, a length in metres (m), a voltage in volts (V)",
  })
  void namesBothUnitsWhenTheUnitIsWrong(
      String text, Unit expected, String foundWords, String expectedWords) {
    QuantityException refusal = refusal(text, expected);
    assertTrue(refusal.found().contains(foundWords), refusal.found());
    assertTrue(refusal.expected().contains(expectedWords), refusal.expected());
    assertTrue(refusal.expected().contains(expected.example()), refusal.expected());
    assertEquals(
        "found " + refusal.found() + ", expected " + refusal.expected(), refusal.getMessage());
  }

  @Test
  void everyPairOfUnitsIsToldApart() {
    for (Unit stated : Unit.values()) {
      for (Unit expected : Unit.values()) {
        String text = "5 " + (stated == Unit.RATIO ? "%" : stated.plainSymbol());
        // a lone "m" after a number is milli wherever a length is not expected
        if (stated != expected && stated != Unit.METRE && !(stated == Unit.KELVIN)) {
          assertTrue(refusal(text, expected).found().contains(stated.word()), text);
        }
      }
    }
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "",
        " ",
        "\u00a0",
        "NaN",
        "nan",
        "Infinity",
        "-Infinity",
        "inf",
        "1e400",
        "-1e400",
        "1e-400",
        "1e99999999999",
        "1e-99999999999",
        "k",
        "k7",
        "M5",
        "R",
        "V",
        "abc",
        "--5",
        "+-5",
        "5 5",
        "5k5k",
        "5k7x",
        "4k7 4k7",
        "1.2.3",
        "1,2,3",
        "1.000,5",
        "5 V rms",
        "5 kk",
        "5_000",
        "0x10",
        "1f2g",
        "5 \u03a9\u03a9",
        "5\nk",
        "5\u0000",
        "\u0665",
        "5 Q",
        "1/2",
        "5e",
        "5e+",
        "e5",
        ".",
        ",",
        "-",
        "4k7.5",
        "100 k/V",
      })
  void refusesEverythingElse(String text) {
    QuantityException refusal = refusal(text, Unit.OHM);
    assertTrue(refusal.expected().contains("resistance"), refusal.expected());
    assertFalse(refusal.message().contains("\n"), "one line");
  }

  @Test
  void saysWhatIsNotUnderstood() {
    assertEquals(
        "found \"100q\", in which \"q\" is not understood here, expected a resistance in ohms (Ω),"
            + " for example \"4k7\"",
        refusal("100q", Unit.OHM).message());
    assertEquals("nothing", refusal("", Unit.VOLT).found());
  }

  @Test
  void refusesHugeTextsWithoutRepeatingThem() {
    String text = "1".repeat(1_000_000);
    QuantityException refusal = refusal(text, Unit.OHM);
    assertTrue(refusal.message().length() < 200, refusal.message());
  }

  /** Property: a prefix moves the decimal sign; it never multiplies a number already rounded. */
  @Test
  void readsToTheNearestNumber() throws QuantityException {
    Random random = new Random(42);
    for (int round = 0; round < 5000; round++) {
      String number = random.nextInt(100_000) + "." + random.nextInt(1_000_000);
      assertEquals(
          new BigDecimal(number).movePointLeft(3).doubleValue(),
          QuantityParser.parse(number + " mA", Unit.AMPERE).value());
      assertEquals(
          new BigDecimal(number).movePointRight(3).negate().doubleValue(),
          QuantityParser.parse("-" + number + "k", Unit.OHM).value());
      assertEquals(
          new BigDecimal(number).multiply(new BigDecimal("0.0254")).doubleValue(),
          QuantityParser.parse(number + " in", Unit.METRE).value());
    }
  }

  @Test
  void zeroHasNoSign() throws QuantityException {
    assertEquals(0.0, QuantityParser.parse("-0", Unit.VOLT).value());
    assertEquals(1 / 0.0, 1 / QuantityParser.parse("-0", Unit.VOLT).value());
  }

  @ParameterizedTest
  @ValueSource(strings = {"tr-TR", "de-DE", "ar-EG", "hi-IN-u-nu-deva", "en-US"})
  void readsTheSameOnEveryMachine(String tag) throws QuantityException {
    Locale.setDefault(Locale.forLanguageTag(tag));
    assertEquals(1500, QuantityParser.parse("1.5k", Unit.OHM).value());
    assertEquals(1500, QuantityParser.parse("1,5k", Unit.OHM).value());
    assertEquals(
        3, QuantityParser.parse("3 KILOOHM".replace("KILO", "k"), Unit.OHM).value() / 1000);
    assertEquals(
        0.001, QuantityParser.parse("1 MILLIVOLT".replace("MILLI", "m"), Unit.VOLT).value());
  }

  private static QuantityException refusal(String text, Unit expected) {
    return assertThrows(QuantityException.class, () -> QuantityParser.parse(text, expected));
  }
}
