package perveance.engine.circuit;

import java.util.List;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.device.LawKind;
import perveance.engine.device.LawParameter;

/**
 * A small law for tests of the engine: Ia = G max(0, Vg + Vc + Va / mu)^1.5 and, in the retarding
 * region, Ig = I00 exp(min(Vg, 0) / VT), going on as a straight line above zero.
 *
 * @param perveance G [A V^-1.5]
 * @param mu amplification factor [1]
 * @param contact Vc [V]
 * @param gridAtZero I00, zero for none [A]
 * @param thermal VT [V]
 */
record ThreeHalvesTriode(
    double perveance, double mu, double contact, double gridAtZero, double thermal)
    implements DeviceLaw {
  @Override
  public LawKind kind() {
    return LawKind.TRIODE;
  }

  @Override
  public void evaluate(double anode, double grid, double screen, ElectrodeCurrents out) {
    out.clear();
    double u = Math.max(0, grid + contact + anode / mu);
    double root = Math.sqrt(u);
    double slope = 1.5 * perveance * root;
    out.set(ElectrodeCurrents.ANODE, perveance * u * root, slope / mu, slope, 0);
    double ig = gridAtZero * Math.exp(Math.min(grid, 0) / thermal);
    double gg = ig / thermal;
    out.set(ElectrodeCurrents.GRID, ig + gg * Math.max(grid, 0), 0, gg, 0);
  }

  @Override
  public DeviceLaw specimen(double conduction, double contactShift) {
    return new ThreeHalvesTriode(
        perveance * conduction, mu, contact + contactShift, gridAtZero, thermal);
  }

  @Override
  public double gridCurrentOnset() {
    return thermal * Math.log(0.3e-6 / gridAtZero);
  }

  @Override
  public List<LawParameter> parameters() {
    return List.of(new LawParameter("perveance", perveance, "A V^-1.5", "perveance"));
  }
}
