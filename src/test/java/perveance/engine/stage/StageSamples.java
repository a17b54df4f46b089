package perveance.engine.stage;

import java.util.LinkedHashMap;
import java.util.Map;
import perveance.engine.device.LawKind;

/** Stages of every kind in their variants, for the checks that all kinds must pass. */
final class StageSamples {
  static final LinearValve TRIODE = LinearValve.triode(100, 62.5e3);
  static final LinearValve PENTODE =
      new LinearValve(LawKind.PENTODE, 2e-3, 1e6, 0.05e-3, 0.02e-3, 0);

  private StageSamples() {}

  static Map<String, StageBench> all() {
    Map<String, StageBench> all = new LinkedHashMap<>();
    commonCathode(all);
    return all;
  }

  static StageBench plain() {
    return new StageBench("common-cathode", TRIODE)
        .with("anode_load", 100e3)
        .with("cathode_resistor", 1.5e3)
        .with("grid_leak", 1e6);
  }

  private static void commonCathode(Map<String, StageBench> all) {
    all.put("plain", plain());
    all.put(
        "full",
        plain()
            .with("cathode_bypass", 22e-6)
            .with("grid_stopper", 10e3)
            .with("source", 10e3)
            .with("input_coupling", 22e-9)
            .with("coupling", 22e-9)
            .with("load", 470e3)
            .with("drive", 0.5));
    all.put("small bypass, load alone", plain().with("cathode_bypass", 0.68e-6).with("load", 1e6));
    all.put("open coupling", plain().with("coupling", 22e-9).with("drives", "V2"));
    all.put("fixed bias", plain().without("cathode_resistor").with("grid_bias", -2));
    all.put("led", plain().without("cathode_resistor").with("cathode_voltage", 1.7));
    all.put("zener", plain().without("cathode_resistor").with("cathode_voltage", 6.2));
    all.put("grid leak", plain().without("cathode_resistor").with("grid_leak", 10e6));
    all.put("direct", plain().without("grid_leak").in(StageBench.drivenFrom("V0.anode")));
    all.put(
        "constant current",
        plain().without("anode_load").with("anode_current", 1e-3).with("load", 1e6));
    all.put(
        "parallel",
        plain().with("sections", 2).with("grid_stopper", 10e3).with("cathode_bypass", 22e-6));
    all.put("three grounded", plain().with("sections", 3).without("cathode_resistor"));
    all.put(
        "pentode",
        new StageBench("common-cathode", PENTODE)
            .with("anode_load", 220e3)
            .with("cathode_resistor", 2.2e3)
            .with("cathode_bypass", 47e-6)
            .with("screen_resistor", 1e6)
            .with("screen_bypass", 0.1e-6)
            .with("grid_leak", 1e6)
            .with("coupling", 22e-9)
            .with("load", 470e3));
    all.put(
        "pentode, screen stated",
        new StageBench("common-cathode", PENTODE)
            .with("anode_load", 220e3)
            .with("cathode_resistor", 2.2e3)
            .with("screen_voltage", 100)
            .with("grid_leak", 1e6)
            .with("load", 470e3));
    all.put(
        "pentode as triode",
        new StageBench("common-cathode", PENTODE)
            .with("connection", "triode")
            .with("anode_load", 47e3)
            .with("cathode_resistor", 2.2e3)
            .with("grid_leak", 1e6)
            .with("coupling", 22e-9)
            .with("load", 470e3));
  }
}
