package perveance.accuracy;

import perveance.engine.device.DeviceLaw;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.numeric.Harmonics;
import perveance.engine.numeric.RootOutcome;
import perveance.engine.numeric.Roots;

/**
 * A resistance-coupled pentode with cathode and screen bypassed, solved here by root finding alone
 * so that a law can be judged without the circuit engine.
 *
 * @param law the valve
 * @param supply to the foot of the stage [V]
 * @param anodeLoad anode resistor [ohm]
 * @param screenResistor from the supply to the screen [ohm]
 * @param cathodeResistor bypassed [ohm]
 * @param nextLeak grid leak of the next stage [ohm]
 */
record TestCoupledPentode(
    DeviceLaw law,
    double supply,
    double anodeLoad,
    double screenResistor,
    double cathodeResistor,
    double nextLeak) {
  private static final int SAMPLES = 64;

  /** Voltages to the cathode at rest [V]. */
  record Rest(double anode, double grid, double screen) {}

  /** The working point: the cathode's voltage closes the loop, screen and anode follow from it. */
  Rest rest() {
    double cathode = root(v -> at(following(v)).cathode() - v / cathodeResistor, 1e-3, 20);
    return following(cathode);
  }

  private Rest following(double cathode) {
    double available = supply - cathode;
    double screen =
        root(
            s -> (available - s) / screenResistor - atScreen(available, cathode, s).screen(),
            1e-3,
            available);
    return new Rest(atScreen(available, cathode, screen).anode(), -cathode, screen);
  }

  private record Divided(double anode, double screen) {}

  private Divided atScreen(double available, double cathode, double screen) {
    double anode =
        root(
            a ->
                (available - a) / anodeLoad
                    - at(new Rest(a, -cathode, screen)).current(ElectrodeCurrents.ANODE),
            0,
            available);
    return new Divided(
        anode, at(new Rest(anode, -cathode, screen)).current(ElectrodeCurrents.SCREEN));
  }

  /** Cathode current at rest [A]. */
  double current() {
    return at(rest()).cathode();
  }

  private double load() {
    return anodeLoad * nextLeak / (anodeLoad + nextLeak);
  }

  /** Small-signal gain without its sign [1]. */
  double gain() {
    ElectrodeCurrents out = at(rest());
    double gm = out.slope(ElectrodeCurrents.ANODE, ElectrodeCurrents.GRID);
    double ga = out.slope(ElectrodeCurrents.ANODE, ElectrodeCurrents.ANODE);
    return gm * load() / (1 + ga * load());
  }

  /** Gain of the fundamental without its sign when the output has this effective value [1]. */
  double gainAtOutput(double rms) {
    Rest rest = rest();
    double peak = rms * Math.sqrt(2);
    double drive = root(v -> swing(rest, v).amplitude(1) - peak, 0.5 * peak / gain(), -rest.grid());
    return peak / drive;
  }

  private Harmonics swing(Rest rest, double drive) {
    double current = at(rest).current(ElectrodeCurrents.ANODE);
    double highest = rest.anode() + load() * current;
    double[] voltage = new double[SAMPLES];
    for (int k = 0; k < SAMPLES; k++) {
      double grid = rest.grid() + drive * Math.cos(2 * Math.PI * k / SAMPLES);
      voltage[k] =
          root(
              a ->
                  a
                      - highest
                      + load()
                          * at(new Rest(a, grid, rest.screen())).current(ElectrodeCurrents.ANODE),
              0,
              highest);
    }
    return Harmonics.of(voltage);
  }

  private ElectrodeCurrents at(Rest point) {
    ElectrodeCurrents out = new ElectrodeCurrents();
    law.evaluate(point.anode(), point.grid(), point.screen(), out);
    return out;
  }

  private static double root(
      java.util.function.DoubleUnaryOperator function, double low, double high) {
    RootOutcome outcome = Roots.bracketed(function, low, high, 1e-8);
    if (outcome instanceof RootOutcome.Found found) {
      return found.x();
    }
    throw new IllegalStateException(outcome.toString());
  }
}
