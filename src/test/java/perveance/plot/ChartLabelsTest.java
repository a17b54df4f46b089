package perveance.plot;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import perveance.engine.analysis.StageAnswer;
import perveance.engine.base.BadInputException;

/** Texts of a chart do not meet, in every chart of every example. */
class ChartLabelsTest {
  private static final int WIDTH = 350;
  private static final int HEIGHT = 380;
  private static final List<Function<StageAnswer, Optional<PlotDescription>>> CHARTS =
      List.of(
          StagePlots::characteristics,
          StagePlots::frame,
          SignalPlots::transfer,
          SignalPlots::waveform,
          SignalPlots::distortion,
          SignalPlots::response);

  static List<Path> examples() throws IOException {
    return Examples.all();
  }

  @ParameterizedTest
  @MethodSource("examples")
  void noTextMeetsAnother(Path example) throws BadInputException {
    List<String> meetings = new ArrayList<>();
    for (StageAnswer stage : Examples.answer(example).stages()) {
      for (var chart : CHARTS) {
        chart.apply(stage).ifPresent(d -> look(stage.ref() + " " + d.title(), d, meetings));
      }
    }
    assertEquals(List.of(), meetings);
  }

  private static void look(String name, PlotDescription description, List<String> meetings) {
    List<Rectangle2D> boxes = boxes(description).toList();
    for (int i = 0; i < boxes.size(); i++) {
      for (int j = 0; j < i; j++) {
        if (boxes.get(i).intersects(boxes.get(j))) {
          meetings.add(name + ": " + boxes.get(i) + " and " + boxes.get(j));
        }
      }
    }
    long wanted = description.labels().stream().filter(l -> l.along().isEmpty()).count();
    assertTrue(boxes.size() >= wanted, () -> name + " shows only " + boxes.size() + " texts");
  }

  private static Stream<Rectangle2D> boxes(PlotDescription description) {
    Graphics2D g = new BufferedImage(WIDTH, HEIGHT, BufferedImage.TYPE_INT_RGB).createGraphics();
    Artwork chart = new ChartFactory(Look.LIGHT, new PlotFonts(), 11).artwork(description);
    return chart.draw(g, new Rectangle2D.Double(0, 0, WIDTH, HEIGHT)).stream()
        .filter(s -> s.name().equals(Artwork.TEXT))
        .map(s -> new Rectangle2D.Double(s.x(), s.y(), s.width(), s.height()));
  }
}
