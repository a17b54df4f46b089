package perveance.desktop.viewmodel;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.BiFunction;
import java.util.function.Consumer;
import java.util.function.UnaryOperator;
import javafx.beans.binding.Bindings;
import javafx.beans.binding.BooleanBinding;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import org.jspecify.annotations.Nullable;
import perveance.app.Edit;
import perveance.app.History;
import perveance.desktop.task.LatestOnly;
import perveance.engine.analysis.AnalysisOptions;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.analysis.StageAnswer;
import perveance.engine.base.Finding;
import perveance.engine.base.Progress;
import perveance.engine.base.Remedy;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.StageEntry;

/** The open chassis: its edits, what is chosen in it, and its answer. */
public final class Workbench {
  /** At once after an edit: everything but bands and levels. */
  private static final AnalysisOptions QUICK = new AnalysisOptions(0, 1, false, true);

  private final Engine engine;
  private List<String> complaints = List.of();
  private final Desks desks;
  private final ReadOnlyObjectWrapper<History> history;
  private final ReadOnlyBooleanWrapper settled = new ReadOnlyBooleanWrapper();
  private final ReadOnlyObjectWrapper<@Nullable ChassisAnswer> answer =
      new ReadOnlyObjectWrapper<>();
  private final ReadOnlyObjectWrapper<Chassis> saved;
  private final ReadOnlyStringWrapper message = new ReadOnlyStringWrapper("");
  private final StringProperty chosenStage = new SimpleStringProperty("");
  private final StringProperty chosenPart = new SimpleStringProperty("");
  private final LatestOnly<Nearby.Question, ChassisAnswer> live;
  private final LatestOnly<Chassis, ChassisAnswer> full;

  /**
   * A workbench.
   *
   * @param start first chassis
   * @param engine what computes and checks
   * @param desks where it computes and where answers arrive
   */
  public Workbench(Chassis start, Engine engine, Desks desks) {
    this.engine = engine;
    this.desks = desks;
    history = new ReadOnlyObjectWrapper<>(History.of(start));
    saved = new ReadOnlyObjectWrapper<>(start);
    live =
        new LatestOnly<>(
            desks.quick(),
            desks.foreground(),
            (question, progress) -> Nearby.answer(engine, question, QUICK, progress),
            a -> receive(a, QUICK),
            this::notComputed);
    full =
        new LatestOnly<>(
            desks.thorough(),
            desks.foreground(),
            (chassis, progress) -> engine.answer(chassis, AnalysisOptions.FULL, progress),
            a -> receive(a, AnalysisOptions.FULL),
            this::notComputed);
    chooseFirst(start);
    recompute(engine.complaints(chassis()));
  }

  /**
   * A line of questions beside the main one, of which only the latest is answered.
   *
   * @param work answers a question
   * @param done receives the answer, in the foreground
   * @param <Q> question
   * @param <A> answer
   * @return where to ask
   */
  public <Q, A> LatestOnly<Q, A> aside(BiFunction<Q, Progress, A> work, Consumer<A> done) {
    return new LatestOnly<>(
        desks.quick(),
        desks.foreground(),
        work,
        done,
        e -> message.set(String.valueOf(e.getMessage())));
  }

  /** A quick answer that comes after the thorough one of the same chassis brings nothing new. */
  private void receive(ChassisAnswer received, AnalysisOptions options) {
    boolean late = options.samples() == 0 && settled.get() && received.chassis().equals(chassis());
    if (!late) {
      settled.set(options.samples() > 0);
      answer.set(received);
    }
  }

  private void notComputed(RuntimeException e) {
    message.set("This could not be computed: " + e.getMessage() + ". Undo the last change.");
  }

  /**
   * What can be undone, the chassis, what can be redone.
   *
   * @return history
   */
  public ReadOnlyObjectProperty<History> history() {
    return history.getReadOnlyProperty();
  }

  /**
   * The newest answer; first without bands, soon with.
   *
   * @return answer, null until the first arrives
   */
  public ReadOnlyObjectProperty<@Nullable ChassisAnswer> answer() {
    return answer.getReadOnlyProperty();
  }

  /**
   * Whether the answer is thorough and of the present chassis; false while bands follow behind.
   *
   * @return true when nothing more is to come
   */
  public ReadOnlyBooleanProperty settled() {
    return settled.getReadOnlyProperty();
  }

  /**
   * What computes and checks.
   *
   * @return engine
   */
  public Engine engine() {
    return engine;
  }

  /**
   * One line for the foot of the window.
   *
   * @return message, may be empty
   */
  public ReadOnlyStringProperty message() {
    return message.getReadOnlyProperty();
  }

  /**
   * Reference of the chosen stage.
   *
   * @return reference, empty when the chassis has no stage
   */
  public StringProperty chosenStage() {
    return chosenStage;
  }

  /**
   * Element name of the chosen part.
   *
   * @return name, empty when none
   */
  public StringProperty chosenPart() {
    return chosenPart;
  }

  /**
   * Whether there are changes that are not saved.
   *
   * @return true when the chassis differs from its file
   */
  public BooleanBinding modified() {
    return Bindings.createBooleanBinding(
        () -> !history.get().now().equals(saved.get()), history, saved);
  }

  /**
   * The chassis as it is.
   *
   * @return chassis
   */
  public Chassis chassis() {
    return history.get().now();
  }

  /**
   * The chassis as last saved or opened.
   *
   * @return chassis
   */
  public Chassis savedChassis() {
    return saved.get();
  }

  /**
   * Does an edit and computes anew; an edit that cannot be is refused in words.
   *
   * @param edit the edit
   * @return why it was refused, empty when it was done
   */
  public Optional<String> edit(Edit edit) {
    return step(h -> h.after(edit));
  }

  /**
   * Does an edit that belongs to the last one, while a hand drags.
   *
   * @param edit the edit
   * @return why it was refused, empty when it was done
   */
  public Optional<String> drag(Edit edit) {
    return step(h -> h.continued(edit));
  }

  /** Undoes the last edit. */
  public void undo() {
    take(history.get().undone());
  }

  /** Does the last undone edit again. */
  public void redo() {
    take(history.get().redone());
  }

  private Optional<String> step(UnaryOperator<History> change) {
    History after;
    try {
      after = change.apply(history.get());
    } catch (IllegalArgumentException e) {
      return refuse(String.valueOf(e.getMessage()));
    }
    List<String> found = engine.complaints(after.now());
    if (!found.isEmpty() && complaints.isEmpty()) {
      return refuse(String.join("; ", found));
    }
    take(after, found);
    return Optional.empty();
  }

  private Optional<String> refuse(String why) {
    message.set(why);
    return Optional.of(why);
  }

  private void take(History after) {
    take(after, engine.complaints(after.now()));
  }

  private void take(History after, List<String> found) {
    History before = history.get();
    if (after.past().size() != before.past().size() || !after.now().equals(before.now())) {
      history.set(after);
      message.set("");
      keepChoice();
      recompute(found);
    }
  }

  private void recompute(List<String> found) {
    settled.set(false);
    complaints = found;
    if (!complaints.isEmpty()) {
      message.set(String.join("; ", complaints));
      return;
    }
    live.ask(new Nearby.Question(chassis(), chosenStage.get(), answer.get()));
    full.ask(chassis());
  }

  private void keepChoice() {
    if (chassis().stage(chosenStage.get()).isEmpty()) {
      chooseFirst(chassis());
    }
  }

  private void chooseFirst(Chassis chassis) {
    chosenPart.set("");
    chosenStage.set(chassis.stages().stream().findFirst().map(StageEntry::ref).orElse(""));
  }

  /**
   * Takes another chassis in place of this one; its history starts anew.
   *
   * @param chassis the chassis
   */
  public void replace(Chassis chassis) {
    history.set(History.of(chassis));
    saved.set(chassis);
    chooseFirst(chassis);
    recompute(engine.complaints(chassis()));
  }

  /**
   * Puts a recovered chassis in place of the saved one, as an edit that can be undone.
   *
   * @param chassis as last edited before the program was ended
   */
  public void restore(Chassis chassis) {
    History now = history.get();
    List<History.Step> past = new ArrayList<>(now.past());
    past.add(new History.Step("recover unsaved changes", now.now()));
    take(new History(past, chassis, List.of()));
  }

  /** Notes that nothing of the chassis stands in a file. */
  public void unsaved() {
    saved.set(new Chassis("", chassis().conditions(), List.of(), List.of()));
  }

  /**
   * Notes that the chassis has been saved.
   *
   * @param file where
   */
  public void saved(Path file) {
    saved.set(chassis());
    message.set("Saved " + file);
  }

  /**
   * Says something at the foot of the window.
   *
   * @param text what
   */
  public void say(String text) {
    message.set(text);
  }

  /**
   * Answer of the chosen stage.
   *
   * @return answer, empty until computed or where it could not be solved
   */
  public Optional<StageAnswer> stageAnswer() {
    ChassisAnswer now = answer.get();
    return now == null
        ? Optional.empty()
        : now.stages().stream().filter(s -> s.ref().equals(chosenStage.get())).findFirst();
  }

  /**
   * Takes the remedy of a finding; undone in one step.
   *
   * @param finding a finding with a remedy
   */
  public void take(Finding finding) {
    finding.remedy().ifPresent(remedy -> take(finding.where(), remedy));
  }

  private void take(String where, Remedy remedy) {
    RemedyEdits.Outcome outcome = RemedyEdits.of(chassis(), where, stageOf(where), remedy);
    if (outcome.refused().isPresent()) {
      message.set(outcome.refused().get());
      return;
    }
    Optional<String> refused =
        edit(new Edit.Together("take the remedy for " + where, outcome.edits()));
    if (refused.isEmpty()) {
      message.set(remedy.text());
    }
  }

  /**
   * The stage that a place belongs to.
   *
   * @param where a stage, a valve of it or a part of it
   * @return reference of the stage, the place itself when none is found
   */
  public String stageOf(String where) {
    if (chassis().stage(where).isPresent()) {
      return where;
    }
    ChassisAnswer now = answer.get();
    if (now != null) {
      for (StageAnswer stage : now.stages()) {
        boolean valve = stage.circuit().devices().stream().anyMatch(d -> d.ref().equals(where));
        boolean part = stage.circuit().parts().stream().anyMatch(p -> p.element().equals(where));
        if (valve || part) {
          return stage.ref();
        }
      }
    }
    return where.split("[ .]", 2)[0];
  }
}
