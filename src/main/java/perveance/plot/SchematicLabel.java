package perveance.plot;

import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * A block of text that belongs to a symbol or a node, and where it may stand.
 *
 * @param name element or node; empty for text that cannot be pointed at
 * @param node true when the name is a node's
 * @param body what the text belongs to, empty when it stands for itself
 * @param places where it may stand, the best first; at least one
 */
record SchematicLabel(
    String name, boolean node, Optional<Rectangle2D> body, List<SchematicLabel.Place> places) {
  /** What a line of text is drawn in. */
  enum Ink {
    VALUE,
    DETAIL,
    NODE,
    WARNING
  }

  /**
   * One line of text.
   *
   * @param text the words
   * @param ink how it is drawn
   * @param size of the type in grid units [1]
   * @param width in grid units [1]
   */
  record Line(String text, Ink ink, double size, double width) {}

  /**
   * A place for the text.
   *
   * @param box what it fills, in grid units
   * @param align 0 for lines that begin together, 1 for lines that end together [1]
   * @param lines from the top
   */
  record Place(Rectangle2D box, double align, List<Line> lines) {}

  /**
   * Lines with the room that they need together.
   *
   * @param lines from the top
   * @param width in grid units [1]
   * @param height in grid units [1]
   */
  record Block(List<Line> lines, double width, double height) {
    private static final double ASCENT = 0.76;
    private static final double LEADING = 1.08;
    private static final double DESCENT = 0.22;

    static Block of(List<Line> lines) {
      double width = lines.stream().mapToDouble(Line::width).max().orElse(0);
      double height = 0;
      for (int i = 0; i < lines.size(); i++) {
        height += (i == 0 ? ASCENT : LEADING) * lines.get(i).size();
      }
      return new Block(lines, width, height + DESCENT * lines.get(lines.size() - 1).size());
    }

    /** Heights of the baselines beneath the top of the block, in grid units. */
    List<Double> baselines() {
      List<Double> all = new ArrayList<>();
      double y = 0;
      for (int i = 0; i < lines.size(); i++) {
        y += (i == 0 ? ASCENT : LEADING) * lines.get(i).size();
        all.add(y);
      }
      return all;
    }

    Place at(double left, double top, double align) {
      return new Place(new Rectangle2D.Double(left, top, width, height), align, lines);
    }

    Place rightOf(double x, double y) {
      return at(x, y - height / 2, 0);
    }

    Place leftOf(double x, double y) {
      return at(x - width, y - height / 2, 1);
    }

    Place above(double x, double y) {
      return at(x - width / 2, y - height, 0.5);
    }

    Place below(double x, double y) {
      return at(x - width / 2, y, 0.5);
    }
  }
}
