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
    return of(CharacteristicsPlot.of(family, dissipation), true);
  }

  /**
   * A bitmap at twice the size.
   *
   * @param family characteristics
   * @param dissipation anode limit, empty for none [W]
   * @return PNG file
   */
  public static byte[] png(CurveFamily family, OptionalDouble dissipation) {
    return of(CharacteristicsPlot.of(family, dissipation), false);
  }

  /**
   * A picture of any description.
   *
   * @param plot what to draw
   * @param vector true for SVG, false for PNG
   * @return the file
   */
  public static byte[] of(PlotDescription plot, boolean vector) {
    Artwork artwork = Artwork.of(new ChartFactory(Look.LIGHT, new PlotFonts(), 12).titled(plot));
    return vector
        ? Pictures.svg(artwork, Look.LIGHT, WIDTH, HEIGHT)
        : Pictures.png(artwork, Look.LIGHT, WIDTH, HEIGHT, 2);
  }
}
