package perveance.engine.device;

import java.util.List;
import java.util.Map;

/**
 * The constants of a {@link SpreadPentodeLaw}.
 *
 * @param perveance G, above 0 [A V^-1.5]
 * @param contactPotential Vc, added to the grid voltage [V]
 * @param penetration D0, mean penetration factor of the screen through the grid, above 0 [1]
 * @param spread s, sqrt 3 times the standard deviation of D over D0, 0 to 1 [1]
 * @param cathodeSpread c, the same of the cathode's potential, 0 or above [V]
 * @param remoteShare part of the cathode behind the wide turns of a remote cut-off grid, 0 to 1 [1]
 * @param remotePenetration penetration factor there over D0, 1 or above [1]
 * @param anodeInfluence L, part of the anode voltage that adds to the screen's pull, 0 to 1 [1]
 * @param screenShare k, Ig2/Ia with anode and screen at the same voltage, above 0 [1]
 * @param shareFall b, part of the share that falls as the anode is raised, 0 to 1 [1]
 * @param shareOffset x0, anode to screen voltage ratio that sets how steeply, above 0 [1]
 * @param beamWidth r0, drive ratio at which the beams fill the screen's gaps; 0 where not aligned
 *     [1]
 * @param knee c, knee voltage as a part of the voltage that draws the current at no bias, above 0
 *     [1]
 * @param kneeSharpness n, 1 for a rounded knee, up to 8 for a sharp one [1]
 * @param gridPerveance Gg, above 0 [A V^-1.5]
 * @param gridOnset grid voltage at which 0.3 uA flows into the grid [V]
 * @param thermalVoltage VT of the cathode, above 0 [V]
 */
public record SpreadPentodeParameters(
    double perveance,
    double contactPotential,
    double penetration,
    double spread,
    double cathodeSpread,
    double remoteShare,
    double remotePenetration,
    double anodeInfluence,
    double screenShare,
    double shareFall,
    double shareOffset,
    double beamWidth,
    double knee,
    double kneeSharpness,
    double gridPerveance,
    double gridOnset,
    double thermalVoltage) {
  /** Refuses what has no meaning. */
  public SpreadPentodeParameters {
    positive("perveance", perveance);
    finite("contactPotential", contactPotential);
    positive("penetration", penetration);
    within("spread", spread, 0, 1);
    within("cathodeSpread", cathodeSpread, 0, 100);
    within("remoteShare", remoteShare, 0, 1);
    within("remotePenetration", remotePenetration, 1, 100);
    within("anodeInfluence", anodeInfluence, 0, 1);
    positive("screenShare", screenShare);
    within("shareFall", shareFall, 0, 1);
    positive("shareOffset", shareOffset);
    within("beamWidth", beamWidth, 0, 10);
    positive("knee", knee);
    within("kneeSharpness", kneeSharpness, 1, 8);
    positive("gridPerveance", gridPerveance);
    finite("gridOnset", gridOnset);
    positive("thermalVoltage", thermalVoltage);
  }

  /**
   * Constants of a valve whose grid has one pitch.
   *
   * @param perveance G, above 0 [A V^-1.5]
   * @param contactPotential Vc, added to the grid voltage [V]
   * @param penetration D0, mean penetration factor of the screen through the grid, above 0 [1]
   * @param spread s, sqrt 3 times the standard deviation of D over D0, 0 to 1 [1]
   * @param cathodeSpread c, the same of the cathode's potential, 0 or above [V]
   * @param anodeInfluence L, part of the anode voltage that adds to the screen's pull, 0 to 1 [1]
   * @param screenShare k, Ig2/Ia with anode and screen at the same voltage, above 0 [1]
   * @param shareFall b, part of the share that falls as the anode is raised, 0 to 1 [1]
   * @param shareOffset x0, anode to screen voltage ratio that sets how steeply, above 0 [1]
   * @param beamWidth r0, drive ratio at which the beams fill the screen's gaps; 0 where not aligned
   *     [1]
   * @param knee c, knee voltage as a part of the voltage that draws the current at no bias, above 0
   *     [1]
   * @param kneeSharpness n, 1 for a rounded knee, up to 8 for a sharp one [1]
   * @param gridPerveance Gg, above 0 [A V^-1.5]
   * @param gridOnset grid voltage at which 0.3 uA flows into the grid [V]
   * @param thermalVoltage VT of the cathode, above 0 [V]
   */
  public SpreadPentodeParameters(
      double perveance,
      double contactPotential,
      double penetration,
      double spread,
      double cathodeSpread,
      double anodeInfluence,
      double screenShare,
      double shareFall,
      double shareOffset,
      double beamWidth,
      double knee,
      double kneeSharpness,
      double gridPerveance,
      double gridOnset,
      double thermalVoltage) {
    this(
        perveance,
        contactPotential,
        penetration,
        spread,
        cathodeSpread,
        0,
        1,
        anodeInfluence,
        screenShare,
        shareFall,
        shareOffset,
        beamWidth,
        knee,
        kneeSharpness,
        gridPerveance,
        gridOnset,
        thermalVoltage);
  }

  /** Keys in the order of {@link #list}. */
  public static final List<String> KEYS =
      List.of(
          "perveance",
          "contact_potential",
          "penetration",
          "spread",
          "cathode_spread",
          "remote_share",
          "remote_penetration",
          "anode_influence",
          "screen_share",
          "share_fall",
          "share_offset",
          "beam_width",
          "knee",
          "knee_sharpness",
          "grid_perveance",
          "grid_onset",
          "thermal_voltage");

  /**
   * Reads the constants by the keys of a device file.
   *
   * @param values value by key [SI unit of the key]; further keys are not looked at
   * @return the constants
   * @throws IllegalArgumentException when a key is missing or a value is out of range
   */
  public static SpreadPentodeParameters of(Map<String, Double> values) {
    double[] v = new double[KEYS.size()];
    for (int i = 0; i < v.length; i++) {
      Double value = values.get(KEYS.get(i));
      if (value == null) {
        throw new IllegalArgumentException("parameter is missing: " + KEYS.get(i));
      }
      v[i] = value;
    }
    return new SpreadPentodeParameters(
        v[0], v[1], v[2], v[3], v[4], v[5], v[6], v[7], v[8], v[9], v[10], v[11], v[12], v[13],
        v[14], v[15], v[16]);
  }

  /**
   * The constants with keys, units and meaning.
   *
   * @return in the order of the record
   */
  public List<LawParameter> list() {
    return List.of(
        parameter(0, perveance, "A V^-1.5", "perveance of the cathode"),
        parameter(1, contactPotential, "V", "contact potential, added to the grid voltage"),
        parameter(2, penetration, "1", "mean penetration factor of the screen through the grid"),
        parameter(3, spread, "1", "spread of the penetration factor, relative"),
        parameter(4, cathodeSpread, "V", "spread of the cathode's potential"),
        parameter(5, remoteShare, "1", "part of the cathode behind wide turns (remote cut-off)"),
        parameter(6, remotePenetration, "1", "penetration factor there over the mean"),
        parameter(
            7, anodeInfluence, "1", "part of the anode voltage that adds to the screen's pull"),
        parameter(8, screenShare, "1", "Ig2/Ia at equal anode and screen voltage, wide beams"),
        parameter(9, shareFall, "1", "part of the screen's share that falls with anode voltage"),
        parameter(10, shareOffset, "1", "Va/Vg2 that sets how steeply the share falls"),
        parameter(
            11, beamWidth, "1", "drive at which beams fill the screen's gaps, 0 if not aligned"),
        parameter(12, knee, "1", "knee over the voltage that draws the current at no bias"),
        parameter(13, kneeSharpness, "1", "1 for a rounded knee, larger for a sharp one"),
        parameter(14, gridPerveance, "A V^-1.5", "perveance of the grid"),
        parameter(15, gridOnset, "V", "grid voltage at 0.3 uA of grid current"),
        parameter(16, thermalVoltage, "V", "thermal voltage of the cathode, k T / e"));
  }

  private static LawParameter parameter(int index, double value, String unit, String meaning) {
    return new LawParameter(KEYS.get(index), value, unit, meaning);
  }

  private static void positive(String name, double value) {
    if (!(value > 0) || value == Double.POSITIVE_INFINITY) {
      throw new IllegalArgumentException(name + " must be above 0, found " + value);
    }
  }

  private static void within(String name, double value, double lowest, double highest) {
    if (!(value >= lowest && value <= highest)) {
      throw new IllegalArgumentException(
          name + " must be from " + lowest + " to " + highest + ", found " + value);
    }
  }

  private static void finite(String name, double value) {
    if (!Double.isFinite(value)) {
      throw new IllegalArgumentException(name + " must be finite, found " + value);
    }
  }
}
