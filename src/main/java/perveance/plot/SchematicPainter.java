package perveance.plot;

import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.geom.AffineTransform;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
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
  private final TextWidths bold;
  private final TextWidths regular;
  private final TypeSize typeSize = new TypeSize(this);
  private @Nullable Strokes last;

  /**
   * A painter.
   *
   * @param look colours
   * @param fonts faces
   */
  public SchematicPainter(Look look, PlotFonts fonts) {
    this.look = look;
    this.labels = new SchematicLabels(look, fonts);
    this.bold = new TextWidths(fonts.bold(1));
    this.regular = new TextWidths(fonts.regular(1));
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
    return paint(g, layout(drawing, text, 1));
  }

  List<Hotspot> paint(Graphics2D g, SchematicLayout layout) {
    Drawing drawing = layout.drawing();
    g.setPaint(look.ink());
    g.setStroke(ValveShapes.stroke(false));
    for (Drawing.Wire wire : drawing.wires()) {
      g.draw(SymbolShapes.line(wire.x1(), wire.y1(), wire.x2(), wire.y2()));
    }
    for (Drawing.Symbol symbol : drawing.symbols()) {
      taps(drawing, symbol).forEach(g::draw);
      paintSymbol(g, symbol, layout.text());
    }
    g.setPaint(look.ink());
    drawing.marks().forEach(mark -> g.fill(dot(mark)));
    List<Hotspot> spots = new ArrayList<>();
    for (int i = 0; i < layout.labels().size(); i++) {
      labels.draw(g, layout.labels().get(i), layout.placed().places().get(i)).ifPresent(spots::add);
    }
    return List.copyOf(spots);
  }

  /** Finds a place for every text. */
  SchematicLayout layout(Drawing drawing, SchematicText text, double factor) {
    Obstacles obstacles = strokes(drawing, text.zigzag());
    List<SchematicLabel> all = new LabelPlaces(bold, regular, factor).all(drawing, text);
    LabelPlacement.Placed placed = LabelPlacement.place(all, obstacles);
    Rectangle2D extent = obstacles.extent();
    for (SchematicLabel.Place place : placed.places()) {
      extent = extent.createUnion(place.box());
    }
    Rectangle2D airy =
        new Rectangle2D.Double(
            extent.getX() - MARGIN,
            extent.getY() - MARGIN,
            extent.getWidth() + 2 * MARGIN,
            extent.getHeight() + 2 * MARGIN);
    return new SchematicLayout(drawing, text, all, placed, factor, airy);
  }

  /** The layout with type that can be read in an area, as far as that can be. */
  SchematicLayout layout(
      Drawing drawing, SchematicText text, Rectangle2D area, double largest, double readable) {
    return typeSize.layout(new TypeSize.Room(drawing, area, largest, readable), text);
  }

  /** The strokes that were asked for last; values change more often than the drawing. */
  private record Strokes(Drawing drawing, boolean zigzag, Obstacles obstacles) {}

  private Obstacles strokes(Drawing drawing, boolean zigzag) {
    Strokes known = last;
    if (known == null || known.zigzag() != zigzag || !known.drawing().equals(drawing)) {
      known = new Strokes(drawing, zigzag, obstacles(drawing, zigzag));
      last = known;
    }
    return known.obstacles();
  }

  private static Obstacles obstacles(Drawing drawing, boolean zigzag) {
    Obstacles obstacles = new Obstacles();
    for (Drawing.Wire wire : drawing.wires()) {
      obstacles.add(SymbolShapes.line(wire.x1(), wire.y1(), wire.x2(), wire.y2()));
    }
    for (Drawing.Symbol symbol : drawing.symbols()) {
      taps(drawing, symbol).forEach(obstacles::add);
      AffineTransform place = place(symbol);
      SymbolShapes.Strokes strokes = shapes(symbol.type(), zigzag);
      for (List<Shape> some : List.of(strokes.lines(), strokes.solids(), strokes.heavy())) {
        some.forEach(s -> obstacles.add(placed(s, place)));
      }
    }
    drawing.marks().forEach(mark -> obstacles.add(dot(mark)));
    return obstacles;
  }

  /** A circle stays a circle, so that text may stand in the corners of its box. */
  private static Shape placed(Shape stroke, AffineTransform place) {
    return stroke instanceof Ellipse2D e
        ? new Ellipse2D.Double(
            place.getTranslateX() + e.getX(),
            place.getTranslateY() + e.getY(),
            e.getWidth(),
            e.getHeight())
        : place.createTransformedShape(stroke);
  }

  /** What takes a wire that ends at a tap on to the winding. */
  private static List<Shape> taps(Drawing drawing, Drawing.Symbol symbol) {
    List<Shape> lines = new ArrayList<>();
    for (SymbolShape.Point tap : SymbolShape.taps(symbol)) {
      boolean wired =
          drawing.wires().stream()
              .anyMatch(
                  w ->
                      (w.x1() == tap.x() && w.y1() == tap.y())
                          || (w.x2() == tap.x() && w.y2() == tap.y()));
      if (wired) {
        lines.add(SymbolShapes.line(tap.x(), tap.y(), tap.x() + 0.6, tap.y()));
      }
    }
    return lines;
  }

  /**
   * What the drawing fills with its text, which is less than its grid.
   *
   * @param drawing geometry
   * @param text words and figures
   * @return rectangle in grid units, with a small margin
   */
  public Rectangle2D extent(Drawing drawing, SchematicText text) {
    return layout(drawing, text, 1).extent();
  }

  private static Shape dot(Drawing.NodeMark mark) {
    return new Ellipse2D.Double(mark.x() - 0.24, mark.y() - 0.24, 0.48, 0.48);
  }

  private static AffineTransform place(Drawing.Symbol symbol) {
    AffineTransform place = AffineTransform.getTranslateInstance(symbol.x(), symbol.y());
    if (symbol.turned()) {
      place.rotate(-Math.PI / 2);
    }
    if (symbol.mirrored()) {
      place.scale(-1, 1);
    }
    return place;
  }

  private void paintSymbol(Graphics2D g, Drawing.Symbol symbol, SchematicText text) {
    AffineTransform place = place(symbol);
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
