package perveance.engine.device;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;

/** Looking up a rectifier's limits at a voltage. */
class RectifierRatingsTest {
  private static RectifierLimit limit(double voltage, double current) {
    return new RectifierLimit(
        "R",
        RatingSystem.DESIGN_CENTRE,
        RectifierFilter.CAPACITOR,
        OptionalDouble.of(voltage),
        OptionalDouble.of(current),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        "a book",
        "memory",
        "high",
        "");
  }

  private final RectifierRatings ratings =
      new RectifierRatings(
          List.of(limit(550, 0.16), limit(450, 0.25), limit(500, 0.2)),
          List.of(
              new LimitingResistance(550, 200, "a book", "memory", "medium", ""),
              new LimitingResistance(300, 75, "a book", "memory", "medium", ""),
              new LimitingResistance(450, 150, "a book", "memory", "medium", "")),
          List.of());

  /*
   * Derived. Case: 250 mA up to 450 V, 200 mA at 500 V, 160 mA at 550 V, in any order. Expected: the
   * limits of the next voltage up; none above the highest or for the other filter.
   */
  @Test
  @DisplayName("the limits of the next voltage up hold")
  void limits() {
    assertEquals(0.25, current(300));
    assertEquals(0.25, current(450));
    assertEquals(0.2, current(450.1));
    assertEquals(0.16, current(550));
    assertTrue(ratings.limitAt(RectifierFilter.CAPACITOR, 551).isEmpty());
    assertTrue(ratings.limitAt(RectifierFilter.CHOKE, 300).isEmpty());
  }

  private double current(double voltage) {
    return ratings
        .limitAt(RectifierFilter.CAPACITOR, voltage)
        .orElseThrow()
        .outputCurrent()
        .orElseThrow();
  }

  /*
   * Derived. Case: 75 ohm at 300 V, 150 at 450 V, 200 at 550 V. Expected: straight lines between,
   * 112.5 at 375 V; the lowest row's value below it; nothing above.
   */
  @Test
  @DisplayName("the least resistance follows straight lines between the rows")
  void resistances() {
    assertEquals(75, ratings.leastResistance(200).orElseThrow(), 1e-12);
    assertEquals(112.5, ratings.leastResistance(375).orElseThrow(), 1e-12);
    assertEquals(150, ratings.leastResistance(450).orElseThrow(), 1e-12);
    assertEquals(200, ratings.leastResistance(550).orElseThrow(), 1e-12);
    assertTrue(ratings.leastResistance(560).isEmpty());
  }
}
