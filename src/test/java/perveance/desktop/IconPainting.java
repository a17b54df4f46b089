package perveance.desktop;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Arc2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.RoundRectangle2D;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Path;
import javax.imageio.ImageIO;
import perveance.plot.Pictures;

/**
 * Paints the program's icon: a triode's envelope with anode, grid and cathode, and a load line
 * through it.
 *
 * <p>Argument: the file, {@code src/main/resources/perveance/desktop/perveance.png}.
 */
public final class IconPainting {
  private static final int SIZE = 256;

  private IconPainting() {}

  /**
   * Paints.
   *
   * @param args the file
   * @throws IOException when it cannot be written
   */
  public static void main(String[] args) throws IOException {
    BufferedImage image = new BufferedImage(SIZE, SIZE, BufferedImage.TYPE_INT_ARGB);
    Graphics2D g = image.createGraphics();
    Pictures.smooth(g);
    g.setColor(new Color(0x0a, 0x6b, 0x73));
    g.fill(new RoundRectangle2D.Double(8, 8, 240, 240, 56, 56));
    g.setColor(new Color(0x8f, 0xd3, 0xd8));
    g.setStroke(new BasicStroke(9, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND));
    g.draw(new Line2D.Double(34, 62, 222, 210));
    g.setColor(new Color(0x0a, 0x6b, 0x73));
    g.fill(new Ellipse2D.Double(58, 58, 140, 140));
    g.setColor(Color.WHITE);
    g.setStroke(new BasicStroke(11, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND));
    g.draw(new Ellipse2D.Double(58, 58, 140, 140));
    g.draw(new Line2D.Double(128, 26, 128, 94));
    g.draw(new Line2D.Double(94, 94, 162, 94));
    for (int i = 0; i < 3; i++) {
      g.draw(new Line2D.Double(86 + 34 * i, 128, 102 + 34 * i, 128));
    }
    g.draw(new Arc2D.Double(92, 156, 72, 44, 20, 140, Arc2D.OPEN));
    g.draw(new Line2D.Double(98, 168, 98, 230));
    g.dispose();
    ImageIO.write(image, "png", Path.of(args[0]).toFile());
  }
}
