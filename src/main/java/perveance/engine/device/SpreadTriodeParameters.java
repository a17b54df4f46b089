package perveance.engine.device;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/**
 * The constants of a {@link SpreadTriodeLaw}.
 *
 * @param perveance G of the cathode, above 0 [A V^-1.5]
 * @param contactPotential Vc, added to the grid voltage [V]
 * @param penetration mean penetration factor D0 = 1/mu0, above 0 [1]
 * @param spread s, sqrt 3 times the standard deviation of D over D0 (the half width, were the
 *     spread even), 0 to 1 [1]
 * @param cathodeSpread c, the same of the cathode's potential, 0 or above [V]
 * @param remoteShare part of the cathode that the grid's loose places control, 0 to 1 [1]
 * @param remotePenetration penetration factor there over D0, 1 to 100 [1]
 * @param turnBack anode voltage at which a quarter of the electrons turns back, above 0 [V]
 * @param gridPerveance Gg of the grid, above 0 [A V^-1.5]
 * @param gridOnset grid voltage at 0.3 uA of grid current [V]
 * @param thermalVoltage k T / e of the cathode, above 0 [V]
 */
public record SpreadTriodeParameters(
    double perveance,
    double contactPotential,
    double penetration,
    double spread,
    double cathodeSpread,
    double remoteShare,
    double remotePenetration,
    double turnBack,
    double gridPerveance,
    double gridOnset,
    double thermalVoltage) {
  /** Checks the ranges. */
  public SpreadTriodeParameters {
    above0("perveance", perveance);
    finite("contactPotential", contactPotential);
    above0("penetration", penetration);
    within("spread", spread, 0, 1);
    if (!(cathodeSpread >= 0) || Double.isInfinite(cathodeSpread)) {
      throw new IllegalArgumentException(
          "cathodeSpread is not 0 or above and finite: " + cathodeSpread);
    }
    within("remoteShare", remoteShare, 0, 1);
    within("remotePenetration", remotePenetration, 1, 100);
    above0("turnBack", turnBack);
    above0("gridPerveance", gridPerveance);
    finite("gridOnset", gridOnset);
    above0("thermalVoltage", thermalVoltage);
  }

  /**
   * Constants of a valve whose grid is wound alike throughout.
   *
   * @param perveance G of the cathode, above 0 [A V^-1.5]
   * @param contactPotential Vc, added to the grid voltage [V]
   * @param penetration mean penetration factor, above 0 [1]
   * @param spread of the penetration factor, 0 to 1 [1]
   * @param cathodeSpread c, spread of the cathode's potential, 0 or above [V]
   * @param turnBack anode voltage at which a quarter of the electrons turns back, above 0 [V]
   * @param gridPerveance Gg of the grid, above 0 [A V^-1.5]
   * @param gridOnset grid voltage at 0.3 uA of grid current [V]
   * @param thermalVoltage k T / e of the cathode, above 0 [V]
   */
  public SpreadTriodeParameters(
      double perveance,
      double contactPotential,
      double penetration,
      double spread,
      double cathodeSpread,
      double turnBack,
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
        turnBack,
        gridPerveance,
        gridOnset,
        thermalVoltage);
  }

  /**
   * Constants of a valve whose cathode is at one potential throughout.
   *
   * @param perveance G of the cathode, above 0 [A V^-1.5]
   * @param contactPotential Vc, added to the grid voltage [V]
   * @param penetration mean penetration factor, above 0 [1]
   * @param spread of the penetration factor, 0 to 1 [1]
   * @param turnBack anode voltage at which a quarter of the electrons turns back, above 0 [V]
   * @param gridPerveance Gg of the grid, above 0 [A V^-1.5]
   * @param gridOnset grid voltage at 0.3 uA of grid current [V]
   * @param thermalVoltage k T / e of the cathode, above 0 [V]
   */
  public SpreadTriodeParameters(
      double perveance,
      double contactPotential,
      double penetration,
      double spread,
      double turnBack,
      double gridPerveance,
      double gridOnset,
      double thermalVoltage) {
    this(
        perveance,
        contactPotential,
        penetration,
        spread,
        0,
        turnBack,
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
          "turn_back",
          "grid_perveance",
          "grid_onset",
          "thermal_voltage");

  /** Keys of a grid with loose places, absent in the file of a valve without. */
  public static final List<String> REMOTE_KEYS = List.of("remote_share", "remote_penetration");

  /**
   * Reads the constants by the keys of a device file.
   *
   * @param values value by key [SI unit of the key]; further keys are not looked at
   * @return the constants
   * @throws IllegalArgumentException when a key is missing or a value is out of range
   */
  public static SpreadTriodeParameters of(Map<String, Double> values) {
    double[] v = new double[KEYS.size()];
    for (int i = 0; i < v.length; i++) {
      Double value = values.get(KEYS.get(i));
      if (value == null) {
        throw new IllegalArgumentException("parameter is missing: " + KEYS.get(i));
      }
      v[i] = value;
    }
    return new SpreadTriodeParameters(
        v[0],
        v[1],
        v[2],
        v[3],
        v[4],
        values.getOrDefault(REMOTE_KEYS.get(0), 0.0),
        values.getOrDefault(REMOTE_KEYS.get(1), 1.0),
        v[5],
        v[6],
        v[7],
        v[8]);
  }

  /**
   * The constants with keys, units and meaning.
   *
   * @return those that every triode has, then those of loose places in the grid, if any
   */
  public List<LawParameter> list() {
    List<LawParameter> list = new ArrayList<>(common());
    if (remoteShare > 0) {
      list.add(
          new LawParameter(
              REMOTE_KEYS.get(0), remoteShare, "1", "part of the cathode behind loose places"));
      list.add(
          new LawParameter(
              REMOTE_KEYS.get(1),
              remotePenetration,
              "1",
              "penetration factor there over the mean"));
    }
    return List.copyOf(list);
  }

  private List<LawParameter> common() {
    return List.of(
        parameter(0, perveance, "A V^-1.5", "perveance of the cathode"),
        parameter(1, contactPotential, "V", "contact potential, added to the grid voltage"),
        parameter(2, penetration, "1", "mean penetration factor of the grid, 1/mu"),
        parameter(3, spread, "1", "spread of the penetration factor, relative"),
        parameter(4, cathodeSpread, "V", "spread of the cathode's potential"),
        parameter(5, turnBack, "V", "anode voltage at which a quarter of the electrons turns back"),
        parameter(6, gridPerveance, "A V^-1.5", "perveance of the grid"),
        parameter(7, gridOnset, "V", "grid voltage at 0.3 uA of grid current"),
        parameter(8, thermalVoltage, "V", "thermal voltage of the cathode, k T / e"));
  }

  private static LawParameter parameter(int index, double value, String unit, String meaning) {
    return new LawParameter(KEYS.get(index), value, unit, meaning);
  }

  private static void within(String name, double value, double low, double high) {
    if (!(value >= low && value <= high)) {
      throw new IllegalArgumentException(
          name + " is not between " + low + " and " + high + ": " + value);
    }
  }

  private static void above0(String name, double value) {
    if (!(value > 0) || Double.isInfinite(value)) {
      throw new IllegalArgumentException(name + " is not above 0 and finite: " + value);
    }
  }

  private static void finite(String name, double value) {
    if (!Double.isFinite(value)) {
      throw new IllegalArgumentException(name + " is not finite: " + value);
    }
  }
}
