package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.base.PreferredSeries;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.Unit;
import perveance.engine.circuit.DcSolution;
import perveance.engine.stage.PartRatings;
import perveance.engine.stage.StageCircuit;
import perveance.engine.stage.StageCircuit.Part;
import perveance.engine.stage.StageCircuit.StageDevice;
import perveance.engine.stage.StageValues;

/** Works out what each part of a stage has to stand and which rating to buy. */
final class PartDuties {
  private static final String AT_DRIVE = "at the stated drive";

  private final StageCircuit stage;
  private final StageValues values;
  private final DcSolution idle;
  private final Optional<DcSolution> cold;
  private final List<State> worst = new ArrayList<>();

  /** A state that stresses parts, and its name. */
  private record State(String name, Map<String, PartStress> stress) {}

  PartDuties(
      StageModel model,
      StageValues values,
      DcSolution idle,
      FaultCircuits faults,
      Optional<DcSolution> cold) {
    this.stage = model.stage();
    this.values = values;
    this.idle = idle;
    this.cold = cold;
    for (StageDevice device : stage.devices()) {
      String ref = device.ref();
      faults.shorted(ref).ifPresent(dc -> add(ref + " shorted from anode to cathode", dc));
      faults
          .shortedToChassis(ref)
          .ifPresent(dc -> add(ref + " with its anode shorted to chassis", dc));
    }
  }

  private void add(String name, DcSolution dc) {
    Map<String, PartStress> stress = new HashMap<>();
    for (Part part : stage.parts()) {
      stress.put(part.element(), PartStress.of(dc, part.element()));
    }
    worst.add(new State(name, stress));
  }

  /** Adds what the parts bear at the stated drive, by element. */
  void addDriven(Map<String, PartStress> stress) {
    worst.add(new State(AT_DRIVE, Map.copyOf(stress)));
  }

  /** Duties of all parts, designators from R1 and C1 on. */
  List<PartDuty> all(Designators designators) {
    List<PartDuty> duties = new ArrayList<>();
    for (Part part : stage.parts()) {
      duties.add(duty(part, designators.next(part.type())));
    }
    return duties;
  }

  private PartDuty duty(Part part, String designator) {
    PartStress now = PartStress.of(idle, part.element());
    State hardest = null;
    for (State state : worst) {
      if (stress(state, part).power() > (hardest == null ? 0 : stress(hardest, part).power())
          || (hardest == null && stress(state, part).voltage() > now.voltage())) {
        hardest = state;
      }
    }
    double voltage = now.voltage();
    for (State state : worst) {
      voltage = Math.max(voltage, stress(state, part).voltage());
    }
    double power = hardest == null ? now.power() : stress(hardest, part).power();
    double coldVoltage = cold.map(dc -> PartStress.of(dc, part.element()).voltage()).orElse(0.0);
    double working = Math.max(now.power(), driven(part));
    return new PartDuty(
        part,
        designator,
        now.voltage(),
        now.power(),
        working,
        voltage,
        Math.max(power, now.power()),
        hardest == null ? LimitShares.IDLE : hardest.name(),
        coldVoltage,
        nearest(part),
        buy(part, working, power, Math.max(voltage, coldVoltage)),
        PartRatings.of(values, part.key()));
  }

  private static PartStress stress(State state, Part part) {
    return state.stress().getOrDefault(part.element(), new PartStress(0, 0));
  }

  private double driven(Part part) {
    return worst.stream()
        .filter(s -> s.name().equals(AT_DRIVE))
        .mapToDouble(s -> stress(s, part).power())
        .max()
        .orElse(0);
  }

  private static double nearest(Part part) {
    return switch (part.type()) {
      case RESISTOR -> PreferredSeries.E24.nearest(part.value());
      case CAPACITOR -> PreferredSeries.E12.nearest(part.value());
      case ELECTROLYTIC -> PreferredSeries.E6.nearest(part.value());
      default -> part.value();
    };
  }

  private static Optional<String> buy(Part part, double working, double fault, double highest) {
    if (PartRoles.isLoad(part) && working > 0 && part.key().startsWith("secondary")) {
      return Optional.of("takes " + text(working, Unit.WATT) + " at the stated drive");
    }
    return switch (part.type()) {
      case RESISTOR -> Optional.of(resistor(working, fault, highest));
      case CAPACITOR -> Optional.of(capacitor(RatingToBuy.filmVoltage(highest), highest));
      case ELECTROLYTIC ->
          Optional.of(capacitor(RatingToBuy.electrolyticVoltage(highest), highest));
      default -> Optional.empty();
    };
  }

  private static String resistor(double working, double fault, double highest) {
    OptionalDouble power = RatingToBuy.power(working, fault);
    String watts =
        power.isPresent()
            ? QuantityFormat.TYPESET.part(power.getAsDouble(), Unit.WATT)
            : "over " + text(2 * working, Unit.WATT);
    if (!RatingToBuy.bears(fault)) {
      return watts + "; a shorted valve puts " + text(fault, Unit.WATT) + " on it: fuse it";
    }
    OptionalDouble volts = RatingToBuy.resistorVoltage(highest);
    return volts.isPresent() ? watts + ", " + text(volts.getAsDouble()) + " or more" : watts;
  }

  private static String capacitor(OptionalDouble rating, double highest) {
    return rating.isPresent()
        ? text(rating.getAsDouble()) + " or more"
        : "two in series, " + text(highest / RatingToBuy.ELECTROLYTIC_USE) + " together";
  }

  private static String text(double volts) {
    return QuantityFormat.TYPESET.part(volts, Unit.VOLT, 3);
  }

  private static String text(double value, Unit unit) {
    return QuantityFormat.TYPESET.reading(value, unit, 2);
  }
}
