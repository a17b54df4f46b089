package perveance.engine.numeric;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

/** The fast cube root against the library's. */
class CubeRootTest {
  /**
   * Derived: over 600 powers of ten and between, against {@link Math#cbrt} (within one unit in the
   * last place). 1e-14: what two steps leave of the first guess.
   */
  @Test
  void agreesWithTheLibraryEverywhere() {
    for (double x = 1e-300; x < 1e300; x *= 1.037) {
      assertEquals(1, CubeRoot.of(x) / Math.cbrt(x), 1e-14, "at " + x);
    }
    assertEquals(0, CubeRoot.of(0), 0);
    assertEquals(Math.cbrt(Double.MIN_VALUE), CubeRoot.of(Double.MIN_VALUE), 1e-120);
    assertEquals(3, CubeRoot.of(27), 1e-13);
  }

  /** Derived: no jumps where the exponent changes its remainder by three; the slope is smooth. */
  @Test
  void risesSteadily() {
    double last = 0;
    for (double x = 0.1; x < 100; x += 1e-3) {
      double root = CubeRoot.of(x);
      if (last > 0) {
        double slope = (root - last) / 1e-3;
        double middle = x - 0.5e-3;
        assertEquals(1 / (3 * Math.cbrt(middle * middle)), slope, 1e-4 * slope, "at " + x);
      }
      last = root;
    }
  }
}
