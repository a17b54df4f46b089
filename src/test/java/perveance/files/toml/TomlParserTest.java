package perveance.files.toml;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import perveance.engine.base.Problem;

/** Reading TOML: what is understood, where it stands, and how faults are told. */
class TomlParserTest {
  private static List<String> faults(String text) {
    Problems problems = new Problems("amp.toml");
    TomlParser.parse(SourceText.of("amp.toml", text), problems);
    return problems.list().stream().map(Problem::message).collect(Collectors.toList());
  }

  private static TomlTable good(String text) {
    Problems problems = new Problems("amp.toml");
    TomlTable root = TomlParser.parse(SourceText.of("amp.toml", text), problems);
    assertEquals(List.of(), problems.list());
    return root;
  }

  @Test
  void everyFormOfValueIsUnderstood() {
    TomlTable root =
        good(
            """
            basic = "a\\tb \\"c\\" \\u03A9"
            literal = 'C:\\x'
            many = \"""
            one
            two\\
               three\"""
            whole = 1_000
            hex = 0xFF
            real = 1.5e-3
            flag = true
            list = [ 1, # first
              2,
            ]
            braces = { a = 1, b.c = "x" }
            "quoted key" = 1
            dotted.key = 2
            [table]
            x = 1
            [[stage]]
            ref = "V1a"
            [[stage]]
            ref = "V1b"
            """);
    assertEquals("a\tb \"c\" \u03A9", text(root, "basic"));
    assertEquals("C:\\x", text(root, "literal"));
    assertEquals("one\ntwothree", text(root, "many"));
    assertEquals(1000, assertInstanceOf(TomlValue.Whole.class, value(root, "whole")).number());
    assertEquals(255, assertInstanceOf(TomlValue.Whole.class, value(root, "hex")).number());
    assertEquals(1.5e-3, assertInstanceOf(TomlValue.Real.class, value(root, "real")).number());
    assertTrue(assertInstanceOf(TomlValue.Flag.class, value(root, "flag")).flag());
    assertEquals(2, assertInstanceOf(TomlValue.Items.class, value(root, "list")).values().size());
    assertEquals("x", text(root.table("braces").orElseThrow().table("b").orElseThrow(), "c"));
    assertTrue(root.find("quoted key").isPresent());
    assertTrue(root.table("dotted").orElseThrow().find("key").isPresent());
    assertEquals("V1b", text(root.tables("stage").get(1), "ref"));
  }

  @Test
  void everyKeyAndValueKnowsItsPlace() {
    String text = "\uFEFF".substring(1) + "a = 1\r\n\r\n[[stage]]  # x\r\n  load = \"47k\" # y\r\n";
    TomlTable stage = good(text).tables("stage").get(0);
    TomlEntry load = stage.find("load").orElseThrow();
    assertEquals(3, stage.span().line());
    assertEquals("[[stage]]", text.substring(stage.span().start(), stage.span().end()));
    assertEquals(4, load.line());
    assertEquals("load", text.substring(load.keySpan().start(), load.keySpan().end()));
    assertEquals("\"47k\"", text.substring(load.value().span().start(), load.value().span().end()));
  }

  @Test
  void allFaultsAreToldAtOnceEachWithItsLine() {
    List<String> told =
        faults(
            """
            title = "open
            load = 100k
            [supply.A
            x = 1
            [[stage]]
            ref = \u201CV1a\u201D
            nothing =
            ref = "V1b"
            no equals
            """);
    assertEquals(
        List.of(
            "amp.toml:1: found \"open, expected a closing \" on the same line",
            "amp.toml:2: found 100k, expected text in quotes, a plain number, true or false;"
                + " did you mean \"100k\"?",
            "amp.toml:3: found [supply.A, expected a closing ]",
            "amp.toml:6: found \u201CV1a\u201D, expected text in straight quotes;"
                + " did you mean \"V1a\"?",
            "amp.toml:7: found nothing, expected a value behind the equals sign",
            "amp.toml:8: stage.ref: found ref a second time,"
                + " expected it once only; it stands in line 6 already",
            "amp.toml:9: found equals, expected an equals sign behind the key"),
        told);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "a = 1~a = 2 | 2",
        "[t]~[t] | 2",
        "a = 1~[a] | 2",
        "[[t]]~[t] | 2",
        "[t]~[[t]] | 2",
        "a = {b = 1}~[a.c] | 2",
        "a.b = 1~a = 2 | 2",
        "a = 1e400 | 1",
        "a = 99999999999999999999 | 1",
        "a = 01 | 1",
        "a = 1. | 1",
        "a = 1__0 | 1",
        "a = 1979-05-27 | 1",
        "a = 100 k | 1",
        "a = \"\\q\" | 1",
        "a = \"\\uD800\" | 1",
        "a = {b = 1,} | 1",
        "a = [1 2] | 1",
        "b = 1~a = [1, | 2",
        "a = \"\"\"x | 1",
        "= 1 | 1",
        "a. = 1 | 1",
        "a = \"x\" y | 1",
        "a = 'x | 1"
      })
  void oneFaultIsToldOnceAtItsLine(String text, int line) {
    List<String> told = faults(text.replace('~', '\n'));
    assertEquals(1, told.size(), told.toString());
    assertTrue(told.get(0).startsWith("amp.toml:" + line + ": "), told.get(0));
  }

  @Test
  void anUnclosedListDoesNotSwallowTheTableBelowIt() {
    List<String> told = faults("pins = [\"1 a\",\n \"2 g\"\n\n[[heater]]\nvoltage = 1\nx = \n");
    assertEquals(
        List.of(
            "amp.toml:4: found [[heater]], expected a comma or a closing ]",
            "amp.toml:6: found nothing, expected a value behind the equals sign"),
        told);
  }

  @Test
  void nestingIsLimitedNotFatal() {
    List<String> told = faults("a = " + "[".repeat(100_000) + "\nb = " + "{a=".repeat(100_000));
    assertEquals(2, told.size());
    assertTrue(told.get(0).contains("nested too deep"), told.get(0));
  }

  @Test
  void manyFaultsAreCutShortAndCounted() {
    StringBuilder text = new StringBuilder();
    for (int i = 0; i < 1000; i++) {
      text.append("x").append(i).append(" = 1k\n");
    }
    List<String> told = faults(text.toString());
    assertEquals(Problems.MOST + 1, told.size());
    assertTrue(told.get(Problems.MOST).contains("900 more problems"), told.get(Problems.MOST));
  }

  private static TomlValue value(TomlTable table, String key) {
    return table.find(key).orElseThrow().value();
  }

  private static String text(TomlTable table, String key) {
    return assertInstanceOf(TomlValue.Text.class, value(table, key)).text();
  }
}
