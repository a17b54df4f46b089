package perveance.engine.stage;

import java.util.LinkedHashMap;
import java.util.Map;

/** Stages of every kind in their variants, for the checks that all kinds must pass. */
final class StageSamples {
  static final LinearValve TRIODE = LinearValve.triode(100, 62.5e3);
  static final LinearValve PENTODE = LinearValve.pentode(2e-3, 1e6, 40, 50e3);

  private StageSamples() {}

  static Map<String, StageBench> all() {
    Map<String, StageBench> all = new LinkedHashMap<>();
    commonCathode(all);
    followers(all);
    TwoValveSamples.add(all);
    OutputSamples.add(all);
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
        "pentodes in parallel",
        new StageBench("common-cathode", PENTODE)
            .with("sections", 3)
            .with("anode_load", 100e3)
            .with("cathode_resistor", 1e3)
            .with("cathode_bypass", 47e-6)
            .with("screen_resistor", 470e3)
            .with("screen_bypass", 0.1e-6)
            .with("grid_leak", 1e6)
            .with("grid_stopper", 1e3)
            .with("coupling", 22e-9)
            .with("load", 470e3));
    all.put(
        "pentodes in parallel as triodes",
        new StageBench("common-cathode", PENTODE)
            .with("sections", 2)
            .with("connection", "triode")
            .with("anode_load", 47e3)
            .with("cathode_resistor", 1e3)
            .with("grid_leak", 1e6)
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

  private static void followers(Map<String, StageBench> all) {
    StageBench follower = new StageBench("cathode-follower", TRIODE).with("grid_leak", 1e6);
    all.put("follower on chassis", follower.copy().with("cathode_resistor", 22e3));
    all.put(
        "follower, self bias",
        follower
            .copy()
            .with("cathode_resistor", 1e3)
            .with("cathode_bypass", 22e-6)
            .with("cathode_load", 47e3)
            .with("grid_stopper", 1e3)
            .with("coupling", 1e-6)
            .with("load", 100e3));
    all.put(
        "follower, fixed bias",
        follower
            .copy()
            .with("cathode_resistor", 1e3)
            .with("cathode_load", 47e3)
            .with("anode_load", 1e3)
            .with("grid_bias", 100));
    all.put(
        "follower, direct",
        follower
            .copy()
            .without("grid_leak")
            .with("cathode_load", 100e3)
            .with("load", 100e3)
            .in(StageBench.drivenFrom("V0.anode")));
    all.put(
        "followers in parallel",
        follower
            .copy()
            .with("sections", 3)
            .with("cathode_resistor", 1e3)
            .with("cathode_bypass", 22e-6)
            .with("cathode_load", 22e3)
            .with("grid_stopper", 1e3)
            .with("anode_load", 100)
            .with("coupling", 1e-6)
            .with("load", 100e3));
    all.put(
        "followers in parallel, pentodes",
        new StageBench("cathode-follower", PENTODE)
            .with("sections", 2)
            .with("connection", "triode")
            .with("cathode_load", 10e3)
            .with("grid_bias", 60));
    all.put(
        "follower on a current source",
        follower
            .copy()
            .with("cathode_resistor", 1e3)
            .with("cathode_current", 2e-3)
            .with("coupling", 1e-6));
    all.put(
        "follower, pentode",
        new StageBench("cathode-follower", PENTODE)
            .with("connection", "triode")
            .with("cathode_load", 10e3)
            .with("grid_bias", 60));
    StageBench grounded =
        new StageBench("grounded-grid", TRIODE)
            .with("anode_load", 22e3)
            .with("cathode_resistor", 1e3);
    all.put(
        "grounded grid",
        grounded.copy().with("input_coupling", 1e-6).with("coupling", 1e-7).with("load", 1e6));
    all.put("grounded grid, fixed bias", grounded.copy().with("grid_bias", 10));
    all.put(
        "grounded grid, direct",
        grounded.copy().without("cathode_resistor").in(StageBench.drivenFrom("V0.cathode")));
    StageBench concertina =
        new StageBench("concertina", TRIODE).with("anode_load", 22e3).with("cathode_load", 22e3);
    all.put(
        "concertina, direct",
        concertina
            .copy()
            .with("grid_stopper", 10e3)
            .with("coupling", 1e-7)
            .with("load", 220e3)
            .in(StageBench.drivenFrom("V0.anode")));
    all.put(
        "concertina, self bias",
        concertina
            .copy()
            .with("cathode_resistor", 1e3)
            .with("cathode_bypass", 22e-6)
            .with("coupling", 1e-7)
            .with("load", 220e3)
            .with("load2", 100e3));
    all.put("concertina, fixed bias", concertina.copy().with("grid_bias", 85));
  }
}
