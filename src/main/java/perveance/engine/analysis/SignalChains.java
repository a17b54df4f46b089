package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import perveance.engine.analysis.SignalChain.Link;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.Setting;
import perveance.engine.stage.StageEntry;

/** Follows the signal through stages that drive each other. */
final class SignalChains {
  private SignalChains() {}

  /** Every row of two stages or more, in the order of the chassis. */
  static List<SignalChain> of(Chassis chassis, List<StageAnswer> stages) {
    Set<String> driven = new HashSet<>();
    chassis.stages().forEach(s -> drives(s).ifPresent(driven::add));
    List<SignalChain> chains = new ArrayList<>();
    for (StageEntry first : chassis.stages()) {
      if (!driven.contains(first.ref())) {
        List<StageAnswer> row = row(chassis, first, stages);
        if (row.size() > 1) {
          chains.add(chain(row, drive(first)));
        }
      }
    }
    return chains;
  }

  private static Optional<String> drives(StageEntry stage) {
    return Optional.ofNullable(stage.settings().get("drives")).map(Setting::text);
  }

  private static OptionalDouble drive(StageEntry stage) {
    return stage.settings().get("drive") instanceof Setting.Number n
        ? OptionalDouble.of(n.value())
        : OptionalDouble.empty();
  }

  /** The answered stages from one on; a stage without an answer ends the row. */
  private static List<StageAnswer> row(
      Chassis chassis, StageEntry first, List<StageAnswer> stages) {
    List<StageAnswer> row = new ArrayList<>();
    Optional<StageEntry> at = Optional.of(first);
    while (at.isPresent()) {
      String ref = at.get().ref();
      Optional<StageAnswer> answer = stages.stream().filter(s -> s.ref().equals(ref)).findFirst();
      answer.ifPresent(row::add);
      at = answer.isEmpty() ? Optional.empty() : drives(at.get()).flatMap(chassis::stage);
    }
    return row;
  }

  private static SignalChain chain(List<StageAnswer> row, OptionalDouble drive) {
    double[] before = new double[row.size()];
    double gain = 1;
    int first = 0;
    for (int i = 0; i < before.length; i++) {
      before[i] = gain;
      gain *= row.get(i).smallSignal().gain();
      first = end(row.get(i), before[i]) < end(row.get(first), before[first]) ? i : first;
    }
    double input = end(row.get(first), before[first]);
    List<Link> links = new ArrayList<>();
    for (int i = 0; i < before.length; i++) {
      links.add(link(row.get(i), Math.abs(before[i]), input, drive));
    }
    CleanSwing clean = row.get(first).clean();
    return new SignalChain(
        links,
        gain,
        row.get(first).ref(),
        clean.limitedBy(),
        clean.limitedAt(),
        input,
        input * Math.abs(gain),
        drive);
  }

  /** Peak input of the row at which a stage is at its end [V]. */
  private static double end(StageAnswer stage, double before) {
    return stage.clean().inputPeak() / Math.abs(before);
  }

  private static Link link(StageAnswer stage, double before, double input, OptionalDouble drive) {
    double gain = stage.smallSignal().gain();
    double at = input * before;
    double spare = 20 * Math.log10(stage.clean().inputPeak() / at);
    OptionalDouble driven =
        drive.isPresent() ? OptionalDouble.of(drive.getAsDouble() * before) : drive;
    return new Link(
        stage.ref(),
        gain,
        at,
        at * Math.abs(gain),
        Double.isFinite(spare) ? spare : 0,
        driven,
        driven.isPresent() ? OptionalDouble.of(driven.getAsDouble() * Math.abs(gain)) : driven);
  }
}
