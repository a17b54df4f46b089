package perveance.engine.circuit;

import perveance.engine.circuit.Element.Transformer;

/**
 * Waveforms of all voltages and currents over one period, and their mean powers; filled sample by
 * sample from the ledger of currents.
 */
final class CycleRecord {
  private static final int ELECTRODES = 3;

  final int count;

  /** Node voltages by node and sample [V]. */
  final double[][] voltage;

  /** Currents by element and sample [A]. */
  final double[][] current;

  /** Winding currents by element, winding and sample; empty for others [A]. */
  final double[][][] winding;

  /** Electrode currents by valve, electrode and sample [A]. */
  final double[][][] electrode;

  /** Mean power by element [W]. */
  final double[] power;

  /** Mean electrode power by valve and electrode [W]. */
  final double[][] electrodePower;

  final int[] valveElements;

  /** Largest current that Kirchhoff's law left over in any sample [A]. */
  double residual;

  CycleRecord(Topology topology, ValveBank valves, int count) {
    int elements = topology.circuit.elements().size();
    this.count = count;
    this.voltage = new double[topology.nodeCount][count];
    this.current = new double[elements][count];
    this.winding = new double[elements][][];
    for (int i = 0; i < elements; i++) {
      Element element = topology.circuit.elements().get(i);
      winding[i] = new double[element instanceof Transformer e ? e.windings().size() : 0][count];
    }
    this.electrode = new double[valves.count][ELECTRODES][count];
    this.power = new double[elements];
    this.electrodePower = new double[valves.count][ELECTRODES];
    this.valveElements = valves.element;
  }

  /** Writes one sample; a mirrored one also in its mirror's place. */
  void write(int k, boolean mirrored, double[] nodes, CurrentLedger ledger, ValveBank valves) {
    int mirror = mirrored ? count - k : k;
    double weight = (mirrored ? 2.0 : 1.0) / count;
    for (int n = 0; n < voltage.length; n++) {
      voltage[n][k] = nodes[n];
      voltage[n][mirror] = nodes[n];
    }
    for (int i = 0; i < current.length; i++) {
      current[i][k] = ledger.current[i];
      current[i][mirror] = ledger.current[i];
      power[i] += weight * ledger.power[i];
      for (int w = 0; w < winding[i].length; w++) {
        winding[i][w][k] = ledger.winding[i][w];
        winding[i][w][mirror] = ledger.winding[i][w];
      }
    }
    for (int v = 0; v < electrode.length; v++) {
      double cathode = nodes[valves.cathode(v)];
      for (int e = 0; e < valves.active(v); e++) {
        double into = valves.point[v].current(e);
        electrode[v][e][k] = into;
        electrode[v][e][mirror] = into;
        electrodePower[v][e] += weight * into * (nodes[valves.electrode(v, e)] - cathode);
      }
    }
    residual = Math.max(residual, ledger.residual());
  }

  int valve(int element) {
    for (int v = 0; v < valveElements.length; v++) {
      if (valveElements[v] == element) {
        return v;
      }
    }
    throw new IllegalArgumentException("element " + element + " is no valve");
  }
}
