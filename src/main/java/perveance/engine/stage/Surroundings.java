package perveance.engine.stage;

import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What stands around a stage in its chassis: what drives it, what it drives, what feeds it. A stage
 * that stands alone has none of it.
 *
 * @param directInput name of the circuit node wired straight to its grid, empty when the stage has
 *     a source of its own behind a capacitor
 * @param directInput2 name of the node wired straight to its second grid, empty when the stage
 *     before has one output
 * @param drivenBy reference of the stage that drives it through a capacitor, empty when none does
 * @param sourceResistance output resistance of the stage that drives it, used where the stage
 *     states no {@code source} of its own [ohm]
 * @param directOutput reference of the stage wired straight to its main output, empty when none is
 * @param next input network of the stage that its outputs drive through a capacitor
 * @param supplyVoltage rough voltage of its supply node, for choosing a diode's working current [V]
 */
public record Surroundings(
    Optional<String> directInput,
    Optional<String> directInput2,
    Optional<String> drivenBy,
    OptionalDouble sourceResistance,
    Optional<String> directOutput,
    Optional<NextInput> next,
    OptionalDouble supplyVoltage) {
  /** A stage by itself. */
  public static final Surroundings NONE =
      new Surroundings(
          Optional.empty(),
          Optional.empty(),
          Optional.empty(),
          OptionalDouble.empty(),
          Optional.empty(),
          Optional.empty(),
          OptionalDouble.empty());

  /**
   * The input network of a driven stage, as its driver sees it behind the coupling capacitor: the
   * leak across the input, then a stopper, then the capacitance.
   *
   * @param ref reference of the driven stage
   * @param leak resistance from the input to chassis [ohm]
   * @param stopper resistance between the input and the grid, zero when there is none [ohm]
   * @param capacitance of the grid with the Miller effect, zero when not known yet [F]
   */
  public record NextInput(String ref, double leak, double stopper, double capacitance) {}
}
