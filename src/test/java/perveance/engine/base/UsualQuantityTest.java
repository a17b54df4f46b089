package perveance.engine.base;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.OptionalDouble;
import java.util.Random;
import org.junit.jupiter.api.Test;

/** The short way of reading a quantity against the full one, which has its own published checks. */
class UsualQuantityTest {
  private static final String[] NUMBERS = {
    "0",
    "1",
    "-2",
    "250",
    "1.2",
    "0.046",
    "62.5",
    "-0.6",
    "12.6",
    "-0",
    "00",
    "1.",
    ".5",
    "+3",
    "1e3",
    "1,5",
    "123456789012345678",
    "",
    "-",
    "99999999999999999999999"
  };

  private static final String[] SUFFIXES = {
    "", " ", "V", " V", "  V", "mV", " kV", "A", " mA", " uA", "k", " k", "M", "m", "n", " nF",
    "pF", "F", "ohm", " kohm", "W", " mW", "Hz", " kHz", "mA/V", " A/V", "S", "%", "dB", "s", "R",
    "k7", "VV", "kk", "MV", "G", "c", "\u00b5F", "Hzz", "m V", "K"
  };

  @Test
  void everyCombinationReadsAsInFullOrIsLeftToIt() throws QuantityException {
    int read = 0;
    for (Unit unit : Unit.values()) {
      for (String number : NUMBERS) {
        for (String suffix : SUFFIXES) {
          read += agrees(number + suffix, unit) ? 1 : 0;
        }
      }
    }
    assertTrue(read > 500, read + " texts were read the short way");
  }

  @Test
  void decimalsAreReadToTheNearestDouble() throws QuantityException {
    Random random = new Random(42);
    for (int i = 0; i < 5000; i++) {
      String number = random.nextInt(100_000) + "." + random.nextInt(1_000_000);
      assertTrue(agrees(number + " mA", Unit.AMPERE));
      assertTrue(agrees("-" + number + "k", Unit.OHM));
    }
  }

  private static boolean agrees(String text, Unit unit) throws QuantityException {
    OptionalDouble usual = UsualQuantity.read(text, unit);
    if (usual.isEmpty()) {
      return false;
    }
    assertEquals(
        QuantityParser.parseInFull(text, unit),
        new Quantity(usual.getAsDouble(), unit),
        () -> text + " in " + unit);
    return true;
  }
}
