package perveance.engine.device;

/**
 * A device law: the currents of a valve as a function of its electrode voltages.
 *
 * <p>Every law is finite for every finite voltage, continuous with continuous first derivatives
 * (apart from stated joints), does not fall when a positive-going grid or anode is raised, and is
 * zero where the device is cut off. A law is immutable; variants are new laws.
 */
public interface DeviceLaw {
  /**
   * Which electrodes carry current in this law.
   *
   * @return kind of law
   */
  LawKind kind();

  /**
   * Evaluates currents and all partial derivatives. Allocates nothing.
   *
   * @param anode anode to cathode [V]
   * @param grid grid to cathode [V]; ignored by a diode
   * @param screen screen to cathode [V]; ignored by a diode and a triode
   * @param out overwritten with the result
   * @throws IllegalArgumentException when a voltage is NaN
   */
  void evaluate(double anode, double grid, double screen, ElectrodeCurrents out);

  /**
   * A specimen of the same type: more or less conduction, another contact potential.
   *
   * @param conduction factor on the perveance [1], positive
   * @param contactShift added to the contact potential [V]
   * @return the varied law
   */
  DeviceLaw specimen(double conduction, double contactShift);

  /**
   * Grid voltage at which grid current reaches the published onset criterion of 0.3 uA (or its
   * class value); positive infinity when the law has no grid current.
   *
   * @return onset of grid current, grid to cathode [V]
   */
  double gridCurrentOnset();

  /**
   * The law's own parameters with units, for files and reports, in a fixed order.
   *
   * @return parameters by name
   */
  java.util.List<LawParameter> parameters();
}
