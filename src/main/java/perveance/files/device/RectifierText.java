package perveance.files.device;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.base.Unit;
import perveance.engine.device.LimitingResistance;
import perveance.engine.device.RectifierLimit;
import perveance.engine.device.RectifierOutput;
import perveance.engine.device.RectifierRatings;

/** The tables of a rectifier, as they stand in its file. */
final class RectifierText {
  private RectifierText() {}

  static List<String> blocks(RectifierRatings rectifier) {
    List<String> blocks = new ArrayList<>();
    rectifier.limits().forEach(limit -> blocks.add(limit(limit)));
    rectifier.limitingResistances().forEach(one -> blocks.add(resistance(one)));
    rectifier.outputs().forEach(output -> blocks.add(output(output)));
    if (blocks.isEmpty()) {
      blocks.add("[rectifier]\n");
    }
    return blocks;
  }

  private static String limit(RectifierLimit limit) {
    Values values =
        new Values()
            .text("type", limit.type())
            .text("system", limit.system().word())
            .text("filter", limit.filter().word())
            .quantity("anode_voltage", limit.anodeVoltage(), Unit.VOLT)
            .quantity("output_current", limit.outputCurrent(), Unit.AMPERE)
            .quantity("peak_current", limit.peakCurrent(), Unit.AMPERE)
            .quantity("inverse_voltage", limit.inverseVoltage(), Unit.VOLT)
            .quantity("capacitance", limit.capacitance(), Unit.FARAD)
            .quantity("heater_voltage", limit.heaterVoltage(), Unit.VOLT);
    return sourced(values, limit.source(), limit.how(), limit.confidence(), limit.note())
        .block("[[rectifier.limit]]");
  }

  private static String resistance(LimitingResistance one) {
    Values values =
        new Values()
            .quantity("anode_voltage", one.anodeVoltage(), Unit.VOLT)
            .quantity("resistance", one.resistance(), Unit.OHM);
    return sourced(values, one.source(), one.how(), one.confidence(), one.note())
        .block("[[rectifier.resistance]]");
  }

  private static String output(RectifierOutput output) {
    Values values =
        new Values()
            .text("filter", output.filter().word())
            .quantity("anode_voltage", output.anodeVoltage(), Unit.VOLT)
            .quantity("output_current", output.outputCurrent(), Unit.AMPERE)
            .quantity("capacitance", output.capacitance(), Unit.FARAD)
            .quantity("resistance", output.resistance(), Unit.OHM)
            .quantity("output_voltage", output.outputVoltage(), Unit.VOLT);
    return sourced(values, output.source(), output.how(), output.confidence(), output.note())
        .block("[[rectifier.output]]");
  }

  private static Values sourced(
      Values values, String source, String how, String confidence, String note) {
    return values
        .text("source", source)
        .text("how", how)
        .text("confidence", confidence)
        .text("note", note);
  }
}
