package perveance.engine.device.geometry;

import java.util.List;
import java.util.stream.IntStream;

/**
 * The gap from cathode to anode at one voltage, as points for a picture. The cathode's own surface
 * is left out: the law has electrons at rest there, whose density has no finite value.
 *
 * @param voltage of the anode [V]
 * @param points at equal distances, the last at the anode
 */
public record GapProfile(double voltage, List<GapPoint> points) {
  /** Copies the points. */
  public GapProfile {
    points = List.copyOf(points);
  }

  /**
   * Walks across a gap.
   *
   * @param diode electrodes
   * @param voltage of the anode, above 0 [V]
   * @param count number of points, 1 or more
   * @return the profile
   */
  public static GapProfile across(DiodeGeometry diode, double voltage, int count) {
    if (count < 1) {
      throw new IllegalArgumentException("count must be 1 or more, found " + count);
    }
    return new GapProfile(
        voltage,
        IntStream.rangeClosed(1, count)
            .mapToObj(i -> diode.at(diode.gap() * i / count, voltage))
            .toList());
  }
}
