package perveance.engine.base;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class NearMissTest {
  private static final List<String> KEYS =
      List.of("anode_load", "cathode_resistor", "cathode_bypass", "grid_leak", "load", "drive");

  @ParameterizedTest
  @CsvSource({
    "anode_laod, anode_load",
    "anodeload, anode_load",
    "Anode-Load, anode_load",
    "cathode_resister, cathode_resistor",
    "cathode_bypas, cathode_bypass",
    "grid_leek, grid_leak",
    "laod, load",
    "drve, drive",
  })
  void findsTheWordMeant(String typed, String meant) {
    assertEquals(Optional.of(meant), NearMiss.suggest(typed, KEYS));
  }

  @ParameterizedTest
  @CsvSource({"heater", "plate", "x", "screen_resistor_value", "''"})
  void saysNothingWhenNothingIsNear(String typed) {
    assertEquals(Optional.empty(), NearMiss.suggest(typed, KEYS));
  }

  /** Types of one family begin alike: EL35 is nearer to EL34 than to EZ35. */
  @Test
  void prefersWhatBeginsAlike() {
    assertEquals(Optional.of("EL34"), NearMiss.suggest("EL35", List.of("EZ35", "EL34", "EL36")));
    assertEquals(Optional.of("6L6GC"), NearMiss.suggest("6L6GB", List.of("5U4GB", "6L6GC")));
  }

  /** A single letter is no reason to propose another one. */
  @Test
  void doesNotReplaceWholeWords() {
    assertEquals(Optional.empty(), NearMiss.suggest("A", List.of("B", "C")));
    assertEquals(Optional.of("12AX7"), NearMiss.suggest("12ax-7", List.of("12AU7", "12AX7")));
  }

  /** Derived: insert, drop, change and swap are one slip each. */
  @Test
  void countsSlips() {
    assertEquals(0, NearMiss.slips("load", "load"));
    assertEquals(1, NearMiss.slips("load", "loads"));
    assertEquals(1, NearMiss.slips("load", "lad"));
    assertEquals(1, NearMiss.slips("load", "lead"));
    assertEquals(1, NearMiss.slips("load", "laod"));
    assertEquals(3, NearMiss.slips("kitten", "sitting"));
    assertEquals(4, NearMiss.slips("", "load"));
  }

  @Test
  void hugeWordsTakeNoTime() {
    assertEquals(Optional.empty(), NearMiss.suggest("z".repeat(1_000_000), KEYS));
  }
}
