package perveance.engine.analysis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import perveance.engine.base.BadInputException;
import perveance.engine.base.Progress;
import perveance.engine.base.RatingMessage;
import perveance.engine.base.Severity;
import perveance.files.chassis.ChassisReader;
import perveance.files.device.DeviceFiles;

/**
 * Derived: what must hold of the whole answer of every shipped example, whatever its figures. Signs
 * and the room for the swing are in {@link ExampleSwingTest}.
 */
class ExampleAnswersTest {
  private static final DeviceFiles DEVICES = new DeviceFiles(List.of());

  /** A band of 200 samples leaves out 5 of 200; a nominal value lies well inside. */
  private static final AnalysisOptions OPTIONS = AnalysisOptions.FULL.withSamples(200);

  static List<Path> examples() throws IOException {
    try (Stream<Path> files = Files.list(Path.of("examples"))) {
      return files.filter(f -> f.toString().endsWith(".toml")).sorted().toList();
    }
  }

  @ParameterizedTest
  @MethodSource("examples")
  void theAnswerIsOneThatABenchCouldGive(Path example) throws BadInputException {
    ChassisAnswer answer =
        new ChassisAnalysis(DEVICES)
            .answer(new ChassisReader(DEVICES).read(example), OPTIONS, Progress.none());
    assertEquals(List.of(), answer.failures());
    double highest = answer.highestVoltage();
    for (StageAnswer stage : answer.stages()) {
      String name = example.getFileName() + " " + stage.ref();
      points(stage, highest, name);
      smallSignal(stage.smallSignal(), name);
      swing(stage, name);
    }
  }

  private static void points(StageAnswer stage, double highest, String name) {
    for (DevicePoint point : stage.points()) {
      assertTrue(point.anodeCurrent() > 0, name + " conducts");
      assertTrue(point.anode() > 0 && point.anode() < 1.1 * highest, name + " " + point.anode());
      assertTrue(point.grid() < 0, name + " grid " + point.grid());
      double power = point.anode() * point.anodeCurrent();
      assertEquals(power, point.anodeDissipation(), 1e-9 + 1e-6 * power, name);
      inside(point.bands(), "anodeCurrent", point.anodeCurrent(), name);
      inside(point.bands(), "anodeChassis", point.anodeChassis(), name);
    }
  }

  private static void smallSignal(SmallSignalAnswer small, String name) {
    assertTrue(Math.abs(small.gain()) > 0.1 && Math.abs(small.gain()) < 1000, name);
    assertTrue(small.outputResistance() > 0 && small.outputResistance() < 1e6, name);
    assertTrue(small.inputCapacitance() > 0 && small.inputCapacitance() < 2e-9, name);
    assertTrue(small.noiseInput().orElseThrow() > 1e-8, name);
    assertTrue(small.noiseInput().orElseThrow() < 1e-4, name);
    inside(small.bands(), "gain", small.gain(), name);
    inside(small.bands(), "outputResistance", small.outputResistance(), name);
    if (small.lowCorner().isPresent() && small.highCorner().isPresent()) {
      double low = small.lowCorner().getAsDouble();
      assertTrue(low < 200 && small.highCorner().getAsDouble() > 5e3, name + " corners");
    }
  }

  private static void swing(StageAnswer stage, String name) {
    CleanSwing clean = stage.clean();
    assertTrue(clean.inputPeak() > 0, name + " has a clean input");
    if (stage.driven().isPresent()) {
      DrivenAnswer driven = stage.driven().get();
      assertTrue(driven.output() > 0 && driven.distortion() >= 0, name);
      assertTrue(driven.distortion() < 0.1, name + " distortion " + driven.distortion());
      double expected = Math.abs(stage.smallSignal().gain()) * driven.inputPeak();
      // compression: never more than a tenth above the small-signal gain, rarely half of it
      double found = Math.sqrt(2) * driven.output();
      assertTrue(found < 1.1 * expected && found > 0.5 * expected, name + " " + found);
    }
  }

  private static void inside(Map<String, Band> bands, String what, double value, String name) {
    Band band = bands.get(what);
    assertTrue(band != null && band.low() <= value && value <= band.high(), name + " " + what);
  }

  /** Shipped examples are sound designs, but for the one that shows a heater out of its limit. */
  @ParameterizedTest
  @MethodSource("examples")
  void noLimitIsExceededButTheOneThatIsShown(Path example) throws BadInputException {
    ChassisAnswer answer =
        new ChassisAnalysis(DEVICES)
            .answer(new ChassisReader(DEVICES).read(example), OPTIONS, Progress.none());
    boolean shown = example.endsWith("single-ended-triode.toml");
    assertEquals(
        shown ? List.of(RatingMessage.HEATER_CATHODE_OVER) : List.of(),
        answer.findings().stream()
            .filter(f -> f.severity().compareTo(Severity.OVER_LIMIT) >= 0)
            .map(f -> f.code())
            .toList());
  }
}
