package perveance.reference;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import perveance.engine.base.QuantityException;
import perveance.engine.base.QuantityParser;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.ChassisCircuits;
import perveance.engine.stage.Conditions;
import perveance.engine.stage.KeySpec;
import perveance.engine.stage.Setting;
import perveance.engine.stage.StageCircuit;
import perveance.engine.stage.StageEntry;
import perveance.engine.stage.StageKind;
import perveance.engine.stage.StageKinds;
import perveance.engine.stage.Supply;
import perveance.engine.stage.SupplyFeed;
import perveance.reference.ReferenceCase.Output;

/**
 * The circuits that both engines solve: a line a stage, with the keys of the chassis file. Supply A
 * is 300 V, supply B 250 V.
 */
final class ReferenceCases {
  private static final ReferenceLaws LAWS = new ReferenceLaws();
  private static final List<Double> FREQUENCIES = List.of(20.0, 1e3, 20e3, 500e3);

  private ReferenceCases() {}

  static List<ReferenceCase> all() {
    List<ReferenceCase> all = new ArrayList<>();
    commonCathodes(all);
    followers(all);
    pairsAndStacks(all);
    outputs(all);
    return all;
  }

  private static void commonCathodes(List<ReferenceCase> all) {
    String common =
        "common-cathode device=high anode_load=100k grid_leak=1M grid_stopper=10k source=10k"
            + " coupling=22n load=470k ";
    String bypassed = "cathode_resistor=1k5 cathode_bypass=22u ";
    all.add(stage("common-cathode-fixed", 1, common + "grid_bias=-2"));
    all.add(stage("common-cathode-bypassed", 1, common + bypassed + "input_coupling=22n"));
    all.add(stage("common-cathode-bare", 1.5, common + "cathode_resistor=1k5"));
    all.add(stage("common-cathode-led", 1, common + "cathode_voltage=1.7"));
    all.add(stage("common-cathode-overdriven", 6, common + bypassed + "input_coupling=22n"));
    all.add(
        stage(
            "common-cathode-current-source",
            0.5,
            "common-cathode device=medium anode_current=2m grid_leak=1M cathode_resistor=1k"
                + " load=1M"));
    all.add(stage("common-cathode-parallel", 1, common + bypassed + "sections=2"));
    all.add(
        stage(
            "grid-leak-bias",
            0.5,
            "common-cathode device=high anode_load=220k grid_leak=10M source=47k input_coupling=22n"
                + " coupling=22n load=1M"));
    String pentode =
        "common-cathode device=pentode anode_load=220k cathode_resistor=2k2 cathode_bypass=47u"
            + " grid_leak=1M coupling=22n load=470k ";
    all.add(
        stage("pentode-screen-dropper", 0.2, pentode + "screen_resistor=1M screen_bypass=0.1u"));
    all.add(
        stage(
            "pentodes-parallel",
            0.2,
            pentode + "sections=2 grid_stopper=1k screen_resistor=470k screen_bypass=0.1u"));
    all.add(stage("pentode-as-triode", 1, pentode + "connection=triode"));
    all.add(
        stage(
            "choke-load",
            2,
            "choke-load device=medium anode_choke=40 choke_resistance=600 cathode_resistor=470"
                + " cathode_bypass=220u grid_leak=1M coupling=1u load=100k"));
  }

  private static void followers(List<ReferenceCase> all) {
    String follower = "cathode-follower device=medium grid_leak=1M coupling=1u load=100k ";
    all.add(stage("follower-self-bias", 10, follower + "cathode_resistor=1k cathode_load=47k"));
    all.add(
        stage(
            "follower-fixed-bias",
            10,
            follower + "cathode_resistor=1k cathode_load=47k grid_bias=100"));
    all.add(
        stage(
            "followers-parallel",
            10,
            follower + "cathode_resistor=470 cathode_load=22k sections=2 grid_stopper=1k"));
    all.add(
        stage("follower-current-source", 10, follower + "cathode_resistor=1k cathode_current=2m"));
    all.add(
        stage(
            "grounded-grid",
            0.2,
            "grounded-grid device=medium anode_load=22k cathode_resistor=1k input_coupling=10u"
                + " source=100 coupling=0.1u load=1M"));
    all.add(
        stage(
            "concertina-fixed-bias",
            10,
            "concertina device=medium anode_load=22k cathode_load=22k grid_bias=85 coupling=0.1u"
                + " load=220k load2=100k"));
    all.add(
        stage(
            "concertina-self-bias",
            10,
            "concertina device=medium anode_load=22k cathode_load=22k cathode_resistor=1k"
                + " cathode_bypass=22u coupling=0.1u load=220k"));
    all.add(
        stage(
            "white-follower",
            5,
            "white-follower device=medium anode_load=1k cathode_resistor=220 grid_leak=1M"
                + " upper_resistor=220 lower_coupling=0.1u cathode_bypass=220u coupling=10u"
                + " load=10k"));
    all.add(
        chain(
            "direct-coupled-pair",
            0.5,
            "common-cathode device=high anode_load=100k grid_leak=1M cathode_resistor=1k5"
                + " cathode_bypass=22u drives=V2",
            "cathode-follower device=medium cathode_load=100k coupling=1u load=220k"));
    all.add(
        chain(
            "direct-coupled-splitter",
            0.3,
            "common-cathode device=high anode_load=220k grid_leak=1M cathode_resistor=2k2"
                + " cathode_bypass=22u drives=V2",
            "concertina device=medium anode_load=47k cathode_load=47k coupling=0.1u load=220k"));
  }

  private static void pairsAndStacks(List<ReferenceCase> all) {
    all.add(
        stage(
            "long-tailed-pair",
            1,
            "long-tailed-pair device=high anode_load=100k anode_load2=82k cathode_resistor=470"
                + " tail_resistor=10k grid_leak=1M second_grid_leak=1M second_grid_bypass=0.1u"
                + " coupling=0.1u load=220k"));
    all.add(
        stage(
            "long-tailed-pair-current-tail",
            1,
            "long-tailed-pair device=medium anode_load=47k tail_current=4m grid_bias=60"
                + " second_grid_leak=1M coupling=0.1u load=470k"));
    all.add(
        stage(
            "cascode",
            0.3,
            "cascode device=medium anode_load=22k cathode_resistor=470 cathode_bypass=100u"
                + " grid_leak=1M upper_grid_top=1M upper_grid_bottom=470k upper_grid_bypass=0.1u"
                + " coupling=0.1u load=1M"));
    all.add(
        stage(
            "totem-pole",
            1,
            "totem-pole device=medium cathode_resistor=680 upper_resistor=680 cathode_bypass=220u"
                + " grid_leak=1M coupling=1u load=47k"));
    all.add(
        stage(
            "mu-follower",
            1,
            "mu-follower device=medium anode_load=22k upper_resistor=470 cathode_resistor=470"
                + " cathode_bypass=220u grid_leak=1M upper_grid_leak=1M upper_coupling=0.1u"
                + " coupling=1u load=100k"));
    all.add(
        stage(
            "paraphase",
            1,
            "paraphase device=high anode_load=100k cathode_resistor=1k5 cathode_bypass=22u"
                + " divider_top=470k divider_bottom=8k2 grid_leak=1M coupling=0.1u load=1M"));
  }

  private static void outputs(List<ReferenceCase> all) {
    String iron = " winding_resistance=200 primary_inductance=15 leakage_inductance=20m";
    all.add(
        stage(
            "single-triode",
            40,
            "single-ended-output device=power primary=3k secondary_load=8 secondary_resistance=0.5"
                + " cathode_resistor=880 cathode_bypass=100u grid_leak=220k grid_stopper=1k"
                + iron));
    all.add(
        stage(
            "single-triode-data-sheet",
            40,
            "single-ended-output device=power primary=3k anode_voltage=250 grid_bias=-45"));
    String beam =
        "single-ended-output device=beam primary=5k secondary_load=8 cathode_resistor=240"
            + " cathode_bypass=100u grid_leak=220k ";
    all.add(stage("single-beam", 10, beam + "screen_supply=B" + iron));
    all.add(stage("single-beam-dropper", 10, beam + "screen_resistor=1k screen_bypass=10u"));
    all.add(stage("single-beam-ultra-linear", 10, beam + "connection=ultra-linear tap=43%"));
    all.add(stage("single-beam-as-triode", 10, beam + "connection=triode"));
    String pair = "push-pull-output primary=6k6 secondary_load=8 grid_leak=220k grid_stopper=2k2 ";
    all.add(
        stage(
            "push-pull-beam-class-ab",
            20,
            pair
                + "device=beam grid_bias=-20 screen_supply=B screen_resistor=470 source=10k"
                + iron));
    all.add(
        stage(
            "push-pull-screen-dropper",
            15,
            pair
                + "device=beam cathode_resistor=240 cathode_bypass=100u shared=true"
                + " screen_dropper=2k2 screen_bypass=22u"));
    all.add(
        stage(
            "push-pull-ultra-linear",
            15,
            pair
                + "device=beam cathode_resistor=240 cathode_bypass=100u shared=true"
                + " connection=ultra-linear tap=43%"));
    all.add(
        stage(
            "push-pull-triodes",
            45,
            pair + "device=power cathode_resistor=900 cathode_bypass=100u winding_resistance=100"));
    all.add(
        stage(
            "push-pull-grid-current",
            40,
            pair
                + "device=beam grid_bias=-22 screen_supply=B screen_resistor=470 source=2k2"
                + " input_coupling=0.1u"));
    all.add(
        chain(
            "direct-coupled-output-pair",
            0.5,
            "long-tailed-pair device=medium anode_load=100k tail_resistor=4k7 cathode_resistor=330"
                + " grid_leak=1M second_grid_leak=1M second_grid_bypass=0.1u drives=V2",
            "push-pull-output device=power primary=6k6 secondary_load=8 cathode_resistor=2k2"
                + " shared=true grid_stopper=1k"));
    all.add(
        stage(
            "push-pull-driver-transformer",
            30,
            "push-pull-output primary=6k6 secondary_load=8 device=beam grid_bias=-22"
                + " screen_supply=B source=1k"));
  }

  private static ReferenceCase stage(String name, double peak, String stage) {
    return chain(name, peak, stage);
  }

  /** Stages in signal order, each its kind and then its keys as {@code key=value} with blanks. */
  private static ReferenceCase chain(String name, double peak, String... stages) {
    List<StageEntry> entries = new ArrayList<>();
    for (String text : stages) {
      String[] words = text.trim().split("\\s+");
      StageKind kind = StageKinds.find(words[0]).orElseThrow();
      Map<String, Setting> settings = new LinkedHashMap<>();
      if (!text.contains("anode_voltage=")) {
        settings.put("supply", new Setting.Word("A"));
      }
      for (int i = 1; i < words.length; i++) {
        String[] pair = words[i].split("=", 2);
        settings.put(pair[0], setting(kind, pair[0], pair[1]));
      }
      entries.add(new StageEntry("V" + (entries.size() + 1), words[0], settings));
    }
    List<Supply> supplies = List.of(supply("A", 300), supply("B", 250));
    Chassis chassis = new Chassis(name, Conditions.USUAL, supplies, entries);
    ChassisCircuits.Built built = new ChassisCircuits(chassis, LAWS).whole();
    return of(name, built, peak);
  }

  /** Driven at the first stage, compared at the outputs of all. */
  private static ReferenceCase of(String name, ChassisCircuits.Built built, double peak) {
    List<Output> outputs = new ArrayList<>();
    for (StageCircuit stage : built.stages()) {
      stage.outputs().stream()
          .map(o -> new Output(stage.ref() + "." + o.name().replace(' ', '-'), o.plus(), o.minus()))
          .forEach(outputs::add);
    }
    String input = built.stages().get(0).input().orElseThrow();
    return new ReferenceCase(name, built.circuit(), input, outputs, peak, FREQUENCIES);
  }

  private static Supply supply(String name, double voltage) {
    return new Supply(
        name, new SupplyFeed.Stated(voltage), OptionalDouble.empty(), OptionalDouble.empty());
  }

  private static Setting setting(StageKind kind, String key, String text) {
    KeySpec spec = kind.keys().stream().filter(k -> k.key().equals(key)).findFirst().orElseThrow();
    try {
      return switch (spec.form()) {
        case QUANTITY -> new Setting.Number(text, QuantityParser.parse(text, spec.unit()).value());
        case FLAG -> new Setting.Flag(Boolean.parseBoolean(text));
        case WORD, DEVICE, SUPPLY, STAGE -> new Setting.Word(text);
      };
    } catch (QuantityException e) {
      throw new IllegalArgumentException(key + " = " + text, e);
    }
  }
}
