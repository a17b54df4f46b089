package perveance.engine.numeric;

/**
 * Harmonic amplitudes from a few ordinates of a waveform along the load line, as handbooks compute
 * them by hand: exact for transfer curves of the degree that the ordinates can tell. They check the
 * transform; the program itself does not use them.
 */
final class OrdinateSchedules {
  private OrdinateSchedules() {}

  /** The transfer curve at a share of the peak swing, from -1 to 1. */
  @FunctionalInterface
  interface Curve {
    double at(double share);
  }

  /** Three ordinates: mean, fundamental, second harmonic. */
  static double[] three(Curve i) {
    return new double[] {
      (i.at(1) + 2 * i.at(0) + i.at(-1)) / 4,
      (i.at(1) - i.at(-1)) / 2,
      (i.at(1) - 2 * i.at(0) + i.at(-1)) / 4
    };
  }

  /** Five ordinates at half steps (D. C. Espley, Proc. IRE 21, 1439, 1933): to the fourth. */
  static double[] five(Curve i) {
    return new double[] {
      (i.at(1) + 2 * i.at(0.5) + 2 * i.at(-0.5) + i.at(-1)) / 6,
      (i.at(1) + i.at(0.5) - i.at(-0.5) - i.at(-1)) / 3,
      (i.at(1) - 2 * i.at(0) + i.at(-1)) / 4,
      (i.at(1) - 2 * i.at(0.5) + 2 * i.at(-0.5) - i.at(-1)) / 6,
      (i.at(1) - 4 * i.at(0.5) + 6 * i.at(0) - 4 * i.at(-0.5) + i.at(-1)) / 12
    };
  }

  /** Five ordinates at 0.707 of the swing (RCA Receiving Tube Manual): first to third. */
  static double[] fiveAtEighths(Curve i) {
    double root = Math.sqrt(2);
    double x = 1 / root;
    double outer = i.at(1) - i.at(-1);
    double inner = root * (i.at(x) - i.at(-x));
    return new double[] {
      Double.NaN, (outer + inner) / 4, (i.at(1) - 2 * i.at(0) + i.at(-1)) / 4, (outer - inner) / 4
    };
  }

  /** Seven ordinates at 0.866 and 0.5 of the swing: first to sixth harmonic. */
  static double[] seven(Curve i) {
    double root = Math.sqrt(3);
    double x = root / 2;
    double outer = i.at(1) - i.at(-1);
    double middle = i.at(x) - i.at(-x);
    double inner = i.at(0.5) - i.at(-0.5);
    double ends = i.at(1) + i.at(-1);
    double far = i.at(x) + i.at(-x);
    double near = i.at(0.5) + i.at(-0.5);
    return new double[] {
      (ends + 2 * far + 2 * near + 2 * i.at(0)) / 12,
      (outer + root * middle + inner) / 6,
      (ends + far - near - 2 * i.at(0)) / 6,
      (outer - 2 * inner) / 6,
      (ends - far - near + 2 * i.at(0)) / 6,
      (outer - root * middle + inner) / 6,
      (ends - 2 * far + 2 * near - 2 * i.at(0)) / 12
    };
  }

  /** Eleven ordinates at equal angles of 18 degrees: mean to tenth harmonic. */
  static double[] eleven(Curve i) {
    double[] amplitudes = new double[11];
    for (int n = 0; n <= 10; n++) {
      double sum = 0;
      for (int k = 0; k <= 10; k++) {
        double end = k == 0 || k == 10 ? 0.5 : 1;
        sum += end * i.at(Math.cos(k * Math.PI / 10)) * Math.cos(n * k * Math.PI / 10);
      }
      amplitudes[n] = sum / (n == 0 || n == 10 ? 10 : 5);
    }
    return amplitudes;
  }
}
