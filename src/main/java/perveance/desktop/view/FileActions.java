package perveance.desktop.view;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Supplier;
import perveance.desktop.viewmodel.Asking;
import perveance.desktop.viewmodel.Desk;
import perveance.desktop.viewmodel.DocumentException;
import perveance.desktop.viewmodel.FiguresTable;
import perveance.desktop.viewmodel.Settings;
import perveance.desktop.viewmodel.Starters;
import perveance.engine.analysis.ChassisAnswer;
import perveance.plot.Artwork;
import perveance.plot.Look;
import perveance.plot.Pictures;

/** Opening, saving and exporting, each with its trouble told. */
final class FileActions {
  private static final int CHART_WIDTH = 900;
  private static final int CHART_HEIGHT = 640;
  private static final double BITMAP_SCALE = 2;

  private final Desk desk;
  private final SideWork work;

  FileActions(Desk desk) {
    this.desk = desk;
    work = new SideWork(desk);
  }

  /** What is being made beside the window. */
  SideWork work() {
    return work;
  }

  /** Something that may fail for a reason that a person can mend. */
  interface Attempt {
    void run() throws DocumentException;
  }

  boolean attempt(Attempt attempt) {
    try {
      attempt.run();
      return true;
    } catch (DocumentException e) {
      desk.asking().tell(e.what(), e.why(), e.remedy());
      return false;
    }
  }

  /** Whether the present document may be left: saved, given up, or nothing to lose. */
  boolean mayLeave() {
    if (desk.bench().chassis().equals(desk.bench().savedChassis())) {
      return true;
    }
    return switch (desk.asking().unsaved(desk.bench().chassis().title())) {
      case SAVE -> save();
      case DISCARD -> {
        attempt(() -> desk.document().documents().forget());
        yield true;
      }
      case STAY -> false;
    };
  }

  void start() {
    if (mayLeave()) {
      desk.document().start(Starters.empty(desk.settings().get()));
    }
  }

  void example() {
    if (mayLeave()) {
      desk.document().start(Starters.example(desk.settings().get()));
    }
  }

  void open() {
    if (mayLeave()) {
      desk.asking().fileToOpen().ifPresent(f -> attempt(() -> desk.document().open(f)));
    }
  }

  void open(Path file) {
    if (mayLeave()) {
      attempt(() -> desk.document().open(file));
    }
  }

  void openRecent() {
    List<Path> recent = desk.document().documents().recent();
    if (recent.isEmpty()) {
      desk.bench().say("Nothing was opened lately.");
      return;
    }
    desk.asking()
        .choose("Open which file?", recent.stream().map(Path::toString).toList())
        .ifPresent(i -> open(recent.get(i)));
  }

  boolean save() {
    if (desk.document().file().isEmpty()) {
      return saveAs();
    }
    return attempt(() -> desk.document().save());
  }

  boolean saveAs() {
    Optional<Path> file = desk.asking().fileToWrite("Save the chassis as", name(), "toml");
    return file.isPresent() && attempt(() -> desk.document().saveAs(file.get()));
  }

  private String name() {
    return desk.document()
        .file()
        .map(f -> String.valueOf(f.getFileName()).replaceFirst("\\.toml$", ""))
        .orElse(plain(desk.bench().chassis().title()));
  }

  private static String plain(String title) {
    String plain = title.replaceAll("[^\\p{L}\\p{N}]+", "-").replaceAll("^-|-$", "");
    return plain.isEmpty() ? "chassis" : plain;
  }

  /** Asks where to, then makes it beside the window. */
  private void export(String what, String suffix, String ending, Supplier<byte[]> maker) {
    desk.asking()
        .fileToWrite(what, name() + suffix, ending)
        .ifPresent(file -> work.order(what, maker, content -> write(file, content)));
  }

  private void write(Path file, byte[] content) throws DocumentException {
    desk.document().documents().write(file, content);
    desk.bench().say("Written: " + file);
  }

  /** The sheet of what stands on the bench, to be made; empty while figures are worked out. */
  private Optional<Supplier<byte[]>> pressed() {
    ChassisAnswer answer = desk.bench().answer().get();
    if (answer == null || !desk.bench().settled().get()) {
      desk.bench().say("The figures are still being worked out; print again in a moment.");
      return Optional.empty();
    }
    Settings settings = desk.settings().get();
    return Optional.of(() -> desk.press().sheet(answer, settings));
  }

  void sheet() {
    pressed().ifPresent(maker -> export("Print the sheet", "-sheet", "pdf", maker));
  }

  /** The same sheet, on paper. */
  void paper() {
    List<String> printers = desk.press().printers();
    if (printers.isEmpty()) {
      desk.asking()
          .tell(
              "The sheet was not printed.",
              "No printer that takes PDF is set up on this machine.",
              "Write the sheet as a PDF file with \u201cPrint the sheet (PDF)\u201d and print"
                  + " that.");
      return;
    }
    pressed()
        .ifPresent(
            maker ->
                desk.asking()
                    .choose("Print the sheet on which printer?", printers)
                    .map(printers::get)
                    .ifPresent(printer -> paper(printer, maker)));
  }

  private void paper(String printer, Supplier<byte[]> maker) {
    Settings settings = desk.settings().get();
    work.order(
        "Print the sheet on " + printer,
        maker,
        sheet -> {
          desk.press().print(sheet, printer, settings);
          desk.bench().say("Sent to " + printer + ".");
        });
  }

  void figures() {
    ChassisAnswer answer = desk.bench().answer().get();
    if (answer != null) {
      export(
          "Export the figures",
          "-figures",
          "csv",
          () -> FiguresTable.csv(answer).getBytes(StandardCharsets.UTF_8));
    }
  }

  void vector(String what, Optional<Artwork> artwork) {
    if (artwork.isEmpty()) {
      desk.bench().say("There is nothing to export in this view.");
      return;
    }
    export("Export " + what, "-" + what, "svg", () -> svg(artwork.get()));
  }

  void bitmap(String what, Optional<Artwork> artwork) {
    artwork.ifPresent(a -> export("Export " + what, "-" + what, "png", () -> png(a)));
  }

  static byte[] png(Artwork artwork) {
    return Pictures.png(artwork, Look.LIGHT, CHART_WIDTH, CHART_HEIGHT, BITMAP_SCALE);
  }

  static byte[] svg(Artwork artwork) {
    return Pictures.svg(artwork, Look.LIGHT, CHART_WIDTH, CHART_HEIGHT);
  }

  /** Offers what a killed program has left. */
  void offerRecovery() {
    for (var left : desk.document().documents().left()) {
      String what = left.original().map(Path::toString).orElse("a chassis never saved");
      List<String> choices =
          new ArrayList<>(List.of("Restore it", "Throw it away", "Decide later"));
      Optional<Integer> choice =
          desk.asking()
              .choose("Unsaved changes of " + what + " were kept on " + left.when() + ".", choices);
      if (choice.isPresent() && choice.get() == 0) {
        attempt(() -> desk.document().restore(left));
        return;
      }
      if (choice.isPresent() && choice.get() == 1) {
        attempt(() -> desk.document().documents().forget(left));
      }
    }
  }

  Asking asking() {
    return desk.asking();
  }
}
