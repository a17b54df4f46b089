package perveance.engine.stage;

import java.util.Map;
import java.util.Optional;

/** Output stages in their variants. */
final class OutputSamples {
  private OutputSamples() {}

  static void add(Map<String, StageBench> all) {
    singleEnded(all);
    pushPull(all);
  }

  private static StageBench single(LinearValve law) {
    return new StageBench("single-ended-output", law).with("primary", 5e3);
  }

  private static void singleEnded(Map<String, StageBench> all) {
    all.put(
        "single triode, data sheet",
        single(StageSamples.TRIODE)
            .without("supply")
            .with("anode_voltage", 250)
            .with("grid_bias", -45));
    all.put(
        "single triode, full",
        single(StageSamples.TRIODE)
            .with("cathode_resistor", 880)
            .with("cathode_bypass", 100e-6)
            .with("grid_leak", 220e3)
            .with("grid_stopper", 1e3)
            .with("input_coupling", 1e-7)
            .with("secondary_load", 8)
            .with("secondary_resistance", 0.5)
            .with("winding_resistance", 200)
            .with("primary_inductance", 15)
            .with("leakage_inductance", 20e-3));
    all.put(
        "single triodes in parallel",
        single(StageSamples.TRIODE)
            .with("sections", 3)
            .with("cathode_voltage", 30)
            .with("grid_stopper", 1e3)
            .with("secondary_load", 8));
    StageBench pentode = single(StageSamples.PENTODE).with("cathode_resistor", 135);
    all.put("single pentode, screen at the supply", pentode.copy().with("cathode_bypass", 100e-6));
    all.put(
        "single pentode, dropper",
        pentode
            .copy()
            .with("screen_resistor", 1e3)
            .with("screen_bypass", 10e-6)
            .with("secondary_load", 8));
    all.put(
        "single pentode, data sheet",
        pentode
            .copy()
            .without("supply")
            .with("anode_voltage", 250)
            .with("screen_voltage", 200)
            .with("screen_resistor", 1e3));
    all.put("single pentode, own screen supply", pentode.copy().with("screen_supply", "B").copy());
    all.put(
        "single pentode, ultra-linear",
        pentode
            .copy()
            .with("connection", "ultra-linear")
            .with("tap", 0.43)
            .with("screen_resistor", 1e3)
            .with("secondary_load", 8));
    all.put(
        "single pentode as triode",
        pentode.copy().with("connection", "triode").with("screen_resistor", 100));
    all.put(
        "single pentodes in parallel",
        pentode
            .copy()
            .with("sections", 2)
            .with("screen_resistor", 100)
            .with("grid_stopper", 1e3)
            .with("screen_voltage", 200));
    all.put(
        "single pentodes, ultra-linear",
        pentode.copy().with("sections", 2).with("connection", "ultra-linear").with("tap", 0.2));
  }

  private static StageBench pair(LinearValve law) {
    return new StageBench("push-pull-output", law).with("primary", 6.6e3);
  }

  private static void pushPull(Map<String, StageBench> all) {
    all.put(
        "push-pull triodes, data sheet",
        pair(StageSamples.TRIODE)
            .without("supply")
            .with("anode_voltage", 300)
            .with("grid_bias", -62));
    all.put(
        "push-pull triodes, shared",
        pair(StageSamples.TRIODE)
            .with("cathode_resistor", 250)
            .with("cathode_bypass", 100e-6)
            .with("shared", true)
            .with("ref2", "V9")
            .with("input_coupling", 1e-7)
            .with("grid_stopper", 1e3)
            .with("winding_resistance", 250)
            .with("secondary_load", 8));
    StageBench pentode =
        pair(StageSamples.PENTODE).with("grid_stopper", 2.2e3).with("grid_leak", 220e3);
    all.put(
        "push-pull pentodes, fixed bias",
        pentode
            .copy()
            .with("grid_bias", -38)
            .with("screen_resistor", 1e3)
            .with("secondary_load", 8));
    all.put(
        "push-pull pentodes, data sheet",
        pentode
            .copy()
            .without("supply")
            .with("anode_voltage", 430)
            .with("screen_voltage", 300)
            .with("cathode_resistor", 465)
            .with("cathode_bypass", 50e-6));
    all.put(
        "push-pull ultra-linear",
        pentode
            .copy()
            .with("cathode_resistor", 465)
            .with("connection", "ultra-linear")
            .with("tap", 0.43)
            .with("screen_resistor", 1e3));
    all.put(
        "push-pull pentodes as triodes",
        pentode
            .copy()
            .with("cathode_resistor", 465)
            .with("connection", "triode")
            .with("screen_resistor", 100));
    all.put(
        "push-pull, own screen supply",
        pentode
            .copy()
            .with("cathode_resistor", 230)
            .with("shared", true)
            .with("cathode_bypass", 100e-6)
            .with("screen_supply", "B"));
    all.put(
        "push-pull, screens by one dropper",
        pentode
            .copy()
            .with("cathode_resistor", 230)
            .with("shared", true)
            .with("cathode_bypass", 100e-6)
            .with("screen_dropper", 4.7e3)
            .with("screen_bypass", 22e-6)
            .with("secondary_load", 8));
    all.put(
        "push-pull, four pentodes, dropper from own supply",
        pentode
            .copy()
            .with("sections", 2)
            .with("grid_bias", -38)
            .with("screen_resistor", 1e3)
            .with("screen_dropper", 1e3)
            .with("screen_bypass", 22e-6)
            .with("screen_supply", "B"));
    all.put(
        "push-pull triodes, direct",
        pair(StageSamples.TRIODE)
            .with("cathode_resistor", 900)
            .with("shared", true)
            .with("grid_stopper", 1e3)
            .in(StageBench.drivenFrom("V0.anode", Optional.of("V0.anode2"))));
    all.put(
        "push-pull, four pentodes",
        pentode
            .copy()
            .with("sections", 2)
            .with("grid_bias", -38)
            .with("screen_resistor", 1e3)
            .with("secondary_load", 4));
    all.put(
        "push-pull, four ultra-linear",
        pentode
            .copy()
            .with("sections", 2)
            .with("cathode_resistor", 120)
            .with("cathode_bypass", 100e-6)
            .with("shared", true)
            .with("connection", "ultra-linear")
            .with("tap", 0.43)
            .with("screen_resistor", 1e3));
    all.put(
        "push-pull, six as triodes",
        pentode
            .copy()
            .with("sections", 3)
            .with("cathode_resistor", 120)
            .with("cathode_bypass", 100e-6)
            .with("connection", "triode"));
  }
}
