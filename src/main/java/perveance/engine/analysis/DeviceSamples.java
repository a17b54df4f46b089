package perveance.engine.analysis;

import static perveance.engine.device.ElectrodeCurrents.ANODE;
import static perveance.engine.device.ElectrodeCurrents.GRID;
import static perveance.engine.device.ElectrodeCurrents.SCREEN;

import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import perveance.engine.circuit.DcSolver;
import perveance.engine.circuit.Element.Valve;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.device.LawKind;

/** The operating point of one valve over the specimens. */
final class DeviceSamples {
  private static final List<String> TRIODE =
      List.of(
          "anode",
          "grid",
          "anodeChassis",
          "cathodeChassis",
          "gridChassis",
          "anodeCurrent",
          "mutualConductance",
          "anodeResistance",
          "amplificationFactor",
          "anodeDissipation");
  private static final List<String> SCREENED =
      List.of("screen", "screenChassis", "screenCurrent", "screenDissipation");

  private final int element;
  private final Valve valve;
  private final double[][] values;

  /**
   * A valve of a circuit.
   *
   * @param element its place in the circuit
   * @param valve the valve
   * @param samples number of specimens
   */
  DeviceSamples(int element, Valve valve, int samples) {
    this.element = element;
    this.valve = valve;
    boolean screened = valve.law().kind() == LawKind.PENTODE;
    this.values = new double[TRIODE.size() + (screened ? SCREENED.size() : 0)][samples];
    for (double[] row : values) {
      Arrays.fill(row, Double.NaN);
    }
  }

  /** Reads the last point of a solver. */
  void read(DcSolver solver, int sample) {
    ElectrodeCurrents at = solver.valve(element);
    double cathode = solver.voltage(valve.cathode());
    double anode = solver.voltage(valve.anode());
    double grid = solver.voltage(valve.grid());
    double current = at.current(ANODE);
    double gm = at.slope(ANODE, GRID);
    double ga = at.slope(ANODE, ANODE);
    int next = 0;
    values[next++][sample] = anode - cathode;
    values[next++][sample] = grid - cathode;
    values[next++][sample] = anode;
    values[next++][sample] = cathode;
    values[next++][sample] = grid;
    values[next++][sample] = current;
    values[next++][sample] = gm;
    values[next++][sample] = ga > 0 ? 1 / ga : Double.NaN;
    values[next++][sample] = ga > 0 ? gm / ga : Double.NaN;
    values[next++][sample] = (anode - cathode) * current;
    if (next < values.length) {
      double screen = solver.voltage(valve.screen());
      values[next++][sample] = screen - cathode;
      values[next++][sample] = screen;
      values[next++][sample] = at.current(SCREEN);
      values[next][sample] = (screen - cathode) * at.current(SCREEN);
    }
  }

  /** All figures by the component names of {@link DevicePoint}. */
  Map<String, double[]> figures() {
    Map<String, double[]> figures = new LinkedHashMap<>();
    for (int i = 0; i < values.length; i++) {
      String name = i < TRIODE.size() ? TRIODE.get(i) : SCREENED.get(i - TRIODE.size());
      figures.put(name, values[i]);
    }
    return figures;
  }
}
