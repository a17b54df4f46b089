package perveance.plot;

import java.util.OptionalDouble;
import perveance.engine.device.CurveFamily;

/** Pictures of a curve family for files. */
public final class CurvePictures {
  private static final int WIDTH = 900;
  private static final int HEIGHT = 640;

  private CurvePictures() {}

  /**
   * A vector picture.
   *
   * @param family characteristics
   * @param dissipation anode limit, empty for none [W]
   * @return SVG file
   */
  public static byte[] svg(CurveFamily family, OptionalDouble dissipation) {
    return Pictures.svg(artwork(family, dissipation), Look.LIGHT, WIDTH, HEIGHT);
  }

  /**
   * A bitmap at twice the size.
   *
   * @param family characteristics
   * @param dissipation anode limit, empty for none [W]
   * @return PNG file
   */
  public static byte[] png(CurveFamily family, OptionalDouble dissipation) {
    return Pictures.png(artwork(family, dissipation), Look.LIGHT, WIDTH, HEIGHT, 2);
  }

  private static Artwork artwork(CurveFamily family, OptionalDouble dissipation) {
    return Artwork.of(
        new ChartFactory(Look.LIGHT, new PlotFonts(), 12)
            .chart(CharacteristicsPlot.of(family, dissipation)));
  }
}
