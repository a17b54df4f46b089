package perveance.engine.device.fit;

/**
 * A cathode that is its own heater.
 *
 * <p>The law of a directly heated valve refers to the filament's middle. Heated with direct current
 * and measured from the negative end, grid and anode are half the filament's voltage lower against
 * the middle than against that end; a 2A3 biased -45 V to the middle so reads -43.75 V to the end
 * (the tables print -43.5 V). Heated with alternating current both ends swing about the middle.
 *
 * @param voltage heating voltage, root mean square if alternating [V]
 * @param heating how the evidence was taken
 */
public record Filament(double voltage, Heating heating) {
  /** Refuses voltages that are none. */
  public Filament {
    if (!(voltage > 0) || Double.isInfinite(voltage)) {
      throw new IllegalArgumentException("voltage is not above 0 and finite: " + voltage);
    }
  }

  /**
   * A voltage of the evidence told against the filament's middle.
   *
   * @param stated voltage as stated [V]
   * @return the same electrode to the middle [V]
   */
  public double toMiddle(double stated) {
    return heating == Heating.ALTERNATING ? stated : stated - voltage / 2;
  }

  /**
   * How far the filament's own voltage spreads the cathode potential: spread evenly over the
   * length, its deviation is the voltage over sqrt 12, with either kind of current.
   *
   * @return sqrt 3 times the standard deviation [V]
   */
  public double cathodeSpread() {
    return voltage / 2;
  }
}
