package perveance.engine.device;

import java.util.List;
import java.util.Map;

/**
 * Vacuum diodes and rectifiers.
 *
 * <p>What it predicts: the anode current of a space-charge-limited diode with the tail that initial
 * velocities give,
 *
 * <pre>{@code I = G w^(3/2),  w = 1.5 VT ln(1 + exp((Va + Vc) / (1.5 VT)))}</pre>
 *
 * <p>Well above zero this is the three-halves law G (Va + Vc)^(3/2) of Child (1911) and Langmuir
 * (1913); well below, the current falls by a factor e for every VT = kT/e (retarding region,
 * Langmuir, Phys. Rev. 21, 419, 1923). Range: from the retarding region to the peak current of the
 * data sheet; the emission ceiling is not part of the law. Outside: finite, rising, never negative;
 * voltages beyond one megavolt are taken as one megavolt.
 */
public final class SpaceChargeDiodeLaw implements DeviceLaw {
  /** Keys of the law's constants in device files, in the order of {@link #parameters}. */
  public static final List<String> KEYS =
      List.of("perveance", "contact_potential", "thermal_voltage");

  private static final double FAR_BELOW = -200;
  private static final double FAR_ABOVE = 36;
  private static final double HIGHEST_VOLTAGE = 1e6;

  /** Name of the law in device files. */
  public static final String NAME = "space-charge-diode";

  private final double perveance;
  private final double contactPotential;
  private final double thermalVoltage;

  /**
   * Makes the law of one anode.
   *
   * @param perveance G, above 0 [A V^-1.5]
   * @param contactPotential Vc [V]
   * @param thermalVoltage VT of the cathode, above 0 [V]
   */
  public SpaceChargeDiodeLaw(double perveance, double contactPotential, double thermalVoltage) {
    if (!(perveance > 0) || Double.isInfinite(perveance)) {
      throw new IllegalArgumentException("perveance must be above 0, found " + perveance);
    }
    if (!Double.isFinite(contactPotential)) {
      throw new IllegalArgumentException(
          "contactPotential must be finite, found " + contactPotential);
    }
    if (!(thermalVoltage > 0 && thermalVoltage <= 5)) {
      throw new IllegalArgumentException(
          "thermalVoltage must be above 0, at most 5, found " + thermalVoltage);
    }
    this.perveance = perveance;
    this.contactPotential = contactPotential;
    this.thermalVoltage = thermalVoltage;
  }

  /**
   * Makes the law from the keys of a device file.
   *
   * @param values value by key, further keys are not looked at [SI unit of each]
   * @return the law
   * @throws IllegalArgumentException when a key is missing or a value is out of range
   */
  public static SpaceChargeDiodeLaw of(Map<String, Double> values) {
    double[] v = new double[KEYS.size()];
    for (int i = 0; i < v.length; i++) {
      Double value = values.get(KEYS.get(i));
      if (value == null) {
        throw new IllegalArgumentException("parameter is missing: " + KEYS.get(i));
      }
      v[i] = value;
    }
    return new SpaceChargeDiodeLaw(v[0], v[1], v[2]);
  }

  @Override
  public LawKind kind() {
    return LawKind.DIODE;
  }

  @Override
  public void evaluate(double anode, double grid, double screen, ElectrodeCurrents out) {
    if (Double.isNaN(anode + grid + screen)) {
      throw new IllegalArgumentException(
          "voltage is not a number: anode " + anode + ", grid " + grid + ", screen " + screen);
    }
    double width = 1.5 * thermalVoltage;
    double x = (Math.min(anode, HIGHEST_VOLTAGE) + contactPotential) / width;
    out.clear();
    if (x < FAR_BELOW) {
      return;
    }
    double effective = x;
    double openness = 1;
    if (x <= FAR_ABOVE) {
      double e = Math.exp(x);
      effective = Math.log1p(e);
      openness = e / (1 + e);
    }
    double w = width * effective;
    double root = Math.sqrt(w);
    out.set(ElectrodeCurrents.ANODE, perveance * w * root, 1.5 * perveance * root * openness, 0, 0);
  }

  @Override
  public SpaceChargeDiodeLaw specimen(double conduction, double contactShift) {
    return new SpaceChargeDiodeLaw(
        perveance * conduction, contactPotential + contactShift, thermalVoltage);
  }

  /**
   * A diode has no grid.
   *
   * @return positive infinity [V]
   */
  @Override
  public double gridCurrentOnset() {
    return Double.POSITIVE_INFINITY;
  }

  @Override
  public List<LawParameter> parameters() {
    return List.of(
        new LawParameter(KEYS.get(0), perveance, "A V^-1.5", "perveance of one anode"),
        new LawParameter(KEYS.get(1), contactPotential, "V", "added to the anode voltage"),
        new LawParameter(KEYS.get(2), thermalVoltage, "V", "kT/e of the cathode"));
  }
}
