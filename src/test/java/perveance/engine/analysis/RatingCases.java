package perveance.engine.analysis;

import static perveance.engine.analysis.FindingCases.single;
import static perveance.engine.analysis.FindingCases.standard;

import java.util.Map;
import java.util.function.Supplier;
import perveance.engine.base.MessageCode;
import perveance.engine.base.RatingMessage;
import perveance.engine.stage.HeaterSupply;

/** For every finding about the limits of valves a small chassis that it must be told of. */
final class RatingCases {
  private final Map<MessageCode, Supplier<Bench>> cases;

  private RatingCases(Map<MessageCode, Supplier<Bench>> cases) {
    this.cases = cases;
  }

  static void into(Map<MessageCode, Supplier<Bench>> cases) {
    RatingCases all = new RatingCases(cases);
    all.ratings();
    all.dissipation();
  }

  private void ratings() {
    cases.put(
        RatingMessage.ANODE_VOLTAGE_OVER,
        () -> standard(450, "anode_load", "10k", "cathode_resistor", "4k7"));
    cases.put(
        RatingMessage.ANODE_VOLTAGE_NEAR,
        () -> standard(310, "anode_load", "22k", "cathode_resistor", "3k3"));
    cases.put(
        RatingMessage.SCREEN_VOLTAGE_OVER,
        () -> single(320, "EL84", "primary", "5k", "grid_bias", "-12 V"));
    cases.put(
        RatingMessage.SCREEN_VOLTAGE_NEAR,
        () -> single(290, "EL84", "primary", "5k", "grid_bias", "-12 V"));
    cases.put(
        RatingMessage.CATHODE_CURRENT_OVER,
        () -> single(250, "EL84", "primary", "5k", "grid_bias", "-5 V"));
    cases.put(
        RatingMessage.CATHODE_CURRENT_NEAR,
        () -> single(250, "EL84", "primary", "5k", "grid_bias", "-6.5 V"));
    cases.put(
        RatingMessage.HEATER_CATHODE_OVER,
        () ->
            Bench.on(400)
                .stage(
                    "V1",
                    "cathode-follower",
                    "device",
                    "12AX7",
                    "supply",
                    "A",
                    "cathode_load",
                    "100k",
                    "grid_bias",
                    "220 V"));
    cases.put(
        RatingMessage.HEATER_CATHODE_NEAR,
        () ->
            Bench.on(400)
                .stage(
                    "V1",
                    "cathode-follower",
                    "device",
                    "12AX7",
                    "supply",
                    "A",
                    "cathode_load",
                    "100k",
                    "grid_bias",
                    "172 V"));
    cases.put(
        RatingMessage.GRID_LEAK_OVER,
        () -> single(250, "EL84", "primary", "5k", "grid_bias", "-8 V", "grid_leak", "2M2"));
    cases.put(
        RatingMessage.HEATER_VOLTAGE_OUTSIDE,
        () -> standard(300).conditions(FindingCases.conditions(1.12, HeaterSupply.USUAL)));
    cases.put(
        RatingMessage.COLD_START_ANODE_OVER,
        () -> single(650, "EL84", "primary", "5k", "grid_bias", "-60 V"));
    cases.put(RatingMessage.NO_RATING, () -> standard(300).devices(SampleDevices.unrated("12AX7")));
  }

  private void dissipation() {
    cases.put(
        RatingMessage.ANODE_DISSIPATION_OVER,
        () -> standard(400, "anode_load", "22k", "cathode_resistor", "220"));
    cases.put(
        RatingMessage.ANODE_DISSIPATION_NEAR,
        () -> single(250, "EL84", "primary", "5k", "cathode_resistor", "140"));
    cases.put(
        RatingMessage.SCREEN_DISSIPATION_OVER,
        () -> single(290, "EL84", "primary", "5k", "grid_bias", "-5 V"));
    cases.put(
        RatingMessage.SCREEN_DISSIPATION_NEAR,
        () -> single(250, "EL84", "primary", "5k", "grid_bias", "-6 V"));
    cases.put(
        RatingMessage.BOTH_ANODES_OVER,
        () ->
            Bench.on(280)
                .stage(
                    "V1",
                    "long-tailed-pair",
                    "device",
                    "5687",
                    "supply",
                    "A",
                    "anode_load",
                    "4k7",
                    "anode_load2",
                    "4k7",
                    "tail_resistor",
                    "100",
                    "second_grid_leak",
                    "1M",
                    "second_grid_bypass",
                    "100n"));
  }
}
