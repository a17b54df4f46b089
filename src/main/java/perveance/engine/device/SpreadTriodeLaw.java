package perveance.engine.device;

import java.util.List;

/**
 * Triode with a spread penetration factor: the project's triode law.
 *
 * <p>What it predicts: anode and grid current of a triode and their partial derivatives, from
 * cut-off to positive grid voltages, so that mu falls towards cut-off as that of a real valve does.
 *
 * <pre>{@code
 * Ik = space charge behind a spread grid, see SpreadCathode
 * Ia = Ik (1 - r),   r = 1 / (1 + (Va / Vt)^2)^2 for Va > 0, else 1
 * Ig = Ig0 + Ik r o,  Ig0 and the openness o: see GridCurrent
 * }</pre>
 *
 * <p>r says which part of the electrons that pass the grid turns back: at a low anode voltage they
 * form a virtual cathode between grid and anode and turn back (C. E. Fay, A. L. Samuel and W.
 * Shockley, Bell System Tech. J. 17, 49, 1938). They return to the cathode while the grid is
 * negative and end on the grid when it is positive. Vt is small against any working anode voltage.
 *
 * <p>A small part of the cathode may lie behind loose places of the grid, its ends and the gaps
 * beside its supports: there the same holds with a larger penetration factor, and a little current
 * flows long after the rest is cut off.
 *
 * <p>Validity: the region that the device's evidence covers ({@link Validity}). Outside it the law
 * still follows the three-halves law but nobody has checked it there. Emission is unlimited.
 * Voltages beyond one megavolt are taken as one megavolt.
 */
public final class SpreadTriodeLaw implements DeviceLaw {
  /** Name of the law in device files. */
  public static final String NAME = "spread-triode";

  private static final double HIGHEST_VOLTAGE = 1e6;

  private final SpreadTriodeParameters parameters;
  private final SpreadCathode cathode;
  private final SpreadCathode remote;
  private final boolean loose;
  private final GridCurrent gridCurrent;
  private final double turnBackSquared;
  private final double inverseTurnBackSquared;

  /**
   * A law with these constants.
   *
   * @param parameters the constants
   */
  public SpreadTriodeLaw(SpreadTriodeParameters parameters) {
    this.parameters = parameters;
    this.cathode = part(parameters, 1 - parameters.remoteShare(), 1);
    this.remote = part(parameters, parameters.remoteShare(), parameters.remotePenetration());
    this.loose = parameters.remoteShare() > 0;
    this.gridCurrent =
        new GridCurrent(
            parameters.gridPerveance(), parameters.gridOnset(), parameters.thermalVoltage());
    this.turnBackSquared = parameters.turnBack() * parameters.turnBack();
    this.inverseTurnBackSquared = 1 / turnBackSquared;
  }

  private static SpreadCathode part(SpreadTriodeParameters p, double share, double ratio) {
    return new SpreadCathode(
        share * p.perveance(),
        p.contactPotential(),
        ratio * p.penetration(),
        p.spread(),
        p.cathodeSpread());
  }

  /**
   * The constants.
   *
   * @return the constants of this law
   */
  public SpreadTriodeParameters constants() {
    return parameters;
  }

  @Override
  public LawKind kind() {
    return LawKind.TRIODE;
  }

  @Override
  public void evaluate(double anode, double grid, double screen, ElectrodeCurrents out) {
    if (Double.isNaN(anode) || Double.isNaN(grid)) {
      throw new IllegalArgumentException("voltage is NaN: anode " + anode + ", grid " + grid);
    }
    double va = bounded(anode);
    double vg = bounded(grid);
    cathode.evaluate(vg, va, out);
    double emitted = out.current(ElectrodeCurrents.ANODE);
    double byAnode = out.slope(ElectrodeCurrents.ANODE, ElectrodeCurrents.ANODE);
    double byGrid = out.slope(ElectrodeCurrents.ANODE, ElectrodeCurrents.GRID);
    if (loose) {
      remote.evaluate(vg, va, out);
      emitted += out.current(ElectrodeCurrents.ANODE);
      byAnode += out.slope(ElectrodeCurrents.ANODE, ElectrodeCurrents.ANODE);
      byGrid += out.slope(ElectrodeCurrents.ANODE, ElectrodeCurrents.GRID);
    }
    double turned = emitted;
    double turnedByAnode = byAnode;
    double turnedByGrid = byGrid;
    if (va > 0) {
      double root = turnBackSquared / (turnBackSquared + va * va);
      double refused = root * root;
      turned *= refused;
      turnedByGrid *= refused;
      turnedByAnode = byAnode * refused - 4 * va * inverseTurnBackSquared * root * turned;
    }
    out.set(
        ElectrodeCurrents.ANODE,
        emitted - turned,
        byAnode - turnedByAnode,
        byGrid - turnedByGrid,
        0);
    gridCurrent.evaluate(vg, turned, turnedByAnode, turnedByGrid, out);
    out.set(ElectrodeCurrents.SCREEN, 0, 0, 0, 0);
  }

  /** Branches that are never taken in practice cost less here than Math.max and Math.min. */
  private static double bounded(double voltage) {
    if (voltage > HIGHEST_VOLTAGE) {
      return HIGHEST_VOLTAGE;
    }
    return voltage < -HIGHEST_VOLTAGE ? -HIGHEST_VOLTAGE : voltage;
  }

  @Override
  public DeviceLaw specimen(double conduction, double contactShift) {
    return new SpreadTriodeLaw(
        new SpreadTriodeParameters(
            parameters.perveance() * conduction,
            parameters.contactPotential() + contactShift,
            parameters.penetration(),
            parameters.spread(),
            parameters.cathodeSpread(),
            parameters.remoteShare(),
            parameters.remotePenetration(),
            parameters.turnBack(),
            parameters.gridPerveance() * conduction,
            parameters.gridOnset() - contactShift,
            parameters.thermalVoltage()));
  }

  @Override
  public double gridCurrentOnset() {
    return parameters.gridOnset();
  }

  @Override
  public List<LawParameter> parameters() {
    return parameters.list();
  }
}
