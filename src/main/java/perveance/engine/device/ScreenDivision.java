package perveance.engine.device;

import perveance.engine.numeric.CubeRoot;

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
 * A  = 1 + b (1 - x) / (x + x0),  x = Va/Vg2              falls as the anode is raised
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

  private static final double TWO_THIRDS = 2.0 / 3.0;

  private final double share;
  private final double fallPart;
  private final double fallOffset;
  private final double inverseBeamWidth;
  private final double kneePerDrive;
  private final double sharpness;

  ScreenDivision(SpreadPentodeParameters p) {
    this.share = p.screenShare();
    this.fallPart = p.shareFall();
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
    double aSlope = anode >= ANODE_ROUNDING ? 1 : anode > 0 ? anode / ANODE_ROUNDING : 0;
    // bent to 1 / (2 - Vg2) below one volt, so that it stays positive
    double inverseScreen = 1 / (screen >= 1 ? screen : 1 / (2 - screen));
    double g2Slope = screen >= 1 ? 1 : 1 / (inverseScreen * inverseScreen);

    double x = a * inverseScreen;
    double inverseBelow = 1 / (x + fallOffset);
    double beam = 1;
    double beamByLog = 0;
    if (inverseBeamWidth > 0) {
      double ratio = drive * inverseBeamWidth * inverseScreen;
      double tail = Math.exp(-ratio * ratio);
      beam = 1 - tail;
      beamByLog = 2 * ratio * ratio * tail;
    }
    double fall = share * (1 + fallPart * (1 - x) * inverseBelow);
    double q = fall * beam;
    double qByLogDrive = fall * beamByLog;
    double qByX = -share * fallPart * (1 + fallOffset) * inverseBelow * inverseBelow * beam;
    double qByAnode = qByX * inverseScreen;
    double qByScreen = -(qByX * x + qByLogDrive) * inverseScreen;

    double inverseKnee = 1 / (kneePerDrive * drive + KNEE_AT_NO_CURRENT);
    double z = a * inverseKnee;
    double sum = 1 + power(z);
    double slope = inverseRoot(sum);
    double h = z * slope;
    double hByAnode = slope * inverseKnee / sum;
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
      double root = CubeRoot.of(sum);
      return 1 / (root * root);
    }
    return sharpness == 3 ? 1 / CubeRoot.of(sum) : Math.pow(sum, -1 / sharpness);
  }
}
