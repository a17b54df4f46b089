package perveance.engine.analysis;

import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.circuit.Circuit;
import perveance.engine.circuit.DcOutcome;
import perveance.engine.circuit.DcSolution;
import perveance.engine.circuit.DcSolver;
import perveance.engine.circuit.Element.Resistor;
import perveance.engine.circuit.Element.VoltageSource;
import perveance.engine.numeric.RootOutcome;
import perveance.engine.numeric.Roots;
import perveance.engine.stage.StageValues;

/**
 * A bias supply, the resistor from it to the control, the control, and the resistor from there to
 * chassis; perhaps one more from the wiper to the supply. Grids draw no current from it.
 *
 * @param raw the supply [V]
 * @param top from the supply to the control [ohm]
 * @param pot the whole control [ohm]
 * @param bottom from the control to chassis [ohm]
 * @param hold from the wiper to the supply, empty where there is none [ohm]
 */
record BiasDivider(double raw, double top, double pot, double bottom, OptionalDouble hold) {
  /** What is left of a track at its end, of a wire, and of nothing at all [ohm]. */
  private static final double LEAST = 1e-3;

  private static final double SETTING = 1e-9;

  /** The divider that a stage states. */
  static Optional<BiasDivider> of(StageValues values) {
    OptionalDouble raw = values.find("bias_supply");
    OptionalDouble pot = values.find("bias_pot");
    return raw.isPresent() && pot.isPresent()
        ? Optional.of(
            new BiasDivider(
                raw.getAsDouble(),
                values.number("bias_top", 0),
                pot.getAsDouble(),
                values.number("bias_bottom", 0),
                values.find("bias_hold")))
        : Optional.empty();
  }

  /**
   * The divider that reaches from one voltage to another: what flows is their difference over the
   * control, and either resistor drops the rest.
   *
   * @param raw the supply [V]
   * @param pot the control [ohm]
   * @param most the end near the supply [V]
   * @param least the end near chassis [V]
   */
  static BiasDivider reaching(double raw, double pot, double most, double least) {
    double current = (most - least) / pot;
    return new BiasDivider(
        raw, (raw - most) / current, pot, least / current, OptionalDouble.empty());
  }

  /** The answer for a stated bias; empty when the divider has no solution. */
  Optional<BiasSupplyAnswer> answer(double bias) {
    Optional<DcSolution> low = at(0);
    Optional<DcSolution> high = at(1);
    if (low.isEmpty() || high.isEmpty()) {
      return Optional.empty();
    }
    return Optional.of(
        new BiasSupplyAnswer(
            raw,
            Math.abs(low.get().current("top")),
            high.get().voltage("wiper"),
            low.get().voltage("wiper"),
            setting(bias),
            hold.isPresent() ? OptionalDouble.of(raw) : OptionalDouble.empty()));
  }

  /** Where the control stands for a bias. */
  private OptionalDouble setting(double bias) {
    RootOutcome outcome =
        Roots.bracketed(
            share -> at(share).map(dc -> dc.voltage("wiper") - bias).orElse(0.0), 0, 1, SETTING);
    return outcome instanceof RootOutcome.Found found
        ? OptionalDouble.of(found.x())
        : OptionalDouble.empty();
  }

  /** The divider with its control at a share of its track, counted from the chassis end. */
  private Optional<DcSolution> at(double share) {
    Circuit.Builder circuit = new Circuit.Builder();
    int supply = circuit.node("supply");
    int upper = circuit.node("upper");
    int wiper = circuit.node("wiper");
    int lower = circuit.node("lower");
    circuit.add(new VoltageSource("raw", supply, 0, raw));
    circuit.add(resistor("top", supply, upper, top));
    circuit.add(resistor("pot_upper", upper, wiper, (1 - share) * pot));
    circuit.add(resistor("pot_lower", wiper, lower, share * pot));
    circuit.add(resistor("bottom", lower, 0, bottom));
    hold.ifPresent(r -> circuit.add(resistor("hold", supply, wiper, r)));
    return new DcSolver(circuit.build()).solve() instanceof DcOutcome.Converged solved
        ? Optional.of(solved.solution())
        : Optional.empty();
  }

  private static Resistor resistor(String name, int a, int b, double resistance) {
    return new Resistor(name, a, b, Math.max(LEAST, resistance));
  }
}
