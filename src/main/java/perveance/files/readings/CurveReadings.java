package perveance.files.readings;

import java.util.List;
import java.util.Optional;
import perveance.engine.device.Evidence;

/**
 * Readings of one valve.
 *
 * @param device the type it is, where the file says so
 * @param evidence one entry for each reading, in the order of the file
 */
public record CurveReadings(Optional<String> device, List<Evidence> evidence) {
  /** Copies the list. */
  public CurveReadings {
    evidence = List.copyOf(evidence);
  }
}
