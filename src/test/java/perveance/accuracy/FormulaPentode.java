package perveance.accuracy;

import java.util.List;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.device.LawKind;
import perveance.engine.device.LawParameter;

/**
 * Pentodes after N. Koren, Glass Audio 8/5 and 8/6, 1996, with the parameter table of the author's
 * published errata: a second opinion. Slopes by central differences.
 *
 * <pre>{@code
 * E  = (Vg2/KP) ln(1 + exp(KP (1/mu + Vg/Vg2)))
 * Ia = 2 E^X / KG1 * arctan(Va/KVB),  Ig2 = (Vg + Vg2/mu)^(3/2) / KG2
 * }</pre>
 */
record FormulaPentode(double mu, double x, double kg1, double kg2, double kp, double kvb)
    implements DeviceLaw {
  private static final double STEP = 1e-3;

  static DeviceLaw koren(String type) {
    return switch (type) {
      case "EL34" -> new FormulaPentode(11, 1.35, 650, 4200, 60, 24);
      case "6L6GC" -> new FormulaPentode(8.7, 1.35, 1460, 4500, 48, 12);
      case "KT88" -> new FormulaPentode(8.8, 1.35, 730, 4200, 32, 16);
      case "6550" -> new FormulaPentode(7.9, 1.35, 890, 4200, 60, 24);
      default -> throw new IllegalArgumentException("no published parameters for " + type);
    };
  }

  private double anodeCurrent(double anode, double grid, double screen) {
    double e = screen / kp * Math.log1p(Math.exp(kp * (1 / mu + grid / screen)));
    return anode <= 0 ? 0 : 2 * Math.pow(e, x) / kg1 * Math.atan(anode / kvb);
  }

  private double screenCurrent(double grid, double screen) {
    return Math.pow(Math.max(0, grid + screen / mu), 1.5) / kg2;
  }

  @Override
  public LawKind kind() {
    return LawKind.PENTODE;
  }

  @Override
  public void evaluate(double anode, double grid, double screen, ElectrodeCurrents out) {
    out.clear();
    out.set(
        ElectrodeCurrents.ANODE,
        anodeCurrent(anode, grid, screen),
        (anodeCurrent(anode + STEP, grid, screen) - anodeCurrent(anode - STEP, grid, screen))
            / (2 * STEP),
        (anodeCurrent(anode, grid + STEP, screen) - anodeCurrent(anode, grid - STEP, screen))
            / (2 * STEP),
        (anodeCurrent(anode, grid, screen + STEP) - anodeCurrent(anode, grid, screen - STEP))
            / (2 * STEP));
    out.set(
        ElectrodeCurrents.SCREEN,
        screenCurrent(grid, screen),
        0,
        (screenCurrent(grid + STEP, screen) - screenCurrent(grid - STEP, screen)) / (2 * STEP),
        (screenCurrent(grid, screen + STEP) - screenCurrent(grid, screen - STEP)) / (2 * STEP));
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
