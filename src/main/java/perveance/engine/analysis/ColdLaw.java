package perveance.engine.analysis;

import static perveance.engine.device.ElectrodeCurrents.ANODE;
import static perveance.engine.device.ElectrodeCurrents.SCREEN;

import java.util.List;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.device.LawKind;
import perveance.engine.device.LawParameter;

/**
 * A valve whose cathode is cold: no current but the leakage that settles what hangs between two
 * cold valves.
 *
 * @param kind kind of the law it stands for
 */
record ColdLaw(LawKind kind) implements DeviceLaw {
  /** Far below the leakage of any socket [S]. */
  private static final double LEAKAGE = 1e-12;

  @Override
  public void evaluate(double anode, double grid, double screen, ElectrodeCurrents out) {
    out.clear();
    out.set(ANODE, LEAKAGE * anode, LEAKAGE, 0, 0);
    if (kind == LawKind.PENTODE) {
      out.set(SCREEN, LEAKAGE * screen, 0, 0, LEAKAGE);
    }
  }

  @Override
  public DeviceLaw specimen(double conduction, double contactShift) {
    return this;
  }

  @Override
  public double gridCurrentOnset() {
    return Double.POSITIVE_INFINITY;
  }

  @Override
  public List<LawParameter> parameters() {
    return List.of(
        new LawParameter("leakage", LEAKAGE, "S", "conductance from anode to cathode when cold"));
  }
}
