package perveance.engine.circuit;

import java.util.List;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.device.LawKind;
import perveance.engine.device.LawParameter;

/**
 * The linear pentode of the hand formulas: Ia = gm (Vg + Vg2 / mu) + Va / rp, Ig2 = share of the
 * same control, and a screen resistance of its own.
 *
 * @param gm anode current by grid voltage [S]
 * @param mu control grid against screen [1]
 * @param rp anode resistance [ohm]
 * @param screenConductance screen current by screen voltage [S]
 */
record LinearPentode(double gm, double mu, double rp, double screenConductance)
    implements DeviceLaw {
  @Override
  public LawKind kind() {
    return LawKind.PENTODE;
  }

  @Override
  public void evaluate(double anode, double grid, double screen, ElectrodeCurrents out) {
    out.clear();
    double control = gm * (grid + screen / mu);
    out.set(ElectrodeCurrents.ANODE, control + anode / rp, 1 / rp, gm, gm / mu);
    double byGrid = screenConductance * mu;
    out.set(
        ElectrodeCurrents.SCREEN,
        byGrid * grid + screenConductance * screen,
        0,
        byGrid,
        screenConductance);
  }

  @Override
  public DeviceLaw specimen(double conduction, double contactShift) {
    return new LinearPentode(gm * conduction, mu, rp, screenConductance);
  }

  @Override
  public double gridCurrentOnset() {
    return Double.POSITIVE_INFINITY;
  }

  @Override
  public List<LawParameter> parameters() {
    return List.of();
  }
}
