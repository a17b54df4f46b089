package perveance.engine.stage;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import perveance.engine.base.NearMiss;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.Unit;
import perveance.engine.stage.ChassisComplaint.Place;

/** Checks the supply nodes of a chassis: names, feeds that lead somewhere, possible values. */
final class SupplyChecks {
  private static final double HIGHEST_VOLTAGE = 10e3;
  private static final double LEAST_RESISTANCE = 0.01;
  private static final double GREATEST_RESISTANCE = 1e9;
  private static final double LEAST_CAPACITANCE = 1e-12;
  private static final double GREATEST_CAPACITANCE = 1;

  private final Chassis chassis;
  private final List<ChassisComplaint> complaints = new ArrayList<>();

  private SupplyChecks(Chassis chassis) {
    this.chassis = chassis;
  }

  static List<ChassisComplaint> complaints(Chassis chassis) {
    SupplyChecks checks = new SupplyChecks(chassis);
    Set<String> names = new HashSet<>();
    for (int i = 0; i < chassis.supplies().size(); i++) {
      Supply supply = chassis.supplies().get(i);
      if (!ChassisNames.wellFormed(supply.name())) {
        checks.add(i, "", "a supply named \"" + supply.name() + "\"", ChassisNames.FORM);
      }
      if (!names.add(supply.name())) {
        checks.add(i, "", "a second supply of that name", "a name of its own");
      }
      checks.feed(i, supply);
      supply.reservoir().ifPresent(new Range(checks, i, "reservoir", Unit.FARAD)::check);
      supply.bleeder().ifPresent(new Range(checks, i, "bleeder", Unit.OHM)::check);
    }
    return checks.complaints;
  }

  private void feed(int index, Supply supply) {
    if (supply.feed() instanceof SupplyFeed.Stated stated) {
      new Range(this, index, "voltage", Unit.VOLT).check(stated.voltage());
    } else if (supply.feed() instanceof SupplyFeed.Dropped dropped) {
      new Range(this, index, "dropper", Unit.OHM).check(dropped.dropper());
      List<String> others =
          chassis.supplies().stream()
              .map(Supply::name)
              .filter(n -> !n.equals(supply.name()))
              .toList();
      if (!others.contains(dropped.from())) {
        Optional<String> near = NearMiss.suggest(dropped.from(), others);
        String found = "\"" + dropped.from() + "\", which is no other supply";
        add(index, "from", found, "another supply of the chassis", near);
      } else if (inCircle(supply)) {
        add(
            index,
            "from",
            "supplies that feed each other in a circle",
            "a chain that starts at a voltage");
      }
    }
  }

  private boolean inCircle(Supply start) {
    Supply at = start;
    for (int steps = 0; steps <= chassis.supplies().size(); steps++) {
      if (!(at.feed() instanceof SupplyFeed.Dropped dropped)) {
        return false;
      }
      Optional<Supply> next = chassis.supply(dropped.from());
      if (next.isEmpty()) {
        return false;
      }
      at = next.get();
    }
    return true;
  }

  private void add(int index, String key, String found, String expected) {
    add(index, key, found, expected, Optional.empty());
  }

  private void add(int index, String key, String found, String expected, Optional<String> near) {
    String name = chassis.supplies().get(index).name();
    complaints.add(new ChassisComplaint(Place.SUPPLY, index, name, key, found, expected, near));
  }

  /** A value of a supply that must be possible. */
  private record Range(SupplyChecks checks, int index, String key, Unit unit) {
    void check(double value) {
      boolean possible =
          switch (unit) {
            case VOLT -> Math.abs(value) <= HIGHEST_VOLTAGE && value != 0;
            case OHM -> value >= LEAST_RESISTANCE && value <= GREATEST_RESISTANCE;
            default -> value >= LEAST_CAPACITANCE && value <= GREATEST_CAPACITANCE;
          };
      if (!possible) {
        String found =
            Double.isFinite(value)
                ? QuantityFormat.PLAIN.part(value, unit)
                : Double.toString(value);
        checks.add(index, key, found, expected());
      }
    }

    private String expected() {
      return switch (unit) {
        case VOLT -> "a voltage up to 10 kV, not zero";
        case OHM -> "a resistance from 0R01 to 1G";
        default -> "a capacitance from 1p to 1 F";
      };
    }
  }
}
