package perveance.engine.analysis;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import perveance.engine.stage.ChassisChecks;

/** Derived: what the trade says of a beam valve with its own screen feed is one connection. */
class ConnectionWordsTest {
  private static Bench output(String kind, String connection) {
    Bench bench = Bench.on(250);
    return bench.stage(
        "V1",
        kind,
        "device",
        "6V6GT",
        "connection",
        connection,
        "supply",
        "A",
        "primary",
        "8k",
        "cathode_resistor",
        "270",
        "screen_resistor",
        "470",
        "drive",
        "5 V");
  }

  private static Bench input(String connection) {
    return Bench.on(250)
        .stage(
            "V1",
            "common-cathode",
            "device",
            "EF86",
            "connection",
            connection,
            "supply",
            "A",
            "anode_load",
            "100k",
            "screen_resistor",
            "390k",
            "screen_bypass",
            "100n",
            "cathode_resistor",
            "1k",
            "grid_leak",
            "1M",
            "drive",
            "50 mV");
  }

  @ParameterizedTest
  @CsvSource({"beam, single-ended-output", "tetrode, push-pull-output", "beam, common-cathode"})
  void theSameCircuitAnswers(String word, String kind) {
    boolean output = kind.endsWith("output");
    StageAnswer said = (output ? output(kind, word) : input(word)).first();
    StageAnswer pentode = (output ? output(kind, "pentode") : input("pentode")).first();
    assertEquals(pentode.points(), said.points());
    assertEquals(pentode.smallSignal(), said.smallSignal());
    assertEquals(pentode.clean(), said.clean());
    assertEquals(pentode.driven(), said.driven());
    assertEquals(pentode.drawing(), said.drawing());
  }

  @Test
  void aTriodeHasNoSuchConnection() {
    Bench bench =
        Bench.on(300)
            .stage(
                "V1",
                "single-ended-output",
                "device",
                "2A3",
                "connection",
                "beam",
                "supply",
                "A",
                "primary",
                "2k5",
                "cathode_resistor",
                "750");
    assertEquals(
        List.of("stage V1 connection: found \"beam\" for a triode, expected no such key"),
        ChassisChecks.all(bench.chassis(), Bench.LIBRARY).stream().map(c -> c.message()).toList());
  }
}
