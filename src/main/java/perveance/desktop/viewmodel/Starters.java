package perveance.desktop.viewmodel;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import perveance.engine.base.QuantityException;
import perveance.engine.base.QuantityParser;
import perveance.engine.base.Unit;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.Conditions;
import perveance.engine.stage.Setting;
import perveance.engine.stage.StageEntry;
import perveance.engine.stage.Supply;
import perveance.engine.stage.SupplyFeed;

/** What stands on the bench before a file is opened. */
public final class Starters {
  private Starters() {}

  /**
   * A chassis without stages.
   *
   * @param settings conditions for new documents
   * @return one supply node
   */
  public static Chassis empty(Settings settings) {
    return new Chassis("New chassis", conditions(settings), supplies(), List.of());
  }

  /**
   * The first example: a line stage with one half of a 12AX7.
   *
   * @param settings conditions for new documents
   * @return a chassis that answers at once
   */
  public static Chassis example(Settings settings) {
    Map<String, Setting> s = new LinkedHashMap<>();
    s.put("device", new Setting.Word("12AX7"));
    s.put("supply", new Setting.Word("A"));
    put(s, "anode_load", "100k", Unit.OHM);
    put(s, "cathode_resistor", "1k5", Unit.OHM);
    put(s, "cathode_bypass", "22u", Unit.FARAD);
    put(s, "grid_leak", "1M", Unit.OHM);
    put(s, "source", "10k", Unit.OHM);
    put(s, "coupling", "22n", Unit.FARAD);
    put(s, "load", "330k", Unit.OHM);
    put(s, "drive", "0.5 V", Unit.VOLT);
    return new Chassis(
        "Line stage, example",
        conditions(settings),
        supplies(),
        List.of(new StageEntry("V1a", "common-cathode", s)));
  }

  private static List<Supply> supplies() {
    return List.of(
        new Supply(
            "A", new SupplyFeed.Stated(300), OptionalDouble.of(47e-6), OptionalDouble.of(220e3)));
  }

  private static Conditions conditions(Settings settings) {
    Conditions c = Conditions.USUAL;
    return new Conditions(
        c.mains(),
        c.mainsActual(),
        settings.mainsFrequency(),
        settings.meter(),
        c.resistorTolerance(),
        c.capacitorTolerance(),
        c.supplyTolerance(),
        c.threshold());
  }

  private static void put(Map<String, Setting> settings, String key, String text, Unit unit) {
    try {
      settings.put(key, new Setting.Number(text, QuantityParser.parse(text, unit).value()));
    } catch (QuantityException e) {
      throw new IllegalStateException("the example holds what cannot be read: " + text, e);
    }
  }
}
