package perveance.engine.circuit;

import perveance.engine.circuit.Element.Capacitor;

/** A steady cycle at a stated frequency; immutable. */
public final class ReactiveSolution extends PeriodicState {
  private final double peak;
  private final double frequency;

  ReactiveSolution(
      HarmonicNetwork network,
      HarmonicEquations equations,
      Drive drive,
      double[][] known,
      double peak,
      double frequency) {
    super(network.circuit, record(network, equations, drive, known, peak, frequency));
    this.peak = peak;
    this.frequency = frequency;
  }

  private static CycleRecord record(
      HarmonicNetwork network,
      HarmonicEquations equations,
      Drive drive,
      double[][] known,
      double peak,
      double frequency) {
    Waveform waveform = drive.waveform();
    int count = waveform.count();
    HarmonicSum sum = new HarmonicSum(network, equations, waveform, peak, frequency);
    Topology topology = network.topology;
    ValveBank valves = new ValveBank(network.circuit, topology);
    JunctionBank junctions = new JunctionBank(network.circuit, topology);
    ElementValues values = new ElementValues(network.circuit);
    double[] quiet = values.value.clone();
    valves.take(values);
    CycleRecord cycle = new CycleRecord(topology, valves, count);
    CurrentLedger ledger = new CurrentLedger(topology, valves, junctions);
    double[] voltage = new double[topology.nodeCount];
    for (int k = 0; k < count; k++) {
      int sample = k;
      for (int node = 0; node < voltage.length; node++) {
        voltage[node] =
            topology.row[node] < 0
                ? known[0][node] + peak * known[k + 1][node]
                : sum.value[node][k];
      }
      double signal = peak * waveform.sample(k);
      drive.shares().forEach((s, share) -> values.value[s] = quiet[s] + share * signal);
      valves.evaluate(voltage);
      junctions.evaluate(voltage);
      ledger.fill(
          values,
          voltage,
          (element, winding) ->
              network.circuit.elements().get(element) instanceof Capacitor
                  ? sum.capacitorCurrent[element][sample]
                  : sum.value[network.stamper.place(element) + winding][sample]);
      cycle.write(k, false, voltage, ledger, valves);
    }
    return cycle;
  }

  /**
   * Peak of the drive.
   *
   * @return peak of the waveform [V] or [A]
   */
  public double peak() {
    return peak;
  }

  /**
   * Frequency of the period.
   *
   * @return one over the period [Hz]
   */
  public double frequency() {
    return frequency;
  }
}
