package perveance.engine.stage;

import java.util.List;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.device.LawKind;
import perveance.engine.device.LawParameter;

/**
 * A pentode that takes fixed currents whatever its voltages, for questions that are Ohm's law.
 *
 * @param anode anode current [A]
 * @param screen screen current [A]
 */
record FixedPentode(double anode, double screen) implements DeviceLaw {
  /** So small that no figure shows it; without it nothing would fix the electrodes [S]. */
  private static final double TRACE = 1e-15;

  @Override
  public LawKind kind() {
    return LawKind.PENTODE;
  }

  @Override
  public void evaluate(double va, double vg, double vs, ElectrodeCurrents out) {
    out.clear();
    out.set(ElectrodeCurrents.ANODE, anode + TRACE * va, TRACE, 0, 0);
    out.set(ElectrodeCurrents.SCREEN, screen + TRACE * vs, 0, 0, TRACE);
  }

  @Override
  public DeviceLaw specimen(double conduction, double contactShift) {
    return new FixedPentode(conduction * anode, conduction * screen);
  }

  @Override
  public double gridCurrentOnset() {
    return Double.POSITIVE_INFINITY;
  }

  @Override
  public List<LawParameter> parameters() {
    return List.of(new LawParameter("anode", anode, "A", "anode current"));
  }
}
