package perveance.engine.device.geometry;

import java.util.Optional;
import perveance.engine.base.PhysicalConstants;
import perveance.engine.numeric.RootOutcome;
import perveance.engine.numeric.Roots;

/**
 * A plane diode whose electrons have initial velocities: voltage and current density with the
 * potential minimum in front of the cathode, by {@link InitialVelocities}. The reference for the
 * small voltages of a valve's grid region, where the plain law gives half the current.
 *
 * <p>Range: current densities below the emission. Where the minimum would lie beyond the anode, the
 * anode only retards and {@code J = J0 exp(V e / (k T))}.
 *
 * @param gap distance of the electrodes, above 0 [m]
 * @param temperature of the cathode, above 0 [K]
 * @param emission J0, above 0 [A m^-2]
 */
public record ThermalDiode(double gap, double temperature, double emission) {
  /** Logarithm of the least part of the emission looked for at positive voltages [1]. */
  private static final double DEEPEST = 40;

  private static final double NEAREST_TO_SATURATION = 1e-6;

  /** Checks the values. */
  public ThermalDiode {
    Dimension.positive("gap", gap);
    Dimension.positive("temperature", temperature);
    Dimension.positive("emission", emission);
  }

  /**
   * State at one current density.
   *
   * @param currentDensity J [A m^-2]
   * @param voltage of the anode, without contact potential [V]
   * @param minimum depth of the potential minimum, zero or negative [V]
   * @param minimumDistance of the minimum from the cathode, at most the gap [m]
   */
  public record State(
      double currentDensity, double voltage, double minimum, double minimumDistance) {}

  /**
   * Voltage that draws a current density.
   *
   * @param currentDensity J, above 0 and below the emission [A m^-2]
   * @return the state there
   */
  public State atCurrentDensity(double currentDensity) {
    Dimension.positive("currentDensity", currentDensity);
    if (currentDensity >= emission) {
      throw new IllegalArgumentException(
          "currentDensity must be below the emission " + emission + ", found " + currentDensity);
    }
    double thermal = PhysicalConstants.thermalVoltage(temperature);
    double depth = Math.log(emission / currentDensity);
    double scale = InitialVelocities.scale(temperature, currentDensity);
    double minimumDistance = InitialVelocities.cathodeSide(depth) / scale;
    double minimum = -thermal * depth;
    if (minimumDistance >= gap) {
      return new State(currentDensity, minimum, minimum, gap);
    }
    double height = anodeHeight(scale * (gap - minimumDistance));
    return new State(currentDensity, minimum + thermal * height, minimum, minimumDistance);
  }

  /**
   * State at one voltage.
   *
   * @param voltage of the anode, without contact potential [V]
   * @return the state there, or empty where the cathode is saturated
   */
  public Optional<State> atVoltage(double voltage) {
    double top = Math.log(emission);
    double retarded = voltage / PhysicalConstants.thermalVoltage(temperature);
    RootOutcome outcome =
        Roots.bracketed(
            log -> atCurrentDensity(Math.exp(log)).voltage() - voltage,
            top + Math.min(-DEEPEST, retarded - 1),
            top - NEAREST_TO_SATURATION,
            1e-12);
    if (outcome instanceof RootOutcome.Found found) {
      return Optional.of(atCurrentDensity(Math.exp(found.x())));
    }
    return Optional.empty();
  }

  /**
   * Langmuir's practical form for the current density: the plane law counted from the minimum with
   * a factor, {@code P0 (V - Vm)^(3/2) / (d - xm)^2 (1 + 2.66 / sqrt(eta))}.
   *
   * @param state a state with its minimum inside the gap
   * @return current density by the practical form [A m^-2]
   */
  public double practicalForm(State state) {
    double height = state.voltage() - state.minimum();
    double way = gap - state.minimumDistance();
    if (!(height > 0 && way > 0)) {
      throw new IllegalArgumentException("state has no minimum inside the gap");
    }
    double eta = height / PhysicalConstants.thermalVoltage(temperature);
    return PhysicalConstants.PLANE_SPACE_CHARGE
        * height
        * Math.sqrt(height)
        / (way * way)
        * (1 + 2.66 / Math.sqrt(eta));
  }

  private static double anodeHeight(double xi) {
    // xi grows at least as fast as eta^(1/2) and eta^(3/4), so this bracket holds
    double high = Math.min(1e5, 1 + xi * xi);
    RootOutcome outcome =
        Roots.bracketed(eta -> InitialVelocities.anodeSide(eta) - xi, 0, high, 1e-12);
    if (outcome instanceof RootOutcome.Found found) {
      return found.x();
    }
    throw new IllegalArgumentException("the voltage would be beyond 1e5 kT/e, xi is " + xi);
  }
}
