package perveance.engine.stage;

import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.stage.Surroundings.NextInput;

/** Which stages of a chassis hang together, and how. */
final class ChassisWiring {
  /** Taken for the input of a stage whose grid leak is not stated [ohm]. */
  private static final double USUAL_LEAK = 1e6;

  private ChassisWiring() {}

  /** The stage that a stage drives. */
  static Optional<String> drives(StageEntry entry) {
    return Optional.ofNullable(entry.settings().get(StageKeys.DRIVES.key())).map(Setting::text);
  }

  /** Whether a stage drives another by a wire, without a capacitor. */
  static boolean direct(StageEntry entry) {
    return drives(entry).isPresent() && !entry.settings().containsKey(StageKeys.COUPLING.key());
  }

  /** Whether a stage has two outputs of opposite phase. */
  private static boolean twoOutputs(StageEntry entry) {
    return StageKinds.find(entry.kind())
        .filter(kind -> kind.keys().contains(StageKeys.LOAD2))
        .isPresent();
  }

  /** The stage that drives a stage. */
  static Optional<StageEntry> driver(Chassis chassis, String ref) {
    return chassis.stages().stream()
        .filter(s -> drives(s).map(ref::equals).orElse(false))
        .findFirst();
  }

  /**
   * The surroundings of a stage as far as they are known before anything is built: a direct input
   * carries the reference of its driver instead of a node.
   */
  static Surroundings roughly(Chassis chassis, StageEntry entry) {
    Optional<StageEntry> driver = driver(chassis, entry.ref());
    Optional<StageEntry> next = drives(entry).flatMap(chassis::stage);
    boolean direct = direct(entry);
    return new Surroundings(
        driver.filter(ChassisWiring::direct).map(StageEntry::ref),
        driver.filter(ChassisWiring::direct).filter(ChassisWiring::twoOutputs).map(StageEntry::ref),
        driver.filter(d -> !direct(d)).map(StageEntry::ref),
        OptionalDouble.empty(),
        direct ? next.map(StageEntry::ref) : Optional.empty(),
        direct ? Optional.empty() : next.map(ChassisWiring::input),
        roughVoltage(chassis, entry));
  }

  /** The input network of a stage from its own keys, before its capacitance is known. */
  private static NextInput input(StageEntry entry) {
    return new NextInput(
        entry.ref(),
        quantity(entry, StageKeys.GRID_LEAK).orElse(USUAL_LEAK),
        quantity(entry, StageKeys.GRID_STOPPER).orElse(0),
        0);
  }

  private static OptionalDouble quantity(StageEntry entry, KeySpec key) {
    return entry.settings().get(key.key()) instanceof Setting.Number n
        ? OptionalDouble.of(n.value())
        : OptionalDouble.empty();
  }

  /** The voltage at the head of the chain that feeds a stage, not counting the droppers. */
  private static OptionalDouble roughVoltage(Chassis chassis, StageEntry entry) {
    Optional<Supply> at =
        Optional.ofNullable(entry.settings().get(StageKeys.SUPPLY.key()))
            .flatMap(s -> chassis.supply(s.text()));
    for (int steps = 0; at.isPresent() && steps <= chassis.supplies().size(); steps++) {
      SupplyFeed feed = at.get().feed();
      if (feed instanceof SupplyFeed.Stated stated) {
        return OptionalDouble.of(stated.voltage() * chassis.conditions().mainsRatio());
      }
      at = feed instanceof SupplyFeed.Dropped d ? chassis.supply(d.from()) : Optional.empty();
    }
    return OptionalDouble.empty();
  }
}
