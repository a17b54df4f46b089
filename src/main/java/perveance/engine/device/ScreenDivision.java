package perveance.engine.device;

/**
 * How the cathode current of a pentode or beam tetrode divides between anode and screen.
 *
 * <p>What it predicts: the anode's share {@code f = Ia/Ik} as a function of the effective grid
 * voltage u (the two-thirds power of the current over the perveance), the anode voltage and the
 * screen voltage,
 *
 * <pre>{@code
 * f  = h / (1 + q)
 * h  = z / (1 + z^n)^(1/n),  z = Va/Vk,  Vk = c u/D0 + V0   the knee
 * q  = k B A                                               Ig2/Ia above the knee
 * A  = ((1 + x0) / (Va/Vg2 + x0))^b                        falls as the anode is raised
 * B  = 1 - exp(-(u/(D0 Vg2) / r0)^2), 1 for r0 = 0         beams narrow at low current
 * }</pre>
 *
 * <p>The knee moves with current because the anode must clear the space charge that a given current
 * leaves between screen and anode: u/D0 is the voltage that draws the current at zero bias, so Vk
 * is a fixed part c of it (two-thirds power of the current, Fay, Samuel and Shockley, Bell System
 * Technical Journal 17, 49, 1938). A small n rounds the knee as a suppressor grid does, a larger
 * one sharpens it as beam forming does. V0 is the small voltage that initial velocities give. The
 * fall of q with anode voltage is Tank's division of current (Jahrb. drahtl. Telegraphie 20, 82,
 * 1922) weakened by a suppressor. B describes aligned grids: at low current the sheets of electrons
 * pass between the screen's wires, at high current they are wider.
 *
 * <p>Range: screen positive, anode from zero up. Outside: the share is 0 for a negative anode, and
 * the screen voltage is bent smoothly to a small positive value so that every figure stays finite.
 */
final class ScreenDivision {
  /** Knee voltage left at vanishing current, from initial velocities [V]. */
  private static final double KNEE_AT_NO_CURRENT = 0.2;

  /** Anode voltage below which its effect is rounded off [V]. */
  private static final double ANODE_ROUNDING = 0.1;

  /** Screen voltages are bent towards positive values on this scale [V]. */
  private static final double SCREEN_ROUNDING = 1.0;

  private static final double TWO_THIRDS = 2.0 / 3.0;

  private final double share;
  private final double fallPower;
  private final double fallOffset;
  private final double inverseBeamWidth;
  private final double kneePerDrive;
  private final double sharpness;

  ScreenDivision(SpreadPentodeParameters p) {
    this.share = p.screenShare();
    this.fallPower = p.shareFall();
    this.fallOffset = p.shareOffset();
    this.inverseBeamWidth = p.beamWidth() > 0 ? 1 / (p.penetration() * p.beamWidth()) : 0;
    this.kneePerDrive = p.knee() / p.penetration();
    this.sharpness = p.kneeSharpness();
  }

  /**
   * Divides a cathode current that stands in the anode's place of {@code out}, with its slopes by
   * anode, grid and screen, and writes the currents of anode and screen.
   *
   * @param drive effective grid voltage u, above zero [V]
   * @param anode anode to cathode [V]
   * @param screen screen to cathode [V]
   * @param out holds the cathode current, receives the two currents
   */
  void divide(double drive, double anode, double screen, ElectrodeCurrents out) {
    double a = rounded(anode);
    double aSlope = Math.min(1, Math.max(0, anode / ANODE_ROUNDING));
    double root = Math.sqrt(screen * screen + SCREEN_ROUNDING * SCREEN_ROUNDING);
    double g2 = 0.5 * (screen + root);
    double g2Slope = g2 / root;

    double below = a + fallOffset * g2;
    double fall = fallen((1 + fallOffset) * g2 / below);
    double ratio = drive * inverseBeamWidth / g2;
    double tail = inverseBeamWidth > 0 ? Math.exp(-ratio * ratio) : 0;
    double beam = 1 - tail;
    double beamByLog = 2 * ratio * ratio * tail;
    double q = share * beam * fall;
    double qByLogDrive = share * fall * beamByLog;
    double qByAnode = -fallPower * q / below;
    double qByScreen = (fallPower * q * a / below - qByLogDrive) / g2;

    double knee = kneePerDrive * drive + KNEE_AT_NO_CURRENT;
    double z = a / knee;
    double sum = 1 + power(z);
    double slope = inverseRoot(sum);
    double h = z * slope;
    double hByAnode = slope / (sum * knee);
    double hByLogDrive = -hByAnode * z * kneePerDrive * drive;

    double part = 1 / (1 + q);
    double f = h * part;
    double fByAnode = (hByAnode - f * qByAnode) * part * aSlope;
    double fByScreen = -f * qByScreen * part * g2Slope;
    double fByLogDrive = (hByLogDrive - f * qByLogDrive) * part;
    write(f, f + TWO_THIRDS * fByLogDrive, fByAnode, fByScreen, out);
  }

  private static void write(
      double f, double gain, double fByAnode, double fByScreen, ElectrodeCurrents out) {
    int anode = ElectrodeCurrents.ANODE;
    int grid = ElectrodeCurrents.GRID;
    int screen = ElectrodeCurrents.SCREEN;
    double total = out.current(anode);
    double byAnode = out.slope(anode, anode);
    double byGrid = out.slope(anode, grid);
    double byScreen = out.slope(anode, screen);
    double ownByAnode = gain * byAnode + total * fByAnode;
    double ownByGrid = gain * byGrid;
    double ownByScreen = gain * byScreen + total * fByScreen;
    out.set(anode, total * f, ownByAnode, ownByGrid, ownByScreen);
    out.set(
        screen, total * (1 - f), byAnode - ownByAnode, byGrid - ownByGrid, byScreen - ownByScreen);
  }

  private static double rounded(double anode) {
    if (anode <= 0) {
      return 0;
    }
    return anode < ANODE_ROUNDING
        ? anode * anode / (2 * ANODE_ROUNDING)
        : anode - 0.5 * ANODE_ROUNDING;
  }

  private double fallen(double ratio) {
    return fallPower == 1 ? ratio : Math.pow(ratio, fallPower);
  }

  /** z^n; the usual powers without the general function, which is slow. */
  private double power(double z) {
    if (sharpness == 1.5) {
      return z * Math.sqrt(z);
    }
    return sharpness == 3 ? z * z * z : Math.pow(z, sharpness);
  }

  /** sum^(-1/n). */
  private double inverseRoot(double sum) {
    if (sharpness == 1.5) {
      double root = Math.cbrt(sum);
      return 1 / (root * root);
    }
    return sharpness == 3 ? 1 / Math.cbrt(sum) : Math.pow(sum, -1 / sharpness);
  }
}
