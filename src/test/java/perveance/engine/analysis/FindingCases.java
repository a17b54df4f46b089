package perveance.engine.analysis;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.function.Supplier;
import perveance.engine.base.BiasMessage;
import perveance.engine.base.DataMessage;
import perveance.engine.base.HazardMessage;
import perveance.engine.base.MessageCode;
import perveance.engine.base.PartMessage;
import perveance.engine.base.SupplyMessage;
import perveance.engine.stage.Conditions;
import perveance.engine.stage.HeaterSupply;
import perveance.engine.stage.Supply;
import perveance.engine.stage.SupplyFeed;

/** For every kind of finding a small chassis that it must be told of. */
final class FindingCases {
  private final Map<MessageCode, Supplier<Bench>> cases = new LinkedHashMap<>();

  private FindingCases() {
    hazards();
    RatingCases.into(cases);
    parts();
    bias();
    SignalCases.into(cases);
    supplies();
    data();
  }

  static Map<MessageCode, Supplier<Bench>> all() {
    return new FindingCases().cases;
  }

  /** The chassis for one kind of finding. */
  static Bench of(MessageCode code) {
    Supplier<Bench> bench = all().get(code);
    if (bench == null) {
      throw new AssertionError("no chassis is known that raises " + code.code());
    }
    return bench.get();
  }

  static Bench standard(double supply, String... keysAndTexts) {
    return Bench.on(supply).standardWith(keysAndTexts);
  }

  private static Bench reservoir(double farads, OptionalDouble bleeder) {
    return new Bench()
        .supply(new Supply("A", new SupplyFeed.Stated(300), OptionalDouble.of(farads), bleeder))
        .standardWith();
  }

  /** A single output valve; keys of this test behind the usual ones. */
  static Bench single(double supply, String device, String... keysAndTexts) {
    return output("single-ended-output", supply, device, keysAndTexts);
  }

  static Bench pair(double supply, String device, String... keysAndTexts) {
    return output("push-pull-output", supply, device, keysAndTexts);
  }

  private static Bench output(String kind, double supply, String device, String... keysAndTexts) {
    String[] all = new String[keysAndTexts.length + 4];
    System.arraycopy(new String[] {"device", device, "supply", "A"}, 0, all, 0, 4);
    System.arraycopy(keysAndTexts, 0, all, 4, keysAndTexts.length);
    return Bench.on(supply).stage("V2", kind, all);
  }

  private void hazards() {
    cases.put(HazardMessage.STORED_CHARGE, () -> reservoir(22e-6, OptionalDouble.of(100e3)));
    cases.put(HazardMessage.SLOW_DISCHARGE, () -> reservoir(100e-6, OptionalDouble.of(1e6)));
    cases.put(HazardMessage.NO_DISCHARGE_PATH, () -> reservoir(22e-6, OptionalDouble.empty()));
    cases.put(
        HazardMessage.VALVE_PULLED,
        () -> Bench.on(400).dropped("B", "A", 47e3, 22e-6).standardWith("supply", "B"));
  }

  private void parts() {
    cases.put(PartMessage.RESISTOR_POWER_OVER, () -> standard(310, "anode_load_power", "0.1 W"));
    cases.put(
        PartMessage.RESISTOR_POWER_NEAR,
        () ->
            pair(
                300,
                "EL84",
                "primary",
                "8k",
                "cathode_resistor",
                "130",
                "shared",
                "true",
                "cathode_resistor_power",
                "1 W"));
    cases.put(PartMessage.RESISTOR_FAULT_OVER, () -> standard(310, "anode_load_power", "0.5 W"));
    cases.put(
        PartMessage.RESISTOR_VOLTAGE_OVER, () -> standard(310, "anode_load_voltage", "250 V"));
    cases.put(PartMessage.CAPACITOR_VOLTAGE_OVER, () -> standard(310, "coupling_voltage", "250 V"));
    cases.put(PartMessage.CAPACITOR_COLD_START, () -> standard(310));
    cases.put(PartMessage.NOT_PREFERRED, () -> standard(310, "anode_load", "103.3k"));
  }

  private void bias() {
    cases.put(
        BiasMessage.CUT_OFF_IDLE,
        () -> standard(310, "cathode_resistor", "330k", "cathode_bypass", ""));
    cases.put(BiasMessage.GRID_CURRENT_IDLE, () -> standard(310, "cathode_resistor", "100"));
    cases.put(BiasMessage.ANODE_NEAR_SUPPLY, () -> standard(310, "cathode_resistor", "22k"));
    cases.put(
        BiasMessage.ANODE_BOTTOMED,
        () -> standard(200, "anode_load", "2M2", "cathode_resistor", "10"));
    cases.put(BiasMessage.LOW_CURRENT, () -> standard(310, "cathode_resistor", "47k"));
    cases.put(
        BiasMessage.GRID_LEAK_VOLTAGE,
        () -> standard(310, "cathode_resistor", "", "cathode_bypass", "", "grid_leak", "10M"));
    cases.put(BiasMessage.COLD_START_GRID, FindingCases::follower);
    cases.put(
        BiasMessage.BIAS_OUT_OF_RANGE, () -> control("bias_top", "33k", "bias_bottom", "22k"));
    cases.put(
        BiasMessage.BIAS_RANGE_SMALL,
        () -> control("bias_pot", "10k", "bias_top", "47k", "bias_bottom", "91k"));
    cases.put(BiasMessage.BIAS_WIPER_OPEN, () -> control("bias_top", "13k", "bias_bottom", "36k"));
    cases.put(
        BiasMessage.FIXED_BIAS_SPREAD,
        () -> pair(430, "EL34", "primary", "3k4", "grid_bias", "-38 V", "screen_resistor", "1k"));
  }

  /** A pair at -38 V from a bias supply of -58 V through 25 k. */
  static Bench control(String... keysAndTexts) {
    String[] usual = {
      "primary",
      "3k4",
      "grid_bias",
      "-38 V",
      "screen_resistor",
      "1k",
      "bias_supply",
      "-58 V",
      "bias_pot",
      "25k"
    };
    String[] all = new String[usual.length + keysAndTexts.length];
    System.arraycopy(usual, 0, all, 0, usual.length);
    System.arraycopy(keysAndTexts, 0, all, usual.length, keysAndTexts.length);
    return pair(430, "EL34", all);
  }

  private static Bench follower() {
    return Bench.on(310)
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
            "drives",
            "V1b")
        .stage("V1b", "cathode-follower", "device", "12AX7", "supply", "A", "cathode_load", "100k");
  }

  private void supplies() {
    cases.put(
        SupplyMessage.SUPPLY_SAGS,
        () ->
            Bench.on(450)
                .dropped("B", "A", 330, 100e-6)
                .stage(
                    "V2",
                    "push-pull-output",
                    "device",
                    "EL34",
                    "supply",
                    "B",
                    "primary",
                    "3k4",
                    "grid_bias",
                    "-36 V",
                    "screen_resistor",
                    "1k",
                    "drive",
                    "30 V"));
    cases.put(
        SupplyMessage.MAINS_HIGH,
        () -> standard(300).conditions(conditions(1.07, HeaterSupply.USUAL)));
    cases.put(
        SupplyMessage.HEATER_BUDGET_OVER,
        () ->
            standard(300)
                .conditions(conditions(1, new HeaterSupply(6.3, OptionalDouble.of(0.25), 0))));
  }

  static Conditions conditions(double mainsRatio, HeaterSupply heaters) {
    Conditions usual = Conditions.USUAL;
    return new Conditions(
        usual.mains(),
        mainsRatio * usual.mains(),
        usual.mainsFrequency(),
        usual.meter(),
        usual.resistorTolerance(),
        usual.capacitorTolerance(),
        usual.supplyTolerance(),
        usual.threshold(),
        heaters);
  }

  private void data() {
    cases.put(DataMessage.OUTSIDE_EVIDENCE, () -> standard(310, "cathode_resistor", "100k"));
    cases.put(
        DataMessage.SPREAD_ASSUMED,
        () -> standard(300, "device", "6DJ8", "anode_load", "33k", "cathode_resistor", "680"));
    cases.put(DataMessage.BAND_CAUSE, () -> standard(310));
    cases.put(
        DataMessage.FIT_LOOSE,
        () -> standard(300, "device", "12AT7", "anode_load", "33k", "cathode_resistor", "680"));
    cases.put(
        DataMessage.NOT_SOLVED,
        () -> standard(300).devices(new SampleDevices("12AX7", OddTriodeLaw.WITH_A_JUMP)));
  }
}
