package perveance.desktop.viewmodel;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import perveance.app.Edit;
import perveance.engine.analysis.AnalysisOptions;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.analysis.StageAnswer;
import perveance.engine.base.Progress;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.Setting;
import perveance.engine.stage.StageEntry;
import perveance.engine.stage.Supply;
import perveance.engine.stage.SupplyFeed;

/** The first answer in a large chassis, held against the whole one. */
class NearbyTest {
  private static final AnalysisOptions QUICK = new AnalysisOptions(0, 1, false, true);

  private final Engine engine = new RealEngine();

  /**
   * *Derived*: on a stated supply nothing but the stages wired together can matter, so both ways
   * must agree to the accuracy of the solver.
   */
  @Test
  void onAStatedSupplyItIsTheWholeAnswer() {
    Chassis chassis = chassis("A");
    ChassisAnswer last = engine.answer(chassis, QUICK, Progress.none());
    Chassis changed = new Edit.SetKey("V2", "anode_load", number("68k", 68e3)).apply(chassis);
    ChassisAnswer near =
        Nearby.answer(engine, new Nearby.Question(changed, "V2", last), QUICK, Progress.none());
    ChassisAnswer whole = engine.answer(changed, QUICK, Progress.none());
    assertEquals(whole.stages().size(), near.stages().size());
    for (String ref : List.of("V1", "V2", "V5")) {
      assertEquals(
          stage(whole, ref).smallSignal().gain(), stage(near, ref).smallSignal().gain(), 1e-6, ref);
    }
    assertEquals(
        stage(whole, "V2").parts().get(0).designator(),
        stage(near, "V2").parts().get(0).designator(),
        "parts keep their numbers");
  }

  /** *Derived*: behind a dropper the voltage solved last is held, hence the gain nearly so. */
  @Test
  void behindADropperItIsNear() {
    Chassis chassis = chassis("B");
    ChassisAnswer last = engine.answer(chassis, QUICK, Progress.none());
    Chassis changed = new Edit.SetKey("V2", "anode_load", number("91k", 91e3)).apply(chassis);
    ChassisAnswer near =
        Nearby.answer(engine, new Nearby.Question(changed, "V2", last), QUICK, Progress.none());
    ChassisAnswer whole = engine.answer(changed, QUICK, Progress.none());
    double expected = stage(whole, "V2").smallSignal().gain();
    assertEquals(expected, stage(near, "V2").smallSignal().gain(), 0.01 * Math.abs(expected));
  }

  private static StageAnswer stage(ChassisAnswer answer, String ref) {
    return answer.stages().stream().filter(s -> s.ref().equals(ref)).findFirst().orElseThrow();
  }

  private static Setting.Number number(String text, double value) {
    return new Setting.Number(text, value);
  }

  /** Six stages, the first driving the second. */
  private static Chassis chassis(String supply) {
    Chassis one = Starters.example(Settings.USUAL);
    StageEntry first = one.stages().get(0);
    List<StageEntry> stages = new ArrayList<>();
    for (int i = 1; i <= 6; i++) {
      StageEntry stage =
          new StageEntry("V" + i, first.kind(), first.settings())
              .with("supply", new Setting.Word(supply));
      if (i == 1) {
        stage = stage.without("load").with("drives", new Setting.Word("V2"));
      }
      if (i == 2) {
        stage = stage.without("source");
      }
      stages.add(stage);
    }
    List<Supply> supplies = new ArrayList<>(one.supplies());
    supplies.add(
        new Supply(
            "B",
            new SupplyFeed.Dropped("A", 4700),
            OptionalDouble.of(22e-6),
            OptionalDouble.empty()));
    return new Chassis(one.title(), one.conditions(), supplies, stages);
  }
}
