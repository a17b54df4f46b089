package perveance.accuracy;

import java.util.List;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.device.LawKind;
import perveance.engine.device.LawParameter;

/**
 * A triode law given by formulas for its currents alone, for second opinions and exercises; slopes
 * by central differences.
 */
public abstract class FormulaTriode implements DeviceLaw {
  private static final double STEP = 1e-4;

  /** Anode current [A]. */
  protected abstract double anodeCurrent(double anode, double grid);

  /** Grid current [A]; none unless stated. */
  protected double gridCurrent(double grid) {
    return 0;
  }

  @Override
  public LawKind kind() {
    return LawKind.TRIODE;
  }

  @Override
  public void evaluate(double anode, double grid, double screen, ElectrodeCurrents out) {
    double byAnode =
        (anodeCurrent(anode + STEP, grid) - anodeCurrent(anode - STEP, grid)) / (2 * STEP);
    double byGrid =
        (anodeCurrent(anode, grid + STEP) - anodeCurrent(anode, grid - STEP)) / (2 * STEP);
    double gridSlope = (gridCurrent(grid + STEP) - gridCurrent(grid - STEP)) / (2 * STEP);
    out.clear();
    out.set(ElectrodeCurrents.ANODE, anodeCurrent(anode, grid), byAnode, byGrid, 0);
    out.set(ElectrodeCurrents.GRID, gridCurrent(grid), 0, gridSlope, 0);
  }

  @Override
  public DeviceLaw specimen(double conduction, double contactShift) {
    throw new UnsupportedOperationException("a formula for comparison only");
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
