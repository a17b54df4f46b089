package perveance.files.json;

import java.io.IOException;
import java.util.Locale;
import perveance.engine.analysis.ExpectedReading;
import perveance.engine.analysis.LimitUse;
import perveance.engine.analysis.PartDuty;
import perveance.engine.analysis.StageAnswer;

/** Writes the lists of a stage: limits, parts, expected readings. */
final class PartJson {
  private PartJson() {}

  static void write(StageAnswer stage, JsonSink sink) throws IOException {
    sink.someObjects("limits", stage.limits(), limit -> limit(limit, sink));
    sink.someObjects("parts", stage.parts(), part -> part(part, sink));
    sink.someObjects("readings", stage.readings(), reading -> reading(reading, sink));
  }

  private static void limit(LimitUse limit, JsonSink sink) throws IOException {
    sink.text("ref", limit.ref());
    sink.text("what", limit.what());
    sink.text("when", limit.when());
    sink.number("value", limit.value());
    sink.number("limit", limit.limit());
    sink.text("unit", limit.unit().plainSymbol());
    sink.number("share", limit.share());
    sink.text("system", limit.system().word());
    sink.someText("source", limit.source());
  }

  private static void part(PartDuty duty, JsonSink sink) throws IOException {
    sink.text("part", duty.part().element());
    sink.someText("designator", duty.designator());
    sink.text("type", duty.part().type().name().toLowerCase(Locale.ROOT));
    sink.number("value", duty.part().value());
    sink.number("idle_V", duty.idleVoltage());
    sink.number("idle_W", duty.idlePower());
    sink.number("worst_V", duty.worstVoltage());
    sink.number("worst_W", duty.worstPower());
    sink.number("cold_V", duty.coldVoltage());
    sink.number("nearest", duty.nearest());
    sink.text("buy", duty.buy());
    sink.number("rated_W", duty.rated().power());
    sink.number("rated_V", duty.rated().voltage());
  }

  private static void reading(ExpectedReading reading, JsonSink sink) throws IOException {
    sink.whole("point", reading.testPoint());
    sink.someText("ref", reading.device());
    sink.someText("electrode", reading.electrode());
    sink.someText("pin", reading.pin());
    sink.number("true_V", reading.trueValue());
    sink.number("reading_V", reading.reading());
    sink.number("low_V", reading.low());
    sink.number("high_V", reading.high());
    sink.number("stop_V", reading.stop());
  }
}
