package perveance.desktop.viewmodel;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import perveance.app.Edit;
import perveance.engine.base.QuantityException;
import perveance.engine.base.QuantityParser;
import perveance.engine.base.Remedy;
import perveance.engine.base.Unit;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.Supply;
import perveance.engine.stage.SupplyRatings;

/** Turns a remedy into edits of the stage or of the supply node that its finding is about. */
final class RemedyEdits {
  private static final String SUPPLY = "supply ";

  private RemedyEdits() {}

  /**
   * Edits or a refusal.
   *
   * @param edits in order, empty when refused
   * @param refused why not, empty when all is well
   */
  record Outcome(List<Edit> edits, Optional<String> refused) {}

  /**
   * The edits that carry a remedy out.
   *
   * @param chassis chassis
   * @param where place of the finding
   * @param stage the stage that the place belongs to
   * @param remedy what to do
   */
  static Outcome of(Chassis chassis, String where, String stage, Remedy remedy) {
    Optional<Supply> supply =
        where.startsWith(SUPPLY)
            ? chassis.supply(where.substring(SUPPLY.length()))
            : Optional.empty();
    List<Edit> edits = new ArrayList<>();
    for (Map.Entry<String, String> e : remedy.edits().entrySet()) {
      KeyEditor.Outcome outcome =
          supply.isPresent()
              ? supply(supply.get(), e.getKey(), e.getValue())
              : KeyEditor.parse(chassis, stage, e.getKey(), e.getValue());
      if (outcome instanceof KeyEditor.Outcome.Accepted accepted) {
        edits.add(accepted.edit());
        // the next key of a node goes on from this one
        supply = accepted.edit() instanceof Edit.SetSupply set ? Optional.of(set.supply()) : supply;
      } else if (outcome instanceof KeyEditor.Outcome.Refused refused) {
        return new Outcome(List.of(), Optional.of(refused.why()));
      }
    }
    return new Outcome(edits, Optional.empty());
  }

  private static KeyEditor.Outcome supply(Supply supply, String key, String text) {
    SupplyRatings r = supply.ratings();
    try {
      Supply changed =
          switch (key) {
            case "bleeder" -> supply.withBleeder(QuantityParser.parse(text, Unit.OHM).value());
            case "reservoir_voltage" ->
                supply.with(
                    new SupplyRatings(number(text, Unit.VOLT), r.dropperPower(), r.bleederPower()));
            case "dropper_power" ->
                supply.with(
                    new SupplyRatings(
                        r.reservoirVoltage(), number(text, Unit.WATT), r.bleederPower()));
            case "bleeder_power" ->
                supply.with(
                    new SupplyRatings(
                        r.reservoirVoltage(), r.dropperPower(), number(text, Unit.WATT)));
            default -> supply;
          };
      return changed.equals(supply)
          ? new KeyEditor.Outcome.Refused(
              "Supply " + supply.name() + " has no " + KeyEditor.words(key) + ".")
          : new KeyEditor.Outcome.Accepted(new Edit.SetSupply(changed));
    } catch (QuantityException e) {
      return new KeyEditor.Outcome.Refused(
          "Found " + e.found() + ", expected " + e.expected() + ".");
    }
  }

  private static OptionalDouble number(String text, Unit unit) throws QuantityException {
    return OptionalDouble.of(QuantityParser.parse(text, unit).value());
  }
}
