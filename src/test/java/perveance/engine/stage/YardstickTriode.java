package perveance.engine.stage;

import java.util.List;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.device.LawKind;
import perveance.engine.device.LawParameter;

/**
 * The plain three-halves law through one published point with which the expected answers of the
 * bench questions were worked out: Ia = K (Va / mu + Vg + E0)^1.5 mA, without grid current.
 *
 * @param mu amplification factor [1]
 * @param offset E0 [V]
 * @param factor K [mA V^-1.5]
 */
record YardstickTriode(double mu, double offset, double factor) implements DeviceLaw {
  static final YardstickTriode T12AX7 = new YardstickTriode(100, 0.625, 1.006);
  static final YardstickTriode T12AU7 = new YardstickTriode(17, 0.953, 0.548);
  static final YardstickTriode T6SN7 = new YardstickTriode(20, 0.692, 0.761);

  @Override
  public LawKind kind() {
    return LawKind.TRIODE;
  }

  @Override
  public void evaluate(double anode, double grid, double screen, ElectrodeCurrents out) {
    out.clear();
    double u = Math.max(0, anode / mu + grid + offset);
    double slope = 1.5e-3 * factor * Math.sqrt(u);
    out.set(ElectrodeCurrents.ANODE, 1e-3 * factor * u * Math.sqrt(u), slope / mu, slope, 0);
  }

  @Override
  public DeviceLaw specimen(double conduction, double contactShift) {
    return new YardstickTriode(mu, offset + contactShift, factor * conduction);
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
