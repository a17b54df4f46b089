package perveance.engine.analysis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import perveance.engine.base.BiasMessage;
import perveance.engine.base.DataMessage;
import perveance.engine.base.Finding;
import perveance.engine.base.HazardMessage;
import perveance.engine.base.MessageCode;
import perveance.engine.base.OutputMessage;
import perveance.engine.base.PartMessage;
import perveance.engine.base.RatingMessage;
import perveance.engine.base.Remedy;
import perveance.engine.base.Severity;
import perveance.engine.base.SignalMessage;
import perveance.engine.base.SupplyMessage;
import perveance.engine.stage.Conditions;
import perveance.engine.stage.HeaterSupply;
import perveance.engine.stage.Supply;
import perveance.engine.stage.SupplyFeed;
import perveance.engine.stage.SupplyRatings;

/** Findings about more than one stage, about parts' ratings and about loads: figures and cures. */
class ChassisFindingsTest {
  private static Optional<Finding> find(ChassisAnswer answer, MessageCode code) {
    return answer.findings().stream().filter(f -> f.code() == code).findFirst();
  }

  private static Finding expect(Bench bench, MessageCode code) {
    ChassisAnswer answer = bench.answer(AnalysisOptions.FULL);
    return find(answer, code).orElseThrow(() -> new AssertionError(answer.findings().toString()));
  }

  /** Eight sections in four 12AX7, and two EL34. */
  private static Bench heaters(String output, double winding) {
    Bench bench = Bench.on(400).supply("B", 300);
    String[] keys = Bench.standard();
    keys[3] = "B";
    for (int valve = 1; valve <= 4; valve++) {
      bench.stage("V" + valve + "a", "common-cathode", keys);
      bench.stage("V" + valve + "b", "common-cathode", keys);
    }
    return bench
        .stage(
            "V5",
            "push-pull-output",
            "ref2",
            "V6",
            "device",
            output,
            "supply",
            "A",
            "primary",
            "6k6",
            "grid_bias",
            "-38 V",
            "screen_resistor",
            "1k")
        .conditions(
            FindingCases.conditions(1, new HeaterSupply(6.3, OptionalDouble.of(winding), 0.15)));
  }

  /**
   * Derived (sums of the makers' heater currents). Four 12AX7 at 0.3 A, two EL34 at 1.5 A and a
   * lamp of 0.15 A take 4.35 A: within 4.5 A; with two KT88 of 1.6 A it is 4.55 A and over. Exact.
   */
  @Test
  void theHeaterWindingIsSummedOverEnvelopes() {
    assertTrue(
        find(heaters("EL34", 4.5).answer(AnalysisOptions.FULL), SupplyMessage.HEATER_BUDGET_OVER)
            .isEmpty());
    Finding over = expect(heaters("KT88", 4.5), SupplyMessage.HEATER_BUDGET_OVER);
    assertEquals(4.55, over.value().orElseThrow(), 1e-9);
    assertEquals(4.5, over.limit().orElseThrow());
    assertEquals(Severity.OVER_LIMIT, over.severity());
    assertTrue(over.remedy().orElseThrow().text().contains("5 A"), over.toString());
  }

  /** Derived. 6.3 V at mains 7 % and 12 % up: 6.74 V is noted, 7.06 V cautioned; 4 % is nothing. */
  @Test
  void heatersFollowTheMains() {
    Finding noted =
        expect(
            Bench.on(300)
                .standardWith()
                .conditions(FindingCases.conditions(1.07, HeaterSupply.USUAL)),
            RatingMessage.HEATER_VOLTAGE_OUTSIDE);
    assertEquals(Severity.NOTE, noted.severity());
    assertEquals(6.741, noted.value().orElseThrow(), 1e-6);
    Finding cautioned =
        expect(
            Bench.on(300)
                .standardWith()
                .conditions(FindingCases.conditions(0.88, HeaterSupply.USUAL)),
            RatingMessage.HEATER_VOLTAGE_OUTSIDE);
    assertEquals(Severity.CAUTION, cautioned.severity());
    assertTrue(
        find(
                Bench.on(300)
                    .standardWith()
                    .conditions(FindingCases.conditions(1.04, HeaterSupply.USUAL))
                    .answer(AnalysisOptions.FULL),
                RatingMessage.HEATER_VOLTAGE_OUTSIDE)
            .isEmpty());
  }

  /**
   * Derived. Two sections of one valve on a node behind 18 k: with the valve out nothing draws, so
   * the node stands at the supply. Exact.
   */
  @Test
  void aPulledValveTakesBothItsSectionsOut() {
    String[] keys = Bench.standard();
    keys[3] = "B";
    Finding finding =
        expect(
            Bench.on(385)
                .dropped("B", "A", 47e3, 22e-6)
                .stage("V1a", "common-cathode", keys)
                .stage("V1b", "common-cathode", keys),
            HazardMessage.VALVE_PULLED);
    assertEquals(385, finding.value().orElseThrow(), 1e-3);
    assertEquals("supply B", finding.where());
    assertTrue(finding.text().startsWith("With V1 out of its socket"), finding.text());
  }

  /**
   * Derived. Two EL34 behind 330 ohm: driven, the pair takes more than at idle, and the node falls
   * by that current times the dropper. Tolerance 3 %: the pair's own idle current falls a little
   * with the node.
   */
  @Test
  void aNodeBehindADropperSagsByTheCurrentOfTheDrive() {
    Bench bench = FindingCases.of(SupplyMessage.SUPPLY_SAGS);
    ChassisAnswer answer = bench.answer(AnalysisOptions.FULL);
    Finding finding = find(answer, SupplyMessage.SUPPLY_SAGS).orElseThrow();
    StageAnswer pair = answer.stages().get(0);
    double idle =
        pair.points().stream()
            .mapToDouble(p -> p.anodeCurrent() + p.screenCurrent().orElse(0))
            .sum();
    DrivenAnswer driven = pair.driven().orElseThrow();
    double extra = driven.meanAnodeCurrent() + driven.meanScreenCurrent().orElseThrow() - idle;
    double fall = finding.limit().orElseThrow() - finding.value().orElseThrow();
    // the dropper sees what the pair, less eager on a lower node, really draws
    assertTrue(fall > 0.6 * 330 * extra && fall <= 330 * extra, fall + " V for " + extra + " A");
  }

  /** Case: the usual anode load takes 0.114 W idle and 0.96 W into a shorted valve. */
  @Test
  void aStatedPowerRatingIsHeldAgainstIdleAndAgainstAFault() {
    Finding over =
        expect(
            Bench.on(310).standardWith("anode_load_power", "0.1 W"),
            PartMessage.RESISTOR_POWER_OVER);
    assertEquals(0.114, over.value().orElseThrow(), 0.004);
    assertEquals("1 W", edit(over, "anode_load_power"));
    Finding fault =
        expect(
            Bench.on(310).standardWith("anode_load_power", "0.5 W"),
            PartMessage.RESISTOR_FAULT_OVER);
    assertEquals(0.96, fault.value().orElseThrow(), 0.01);
    assertTrue(fault.text().contains("anode shorted to chassis"), fault.text());
    Bench cured = Bench.on(310).standardWith("anode_load_power", edit(fault, "anode_load_power"));
    assertTrue(
        cured.answer(AnalysisOptions.FULL).findings().stream()
            .noneMatch(f -> f.code().code().startsWith("resistor-")));
  }

  /** Cold, the coupling capacitor sees the whole 310 V: 250 V is too little, 630 V is offered. */
  @Test
  void aStatedVoltageRatingIsHeldAgainstTheColdStart() {
    Finding over =
        expect(
            Bench.on(310).standardWith("coupling_voltage", "250 V"),
            PartMessage.CAPACITOR_VOLTAGE_OVER);
    assertEquals(310, over.value().orElseThrow(), 0.01);
    assertEquals("630 V", edit(over, "coupling_voltage"));
    assertEquals("V1a.coupling", over.part().orElseThrow());
  }

  /**
   * Derived. Cold, a reservoir on 385 V behind 18 k stands at 385 V; 4.27 mA through 18 k is 0.33
   * W. Tolerance 10 % for the current, the law's.
   */
  @Test
  void partsOfTheSupplyAreHeldAgainstTheirRatings() {
    String[] keys = Bench.standard();
    keys[3] = "B";
    Supply dropped =
        new Supply(
            "B",
            new SupplyFeed.Dropped("A", 18e3),
            OptionalDouble.of(22e-6),
            OptionalDouble.of(220e3),
            new SupplyRatings(
                OptionalDouble.of(350), OptionalDouble.of(0.25), OptionalDouble.of(1)));
    Bench bench = Bench.on(385).supply(dropped);
    for (String ref : new String[] {"V1a", "V1b", "V2a", "V2b"}) {
      bench.stage(ref, "common-cathode", keys);
    }
    ChassisAnswer answer = bench.answer(AnalysisOptions.FULL);
    Finding reservoir = find(answer, PartMessage.CAPACITOR_VOLTAGE_OVER).orElseThrow();
    assertEquals("supply B", reservoir.where());
    assertEquals("supply.B.reservoir", reservoir.part().orElseThrow());
    double cold = 385 * 220 / 238.0;
    assertEquals(cold, reservoir.value().orElseThrow(), 1);
    assertEquals("450 V", edit(reservoir, "reservoir_voltage"));
    Finding dropper = find(answer, PartMessage.RESISTOR_POWER_OVER).orElseThrow();
    assertTrue(dropper.text().startsWith("The dropper of supply B dissipates"), dropper.text());
  }

  /** A dropper of 20 % makes most of the doubt of a stage behind it: told at its supply node. */
  @Test
  void theDoubtOfADropperIsToldAtItsNode() {
    Conditions loose = FindingCases.conditions(1, HeaterSupply.USUAL);
    Conditions conditions =
        new Conditions(
            loose.mains(),
            loose.mainsActual(),
            loose.mainsFrequency(),
            loose.meter(),
            0.2,
            loose.capacitorTolerance(),
            0.001,
            loose.threshold());
    Finding finding =
        expect(
            Bench.on(600)
                .conditions(conditions)
                .dropped("B", "A", 470e3, 22e-6)
                .standardWith("supply", "B", "anode_load", "10k", "cathode_resistor", "3k3"),
            DataMessage.BAND_CAUSE);
    assertEquals("supply B", finding.where());
    assertTrue(finding.text().contains("comes from the dropper of supply B"), finding.text());
  }

  /** A follower's anode is the supply: nothing there is worth measuring twice. */
  @Test
  void theDoubtOfAnAnodeOnItsSupplyIsNotTold() {
    ChassisAnswer answer =
        FindingCases.of(BiasMessage.COLD_START_GRID).answer(AnalysisOptions.FULL);
    assertTrue(
        answer.findings().stream()
            .noneMatch(f -> f.code() == DataMessage.BAND_CAUSE && f.text().startsWith("V1b")),
        answer.findings().toString());
  }

  /**
   * Derived. Two sections of one 5687 in different stages, each within its own 4.2 W at about 4 W,
   * make 8 W together, over the 7.5 W of the envelope; exact sum of both stages' figures.
   */
  @Test
  void bothAnodesCountTogetherWhateverStagesTheyServe() {
    Bench bench = Bench.on(280);
    for (String ref : new String[] {"V1a", "V1b"}) {
      bench.stage(
          ref,
          "common-cathode",
          "device",
          "5687",
          "supply",
          "A",
          "anode_load",
          "4k7",
          "cathode_resistor",
          "180");
    }
    ChassisAnswer answer = bench.answer(AnalysisOptions.FULL);
    Finding finding = find(answer, RatingMessage.BOTH_ANODES_OVER).orElseThrow();
    double sum =
        answer.stages().stream().mapToDouble(s -> s.points().get(0).anodeDissipation()).sum();
    assertEquals(sum, finding.value().orElseThrow(), 1e-9);
    assertTrue(finding.text().startsWith("V1: both anodes"), finding.text());
  }

  private static String edit(Finding finding, String key) {
    Map<String, String> edits = finding.remedy().map(Remedy::edits).orElse(Map.of());
    return edits.getOrDefault(key, "");
  }

  /** Speakers and headphones come as they are: no value of them is anything but given. */
  @Test
  void aSpeakerIsNoPartToChooseFromASeries() {
    for (String speaker : new String[] {"2", "4", "8", "15", "16", "32", "300"}) {
      ChassisAnswer answer =
          Bench.on(250)
              .stage(
                  "V2",
                  "single-ended-output",
                  "device",
                  "EL84",
                  "supply",
                  "A",
                  "primary",
                  "5k2",
                  "secondary_load",
                  speaker,
                  "cathode_resistor",
                  "150",
                  "cathode_bypass",
                  "220u")
              .answer(AnalysisOptions.FULL);
      assertFalse(find(answer, PartMessage.NOT_PREFERRED).isPresent(), speaker);
    }
  }

  /** The load proposed gives the power promised, and stays within the valve's limits. */
  @Test
  void theBetterLoadGivesWhatItPromises() {
    String[] keys = {
      "device",
      "2A3",
      "supply",
      "A",
      "primary",
      "1k",
      "secondary_load",
      "8",
      "cathode_resistor",
      "1k2",
      "cathode_bypass",
      "100u",
      "grid_leak",
      "220k"
    };
    Bench poor = Bench.on(300).stage("V2", "single-ended-output", keys);
    Finding finding = expect(poor, OutputMessage.LOAD_OFF_BEST);
    double before = Math.pow(poor.first().clean().outputPeak(), 2) / 16;
    keys[5] = edit(finding, "primary");
    StageAnswer better = Bench.on(300).stage("V2", "single-ended-output", keys).full();
    double after = Math.pow(better.clean().outputPeak(), 2) / 16;
    assertTrue(after > 1.15 * before, before + " W to " + after + " W");
    assertTrue(better.limits().stream().allMatch(u -> u.share() <= 1.001), better.toString());
  }

  /** A driver that cannot give what the output stage takes: both figures are its own and its. */
  @Test
  void aShortDriverIsToldWithBothVoltages() {
    Bench bench = FindingCases.of(SignalMessage.DRIVER_SHORT);
    ChassisAnswer answer = bench.answer(AnalysisOptions.FULL);
    Finding finding = find(answer, SignalMessage.DRIVER_SHORT).orElseThrow();
    StageAnswer driver = answer.stages().get(0);
    StageAnswer output = answer.stages().get(1);
    assertEquals(driver.clean().outputPeak(), finding.value().orElseThrow(), 1e-9);
    assertEquals(output.clean().inputPeak(), finding.limit().orElseThrow(), 1e-6);
    assertEquals("V1", answer.chains().get(0).clipsFirst());
  }
}
