package perveance.accuracy;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.OptionalDouble;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.Evidence;
import perveance.engine.device.SpreadTriodeLaw;
import perveance.engine.device.SpreadTriodeParameters;
import perveance.engine.device.fit.Figure;
import perveance.engine.device.fit.LawReadings;

/** Published exercises on triode constants, answered by laws and read off as evidence is. */
@Tag("published")
class TriodeExercisesTest {
  private static Evidence point(double anode, double grid) {
    OptionalDouble none = OptionalDouble.empty();
    return new Evidence(
        "triode",
        "point",
        anode,
        OptionalDouble.of(grid),
        none,
        none,
        none,
        none,
        none,
        none,
        true,
        "exercise",
        "found",
        "high",
        "");
  }

  private static double read(DeviceLaw law, double anode, double grid, Figure figure) {
    return new LawReadings(law).predict(point(anode, grid), figure);
  }

  /** The plane through three readings of current, as difference formulas assume it. */
  private static DeviceLaw linear(double rest, double gm, double ra) {
    return new FormulaTriode() {
      @Override
      protected double anodeCurrent(double anode, double grid) {
        return rest + gm * grid + anode / ra;
      }
    };
  }

  /**
   * W14: i = 41 (Va + 7 Vg)^1.41 uA at 250 V, -20 V gives 30 mA, 2.53 k, 2.77 mA/V, 7 (H. C. Verma,
   * Concepts of Physics 2). Recomputed 30.98 mA, 2518 ohm, 2.780 mA/V, 7; tolerance half of the
   * last digit recomputed.
   */
  @Test
  void vermaPowerLaw() {
    DeviceLaw law =
        new FormulaTriode() {
          @Override
          protected double anodeCurrent(double anode, double grid) {
            return 41e-6 * Math.pow(Math.max(0, anode + 7 * grid), 1.41);
          }
        };
    assertEquals(30.98e-3, read(law, 250, -20, Figure.CURRENT), 5e-6);
    assertEquals(2518, read(law, 250, -20, Figure.ANODE_RESISTANCE), 0.6);
    assertEquals(2.780e-3, read(law, 250, -20, Figure.MUTUAL_CONDUCTANCE), 6e-7);
    assertEquals(7, read(law, 250, -20, Figure.AMPLIFICATION), 1e-5);
  }

  /**
   * W15: a three-halves triode with ra 10 k, gm 5 mA/V at 8 mA and 300 V: mu 50, cut-off -6 V
   * (examination paper). With the project's law without spread: K = (1/30)^1.5 mA V^-1.5, bias -3.6
   * V.
   */
  @Test
  void threeHalvesTriodeFromItsConstants() {
    double k = 1e-3 * Math.pow(1.0 / 30, 1.5);
    DeviceLaw law =
        new SpreadTriodeLaw(
            new SpreadTriodeParameters(
                k * Math.pow(50, 1.5), 0, 1.0 / 50, 0, 1e-3, 1e-4, -0.5, 0.0862));
    assertEquals(8e-3, read(law, 300, -3.6, Figure.CURRENT), 1e-9);
    assertEquals(10e3, read(law, 300, -3.6, Figure.ANODE_RESISTANCE), 1e-3);
    assertEquals(5e-3, read(law, 300, -3.6, Figure.MUTUAL_CONDUCTANCE), 1e-9);
    assertEquals(50, read(law, 300, -3.6, Figure.AMPLIFICATION), 1e-6);
    assertEquals(0, read(law, 300, -6, Figure.CURRENT), 1e-12);
  }

  /**
   * W16: 15, 12.5, 10, 7.5 mA at 150 V and 10, 7.5, 5, 2.5 mA at 120 V for 0, -2, -4, -6 V: ra
   * 6000, gm 1.25 mA/V, mu 7.5 (examination paper). All eight readings lie on the plane of the
   * answer.
   */
  @Test
  void eightReadingsOnAPlane() {
    DeviceLaw law = linear(-10e-3, 1.25e-3, 6000);
    for (int i = 0; i < 4; i++) {
      assertEquals(15e-3 - 2.5e-3 * i, read(law, 150, -2 * i, Figure.CURRENT), 1e-12);
      assertEquals(10e-3 - 2.5e-3 * i, read(law, 120, -2 * i, Figure.CURRENT), 1e-12);
    }
    assertEquals(7.5, read(law, 150, -2, Figure.AMPLIFICATION), 1e-6);
  }

  /** W17: I = 0.125 V - 7.5 mA at -1 V and 5 mA at -3 V, 300 V: 8 k, 12.5 mA/V, 100 (IIT-JEE). */
  @Test
  void jeeTriode() {
    DeviceLaw law = linear(-7.5e-3 + 12.5e-3, 12.5e-3, 8000);
    assertEquals(0.125e-3 * 300 - 7.5e-3, read(law, 300, -1, Figure.CURRENT), 1e-12);
    assertEquals(5e-3, read(law, 300, -3, Figure.CURRENT), 1e-12);
    assertEquals(100, read(law, 300, -3, Figure.AMPLIFICATION), 1e-5);
  }

  /**
   * W18 to W21 (H. C. Verma): the same current at 225 V, -0.5 V and 250 V, -2.5 V means mu 12.5;
   * with 8 k and 2.5 mA/V, 48 V more are 6 mA or 2.4 V of grid; with 10 k and mu 20 at 250 V, -7.5
   * V and 10 mA, 15 mA need -5 V, and 200 V bring them back; 2 k and 2 mA/V are mu 4.
   */
  @Test
  void vermaLinearTriodes() {
    DeviceLaw first = linear(0, 12.5 / 10e3, 10e3);
    assertEquals(
        read(first, 225, -0.5, Figure.CURRENT), read(first, 250, -2.5, Figure.CURRENT), 1e-12);
    DeviceLaw second = linear(0, 2.5e-3, 8e3);
    double rest = read(second, 200, -5, Figure.CURRENT);
    assertEquals(6e-3, read(second, 248, -5, Figure.CURRENT) - rest, 1e-12);
    assertEquals(rest, read(second, 248, -7.4, Figure.CURRENT), 1e-12);
    DeviceLaw third = linear(10e-3 - 25e-3 + 15e-3, 2e-3, 10e3);
    assertEquals(10e-3, read(third, 250, -7.5, Figure.CURRENT), 1e-12);
    assertEquals(15e-3, read(third, 250, -5, Figure.CURRENT), 1e-12);
    assertEquals(10e-3, read(third, 200, -5, Figure.CURRENT), 1e-12);
    assertEquals(4, read(linear(0, 2e-3, 2e3), 100, 0, Figure.AMPLIFICATION), 1e-6);
  }

  /** W22: mu 30 and 21 with 5 k and 4 k in parallel: mu 25, 2222 ohm, 11.25 mA/V. */
  @Test
  void triodesInParallel() {
    DeviceLaw one = linear(0, 30 / 5e3, 5e3);
    DeviceLaw other = linear(0, 21 / 4e3, 4e3);
    DeviceLaw both =
        new FormulaTriode() {
          @Override
          protected double anodeCurrent(double anode, double grid) {
            return read(one, anode, grid, Figure.CURRENT)
                + read(other, anode, grid, Figure.CURRENT);
          }
        };
    assertEquals(25, read(both, 100, 0, Figure.AMPLIFICATION), 1e-5);
    assertEquals(2222, read(both, 100, 0, Figure.ANODE_RESISTANCE), 0.5);
    assertEquals(11.25e-3, read(both, 100, 0, Figure.MUTUAL_CONDUCTANCE), 1e-9);
  }

  /**
   * W23: Barkhausen's S D Ri = 1 with the ECC83's 1.6 mA/V and 62.5 k: mu 100, D 1 %. The law of
   * the library keeps the identity exactly and the figures within the 6 % of its tabulated points.
   */
  @Test
  void barkhausen() {
    DeviceLaw law = Library.device("ECC83").law();
    double s = read(law, 250, -2, Figure.MUTUAL_CONDUCTANCE);
    double ri = read(law, 250, -2, Figure.ANODE_RESISTANCE);
    double d = 1 / read(law, 250, -2, Figure.AMPLIFICATION);
    assertEquals(1, s * d * ri, 1e-12);
    assertEquals(0.01, d, 0.06 * 0.01);
    assertEquals(100, 1.6e-3 * 62.5e3, 1e-9);
  }
}
