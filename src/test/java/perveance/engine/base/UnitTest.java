package perveance.engine.base;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class UnitTest {
  /** The example that messages give must itself be read. */
  @ParameterizedTest
  @EnumSource(Unit.class)
  void examplesAreRead(Unit unit) throws QuantityException {
    assertEquals(unit, QuantityParser.parse(unit.example(), unit).unit());
  }

  @ParameterizedTest
  @EnumSource(Unit.class)
  void namesAreThere(Unit unit) {
    assertFalse(unit.word().isBlank() || unit.quantityWord().isBlank());
    assertTrue(unit.plainSymbol().chars().allMatch(c -> c < 128), unit.plainSymbol());
    assertFalse(unit.symbol().isBlank());
  }

  @Test
  void quantitiesAreFinite() {
    assertThrows(IllegalArgumentException.class, () -> new Quantity(Double.NaN, Unit.VOLT));
    assertThrows(
        IllegalArgumentException.class, () -> new Quantity(Double.NEGATIVE_INFINITY, Unit.VOLT));
  }

  @Test
  void silentProgressNeverCancels() {
    Progress progress = Progress.none();
    progress.report(0.5, "half way");
    assertFalse(progress.cancelled());
  }
}
