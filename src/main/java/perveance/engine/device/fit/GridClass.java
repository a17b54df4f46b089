package perveance.engine.device.fit;

/**
 * Usual constants of valves built alike, for what a type's own evidence leaves open.
 *
 * <p>The spread of the penetration factor comes from the types whose evidence fixes it: 6SL7GT (41
 * chart readings, 0.11) for closely wound grids; 6SN7GT, 12AU7, 12BH7A and 5687 (0.30, 0.61, 0.46,
 * 0.38) for open ones; 2A3, 45, 300B, 211 and 845 (0.17, 0.16, 0.09, 0.15, 0.08) for filaments.
 */
public enum GridClass {
  /** Indirectly heated, mu below 45. */
  OPEN("indirectly heated, mu below 45", 0.45, 0.15, 0.5, 0.25, -0.6, 3),
  /** Indirectly heated, mu 45 or above: a closely wound grid of thin wire. */
  CLOSE("indirectly heated, mu 45 or above", 0.20, 0.07, 0.5, 0.25, -0.6, 3),
  /** The filament is the cathode. */
  FILAMENT("directly heated", 0.15, 0.06, 0, 2, 0, 5);

  private static final double CLOSE_FROM = 45;

  private final String words;
  private final double spread;
  private final double spreadDeviation;
  private final double contactPotential;
  private final double contactDeviation;
  private final double gridOnset;
  private final double turnBack;

  GridClass(
      String words,
      double spread,
      double spreadDeviation,
      double contactPotential,
      double contactDeviation,
      double gridOnset,
      double turnBack) {
    this.words = words;
    this.spread = spread;
    this.spreadDeviation = spreadDeviation;
    this.contactPotential = contactPotential;
    this.contactDeviation = contactDeviation;
    this.gridOnset = gridOnset;
    this.turnBack = turnBack;
  }

  /**
   * The class of a valve.
   *
   * @param directlyHeated true for a filament
   * @param amplificationFactor nominal mu [1]
   * @return its class
   */
  public static GridClass of(boolean directlyHeated, double amplificationFactor) {
    if (directlyHeated) {
      return FILAMENT;
    }
    return amplificationFactor >= CLOSE_FROM ? CLOSE : OPEN;
  }

  /**
   * What the class is, in words.
   *
   * @return for example {@code directly heated}
   */
  public String words() {
    return words;
  }

  /**
   * Usual spread of the penetration factor.
   *
   * @return s [1]
   */
  public double spread() {
    return spread;
  }

  /**
   * How far types of the class differ in their spread.
   *
   * @return one standard deviation [1]
   */
  public double spreadDeviation() {
    return spreadDeviation;
  }

  /**
   * Usual contact potential.
   *
   * @return Vc [V]
   */
  public double contactPotential() {
    return contactPotential;
  }

  /**
   * How far types of the class differ in their contact potential.
   *
   * @return one standard deviation [V]
   */
  public double contactDeviation() {
    return contactDeviation;
  }

  /**
   * Usual onset of grid current: of indirectly heated types the grid voltage at which the printed
   * output of the ECC83's resistance-coupled table ends, of filaments zero, to which their tables
   * drive the grid.
   *
   * @return grid voltage at 0.3 uA [V]
   */
  public double gridOnset() {
    return gridOnset;
  }

  /**
   * Usual anode voltage at which a quarter of the electrons turns back.
   *
   * @return Vt [V]
   */
  public double turnBack() {
    return turnBack;
  }
}
