package perveance.engine.analysis;

import java.util.OptionalDouble;

/**
 * A supply node as solved.
 *
 * @param name name of the node
 * @param voltage loaded, at today's mains [V]
 * @param low 95 % band [V]
 * @param high 95 % band [V]
 * @param current drawn from the node [A]
 * @param coldVoltage with cold valves [V]
 * @param ripple rms, empty when not computed [V]
 * @param dropperPower in its dropper, empty for a stated node [W]
 */
public record SupplyAnswer(
    String name,
    double voltage,
    double low,
    double high,
    double current,
    double coldVoltage,
    OptionalDouble ripple,
    OptionalDouble dropperPower) {}
