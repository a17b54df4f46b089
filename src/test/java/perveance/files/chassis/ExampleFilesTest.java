package perveance.files.chassis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import perveance.engine.base.BadInputException;
import perveance.engine.circuit.DcOutcome;
import perveance.engine.circuit.DcSolver;
import perveance.engine.circuit.ValvePoint;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.ChassisCircuits;
import perveance.engine.stage.StageEntry;
import perveance.engine.stage.StageKind;
import perveance.engine.stage.StageKinds;
import perveance.files.device.DeviceFiles;

/** Every shipped example is read, built and at rest where valves work; every kind has one. */
class ExampleFilesTest {
  private static final DeviceFiles LIBRARY = new DeviceFiles(List.of());

  static List<Path> examples() throws IOException {
    try (Stream<Path> files = Files.list(Path.of("examples"))) {
      return files.filter(p -> p.toString().endsWith(".toml")).sorted().toList();
    }
  }

  private static Chassis read(Path example) throws BadInputException {
    return new ChassisReader(LIBRARY).read(example);
  }

  @Test
  void everyKindHasAnExample() throws IOException, BadInputException {
    Set<String> shown = new TreeSet<>();
    for (Path example : examples()) {
      read(example).stages().stream().map(StageEntry::kind).forEach(shown::add);
    }
    Set<String> kinds = StageKinds.all().stream().map(StageKind::name).collect(Collectors.toSet());
    assertEquals(new TreeSet<>(kinds), shown);
  }

  @ParameterizedTest
  @MethodSource("examples")
  void everyValveConductsWithItsGridNegative(Path example) throws BadInputException {
    ChassisCircuits circuits = new ChassisCircuits(read(example), LIBRARY);
    DcOutcome outcome = new DcSolver(circuits.whole().circuit()).solve();
    DcOutcome.Converged solved = assertInstanceOf(DcOutcome.Converged.class, outcome);
    for (ValvePoint valve : solved.solution().valves()) {
      assertTrue(
          valve.current(ElectrodeCurrents.ANODE) > 0.2e-3,
          () -> valve.name() + " is all but cut off");
      assertTrue(
          valve.voltage(ElectrodeCurrents.GRID) < -0.4,
          () -> valve.name() + " has its grid at " + valve.voltage(ElectrodeCurrents.GRID));
      assertTrue(
          valve.voltage(ElectrodeCurrents.ANODE) > 25,
          () -> valve.name() + " has its anode at " + valve.voltage(ElectrodeCurrents.ANODE));
    }
  }

  @ParameterizedTest
  @MethodSource("examples")
  void everyStageIsDrawn(Path example) throws BadInputException {
    Chassis chassis = read(example);
    ChassisCircuits circuits = new ChassisCircuits(chassis, LIBRARY);
    for (StageEntry stage : chassis.stages()) {
      assertTrue(circuits.drawing(stage.ref()).symbols().size() > 5, stage.ref());
    }
  }
}
