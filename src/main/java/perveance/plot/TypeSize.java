package perveance.plot;

import java.awt.geom.Rectangle2D;
import org.jspecify.annotations.Nullable;
import perveance.engine.stage.Drawing;

/**
 * Chooses how large the type of a drawing is: the smallest that can still be read in an area; where
 * the texts would then cover something, the largest with which they do not. The choice stands as
 * long as only figures change, so that a drag neither makes the type jump nor tries every size.
 */
final class TypeSize {
  /** Sizes that are tried when the usual one would be too small to read. */
  private static final double[] FACTORS = {1, 1.15, 1.3, 1.5, 1.7, 1.9, 2.2};

  private final SchematicPainter painter;
  private @Nullable Room last;
  private int chosen;
  private boolean clear;

  TypeSize(SchematicPainter painter) {
    this.painter = painter;
  }

  /**
   * Where a drawing has to find room.
   *
   * @param drawing geometry
   * @param area rectangle that it is to fit into
   * @param largest largest size of one grid unit, in units of the area [1]
   * @param readable size of type that is aimed at, in units of the area [1]
   */
  record Room(Drawing drawing, Rectangle2D area, double largest, double readable) {
    /** Whether the same type does for both; where the area lies makes no difference. */
    boolean isLike(Room other) {
      return area.getWidth() == other.area.getWidth()
          && area.getHeight() == other.area.getHeight()
          && largest == other.largest
          && readable == other.readable
          && drawing.equals(other.drawing);
    }
  }

  SchematicLayout layout(Room room, SchematicText text) {
    Room before = last;
    if (before != null && room.isLike(before)) {
      SchematicLayout again = painter.layout(room.drawing(), text, FACTORS[chosen]);
      if (again.isClear() || !clear) {
        return again;
      }
    }
    SchematicLayout best = choose(room, text);
    last = room;
    clear = best.isClear();
    return best;
  }

  private SchematicLayout choose(Room room, SchematicText text) {
    SchematicLayout best = painter.layout(room.drawing(), text, FACTORS[0]);
    chosen = 0;
    for (int i = 1; i < FACTORS.length && smallest(best, room) < room.readable(); i++) {
      SchematicLayout next = painter.layout(room.drawing(), text, FACTORS[i]);
      boolean larger = smallest(next, room) > smallest(best, room);
      if (larger && (next.isClear() || !best.isClear())) {
        best = next;
        chosen = i;
      }
    }
    return best;
  }

  private static double smallest(SchematicLayout layout, Room room) {
    return layout.smallest(room.area(), room.largest());
  }
}
