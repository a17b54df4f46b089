package perveance.engine.analysis;

import java.util.List;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.device.LawKind;
import perveance.engine.device.LawParameter;

/**
 * The valve of back-of-envelope sums: anode current by the grid alone, linear and cut off below
 * zero; screen and grid currents that do not change.
 *
 * @param kind triode or pentode
 * @param rest anode current at zero grid voltage [A]
 * @param slope gm [S]
 * @param screen screen current [A]
 * @param grid grid current; negative for gas [A]
 */
record SimpleValve(LawKind kind, double rest, double slope, double screen, double grid)
    implements DeviceLaw {
  /** Slope of an anode that hardly counts [S]. */
  private static final double TRACE = 1e-14;

  static SimpleValve triode(double rest, double slope) {
    return new SimpleValve(LawKind.TRIODE, rest, slope, 0, 0);
  }

  @Override
  public void evaluate(double anode, double vg, double vg2, ElectrodeCurrents out) {
    out.clear();
    double current = rest + slope * vg + TRACE * anode;
    if (current > 0) {
      out.set(ElectrodeCurrents.ANODE, current, TRACE, slope, 0);
    }
    if (kind == LawKind.PENTODE) {
      out.set(ElectrodeCurrents.SCREEN, screen, 0, 0, 0);
    }
    out.set(ElectrodeCurrents.GRID, grid, 0, 0, 0);
  }

  @Override
  public DeviceLaw specimen(double conduction, double contactShift) {
    return this;
  }

  @Override
  public double gridCurrentOnset() {
    return 100;
  }

  @Override
  public List<LawParameter> parameters() {
    return List.of();
  }
}
