package perveance.desktop.viewmodel;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import perveance.engine.analysis.AnalysisOptions;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.analysis.PartDuty;
import perveance.engine.analysis.StageAnswer;
import perveance.engine.analysis.SupplyAnswer;
import perveance.engine.base.Progress;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.Setting;
import perveance.engine.stage.StageEntry;
import perveance.engine.stage.Supply;
import perveance.engine.stage.SupplyFeed;

/**
 * A first answer in a large chassis: the chosen stage with those that hang together with it, on the
 * supply voltages solved last. The rest of the chassis keeps its last answer until the thorough one
 * comes.
 */
final class Nearby {
  /** A chassis of so few stages is answered whole. */
  private static final int FEW = 3;

  private Nearby() {}

  /** What is asked first. */
  record Question(Chassis chassis, String ref, @Nullable ChassisAnswer last) {}

  static ChassisAnswer answer(
      Engine engine, Question question, AnalysisOptions options, Progress progress) {
    ChassisAnswer last = question.last();
    if (last == null || question.chassis().stages().size() <= FEW) {
      return engine.answer(question.chassis(), options, progress);
    }
    Chassis part = part(question.chassis(), question.ref(), last);
    if (!engine.complaints(part).isEmpty()) {
      return engine.answer(question.chassis(), options, progress);
    }
    return merged(question.chassis(), last, engine.answer(part, options, progress));
  }

  /** The stages that are wired to one, fed by what the last answer found. */
  static Chassis part(Chassis chassis, String ref, ChassisAnswer last) {
    Set<String> near = new LinkedHashSet<>(Set.of(ref));
    boolean grown = true;
    while (grown) {
      grown = false;
      for (StageEntry stage : chassis.stages()) {
        String driven = driven(stage);
        if (near.contains(stage.ref()) && !driven.isEmpty()) {
          grown |= near.add(driven);
        } else if (near.contains(driven)) {
          grown |= near.add(stage.ref());
        }
      }
    }
    return new Chassis(
        chassis.title(),
        chassis.conditions(),
        chassis.supplies().stream().map(s -> held(s, chassis, last)).toList(),
        chassis.stages().stream().filter(s -> near.contains(s.ref())).toList());
  }

  private static String driven(StageEntry stage) {
    Setting drives = stage.settings().get("drives");
    return drives == null ? "" : drives.text();
  }

  /**
   * A node behind a dropper depends on every stage; until they are solved it stays where it was.
   */
  private static Supply held(Supply supply, Chassis chassis, ChassisAnswer last) {
    Optional<SupplyAnswer> solved =
        last.supplies().stream().filter(s -> s.name().equals(supply.name())).findFirst();
    return supply.feed() instanceof SupplyFeed.Dropped && solved.isPresent()
        ? new Supply(
            supply.name(),
            new SupplyFeed.Stated(solved.get().voltage() / chassis.conditions().mainsRatio()),
            supply.reservoir(),
            supply.bleeder(),
            supply.ratings())
        : supply;
  }

  private static ChassisAnswer merged(Chassis chassis, ChassisAnswer last, ChassisAnswer near) {
    Map<String, StageAnswer> fresh = new HashMap<>();
    near.stages().forEach(s -> fresh.put(s.ref(), s));
    Map<String, StageAnswer> old = new HashMap<>();
    last.stages().forEach(s -> old.put(s.ref(), s));
    Map<String, String> names = new HashMap<>();
    last.stages()
        .forEach(s -> s.parts().forEach(p -> names.put(p.part().element(), p.designator())));
    List<StageAnswer> stages = new ArrayList<>();
    for (StageEntry entry : chassis.stages()) {
      StageAnswer answer = fresh.get(entry.ref());
      if (answer != null) {
        stages.add(named(answer, names));
      } else if (old.get(entry.ref()) != null) {
        stages.add(old.get(entry.ref()));
      }
    }
    return new ChassisAnswer(
        chassis,
        last.supplies(),
        stages,
        near.failures(),
        last.discharges(),
        Math.max(last.highestVoltage(), near.highestVoltage()),
        last.chains(),
        last.findings());
  }

  /** Parts keep the numbers that they have in the whole chassis. */
  private static StageAnswer named(StageAnswer a, Map<String, String> names) {
    List<PartDuty> parts = a.parts().stream().map(p -> named(p, names)).toList();
    return new StageAnswer(
        a.ref(),
        a.kind(),
        a.circuit(),
        a.drawing(),
        a.points(),
        a.limits(),
        a.smallSignal(),
        a.clean(),
        a.driven(),
        a.levels(),
        a.large(),
        a.biasSupply(),
        parts,
        a.readings(),
        a.loadLine(),
        a.sums(),
        a.assumptions(),
        a.findings());
  }

  private static PartDuty named(PartDuty p, Map<String, String> names) {
    return new PartDuty(
        p.part(),
        names.getOrDefault(p.part().element(), p.designator()),
        p.idleVoltage(),
        p.idlePower(),
        p.workingPower(),
        p.worstVoltage(),
        p.worstPower(),
        p.worstCase(),
        p.coldVoltage(),
        p.nearest(),
        p.buy(),
        p.rated());
  }
}
