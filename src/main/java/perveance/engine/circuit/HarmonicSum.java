package perveance.engine.circuit;

import perveance.engine.circuit.Element.Capacitor;

/**
 * Puts the waveforms of all nodes and branches together from what device currents, drive and dc
 * sources do at each harmonic.
 */
final class HarmonicSum {
  /** By place of the frame and sample [V] or [A]. */
  final double[][] value;

  /** By element and sample, filled for capacitors [A]. */
  final double[][] capacitorCurrent;

  private final HarmonicNetwork network;
  private final int count;

  HarmonicSum(
      HarmonicNetwork network,
      HarmonicEquations equations,
      Waveform waveform,
      double peak,
      double frequency) {
    this.network = network;
    this.count = waveform.count();
    this.value = new double[network.size][count];
    this.capacitorCurrent = new double[network.circuit.elements().size()][count];
    double[] causeRe = new double[network.driveCause() + 2];
    double[] causeIm = new double[causeRe.length];
    for (int h = 0; h <= count / 2; h++) {
      for (int j = 0; j < equations.nodes; j++) {
        int node = j;
        transform(h, j, causeRe, causeIm, k -> -equations.current(k, node));
      }
      transform(h, network.driveCause(), causeRe, causeIm, k -> peak * waveform.sample(k));
      causeRe[network.driveCause() + 1] = h == 0 ? 1 : 0;
      add(h, causeRe, causeIm, frequency);
    }
  }

  private void transform(
      int h, int cause, double[] re, double[] im, java.util.function.IntToDoubleFunction samples) {
    double weight = (h == 0 || h == count / 2 ? 1.0 : 2.0) / count;
    re[cause] = 0;
    im[cause] = 0;
    for (int k = 0; k < count; k++) {
      double angle = 2 * Math.PI * ((long) h * k % count) / count;
      re[cause] += weight * samples.applyAsDouble(k) * Math.cos(angle);
      im[cause] -= weight * samples.applyAsDouble(k) * Math.sin(angle);
    }
  }

  private void add(int h, double[] causeRe, double[] causeIm, double frequency) {
    double[] re = new double[network.size];
    double[] im = new double[network.size];
    for (int place = 0; place < network.size; place++) {
      for (int c = 0; c < causeRe.length; c++) {
        double gRe = network.re(h, c, place);
        double gIm = network.im(h, c, place);
        re[place] += gRe * causeRe[c] - gIm * causeIm[c];
        im[place] += gRe * causeIm[c] + gIm * causeRe[c];
      }
      wave(h, re[place], im[place], value[place]);
    }
    // at half the samples a sine shows nothing, so a capacitor's current is left out there
    double omega = h == count / 2 ? 0 : 2 * Math.PI * frequency * h;
    for (int i = 0; i < capacitorCurrent.length; i++) {
      if (network.circuit.elements().get(i) instanceof Capacitor c) {
        double across = re[c.a()] - re[c.b()];
        double acrossIm = im[c.a()] - im[c.b()];
        double factor = omega * c.capacitance();
        wave(h, -factor * acrossIm, factor * across, capacitorCurrent[i]);
      }
    }
  }

  private void wave(int h, double re, double im, double[] out) {
    for (int k = 0; k < count; k++) {
      double angle = 2 * Math.PI * ((long) h * k % count) / count;
      out[k] += re * Math.cos(angle) - im * Math.sin(angle);
    }
  }
}
