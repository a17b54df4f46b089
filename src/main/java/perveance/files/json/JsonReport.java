package perveance.files.json;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import java.io.IOException;
import java.io.OutputStream;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.analysis.SupplyAnswer;

/**
 * Writes the answer for a chassis as one JSON object.
 *
 * <p>The names are a contract: they may be added to, never changed. Each holds its SI unit, as in
 * {@code anode_chassis_V}; ratios are plain numbers. What is absent is left out.
 */
public final class JsonReport {
  /** The version of the contract. */
  private static final int VERSION = 1;

  private JsonReport() {}

  /**
   * Writes an answer, in UTF-8 and with a line end behind it.
   *
   * @param answer the answer
   * @param out where to; stays open
   * @throws IOException when it cannot be written
   */
  public static void write(ChassisAnswer answer, OutputStream out) throws IOException {
    write(out, sink -> write(answer, sink));
  }

  /** Writes one object in UTF-8 with a line end behind it. */
  static void write(OutputStream out, JsonSink.MembersOf<JsonSink> members) throws IOException {
    DefaultIndenter indent = new DefaultIndenter("  ", "\n");
    try (JsonGenerator generator = new JsonFactory().createGenerator(out)) {
      generator.disable(JsonGenerator.Feature.AUTO_CLOSE_TARGET);
      generator.setPrettyPrinter(new DefaultPrettyPrinter().withObjectIndenter(indent));
      JsonSink sink = new JsonSink(generator);
      sink.root(() -> members.write(sink));
      generator.writeRaw('\n');
    }
  }

  private static void write(ChassisAnswer answer, JsonSink sink) throws IOException {
    sink.whole("perveance", VERSION);
    sink.text("title", answer.chassis().title());
    sink.object(
        "supply",
        () -> {
          for (SupplyAnswer supply : answer.supplies()) {
            sink.object(supply.name(), () -> supply(supply, sink));
          }
        });
    StageJson stages = new StageJson(answer.chassis(), sink);
    sink.objects("stages", answer.stages(), stages::write);
    sink.someObjects(
        "unsolved",
        answer.failures(),
        failure -> {
          sink.text("ref", failure.ref());
          sink.text("reason", failure.reason());
        });
    sink.objects("findings", answer.findings(), finding -> FindingJson.write(finding, sink));
    sink.someObjects("chains", answer.chains(), chain -> ChainJson.write(chain, sink));
    sink.someObjects("stored", answer.discharges(), one -> FindingJson.write(one, sink));
    sink.number("highest_V", answer.highestVoltage());
  }

  private static void supply(SupplyAnswer supply, JsonSink sink) throws IOException {
    sink.number("voltage_V", supply.voltage());
    sink.number("current_A", supply.current());
    sink.number("ripple_V_rms", supply.ripple());
    sink.number("cold_V", supply.coldVoltage());
    sink.number("dropper_W", supply.dropperPower());
    sink.object(
        "band", () -> sink.numbers("voltage_V", java.util.List.of(supply.low(), supply.high())));
  }
}
