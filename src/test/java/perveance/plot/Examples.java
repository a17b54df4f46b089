package perveance.plot;

import static org.junit.jupiter.api.Assertions.assertFalse;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import perveance.engine.analysis.AnalysisOptions;
import perveance.engine.analysis.ChassisAnalysis;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.base.BadInputException;
import perveance.engine.base.Progress;
import perveance.files.chassis.ChassisReader;
import perveance.files.device.DeviceFiles;

/** The chassis files that come with the program, answered. */
final class Examples {
  private Examples() {}

  static List<Path> all() throws IOException {
    try (Stream<Path> files = Files.list(Path.of("examples"))) {
      return files.filter(p -> p.toString().endsWith(".toml")).sorted().toList();
    }
  }

  static ChassisAnswer answer(Path example) throws BadInputException {
    DeviceFiles devices = new DeviceFiles(List.of());
    ChassisAnswer answer =
        new ChassisAnalysis(devices)
            .answer(
                new ChassisReader(devices).read(example),
                AnalysisOptions.FULL.withSamples(40),
                Progress.none());
    assertFalse(answer.stages().isEmpty(), "no stage of " + example + " was answered");
    return answer;
  }
}
