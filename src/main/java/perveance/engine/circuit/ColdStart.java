package perveance.engine.circuit;

import perveance.engine.circuit.Element.VoltageSource;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.ElectrodeCurrents;

/**
 * Where the search for a dc point begins when nothing is known: every valve is replaced by its
 * tangent half-way between zero bias and cut-off at half the supply, and the linear circuit that
 * results is solved. This saves the iterations in which grids would first be driven positive.
 */
final class ColdStart {
  private static final double ELECTRODE_SHARE = 0.5;
  private static final double BIAS_SHARE = 0.5;

  private final NodalSystem system;
  private final double supply;
  private final double[] anode;
  private final double[] grid;
  private final ElectrodeCurrents[] tangent;
  private final DeviceLaw[] known;

  ColdStart(NodalSystem system) {
    int count = system.valves.count;
    this.system = system;
    this.supply = highestSource(system.topology.circuit);
    this.anode = new double[count];
    this.grid = new double[count];
    this.tangent = new ElectrodeCurrents[count];
    this.known = new DeviceLaw[count];
    for (int v = 0; v < count; v++) {
      tangent[v] = new ElectrodeCurrents();
    }
  }

  private static double highestSource(Circuit circuit) {
    double highest = 0;
    for (Element element : circuit.elements()) {
      if (element instanceof VoltageSource e) {
        highest = Math.max(highest, Math.abs(e.voltage()));
      }
    }
    return highest;
  }

  /** Adds the tangents' slopes to a matrix. */
  void addSlopes(double[] matrix, int size) {
    ValveBank valves = system.valves;
    for (int v = 0; v < valves.count; v++) {
      choose(v);
      valves.addSlopes(matrix, size, v, tangent[v]);
    }
  }

  /** Adds the tangents' currents with all unknown voltages at zero. */
  void addCurrents(double[] residual) {
    ValveBank valves = system.valves;
    for (int v = 0; v < valves.count; v++) {
      double cathode = knownVoltage(valves.cathode(v));
      double byAnode = knownVoltage(valves.anode(v)) - cathode - anode[v];
      double byGrid = knownVoltage(valves.grid(v)) - cathode - grid[v];
      double byScreen = knownVoltage(valves.screen(v)) - cathode - anode[v];
      for (int e = 0; e < valves.active(v); e++) {
        double current =
            tangent[v].current(e)
                + tangent[v].slope(e, ElectrodeCurrents.ANODE) * byAnode
                + tangent[v].slope(e, ElectrodeCurrents.GRID) * byGrid
                + tangent[v].slope(e, ElectrodeCurrents.SCREEN) * byScreen;
        valves.addCurrent(residual, v, e, current);
      }
    }
  }

  private double knownVoltage(int node) {
    return system.topology.row[node] < 0 ? system.voltage[node] : 0;
  }

  /** Finds the point of the tangent, again only when the law has changed. */
  private void choose(int v) {
    DeviceLaw law = system.valves.law(v);
    if (law.equals(known[v])) {
      return;
    }
    double half = ELECTRODE_SHARE * supply;
    ElectrodeCurrents point = tangent[v];
    law.evaluate(half, 0, half, point);
    double pull =
        point.slope(ElectrodeCurrents.ANODE, ElectrodeCurrents.ANODE)
            + point.slope(ElectrodeCurrents.ANODE, ElectrodeCurrents.SCREEN);
    double push = point.slope(ElectrodeCurrents.ANODE, ElectrodeCurrents.GRID);
    anode[v] = half;
    grid[v] = push > 0 ? Math.max(-half, -BIAS_SHARE * half * pull / push) : 0;
    law.evaluate(anode[v], grid[v], anode[v], point);
    known[v] = law;
  }
}
