package perveance.accuracy;

import perveance.engine.device.DeviceLaw;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.numeric.Harmonics;
import perveance.engine.numeric.RootOutcome;
import perveance.engine.numeric.Roots;

/**
 * Two equal valves behind an ideal centre-tapped transformer, fixed bias, solved by root finding
 * alone.
 *
 * @param law each valve
 * @param supply anode to cathode at rest [V]
 * @param bias grid to cathode at rest [V]
 * @param load anode to anode [ohm]
 */
record TestPushPull(DeviceLaw law, double supply, double bias, double load) {
  private static final int SAMPLES = 64;

  /** The voltage that one half of the primary takes over a period [V]. */
  Harmonics half(double amplitude) {
    double[] voltages = new double[SAMPLES];
    for (int k = 0; k < SAMPLES; k++) {
      double drive = amplitude * Math.cos(2 * Math.PI * k / SAMPLES);
      RootOutcome outcome = Roots.bracketed(x -> misfit(x, drive), -supply, supply, 1e-11);
      if (!(outcome instanceof RootOutcome.Found found)) {
        throw new IllegalStateException(outcome.toString());
      }
      voltages[k] = found.x();
    }
    return Harmonics.of(voltages);
  }

  /** The power of the fundamental in the whole load [W]. */
  double power(double amplitude) {
    double whole = 2 * half(amplitude).amplitude(1);
    return whole * whole / (2 * load);
  }

  private double misfit(double x, double drive) {
    double difference = current(supply - x, bias + drive) - current(supply + x, bias - drive);
    return difference * load / 4 - x;
  }

  private double current(double anode, double grid) {
    ElectrodeCurrents out = new ElectrodeCurrents();
    law.evaluate(anode, grid, 0, out);
    return out.current(ElectrodeCurrents.ANODE);
  }
}
