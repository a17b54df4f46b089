package perveance.app.wording;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.api.Test;
import perveance.engine.base.Finding;
import perveance.engine.base.HazardMessage;
import perveance.engine.base.PartMessage;
import perveance.engine.base.Remedy;
import perveance.engine.base.Severity;

/** Derived: told once is what differs in the leading name alone, and nothing else is merged. */
class FindingLinesTest {
  private static final Remedy BUY = Remedy.byHand("Buy it for 630 V or more.");

  private static Finding cold(String part, String volts, Severity severity) {
    return Finding.of(PartMessage.CAPACITOR_COLD_START, severity, "V2", part, volts)
        .withRemedy(BUY);
  }

  private static List<String> told(Finding... findings) {
    return FindingLines.of(List.of(findings)).stream().map(FindingLine::told).toList();
  }

  @Test
  void theSameOfThreePartsIsToldOnceAndNamesAll() {
    assertEquals(
        List.of(
            "C1 (bypass) sees 441 V before the valves warm; it must be rated for that. The same"
                + " holds for C2 (coupling) and C3 (coupling). Remedy: Buy it for 630 V or more."),
        told(
            cold("C1 (bypass)", "441 V", Severity.NOTE),
            cold("C2 (coupling)", "441 V", Severity.NOTE),
            cold("C3 (coupling)", "441 V", Severity.NOTE)));
  }

  @Test
  void anotherFigureAnotherSeverityOrAnotherCureStandsAlone() {
    assertEquals(
        4,
        told(
                cold("C1 (bypass)", "441 V", Severity.NOTE),
                cold("C2 (bypass)", "300 V", Severity.NOTE),
                cold("C3 (bypass)", "441 V", Severity.CAUTION),
                cold("C4 (bypass)", "441 V", Severity.NOTE)
                    .withRemedy(Remedy.byHand("Buy it for 1000 V or more.")))
            .size());
  }

  @Test
  void aSentenceThatBeginsWithNoNameIsKeptWhole() {
    Finding supply =
        Finding.of(
            HazardMessage.SLOW_DISCHARGE, Severity.CAUTION, "supply A", "supply A", "31 s", "60 V");
    assertEquals(List.of(supply.text()), told(supply));
  }

  @Test
  void theOrderOfTheFirstOfEachIsKept() {
    List<FindingLine> lines =
        FindingLines.of(
            List.of(
                cold("C1 (bypass)", "441 V", Severity.CAUTION),
                cold("C2 (bypass)", "441 V", Severity.NOTE),
                cold("C3 (bypass)", "441 V", Severity.CAUTION)));
    assertEquals(List.of("CAUTION", "NOTE"), lines.stream().map(FindingLine::word).toList());
    assertEquals("V2", lines.get(0).where());
  }
}
