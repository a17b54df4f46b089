package perveance.engine.stage;

/**
 * What the figures assume about mains, meter and parts.
 *
 * @param mains nominal mains [V]
 * @param mainsActual mains today [V]
 * @param mainsFrequency [Hz]
 * @param meter input resistance of the meter that will be used [ohm]
 * @param resistorTolerance tolerance of resistors, taken as two standard deviations [1]
 * @param capacitorTolerance tolerance of capacitors, taken as two standard deviations [1]
 * @param supplyTolerance doubt of a stated supply, taken as two standard deviations [1]
 * @param threshold voltage below which a discharged capacitor is to be measured; check your local
 *     rule [V]
 * @param heaters winding that feeds the heaters
 */
public record Conditions(
    double mains,
    double mainsActual,
    double mainsFrequency,
    double meter,
    double resistorTolerance,
    double capacitorTolerance,
    double supplyTolerance,
    double threshold,
    HeaterSupply heaters) {
  /** Used where the file is silent: 230 V 50 Hz, 10 Mohm meter, 5 % resistors, 60 V threshold. */
  public static final Conditions USUAL = new Conditions(230, 230, 50, 10e6, 0.05, 0.20, 0.06, 60);

  /**
   * Conditions with the usual heater supply.
   *
   * @param mains nominal mains [V]
   * @param mainsActual mains today [V]
   * @param mainsFrequency [Hz]
   * @param meter input resistance of the meter that will be used [ohm]
   * @param resistorTolerance tolerance of resistors [1]
   * @param capacitorTolerance tolerance of capacitors [1]
   * @param supplyTolerance doubt of a stated supply [1]
   * @param threshold voltage below which a discharged capacitor is to be measured [V]
   */
  public Conditions(
      double mains,
      double mainsActual,
      double mainsFrequency,
      double meter,
      double resistorTolerance,
      double capacitorTolerance,
      double supplyTolerance,
      double threshold) {
    this(
        mains,
        mainsActual,
        mainsFrequency,
        meter,
        resistorTolerance,
        capacitorTolerance,
        supplyTolerance,
        threshold,
        HeaterSupply.USUAL);
  }

  /**
   * The same with another heater supply.
   *
   * @param supply winding that feeds the heaters
   * @return the changed conditions
   */
  public Conditions with(HeaterSupply supply) {
    return new Conditions(
        mains,
        mainsActual,
        mainsFrequency,
        meter,
        resistorTolerance,
        capacitorTolerance,
        supplyTolerance,
        threshold,
        supply);
  }

  /**
   * Ratio of today's mains to the nominal mains.
   *
   * @return ratio [1]
   */
  public double mainsRatio() {
    return mainsActual / mains;
  }
}
