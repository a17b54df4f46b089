package perveance.engine.analysis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import perveance.engine.base.BadInputException;
import perveance.engine.base.Progress;
import perveance.files.chassis.ChassisReader;
import perveance.files.device.DeviceFiles;

/** Derived: the readings at which a technician is told to stop. */
class StopReadingsTest {
  private static ChassisAnswer answer(Path example) throws BadInputException {
    DeviceFiles devices = new DeviceFiles(List.of());
    return new ChassisAnalysis(devices)
        .answer(
            new ChassisReader(devices).read(example),
            AnalysisOptions.FULL.withSamples(50),
            Progress.none());
  }

  static List<Path> examples() throws IOException {
    try (Stream<Path> files = Files.list(Path.of("examples"))) {
      return files.filter(f -> f.toString().endsWith(".toml")).sorted().toList();
    }
  }

  /** A sound stage at rest is never told to stop. */
  @ParameterizedTest
  @MethodSource("examples")
  void theExpectedReadingIsBelowTheStop(Path example) throws BadInputException {
    for (StageAnswer stage : answer(example).stages()) {
      assertFalse(stage.readings().isEmpty(), stage.ref());
      for (ExpectedReading reading : stage.readings()) {
        assertTrue(
            reading.stop().isEmpty() || reading.reading() < reading.stop().getAsDouble(),
            () -> example + " " + stage.ref() + " " + reading);
      }
    }
  }

  /** Two EL84 of 12 W on 150 ohms: the anode's share of the cathode current fills the limit. */
  @Test
  void theCathodeResistorOfAPairCarriesTwoValves() throws BadInputException {
    StageAnswer stage = answer(Path.of("examples/ultra-linear-el84.toml")).stages().get(2);
    DevicePoint valve = stage.points().get(0);
    double anode = 12 / valve.anode();
    double cathode = anode * (1 + valve.screenCurrent().orElseThrow() / valve.anodeCurrent());
    ExpectedReading reading =
        stage.readings().stream()
            .filter(r -> r.electrode().equals("cathode"))
            .findFirst()
            .orElseThrow();
    assertEquals(2 * cathode * 150, reading.stop().orElseThrow(), 1e-6);
  }
}
