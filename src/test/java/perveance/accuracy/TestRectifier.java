package perveance.accuracy;

import perveance.engine.device.DeviceLaw;
import perveance.engine.device.ElectrodeCurrents;

/**
 * A full-wave rectifier with a reservoir, followed in time until it repeats, so that a law can be
 * judged without the circuit engine: stiff sine behind a resistance at each anode, constant load
 * current.
 *
 * @param law of one anode
 * @param anodeVoltage root mean square at each anode [V]
 * @param resistance at each anode [ohm]
 * @param capacitance reservoir [F]
 * @param frequency of the mains [Hz]
 */
record TestRectifier(
    DeviceLaw law, double anodeVoltage, double resistance, double capacitance, double frequency) {
  private static final int STEPS = 2000;
  private static final int MOST_HALF_CYCLES = 400;

  /** Mean voltage at the reservoir for a load current [V]. */
  double output(double loadCurrent) {
    double peak = anodeVoltage * Math.sqrt(2);
    double reservoir = peak;
    double step = 1 / (2 * frequency * STEPS);
    for (int half = 0; half < MOST_HALF_CYCLES; half++) {
      double start = reservoir;
      double mean = 0;
      for (int k = 0; k < STEPS; k++) {
        double source = peak * Math.sin(Math.PI * (k + 0.5) / STEPS);
        double charge = current(source - reservoir) - loadCurrent;
        reservoir += step * charge / capacitance;
        mean += reservoir / STEPS;
      }
      if (Math.abs(reservoir - start) < 1e-6 * peak) {
        return mean;
      }
    }
    throw new IllegalStateException("does not settle");
  }

  /** Current through resistance and diode in series, by bisection for the diode's voltage. */
  private double current(double across) {
    if (across <= -5) {
      return 0;
    }
    ElectrodeCurrents out = new ElectrodeCurrents();
    double low = -5;
    double high = Math.max(across, 0) + 1;
    for (int i = 0; i < 40; i++) {
      double middle = 0.5 * (low + high);
      law.evaluate(middle, 0, 0, out);
      if (middle + resistance * out.current(ElectrodeCurrents.ANODE) > across) {
        high = middle;
      } else {
        low = middle;
      }
    }
    law.evaluate(0.5 * (low + high), 0, 0, out);
    return out.current(ElectrodeCurrents.ANODE);
  }
}
