package perveance.engine.circuit;

import java.util.Arrays;
import java.util.List;

/** The course of all voltages and currents in a transient; immutable. */
public final class TransientSolution {
  private final Circuit circuit;
  private final double[] time;
  private final double[][] voltage;
  private final double[][] current;
  private final double[][] electrode;
  private final int[] valves;

  /** Takes one row for each accepted time; rows are not copied. */
  TransientSolution(Circuit circuit, List<TransientRow> rows, int[] valves) {
    this.circuit = circuit;
    this.valves = valves;
    this.time = rows.stream().mapToDouble(TransientRow::time).toArray();
    this.voltage = rows.stream().map(TransientRow::voltage).toArray(double[][]::new);
    this.current = rows.stream().map(TransientRow::current).toArray(double[][]::new);
    this.electrode = rows.stream().map(TransientRow::electrode).toArray(double[][]::new);
  }

  /**
   * The circuit.
   *
   * @return circuit
   */
  public Circuit circuit() {
    return circuit;
  }

  /**
   * Times of all steps, the start included.
   *
   * @return rising, from zero [s]
   */
  public double[] times() {
    return time.clone();
  }

  /**
   * Voltage of a node at the times of the steps.
   *
   * @param node node number
   * @return one value a time [V]
   */
  public double[] voltage(int node) {
    return column(voltage, node);
  }

  /**
   * Current through an element at the times of the steps, from its first node to its second; of a
   * valve its anode current, of a transformer that of its first winding.
   *
   * @param element element index
   * @return one value a time [A]
   */
  public double[] current(int element) {
    return column(current, element);
  }

  /**
   * Current into one electrode of a valve at the times of the steps.
   *
   * @param element element index of the valve
   * @param index anode, grid or screen as counted in ElectrodeCurrents
   * @return one value a time [A]
   */
  public double[] electrodeCurrent(int element, int index) {
    int place = Arrays.binarySearch(valves, element);
    if (place < 0) {
      throw new IllegalArgumentException("element " + element + " is no valve");
    }
    return column(electrode, TransientRow.ELECTRODES * place + index);
  }

  /**
   * Voltage of a node at any time, straight between steps.
   *
   * @param node node number
   * @param when time within the course [s]
   * @return voltage [V]
   */
  public double voltageAt(int node, double when) {
    int after = Arrays.binarySearch(time, when);
    if (after >= 0) {
      return voltage[after][node];
    }
    after = -after - 1;
    if (after == 0 || after == time.length) {
      throw new IllegalArgumentException("when is outside the course: " + when);
    }
    double share = (when - time[after - 1]) / (time[after] - time[after - 1]);
    return voltage[after - 1][node] + share * (voltage[after][node] - voltage[after - 1][node]);
  }

  private static double[] column(double[][] rows, int place) {
    double[] out = new double[rows.length];
    for (int k = 0; k < out.length; k++) {
      out[k] = rows[k][place];
    }
    return out;
  }
}
