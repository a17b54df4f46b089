package perveance.engine.analysis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import org.junit.jupiter.api.Test;

class RatingToBuyTest {
  /**
   * Derived, Ohm's and Watt's laws. 100 k anode load at 310 V: 0.114 W and 107 V at idle, 0.96 W
   * and 310 V with the anode shorted to chassis: a 1 W part with 350 V or more.
   */
  @Test
  void anodeLoadBearsTheShortedValve() {
    assertEquals(1, RatingToBuy.power(0.114, 310.0 * 310 / 100e3).orElseThrow());
    assertEquals(350, RatingToBuy.resistorVoltage(310).orElseThrow());
  }

  /** Derived. 250 ohm below two output valves takes 1.6 W: at half its rating that is 5 W. */
  @Test
  void sharedCathodeResistorRunsAtHalfItsRating() {
    assertEquals(5, RatingToBuy.power(1.6, 340.0 * 340 / 250).orElseThrow());
    assertFalse(RatingToBuy.bears(340.0 * 340 / 250));
  }

  @Test
  void capacitorsAreBoughtForTheColdStart() {
    assertEquals(630, RatingToBuy.filmVoltage(310).orElseThrow());
    assertEquals(10, RatingToBuy.electrolyticVoltage(1.6).orElseThrow());
    assertEquals(450, RatingToBuy.electrolyticVoltage(360).orElseThrow());
    assertFalse(RatingToBuy.electrolyticVoltage(480).isPresent());
    assertFalse(RatingToBuy.resistorVoltage(1.6).isPresent());
  }
}
