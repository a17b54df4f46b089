package perveance.engine.stage;

import java.util.List;
import perveance.engine.stage.Drawing.NodeMark;
import perveance.engine.stage.Drawing.Side;
import perveance.engine.stage.Drawing.Symbol;

/**
 * Where a symbol's terminals are and how much room it and its text take, in grid units. The layout,
 * its tests and every painter read it from here.
 */
public final class SymbolShape {
  /** Room for one text: a bold value and a second line below it, eight units wide, two high. */
  public static final int LABEL_WIDTH = 8;

  /** Height of the room for one text. */
  public static final int LABEL_HEIGHT = 2;

  private SymbolShape() {}

  /**
   * A grid point.
   *
   * @param x to the right
   * @param y down
   */
  public record Point(int x, int y) {}

  /**
   * A rectangle on the grid.
   *
   * @param left edge
   * @param top edge
   * @param right edge
   * @param bottom edge
   */
  public record Box(int left, int top, int right, int bottom) {
    /**
     * Whether two rectangles share more than an edge.
     *
     * @param other the other rectangle
     * @return true when they overlap
     */
    public boolean overlaps(Box other) {
      return left < other.right && other.left < right && top < other.bottom && other.top < bottom;
    }
  }

  /**
   * The terminals of a symbol. Two-terminal symbols: top or left first; for junctions the anode,
   * for a current source where the current enters. Valves: anode, grid, cathode, and for a pentode
   * the screen. A transformer: primary top and bottom, primary tap, secondary top and bottom. With
   * a centre tap: primary top, centre, bottom, upper and lower screen tap, secondary top and
   * bottom.
   *
   * @param symbol the symbol
   * @return its terminals in that order
   */
  public static List<Point> terminals(Symbol symbol) {
    int x = symbol.x();
    int y = symbol.y();
    return switch (symbol.type()) {
      case RESISTOR, CAPACITOR, ELECTROLYTIC, INDUCTOR, DIODE, ZENER, LED, CURRENT_SOURCE ->
          symbol.turned()
              ? List.of(new Point(x - 2, y), new Point(x + 2, y))
              : List.of(new Point(x, y - 2), new Point(x, y + 2));
      case TRIODE, DIRECTLY_HEATED_TRIODE ->
          List.of(new Point(x, y - 4), new Point(grid(symbol), y), new Point(x, y + 4));
      case PENTODE, BEAM_TETRODE ->
          List.of(
              new Point(x, y - 4),
              new Point(grid(symbol), y),
              new Point(x, y + 4),
              new Point(2 * x - grid(symbol), y));
      case TRANSFORMER ->
          List.of(
              new Point(x - 2, y - 4),
              new Point(x - 2, y + 4),
              new Point(x - 2, y),
              new Point(x + 2, y - 2),
              new Point(x + 2, y + 2));
      case CENTRE_TAPPED_TRANSFORMER ->
          List.of(
              new Point(x - 2, y - 8),
              new Point(x - 2, y),
              new Point(x - 2, y + 8),
              new Point(x - 2, y - 4),
              new Point(x - 2, y + 4),
              new Point(x + 2, y - 2),
              new Point(x + 2, y + 2));
      case GROUND, SUPPLY, BIAS, INPUT, OUTPUT, DOT -> List.of(new Point(x, y));
    };
  }

  /**
   * The terminals that are taps of a winding.
   *
   * @param symbol the symbol
   * @return taps for a screen, empty for all but transformers
   */
  public static List<Point> taps(Symbol symbol) {
    return switch (symbol.type()) {
      case TRANSFORMER -> terminals(symbol).subList(2, 3);
      case CENTRE_TAPPED_TRANSFORMER -> terminals(symbol).subList(3, 5);
      default -> List.of();
    };
  }

  private static int grid(Symbol symbol) {
    return symbol.mirrored() ? symbol.x() + 4 : symbol.x() - 4;
  }

  /**
   * The room that a symbol's lines take.
   *
   * @param symbol the symbol
   * @return its rectangle; without extent for a dot
   */
  public static Box box(Symbol symbol) {
    int x = symbol.x();
    int y = symbol.y();
    return switch (symbol.type()) {
      case RESISTOR, CAPACITOR, ELECTROLYTIC, INDUCTOR, DIODE, ZENER, LED, CURRENT_SOURCE ->
          symbol.turned()
              ? new Box(x - 2, y - 1, x + 2, y + 1)
              : new Box(x - 1, y - 2, x + 1, y + 2);
      case TRIODE, DIRECTLY_HEATED_TRIODE, PENTODE, BEAM_TETRODE ->
          new Box(x - 3, y - 3, x + 3, y + 3);
      case TRANSFORMER -> new Box(x - 2, y - 4, x + 2, y + 4);
      case CENTRE_TAPPED_TRANSFORMER -> new Box(x - 2, y - 8, x + 2, y + 8);
      case GROUND -> new Box(x - 1, y, x + 1, y + 1);
      case SUPPLY -> new Box(x - 2, y - 1, x + 2, y);
      case BIAS -> new Box(x - 2, y, x + 2, y + 1);
      case INPUT -> terminal(x, y, !symbol.mirrored());
      case OUTPUT -> terminal(x, y, symbol.mirrored());
      case DOT -> new Box(x, y, x, y);
    };
  }

  /**
   * The room that is kept for a symbol's text.
   *
   * @param symbol the symbol
   * @return a rectangle beside it; without extent where the symbol has no text
   */
  public static Box label(Symbol symbol) {
    Box box = box(symbol);
    return switch (symbol.type()) {
      case GROUND, DOT -> box(symbol.x(), symbol.y(), 0, 0);
      case TRIODE, DIRECTLY_HEATED_TRIODE, PENTODE, BEAM_TETRODE ->
          // beside the cathode's half, so that a screen lead has the height of the grid to itself
          symbol.label() == Side.LEFT
              ? box(box.left() - LABEL_WIDTH, symbol.y() + 1, LABEL_WIDTH, LABEL_HEIGHT)
              : box(box.right(), symbol.y() + 1, LABEL_WIDTH, LABEL_HEIGHT);
      default -> beside(box, symbol.label());
    };
  }

  /**
   * The room that is kept for a node's voltage.
   *
   * @param mark the node
   * @return a rectangle beside it
   */
  public static Box label(NodeMark mark) {
    return beside(new Box(mark.x(), mark.y(), mark.x(), mark.y()), mark.label());
  }

  private static Box beside(Box box, Side side) {
    int x = Math.floorDiv(box.left() + box.right() - LABEL_WIDTH, 2);
    int y = Math.floorDiv(box.top() + box.bottom() - LABEL_HEIGHT, 2);
    return switch (side) {
      case LEFT -> box(box.left() - LABEL_WIDTH, y, LABEL_WIDTH, LABEL_HEIGHT);
      case RIGHT -> box(box.right(), y, LABEL_WIDTH, LABEL_HEIGHT);
      case ABOVE -> box(x, box.top() - LABEL_HEIGHT, LABEL_WIDTH, LABEL_HEIGHT);
      case BELOW -> box(x, box.bottom(), LABEL_WIDTH, LABEL_HEIGHT);
    };
  }

  /** An open terminal on the left or the right of its wire's end. */
  private static Box terminal(int x, int y, boolean left) {
    return left ? new Box(x - 1, y - 1, x, y + 1) : new Box(x, y - 1, x + 1, y + 1);
  }

  private static Box box(int left, int top, int width, int height) {
    return new Box(left, top, left + width, top + height);
  }
}
