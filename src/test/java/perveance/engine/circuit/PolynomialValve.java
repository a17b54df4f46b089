package perveance.engine.circuit;

import java.util.List;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.device.LawKind;
import perveance.engine.device.LawParameter;

/**
 * A valve whose anode current is a polynomial of the grid voltage alone, for harmonics that are
 * known exactly.
 *
 * @param coefficients of rising powers of Vg [A], [A/V], [A/V^2] ...
 */
record PolynomialValve(List<Double> coefficients) implements DeviceLaw {
  @Override
  public LawKind kind() {
    return LawKind.TRIODE;
  }

  @Override
  public void evaluate(double anode, double grid, double screen, ElectrodeCurrents out) {
    double value = 0;
    double slope = 0;
    for (int n = coefficients.size() - 1; n >= 0; n--) {
      slope = slope * grid + value;
      value = value * grid + coefficients.get(n);
    }
    out.clear();
    out.set(ElectrodeCurrents.ANODE, value, 0, slope, 0);
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
    return List.of();
  }
}
