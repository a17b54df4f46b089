package perveance.engine.device.fit;

/**
 * Usual constants of pentodes and beam tetrodes built alike, for what a type's own evidence leaves
 * open.
 *
 * <p>Knee and, for beam forming, the width of the beams were set once for each class on published
 * single-ended stages (power and mean screen current at full drive): EL84 at 250 V with 4.5k and
 * 5.2k for pentodes, the three rows of the 6V6GT for beam tetrodes. They are not fitted to any
 * single type. That of small pentodes is a little wider, as their published ra at 100 V shows
 * (6AU6, 6SK7). The spread comes from what the types' tables say when nothing holds it: small
 * pentodes 6AU6 0.7, 6SK7 0.7, EF80 0.45; output pentodes 6F6 0.47, EL84 and EL34 near 0; beam
 * tetrodes 6L6 0.46, 6V6GT 0.47, 6AQ5 0.64, KT66 near 0.
 */
public enum PentodeClass {
  /** Suppressor grid, cathode current of 25 mA or less. */
  SMALL("pentodes of small current", 0.5, 0.05, 0.003, 0.2, 0.5, 0, 0.08, 1.5),
  /** The same with a grid of uneven pitch for remote cut-off. */
  REMOTE("remote cut-off pentodes", 0.5, 0.05, 0.003, 0.2, 0.5, 0, 0.08, 1.5),
  /** Suppressor grid, larger currents. */
  POWER("output pentodes", 0.3, 0.15, 0.03, 0.2, 0.5, 0, 0.065, 1.5),
  /** Beam plates and aligned grids. */
  BEAM("beam tetrodes", 0.4, 0.15, 0.03, 1, 0.8, 0.35, 0.09, 3);

  private static final double SMALL_CURRENT = 25e-3;

  private final String words;
  private final double spread;
  private final double spreadDeviation;
  private final double anodeInfluence;
  private final double shareFall;
  private final double shareOffset;
  private final double beamWidth;
  private final double knee;
  private final double kneeSharpness;

  PentodeClass(
      String words,
      double spread,
      double spreadDeviation,
      double anodeInfluence,
      double shareFall,
      double shareOffset,
      double beamWidth,
      double knee,
      double kneeSharpness) {
    this.words = words;
    this.spread = spread;
    this.spreadDeviation = spreadDeviation;
    this.anodeInfluence = anodeInfluence;
    this.shareFall = shareFall;
    this.shareOffset = shareOffset;
    this.beamWidth = beamWidth;
    this.knee = knee;
    this.kneeSharpness = kneeSharpness;
  }

  /**
   * The class of a valve.
   *
   * @param beam true for beam plates, false for a suppressor grid
   * @param remote true where a mutual conductance far beyond the usual cut-off is published
   * @param highestCurrent largest cathode current of its tables [A]
   * @return its class
   */
  public static PentodeClass of(boolean beam, boolean remote, double highestCurrent) {
    if (beam) {
      return BEAM;
    }
    if (remote) {
      return REMOTE;
    }
    return highestCurrent <= SMALL_CURRENT ? SMALL : POWER;
  }

  /**
   * What the class is, in words.
   *
   * @return for example {@code beam tetrodes}
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
   * Usual part of the anode voltage that adds to the screen's pull.
   *
   * @return L [1]
   */
  public double anodeInfluence() {
    return anodeInfluence;
  }

  /**
   * Usual part of the screen's share that falls as the anode is raised.
   *
   * @return b [1]
   */
  public double shareFall() {
    return shareFall;
  }

  /**
   * Usual anode to screen voltage ratio that sets how steeply the share falls.
   *
   * @return x0 [1]
   */
  public double shareOffset() {
    return shareOffset;
  }

  /**
   * Usual drive at which beams fill the screen's gaps.
   *
   * @return r0, 0 where grids are not aligned [1]
   */
  public double beamWidth() {
    return beamWidth;
  }

  /**
   * Knee over the voltage that draws the current at no bias.
   *
   * @return c [1]
   */
  public double knee() {
    return knee;
  }

  /**
   * Sharpness of the knee.
   *
   * @return n [1]
   */
  public double kneeSharpness() {
    return kneeSharpness;
  }
}
