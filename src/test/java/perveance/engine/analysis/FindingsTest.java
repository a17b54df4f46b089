package perveance.engine.analysis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import perveance.engine.base.BiasMessage;
import perveance.engine.base.DataMessage;
import perveance.engine.base.Finding;
import perveance.engine.base.HazardMessage;
import perveance.engine.base.MessageCode;
import perveance.engine.base.PartMessage;
import perveance.engine.base.RatingMessage;
import perveance.engine.base.Severity;
import perveance.engine.base.SignalMessage;
import perveance.engine.stage.Supply;
import perveance.engine.stage.SupplyFeed;

/** Findings appear where they should, with their figures, and their remedies cure. */
class FindingsTest {
  private static Optional<Finding> find(ChassisAnswer answer, MessageCode code) {
    return answer.findings().stream().filter(f -> f.code() == code).findFirst();
  }

  private static Finding expect(Bench bench, MessageCode code) {
    return find(bench.answer(AnalysisOptions.FULL), code).orElseThrow();
  }

  /** The cautions say it on every output; a finding is a fault of this file. */
  @Test
  void aLethalVoltageIsTheCautionsConcernAndNoFault() {
    ChassisAnswer answer = Bench.on(310).standardWith().answer(AnalysisOptions.FULL);
    assertEquals(310, answer.highestVoltage(), 1e-9);
    answer
        .findings()
        .forEach(f -> assertTrue(f.severity().compareTo(Severity.OVER_LIMIT) < 0, f.text()));
  }

  @Test
  void noSentenceSpeaksOfSafety() {
    Bench.on(450)
        .standardWith("anode_load", "22k", "cathode_resistor", "220", "drive", "2 V")
        .answer(AnalysisOptions.FULL)
        .findings()
        .forEach(f -> assertFalse(f.text().toLowerCase(java.util.Locale.ROOT).contains("safe")));
  }

  /** The remedy for overload is worked out: applied, it gives what it promises. */
  @Test
  void theRemedyForOverloadGivesMoreCleanOutput() {
    Finding finding = expect(Bench.on(310).standardWith(), SignalMessage.GRID_CURRENT_FIRST);
    Map<String, String> edits = finding.remedy().orElseThrow().edits();
    assertEquals(List.of("cathode_resistor"), List.copyOf(edits.keySet()));
    double before = Bench.on(310).standardWith().first().clean().outputPeak();
    double after =
        Bench.on(310)
            .standardWith("cathode_resistor", edits.getOrDefault("cathode_resistor", ""))
            .first()
            .clean()
            .outputPeak();
    assertTrue(after > 1.05 * before);
  }

  /** Over-dissipation: the part and value proposed bring the valve within its limit. */
  @Test
  void theRemedyForDissipationCuresIt() {
    String[] keys = {"device", "12AX7", "anode_load", "22k", "cathode_resistor", "220"};
    Finding finding =
        expect(Bench.on(400).standardWith(keys), RatingMessage.ANODE_DISSIPATION_OVER);
    assertEquals(Severity.OVER_LIMIT, finding.severity());
    assertEquals(1.0, finding.limit().orElseThrow());
    Map.Entry<String, String> edit =
        finding.remedy().orElseThrow().edits().entrySet().iterator().next();
    StageAnswer cured =
        Bench.on(400)
            .standardWith(
                "anode_load", edit.getKey().equals("anode_load") ? edit.getValue() : "22k",
                "cathode_resistor",
                    edit.getKey().equals("cathode_resistor") ? edit.getValue() : "220")
            .full();
    assertTrue(cured.points().get(0).anodeDissipation() <= 1.0);
    assertTrue(
        cured.findings().stream().noneMatch(f -> f.code() == RatingMessage.ANODE_DISSIPATION_OVER));
  }

  @Test
  void driveBeyondCleanIsTold() {
    Finding finding =
        expect(Bench.on(310).standardWith("drive", "1.3 V"), SignalMessage.NO_HEADROOM);
    assertEquals(Severity.CAUTION, finding.severity());
    assertEquals(1.3, finding.value().orElseThrow());
  }

  @Test
  void aSmallBypassIsToldWithALargerOne() {
    Finding finding =
        expect(Bench.on(310).standardWith("cathode_bypass", "0.68u"), SignalMessage.BYPASS_SHELF);
    String text = finding.remedy().orElseThrow().edits().getOrDefault("cathode_bypass", "");
    double pole =
        Bench.on(310)
            .standardWith("cathode_bypass", text)
            .first()
            .smallSignal()
            .shelf()
            .orElseThrow()
            .pole();
    assertTrue(pole <= 20);
  }

  /**
   * Before the valves warm the coupling capacitor sees the whole supply: 310 V, so 630 V to buy.
   */
  @Test
  void theCouplingCapacitorIsBoughtForTheColdStart() {
    Finding finding = expect(Bench.on(310).standardWith(), PartMessage.CAPACITOR_COLD_START);
    assertEquals(310, finding.value().orElseThrow(), 0.01);
    assertTrue(finding.remedy().orElseThrow().text().contains("630 V"));
    assertEquals("V1a.coupling", finding.part().orElseThrow());
  }

  @Test
  void aGridLeakOverTheLimitIsLowered() {
    Finding finding =
        expect(
            Bench.on(300)
                .standardWith(
                    "device", "12AU7",
                    "anode_load", "15k",
                    "cathode_resistor", "",
                    "cathode_bypass", "",
                    "grid_bias", "-8 V",
                    "grid_leak", "470k"),
            RatingMessage.GRID_LEAK_OVER);
    assertEquals(250e3, finding.limit().orElseThrow());
    assertEquals("220k", finding.remedy().orElseThrow().edits().get("grid_leak"));
  }

  @Test
  void aStarvedValveIsToldAndBroughtBack() {
    Bench starved = Bench.on(310).standardWith("cathode_resistor", "330k", "cathode_bypass", "");
    assertTrue(find(starved.answer(AnalysisOptions.FULL), BiasMessage.CUT_OFF_IDLE).isPresent());
    assertTrue(
        find(starved.answer(AnalysisOptions.FULL), DataMessage.OUTSIDE_EVIDENCE).isPresent());
  }

  /** 138 uF at 440 V with nothing across it: danger, with a bleeder worked out. */
  @Test
  void aReservoirWithoutABleederGetsOne() {
    Bench bench =
        new Bench()
            .supply(
                new Supply(
                    "A",
                    new SupplyFeed.Stated(440),
                    OptionalDouble.of(138e-6),
                    OptionalDouble.empty()))
            .standardWith();
    Finding finding = expect(bench, HazardMessage.NO_DISCHARGE_PATH);
    assertEquals(Severity.CAUTION, finding.severity());
    assertEquals("68k", finding.remedy().orElseThrow().edits().get("bleeder"));
  }

  /**
   * A single EL84 at 95 % of its 12 W would give more clean output with a smaller cathode resistor,
   * and go over its limit: no remedy says so.
   */
  @Test
  void noRemedyDrivesAValveOverALimit() {
    String[] keys = {
      "device",
      "EL84",
      "supply",
      "A",
      "primary",
      "5k2",
      "winding_resistance",
      "280",
      "secondary_load",
      "8",
      "screen_resistor",
      "100",
      "cathode_resistor",
      "150",
      "cathode_bypass",
      "220u",
      "grid_leak",
      "470k",
      "drive",
      "3 V"
    };
    StageAnswer now = Bench.on(265).stage("V2", "single-ended-output", keys).full();
    double limit = 12;
    assertTrue(now.points().get(0).anodeDissipation() < limit);
    for (Finding finding : now.findings()) {
      String resistor =
          finding.remedy().map(r -> r.edits().getOrDefault("cathode_resistor", "")).orElse("");
      if (!resistor.isEmpty()) {
        keys[13] = resistor;
        StageAnswer after = Bench.on(265).stage("V2", "single-ended-output", keys).first();
        assertTrue(after.points().get(0).anodeDissipation() <= limit, finding.toString());
      }
    }
  }

  @Test
  void theWorstComeFirst() {
    List<Finding> findings =
        Bench.on(450)
            .standardWith("anode_load", "22k", "cathode_resistor", "220")
            .answer(AnalysisOptions.FULL)
            .findings();
    for (int i = 1; i < findings.size(); i++) {
      assertTrue(findings.get(i - 1).severity().compareTo(findings.get(i).severity()) >= 0);
    }
  }
}
