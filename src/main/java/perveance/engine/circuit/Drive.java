package perveance.engine.circuit;

import java.util.LinkedHashMap;
import java.util.Map;

/**
 * A signal: one waveform on one or several sources, each with its own share and sign, on top of
 * their dc values.
 *
 * @param waveform shape with a peak of 1
 * @param shares factor by element index of a voltage or current source; 1 and -1 for the two grids
 *     of a push-pull pair [1]
 */
public record Drive(Waveform waveform, Map<Integer, Double> shares) {
  /** Copies the map. */
  public Drive {
    shares = java.util.Collections.unmodifiableMap(new LinkedHashMap<>(shares));
    if (shares.isEmpty()) {
      throw new IllegalArgumentException("shares is empty");
    }
    shares.values().forEach(share -> ElementChecks.finite("share", share));
  }

  /**
   * A signal on one source.
   *
   * @param waveform shape
   * @param source element index of a voltage or current source
   * @return the drive
   */
  public static Drive of(Waveform waveform, int source) {
    return new Drive(waveform, Map.of(source, 1.0));
  }
}
