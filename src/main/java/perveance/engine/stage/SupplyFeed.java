package perveance.engine.stage;

/** Where the voltage of a supply node comes from. */
public sealed interface SupplyFeed {
  /**
   * A stated voltage, at nominal mains.
   *
   * @param voltage to chassis [V]
   */
  record Stated(double voltage) implements SupplyFeed {}

  /**
   * A resistor from another node.
   *
   * @param from name of the node that feeds it
   * @param dropper resistor between them [ohm]
   */
  record Dropped(String from, double dropper) implements SupplyFeed {}
}
