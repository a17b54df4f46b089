package perveance.desktop.view;

import java.util.List;
import java.util.Optional;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.VBox;
import javafx.scene.shape.Circle;
import javafx.scene.shape.Polygon;
import javafx.scene.shape.Rectangle;
import javafx.scene.shape.Shape;
import perveance.desktop.viewmodel.Desk;
import perveance.desktop.viewmodel.Workbench;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.analysis.HandSum;
import perveance.engine.analysis.StageAnswer;
import perveance.engine.base.Finding;
import perveance.engine.base.Remedy;
import perveance.engine.base.Severity;

/** Findings, worst first, each with its remedy; beneath them the hand sums of the chosen stage. */
final class FindingsPane extends VBox {
  private final Desk desk;
  private final Workbench bench;
  private final VBox cards = new VBox(8);
  private final Label count = Bits.label("", "soft", "small");
  private boolean sums;

  FindingsPane(Desk desk) {
    this.desk = desk;
    this.bench = desk.bench();
    getStyleClass().add("card");
    setSpacing(8);
    Label findings = Bits.label("Findings", "strong");
    findings.setMinWidth(USE_PREF_SIZE);
    HBox head = new HBox(8, findings, Bits.gap(), count);
    ScrollPane scroll = new ScrollPane(cards);
    scroll.setFitToWidth(true);
    getChildren().addAll(head, Bits.growing(scroll));
    setId("findings");
  }

  void refresh() {
    ChassisAnswer answer = bench.answer().get();
    cards.getChildren().clear();
    if (answer == null) {
      return;
    }
    long act =
        answer.findings().stream().filter(f -> f.severity().compareTo(Severity.NOTE) > 0).count();
    count.setText(act == 0 ? "nothing to act on" : act + " to act on");
    for (ChassisAnswer.Failure failure : answer.failures()) {
      cards
          .getChildren()
          .add(
              card(
                  "over-limit",
                  new Rectangle(11, 11),
                  failure.ref() + ", no answer",
                  failure.reason(),
                  "not solved"));
    }
    for (Finding finding : answer.findings()) {
      cards.getChildren().add(card(finding));
    }
    if (answer.findings().isEmpty() && answer.failures().isEmpty()) {
      cards
          .getChildren()
          .add(
              Bits.wrapped(
                  desk.say(
                      "Nothing was found against the limits known here. The cautions above hold"
                          + " all the same."),
                  "soft"));
    }
    cards.getChildren().add(sumsPart());
  }

  private VBox card(Finding finding) {
    String title = finding.where().replace('.', ' ');
    VBox card =
        card(
            finding.severity().code(),
            shape(finding.severity()),
            title,
            finding.text(),
            finding.severity().code().replace('-', ' '));
    card.setOnMouseClicked(e -> choose(finding));
    card.setFocusTraversable(true);
    card.setAccessibleRole(javafx.scene.AccessibleRole.BUTTON);
    card.setOnKeyPressed(
        e -> {
          if (e.getCode() == javafx.scene.input.KeyCode.ENTER && e.getTarget() == card) {
            choose(finding);
          }
        });
    finding.remedy().ifPresent(remedy -> card.getChildren().addAll(remedy(finding, remedy)));
    return card;
  }

  private VBox card(String style, Shape shape, String title, String text, String severity) {
    shape.getStyleClass().add("finding-shape");
    Label word = Bits.label(severity, "severity");
    word.setMinWidth(USE_PREF_SIZE);
    Label name = Bits.wrapped(title, "strong");
    HBox.setHgrow(name, javafx.scene.layout.Priority.ALWAYS);
    name.setMaxWidth(Double.MAX_VALUE);
    // a name is broken between words, never within one
    if (title.indexOf(' ') < 0) {
      name.setMinWidth(USE_PREF_SIZE);
    }
    HBox head = new HBox(8, shape, name, word);
    head.setAlignment(javafx.geometry.Pos.CENTER_LEFT);
    VBox card = new VBox(head, Bits.wrapped(Bits.kept(desk.say(text))));
    card.getStyleClass().addAll("finding", style);
    card.setAccessibleText(desk.say(severity + ": " + title + ". " + text));
    return card;
  }

  private List<javafx.scene.Node> remedy(Finding finding, Remedy remedy) {
    Label what = Bits.wrapped(Bits.kept(desk.say(remedy.text())), "small");
    if (remedy.edits().isEmpty()) {
      return List.of(what);
    }
    StringBuilder press = new StringBuilder("Take it: ");
    remedy
        .edits()
        .forEach(
            (key, value) ->
                press
                    .append(press.length() > 9 ? ", " : "")
                    .append(key.replace('_', ' '))
                    .append(' ')
                    .append(value));
    Button button = Bits.button(desk.say(press.toString()), () -> bench.take(finding), "remedy");
    button.setId("remedy");
    return List.of(what, button);
  }

  /**
   * A shape as well as a colour: square for over a limit, triangle for a caution, ring for a note.
   */
  private static Shape shape(Severity severity) {
    return switch (severity) {
      case DANGER -> new Polygon(6, 0, 12, 6, 6, 12, 0, 6);
      case OVER_LIMIT -> new Rectangle(11, 11);
      case CAUTION -> new Polygon(6, 0, 12.5, 11.5, -0.5, 11.5);
      case NOTE -> new Circle(5);
    };
  }

  private void choose(Finding finding) {
    String stage = bench.stageOf(finding.where());
    if (bench.chassis().stage(stage).isPresent()) {
      bench.chosenStage().set(stage);
      bench.chosenPart().set(finding.part().map(p -> element(stage, p)).orElse(""));
    }
  }

  /** Findings name a part by its element or by its key alone. */
  private String element(String stage, String part) {
    return part.contains(".") ? part : stage + "." + part;
  }

  private VBox sumsPart() {
    Optional<StageAnswer> stage = bench.stageAnswer();
    VBox box = new VBox(8);
    List<HandSum> all = stage.map(StageAnswer::sums).orElse(List.of());
    if (all.isEmpty()) {
      return box;
    }
    Button toggle =
        Bits.button(
            sums ? "Hide the hand sums" : "Show the hand sums of " + bench.chosenStage().get(),
            this::toggleSums,
            "link");
    toggle.setId("hand-sums");
    box.getChildren().add(toggle);
    if (sums) {
      all.forEach(sum -> box.getChildren().add(sum(sum)));
    }
    return box;
  }

  void toggleSums() {
    sums = !sums;
    refresh();
    lookupAll("#hand-sums").forEach(javafx.scene.Node::requestFocus);
  }

  private VBox sum(HandSum sum) {
    VBox box =
        new VBox(
            2,
            Bits.wrapped(desk.say(sum.figure()), "strong"),
            Bits.wrapped(desk.say(sum.formula()), "soft"),
            Bits.wrapped(sum.numbers()),
            Bits.wrapped("= " + sum.result(), "strong"));
    if (!sum.note().isEmpty()) {
      box.getChildren().add(Bits.wrapped(desk.say(sum.note()), "soft", "small"));
    }
    box.getStyleClass().add("finding");
    box.setId("hand-sum");
    return box;
  }
}
