package perveance.engine.numeric;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class QuadratureTest {
  /** Derived: n points are exact to degree 2 n - 1; the integral of x^d from 0 to 2 is closed. */
  @ParameterizedTest
  @ValueSource(ints = {1, 2, 3, 5, 8, 20})
  void isExactForPolynomials(int count) {
    Quadrature rule = Quadrature.gaussLegendre(count);
    for (int degree = 0; degree < 2 * count; degree++) {
      int power = degree;
      double exact = Math.pow(2, degree + 1) / (degree + 1);
      assertEquals(1, rule.integrate(x -> Math.pow(x, power), 0, 2) / exact, 1e-13);
    }
  }

  /** Derived: one degree more is not exact; two points take x^4 over -1 to 1 for 2/9, not 2/5. */
  @Test
  void isNoBetterThanItsRule() {
    assertEquals(2.0 / 9, Quadrature.gaussLegendre(2).integrate(x -> x * x * x * x, -1, 1), 1e-15);
  }

  /** Derived: the integral of sin from 0 to pi is 2, and changes sign with its direction. */
  @Test
  void integratesSmoothFunctions() {
    Quadrature rule = Quadrature.gaussLegendre(12);
    assertEquals(2, rule.integrate(Math::sin, 0, Math.PI), 1e-14);
    assertEquals(-2, rule.integrate(Math::sin, Math.PI, 0), 1e-14);
    assertEquals(0, rule.integrate(Math::exp, 3, 3));
  }

  @Test
  void refusesMisuse() {
    assertThrows(IllegalArgumentException.class, () -> Quadrature.gaussLegendre(0));
    assertThrows(IllegalArgumentException.class, () -> Quadrature.gaussLegendre(201));
    Quadrature rule = Quadrature.gaussLegendre(2);
    assertThrows(IllegalArgumentException.class, () -> rule.integrate(x -> x, 0, Double.NaN));
  }
}
