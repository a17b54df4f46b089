package perveance.plot;

import java.awt.geom.Rectangle2D;
import java.util.List;
import perveance.engine.stage.Drawing;

/**
 * A drawing with all its texts in their places.
 *
 * @param drawing geometry
 * @param text words and figures
 * @param labels the texts
 * @param placed where each of them stands
 * @param factor size of the type, 1 for the usual [1]
 * @param extent what all of it fills, with a small margin, in grid units
 */
record SchematicLayout(
    Drawing drawing,
    SchematicText text,
    List<SchematicLabel> labels,
    LabelPlacement.Placed placed,
    double factor,
    Rectangle2D extent) {
  private static final double SMALLEST_TYPE = 0.95;

  /** How many units of an area one grid unit takes when the drawing fills it. */
  double scale(Rectangle2D area, double largest) {
    return Math.min(
        largest,
        Math.min(area.getWidth() / extent.getWidth(), area.getHeight() / extent.getHeight()));
  }

  /** Size of the smallest type in an area. */
  double smallest(Rectangle2D area, double largest) {
    return SMALLEST_TYPE * factor * scale(area, largest);
  }

  boolean isClear() {
    return placed.collision() <= 0;
  }
}
