package perveance.desktop.viewmodel;

import java.util.List;
import java.util.Optional;
import java.util.concurrent.Executor;
import java.util.function.ToDoubleFunction;
import perveance.app.Edit;
import perveance.desktop.task.LatestOnly;
import perveance.engine.analysis.AnalysisOptions;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.analysis.LoadLineView;
import perveance.engine.analysis.StageAnswer;
import perveance.engine.base.Progress;
import perveance.engine.search.KeyGoal;
import perveance.engine.search.KeyOutcome;
import perveance.engine.search.KeySearch;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.KeySpec;
import perveance.engine.stage.StageEntry;

/**
 * Dragging over the characteristics: finds the value that puts the operating point, a load line or
 * the swing where the hand is. All steps of one drag are undone together.
 */
public final class PointDrag {
  /** Which part may move when the operating point is dragged. */
  public enum Mover {
    /** What makes the bias. */
    BIAS("bias", List.of("cathode_resistor", "cathode_voltage", "grid_bias", "upper_resistor")),
    /** What feeds the anode. */
    LOAD("anode load", List.of("anode_load", "cathode_load", "anode_current", "primary"));

    private final String word;
    private final List<String> keys;

    Mover(String word, List<String> keys) {
      this.word = word;
      this.keys = keys;
    }

    /**
     * What it is called.
     *
     * @return for example {@code bias}
     */
    public String word() {
      return word;
    }
  }

  private static final List<String> DC_LOAD = List.of("anode_load", "cathode_load");
  private static final List<String> AC_LOAD = List.of("load", "primary", "anode_load");

  /** Part of the aim that is near enough: less than a pixel. */
  private static final double NEAR = 0.002;

  private record Question(Chassis chassis, KeyGoal goal) {}

  private record Solved(KeyGoal goal, KeyOutcome outcome) {}

  private final Workbench bench;
  private final LatestOnly<Question, Solved> searches;
  private boolean moved;
  private boolean held;

  /**
   * Dragging on a workbench.
   *
   * @param bench the workbench
   * @param background where it searches
   * @param foreground where values are set
   */
  public PointDrag(Workbench bench, Executor background, Executor foreground) {
    this.bench = bench;
    searches =
        new LatestOnly<>(
            background,
            foreground,
            this::search,
            this::take,
            e -> bench.say("This could not be dragged: " + e.getMessage()));
  }

  /** A drag begins. */
  public void begin() {
    moved = false;
    held = true;
  }

  /** The hand lets go; a search that still runs ends the drag. */
  public void end() {
    held = false;
  }

  /**
   * Whether a hand holds something.
   *
   * @return true between begin and end
   */
  public boolean isHeld() {
    return held;
  }

  /**
   * The part that a mover would move in the chosen stage.
   *
   * @param mover which sort
   * @return its key, empty when the stage has none
   */
  public Optional<KeySpec> part(Mover mover) {
    return first(mover.keys);
  }

  private Optional<KeySpec> first(List<String> keys) {
    Optional<StageEntry> stage = bench.chassis().stage(bench.chosenStage().get());
    return keys.stream()
        .filter(k -> stage.isPresent() && stage.get().settings().containsKey(k))
        .findFirst()
        .flatMap(k -> KeyEditor.spec(bench.chassis(), bench.chosenStage().get(), k));
  }

  /**
   * Drags the operating point.
   *
   * @param mover what may move
   * @param anode wanted anode to cathode [V]
   * @param current wanted anode current [A]; the nearest point that can be reached is taken
   */
  public void point(Mover mover, double anode, double current) {
    Optional<KeySpec> key = part(mover);
    if (key.isEmpty()) {
      bench.say("This stage has no part that sets the " + mover.word() + ".");
      return;
    }
    if (mover == Mover.BIAS) {
      ask(key.get(), PointDrag::current, Math.max(1e-6, current));
    } else {
      ask(key.get(), PointDrag::anode, Math.max(1, anode));
    }
  }

  /**
   * Drags the end of the dc load line.
   *
   * @param resistance wanted slope [ohm]
   */
  public void dcLoad(double resistance) {
    load(DC_LOAD, LoadLineView::dcResistance, resistance);
  }

  /**
   * Drags the end of the ac load line.
   *
   * @param resistance wanted slope [ohm]
   */
  public void acLoad(double resistance) {
    load(AC_LOAD, LoadLineView::acResistance, resistance);
  }

  private void load(List<String> keys, ToDoubleFunction<LoadLineView> slope, double resistance) {
    Optional<KeySpec> key = first(keys);
    if (key.isEmpty()) {
      bench.say("This stage has no resistor that sets this load line.");
    } else if (resistance > 0) {
      ask(key.get(), a -> view(a, slope), resistance);
    }
  }

  /**
   * Drags an end of the swing.
   *
   * @param ratio wanted swing against the present one [1]
   */
  public void swing(double ratio) {
    String ref = bench.chosenStage().get();
    Optional<KeySpec> drive = KeyEditor.spec(bench.chassis(), ref, "drive");
    Optional<StageAnswer> answer = bench.stageAnswer();
    if (drive.isEmpty() || answer.isEmpty() || !(ratio > 0)) {
      return;
    }
    double now =
        answer.get().driven().map(d -> d.inputPeak()).orElse(answer.get().clean().inputPeak());
    double next = Math.max(1e-3, Math.min(now * Math.min(ratio, 4), drive.get().highest()));
    set(KeyEditor.set(ref, drive.get(), next));
  }

  private void ask(KeySpec key, ToDoubleFunction<StageAnswer> figure, double wanted) {
    KeyGoal goal = new KeyGoal(bench.chosenStage().get(), key, figure, wanted, NEAR * wanted);
    ChassisAnswer last = bench.answer().get();
    Chassis near = last == null ? bench.chassis() : Nearby.part(bench.chassis(), goal.ref(), last);
    searches.ask(new Question(near, goal));
  }

  private Solved search(Question question, Progress progress) {
    KeyOutcome outcome =
        KeySearch.find(
            question.chassis(),
            question.goal(),
            chassis ->
                progress.cancelled() ? Optional.empty() : answer(chassis, question.goal().ref()));
    return new Solved(question.goal(), outcome);
  }

  private Optional<StageAnswer> answer(Chassis chassis, String ref) {
    return bench.engine().answer(chassis, AnalysisOptions.LIVE, Progress.none()).stages().stream()
        .filter(s -> s.ref().equals(ref))
        .findFirst();
  }

  private void take(Solved solved) {
    double value;
    if (solved.outcome() instanceof KeyOutcome.Found found) {
      value = found.value();
    } else {
      KeyOutcome.NotFound notFound = (KeyOutcome.NotFound) solved.outcome();
      bench.say(notFound.reason());
      value = notFound.nearest();
    }
    set(KeyEditor.set(solved.goal().ref(), solved.goal().key(), value));
  }

  private void set(Edit edit) {
    Optional<String> refused = moved ? bench.drag(edit) : bench.edit(edit);
    moved = moved || refused.isEmpty();
  }

  private static double current(StageAnswer answer) {
    return view(answer, LoadLineView::current);
  }

  private static double anode(StageAnswer answer) {
    return view(answer, LoadLineView::anode);
  }

  private static double view(StageAnswer answer, ToDoubleFunction<LoadLineView> figure) {
    return answer.loadLine().isPresent()
        ? figure.applyAsDouble(answer.loadLine().get())
        : Double.NaN;
  }
}
