package perveance.plot;

import java.awt.geom.Rectangle2D;

/**
 * Where a part or a node was drawn, in grid units: what a window needs to answer a click.
 *
 * @param name element name of a part or name of a node
 * @param node true for a node
 * @param x left [1]
 * @param y top [1]
 * @param width [1]
 * @param height [1]
 */
public record Hotspot(String name, boolean node, double x, double y, double width, double height) {
  /**
   * Whether a point lies inside.
   *
   * @param px [1]
   * @param py [1]
   * @return true when inside
   */
  public boolean contains(double px, double py) {
    return px >= x && py >= y && px <= x + width && py <= y + height;
  }

  static Hotspot of(String name, Rectangle2D box) {
    return new Hotspot(name, false, box.getX(), box.getY(), box.getWidth(), box.getHeight());
  }

  /** The same in the units of an area into which the drawing is put. */
  Hotspot scaled(double left, double top, double scale) {
    return new Hotspot(
        name, node, left + scale * x, top + scale * y, scale * width, scale * height);
  }
}
