package perveance.plot;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.geom.Rectangle2D;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.analysis.StageAnswer;
import perveance.engine.base.BadInputException;

/**
 * Texts of a schematic cover no wire, no symbol and no other text, on the page and on the screen.
 */
class SchematicLayoutTest {
  /** The card of the drawing in a window of 1280 by 800, in pixels. */
  private static final Rectangle2D CARD = new Rectangle2D.Double(0, 0, 398, 404);

  private static final double LARGEST = 21;
  private static final double READABLE = 10.5;
  private static final PlotFonts FONTS = new PlotFonts();

  static List<Path> examples() throws IOException {
    return Examples.all();
  }

  @ParameterizedTest
  @MethodSource("examples")
  void noTextCoversAnything(Path example) throws BadInputException {
    ChassisAnswer chassis = Examples.answer(example);
    List<String> collisions = new ArrayList<>();
    for (StageAnswer stage : chassis.stages()) {
      for (boolean zigzag : new boolean[] {false, true}) {
        for (boolean sheet : new boolean[] {false, true}) {
          SchematicText text = new SchematicWords(chassis, stage, sheet).text(Set.of(), zigzag);
          SchematicPainter painter = new SchematicPainter(Look.PAPER, FONTS);
          look(stage, painter.layout(stage.drawing(), text, 1), collisions);
          look(stage, painter.layout(stage.drawing(), text, CARD, LARGEST, READABLE), collisions);
        }
      }
    }
    assertEquals(List.of(), collisions);
  }

  /** Counted anew from the boxes and the wires, not from what the placement says of itself. */
  private static void look(StageAnswer stage, SchematicLayout layout, List<String> collisions) {
    List<SchematicLabel.Place> places = layout.placed().places();
    for (int i = 0; i < places.size(); i++) {
      Rectangle2D box = places.get(i).box();
      String words = stage.ref() + " " + places.get(i).lines().get(0).text();
      for (int j = 0; j < i; j++) {
        if (box.intersects(places.get(j).box())) {
          collisions.add(words + " meets " + places.get(j).lines().get(0).text());
        }
      }
      for (var wire : layout.drawing().wires()) {
        if (box.intersectsLine(wire.x1(), wire.y1(), wire.x2(), wire.y2())) {
          collisions.add(words + " covers a wire");
        }
      }
    }
    if (!layout.isClear()) {
      collisions.add(stage.ref() + " covers a symbol, factor " + layout.factor());
    }
  }

  /** A drawing for which the usual type would be too small is set in larger type. */
  @ParameterizedTest
  @MethodSource("examples")
  void typeOnTheScreenCanBeRead(Path example) throws BadInputException {
    ChassisAnswer chassis = Examples.answer(example);
    for (StageAnswer stage : chassis.stages()) {
      SchematicText text = new SchematicWords(chassis, stage, false).text(Set.of(), false);
      SchematicLayout layout =
          new SchematicPainter(Look.LIGHT, FONTS)
              .layout(stage.drawing(), text, CARD, LARGEST, READABLE);
      double size = layout.smallest(CARD, LARGEST);
      assertTrue(size >= 9, stage.ref() + " " + stage.kind() + ": type of " + size + " pixels");
    }
  }
}
