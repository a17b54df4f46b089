package perveance.engine.circuit;

import perveance.engine.circuit.Element.Valve;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.device.LawKind;

/** The valves of a circuit: evaluates their laws and adds them to the nodal equations. */
final class ValveBank {
  static final int ELECTRODES = 4;
  private static final int CATHODE = 3;

  final int count;
  final int[] element;
  final ElectrodeCurrents[] point;
  private final DeviceLaw[] laws;

  /** How many electrodes carry current: 1 for a diode, 2 for a triode, 3 for a pentode. */
  private final int[] active;

  /** Anode, grid, screen, cathode of each valve, four entries a valve. */
  private final int[] node;

  private final int[] row;

  ValveBank(Circuit circuit, Topology topology) {
    element = Elements.indexArray(circuit, Valve.class);
    count = element.length;
    point = new ElectrodeCurrents[count];
    laws = new DeviceLaw[count];
    active = new int[count];
    node = new int[ELECTRODES * count];
    row = new int[ELECTRODES * count];
    for (int v = 0; v < count; v++) {
      Element valve = circuit.elements().get(element[v]);
      point[v] = new ElectrodeCurrents();
      System.arraycopy(Terminals.of(valve), 0, node, ELECTRODES * v, ELECTRODES);
      active[v] = activeElectrodes(((Valve) valve).law().kind());
    }
    for (int i = 0; i < node.length; i++) {
      row[i] = topology.row[node[i]];
    }
  }

  private static int activeElectrodes(LawKind kind) {
    return switch (kind) {
      case DIODE -> 1;
      case TRIODE -> 2;
      case PENTODE -> 3;
    };
  }

  void take(ElementValues values) {
    for (int v = 0; v < count; v++) {
      laws[v] = values.law(element[v]);
    }
  }

  DeviceLaw law(int v) {
    return laws[v];
  }

  int active(int v) {
    return active[v];
  }

  int electrode(int v, int electrode) {
    return node[ELECTRODES * v + electrode];
  }

  int anode(int v) {
    return node[ELECTRODES * v];
  }

  int grid(int v) {
    return node[ELECTRODES * v + 1];
  }

  int screen(int v) {
    return node[ELECTRODES * v + 2];
  }

  int cathode(int v) {
    return node[ELECTRODES * v + CATHODE];
  }

  /** Evaluates every law at the node voltages [V]. */
  void evaluate(double[] voltage) {
    for (int v = 0; v < count; v++) {
      double cathode = voltage[cathode(v)];
      laws[v].evaluate(
          voltage[anode(v)] - cathode,
          voltage[grid(v)] - cathode,
          voltage[screen(v)] - cathode,
          point[v]);
    }
  }

  /** Adds the currents that leave each node into the valves. */
  void addCurrents(double[] residual) {
    for (int v = 0; v < count; v++) {
      for (int e = 0; e < active[v]; e++) {
        addCurrent(residual, v, e, point[v].current(e));
      }
    }
  }

  /** Adds a current that enters an electrode and leaves by the cathode [A]. */
  void addCurrent(double[] residual, int v, int electrode, double current) {
    int into = row[ELECTRODES * v + electrode];
    int from = row[ELECTRODES * v + CATHODE];
    if (into >= 0) {
      residual[into] += current;
    }
    if (from >= 0) {
      residual[from] -= current;
    }
  }

  /** Adds the slopes to a matrix of the given width. */
  void addSlopes(double[] matrix, int size) {
    for (int v = 0; v < count; v++) {
      addSlopes(matrix, size, v, point[v]);
    }
  }

  /** Adds the slopes of one valve. */
  void addSlopes(double[] matrix, int size, int v, ElectrodeCurrents slopes) {
    int first = ELECTRODES * v;
    int cathodeRow = row[first + CATHODE];
    for (int e = 0; e < active[v]; e++) {
      int at = row[first + e];
      double byCathode = 0;
      for (int by = 0; by < active[v]; by++) {
        double slope = slopes.slope(e, by);
        int column = row[first + by];
        byCathode -= slope;
        if (column >= 0) {
          add(matrix, size, at, column, slope);
          add(matrix, size, cathodeRow, column, -slope);
        }
      }
      if (cathodeRow >= 0) {
        add(matrix, size, at, cathodeRow, byCathode);
        add(matrix, size, cathodeRow, cathodeRow, -byCathode);
      }
    }
  }

  private static void add(double[] matrix, int size, int at, int column, double value) {
    if (at >= 0) {
      matrix[at * size + column] += value;
    }
  }
}
