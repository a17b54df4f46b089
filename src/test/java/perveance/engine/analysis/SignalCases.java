package perveance.engine.analysis;

import static perveance.engine.analysis.FindingCases.pair;
import static perveance.engine.analysis.FindingCases.single;
import static perveance.engine.analysis.FindingCases.standard;

import java.util.Map;
import java.util.function.Supplier;
import perveance.engine.base.MessageCode;
import perveance.engine.base.OutputMessage;
import perveance.engine.base.SignalMessage;

/** For every finding about signals and output stages a small chassis that it must be told of. */
final class SignalCases {
  private final Map<MessageCode, Supplier<Bench>> cases;

  private SignalCases(Map<MessageCode, Supplier<Bench>> cases) {
    this.cases = cases;
  }

  static void into(Map<MessageCode, Supplier<Bench>> cases) {
    SignalCases all = new SignalCases(cases);
    all.swing();
    all.response();
    all.outputs();
  }

  private void swing() {
    cases.put(SignalMessage.GRID_CURRENT_FIRST, () -> standard(310));
    cases.put(SignalMessage.CUT_OFF_FIRST, () -> standard(310, "cathode_resistor", "6k8"));
    cases.put(
        SignalMessage.KNEE_FIRST,
        () -> single(250, "EL84", "primary", "5k2", "cathode_resistor", "150"));
    cases.put(
        SignalMessage.BOTTOMING_FIRST,
        () ->
            standard(310, "cathode_resistor", "220")
                .devices(new SampleDevices("12AX7", OddTriodeLaw.WITHOUT_GRID_CURRENT)));
    cases.put(
        SignalMessage.SUPPLY_FIRST,
        () ->
            standard(170, "anode_load", "", "anode_current", "0.5 mA", "cathode_resistor", "3k3"));
    cases.put(SignalMessage.NO_HEADROOM, () -> standard(310, "drive", "1.3 V"));
    cases.put(SignalMessage.LITTLE_HEADROOM, () -> standard(310, "drive", "0.9 V"));
    cases.put(SignalMessage.HIGH_DISTORTION, () -> standard(310, "drive", "2 V"));
    cases.put(
        SignalMessage.ROW_OVERDRIVEN,
        () ->
            Bench.on(310)
                .stage(
                    "V1a",
                    "common-cathode",
                    "device",
                    "12AX7",
                    "supply",
                    "A",
                    "anode_load",
                    "100k",
                    "cathode_resistor",
                    "1k5",
                    "cathode_bypass",
                    "22u",
                    "coupling",
                    "22n",
                    "drives",
                    "V1b",
                    "drive",
                    "50 mV")
                .standardNext("V1b"));
    cases.put(SignalMessage.DRIVER_SHORT, () -> driven(200, "300B", "1k", "60 V"));
    cases.put(SignalMessage.DRIVER_THIN, () -> driven(250, "2A3", "750", "40 V"));
  }

  /** A 12AU7 on a supply of its own in front of one triode. */
  private static Bench driven(double supply, String device, String cathode, String drive) {
    return Bench.on(supply)
        .supply("B", 330)
        .stage(
            "V1",
            "common-cathode",
            "device",
            "12AU7",
            "supply",
            "A",
            "anode_load",
            "47k",
            "cathode_resistor",
            "2k2",
            "cathode_bypass",
            "100u",
            "coupling",
            "220n",
            "drives",
            "V2")
        .stage(
            "V2",
            "single-ended-output",
            "device",
            device,
            "supply",
            "B",
            "primary",
            "3k5",
            "cathode_resistor",
            cathode,
            "cathode_bypass",
            "100u",
            "grid_leak",
            "470k",
            "drive",
            drive);
  }

  private void response() {
    cases.put(SignalMessage.LOW_CORNER_HIGH, () -> standard(310, "coupling", "1n", "load", "220k"));
    cases.put(SignalMessage.HIGH_CORNER_LOW, () -> standard(310, "grid_stopper", "220k"));
    cases.put(SignalMessage.BYPASS_SHELF, () -> standard(310, "cathode_bypass", "0.68u"));
    cases.put(
        SignalMessage.BLOCKING, () -> standard(310, "input_coupling", "100n", "source", "100k"));
    cases.put(
        SignalMessage.HIGH_NOISE,
        () -> standard(310, "cathode_resistor", "560", "grid_stopper", "470k"));
  }

  private void outputs() {
    cases.put(
        OutputMessage.LOAD_OFF_BEST,
        () -> single(300, "2A3", "primary", "1k", "cathode_resistor", "1k2"));
    cases.put(
        OutputMessage.POWER_SMALL,
        () -> single(265, "300B", "primary", "800", "cathode_resistor", "2k2"));
    cases.put(
        OutputMessage.LOWER_LOAD_OVER,
        () ->
            pair(
                430,
                "EL34",
                "primary",
                "3k4",
                "secondary_load",
                "8",
                "grid_bias",
                "-36 V",
                "screen_resistor",
                "1k",
                "drive",
                "30 V"));
    cases.put(
        OutputMessage.REACTIVE_CUT_OFF,
        () ->
            FindingCases.single(
                250,
                "2A3",
                "primary",
                "2k5",
                "secondary_load",
                "8R",
                "grid_bias",
                "-45 V",
                "primary_inductance",
                "3",
                "load_frequency",
                "40 Hz"));
    cases.put(
        OutputMessage.REACTIVE_DISSIPATION,
        () ->
            FindingCases.pair(
                430,
                "EL34",
                "primary",
                "3k4",
                "secondary_load",
                "8R",
                "grid_bias",
                "-36 V",
                "screen_resistor",
                "1k",
                "load_capacitance",
                "10u",
                "load_frequency",
                "2 kHz",
                "drive",
                "34 V"));
    cases.put(
        OutputMessage.SCREEN_RISES,
        () ->
            pair(
                430,
                "EL34",
                "primary",
                "3k4",
                "grid_bias",
                "-36 V",
                "screen_resistor",
                "1k",
                "drive",
                "30 V"));
    cases.put(
        OutputMessage.PAIR_UNBALANCED,
        () -> pair(300, "EL84", "device2", "6AQ5", "primary", "8k", "grid_bias", "-10 V"));
    cases.put(
        OutputMessage.OUTPUTS_UNBALANCED,
        () ->
            Bench.on(310)
                .stage(
                    "V1",
                    "long-tailed-pair",
                    "device",
                    "12AX7",
                    "supply",
                    "A",
                    "anode_load",
                    "100k",
                    "anode_load2",
                    "100k",
                    "cathode_resistor",
                    "470",
                    "tail_resistor",
                    "10k",
                    "second_grid_leak",
                    "1M",
                    "second_grid_bypass",
                    "100n",
                    "load",
                    "220k",
                    "load2",
                    "220k"));
  }
}
