package perveance.files.json;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Set;
import java.util.stream.Collectors;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

/** The JSON object against the contract: its names, its numbers, what is absent. */
class JsonReportTest {
  private String text = "";
  private Map<String, Object> root = Map.of();

  @BeforeEach
  void writeAndParse() throws IOException {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    JsonReport.write(SampleAnswer.chassis(), out);
    text = out.toString(StandardCharsets.UTF_8);
    root = parsed(text);
  }

  @Test
  void theObjectHasTheMembersOfTheContract() {
    requires(root, "perveance title supply stages findings");
    assertEquals(1L, root.get("perveance"));
    assertEquals("\u00B5 \"amp\"", root.get("title"));
    requires(object(object(root, "supply"), "A"), "voltage_V current_A ripple_V_rms");
    Map<String, Object> stage = objects(root, "stages").get(0);
    requires(
        stage,
        "ref kind device operating_point gain gain2 output_ohm input_F low_3dB_Hz high_3dB_Hz"
            + " noise_input_V_rms clean driven levels");
    requires(
        objects(stage, "operating_point").get(0),
        "ref anode_V grid_V screen_V anode_chassis_V cathode_chassis_V anode_A screen_A grid_A gm_S"
            + " ra_ohm mu anode_W screen_W band");
    requires(object(stage, "clean"), "input_peak_V output_peak_V limited_by");
    requires(
        object(stage, "driven"), "input_peak_V output_V_rms output_W thd h2 h3 anode_A screen_A");
    requires(objects(stage, "levels").get(0), "input_peak_V output_V_rms thd h");
    requires(objects(root, "findings").get(0), "code severity where value limit unit text remedy");
  }

  @Test
  void overloadAndReactiveLoadHaveTheirOwnNames() {
    Map<String, Object> stage = objects(root, "stages").get(0);
    assertEquals(
        Map.of(
            "input_peak_V", 3.0,
            "capacitor", "V1a.input_coupling",
            "capacitor_F", 1e-7,
            "charge_V", 1.25,
            "leak_ohm", 2.2e5,
            "recovery_s", 0.045),
        object(stage, "recovery"));
    Map<String, Object> reactive = object(stage, "reactive");
    requires(
        reactive,
        "frequency_Hz input_peak_V output_V_rms output_W peak_anode_V peak_anode_A anode_W"
            + " peak_anode_W crosses_dissipation cut_off");
    assertEquals(440.5, reactive.get("peak_anode_V"));
    assertEquals(List.of(8.75), reactive.get("anode_W"));
    assertEquals(19.5, reactive.get("peak_anode_W"));
    assertEquals(true, reactive.get("crosses_dissipation"));
    assertEquals(false, reactive.get("cut_off"));
  }

  @Test
  void theBiasSupplyHasItsOwnNames() {
    assertEquals(
        Map.of(
            "voltage_V", -58.0,
            "current_A", 7.2e-4,
            "most_negative_V", -48.0,
            "least_negative_V", -30.0,
            "setting", 0.25),
        object(objects(root, "stages").get(0), "bias_supply"));
  }

  @Test
  void everyFigureStandsUnderItsOwnName() {
    Map<String, Object> stage = objects(root, "stages").get(0);
    assertEquals("V1a", stage.get("ref"));
    assertEquals("6267", stage.get("device"));
    assertEquals(-58.25, stage.get("gain"));
    assertEquals(0.9, stage.get("gain2"));
    assertEquals(38e3, stage.get("output_ohm"));
    assertEquals(1.2e-10, stage.get("input_F"));
    assertEquals(7.2, stage.get("low_3dB_Hz"));
    assertEquals(1.1e5, stage.get("high_3dB_Hz"));
    assertEquals(2e-6, stage.get("noise_input_V_rms"));
    assertEquals(List.of(-62.0, -54.0), object(stage, "band").get("gain"));
    Map<String, Object> point = objects(stage, "operating_point").get(0);
    assertEquals(101.5, point.get("anode_V"));
    assertEquals(-2.0, point.get("grid_V"));
    assertEquals(90.0, point.get("screen_V"));
    assertEquals(103.5, point.get("anode_chassis_V"));
    assertEquals(2.0, point.get("cathode_chassis_V"));
    assertEquals(3e-4, point.get("screen_A"));
    assertEquals(1.8e-3, point.get("gm_S"));
    assertEquals(2.5e6, point.get("ra_ohm"));
    assertEquals(38.0, point.get("mu"));
    assertEquals(0.12, point.get("anode_W"));
    assertEquals(0.03, point.get("screen_W"));
    assertEquals(Map.of("anode_chassis_V", List.of(98.0, 109.0)), point.get("band"));
    Map<String, Object> driven = object(stage, "driven");
    assertEquals(0.039, driven.get("thd"));
    assertEquals(0.038, driven.get("h2"));
    assertEquals(0.004, driven.get("h3"));
    assertEquals(1.21e-3, driven.get("anode_A"));
    assertEquals("grid-current", object(stage, "clean").get("limited_by"));
    assertEquals(List.of(0.038, 0.004, 0.0005), objects(stage, "levels").get(1).get("h"));
    Map<String, Object> finding = objects(root, "findings").get(0);
    assertEquals("over-limit", finding.get("severity"));
    assertEquals("W", finding.get("unit"));
    assertEquals("Raise \"anode_load\" to 120k.", finding.get("remedy"));
    assertEquals(Map.of("anode_load", "120k"), finding.get("remedy_edits"));
  }

  @Test
  void whatIsAbsentIsLeftOut() {
    Map<String, Object> stage = objects(root, "stages").get(1);
    assertFalse(stage.containsKey("driven"));
    assertFalse(stage.containsKey("gain2"));
    assertFalse(stage.containsKey("low_3dB_Hz"));
    assertEquals("12AX7", stage.get("device"));
    Map<String, Object> point = objects(stage, "operating_point").get(0);
    assertFalse(point.containsKey("screen_V"));
    assertFalse(point.containsKey("ra_ohm"), "an infinite resistance is no number");
    assertFalse(point.containsKey("band"));
    assertFalse(object(object(root, "supply"), "B").containsKey("ripple_V_rms"));
    assertFalse(objects(root, "stored").get(0).containsKey("seconds"));
    assertFalse(text.contains("null"), text);
    assertFalse(text.contains("NaN") || text.contains("Infinity"), text);
  }

  @Test
  void numbersHaveTheirDigitsAndNoNoise() {
    assertTrue(text.contains("\"anode_A\" : 0.0012,"), text);
    assertTrue(text.contains("\"grid_A\" : 0.0,"), text);
    assertTrue(text.endsWith("}\n"));
  }

  @Test
  void theStreamStaysOpen() throws IOException {
    boolean[] closed = {false};
    ByteArrayOutputStream out =
        new ByteArrayOutputStream() {
          @Override
          public void close() {
            closed[0] = true;
          }
        };
    JsonReport.write(SampleAnswer.chassis(), out);
    assertFalse(closed[0]);
    assertTrue(out.size() > 0);
  }

  private static void requires(Map<String, Object> object, String names) {
    Set<String> missing = Set.of(names.split(" "));
    assertEquals(
        "", missing.stream().filter(n -> !object.containsKey(n)).collect(Collectors.joining(" ")));
  }

  @SuppressWarnings("unchecked")
  private static Map<String, Object> object(Map<String, Object> in, String name) {
    return assertInstanceOf(Map.class, in.get(name));
  }

  @SuppressWarnings("unchecked")
  private static List<Map<String, Object>> objects(Map<String, Object> in, String name) {
    return assertInstanceOf(List.class, in.get(name));
  }

  @SuppressWarnings("unchecked")
  private static Map<String, Object> parsed(String json) throws IOException {
    try (JsonParser parser = new JsonFactory().createParser(json)) {
      parser.nextToken();
      Object value = value(parser);
      assertEquals(null, parser.nextToken(), "one object and nothing behind it");
      return assertInstanceOf(Map.class, value);
    }
  }

  private static Object value(JsonParser parser) throws IOException {
    JsonToken token = Objects.requireNonNull(parser.currentToken());
    switch (token) {
      case START_OBJECT:
        Map<String, Object> members = new LinkedHashMap<>();
        while (parser.nextToken() != JsonToken.END_OBJECT) {
          String name = parser.currentName();
          parser.nextToken();
          assertFalse(members.containsKey(name), name);
          members.put(name, value(parser));
        }
        return members;
      case START_ARRAY:
        List<Object> values = new ArrayList<>();
        while (parser.nextToken() != JsonToken.END_ARRAY) {
          values.add(value(parser));
        }
        return values;
      case VALUE_NUMBER_INT:
        return parser.getLongValue();
      case VALUE_NUMBER_FLOAT:
        return parser.getDoubleValue();
      case VALUE_TRUE, VALUE_FALSE:
        return parser.getBooleanValue();
      case VALUE_STRING:
        return parser.getText();
      default:
        throw new AssertionError("unexpected " + token);
    }
  }
}
