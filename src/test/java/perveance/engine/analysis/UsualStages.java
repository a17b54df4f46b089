package perveance.engine.analysis;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Random;

/** Usual values of each kind of stage, from which random ones start. */
final class UsualStages {
  private static final Map<String, Map<String, Double>> ALL =
      Map.ofEntries(
          Map.entry(
              "common-cathode",
              keys("anode_load", 100e3, "cathode_resistor", 1.5e3, "cathode_bypass", 22e-6)),
          Map.entry("cathode-follower", keys("cathode_load", 47e3, "cathode_resistor", 1e3)),
          Map.entry("grounded-grid", keys("anode_load", 22e3, "cathode_resistor", 1e3)),
          Map.entry(
              "cascode",
              keys("anode_load", 22e3, "cathode_resistor", 680.0, "upper_grid_voltage", 90.0)),
          Map.entry(
              "long-tailed-pair",
              keys(
                  "anode_load", 100e3,
                  "anode_load2", 100e3,
                  "cathode_resistor", 470.0,
                  "tail_resistor", 10e3,
                  "load2", 220e3)),
          Map.entry(
              "concertina",
              keys(
                  "anode_load", 22e3,
                  "cathode_load", 22e3,
                  "cathode_resistor", 1e3,
                  "load2", 220e3)),
          Map.entry(
              "totem-pole",
              keys("upper_resistor", 680.0, "cathode_resistor", 680.0, "cathode_bypass", 1e-4)),
          Map.entry(
              "mu-follower",
              keys(
                  "cathode_resistor", 1e3,
                  "cathode_bypass", 1e-4,
                  "anode_load", 22e3,
                  "upper_resistor", 1e3)),
          Map.entry(
              "white-follower",
              keys("anode_load", 1e3, "cathode_resistor", 220.0, "upper_resistor", 220.0)),
          Map.entry(
              "paraphase",
              keys(
                  "anode_load", 100e3,
                  "anode_load2", 100e3,
                  "cathode_resistor", 1.5e3,
                  "divider_top", 470e3,
                  "divider_bottom", 10e3,
                  "load2", 470e3)),
          Map.entry(
              "choke-load",
              keys("anode_choke", 40.0, "choke_resistance", 500.0, "cathode_resistor", 1e3)),
          Map.entry(
              "single-ended-output",
              keys(
                  "supply", 1.0,
                  "primary", 5e3,
                  "winding_resistance", 200.0,
                  "cathode_resistor", 270.0,
                  "cathode_bypass", 2e-4)),
          Map.entry(
              "push-pull-output",
              keys(
                  "supply", 1.0,
                  "primary", 6.6e3,
                  "winding_resistance", 200.0,
                  "cathode_resistor", 250.0)));

  private UsualStages() {}

  private static Map<String, Double> keys(Object... keysAndValues) {
    Map<String, Double> map = new LinkedHashMap<>();
    for (int i = 0; i < keysAndValues.length; i += 2) {
      map.put((String) keysAndValues[i], (Double) keysAndValues[i + 1]);
    }
    return map;
  }

  /** A kind's keys with what surrounds any stage, at random. */
  static Map<String, Double> of(String kind, Random random) {
    Map<String, Double> values = new LinkedHashMap<>(ALL.getOrDefault(kind, Map.of()));
    if (kind.endsWith("-output") && random.nextInt(6) == 0) {
      values.put("grid_bias", -38.0);
      values.put("bias_supply", -58.0);
      values.put("bias_top", 14e3);
      values.put("bias_pot", 25e3);
      values.put("bias_bottom", 42e3);
    }
    if (random.nextBoolean()) {
      values.put("coupling", 22e-9);
      values.put("load", 470e3);
    }
    if (random.nextBoolean()) {
      values.put("grid_leak", 1e6);
    }
    if (random.nextInt(3) == 0) {
      values.put("grid_stopper", 10e3);
    }
    if (random.nextInt(3) == 0) {
      values.put("source", 10e3);
    }
    if (random.nextBoolean()) {
      values.put("drive", 1.0);
    }
    return values;
  }
}
