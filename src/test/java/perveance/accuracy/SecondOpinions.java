package perveance.accuracy;

import perveance.engine.device.DeviceLaw;

/**
 * Published phenomenological laws with their published parameters. They stand beside the project's
 * law to show how far a figure depends on the law.
 */
public final class SecondOpinions {
  private SecondOpinions() {}

  /**
   * N. L. Koren, Glass Audio 8/5 and 8/6, 1996, with the parameter table of the author's published
   * errata.
   */
  public static DeviceLaw koren(String type) {
    return switch (type) {
      case "12AX7" -> koren(100, 1.4, 1060, 600, 300);
      case "12AU7" -> koren(21.5, 1.3, 1180, 84, 300);
      case "12AT7" -> koren(60, 1.35, 460, 300, 300);
      case "6DJ8" -> koren(28, 1.3, 330, 320, 300);
      case "2A3" -> koren(4.2, 1.4, 1500, 60, 300);
      case "300B" -> koren(3.95, 1.4, 1550, 65, 300);
      default -> throw new IllegalArgumentException("no published parameters for " + type);
    };
  }

  private static DeviceLaw koren(double mu, double x, double kg1, double kp, double kvb) {
    return enhanced(mu, x, kg1, kp, kvb, 0);
  }

  /**
   * The same equation with a contact potential (I. Cohen and T. Helie, AES 129, 2010), with the
   * parameters of J. Najnudel, T. Helie, D. Roze and H. Boutin, IEEE/ACM TASLP 28, 2020, table II.
   */
  public static DeviceLaw najnudel(String type) {
    return switch (type) {
      case "6F5" -> enhanced(98, 1.6, 2614, 905, 1.87, 0.5);
      case "6C5" -> enhanced(20, 1.5, 2837, 138, 89, 0.8);
      case "2A3" -> enhanced(4.3, 1.5, 1685, 43, 102, -1.2);
      default -> throw new IllegalArgumentException("no published parameters for " + type);
    };
  }

  private static DeviceLaw enhanced(
      double mu, double x, double kg, double kp, double kvb, double contact) {
    return new FormulaTriode() {
      @Override
      protected double anodeCurrent(double anode, double grid) {
        double drive = kp * (1 / mu + (grid + contact) / Math.sqrt(kvb + anode * anode));
        double effective = anode / kp * softplus(drive);
        return effective > 0 ? 2 * Math.pow(effective, x) / kg : 0;
      }
    };
  }

  /**
   * K. Dempwolf and U. Zoelzer, DAFx-11, Paris 2011, equations 6 to 8 with table 1: three measured
   * 12AX7 (RSD-1, RSD-2, EHX-1).
   */
  public static DeviceLaw dempwolf(String specimen) {
    return switch (specimen) {
      case "RSD-1" ->
          dempwolf(new double[] {2.242e-3, 3.40, 103.2, 1.26, 6.177e-4, 9.901, 1.314, 8.025e-8});
      case "RSD-2" ->
          dempwolf(new double[] {2.173e-3, 3.19, 100.2, 1.28, 5.911e-4, 11.76, 1.358, 4.527e-8});
      case "EHX-1" ->
          dempwolf(new double[] {1.371e-3, 4.56, 86.9, 1.349, 3.263e-4, 11.99, 1.156, 3.917e-8});
      default -> throw new IllegalArgumentException("no published parameters for " + specimen);
    };
  }

  /** Parameters G, C, mu, gamma, Gg, Cg, xi, Ig0. */
  private static DeviceLaw dempwolf(double[] p) {
    return new FormulaTriode() {
      @Override
      protected double anodeCurrent(double anode, double grid) {
        double cathode = p[0] * Math.pow(softplus(p[1] * (anode / p[2] + grid)) / p[1], p[3]);
        return cathode - gridCurrent(grid);
      }

      @Override
      protected double gridCurrent(double grid) {
        return p[4] * Math.pow(softplus(p[5] * grid) / p[5], p[6]) + p[7];
      }
    };
  }

  private static double softplus(double x) {
    return x > 40 ? x : Math.log1p(Math.exp(x));
  }
}
