package perveance.engine.stage;

import java.util.OptionalDouble;

/**
 * A supply node.
 *
 * @param name name of the node, for example {@code A}
 * @param feed where its voltage comes from
 * @param reservoir capacitor from the node to chassis, empty when not stated [F]
 * @param bleeder resistor from the node to chassis, empty when none [ohm]
 * @param ratings of its parts, as far as stated
 */
public record Supply(
    String name,
    SupplyFeed feed,
    OptionalDouble reservoir,
    OptionalDouble bleeder,
    SupplyRatings ratings) {
  /**
   * A supply node without stated ratings.
   *
   * @param name name of the node
   * @param feed where its voltage comes from
   * @param reservoir capacitor from the node to chassis, empty when not stated [F]
   * @param bleeder resistor from the node to chassis, empty when none [ohm]
   */
  public Supply(String name, SupplyFeed feed, OptionalDouble reservoir, OptionalDouble bleeder) {
    this(name, feed, reservoir, bleeder, SupplyRatings.NONE);
  }

  /**
   * The same node with another bleeder.
   *
   * @param resistance of the bleeder [ohm]
   * @return changed node
   */
  public Supply withBleeder(double resistance) {
    return new Supply(name, feed, reservoir, OptionalDouble.of(resistance), ratings);
  }

  /**
   * The same node with other ratings.
   *
   * @param stated ratings of its parts
   * @return changed node
   */
  public Supply with(SupplyRatings stated) {
    return new Supply(name, feed, reservoir, bleeder, stated);
  }
}
