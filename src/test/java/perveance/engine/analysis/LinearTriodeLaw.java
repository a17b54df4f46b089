package perveance.engine.analysis;

import java.util.List;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.device.LawKind;
import perveance.engine.device.LawParameter;

/**
 * The linear valve of the hand formulas: Ia = (Va + mu Vg) / ra + I0, cut off below zero.
 *
 * @param mu amplification factor [1]
 * @param ra anode resistance [ohm]
 * @param rest current at zero volts [A]
 * @param gridScale grid current at zero grid voltage, zero for none [A]
 * @param thermal volts for a factor e of it [V]
 */
record LinearTriodeLaw(double mu, double ra, double rest, double gridScale, double thermal)
    implements DeviceLaw {
  @Override
  public LawKind kind() {
    return LawKind.TRIODE;
  }

  @Override
  public void evaluate(double anode, double grid, double screen, ElectrodeCurrents out) {
    out.clear();
    double current = (anode + mu * grid) / ra + rest;
    if (current > 0) {
      out.set(ElectrodeCurrents.ANODE, current, 1 / ra, mu / ra, 0);
    }
    if (gridScale > 0) {
      double exponent = Math.min(grid / thermal, 40);
      double flow = gridScale * Math.exp(exponent);
      out.set(ElectrodeCurrents.GRID, flow, 0, flow / thermal, 0);
    }
  }

  @Override
  public DeviceLaw specimen(double conduction, double contactShift) {
    return new LinearTriodeLaw(
        mu,
        ra / conduction,
        conduction * (rest + mu / ra * contactShift),
        gridScale * Math.exp(contactShift / thermal),
        thermal);
  }

  @Override
  public double gridCurrentOnset() {
    return gridScale > 0 ? thermal * Math.log(0.3e-6 / gridScale) : 0;
  }

  @Override
  public List<LawParameter> parameters() {
    return List.of(new LawParameter("mu", mu, "1", "amplification factor"));
  }
}
