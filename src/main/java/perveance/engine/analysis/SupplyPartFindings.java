package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.base.Finding;
import perveance.engine.base.PartMessage;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.Remedy;
import perveance.engine.base.Severity;
import perveance.engine.base.Unit;
import perveance.engine.circuit.Circuit;
import perveance.engine.circuit.DcSolution;
import perveance.engine.stage.ChassisNames;
import perveance.engine.stage.Supply;

/** Findings about reservoirs, droppers and bleeders whose rating the file states. */
final class SupplyPartFindings {
  private final DcSolution idle;
  private final Optional<DcSolution> cold;
  private final List<Finding> findings = new ArrayList<>();

  private SupplyPartFindings(DcSolution idle, Optional<DcSolution> cold) {
    this.idle = idle;
    this.cold = cold;
  }

  static List<Finding> of(ChassisModel model, DcSolution idle, Optional<DcSolution> cold) {
    SupplyPartFindings all = new SupplyPartFindings(idle, cold);
    model.chassis().supplies().forEach(all::judge);
    return all.findings;
  }

  private void judge(Supply supply) {
    supply.ratings().reservoirVoltage().ifPresent(rated -> reservoir(supply, rated));
    supply.ratings().dropperPower().ifPresent(rated -> resistor(supply, "dropper", rated));
    supply.ratings().bleederPower().ifPresent(rated -> resistor(supply, "bleeder", rated));
  }

  /** What a part bears at most, warm or cold; nothing for a part that is not there. */
  private PartStress stress(String element) {
    PartStress warm = stress(idle, element);
    PartStress before = cold.map(dc -> stress(dc, element)).orElse(warm);
    return new PartStress(
        Math.max(warm.voltage(), before.voltage()), Math.max(warm.power(), before.power()));
  }

  private static PartStress stress(DcSolution dc, String element) {
    Circuit circuit = dc.circuit();
    boolean there = circuit.elements().stream().anyMatch(e -> e.name().equals(element));
    return there ? PartStress.of(dc, element) : new PartStress(0, 0);
  }

  private void reservoir(Supply supply, double rated) {
    String element = ChassisNames.supply(supply.name()) + ".reservoir";
    double volts = stress(element).voltage();
    if (volts > rated) {
      add(
          Finding.of(
              PartMessage.CAPACITOR_VOLTAGE_OVER,
              Severity.OVER_LIMIT,
              place(supply),
              "The reservoir of supply " + supply.name(),
              Words.of(volts, Unit.VOLT),
              Words.part(rated, Unit.VOLT)),
          volts,
          rated,
          Unit.VOLT,
          element,
          remedy("reservoir_voltage", RatingToBuy.electrolyticVoltage(volts), Unit.VOLT));
    }
  }

  private void resistor(Supply supply, String part, double rated) {
    String element = ChassisNames.supply(supply.name()) + "." + part;
    double watts = stress(element).power();
    String name = "The " + part + " of supply " + supply.name();
    Optional<Remedy> remedy = remedy(part + "_power", RatingToBuy.power(watts, watts), Unit.WATT);
    if (watts > rated) {
      Finding over =
          Finding.of(
              PartMessage.RESISTOR_POWER_OVER,
              Severity.OVER_LIMIT,
              place(supply),
              name,
              Words.of(watts, Unit.WATT),
              Words.part(rated, Unit.WATT));
      add(over, watts, rated, Unit.WATT, element, remedy);
    } else if (watts > PartRatingFindings.HOT * rated) {
      Finding near =
          Finding.of(
              PartMessage.RESISTOR_POWER_NEAR,
              Severity.CAUTION,
              place(supply),
              name,
              Words.of(watts, Unit.WATT),
              Words.percent(watts / rated),
              Words.part(rated, Unit.WATT));
      add(near, watts, rated, Unit.WATT, element, remedy);
    }
  }

  private static String place(Supply supply) {
    return Words.place(ChassisNames.supply(supply.name()));
  }

  private static Optional<Remedy> remedy(String key, OptionalDouble rating, Unit unit) {
    return rating.isEmpty()
        ? Optional.empty()
        : Optional.of(
            new Remedy(
                "Fit one of " + Words.part(rating.getAsDouble(), unit) + " or more.",
                Map.of(key, QuantityFormat.PLAIN.part(rating.getAsDouble(), unit))));
  }

  private void add(
      Finding finding,
      double value,
      double rated,
      Unit unit,
      String element,
      Optional<Remedy> remedy) {
    Finding told = finding.withValue(value, rated, unit).onPart(element);
    findings.add(remedy.map(told::withRemedy).orElse(told));
  }
}
