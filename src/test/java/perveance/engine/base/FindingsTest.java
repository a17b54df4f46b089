package perveance.engine.base;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

class FindingsTest {
  private static Finding resistor(Severity severity, String where, double power) {
    return Finding.of(PartMessage.RESISTOR_POWER_OVER, severity, where, where, "?", "?")
        .withValue(power, 0.5, Unit.WATT)
        .onPart(where + ".anode_load");
  }

  private static Finding note(String where) {
    return Finding.of(BiasMessage.LOW_CURRENT, Severity.NOTE, where, where, "0.2 mA", "0.3 mA");
  }

  @Test
  void sortsWorstFirstAndKeepsTheOrderWithin() {
    Finding danger =
        Finding.of(HazardMessage.NO_DISCHARGE_PATH, Severity.DANGER, "A", "Supply A", "300 V");
    Finding over = resistor(Severity.OVER_LIMIT, "V1b", 0.7);
    List<Finding> sorted = Findings.worstFirst(List.of(note("V1a"), over, note("V1b"), danger));
    assertEquals(List.of(danger, over, note("V1a"), note("V1b")), sorted);
  }

  @Test
  void mergesEqualFindingsToTheirWorst() {
    Finding mild = resistor(Severity.OVER_LIMIT, "V1a", 0.6);
    Finding worst = resistor(Severity.OVER_LIMIT, "V1a", 0.9);
    Finding elsewhere = resistor(Severity.OVER_LIMIT, "V1b", 0.7);
    assertEquals(
        List.of(worst, elsewhere), Findings.worstFirst(List.of(mild, worst, elsewhere, mild)));
    Finding caution = resistor(Severity.CAUTION, "V1a", 2);
    assertEquals(List.of(mild), Findings.worstFirst(List.of(caution, mild)));
    assertEquals(List.of(mild), Findings.worstFirst(List.of(mild, caution)));
  }

  @Test
  void whereLowIsWorseTheLowestStays() {
    Finding much = headroom(3);
    Finding little = headroom(1);
    assertTrue(SignalMessage.LITTLE_HEADROOM.lowerIsWorse());
    assertEquals(List.of(little), Findings.worstFirst(List.of(much, little)));
    assertEquals(List.of(little), Findings.worstFirst(List.of(little, much)));
  }

  private static Finding headroom(double level) {
    return Finding.of(SignalMessage.LITTLE_HEADROOM, Severity.CAUTION, "V1a", "V1a", "little")
        .withValue(level, Unit.DECIBEL);
  }

  @Test
  void negativeValuesCompareBySize() {
    Finding small = heater(-120);
    Finding large = heater(-180);
    assertEquals(List.of(large), Findings.worstFirst(List.of(small, large)));
  }

  private static Finding heater(double volts) {
    return Finding.of(
            RatingMessage.HEATER_CATHODE_OVER, Severity.OVER_LIMIT, "V2", "V2", "?", "?", "?")
        .withValue(volts, 100, Unit.VOLT);
  }

  @Test
  void tellsTheWorstSeverity() {
    assertEquals(Optional.empty(), Findings.worstSeverity(List.of()));
    assertEquals(
        Optional.of(Severity.OVER_LIMIT),
        Findings.worstSeverity(List.of(note("V1a"), resistor(Severity.OVER_LIMIT, "V1a", 1))));
  }

  @Test
  void severitiesAreOrderedAndNamed() {
    assertTrue(Severity.DANGER.compareTo(Severity.OVER_LIMIT) > 0);
    assertTrue(Severity.OVER_LIMIT.compareTo(Severity.CAUTION) > 0);
    assertTrue(Severity.CAUTION.compareTo(Severity.NOTE) > 0);
    assertEquals("over-limit", Severity.OVER_LIMIT.code());
    assertTrue(Severity.DANGER.breaksLimit() && Severity.OVER_LIMIT.breaksLimit());
    assertFalse(Severity.CAUTION.breaksLimit() || Severity.NOTE.breaksLimit());
  }

  @Test
  void carriesCodeValuesTextAndRemedy() {
    Remedy remedy = Remedy.set("Fit 1 W.", "anode_load_watts", "1 W");
    Finding finding = resistor(Severity.OVER_LIMIT, "V1a", 0.7).withRemedy(remedy);
    assertEquals("resistor-power-over", finding.code().code());
    assertEquals("V1a dissipates ?, over its rating of ?.", finding.text());
    assertEquals(OptionalDouble.of(0.7), finding.value());
    assertEquals(OptionalDouble.of(0.5), finding.limit());
    assertEquals(Optional.of(Unit.WATT), finding.unit());
    assertEquals(Optional.of("V1a.anode_load"), finding.part());
    assertEquals(Map.of("anode_load_watts", "1 W"), finding.remedy().orElseThrow().edits());
    assertTrue(Remedy.byHand("Swap the valve.").edits().isEmpty());
  }

  @Test
  void remediesKeepTheOrderOfTheirEdits() {
    Map<String, String> edits = new LinkedHashMap<>();
    edits.put("cathode_resistor", "1k8");
    edits.put("anode_load", "82k");
    Remedy remedy = new Remedy("Change both.", edits);
    edits.clear();
    assertEquals(List.of("cathode_resistor", "anode_load"), List.copyOf(remedy.edits().keySet()));
    assertThrows(UnsupportedOperationException.class, () -> remedy.edits().put("grid_leak", "1M"));
  }

  @Test
  void refusesFiguresThatAreNone() {
    Finding plain = note("V1a");
    assertThrows(IllegalArgumentException.class, () -> plain.withValue(Double.NaN, Unit.VOLT));
    assertThrows(
        IllegalArgumentException.class,
        () -> plain.withValue(1, Double.POSITIVE_INFINITY, Unit.VOLT));
    assertThrows(
        IllegalArgumentException.class,
        () ->
            new Finding(
                BiasMessage.LOW_CURRENT,
                Severity.NOTE,
                "V1a",
                OptionalDouble.of(1),
                OptionalDouble.empty(),
                Optional.empty(),
                "text",
                Optional.empty(),
                Optional.empty()));
  }
}
