package perveance.desktop.view;

import java.io.File;
import java.nio.file.Path;
import java.util.List;
import javafx.beans.binding.Bindings;
import javafx.beans.property.DoubleProperty;
import javafx.beans.property.SimpleDoubleProperty;
import javafx.scene.Scene;
import javafx.scene.input.DragEvent;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCodeCombination;
import javafx.scene.input.KeyCombination;
import javafx.scene.input.TransferMode;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.RowConstraints;
import javafx.scene.layout.VBox;
import perveance.desktop.viewmodel.Desk;
import perveance.desktop.viewmodel.StageList;
import perveance.plot.PlotFonts;

/** The window: the sheet, alive. */
public final class MainWindow {
  /** Large type must not push the drawing out of the window. */
  private static final double FIGURES_SHARE = 0.27;

  /** The drawing's part of what the findings leave, in parts of the whole. */
  private static final double DRAWING_SHARE = 0.53;

  /** The findings' part with text of the usual size, in per cent; it grows with the text. */
  private static final double FINDINGS_PERCENT = 22.5;

  private static final double MOST_FINDINGS_PERCENT = 30;

  /**
   * The chassis list with text of the usual size, in pixels; and at most, in parts of the whole.
   */
  private static final double SIDE_WIDTH = 206;

  private static final double SIDE = 0.185;

  private final Desk desk;
  private final PlotFonts fonts = new PlotFonts();
  private final BorderPane root = new BorderPane();
  private final Scene scene = new Scene(root, 1280, 800);
  private final FileActions files;
  private final StageList list;
  private final TopBar top;
  private final CautionBand caution;
  private final ChassisList chassis;
  private final SchematicCard schematic;
  private final PlotCard plots;
  private final FiguresRow figures;
  private final CappedScroll low = new CappedScroll();
  private final GridPane middle = new GridPane();
  private final DoubleProperty sideWidth = new SimpleDoubleProperty();
  private final FindingsPane findings;
  private final FootBar foot;
  private final Commands commands;

  /**
   * Builds the window.
   *
   * @param desk what it works with
   */
  public MainWindow(Desk desk) {
    Skin.loadFonts();
    this.desk = desk;
    files = new FileActions(desk);
    list = new StageList(desk.bench());
    caution = new CautionBand(desk);
    chassis = new ChassisList(desk, list);
    Pickers pickers = new Pickers(desk, list, fonts);
    schematic = new SchematicCard(desk, fonts, pickers::device);
    plots = new PlotCard(desk, fonts);
    figures = new FiguresRow(desk);
    findings = new FindingsPane(desk);
    foot = new FootBar(desk, files.work());
    commands = new Commands(desk, files, list, schematic, plots, findings, pickers);
    top = new TopBar(desk, files, new SearchField(commands::all, desk.settings()::get));
    commands.menus().forEach(top::menu);
    chassis.onAddStage(pickers::kind);
    layOut();
    listen();
  }

  /**
   * The scene.
   *
   * @return for a stage
   */
  public Scene scene() {
    return scene;
  }

  /**
   * Whether the window may be closed: nothing is unsaved, or the person has decided.
   *
   * @return true when it may
   */
  public boolean mayClose() {
    return files.mayLeave();
  }

  /** Offers what a killed program has left. */
  public void offerRecovery() {
    files.offerRecovery();
  }

  /**
   * Opens a file.
   *
   * @param file the file
   */
  public void open(Path file) {
    files.open(file);
  }

  Commands commands() {
    return commands;
  }

  PlotCard plots() {
    return plots;
  }

  private void layOut() {
    root.getStyleClass().add("window");
    root.setTop(top);
    root.setLeft(chassis);
    chassis.prefWidthProperty().bind(Bindings.min(sideWidth, scene.widthProperty().multiply(SIDE)));
    middle.setHgap(10);
    middle.setVgap(10);
    middle.setPadding(new javafx.geometry.Insets(10));
    RowConstraints high = new RowConstraints();
    high.setVgrow(Priority.ALWAYS);
    RowConstraints flat = new RowConstraints();
    flat.setVgrow(Priority.NEVER);
    middle.getRowConstraints().addAll(high, flat);
    middle.add(Bits.growing(schematic), 0, 0);
    middle.add(Bits.growing(plots), 1, 0);
    low.setContent(figures);
    low.capProperty().bind(scene.heightProperty().multiply(FIGURES_SHARE));
    middle.add(low, 0, 1, 2, 1);
    middle.add(Bits.growing(findings), 2, 0, 1, 2);
    // they take the room there is, so nobody has to ask them how large they would like to be
    for (Region card : List.of(schematic, plots, findings)) {
      card.setMinSize(0, 0);
      card.setPrefSize(0, 0);
    }
    VBox centre = new VBox(caution, Bits.growing(middle), foot);
    centre.setMinSize(0, 0);
    middle.setMinSize(0, 0);
    middle.setPrefSize(0, 0);
    root.setCenter(centre);
  }

  private void listen() {
    desk.bench().answer().addListener((o, was, is) -> refresh());
    desk.bench().history().addListener((o, was, is) -> followEdits());
    desk.bench().settled().addListener((o, was, is) -> figures.refresh());
    plots.characteristics().onReleased(this::refresh);
    desk.bench()
        .chosenStage()
        .addListener(
            (o, was, is) -> {
              plots.refresh();
              figures.refresh();
              findings.refresh();
              foot.refresh();
            });
    desk.settings().addListener((o, was, is) -> dress());
    dress();
    scene
        .getAccelerators()
        .put(
            new KeyCodeCombination(KeyCode.K, KeyCombination.SHORTCUT_DOWN),
            () -> top.search().requestFocus());
    commands.accelerators(scene);
    scene.addEventHandler(DragEvent.DRAG_OVER, this::over);
    scene.addEventHandler(DragEvent.DRAG_DROPPED, this::dropped);
  }

  private void dress() {
    Skin.dress(root, desk.settings().get());
    double findings =
        Math.min(MOST_FINDINGS_PERCENT, FINDINGS_PERCENT * desk.settings().get().textSize());
    double rest = 100 - findings;
    sideWidth.set(SIDE_WIDTH * desk.settings().get().textSize());
    middle.getColumnConstraints().clear();
    for (double percent :
        new double[] {DRAWING_SHARE * rest, (1 - DRAWING_SHARE) * rest, findings}) {
      ColumnConstraints column = new ColumnConstraints();
      column.setPercentWidth(percent);
      middle.getColumnConstraints().add(column);
    }
    refresh();
  }

  private void followEdits() {
    if (!desk.drag().isHeld()) {
      chassis.refresh();
    }
    if (desk.bench().chassis().stages().isEmpty()) {
      refresh();
    }
  }

  private void refresh() {
    plots.refresh();
    schematic.refresh();
    foot.refresh();
    // what a hand drags must not move because a line of the figures comes or goes
    for (Region beneath : List.of(low, figures, foot)) {
      double height = desk.drag().isHeld() ? beneath.getHeight() : Region.USE_COMPUTED_SIZE;
      // all three, or the texts in it are measured again for each frame
      beneath.setMinHeight(height);
      beneath.setPrefHeight(height);
      beneath.setMaxHeight(height);
    }
    figures.refresh();
    // lists follow when the hand rests, so that a drag stays light
    if (!desk.drag().isHeld()) {
      top.refresh();
      caution.refresh();
      chassis.refresh();
      findings.refresh();
    }
  }

  private void over(DragEvent event) {
    if (event.getDragboard().hasFiles()) {
      event.acceptTransferModes(TransferMode.COPY);
    }
    event.consume();
  }

  private void dropped(DragEvent event) {
    List<File> dropped = event.getDragboard().getFiles();
    event.setDropCompleted(!dropped.isEmpty());
    event.consume();
    take(dropped);
  }

  /** Opens the first of the files that were let fall on the window. */
  void take(List<File> dropped) {
    if (!dropped.isEmpty()) {
      files.open(dropped.get(0).toPath());
    }
  }
}
