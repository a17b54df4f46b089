package perveance.report;

import java.util.ArrayList;
import java.util.List;
import perveance.app.wording.Figures;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.analysis.PartDuty;
import perveance.engine.analysis.StageAnswer;
import perveance.engine.base.Unit;
import perveance.engine.device.Device;
import perveance.engine.device.Heater;
import perveance.engine.stage.StageCircuit;

/** The parts list: value, rating to buy, what it stands. */
final class PartRows {
  private static final double[] SHARES = {0.09, 0.175, 0.345, 0.39};

  private PartRows() {}

  static Block of(Typeface faces, SheetOptions options, PartDuty duty) {
    return row(
        faces,
        duty.designator(),
        Figures.part(duty.part().value(), duty.part().type().unit()),
        options.vocabulary().say(duty.buy().orElse(duty.part().role())),
        options.vocabulary().say(stands(duty)));
  }

  private static String stands(PartDuty duty) {
    return switch (duty.part().type()) {
      case RESISTOR -> watts(duty);
      case CAPACITOR, ELECTROLYTIC ->
          duty.coldVoltage() > 1.1 * Math.abs(duty.idleVoltage())
              ? "sees " + Figures.reading(duty.coldVoltage(), Unit.VOLT) + " cold"
              : Figures.reading(Math.abs(duty.idleVoltage()), Unit.VOLT);
      default -> duty.part().role();
    };
  }

  /** Idle watts; the worst case too where it is worse by enough to matter. */
  private static String watts(PartDuty duty) {
    boolean worse = duty.worstPower() > Math.max(0.02, 1.5 * duty.idlePower());
    return worse
        ? Figures.power(duty.idlePower())
            + ", "
            + Figures.power(duty.worstPower())
            + " with "
            + duty.worstCase()
        : Figures.power(Math.max(duty.idlePower(), duty.worstPower()));
  }

  /** One row per envelope type: base and heater. */
  static List<Block> valves(
      Typeface faces, SheetOptions options, ChassisAnswer chassis, StageAnswer stage) {
    List<Block> rows = new ArrayList<>();
    for (StageCircuit.StageDevice section : stage.circuit().devices()) {
      Device device = section.device();
      String heater =
          OtherPoints.heater(chassis, device).map(PartRows::heater).orElse("heater not known");
      rows.add(
          row(
              faces,
              section.ref(),
              device.type(),
              device.base(),
              options.vocabulary().say(heater)));
    }
    return rows;
  }

  private static String heater(Heater heater) {
    return (heater.directlyHeated() ? "filament " : "heater ")
        + Figures.reading(heater.voltage(), Unit.VOLT)
        + " "
        + Figures.reading(heater.current(), Unit.AMPERE);
  }

  private static Block row(Typeface faces, String name, String value, String buy, String stands) {
    return new RowBlock(
        faces,
        SHARES,
        List.of(Cell.bold(name), Cell.bold(value), Cell.plain(buy), Cell.soft(stands)),
        8.5,
        13,
        0);
  }
}
