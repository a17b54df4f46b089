package perveance.plot;

import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import java.util.Optional;
import perveance.engine.stage.Drawing;

/** Text of a schematic: values beside parts, voltages beside nodes, pin numbers at valves. */
final class SchematicLabels {
  private final Look look;
  private final PlotFonts fonts;

  SchematicLabels(Look look, PlotFonts fonts) {
    this.look = look;
    this.fonts = fonts;
  }

  /** Draws a label at its place; says where it can be pointed at. */
  Optional<Hotspot> draw(Graphics2D g, SchematicLabel label, SchematicLabel.Place place) {
    Rectangle2D box = place.box();
    SchematicLabel.Block block = SchematicLabel.Block.of(place.lines());
    List<Double> baselines = block.baselines();
    for (int i = 0; i < place.lines().size(); i++) {
      SchematicLabel.Line line = place.lines().get(i);
      double x = box.getX() + place.align() * (box.getWidth() - line.width());
      draw(g, line, x, box.getY() + baselines.get(i));
    }
    if (label.name().isEmpty()) {
      return Optional.empty();
    }
    Rectangle2D all = label.body().map(box::createUnion).orElse(box);
    return Optional.of(
        new Hotspot(
            label.name(), label.node(), all.getX(), all.getY(), all.getWidth(), all.getHeight()));
  }

  private void draw(Graphics2D g, SchematicLabel.Line line, double x, double baseline) {
    double left = x;
    if (line.ink() == SchematicLabel.Ink.WARNING) {
      g.setPaint(look.limit());
      g.fill(triangle(x, baseline, line.size()));
      left += line.size();
    }
    g.setPaint(colour(line.ink()));
    g.setFont(font(line));
    g.drawString(line.text(), (float) left, (float) baseline);
  }

  private Font font(SchematicLabel.Line line) {
    return line.ink() == SchematicLabel.Ink.DETAIL
        ? fonts.regular(line.size())
        : fonts.bold(line.size());
  }

  private Color colour(SchematicLabel.Ink ink) {
    return switch (ink) {
      case VALUE -> look.ink();
      case DETAIL -> look.soft();
      case NODE -> look.accent();
      case WARNING -> look.limit();
    };
  }

  /** A triangle beside the word: a limit is exceeded here. */
  private static Path2D triangle(double x, double baseline, double size) {
    Path2D triangle = new Path2D.Double();
    triangle.moveTo(x, baseline);
    triangle.lineTo(x + 0.4 * size, baseline - 0.72 * size);
    triangle.lineTo(x + 0.8 * size, baseline);
    triangle.closePath();
    return triangle;
  }

  /** A rail's name with its voltage where it is known. */
  static String fixed(Drawing.Symbol symbol, SchematicText text) {
    SchematicText.NodeText known = text.nodes().get("supply." + symbol.text());
    return isRail(symbol) && known != null ? symbol.text() + " " + known.value() : symbol.text();
  }

  /** The rectangle a symbol's strokes fill. */
  static Rectangle2D body(Drawing.Symbol symbol) {
    double half = isValve(symbol.type()) ? 3 : 2;
    double thin = isValve(symbol.type()) ? 3 : 0.9;
    double w = symbol.turned() ? half : thin;
    double h = symbol.turned() ? thin : half;
    return new Rectangle2D.Double(symbol.x() - w, symbol.y() - h, 2 * w, 2 * h);
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
