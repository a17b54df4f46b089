package perveance.engine.circuit;

import perveance.engine.device.ElectrodeCurrents;

/** One valve at an operating point. Electrodes are counted as in {@link ElectrodeCurrents}. */
public final class ValvePoint {
  private static final int ELECTRODES = 3;

  private final String name;
  private final double[] voltage;
  private final double[] current = new double[ELECTRODES];
  private final double[] slope = new double[ELECTRODES * ELECTRODES];
  private final double cathodeVoltage;

  ValvePoint(String name, double[] voltage, double cathodeVoltage, ElectrodeCurrents point) {
    this.name = name;
    this.voltage = voltage.clone();
    this.cathodeVoltage = cathodeVoltage;
    for (int e = 0; e < ELECTRODES; e++) {
      current[e] = point.current(e);
      for (int by = 0; by < ELECTRODES; by++) {
        slope[ELECTRODES * e + by] = point.slope(e, by);
      }
    }
  }

  /**
   * Name of the valve.
   *
   * @return name of the element
   */
  public String name() {
    return name;
  }

  /**
   * Voltage of an electrode to the cathode.
   *
   * @param electrode anode, grid or screen
   * @return voltage to cathode [V]
   */
  public double voltage(int electrode) {
    return voltage[electrode];
  }

  /**
   * Voltage of the cathode.
   *
   * @return cathode to chassis [V]
   */
  public double cathodeVoltage() {
    return cathodeVoltage;
  }

  /**
   * Current into an electrode.
   *
   * @param electrode anode, grid or screen
   * @return current [A]
   */
  public double current(int electrode) {
    return current[electrode];
  }

  /**
   * Current that leaves through the cathode.
   *
   * @return sum of the electrode currents [A]
   */
  public double cathodeCurrent() {
    return current[0] + current[1] + current[2];
  }

  /**
   * Slope of an electrode's current.
   *
   * @param electrode whose current
   * @param by whose voltage to cathode
   * @return dI/dV [S]
   */
  public double slope(int electrode, int by) {
    return slope[ELECTRODES * electrode + by];
  }

  /**
   * Mutual conductance gm, anode current by grid voltage.
   *
   * @return gm [S]
   */
  public double mutualConductance() {
    return slope(ElectrodeCurrents.ANODE, ElectrodeCurrents.GRID);
  }

  /**
   * Anode resistance ra, positive infinity where the anode current does not depend on the anode
   * voltage.
   *
   * @return ra [ohm]
   */
  public double anodeResistance() {
    return 1 / slope(ElectrodeCurrents.ANODE, ElectrodeCurrents.ANODE);
  }

  /**
   * Amplification factor mu = gm ra; zero when cut off.
   *
   * @return mu [1]
   */
  public double amplificationFactor() {
    double gm = mutualConductance();
    return gm == 0 ? 0 : gm / slope(ElectrodeCurrents.ANODE, ElectrodeCurrents.ANODE);
  }

  /**
   * Power that an electrode takes.
   *
   * @param electrode anode, grid or screen
   * @return voltage to cathode times current [W]
   */
  public double power(int electrode) {
    return voltage[electrode] * current[electrode];
  }
}
