package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.circuit.DcSolution;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.ChassisNames;
import perveance.engine.stage.Supply;
import perveance.engine.stage.SupplyFeed;

/** Reads the supply nodes off the dc solution of the whole chassis. */
final class SupplyFigures {
  private SupplyFigures() {}

  /**
   * All supply nodes.
   *
   * @param chassis the chassis
   * @param dc its point
   * @param cold its point with cold valves
   * @param spread voltages over the specimens, empty without bands
   */
  static List<SupplyAnswer> of(
      Chassis chassis, DcSolution dc, Optional<DcSolution> cold, Optional<RailSpread> spread) {
    List<SupplyAnswer> answers = new ArrayList<>();
    for (Supply supply : chassis.supplies()) {
      String name = ChassisNames.supply(supply.name());
      double voltage = dc.voltage(name);
      Optional<Band> band = spread.flatMap(s -> s.band(name));
      boolean dropped = supply.feed() instanceof SupplyFeed.Dropped;
      String dropper = name + ".dropper";
      answers.add(
          new SupplyAnswer(
              supply.name(),
              voltage,
              band.map(Band::low).orElse(voltage),
              band.map(Band::high).orElse(voltage),
              dropped ? dc.current(dropper) : -dc.current(name),
              cold.map(c -> c.voltage(name)).orElse(voltage),
              OptionalDouble.empty(),
              dropped ? OptionalDouble.of(dc.power(dropper)) : OptionalDouble.empty()));
    }
    return answers;
  }
}
