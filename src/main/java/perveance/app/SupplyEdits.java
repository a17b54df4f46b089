package perveance.app;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.Setting;
import perveance.engine.stage.StageEntry;
import perveance.engine.stage.Supply;
import perveance.engine.stage.SupplyFeed;

/** Changes to the supply nodes. */
final class SupplyEdits {
  private static final List<String> KEYS = List.of("supply", "screen_supply");

  private SupplyEdits() {}

  static Chassis set(Chassis chassis, Supply supply) {
    List<Supply> supplies = new ArrayList<>(chassis.supplies());
    supplies.replaceAll(s -> s.name().equals(supply.name()) ? supply : s);
    if (chassis.supply(supply.name()).isEmpty()) {
      supplies.add(supply);
    }
    return with(chassis, supplies, chassis.stages());
  }

  static Chassis remove(Chassis chassis, String name) {
    boolean used =
        chassis.stages().stream().anyMatch(s -> KEYS.stream().anyMatch(k -> names(s, k, name)))
            || chassis.supplies().stream().anyMatch(s -> feeds(s, name));
    if (used) {
      throw new IllegalArgumentException("supply " + name + " is in use");
    }
    List<Supply> supplies = new ArrayList<>(chassis.supplies());
    supplies.removeIf(s -> s.name().equals(name));
    return with(chassis, supplies, chassis.stages());
  }

  static Chassis rename(Chassis chassis, String name, String changed) {
    if (changed.isBlank() || (!changed.equals(name) && chassis.supply(changed).isPresent())) {
      throw new IllegalArgumentException("no supply can be named '" + changed + "'");
    }
    List<Supply> supplies = new ArrayList<>();
    for (Supply s : chassis.supplies()) {
      SupplyFeed feed =
          feeds(s, name) && s.feed() instanceof SupplyFeed.Dropped d
              ? new SupplyFeed.Dropped(changed, d.dropper())
              : s.feed();
      supplies.add(
          new Supply(s.name().equals(name) ? changed : s.name(), feed, s.reservoir(), s.bleeder())
              .with(s.ratings()));
    }
    List<StageEntry> stages = new ArrayList<>(chassis.stages());
    for (String key : KEYS) {
      stages.replaceAll(s -> names(s, key, name) ? s.with(key, new Setting.Word(changed)) : s);
    }
    return with(chassis, supplies, stages);
  }

  private static boolean names(StageEntry stage, String key, String name) {
    return stage.settings().get(key) instanceof Setting.Word w && w.text().equals(name);
  }

  private static boolean feeds(Supply supply, String name) {
    return supply.feed() instanceof SupplyFeed.Dropped d && d.from().equals(name);
  }

  private static Chassis with(Chassis chassis, List<Supply> supplies, List<StageEntry> stages) {
    return new Chassis(chassis.title(), chassis.conditions(), supplies, stages);
  }
}
