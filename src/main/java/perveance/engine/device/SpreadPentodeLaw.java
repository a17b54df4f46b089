package perveance.engine.device;

import java.util.List;
import perveance.engine.numeric.CubeRoot;

/**
 * Pentodes and beam tetrodes.
 *
 * <p>What it predicts: the currents of anode, grid and screen. The cathode current follows the
 * spread three-halves law ({@link SpreadCathode}) of the control grid and the pull of the screen
 * with a small part of the anode voltage,
 *
 * <pre>{@code Ik = G mean((Vg + Vc + D (Vg2 + L Va))^(3/2)),  D spread about D0}</pre>
 *
 * <p>A remote cut-off grid is wound with wider turns on a part of its length: that part of the
 * cathode follows the same law with a larger D and keeps conducting when the rest is cut off. The
 * cathode current divides between anode and screen by a knee that moves with current ({@link
 * ScreenDivision}). Screen and anode tied give the triode connection, a screen on a tap of the
 * anode's winding the distributed screen: both are the same law with the screen voltage set by the
 * circuit. Grid current ({@link GridCurrent}) is added to the cathode's.
 *
 * <p>Range: the evidence of a device file, mostly screen and anode above 50 V and current from a
 * tenth of the maximum. Source: three-halves law of Child and Langmuir with the penetration factor
 * of H. Barkhausen (Elektronenroehren, 1923); the combination is ours. Outside the range the law
 * stays finite and continuous: no anode current at or below zero anode voltage, no current below
 * cut-off, joints (slope continuous, curvature not) at cut-off and at zero pull. Voltages beyond
 * one megavolt are taken as one megavolt.
 */
public final class SpreadPentodeLaw implements DeviceLaw {
  /** Name of the law in device files. */
  public static final String NAME = "spread-pentode";

  private static final double HIGHEST_VOLTAGE = 1e6;

  private final SpreadPentodeParameters values;
  private final SpreadCathode cathode;
  private final SpreadCathode remote;
  private final ScreenDivision division;
  private final GridCurrent gridCurrent;
  private final double inversePerveance;

  /**
   * Makes the law.
   *
   * @param values its constants
   */
  public SpreadPentodeLaw(SpreadPentodeParameters values) {
    this.values = values;
    this.cathode = part(values, 1 - values.remoteShare(), 1);
    this.remote = part(values, values.remoteShare(), values.remotePenetration());
    this.inversePerveance = 1 / values.perveance();
    this.division = new ScreenDivision(values);
    this.gridCurrent =
        new GridCurrent(values.gridPerveance(), values.gridOnset(), values.thermalVoltage());
  }

  private static SpreadCathode part(SpreadPentodeParameters v, double share, double ratio) {
    return new SpreadCathode(
        share * v.perveance(),
        v.contactPotential(),
        ratio * v.penetration(),
        v.spread(),
        v.cathodeSpread());
  }

  /**
   * The law's constants.
   *
   * @return constants
   */
  public SpreadPentodeParameters values() {
    return values;
  }

  @Override
  public LawKind kind() {
    return LawKind.PENTODE;
  }

  @Override
  public void evaluate(double anode, double grid, double screen, ElectrodeCurrents out) {
    if (Double.isNaN(anode + grid + screen)) {
      throw new IllegalArgumentException(
          "voltage is not a number: anode " + anode + ", grid " + grid + ", screen " + screen);
    }
    double va = bounded(anode);
    double vg = bounded(grid);
    double vg2 = bounded(screen);
    double influence = values.anodeInfluence();
    double pull = vg2 + influence * va;
    cathode.evaluate(vg, pull, out);
    double total = out.current(ElectrodeCurrents.ANODE);
    double byPull = out.slope(ElectrodeCurrents.ANODE, ElectrodeCurrents.ANODE);
    double byGrid = out.slope(ElectrodeCurrents.ANODE, ElectrodeCurrents.GRID);
    if (values.remoteShare() > 0) {
      remote.evaluate(vg, pull, out);
      total += out.current(ElectrodeCurrents.ANODE);
      byPull += out.slope(ElectrodeCurrents.ANODE, ElectrodeCurrents.ANODE);
      byGrid += out.slope(ElectrodeCurrents.ANODE, ElectrodeCurrents.GRID);
    }
    if (total > 0) {
      out.set(ElectrodeCurrents.ANODE, total, influence * byPull, byGrid, byPull);
      double root = CubeRoot.of(total * inversePerveance);
      division.divide(root * root, va, vg2, out);
    } else {
      out.clear();
    }
    gridCurrent.evaluate(vg, 0, 0, 0, out);
  }

  private static double bounded(double voltage) {
    // two comparisons that are never true cost less than the general minimum and maximum
    if (voltage > HIGHEST_VOLTAGE) {
      return HIGHEST_VOLTAGE;
    }
    return voltage < -HIGHEST_VOLTAGE ? -HIGHEST_VOLTAGE : voltage;
  }

  @Override
  public SpreadPentodeLaw specimen(double conduction, double contactShift) {
    SpreadPentodeParameters v = values;
    return new SpreadPentodeLaw(
        new SpreadPentodeParameters(
            v.perveance() * conduction,
            v.contactPotential() + contactShift,
            v.penetration(),
            v.spread(),
            v.cathodeSpread(),
            v.remoteShare(),
            v.remotePenetration(),
            v.anodeInfluence(),
            v.screenShare(),
            v.shareFall(),
            v.shareOffset(),
            v.beamWidth(),
            v.knee(),
            v.kneeSharpness(),
            v.gridPerveance() * conduction,
            v.gridOnset() - contactShift,
            v.thermalVoltage()));
  }

  @Override
  public double gridCurrentOnset() {
    return values.gridOnset();
  }

  @Override
  public List<LawParameter> parameters() {
    return values.list();
  }
}
