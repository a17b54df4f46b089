package perveance.engine.analysis;

import java.util.OptionalDouble;

/**
 * How far a fixed bias can be set, and what an open wiper does.
 *
 * @param raw the bias supply [V]
 * @param current through its divider [A]
 * @param most most negative setting [V]
 * @param least least negative setting [V]
 * @param setting share of the control, from its least negative end, at which the stated bias
 *     stands; empty where it cannot be set to that [1]
 * @param openWiper the grid's foot when the wiper opens; empty where nothing then holds it [V]
 */
public record BiasSupplyAnswer(
    double raw,
    double current,
    double most,
    double least,
    OptionalDouble setting,
    OptionalDouble openWiper) {}
