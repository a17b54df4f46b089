package perveance.engine.stage;

import java.util.List;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.device.LawKind;
import perveance.engine.device.LawParameter;

/**
 * The linear valve of the hand formulas, with a screen if it has one: Ia = I0 + gm Vg + gs Vs + Va
 * / ra, Is = share of it by gs, without cut-off and grid current.
 *
 * @param kind with or without a screen
 * @param gm mutual conductance [S]
 * @param ra anode resistance [ohm]
 * @param screenGm conductance from the screen to the anode, zero for a triode [S]
 * @param screenSlope conductance of the screen itself, zero for a triode [S]
 * @param rest anode current at zero volts [A]
 */
record LinearValve(
    LawKind kind, double gm, double ra, double screenGm, double screenSlope, double rest)
    implements DeviceLaw {
  static LinearValve triode(double mu, double ra) {
    return new LinearValve(LawKind.TRIODE, mu / ra, ra, 0, 0, 0);
  }

  @Override
  public void evaluate(double anode, double grid, double screen, ElectrodeCurrents out) {
    out.clear();
    double current = rest + gm * grid + anode / ra + screenGm * screen;
    out.set(ElectrodeCurrents.ANODE, current, 1 / ra, gm, screenGm);
    out.set(ElectrodeCurrents.SCREEN, screenSlope * screen, 0, 0, screenSlope);
  }

  @Override
  public DeviceLaw specimen(double conduction, double contactShift) {
    return new LinearValve(kind, gm * conduction, ra / conduction, screenGm, screenSlope, rest);
  }

  @Override
  public double gridCurrentOnset() {
    return Double.POSITIVE_INFINITY;
  }

  @Override
  public List<LawParameter> parameters() {
    return List.of(new LawParameter("gm", gm, "S", "mutual conductance"));
  }
}
