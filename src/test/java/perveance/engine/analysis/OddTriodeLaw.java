package perveance.engine.analysis;

import java.util.List;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.device.LawKind;
import perveance.engine.device.LawParameter;

/** Laws that no valve has, for findings that no valve's law leads to. */
enum OddTriodeLaw implements DeviceLaw {
  /** A triode whose grid never draws current: its anode falls until nothing is left. */
  WITHOUT_GRID_CURRENT {
    @Override
    public void evaluate(double anode, double grid, double screen, ElectrodeCurrents out) {
      out.clear();
      double drive = Math.max(0, grid + 0.6 + 0.01 * anode);
      double current = 1e-3 * Math.pow(drive, 1.5);
      double slope = 1.5e-3 * Math.sqrt(drive);
      double left = 1 - Math.exp(-Math.max(0, anode) / KNEE);
      double rest = anode > 0 ? current * Math.exp(-anode / KNEE) / KNEE : 0;
      out.set(ElectrodeCurrents.ANODE, current * left, 0.01 * slope * left + rest, slope * left, 0);
    }
  },
  /** A current that jumps where the anode passes 150 V: no load line meets it. */
  WITH_A_JUMP {
    @Override
    public void evaluate(double anode, double grid, double screen, ElectrodeCurrents out) {
      out.clear();
      out.set(ElectrodeCurrents.ANODE, anode > 150 ? 2e-3 : 0, 0, 0, 0);
    }
  };

  private static final double KNEE = 10;

  @Override
  public LawKind kind() {
    return LawKind.TRIODE;
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
