package perveance.desktop.viewmodel;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.function.Consumer;
import perveance.app.Edit;
import perveance.app.wording.FigureRow;
import perveance.app.wording.StageFigures;
import perveance.desktop.task.LatestOnly;
import perveance.engine.analysis.AnalysisOptions;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.analysis.StageAnswer;
import perveance.engine.base.Finding;
import perveance.engine.base.Progress;
import perveance.engine.base.Severity;
import perveance.engine.device.Device;
import perveance.engine.device.LawKind;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.Setting;

/** Another valve for a stage: finding it, and what it does before it is taken. */
public final class DeviceSwap {
  private static final AnalysisOptions WITH_FINDINGS = new AnalysisOptions(0, 1, false, true);

  private final Workbench bench;
  private final String ref;
  private final String key;
  private final LatestOnly<String, Effect> effects;

  /**
   * A swap in a stage.
   *
   * @param bench workbench
   * @param ref stage
   * @param key key that names the valve, {@code device} or {@code device2}
   * @param shown receives what a valve would do
   */
  public DeviceSwap(Workbench bench, String ref, String key, Consumer<Effect> shown) {
    this.bench = bench;
    this.ref = ref;
    this.key = key;
    this.effects = bench.aside(this::effect, shown);
  }

  /**
   * What a valve would do in the stage.
   *
   * @param type the valve
   * @param rows figure, now, then
   * @param warnings what would be over a limit or dangerous, in sentences
   * @param refusal why it cannot stand there at all, empty when it can
   */
  public record Effect(
      String type, List<Compared> rows, List<String> warnings, Optional<String> refusal) {
    /** Copies the lists. */
    public Effect {
      rows = List.copyOf(rows);
      warnings = List.copyOf(warnings);
    }
  }

  /**
   * One figure, now and then.
   *
   * @param figure what it is
   * @param now with the valve that stands there
   * @param then with the other one
   */
  public record Compared(String figure, String now, String then) {}

  /**
   * Valves whose type or any alias holds a text.
   *
   * @param text what was typed, may be empty
   * @return devices, each once; those whose name begins with the text first
   */
  public List<Device> find(String text) {
    String wanted = plain(text);
    Map<String, Device> found = new LinkedHashMap<>();
    for (boolean begins : new boolean[] {true, false}) {
      for (String name : bench.engine().devices().names()) {
        String plain = plain(name);
        if (begins ? plain.startsWith(wanted) : plain.contains(wanted)) {
          bench
              .engine()
              .devices()
              .find(name)
              .filter(d -> d.law().kind() != LawKind.DIODE)
              .ifPresent(d -> found.putIfAbsent(d.type(), d));
        }
      }
    }
    return new ArrayList<>(found.values());
  }

  private static String plain(String name) {
    return name.toLowerCase(Locale.ROOT).replaceAll("[ -]", "");
  }

  /**
   * Asks what a valve would do; the answer comes to whoever was named at the start.
   *
   * @param type the valve
   */
  public void show(String type) {
    effects.ask(type);
  }

  /**
   * Takes a valve.
   *
   * @param type the valve
   * @return why it cannot be, empty when it was done
   */
  public Optional<String> take(String type) {
    return bench.edit(edit(type));
  }

  private Edit edit(String type) {
    return new Edit.SetKey(ref, key, new Setting.Word(type));
  }

  private Effect effect(String type, Progress progress) {
    Chassis other = edit(type).apply(bench.chassis());
    List<String> complaints = bench.engine().complaints(other);
    if (!complaints.isEmpty()) {
      return new Effect(type, List.of(), List.of(), Optional.of(String.join("; ", complaints)));
    }
    ChassisAnswer answer = bench.engine().answer(other, WITH_FINDINGS, progress);
    Optional<StageAnswer> then = stage(answer);
    if (then.isEmpty()) {
      return new Effect(
          type, List.of(), List.of(), Optional.of("The stage has no solution with this valve."));
    }
    List<String> warnings =
        then.get().findings().stream()
            .filter(f -> f.severity().compareTo(Severity.CAUTION) >= 0)
            .map(Finding::text)
            .toList();
    return new Effect(type, compare(bench.stageAnswer(), then.get()), warnings, Optional.empty());
  }

  private Optional<StageAnswer> stage(ChassisAnswer answer) {
    return answer.stages().stream().filter(s -> s.ref().equals(ref)).findFirst();
  }

  private static List<Compared> compare(Optional<StageAnswer> now, StageAnswer then) {
    Map<String, String> before = new LinkedHashMap<>();
    now.ifPresent(a -> figures(a).forEach(r -> before.put(r.label(), r.value())));
    List<Compared> rows = new ArrayList<>();
    for (FigureRow row : figures(then)) {
      rows.add(new Compared(row.label(), before.getOrDefault(row.label(), "\u2013"), row.value()));
    }
    return rows;
  }

  private static List<FigureRow> figures(StageAnswer answer) {
    List<FigureRow> rows = new ArrayList<>();
    answer.points().stream().findFirst().ifPresent(p -> rows.addAll(StageFigures.point(p)));
    rows.addAll(StageFigures.signal(answer));
    return rows;
  }
}
