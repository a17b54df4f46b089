package perveance.engine.device;

/**
 * Currents into the electrodes of one device and their partial derivatives at one set of electrode
 * voltages.
 *
 * <p>The object is written by {@link DeviceLaw#evaluate} and is reused in the inner loop so that
 * nothing is allocated there. Electrodes are counted anode = 0, grid = 1, screen = 2; the cathode
 * returns their sum. Voltages are to cathode. Currents are positive into the electrode.
 */
public final class ElectrodeCurrents {
  /** Index of the anode. */
  public static final int ANODE = 0;

  /** Index of the (control) grid. */
  public static final int GRID = 1;

  /** Index of the screen. */
  public static final int SCREEN = 2;

  private final double[] current = new double[3];
  private final double[] slope = new double[9];

  /**
   * Current into an electrode.
   *
   * @param electrode {@link #ANODE}, {@link #GRID} or {@link #SCREEN}
   * @return current into the electrode [A]
   */
  public double current(int electrode) {
    return current[electrode];
  }

  /**
   * Partial derivative of a current with respect to an electrode voltage.
   *
   * @param electrode whose current
   * @param voltage whose voltage to cathode
   * @return dI(electrode)/dV(voltage) [S]
   */
  public double slope(int electrode, int voltage) {
    return slope[3 * electrode + voltage];
  }

  /**
   * Current that leaves through the cathode.
   *
   * @return sum of the electrode currents [A]
   */
  public double cathode() {
    return current[ANODE] + current[GRID] + current[SCREEN];
  }

  /** Sets all currents and slopes to zero. */
  public void clear() {
    java.util.Arrays.fill(current, 0.0);
    java.util.Arrays.fill(slope, 0.0);
  }

  /**
   * Sets one current and its three slopes.
   *
   * @param electrode whose current
   * @param value current into the electrode [A]
   * @param byAnode dI/dVa [S]
   * @param byGrid dI/dVg [S]
   * @param byScreen dI/dVg2 [S]
   */
  public void set(int electrode, double value, double byAnode, double byGrid, double byScreen) {
    current[electrode] = value;
    slope[3 * electrode] = byAnode;
    slope[3 * electrode + 1] = byGrid;
    slope[3 * electrode + 2] = byScreen;
  }
}
