package perveance.engine.circuit;

/**
 * The steady state at all samples of a period at once: at each sample k and device node j, x - v0 +
 * sum over samples and nodes of z (i(x) - g x) = 0, where v0 is what the sources make and z the
 * response to an impulse of current (harmonic balance with the devices in the time domain: M. S.
 * Nakhla and J. Vlach, IEEE Trans. Circuits Syst. 23, 85, 1976). Exact in time for waveforms
 * without harmonics from half the samples up.
 */
final class HarmonicEquations {
  final int samples;
  final int nodes;
  private final HarmonicNetwork network;
  private final ValveBank valves;
  private final JunctionBank junctions;
  private final double[] voltage;
  private final double[][] known;

  /** Impulse response by shift, node and cause. */
  private final double[][][] impulse;

  private final double[] perDrive;
  private final double[] quiet;
  private final double[] current;
  private final double[][] slopes;

  HarmonicEquations(HarmonicNetwork network, Waveform waveform, double[][] knownVoltages) {
    this.network = network;
    this.samples = waveform.count();
    this.nodes = network.deviceNode.length;
    this.valves = new ValveBank(network.circuit, network.topology);
    this.junctions = new JunctionBank(network.circuit, network.topology);
    valves.take(new ElementValues(network.circuit));
    this.voltage = new double[network.topology.nodeCount];
    this.known = knownVoltages;
    this.impulse = new double[samples][nodes][nodes];
    this.perDrive = new double[samples * nodes];
    this.quiet = new double[samples * nodes];
    this.current = new double[samples * nodes];
    this.slopes = new double[samples][nodes * nodes];
    fillImpulses();
    fillSources(waveform);
  }

  private void fillImpulses() {
    for (int n = 0; n < samples; n++) {
      for (int h = 0; h <= samples / 2; h++) {
        double weight = (h == 0 || h == samples / 2 ? 1.0 : 2.0) / samples;
        double cos = weight * Math.cos(2 * Math.PI * ((long) h * n % samples) / samples);
        double sin = weight * Math.sin(2 * Math.PI * ((long) h * n % samples) / samples);
        for (int j = 0; j < nodes; j++) {
          for (int c = 0; c < nodes; c++) {
            int at = network.deviceNode[j];
            impulse[n][j][c] += network.re(h, c, at) * cos - network.im(h, c, at) * sin;
          }
        }
      }
    }
  }

  private void fillSources(Waveform waveform) {
    int drive = network.driveCause();
    for (int k = 0; k < samples; k++) {
      for (int j = 0; j < nodes; j++) {
        int at = network.deviceNode[j];
        quiet[k * nodes + j] = network.re(0, drive + 1, at);
      }
    }
    for (int h = 0; h <= samples / 2; h++) {
      double weight = (h == 0 || h == samples / 2 ? 1.0 : 2.0) / samples;
      for (int n = 0; n < samples; n++) {
        double cos = weight * Math.cos(2 * Math.PI * ((long) h * n % samples) / samples);
        double sin = weight * Math.sin(2 * Math.PI * ((long) h * n % samples) / samples);
        for (int j = 0; j < nodes; j++) {
          int at = network.deviceNode[j];
          double shifted = network.re(h, drive, at) * cos - network.im(h, drive, at) * sin;
          for (int k = 0; k < samples; k++) {
            perDrive[(k + n) % samples * nodes + j] += shifted * waveform.sample(k);
          }
        }
      }
    }
  }

  /** Evaluates the devices at all samples and writes what is left of the equations [V]. */
  void residual(double[] x, double peak, double[] out) {
    for (int k = 0; k < samples; k++) {
      evaluate(x, peak, k);
    }
    for (int k = 0; k < samples; k++) {
      for (int j = 0; j < nodes; j++) {
        int row = k * nodes + j;
        double sum = x[row] - quiet[row] - peak * perDrive[row];
        for (int other = 0; other < samples; other++) {
          double[] response = impulse[(k - other + samples) % samples][j];
          for (int c = 0; c < nodes; c++) {
            sum += response[c] * current[other * nodes + c];
          }
        }
        out[row] = sum;
      }
    }
  }

  private void evaluate(double[] x, double peak, int k) {
    place(x, peak, k);
    double[] leaving = new double[nodes];
    valves.addCurrents(leaving);
    junctions.addCurrents(leaving);
    java.util.Arrays.fill(slopes[k], 0);
    valves.addSlopes(slopes[k], nodes);
    junctions.addSlopes(slopes[k], nodes);
    for (int j = 0; j < nodes; j++) {
      slopes[k][j * nodes + j] -= HarmonicNetwork.REFERENCE;
      current[k * nodes + j] = leaving[j] - HarmonicNetwork.REFERENCE * x[k * nodes + j];
    }
  }

  private void place(double[] x, double peak, int k) {
    for (int node = 0; node < voltage.length; node++) {
      int row = network.topology.row[node];
      if (row < 0) {
        voltage[node] = known[0][node] + peak * known[k + 1][node];
      } else if (row < nodes) {
        voltage[node] = x[k * nodes + row];
      }
    }
    valves.evaluate(voltage);
    junctions.evaluate(voltage);
  }

  /** Writes the matrix of derivatives at the point that was last evaluated, row by row. */
  void jacobian(double[] out) {
    int size = samples * nodes;
    for (int k = 0; k < samples; k++) {
      for (int other = 0; other < samples; other++) {
        double[][] response = impulse[(k - other + samples) % samples];
        for (int j = 0; j < nodes; j++) {
          int row = (k * nodes + j) * size + other * nodes;
          for (int by = 0; by < nodes; by++) {
            double sum = k == other && j == by ? 1 : 0;
            for (int c = 0; c < nodes; c++) {
              sum += response[j][c] * slopes[other][c * nodes + by];
            }
            out[row + by] = sum;
          }
        }
      }
    }
  }

  /** Current out of a device node into the network, its reference current taken back [A]. */
  double current(int sample, int node) {
    return current[sample * nodes + node];
  }
}
