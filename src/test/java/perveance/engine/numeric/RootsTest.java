package perveance.engine.numeric;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.function.DoubleUnaryOperator;
import org.junit.jupiter.api.Test;

class RootsTest {
  /** Derived: x^2 = 2 between 0 and 2; sqrt(2) is exact to one rounding. */
  @Test
  void findsASquareRoot() {
    RootOutcome.Found found = found(x -> x * x - 2, 0, 2);
    assertEquals(Math.sqrt(2), found.x(), 1e-12);
    assertEquals(0, found.residual(), 1e-11);
    assertTrue(found.iterations() < 20, "evaluations " + found.iterations());
  }

  /**
   * Derived: currents are small numbers; the root of 1e-15 (x^3 - 8) is 2 and must not be accepted
   * early because the function itself is tiny.
   */
  @Test
  void smallFunctionsAreSolvedAsWell() {
    assertEquals(2, found(x -> 1e-15 * (x * x * x - 8), 0, 10).x(), 1e-12);
  }

  /** Derived: the three-halves law meets zero with a kink; I(v) = max(0, v)^1.5 - 8 at v = 4. */
  @Test
  void solvesAcrossCutOff() {
    assertEquals(4, found(v -> Math.pow(Math.max(0, v), 1.5) - 8, -500, 500).x(), 1e-12);
  }

  @Test
  void acceptsRootsAtTheEnds() {
    assertEquals(1, found(x -> x - 1, 1, 2).x(), 0);
    assertEquals(2, found(x -> x - 2, 1, 2).x(), 0);
  }

  @Test
  void saysWhyThereIsNone() {
    RootOutcome.NotFound same =
        assertInstanceOf(RootOutcome.NotFound.class, Roots.bracketed(x -> 1, 0, 1, 1e-9));
    assertTrue(same.reason().contains("same sign"), same.reason());
    RootOutcome.NotFound notFinite =
        assertInstanceOf(
            RootOutcome.NotFound.class,
            Roots.bracketed(x -> x > 0.3 && x < 0.7 ? Double.NaN : x - 0.5, 0, 1, 1e-9));
    assertTrue(notFinite.reason().contains("not finite"), notFinite.reason());
    assertTrue(notFinite.lastPoint() > 0.3 && notFinite.lastPoint() < 0.7);
  }

  @Test
  void refusesMisuse() {
    assertThrows(IllegalArgumentException.class, () -> Roots.bracketed(x -> x, 1, 1, 1e-9));
    assertThrows(
        IllegalArgumentException.class,
        () -> Roots.bracketed(x -> x, 0, Double.POSITIVE_INFINITY, 1e-9));
    assertThrows(IllegalArgumentException.class, () -> Roots.bracketed(x -> x, -1, 1, 0));
  }

  private static RootOutcome.Found found(DoubleUnaryOperator function, double low, double high) {
    return assertInstanceOf(RootOutcome.Found.class, Roots.bracketed(function, low, high, 1e-13));
  }
}
