package perveance.desktop;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.Objects;
import javafx.scene.Node;
import javafx.scene.input.Clipboard;
import javafx.scene.input.DataFormat;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What is put on the clipboard. */
class CopyingTest {
  @TempDir private Path folder = Path.of("");

  private OpenWindow window;

  @BeforeEach
  void open() {
    window = OpenWindow.open(folder);
    Toolkit.run(() -> Clipboard.getSystemClipboard().clear());
  }

  @AfterEach
  void close() {
    window.close();
  }

  private static String text() {
    return Toolkit.on(() -> String.valueOf(Clipboard.getSystemClipboard().getString()));
  }

  @Test
  void theValueOfTheChosenPart() {
    window.action("Copy the chosen value");
    assertTrue(window.message().contains("Choose a part first"), window.message());
    Node part = window.part("V1a.anode_load");
    Toolkit.run(part::requestFocus);
    window.action("Copy the chosen value");
    assertEquals("100k", text());
  }

  @Test
  void theChartAsBitmapAndAsVector() {
    window.action("Copy this chart");
    Clipboard clipboard = Toolkit.on(Clipboard::getSystemClipboard);
    assertNotNull(Toolkit.on(clipboard::getImage), "no bitmap");
    DataFormat svg = Objects.requireNonNull(DataFormat.lookupMimeType("image/svg+xml"));
    String vector = Toolkit.on(() -> String.valueOf(clipboard.getContent(svg)));
    assertTrue(vector.contains("<svg") && vector.contains("anode to cathode"), "no vector");
  }

  @Test
  void theReportWithItsCaution() {
    window.action("Copy the report as text");
    assertTrue(text().startsWith("DANGER"), text());
    assertTrue(text().contains("V1a,V1a,"), text());
  }
}
