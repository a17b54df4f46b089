package perveance.engine.analysis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import perveance.engine.base.BadInputException;
import perveance.engine.base.Progress;
import perveance.files.chassis.ChassisReader;
import perveance.files.device.DeviceFiles;

/** Derived: what drains a capacitor is read off the drawing; sums of resistors, exact. */
class DischargesTest {
  private static Discharge of(String example, String where) throws BadInputException {
    DeviceFiles devices = new DeviceFiles(List.of());
    return new ChassisAnalysis(devices)
            .answer(
                new ChassisReader(devices).read(Path.of("examples", example + ".toml")),
                AnalysisOptions.LIVE,
                Progress.none())
            .discharges()
            .stream()
            .filter(d -> d.where().equals(where))
            .findFirst()
            .orElseThrow();
  }

  /** Choke 1k2, bleeder 100k and the load 100k in a row. */
  @Test
  void aCouplingCapacitorDrainsThroughAChoke() throws BadInputException {
    Discharge found = of("choke-driver", "V1 coupling");
    assertEquals(201.2e3, found.resistance(), 1);
    assertTrue(Double.isFinite(found.seconds()));
  }

  /** The cathode between two cold valves holds its capacitor: nothing in the file drains it. */
  @Test
  void aCapacitorBetweenColdValvesHasNoPath() throws BadInputException {
    assertEquals(Double.POSITIVE_INFINITY, of("headphone-follower", "V2 coupling").resistance());
  }
}
