package perveance.plot;

import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import perveance.engine.stage.Drawing;
import perveance.plot.SchematicLabel.Block;
import perveance.plot.SchematicLabel.Ink;
import perveance.plot.SchematicLabel.Line;
import perveance.plot.SchematicLabel.Place;

/** Where each text of a drawing may stand: first where the drawing wants it, then around it. */
final class LabelPlaces {
  private static final double VALUE = 1.15;
  private static final double DETAIL = 0.95;

  /** Offsets along a part and away from it that are tried, in grid units. */
  private static final double[] ALONG = {
    0, 0.35, -0.35, 0.7, -0.7, 1.1, -1.1, 1.5, -1.5, 2, -2, 2.5, -2.5, 3, -3
  };

  private static final double ENVELOPE = 3.25;

  private static final double[] AWAY = {0, 0.5, 1.1, 1.8, 2.6, 3.5};

  private final TextWidths bold;
  private final TextWidths regular;
  private final double value;
  private final double detail;

  LabelPlaces(TextWidths bold, TextWidths regular, double factor) {
    this.bold = bold;
    this.regular = regular;
    this.value = VALUE * factor;
    this.detail = DETAIL * factor;
  }

  /** All labels of a drawing; those that have the least choice come first. */
  List<SchematicLabel> all(Drawing drawing, SchematicText text) {
    List<SchematicLabel> labels = new ArrayList<>();
    for (Drawing.Symbol symbol : drawing.symbols()) {
      if (!symbol.text().isEmpty()) {
        labels.add(own(symbol, SchematicLabels.fixed(symbol, text)));
      }
      symbol.part().map(text.pins()::get).ifPresent(pins -> addPins(labels, symbol, pins));
    }
    for (Drawing.Symbol symbol : drawing.symbols()) {
      symbol.part().map(text.parts()::get).ifPresent(words -> labels.add(part(symbol, words)));
    }
    for (Drawing.NodeMark mark : drawing.marks()) {
      SchematicText.NodeText words = text.nodes().get(mark.node());
      if (words != null) {
        labels.add(node(mark, words));
      }
    }
    return labels;
  }

  private Line line(String text, Ink ink) {
    double size = ink == Ink.DETAIL ? detail : value;
    double sign = ink == Ink.WARNING ? value : 0;
    return new Line(text, ink, size, sign + (ink == Ink.DETAIL ? regular : bold).of(text, size));
  }

  /** Value above detail; and, for narrow places, each figure of the detail on its own line. */
  private List<Block> blocks(String first, Ink ink, String second, Optional<String> warning) {
    List<Block> blocks = new ArrayList<>();
    for (boolean narrow : new boolean[] {false, true}) {
      List<Line> lines = new ArrayList<>(List.of(line(first, ink)));
      for (String part : narrow ? second.split("(?<=,) ") : new String[] {second}) {
        if (!part.isEmpty()) {
          lines.add(line(part, Ink.DETAIL));
        }
      }
      warning.ifPresent(w -> lines.add(line(w, Ink.WARNING)));
      if (!narrow || second.contains(", ")) {
        blocks.add(Block.of(lines));
      }
    }
    return blocks;
  }

  private SchematicLabel part(Drawing.Symbol symbol, SchematicText.PartText words) {
    List<Place> places = new ArrayList<>();
    for (Block block : blocks(words.value(), Ink.VALUE, words.duty(), words.over())) {
      if (SchematicLabels.isValve(symbol.type())) {
        addAroundValve(places, symbol, block);
      } else {
        addAround(places, symbol.x(), symbol.y(), around(symbol), symbol.label(), block);
      }
    }
    return new SchematicLabel(
        symbol.part().orElseThrow(), false, Optional.of(SchematicLabels.body(symbol)), places);
  }

  /** Beside the envelope at several heights, the text as near to the circle as it comes. */
  private static void addAroundValve(List<Place> places, Drawing.Symbol symbol, Block block) {
    double radius = 3.35;
    for (double height : new double[] {2.2, 1.4, -2.2, 3.2, -3.2, 4.2, -4.2, 5.2, -5.2}) {
      double inner = Math.max(0, Math.abs(height) - block.height() / 2);
      double aside =
          inner >= radius ? 0.4 : Math.max(0.4, Math.sqrt(radius * radius - inner * inner));
      for (double away : new double[] {0, 0.8}) {
        Place right = block.rightOf(symbol.x() + aside + away, symbol.y() + height);
        Place left = block.leftOf(symbol.x() - aside - away, symbol.y() + height);
        boolean leftFirst = symbol.label() == Drawing.Side.LEFT;
        places.add(leftFirst ? left : right);
        places.add(leftFirst ? right : left);
      }
    }
  }

  private SchematicLabel node(Drawing.NodeMark mark, SchematicText.NodeText words) {
    List<Place> places = new ArrayList<>();
    Rectangle2D dot = new Rectangle2D.Double(mark.x() - 0.5, mark.y() - 0.45, 1, 0.9);
    for (Block block : blocks(words.value(), Ink.NODE, words.detail(), Optional.empty())) {
      addAround(places, mark.x(), mark.y(), dot, mark.label(), block);
    }
    return new SchematicLabel(mark.node(), true, Optional.empty(), places);
  }

  private SchematicLabel own(Drawing.Symbol symbol, String words) {
    List<Place> places = new ArrayList<>();
    Block block = Block.of(List.of(line(words, Ink.VALUE)));
    addAround(places, symbol.x(), symbol.y(), around(symbol), symbol.label(), block);
    return new SchematicLabel("", false, Optional.empty(), places);
  }

  /** On the four sides of a rectangle, the wanted one first, then farther along and away. */
  private static void addAround(
      List<Place> places,
      double x,
      double y,
      Rectangle2D around,
      Drawing.Side wanted,
      Block block) {
    List<Drawing.Side> sides = new ArrayList<>(List.of(wanted));
    for (Drawing.Side side : Drawing.Side.values()) {
      if (side != wanted) {
        sides.add(side);
      }
    }
    for (double away : AWAY) {
      for (double along : ALONG) {
        for (Drawing.Side side : sides) {
          places.add(
              switch (side) {
                case LEFT -> block.leftOf(around.getMinX() - away, y + along);
                case RIGHT -> block.rightOf(around.getMaxX() + away, y + along);
                case ABOVE -> block.above(x + along, around.getMinY() - away);
                case BELOW -> block.below(x + along, around.getMaxY() + away);
              });
        }
      }
    }
  }

  /** What text keeps clear of at a symbol. */
  private static Rectangle2D around(Drawing.Symbol symbol) {
    double[] half =
        switch (symbol.type()) {
          case RESISTOR, INDUCTOR -> new double[] {0.75, 0.75};
          case CAPACITOR -> new double[] {1.2, 0.9};
          case ELECTROLYTIC -> new double[] {1.25, 1.3};
          case LED -> new double[] {1.9, 1.1};
          case TRANSFORMER -> new double[] {2.5, 4.3};
          case CENTRE_TAPPED_TRANSFORMER -> new double[] {2.5, 8.3};
          case SUPPLY, BIAS -> new double[] {2.3, 0.4};
          case INPUT, OUTPUT -> new double[] {0.6, 0.55};
          case GROUND, DOT -> new double[] {0.8, 0.4};
          default -> new double[] {1.25, 1.25};
        };
    boolean turned = symbol.turned();
    double w = turned && half[0] < 2 ? half[1] : half[0];
    double h = turned && half[0] < 2 ? half[0] : half[1];
    return new Rectangle2D.Double(symbol.x() - w, symbol.y() - h, 2 * w, 2 * h);
  }

  private void addPins(
      List<SchematicLabel> labels, Drawing.Symbol symbol, SchematicText.PinText pins) {
    double side = symbol.mirrored() ? -1 : 1;
    addLead(labels, pins.anode(), symbol, -1);
    addLead(labels, pins.cathode(), symbol, 1);
    addGrid(labels, pins.grid(), symbol, -side);
    addGrid(labels, pins.screen(), symbol, side);
  }

  /** Beside a lead that stands, and farther along the envelope where a wire crosses close by. */
  private void addLead(
      List<SchematicLabel> labels, String text, Drawing.Symbol symbol, double outward) {
    List<Place> places = new ArrayList<>();
    Block block = pin(text);
    for (double aside : new double[] {0.35, 0.8, 1.2, 1.6, 2}) {
      double rise = Math.sqrt(ENVELOPE * ENVELOPE - aside * aside) + block.height() / 2;
      for (double more : new double[] {0, 0.25, 0.6}) {
        double y = symbol.y() + outward * (rise + more);
        places.add(block.rightOf(symbol.x() + aside, y));
        places.add(block.leftOf(symbol.x() - aside, y));
      }
    }
    add(labels, text, places);
  }

  /** Above or below a lead that lies. */
  private void addGrid(
      List<SchematicLabel> labels, String text, Drawing.Symbol symbol, double outward) {
    List<Place> places = new ArrayList<>();
    Block block = pin(text);
    for (double out : new double[] {3.7, 4.1, 4.6, 5.2}) {
      double x = symbol.x() + outward * out;
      places.add(block.above(x, symbol.y() - 0.2));
      places.add(block.below(x, symbol.y() + 0.25));
    }
    add(labels, text, places);
  }

  /** Figures have nothing beneath their line. */
  private Block pin(String text) {
    Block block = Block.of(List.of(line(text, Ink.VALUE)));
    return new Block(block.lines(), block.width(), block.baselines().get(0));
  }

  private static void add(List<SchematicLabel> labels, String text, List<Place> places) {
    if (!text.isEmpty()) {
      labels.add(new SchematicLabel("", false, Optional.empty(), places));
    }
  }
}
