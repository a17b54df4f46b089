package perveance.engine.stage;

import perveance.engine.circuit.CapacitorRole;
import perveance.engine.circuit.Circuit;
import perveance.engine.circuit.Element;

/** Puts the supply nodes of a chassis with what feeds and loads them into a circuit. */
final class SupplyWiring {
  private SupplyWiring() {}

  static void wire(Chassis chassis, Circuit.Builder circuit) {
    for (Supply supply : chassis.supplies()) {
      String name = ChassisNames.supply(supply.name());
      int node = circuit.node(name);
      if (supply.feed() instanceof SupplyFeed.Stated stated) {
        double voltage = stated.voltage() * chassis.conditions().mainsRatio();
        circuit.add(new Element.VoltageSource(name, node, 0, voltage));
      } else if (supply.feed() instanceof SupplyFeed.Dropped dropped) {
        int from = circuit.node(ChassisNames.supply(dropped.from()));
        circuit.add(new Element.Resistor(name + ".dropper", from, node, dropped.dropper()));
      }
      supply
          .reservoir()
          .ifPresent(
              c ->
                  circuit.add(
                      new Element.Capacitor(name + ".reservoir", node, 0, c, CapacitorRole.HOLDS)));
      supply
          .bleeder()
          .ifPresent(r -> circuit.add(new Element.Resistor(name + ".bleeder", node, 0, r)));
    }
  }
}
