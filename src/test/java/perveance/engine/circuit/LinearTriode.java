package perveance.engine.circuit;

import java.util.List;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.device.LawKind;
import perveance.engine.device.LawParameter;

/**
 * The linear valve of the hand formulas: Ia = I0 + gm Vg + Va / ra, without cut-off and grid
 * current.
 *
 * @param mu amplification factor [1]
 * @param ra anode resistance [ohm]
 * @param rest current at zero volts [A]
 */
record LinearTriode(double mu, double ra, double rest) implements DeviceLaw {
  @Override
  public LawKind kind() {
    return LawKind.TRIODE;
  }

  @Override
  public void evaluate(double anode, double grid, double screen, ElectrodeCurrents out) {
    out.clear();
    double gm = mu / ra;
    out.set(ElectrodeCurrents.ANODE, rest + gm * grid + anode / ra, 1 / ra, gm, 0);
  }

  @Override
  public DeviceLaw specimen(double conduction, double contactShift) {
    return new LinearTriode(mu, ra / conduction, rest);
  }

  @Override
  public double gridCurrentOnset() {
    return Double.POSITIVE_INFINITY;
  }

  @Override
  public List<LawParameter> parameters() {
    return List.of(new LawParameter("mu", mu, "1", "amplification factor"));
  }
}
