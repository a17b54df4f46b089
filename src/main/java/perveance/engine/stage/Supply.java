package perveance.engine.stage;

import java.util.OptionalDouble;

/**
 * A supply node.
 *
 * @param name name of the node, for example {@code A}
 * @param feed where its voltage comes from
 * @param reservoir capacitor from the node to chassis, empty when not stated [F]
 * @param bleeder resistor from the node to chassis, empty when none [ohm]
 */
public record Supply(
    String name, SupplyFeed feed, OptionalDouble reservoir, OptionalDouble bleeder) {}
