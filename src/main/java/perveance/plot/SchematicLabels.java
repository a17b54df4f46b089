package perveance.plot;

import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.font.FontRenderContext;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.Optional;
import perveance.engine.stage.Drawing;

/** Text of a schematic: values beside parts, voltages beside nodes, pin numbers at valves. */
final class SchematicLabels {
  private static final double VALUE = 1.15;
  private static final double DETAIL = 0.95;
  private static final FontRenderContext CONTEXT = new FontRenderContext(null, true, true);

  private final Look look;
  private final Font value;
  private final Font detail;

  SchematicLabels(Look look, PlotFonts fonts) {
    this.look = look;
    this.value = fonts.bold(VALUE);
    this.detail = fonts.regular(DETAIL);
  }

  Optional<Hotspot> symbol(Graphics2D g, Drawing.Symbol symbol, SchematicText text) {
    if (!symbol.text().isEmpty()) {
      fixedText(g, symbol, fixed(symbol, text));
    }
    if (symbol.part().isEmpty()) {
      return Optional.empty();
    }
    String name = symbol.part().get();
    if (isValve(symbol.type()) && text.pins().get(name) != null) {
      pins(g, symbol, text.pins().get(name));
    }
    SchematicText.PartText words = text.parts().get(name);
    if (words == null) {
      return Optional.empty();
    }
    double reach = reach(symbol);
    double dx = isValve(symbol.type()) ? reach + 0.4 : reach;
    double dy = isValve(symbol.type()) ? 2.2 : 0;
    Rectangle2D box =
        pair(
            g,
            symbol.x(),
            symbol.y() + dy,
            dx,
            overReach(symbol),
            symbol.label(),
            words.value(),
            words.duty(),
            look.ink());
    words.over().ifPresent(word -> warning(g, box, word));
    Rectangle2D all = box.createUnion(body(symbol));
    return Optional.of(
        new Hotspot(name, false, all.getX(), all.getY(), all.getWidth(), all.getHeight()));
  }

  Optional<Hotspot> node(Graphics2D g, Drawing.NodeMark mark, SchematicText text) {
    SchematicText.NodeText words = text.nodes().get(mark.node());
    if (words == null) {
      return Optional.empty();
    }
    Rectangle2D box =
        pair(
            g,
            mark.x(),
            mark.y(),
            0.6,
            0.5,
            mark.label(),
            words.value(),
            words.detail(),
            look.accent());
    return Optional.of(
        new Hotspot(mark.node(), true, box.getX(), box.getY(), box.getWidth(), box.getHeight()));
  }

  /** Two lines of text on a side of a point; returns the box they fill. */
  private Rectangle2D pair(
      Graphics2D g,
      double x,
      double y,
      double aside,
      double over,
      Drawing.Side side,
      String first,
      String second,
      java.awt.Color colour) {
    double w1 = width(first, value);
    double w2 = width(second, detail);
    double w = Math.max(w1, w2);
    double h = VALUE + (second.isEmpty() ? 0 : DETAIL * 1.1);
    double left =
        switch (side) {
          case LEFT -> x - aside - w;
          case RIGHT -> x + aside;
          case ABOVE, BELOW -> x - w / 2;
        };
    double top =
        switch (side) {
          case LEFT, RIGHT -> y - h / 2;
          case ABOVE -> y - over - h;
          case BELOW -> y + over;
        };
    double align = side == Drawing.Side.LEFT ? 1 : side == Drawing.Side.RIGHT ? 0 : 0.5;
    Rectangle2D box = new Rectangle2D.Double(left - 0.1, top, w + 0.2, h);
    g.setPaint(look.paper());
    g.fill(box);
    g.setPaint(colour);
    g.setFont(value);
    g.drawString(first, (float) (left + align * (w - w1)), (float) (top + 0.8 * VALUE));
    if (!second.isEmpty()) {
      g.setPaint(look.soft());
      g.setFont(detail);
      g.drawString(second, (float) (left + align * (w - w2)), (float) (top + VALUE + 0.8 * DETAIL));
    }
    return box;
  }

  private void fixedText(Graphics2D g, Drawing.Symbol symbol, String words) {
    Rectangle2D box = fixedBox(symbol, words);
    g.setPaint(look.ink());
    g.setFont(value);
    g.drawString(words, (float) box.getX(), (float) (box.getY() + 0.8 * VALUE));
  }

  /** A rail's name with its voltage where it is known. */
  static String fixed(Drawing.Symbol symbol, SchematicText text) {
    SchematicText.NodeText known = text.nodes().get("supply." + symbol.text());
    return isRail(symbol) && known != null ? symbol.text() + " " + known.value() : symbol.text();
  }

  /** Where a symbol's own text stands. */
  Rectangle2D fixedBox(Drawing.Symbol symbol, String words) {
    double w = width(words, value);
    boolean round = symbol.type() == Drawing.SymbolType.CURRENT_SOURCE;
    double rail = isRail(symbol) ? 1.6 : round ? 0.5 : 0;
    double x =
        switch (symbol.label()) {
          case LEFT -> symbol.x() - 0.7 - w - rail;
          case RIGHT -> symbol.x() + 0.7 + rail;
          case ABOVE, BELOW -> symbol.x() - w / 2;
        };
    double y =
        switch (symbol.label()) {
          case LEFT, RIGHT -> symbol.y() - 0.42 * VALUE;
          case ABOVE -> symbol.y() - 0.6 - 0.8 * VALUE;
          case BELOW -> symbol.y() + 0.6 + 0.2 * VALUE;
        };
    return new Rectangle2D.Double(x, y, w, VALUE);
  }

  private void pins(Graphics2D g, Drawing.Symbol symbol, SchematicText.PinText pins) {
    double side = symbol.mirrored() ? -1 : 1;
    g.setFont(value);
    g.setPaint(look.ink());
    pin(g, pins.anode(), symbol.x() + 0.35, symbol.y() - 3.25);
    pin(g, pins.cathode(), symbol.x() + 0.35, symbol.y() + 4.0);
    pin(g, pins.grid(), symbol.x() - side * 3.75 - 0.3, symbol.y() - 0.3);
    pin(g, pins.screen(), symbol.x() + side * 3.75 - 0.3, symbol.y() - 0.3);
  }

  private static void pin(Graphics2D g, String text, double x, double y) {
    if (!text.isEmpty()) {
      g.drawString(text, (float) x, (float) y);
    }
  }

  /** A triangle and a word: a limit is exceeded here. */
  private void warning(Graphics2D g, Rectangle2D box, String word) {
    double x = box.getX();
    double y = box.getMaxY() + 0.15;
    Path2D triangle = new Path2D.Double();
    triangle.moveTo(x + 0.1, y + 0.8);
    triangle.lineTo(x + 0.5, y);
    triangle.lineTo(x + 0.9, y + 0.8);
    triangle.closePath();
    g.setPaint(look.limit());
    g.fill(triangle);
    g.setFont(value);
    g.drawString(word, (float) (x + 1.1), (float) (y + 0.78));
  }

  static double width(String text, Font font) {
    return text.isEmpty() ? 0 : font.getStringBounds(text, CONTEXT).getWidth();
  }

  /** The rectangle a symbol's strokes fill. */
  static Rectangle2D body(Drawing.Symbol symbol) {
    double half = isValve(symbol.type()) ? 3 : 2;
    double thin = isValve(symbol.type()) ? 3 : 0.9;
    double w = symbol.turned() ? half : thin;
    double h = symbol.turned() ? thin : half;
    return new Rectangle2D.Double(symbol.x() - w, symbol.y() - h, 2 * w, 2 * h);
  }

  /** How far a symbol reaches above and below its centre, where text stands there. */
  private static double overReach(Drawing.Symbol symbol) {
    return switch (symbol.type()) {
      case TRANSFORMER -> 4.2;
      case CENTRE_TAPPED_TRANSFORMER -> 8.2;
      case CAPACITOR, ELECTROLYTIC -> 1.0;
      default -> reach(symbol);
    };
  }

  private static double reach(Drawing.Symbol symbol) {
    return switch (symbol.type()) {
      case TRIODE, DIRECTLY_HEATED_TRIODE, PENTODE, BEAM_TETRODE -> 2.8;
      case TRANSFORMER, CENTRE_TAPPED_TRANSFORMER -> 2.6;
      case RESISTOR -> 0.8;
      case LED -> 2.0;
      default -> 1.2;
    };
  }

  private static boolean isRail(Drawing.Symbol symbol) {
    return symbol.type() == Drawing.SymbolType.SUPPLY || symbol.type() == Drawing.SymbolType.BIAS;
  }

  static boolean isValve(Drawing.SymbolType type) {
    return switch (type) {
      case TRIODE, DIRECTLY_HEATED_TRIODE, PENTODE, BEAM_TETRODE -> true;
      default -> false;
    };
  }
}
