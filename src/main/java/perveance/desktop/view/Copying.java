package perveance.desktop.view;

import java.io.ByteArrayInputStream;
import java.nio.charset.StandardCharsets;
import javafx.scene.image.Image;
import javafx.scene.input.Clipboard;
import javafx.scene.input.ClipboardContent;
import javafx.scene.input.DataFormat;
import perveance.app.wording.SafetyBox;
import perveance.desktop.viewmodel.Desk;
import perveance.desktop.viewmodel.FiguresTable;
import perveance.engine.analysis.ChassisAnswer;
import perveance.plot.Artwork;
import perveance.plot.Look;

/** Puts values, charts and figures on the clipboard. */
final class Copying {
  private Copying() {}

  static void value(Desk desk, SchematicCard schematic) {
    String text = schematic.chosenValue();
    if (text.isEmpty()) {
      desk.bench().say("Choose a part first; its value is then copied.");
      return;
    }
    put(text);
    desk.bench().say("Copied: " + text);
  }

  /** As a bitmap and, for programs that take it, as a vector picture. */
  static void chart(Desk desk, PlotCard plots) {
    plots.drawn(Look.LIGHT).ifPresent(artwork -> picture(desk, artwork));
  }

  private static void picture(Desk desk, Artwork artwork) {
    ClipboardContent content = new ClipboardContent();
    content.putImage(new Image(new ByteArrayInputStream(FileActions.png(artwork))));
    DataFormat known = DataFormat.lookupMimeType("image/svg+xml");
    DataFormat svg = known == null ? new DataFormat("image/svg+xml") : known;
    content.put(svg, new String(FileActions.svg(artwork), StandardCharsets.UTF_8));
    Clipboard.getSystemClipboard().setContent(content);
    desk.bench().say("The chart is on the clipboard.");
  }

  static void report(Desk desk) {
    ChassisAnswer answer = desk.bench().answer().get();
    if (answer != null) {
      put(desk.say(SafetyBox.of(answer).oneLine()) + "\n\n" + FiguresTable.csv(answer));
      desk.bench().say("The report is on the clipboard.");
    }
  }

  private static void put(String text) {
    ClipboardContent content = new ClipboardContent();
    content.putString(text);
    Clipboard.getSystemClipboard().setContent(content);
  }
}
