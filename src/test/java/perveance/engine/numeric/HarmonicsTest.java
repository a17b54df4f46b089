package perveance.engine.numeric;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import java.util.function.DoubleUnaryOperator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class HarmonicsTest {
  /** A transfer curve in mA over the share x of the peak swing. */
  private static double curve(double x) {
    return 40 + 30 * x + 4 * x * x + 1.5 * x * x * x + 0.5 * x * x * x * x;
  }

  /**
   * Derived: cos^n in multiple angles gives A0 = 40 + 4/2 + 3 (0.5)/8, A1 = 30 + 3 (1.5)/4, A2 =
   * 4/2 + 0.5/2, A3 = 1.5/4, A4 = 0.5/8, all exact; tolerance a few roundings of 76 mA.
   */
  @Test
  void findsTheHarmonicsOfAFourthDegreeCurve() {
    Harmonics harmonics = Harmonics.of(driven(HarmonicsTest::curve, 16));
    assertEquals(42.1875, harmonics.mean(), 1e-13);
    assertEquals(31.125, harmonics.cosine(1), 1e-13);
    assertEquals(2.25, harmonics.cosine(2), 1e-13);
    assertEquals(0.375, harmonics.cosine(3), 1e-13);
    assertEquals(0.0625, harmonics.cosine(4), 1e-13);
    assertEquals(0, harmonics.amplitude(5), 1e-13);
    // the same as shares, to the digits printed
    assertEquals(0.07229, harmonics.relative(2).orElseThrow(), 0.000005);
    assertEquals(0.01205, harmonics.relative(3).orElseThrow(), 0.000005);
    assertEquals(0.00201, harmonics.relative(4).orElseThrow(), 0.000005);
    assertEquals(0.07331, harmonics.distortion(4).orElseThrow(), 0.000005);
  }

  /**
   * Derived: schedules for hand use agree with the transform as far as their ordinates can tell.
   * The three-ordinate one takes the third harmonic for fundamental: A1 = 31.5.
   */
  @Test
  void agreesWithTheSchedulesOfTheHandbooks() {
    Harmonics harmonics = Harmonics.of(driven(HarmonicsTest::curve, 16));
    assertAgree(harmonics, OrdinateSchedules.five(HarmonicsTest::curve), 4);
    assertAgree(harmonics, OrdinateSchedules.fiveAtEighths(HarmonicsTest::curve), 3);
    assertAgree(harmonics, OrdinateSchedules.seven(HarmonicsTest::curve), 6);
    assertAgree(harmonics, OrdinateSchedules.eleven(HarmonicsTest::curve), 7);
    double[] three = OrdinateSchedules.three(HarmonicsTest::curve);
    assertEquals(31.5, three[1], 1e-13);
    assertEquals(2.25, three[2], 1e-13);
  }

  /** The ordinates of the fourth-degree curve as printed, to three decimals. */
  @Test
  void ordinatesAreThosePrinted() {
    assertEquals(76, curve(1), 0.0005);
    assertEquals(56.219, curve(0.5), 0.0005);
    assertEquals(25.844, curve(-0.5), 0.0005);
    assertEquals(13, curve(-1), 0.0005);
    assertEquals(63.8685, curve(Math.sqrt(0.5)), 0.00005);
    assertEquals(20.3815, curve(-Math.sqrt(0.5)), 0.00005);
  }

  /** Derived: on random curves of the degree each schedule can tell, all amplitudes agree. */
  @Test
  void agreesWithTheSchedulesOnRandomCurves() {
    Random random = new Random(1934);
    for (int round = 0; round < 100; round++) {
      double[] c = random.doubles(11, -1, 1).toArray();
      assertAgree(
          Harmonics.of(driven(x -> polynomial(c, x, 4), 16)),
          OrdinateSchedules.five(x -> polynomial(c, x, 4)),
          4);
      assertAgree(
          Harmonics.of(driven(x -> polynomial(c, x, 6), 16)),
          OrdinateSchedules.seven(x -> polynomial(c, x, 6)),
          6);
      assertAgree(
          Harmonics.of(driven(x -> polynomial(c, x, 10), 32)),
          OrdinateSchedules.eleven(x -> polynomial(c, x, 10)),
          10);
    }
  }

  /**
   * Published: output extremes of 22 V and 1 V about a rest of 12 V give 2.38 % second harmonic; 20
   * V and 4 V give none (Boylestad and Nashelsky, Electronic Devices and Circuit Theory, example
   * 12.15). A parabola passes through the three; tolerance half of the last digit.
   */
  @Test
  void secondHarmonicFromThreeOrdinates() {
    Harmonics first = Harmonics.of(driven(x -> 12 + 10.5 * x - 0.5 * x * x, 8));
    assertEquals(0.0238, first.relative(2).orElseThrow(), 0.00005);
    Harmonics second = Harmonics.of(driven(x -> 12 + 8 * x, 8));
    assertEquals(0, second.relative(2).orElseThrow(), 1e-15);
  }

  /**
   * Published: harmonics of 10 %, 2 % and 1 % of 4 A in 8 ohm: 0.1025 in all (the book rounds to
   * 0.1), 64 W of fundamental, 64.67 W together (same book, example 12.16, 64.64 W from the rounded
   * figure). Tolerance half of the last digit.
   */
  @Test
  void distortionAddsAsSquares() {
    double[] samples = new double[32];
    for (int k = 0; k < 32; k++) {
      double t = 2 * Math.PI * k / 32;
      samples[k] =
          4
              * (Math.cos(t)
                  + 0.1 * Math.sin(2 * t)
                  - 0.02 * Math.cos(3 * t)
                  + 0.01 * Math.cos(4 * t));
    }
    Harmonics harmonics = Harmonics.of(samples);
    double distortion = harmonics.distortion(15).orElseThrow();
    assertEquals(0.1025, distortion, 0.00005);
    double fundamental = harmonics.amplitude(1) * harmonics.amplitude(1) / 2 * 8;
    assertEquals(64, fundamental, 1e-12);
    assertEquals(64.67, fundamental * (1 + distortion * distortion), 0.005);
  }

  /** Derived: amplitude and phase of a shifted cosine; the mean square is that of the harmonics. */
  @ParameterizedTest
  @ValueSource(ints = {8, 64, 1024})
  void amplitudePhaseAndPower(int count) {
    Random random = new Random(count);
    double[] samples = new double[count];
    double[] amplitude = new double[count / 2];
    double[] phase = new double[count / 2];
    for (int n = 1; n < count / 2; n++) {
      amplitude[n] = 0.1 + random.nextDouble();
      phase[n] = 6 * random.nextDouble() - 3;
    }
    double square = 0;
    for (int k = 0; k < count; k++) {
      for (int n = 1; n < count / 2; n++) {
        samples[k] += amplitude[n] * Math.cos(2 * Math.PI * n * k / count + phase[n]);
      }
      square += samples[k] * samples[k] / count;
    }
    Harmonics harmonics = Harmonics.of(samples);
    double sum = 0;
    for (int n = 1; n < count / 2; n++) {
      assertEquals(amplitude[n], harmonics.amplitude(n), 1e-11);
      assertEquals(phase[n], harmonics.phase(n), 1e-10);
      assertEquals(amplitude[n] * Math.cos(phase[n]), harmonics.cosine(n), 1e-11);
      assertEquals(-amplitude[n] * Math.sin(phase[n]), harmonics.sine(n), 1e-11);
      sum += harmonics.amplitude(n) * harmonics.amplitude(n) / 2;
    }
    assertEquals(1, sum / square, 1e-12);
  }

  @Test
  void silenceHasNoDistortion() {
    Harmonics harmonics = Harmonics.of(new double[8]);
    assertTrue(harmonics.distortion(3).isEmpty());
    assertTrue(harmonics.relative(2).isEmpty());
    assertEquals(0, harmonics.phase(1));
  }

  @Test
  void refusesMisuse() {
    assertThrows(IllegalArgumentException.class, () -> Harmonics.of(new double[12]));
    assertThrows(IllegalArgumentException.class, () -> Harmonics.of(new double[2]));
    assertThrows(
        IllegalArgumentException.class, () -> Harmonics.of(new double[] {0, 1, Double.NaN, 0}));
    Harmonics harmonics = Harmonics.of(new double[8]);
    assertThrows(IllegalArgumentException.class, () -> harmonics.amplitude(0));
    assertThrows(IllegalArgumentException.class, () -> harmonics.amplitude(4));
    assertThrows(IllegalArgumentException.class, () -> harmonics.distortion(4));
  }

  private static void assertAgree(Harmonics harmonics, double[] schedule, int highest) {
    for (int n = 1; n <= highest; n++) {
      assertEquals(schedule[n], harmonics.cosine(n), 1e-12, "harmonic " + n);
    }
    if (!Double.isNaN(schedule[0])) {
      assertEquals(schedule[0], harmonics.mean(), 1e-12, "mean");
    }
  }

  private static double[] driven(DoubleUnaryOperator transfer, int count) {
    double[] samples = new double[count];
    for (int k = 0; k < count; k++) {
      samples[k] = transfer.applyAsDouble(Math.cos(2 * Math.PI * k / count));
    }
    return samples;
  }

  private static double polynomial(double[] c, double x, int degree) {
    double sum = 0;
    for (int n = degree; n >= 0; n--) {
      sum = sum * x + c[n];
    }
    return sum;
  }
}
