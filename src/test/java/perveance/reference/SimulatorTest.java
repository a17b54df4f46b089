package perveance.reference;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * derived: the same circuits, with the same laws as behavioural sources, in ngspice 39. Expected:
 * its recorded answers in {@code src/test/resources/perveance/reference}. Tolerance: 1e-6 of a dc
 * voltage or current, 1e-5 of a small-signal gain, 1e-4 of a harmonic.
 *
 * <p>The system property {@code perveance.simulator} asks for more: {@code live} runs the simulator
 * and compares afresh, {@code record} writes its answers anew.
 */
class SimulatorTest {
  private static final Path RECORDED = Path.of("src/test/resources/perveance/reference");
  private static final String MODE = System.getProperty("perveance.simulator", "recorded");

  /** Voltages and currents below these are compared as if they were as large [V], [A]. */
  private static final double SMALL_VOLTAGE = 1e-3;

  private static final double SMALL_CURRENT = 1e-9;

  /** Mean current that may be left in what holds a voltage [A]. */
  private static final double MEAN_CURRENT = 1e-9;

  /** Mean volts per turn that may be left on a core: the last digits of hundreds of volts [V]. */
  private static final double MEAN_VOLTAGE = 1e-8;

  static List<ReferenceCase> cases() {
    return ReferenceCases.all();
  }

  @ParameterizedTest
  @MethodSource("cases")
  void agreesWithRecordedAnswers(ReferenceCase c) throws IOException {
    Path file = RECORDED.resolve(c.name() + ".tsv");
    assertTrue(Files.exists(file), () -> "no recorded answers: " + file);
    compare(c, Answers.parse(Files.readString(file, StandardCharsets.UTF_8)));
  }

  @ParameterizedTest
  @MethodSource("cases")
  void agreesWithTheSimulatorNow(ReferenceCase c, @TempDir Path folder) throws IOException {
    assumeTrue(!MODE.equals("recorded"), "perveance.simulator is not set to live or record");
    Answers answers = new SimulatorAnswers(c, new Simulator(folder)).all();
    if (MODE.equals("record")) {
      String head = "# ngspice 39, case " + c.name() + ", written by SimulatorTest\n";
      Files.createDirectories(RECORDED);
      Files.writeString(RECORDED.resolve(c.name() + ".tsv"), head + answers.text());
    }
    compare(c, answers);
  }

  private static void compare(ReferenceCase c, Answers theirs) {
    Answers ours = EngineAnswers.of(c);
    for (String what : ours.all().keySet()) {
      double expected = theirs.get(what);
      assertEquals(expected, ours.get(what), tolerance(what, expected, theirs), what);
    }
    theirs.all().keySet().stream()
        .filter(what -> what.startsWith("mean "))
        .forEach(
            what -> {
              double allowed = what.contains("i(") ? MEAN_CURRENT : MEAN_VOLTAGE;
              assertEquals(0, theirs.get(what), allowed, what);
            });
  }

  private static double tolerance(String what, double value, Answers theirs) {
    double size = Math.abs(value);
    if (what.startsWith("dc voltage")) {
      return 1e-6 * Math.max(size, SMALL_VOLTAGE);
    } else if (what.startsWith("dc current")) {
      return 1e-6 * Math.max(size, SMALL_CURRENT);
    } else if (what.startsWith("ac ")) {
      String other =
          what.contains(" re ") ? what.replace(" re ", " im ") : what.replace(" im ", " re ");
      return 1e-5 * Math.hypot(size, theirs.get(other));
    }
    String output = what.split(" ")[1];
    // harmonics below a millionth of the fundamental are lost in the simulator's own rounding
    double fundamental = Math.abs(theirs.get(Answers.harmonic(output, 1)));
    return 1e-4 * Math.max(size, 1e-6 * fundamental);
  }
}
