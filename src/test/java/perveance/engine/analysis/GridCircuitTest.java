package perveance.engine.analysis;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.file.Path;
import java.util.Map;
import java.util.stream.Collectors;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import perveance.engine.base.BadInputException;
import perveance.engine.base.Progress;
import perveance.files.chassis.ChassisReader;
import perveance.files.device.DeviceFiles;

/**
 * Derived: the resistance that makers limit is the one that the drawing shows between the grid and
 * where it returns, whatever holds the cathode. Tolerance 1 %: what a cathode circuit adds is not
 * counted by hand.
 */
class GridCircuitTest {
  @ParameterizedTest
  @CsvSource({
    // a light-emitting diode in the cathode: the leak alone, for the source is behind a capacitor
    "headphone-follower, V1, 220e3",
    // upper half of the follower: straight on the anode load of the valve before
    "headphone-follower, V2a, 27e3",
    // a diode in the cathode under a current source
    "choke-driver, V2, 470e3",
    // cathode resistor: leak and stopper
    "microphone-cascode, V1a, 100.22e3",
    // cathode on chassis: leak to the bias and stopper
    "push-pull-el34, V3, 222.2e3"
  })
  void itIsTheGridLeakHoweverTheCathodeIsHeld(String example, String ref, double ohms)
      throws BadInputException {
    DeviceFiles devices = new DeviceFiles(java.util.List.of());
    ChassisAnswer answer =
        new ChassisAnalysis(devices)
            .answer(
                new ChassisReader(devices).read(Path.of("examples", example + ".toml")),
                AnalysisOptions.LIVE,
                Progress.none());
    Map<String, Double> found =
        answer.stages().stream()
            .flatMap(s -> s.limits().stream())
            .filter(l -> l.what().startsWith("grid leak"))
            .collect(Collectors.toMap(LimitUse::ref, LimitUse::value, (a, b) -> a));
    assertEquals(ohms, found.getOrDefault(ref, 0.0), 0.01 * ohms);
  }
}
