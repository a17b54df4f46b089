package perveance.engine.stage;

import java.util.Map;

/** Stages with two valves in their variants. */
final class TwoValveSamples {
  private TwoValveSamples() {}

  static void add(Map<String, StageBench> all) {
    pairs(all);
    cascodes(all);
    stacks(all);
    paraphases(all);
    chokes(all);
  }

  private static StageBench pair() {
    return new StageBench("long-tailed-pair", StageSamples.TRIODE).with("anode_load", 100e3);
  }

  private static void pairs(Map<String, StageBench> all) {
    all.put(
        "pair, self bias",
        pair()
            .with("anode_load2", 82e3)
            .with("cathode_resistor", 470)
            .with("tail_resistor", 10e3)
            .with("grid_leak", 1e6)
            .with("grid_stopper", 10e3)
            .with("second_grid_leak", 1e6)
            .with("second_grid_bypass", 1e-7)
            .with("coupling", 1e-7)
            .with("load", 220e3));
    all.put(
        "pair with feedback",
        pair()
            .with("cathode_resistor", 470)
            .with("tail_resistor", 10e3)
            .with("feedback_shunt", 4.7e3)
            .with("second_grid_bypass", 1e-7)
            .with("load", 220e3)
            .with("load2", 100e3));
    all.put(
        "pair, direct",
        pair()
            .with("tail_resistor", 82e3)
            .with("second_grid_leak", 1e6)
            .with("second_grid_bypass", 1e-7)
            .in(StageBench.drivenFrom("V0.anode")));
    all.put("pair, grids at chassis", pair().with("tail_resistor", 10e3).with("grid_leak", 1e6));
    all.put(
        "pair on a negative supply",
        pair().with("tail_resistor", 100e3).with("tail_supply", "N").device2(StageSamples.TRIODE));
    all.put(
        "pair, current tail, fixed bias",
        pair()
            .with("tail_current", 2e-3)
            .with("grid_bias", 60)
            .with("second_grid_leak", 1e6)
            .with("coupling", 1e-7));
  }

  private static void cascodes(Map<String, StageBench> all) {
    StageBench cascode =
        new StageBench("cascode", StageSamples.TRIODE)
            .with("anode_load", 22e3)
            .with("cathode_resistor", 220)
            .with("grid_leak", 1e6);
    all.put("cascode, stated", cascode.copy().with("upper_grid_voltage", 90));
    all.put(
        "cascode, divider",
        cascode
            .copy()
            .with("upper_grid_top", 1e6)
            .with("upper_grid_bottom", 470e3)
            .with("upper_grid_bypass", 1e-7)
            .with("cathode_bypass", 100e-6)
            .with("grid_stopper", 100)
            .with("input_coupling", 1e-7)
            .with("coupling", 1e-7)
            .with("load", 1e6));
    all.put(
        "cascode, pentodes as triodes",
        new StageBench("cascode", StageSamples.PENTODE)
            .with("connection", "triode")
            .with("anode_load", 22e3)
            .with("cathode_voltage", 1.7)
            .with("upper_grid_top", 1e6)
            .with("upper_grid_bottom", 470e3));
  }

  private static void stacks(Map<String, StageBench> all) {
    StageBench totem =
        new StageBench("totem-pole", StageSamples.TRIODE)
            .with("cathode_resistor", 680)
            .with("grid_leak", 1e6);
    all.put("totem pole, plain", totem.copy());
    all.put(
        "totem pole, full",
        totem
            .copy()
            .with("ref2", "V2")
            .with("upper_resistor", 470)
            .with("cathode_bypass", 220e-6)
            .with("grid_stopper", 1e3)
            .with("coupling", 1e-6)
            .with("load", 47e3));
    StageBench mu =
        new StageBench("mu-follower", StageSamples.TRIODE)
            .with("anode_load", 22e3)
            .with("upper_resistor", 470)
            .with("cathode_resistor", 470)
            .with("grid_leak", 1e6);
    all.put("mu-follower, plain", mu.copy());
    all.put(
        "mu-follower, full",
        mu.copy()
            .with("upper_grid_leak", 1e6)
            .with("upper_coupling", 1e-7)
            .with("cathode_bypass", 220e-6)
            .with("grid_stopper", 1e3)
            .with("coupling", 1e-6)
            .with("load", 47e3));
    StageBench white =
        new StageBench("white-follower", StageSamples.TRIODE)
            .with("anode_load", 1e3)
            .with("cathode_resistor", 220)
            .with("grid_leak", 1e6);
    all.put("white follower, fixed bias", white.copy().with("grid_bias", 120));
    all.put(
        "white follower, self bias",
        white
            .copy()
            .with("upper_resistor", 220)
            .with("lower_coupling", 1e-7)
            .with("cathode_bypass", 220e-6)
            .with("coupling", 10e-6)
            .with("load", 600));
    all.put(
        "white follower, direct",
        white
            .copy()
            .without("grid_leak")
            .with("lower_coupling", 1e-7)
            .with("load", 10e3)
            .in(StageBench.drivenFrom("V0.anode")));
  }

  private static void paraphases(Map<String, StageBench> all) {
    StageBench paraphase =
        new StageBench("paraphase", StageSamples.TRIODE)
            .with("anode_load", 100e3)
            .with("cathode_resistor", 1500)
            .with("divider_top", 470e3)
            .with("divider_bottom", 8.2e3)
            .with("grid_leak", 1e6);
    all.put("paraphase, apart", paraphase.copy().with("cathode_bypass", 22e-6));
    all.put(
        "paraphase, floating",
        paraphase
            .copy()
            .with("shared", true)
            .with("cathode_bypass", 22e-6)
            .with("divider_second", 470e3)
            .with("divider_bottom", 470e3)
            .with("grid_stopper", 10e3)
            .with("coupling", 1e-7)
            .with("load", 1e6));
    all.put("paraphase, shared", paraphase.copy().with("shared", true));
  }

  private static void chokes(Map<String, StageBench> all) {
    StageBench choke =
        new StageBench("choke-load", StageSamples.TRIODE)
            .with("anode_choke", 40)
            .with("grid_leak", 1e6);
    all.put("choke, fixed bias", choke.copy().with("grid_bias", -4));
    all.put(
        "choke, cathode bias",
        choke
            .copy()
            .with("choke_resistance", 600)
            .with("cathode_resistor", 470)
            .with("cathode_bypass", 220e-6)
            .with("coupling", 1e-6)
            .with("load", 100e3));
  }
}
