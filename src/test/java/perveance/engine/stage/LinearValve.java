package perveance.engine.stage;

import java.util.List;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.device.LawKind;
import perveance.engine.device.LawParameter;

/**
 * The linear valve of the hand formulas: Ia = I0 + gm (Vg + Vs / mus) + Va / ra and, where there is
 * a screen, Is = (Vs + mus Vg) / rs. It has neither cut-off nor grid current.
 *
 * @param kind with or without a screen
 * @param gm mutual conductance [S]
 * @param ra anode resistance [ohm]
 * @param screenMu amplification factor from grid to screen mus, infinite for a triode [1]
 * @param screenResistance resistance of the screen rs, infinite for a triode [ohm]
 * @param rest anode current at zero volts [A]
 */
record LinearValve(
    LawKind kind, double gm, double ra, double screenMu, double screenResistance, double rest)
    implements DeviceLaw {
  static LinearValve triode(double mu, double ra) {
    double none = Double.POSITIVE_INFINITY;
    return new LinearValve(LawKind.TRIODE, mu / ra, ra, none, none, 0);
  }

  static LinearValve pentode(double gm, double ra, double screenMu, double screenResistance) {
    return new LinearValve(LawKind.PENTODE, gm, ra, screenMu, screenResistance, 0);
  }

  @Override
  public void evaluate(double anode, double grid, double screen, ElectrodeCurrents out) {
    out.clear();
    boolean screened = kind == LawKind.PENTODE;
    double byScreen = screened ? gm / screenMu : 0;
    double current = rest + gm * grid + anode / ra + byScreen * screen;
    out.set(ElectrodeCurrents.ANODE, current, 1 / ra, gm, byScreen);
    if (screened) {
      double slope = 1 / screenResistance;
      double taken = slope * (screen + screenMu * grid);
      out.set(ElectrodeCurrents.SCREEN, taken, 0, slope * screenMu, slope);
    }
  }

  @Override
  public DeviceLaw specimen(double conduction, double contactShift) {
    return new LinearValve(
        kind,
        gm * conduction,
        ra / conduction,
        screenMu,
        screenResistance / conduction,
        rest * conduction);
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
