package perveance.accuracy;

import java.util.function.DoubleUnaryOperator;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.numeric.Harmonics;
import perveance.engine.numeric.RootOutcome;
import perveance.engine.numeric.Roots;

/**
 * An output stage with one or two pentodes, solved here by root finding alone so that a law can be
 * judged without the circuit engine: ideal transformer, stiff supplies, bias fixed or from a
 * bypassed (common) cathode resistor that lifts the cathode as the mean current grows.
 *
 * @param law the valve
 * @param anode anode to cathode at rest [V]
 * @param screenSupply screen supply to cathode at rest [V]
 * @param screenResistor from the supply to the screen, not bypassed, 0 for none [ohm]
 * @param fixedBias grid to cathode, where there is no cathode resistor [V]
 * @param cathodeResistor bypassed, for each valve (twice a common one), 0 for fixed bias [ohm]
 */
record TestOutputPentode(
    DeviceLaw law,
    double anode,
    double screenSupply,
    double screenResistor,
    double fixedBias,
    double cathodeResistor) {
  private static final int SAMPLES = 64;
  private static final int ROUNDS = 60;

  /**
   * What a drive gives; currents are for one valve.
   *
   * @param power of the fundamental in the load [W]
   * @param distortion all harmonics in per cent of the fundamental [%]
   * @param anodeCurrent mean [A]
   * @param screenCurrent mean [A]
   */
  record Driven(double power, double distortion, double anodeCurrent, double screenCurrent) {}

  /**
   * Settled means: grid, screen and anode to cathode at rest of the wave [V], anode current [A].
   */
  private record Rest(double grid, double screen, double anode, double current) {}

  /** At rest. */
  Rest rest() {
    double grid = fixedBias;
    if (cathodeResistor > 0) {
      grid = root(v -> v + cathodeResistor * cathode(anode, v, screenSupply), -200, 0);
    }
    return new Rest(grid, screenSupply, anode, anode(anode, grid, screenSupply));
  }

  /** Anode current at rest [A]. */
  double restCurrent() {
    return rest().current();
  }

  /** One valve on a load, driven by a sine of this peak. */
  Driven singleEnded(double load, double drive) {
    return settle(
        rest -> {
          double[] voltage = new double[SAMPLES];
          for (int k = 0; k < SAMPLES; k++) {
            double grid = rest.grid() + drive * Math.cos(2 * Math.PI * k / SAMPLES);
            double highest = rest.anode() + load * rest.current();
            voltage[k] = root(v -> v - highest + load * anode(v, grid, rest.screen()), 0, highest);
          }
          return voltage;
        },
        drive,
        load,
        false);
  }

  /** Two valves, driven by opposite sines of this peak at each grid. */
  Driven pushPull(double anodeToAnode, double drive) {
    double load = anodeToAnode / 4;
    return settle(
        rest -> {
          double[] voltage = new double[SAMPLES];
          for (int k = 0; k < SAMPLES; k++) {
            double swing = drive * Math.cos(2 * Math.PI * k / SAMPLES);
            double fall =
                root(
                    v ->
                        v
                            - load
                                * (anode(rest.anode() - v, rest.grid() + swing, rest.screen())
                                    - anode(rest.anode() + v, rest.grid() - swing, rest.screen())),
                    -rest.anode(),
                    rest.anode());
            voltage[k] = rest.anode() - fall;
          }
          return voltage;
        },
        drive,
        load,
        true);
  }

  private interface Wave {
    double[] anodeVoltage(Rest rest);
  }

  private Driven settle(Wave wave, double drive, double load, boolean pair) {
    Rest start = rest();
    Rest rest = start;
    for (int round = 0; round < ROUNDS; round++) {
      double[] voltage = wave.anodeVoltage(rest);
      double anodeMean = 0;
      double screenMean = 0;
      for (int k = 0; k < SAMPLES; k++) {
        double grid = rest.grid() + drive * Math.cos(2 * Math.PI * k / SAMPLES);
        anodeMean += anode(voltage[k], grid, rest.screen()) / SAMPLES;
        screenMean += screen(voltage[k], grid, rest.screen()) / SAMPLES;
      }
      double grid = cathodeResistor > 0 ? -cathodeResistor * (anodeMean + screenMean) : fixedBias;
      double lift = start.grid() - grid;
      Rest next =
          new Rest(
              half(rest.grid(), grid),
              half(rest.screen(), screenSupply - lift),
              half(rest.anode(), start.anode() - lift),
              half(rest.current(), pair ? rest.current() : anodeMean));
      if (near(rest, next)) {
        Harmonics harmonics = Harmonics.of(voltage);
        double peak = harmonics.amplitude(1);
        return new Driven(
            peak * peak / 2 / load,
            100 * harmonics.distortion(12).orElse(0),
            anodeMean,
            screenMean);
      }
      rest = next;
    }
    throw new IllegalStateException("the stage does not settle at a drive of " + drive);
  }

  private static double half(double old, double fresh) {
    return 0.5 * (old + fresh);
  }

  private static boolean near(Rest a, Rest b) {
    return Math.abs(a.grid() - b.grid()) < 1e-4
        && Math.abs(a.screen() - b.screen()) < 1e-3
        && Math.abs(a.anode() - b.anode()) < 1e-3
        && Math.abs(a.current() - b.current()) < 1e-6;
  }

  private ElectrodeCurrents at(double anode, double grid, double supply) {
    ElectrodeCurrents out = new ElectrodeCurrents();
    double screen = supply;
    if (screenResistor > 0) {
      screen =
          root(
              v -> {
                law.evaluate(anode, grid, v, out);
                return v - supply + screenResistor * out.current(ElectrodeCurrents.SCREEN);
              },
              0,
              supply);
    }
    law.evaluate(anode, grid, screen, out);
    return out;
  }

  private double anode(double anode, double grid, double screen) {
    return at(anode, grid, screen).current(ElectrodeCurrents.ANODE);
  }

  private double screen(double anode, double grid, double screen) {
    return at(anode, grid, screen).current(ElectrodeCurrents.SCREEN);
  }

  private double cathode(double anode, double grid, double screen) {
    ElectrodeCurrents out = at(anode, grid, screen);
    return out.current(ElectrodeCurrents.ANODE) + out.current(ElectrodeCurrents.SCREEN);
  }

  private static double root(DoubleUnaryOperator function, double low, double high) {
    RootOutcome outcome = Roots.bracketed(function, low, high, 1e-7);
    if (outcome instanceof RootOutcome.Found found) {
      return found.x();
    }
    throw new IllegalStateException(outcome.toString());
  }
}
