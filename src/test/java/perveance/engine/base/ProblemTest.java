package perveance.engine.base;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import org.junit.jupiter.api.Test;

class ProblemTest {
  @Test
  void saysPlaceKeyFoundAndExpected() throws QuantityException {
    QuantityException refusal =
        assertThrows(QuantityException.class, () -> QuantityParser.parse("1.5 mA", Unit.VOLT));
    assertEquals(
        "amp.toml:12: supply A voltage: found \"1.5 mA\", which is a current in amperes (A),"
            + " expected a voltage in volts (V), for example \"300 V\"",
        Problem.at("amp.toml", 12, "supply A voltage", refusal).message());
  }

  @Test
  void suggestsWhatWasProbablyMeant() {
    Problem problem = Problem.at("amp.toml", 3, "anode_laod", "this key", "a key of a stage");
    assertEquals(
        "amp.toml:3: anode_laod: found this key, expected a key of a stage; did you mean"
            + " \"anode_load\"?",
        problem.suggesting("anode_load").message());
  }

  @Test
  void leavesOutWhatIsNotKnown() {
    Problem whole =
        new Problem(
            "amp.toml", OptionalInt.empty(), "", "a folder", "a chassis file", Optional.empty());
    assertEquals("amp.toml: found a folder, expected a chassis file", whole.message());
    Problem typed =
        new Problem("", OptionalInt.of(2), "", "nothing", "a reading", Optional.empty());
    assertEquals("line 2: found nothing, expected a reading", typed.message());
  }

  @Test
  void allProblemsAreToldAtOnce() {
    Problem first = Problem.at("a.toml", 1, "x", "1", "2");
    Problem second = Problem.at("a.toml", 2, "y", "3", "4");
    BadInputException refusal = new BadInputException(List.of(first, second));
    assertEquals(List.of(first, second), refusal.problems());
    assertEquals(first.message() + "\n" + second.message(), refusal.getMessage());
    assertEquals(List.of(first), new BadInputException(first).problems());
    assertThrows(IllegalArgumentException.class, () -> new BadInputException(List.of()));
  }

  @Test
  void refusesLinesBeforeTheFirst() {
    assertThrows(IllegalArgumentException.class, () -> Problem.at("a", 0, "k", "1", "2"));
  }
}
