package perveance.plot;

import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.geom.AffineTransform;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import perveance.engine.stage.Drawing;
import perveance.engine.stage.SymbolShape;

/**
 * Draws a schematic in grid units. The caller scales the graphics; the same painter serves page,
 * picture and window.
 */
public final class SchematicPainter {
  private static final double MARGIN = 0.6;

  private final Look look;
  private final SchematicLabels labels;

  /**
   * A painter.
   *
   * @param look colours
   * @param fonts faces
   */
  public SchematicPainter(Look look, PlotFonts fonts) {
    this.look = look;
    this.labels = new SchematicLabels(look, fonts);
  }

  /**
   * Draws and reports where things are.
   *
   * @param g graphics whose user unit is one grid unit
   * @param drawing geometry
   * @param text words and figures
   * @return where parts and nodes are, in grid units
   */
  public List<Hotspot> paint(Graphics2D g, Drawing drawing, SchematicText text) {
    List<Hotspot> spots = new ArrayList<>();
    g.setPaint(look.ink());
    g.setStroke(ValveShapes.stroke(false));
    for (Drawing.Wire wire : drawing.wires()) {
      g.draw(SymbolShapes.line(wire.x1(), wire.y1(), wire.x2(), wire.y2()));
    }
    for (Drawing.Symbol symbol : drawing.symbols()) {
      paintTaps(g, drawing, symbol);
      paintSymbol(g, symbol, text);
      labels.symbol(g, symbol, text).ifPresent(spots::add);
    }
    for (Drawing.NodeMark mark : drawing.marks()) {
      paintDot(g, mark.x(), mark.y());
      labels.node(g, mark, text).ifPresent(spots::add);
    }
    return List.copyOf(spots);
  }

  /** Takes a wire that ends at a tap on to the winding. */
  private static void paintTaps(Graphics2D g, Drawing drawing, Drawing.Symbol symbol) {
    for (SymbolShape.Point tap : SymbolShape.taps(symbol)) {
      boolean wired =
          drawing.wires().stream()
              .anyMatch(
                  w ->
                      (w.x1() == tap.x() && w.y1() == tap.y())
                          || (w.x2() == tap.x() && w.y2() == tap.y()));
      if (wired) {
        g.draw(SymbolShapes.line(tap.x(), tap.y(), tap.x() + 0.6, tap.y()));
      }
    }
  }

  /**
   * What the drawing fills with its text, which is less than its grid.
   *
   * @param drawing geometry
   * @param text words and figures
   * @return rectangle in grid units, with a small margin
   */
  public Rectangle2D extent(Drawing drawing, SchematicText text) {
    Graphics2D blind = new BufferedImage(1, 1, BufferedImage.TYPE_INT_RGB).createGraphics();
    List<Rectangle2D> boxes = new ArrayList<>();
    for (Hotspot s : paint(blind, drawing, text)) {
      boxes.add(new Rectangle2D.Double(s.x(), s.y(), s.width(), s.height()));
    }
    blind.dispose();
    for (Drawing.Wire w : drawing.wires()) {
      Rectangle2D box = new Rectangle2D.Double(w.x1(), w.y1(), 0, 0);
      box.add(w.x2(), w.y2());
      boxes.add(box);
    }
    for (Drawing.Symbol symbol : drawing.symbols()) {
      boxes.add(new Rectangle2D.Double(symbol.x() - 0.5, symbol.y() - 0.5, 1, 1));
      if (symbol.part().isPresent()) {
        boxes.add(SchematicLabels.body(symbol));
      }
      if (!symbol.text().isEmpty()) {
        boxes.add(labels.fixedBox(symbol, SchematicLabels.fixed(symbol, text)));
      }
    }
    Rectangle2D all = boxes.stream().reduce(Rectangle2D::createUnion).orElseThrow();
    return new Rectangle2D.Double(
        all.getX() - MARGIN,
        all.getY() - MARGIN,
        all.getWidth() + 2 * MARGIN,
        all.getHeight() + 2 * MARGIN);
  }

  private void paintDot(Graphics2D g, double x, double y) {
    g.setPaint(look.ink());
    g.fill(new java.awt.geom.Ellipse2D.Double(x - 0.24, y - 0.24, 0.48, 0.48));
  }

  private void paintSymbol(Graphics2D g, Drawing.Symbol symbol, SchematicText text) {
    AffineTransform place = AffineTransform.getTranslateInstance(symbol.x(), symbol.y());
    if (symbol.turned()) {
      place.rotate(-Math.PI / 2);
    }
    if (symbol.mirrored()) {
      place.scale(-1, 1);
    }
    Optional<String> part = symbol.part();
    boolean chosen = part.isPresent() && text.chosen().contains(part.get());
    SymbolShapes.Strokes strokes = shapes(symbol.type(), text.zigzag());
    if (isTerminal(symbol.type())) {
      // The wire ends at the middle; an open terminal shows no wire inside.
      g.setPaint(look.paper());
      strokes.lines().forEach(s -> g.fill(place.createTransformedShape(s)));
    }
    g.setPaint(chosen ? look.accent() : look.ink());
    g.setStroke(ValveShapes.stroke(false));
    for (Shape line : strokes.lines()) {
      g.draw(place.createTransformedShape(line));
    }
    for (Shape solid : strokes.solids()) {
      g.fill(place.createTransformedShape(solid));
    }
    g.setStroke(ValveShapes.stroke(true));
    for (Shape heavy : strokes.heavy()) {
      g.draw(place.createTransformedShape(heavy));
    }
  }

  private static boolean isTerminal(Drawing.SymbolType type) {
    return type == Drawing.SymbolType.INPUT || type == Drawing.SymbolType.OUTPUT;
  }

  private static SymbolShapes.Strokes shapes(Drawing.SymbolType type, boolean zigzag) {
    return switch (type) {
      case RESISTOR -> SymbolShapes.resistor(zigzag);
      case CAPACITOR -> SymbolShapes.capacitor();
      case ELECTROLYTIC -> SymbolShapes.electrolytic();
      case INDUCTOR -> SymbolShapes.inductor();
      case TRANSFORMER -> TransformerShapes.plain();
      case CENTRE_TAPPED_TRANSFORMER -> TransformerShapes.centreTapped();
      case DIODE -> SymbolShapes.diode(false, false);
      case ZENER -> SymbolShapes.diode(true, false);
      case LED -> SymbolShapes.diode(false, true);
      case CURRENT_SOURCE -> SymbolShapes.currentSource();
      case TRIODE -> ValveShapes.triode(false);
      case DIRECTLY_HEATED_TRIODE -> ValveShapes.triode(true);
      case PENTODE -> ValveShapes.pentode(false);
      case BEAM_TETRODE -> ValveShapes.pentode(true);
      case GROUND -> SymbolShapes.ground();
      case SUPPLY, BIAS -> SymbolShapes.supply();
      case INPUT, OUTPUT -> SymbolShapes.terminal();
      case DOT -> SymbolShapes.dot();
    };
  }
}
