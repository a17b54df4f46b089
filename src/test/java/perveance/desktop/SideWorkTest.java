package perveance.desktop;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.concurrent.Executor;
import javafx.beans.property.SimpleObjectProperty;
import javafx.scene.control.Button;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import perveance.desktop.view.MainWindow;
import perveance.desktop.view.WindowProbe;
import perveance.desktop.viewmodel.Desk;
import perveance.desktop.viewmodel.Desks;
import perveance.desktop.viewmodel.DocumentException;
import perveance.desktop.viewmodel.Press;
import perveance.desktop.viewmodel.Settings;
import perveance.engine.analysis.ChassisAnswer;

/** What takes a while is made beside the window, can be stopped, and never fails in silence. */
class SideWorkTest {
  @TempDir Path folder = Path.of("");
  private final Answers answers = new Answers();
  private final List<Runnable> waiting = new ArrayList<>();
  private final PaperPress press = new PaperPress();
  private boolean busy;
  private @Nullable MainWindow opened;

  /** Puts sheets on no paper. */
  private static final class PaperPress implements Press {
    private final List<String> printers = new ArrayList<>();
    private final List<String> printed = new ArrayList<>();
    private boolean jams;

    @Override
    public byte[] sheet(ChassisAnswer answer, Settings settings) {
      if (jams) {
        throw new IllegalStateException("no ink");
      }
      return new SheetPress().sheet(answer, settings);
    }

    @Override
    public List<String> printers() {
      return printers;
    }

    @Override
    public void print(byte[] sheet, String printer, Settings settings) throws DocumentException {
      if (printer.equals("broken")) {
        throw new DocumentException("The sheet was not printed.", "out of paper", "Add paper.");
      }
      printed.add(printer + " " + new String(sheet, 0, 4, StandardCharsets.ISO_8859_1));
    }
  }

  @BeforeEach
  void open() {
    Toolkit.start();
    opened =
        Toolkit.on(
            () -> {
              Executor quick = work -> run(work);
              Desk real =
                  Wiring.desk(
                      folder.resolve("home"),
                      new SimpleObjectProperty<>(Settings.USUAL),
                      answers,
                      new Desks(quick, Runnable::run, Runnable::run));
              return new MainWindow(
                  new Desk(
                      real.bench(), real.document(), real.settings(), press, answers, real.drag()));
            });
    answers.write = Optional.of(folder.resolve("a.pdf"));
  }

  private MainWindow window() {
    return Objects.requireNonNull(opened);
  }

  private void run(Runnable work) {
    if (busy) {
      waiting.add(work);
    } else {
      work.run();
    }
  }

  private void press(String words) {
    Toolkit.run(() -> WindowProbe.run(window(), words));
  }

  private Button stop() {
    return (Button) Objects.requireNonNull(window().scene().lookup("#stop-making"));
  }

  private boolean shown() {
    return Toolkit.on(() -> Objects.requireNonNull(stop().getParent()).isVisible());
  }

  @Test
  void theWindowSaysWhatIsBeingMadeUntilItIsWritten() throws IOException {
    assertFalse(shown());
    busy = true;
    press("Print the sheet (PDF)\u2026");
    assertTrue(shown());
    assertEquals("Stop: Print the sheet", Toolkit.on(() -> stop().getAccessibleText()));
    Toolkit.run(() -> waiting.forEach(Runnable::run));
    assertFalse(shown());
    assertTrue(Files.size(folder.resolve("a.pdf")) > 1000);
  }

  @Test
  void whatIsStoppedIsNotWritten() {
    busy = true;
    press("Print the sheet (PDF)\u2026");
    Toolkit.run(() -> stop().fire());
    assertFalse(shown());
    Toolkit.run(() -> waiting.forEach(Runnable::run));
    assertFalse(Files.exists(folder.resolve("a.pdf")));
    assertEquals(List.of(), answers.told);
  }

  @Test
  void troubleIsToldInADialog() {
    press.jams = true;
    press("Print the sheet (PDF)\u2026");
    assertEquals(1, answers.told.size());
    assertTrue(answers.told.get(0).contains("no ink"), answers.told.get(0));
    assertFalse(shown());
  }

  @Test
  void aMachineWithoutPrinterIsToldSo() {
    press("Print the sheet on paper\u2026");
    assertEquals(1, answers.told.size());
    assertTrue(answers.told.get(0).contains("No printer"), answers.told.get(0));
    assertEquals(List.of(), answers.asked);
  }

  @Test
  void theSheetGoesToThePrinterThatIsChosen() {
    press.printers.addAll(List.of("broken", "good"));
    answers.choice = Optional.of(1);
    press("Print the sheet on paper\u2026");
    assertEquals(List.of("good %PDF"), press.printed);
    answers.choice = Optional.of(0);
    press("Print the sheet on paper\u2026");
    assertEquals(List.of("good %PDF"), press.printed);
    assertTrue(answers.told.get(0).contains("out of paper"), answers.told.get(0));
  }
}
