package perveance.app;

import java.util.ArrayList;
import java.util.List;
import java.util.function.UnaryOperator;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.Setting;
import perveance.engine.stage.StageEntry;

/** Changes to the list of stages. */
final class StageEdits {
  private static final String DRIVES = "drives";

  private StageEdits() {}

  static Chassis withStages(Chassis chassis, List<StageEntry> stages) {
    return new Chassis(chassis.title(), chassis.conditions(), chassis.supplies(), stages);
  }

  static Chassis replace(Chassis chassis, String ref, UnaryOperator<StageEntry> change) {
    List<StageEntry> stages = new ArrayList<>(chassis.stages());
    int index = index(chassis, ref);
    stages.set(index, change.apply(stages.get(index)));
    return withStages(chassis, stages);
  }

  static Chassis remove(Chassis chassis, String ref) {
    List<StageEntry> stages = new ArrayList<>(chassis.stages());
    stages.remove(index(chassis, ref));
    stages.replaceAll(s -> drives(s, ref) ? s.without(DRIVES) : s);
    return withStages(chassis, stages);
  }

  static Chassis move(Chassis chassis, String ref, int to) {
    List<StageEntry> stages = new ArrayList<>(chassis.stages());
    StageEntry moved = stages.remove(index(chassis, ref));
    stages.add(Math.max(0, Math.min(to, stages.size())), moved);
    return withStages(chassis, stages);
  }

  static Chassis rename(Chassis chassis, String ref, String name) {
    if (name.isBlank() || (!name.equals(ref) && chassis.stage(name).isPresent())) {
      throw new IllegalArgumentException("no stage can be named '" + name + "'");
    }
    int index = index(chassis, ref);
    List<StageEntry> stages = new ArrayList<>(chassis.stages());
    StageEntry old = stages.get(index);
    stages.set(index, new StageEntry(name, old.kind(), old.settings()));
    stages.replaceAll(s -> drives(s, ref) ? s.with(DRIVES, new Setting.Word(name)) : s);
    return withStages(chassis, stages);
  }

  private static boolean drives(StageEntry stage, String ref) {
    return stage.settings().get(DRIVES) instanceof Setting.Word w && w.text().equals(ref);
  }

  private static int index(Chassis chassis, String ref) {
    for (int i = 0; i < chassis.stages().size(); i++) {
      if (chassis.stages().get(i).ref().equals(ref)) {
        return i;
      }
    }
    throw new IllegalArgumentException("no stage named " + ref);
  }
}
