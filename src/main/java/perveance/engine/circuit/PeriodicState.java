package perveance.engine.circuit;

import perveance.engine.numeric.Harmonics;

/**
 * One period of a steady signal: waveforms of all voltages and currents, means and harmonics;
 * immutable. Elements and nodes are those of {@link #circuit}.
 */
public sealed class PeriodicState permits MidbandSolution, ReactiveSolution {
  private final Circuit circuit;
  private final CycleRecord cycle;

  PeriodicState(Circuit circuit, CycleRecord cycle) {
    this.circuit = circuit;
    this.cycle = cycle;
  }

  /**
   * The circuit that was driven.
   *
   * @return circuit
   */
  public Circuit circuit() {
    return circuit;
  }

  /**
   * Number of samples.
   *
   * @return samples a period, a power of two
   */
  public int count() {
    return cycle.count;
  }

  /**
   * Voltage between two nodes over the period.
   *
   * @param plus node number
   * @param minus node number, 0 for chassis
   * @return one value a sample [V]
   */
  public double[] voltage(int plus, int minus) {
    double[] out = cycle.voltage[plus].clone();
    for (int k = 0; k < out.length; k++) {
      out[k] -= cycle.voltage[minus][k];
    }
    return out;
  }

  /**
   * Current through an element, from its first node to its second, over the period; of a valve its
   * anode current, of a transformer that of its first winding.
   *
   * @param element element index
   * @return one value a sample [A]
   */
  public double[] current(int element) {
    return cycle.current[element].clone();
  }

  /**
   * Current of one winding over the period.
   *
   * @param element element index of the transformer
   * @param winding place of the winding in its transformer
   * @return one value a sample, from start to end [A]
   */
  public double[] windingCurrent(int element, int winding) {
    return cycle.winding[element][winding].clone();
  }

  /**
   * Current into one electrode of a valve over the period.
   *
   * @param element element index of the valve
   * @param electrode anode, grid or screen as counted in ElectrodeCurrents
   * @return one value a sample [A]
   */
  public double[] electrodeCurrent(int element, int electrode) {
    return cycle.electrode[cycle.valve(element)][electrode].clone();
  }

  /**
   * Mean current through an element.
   *
   * @param element element index
   * @return mean over the period [A]
   */
  public double meanCurrent(int element) {
    return mean(cycle.current[element]);
  }

  /**
   * Mean current into one electrode of a valve.
   *
   * @param element element index of the valve
   * @param electrode anode, grid or screen
   * @return mean over the period [A]
   */
  public double meanElectrodeCurrent(int element, int electrode) {
    return mean(cycle.electrode[cycle.valve(element)][electrode]);
  }

  /**
   * Mean power that an element takes; over all elements these add to zero.
   *
   * @param element element index
   * @return mean over the period [W]
   */
  public double meanPower(int element) {
    return cycle.power[element];
  }

  /**
   * Mean power that one electrode of a valve takes.
   *
   * @param element element index of the valve
   * @param electrode anode, grid or screen
   * @return mean over the period [W]
   */
  public double meanElectrodePower(int element, int electrode) {
    return cycle.electrodePower[cycle.valve(element)][electrode];
  }

  /**
   * Mean voltage between two nodes.
   *
   * @param plus node number
   * @param minus node number, 0 for chassis
   * @return mean over the period [V]
   */
  public double meanVoltage(int plus, int minus) {
    return mean(cycle.voltage[plus]) - mean(cycle.voltage[minus]);
  }

  /**
   * Harmonics of the voltage between two nodes.
   *
   * @param plus node number
   * @param minus node number, 0 for chassis
   * @return harmonics of the period
   */
  public Harmonics harmonics(int plus, int minus) {
    return Harmonics.of(voltage(plus, minus));
  }

  /**
   * Sum of the mean powers of all elements; zero but for rounding and the tolerance of the
   * solution.
   *
   * @return power [W]
   */
  public double powerBalance() {
    double sum = 0;
    for (double p : cycle.power) {
      sum += p;
    }
    return sum;
  }

  /**
   * Largest current that Kirchhoff's law leaves over at any node in any sample.
   *
   * @return current [A]
   */
  public double residual() {
    return cycle.residual;
  }

  private static double mean(double[] samples) {
    double sum = 0;
    for (double s : samples) {
      sum += s;
    }
    return sum / samples.length;
  }
}
