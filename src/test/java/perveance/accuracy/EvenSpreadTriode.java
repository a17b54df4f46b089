package perveance.accuracy;

import perveance.engine.device.DeviceLaw;

/**
 * The law as it was before the spread tapered and the cathode had a spread of its own: D evenly
 * spread over D0 (1 - s) to D0 (1 + s). Kept to show what the change does at low current.
 *
 * <p>The constants are those of the same evidence with the same weights and class values as the
 * library's, fitted once.
 */
final class EvenSpreadTriode extends FormulaTriode {
  private final double perveance;
  private final double contact;
  private final double penetration;
  private final double spread;

  private EvenSpreadTriode(double perveance, double contact, double mu, double spread) {
    this.perveance = perveance;
    this.contact = contact;
    this.penetration = 1 / mu;
    this.spread = spread;
  }

  static DeviceLaw of(String type) {
    return switch (type) {
      case "12AX7" -> new EvenSpreadTriode(1.0602e-3, 0.625, 102.40, 0.212);
      case "6SL7GT" -> new EvenSpreadTriode(6.8574e-4, 0.692, 70.87, 0.176);
      default -> throw new IllegalArgumentException("not kept: " + type);
    };
  }

  @Override
  protected double anodeCurrent(double anode, double grid) {
    if (anode <= 0) {
      return 0;
    }
    double lower = Math.max(0, grid + contact + anode * penetration * (1 - spread));
    double upper = Math.max(0, grid + contact + anode * penetration * (1 + spread));
    double width = 2 * spread * penetration * anode;
    double refused = Math.pow(1 + Math.pow(anode / 3, 2), -2);
    return perveance * 0.4 * (Math.pow(upper, 2.5) - Math.pow(lower, 2.5)) / width * (1 - refused);
  }
}
