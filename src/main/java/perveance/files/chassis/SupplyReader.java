package perveance.files.chassis;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.base.Unit;
import perveance.engine.stage.Supply;
import perveance.engine.stage.SupplyFeed;
import perveance.engine.stage.SupplyRatings;
import perveance.files.toml.Range;
import perveance.files.toml.StrictTable;

/** Reads one supply node. */
final class SupplyReader {
  static final String RESERVOIR_VOLTAGE = "reservoir_voltage";
  static final String DROPPER_POWER = "dropper_power";
  static final String BLEEDER_POWER = "bleeder_power";

  /** The keys in their usual order. */
  static final List<String> ORDER =
      List.of(
          "voltage",
          "from",
          "dropper",
          "reservoir",
          "bleeder",
          RESERVOIR_VOLTAGE,
          DROPPER_POWER,
          BLEEDER_POWER);

  /** Finite is all that is asked here; what is possible the engine's checks say. */
  private static final double FINITE = 1e15;

  private static final Range VOLTAGE = Range.within(Unit.VOLT, FINITE);
  private static final Range RESISTANCE = Range.within(Unit.OHM, FINITE);
  private static final Range CAPACITANCE = Range.within(Unit.FARAD, FINITE);

  private static final Range RATED_VOLTAGE = new Range(Unit.VOLT, 1, 50e3);
  private static final Range RATED_POWER = new Range(Unit.WATT, 0.01, 10e3);

  private SupplyReader() {}

  /** Reads the node; empty after a complaint about where its voltage comes from. */
  static Optional<Supply> read(String name, StrictTable table) {
    OptionalDouble voltage = table.quantity("voltage", VOLTAGE);
    Optional<String> from = table.text("from");
    OptionalDouble dropper = table.quantity("dropper", RESISTANCE);
    OptionalDouble reservoir = table.quantity("reservoir", CAPACITANCE);
    OptionalDouble bleeder = table.quantity("bleeder", RESISTANCE);
    SupplyRatings ratings =
        new SupplyRatings(
            table.quantity(RESERVOIR_VOLTAGE, RATED_VOLTAGE),
            table.quantity(DROPPER_POWER, RATED_POWER),
            table.quantity(BLEEDER_POWER, RATED_POWER));
    table.refuseOthers();
    Optional<SupplyFeed> feed = feed(table, voltage, from, dropper);
    return feed.isEmpty()
        ? Optional.empty()
        : Optional.of(new Supply(name, feed.get(), reservoir, bleeder, ratings));
  }

  private static Optional<SupplyFeed> feed(
      StrictTable table, OptionalDouble voltage, Optional<String> from, OptionalDouble dropper) {
    boolean stated = table.has("voltage");
    boolean fed = table.has("from") || table.has("dropper");
    if (stated && fed) {
      table.complain("voltage", "a voltage as well as from and dropper", "one or the other");
      return Optional.empty();
    }
    if (!stated && !fed) {
      table.require("voltage", "a voltage, or from and dropper");
      return Optional.empty();
    }
    if (stated) {
      return voltage.isPresent()
          ? Optional.of(new SupplyFeed.Stated(voltage.getAsDouble()))
          : Optional.empty();
    }
    table.require("from", "the supply node that feeds this one");
    table.require("dropper", "the resistor from the node that feeds this one");
    return from.isPresent() && dropper.isPresent()
        ? Optional.of(new SupplyFeed.Dropped(from.get(), dropper.getAsDouble()))
        : Optional.empty();
  }
}
