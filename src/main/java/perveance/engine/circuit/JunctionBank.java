package perveance.engine.circuit;

import perveance.engine.circuit.Element.Junction;

/** The junctions of a circuit: evaluates their laws and adds them to the nodal equations. */
final class JunctionBank {
  final int count;
  final int[] element;
  final double[] current;
  final double[] conductance;
  private final JunctionLaw[] laws;
  private final int[] anode;
  private final int[] cathode;
  private final int[] anodeRow;
  private final int[] cathodeRow;

  JunctionBank(Circuit circuit, Topology topology) {
    element = Elements.indexArray(circuit, Junction.class);
    count = element.length;
    current = new double[count];
    conductance = new double[count];
    laws = new JunctionLaw[count];
    anode = new int[count];
    cathode = new int[count];
    anodeRow = new int[count];
    cathodeRow = new int[count];
    for (int j = 0; j < count; j++) {
      Junction junction = (Junction) circuit.elements().get(element[j]);
      laws[j] = junction.law();
      anode[j] = junction.anode();
      cathode[j] = junction.cathode();
      anodeRow[j] = topology.row[anode[j]];
      cathodeRow[j] = topology.row[cathode[j]];
    }
  }

  int anode(int j) {
    return anode[j];
  }

  int cathode(int j) {
    return cathode[j];
  }

  void evaluate(double[] voltage) {
    for (int j = 0; j < count; j++) {
      double across = voltage[anode[j]] - voltage[cathode[j]];
      current[j] = laws[j].current(across);
      conductance[j] = laws[j].conductance(across);
    }
  }

  void addCurrents(double[] residual) {
    for (int j = 0; j < count; j++) {
      if (anodeRow[j] >= 0) {
        residual[anodeRow[j]] += current[j];
      }
      if (cathodeRow[j] >= 0) {
        residual[cathodeRow[j]] -= current[j];
      }
    }
  }

  void addSlopes(double[] matrix, int size) {
    for (int j = 0; j < count; j++) {
      int a = anodeRow[j];
      int c = cathodeRow[j];
      if (a >= 0) {
        matrix[a * size + a] += conductance[j];
      }
      if (c >= 0) {
        matrix[c * size + c] += conductance[j];
      }
      if (a >= 0 && c >= 0) {
        matrix[a * size + c] -= conductance[j];
        matrix[c * size + a] -= conductance[j];
      }
    }
  }
}
