package perveance.files.chassis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import org.junit.jupiter.api.Test;
import perveance.engine.base.BadInputException;
import perveance.engine.base.Problem;
import perveance.engine.stage.Chassis;

/** What the file reader knows of stages only from the stages around them. */
class CoupledStagesTest {
  private static final String HEAD =
      """
      perveance = 1
      [supply.A]
      voltage = "300 V"
      [[stage]]
      ref = "V1a"
      kind = "common-cathode"
      device = "12AX7"
      supply = "A"
      anode_load = "100k"
      cathode_resistor = "1k5"
      drives = "V2"
      """;

  private static final String WHITE =
      """
      [[stage]]
      ref = "V2"
      kind = "white-follower"
      device = "6DJ8"
      supply = "A"
      anode_load = "1k"
      cathode_resistor = "220"
      """;

  @Test
  void directStageNeedsNoBiasOfItsOwn() throws BadInputException {
    Chassis chassis = Samples.read(HEAD + WHITE);
    assertEquals(2, chassis.stages().size());
  }

  @Test
  void behindACapacitorItDoes() {
    assertEquals(
        List.of(
            "amp.toml:13: stage V2 grid_bias: found nothing that biases the upper valve, expected"
                + " a grid_bias, an upper_resistor, or a stage wired to the grid"),
        problems(HEAD + "coupling = \"22n\"\n" + WHITE));
  }

  @Test
  void valvesOfDifferentStagesCannotShareAName() {
    String third = WHITE.replace("\"V2\"", "\"V2a\"") + "grid_bias = \"100 V\"\n";
    assertEquals(
        List.of(
            "amp.toml:20: stage V2a ref: found \"V2a\", which V2 has, expected a name of its"
                + " own"),
        problems(HEAD + WHITE + third));
  }

  private static List<String> problems(String text) {
    BadInputException refusal = assertThrows(BadInputException.class, () -> Samples.read(text));
    return refusal.problems().stream().map(Problem::message).toList();
  }
}
