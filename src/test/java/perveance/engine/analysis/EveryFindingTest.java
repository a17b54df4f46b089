package perveance.engine.analysis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import perveance.engine.base.Finding;
import perveance.engine.base.MessageCatalogue;
import perveance.engine.base.MessageCode;
import perveance.engine.stage.Supply;

/** Every kind of finding in the catalogue is told of at least one chassis. */
class EveryFindingTest {
  static List<MessageCode> codes() {
    return MessageCatalogue.all();
  }

  private static ChassisAnswer answer(MessageCode code) {
    return FindingCases.of(code).answer(AnalysisOptions.FULL);
  }

  @ParameterizedTest
  @MethodSource("codes")
  void isRaised(MessageCode code) {
    ChassisAnswer answer = answer(code);
    List<Finding> raised = answer.findings().stream().filter(f -> f.code() == code).toList();
    assertFalse(
        raised.isEmpty(),
        () ->
            code.code()
                + " is not among "
                + answer.findings().stream()
                    .map(f -> f.code().code() + ": " + f.text())
                    .collect(Collectors.joining("\n")));
    raised.forEach(EveryFindingTest::readsAsASentence);
    raised.forEach(f -> namesAPlace(f, answer));
  }

  private static void readsAsASentence(Finding finding) {
    String text = finding.text();
    assertTrue(text.endsWith("."), text);
    assertFalse(text.toLowerCase(Locale.ROOT).contains("safe"), text);
    char first = text.charAt(0);
    assertTrue(Character.isUpperCase(first) || Character.isDigit(first), text);
    finding.remedy().ifPresent(r -> assertTrue(r.text().endsWith("."), r.text()));
    finding.remedy().ifPresent(r -> assertFalse(r.text().contains("safe"), r.text()));
  }

  /** Places are told in one form: a stage as drawn, a supply by its name, mains or heaters. */
  private static void namesAPlace(Finding finding, ChassisAnswer answer) {
    Set<String> places = new HashSet<>(Set.of("mains", "heaters"));
    answer.chassis().stages().forEach(s -> places.add(s.ref()));
    answer.chassis().supplies().stream()
        .map(Supply::name)
        .forEach(name -> places.add("supply " + name));
    assertTrue(places.contains(finding.where()), finding.where() + ": " + finding.text());
  }

  /** The table holds no code that the catalogue has lost. */
  @Test
  void theTableIsTheCatalogue() {
    assertEquals(Set.copyOf(MessageCatalogue.all()), FindingCases.all().keySet());
  }
}
