package perveance.files.toml;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.tomlj.Toml;
import org.tomlj.TomlParseResult;
import org.tomlj.TomlVersion;

/**
 * Our reader against an independent one (tomlj): both must accept the same texts and read the same
 * values out of them, over seeded damage to a text that holds every form.
 */
class TomlParserAgainstTomljTest {
  private static final int TEXTS = 3000;

  private static final String[] PIECES = {
    "[[stage]]\n",
    "[stage]\n",
    "[supply.A]\n",
    "[a.b]\n",
    "a.b = 1\n",
    "x = ",
    "= ",
    "\"",
    "'",
    "\"\"\"",
    "'''",
    "\\",
    "\\u0041",
    "#",
    "\n",
    "\r\n",
    "\r",
    ",",
    "[",
    "]",
    "{",
    "}",
    ".",
    "=",
    " ",
    "\t",
    "1",
    "0",
    "-",
    "+",
    "_",
    "e",
    "1e400",
    "0x1F",
    "0b2",
    "inf",
    "nan",
    "true",
    "false",
    "\u00B5",
    "\u03A9",
    "\u0001",
    "\uD83D\uDE00",
    "key",
    "\"key\"",
    "ref",
    "load",
    "100k"
  };

  private static final String SOUND =
      """
      # every form
      perveance = 1
      title = "a \\"b\\" \\u03A9" # note
      raw = 'C:\\dir'
      long = \"""
      one \\
        two
      ""three""\"""
      longraw = '''
      it's '''
      numbers = [1, -2, +3, 0, 1_000, 0xAF, 0o17, 0b101, 1.5, -0.0, 1e3, 6.02E+23, inf, -inf, nan]
      nested = [["a", 'b'], [], [1, "x", true]]
      braces = { a = 1, "b c" = { d = 'e' }, f.g = [1,2] }
      "quoted key" = false
      a.b.c = 1
      a.b.d = 2

      [supply.A]
      voltage = "300 V"
      [supply]
      order = ["A"]
      [[stage]]
      ref = "V1a"
      load = 1e5
      [stage.extra]
      note = ""
      [[stage]]
      ref = "V1b"
      """;

  @Test
  void theSoundTextReadsTheSame() {
    assertTrue(agrees(SOUND));
    assertTrue(agrees(SOUND.replace("\n", "\r\n")));
  }

  @Test
  void damagedTextsAreAcceptedOrRefusedAlike() {
    Random random = new Random(20_240_601L);
    int accepted = 0;
    for (int i = 0; i < TEXTS; i++) {
      String text = SOUND;
      int edits = 1 + random.nextInt(3);
      for (int edit = 0; edit < edits; edit++) {
        text = damaged(text, random);
      }
      if (!StandardCharsets.UTF_8.newEncoder().canEncode(text)) {
        continue; // half a character never leaves the decoder
      }
      accepted += agrees(text) ? 1 : 0;
    }
    // the damage must leave enough sound texts for the values to be compared
    assertTrue(accepted > TEXTS / 10, accepted + " accepted");
    assertTrue(accepted < TEXTS * 9 / 10, accepted + " accepted");
  }

  private static String damaged(String text, Random random) {
    int at = random.nextInt(text.length() + 1);
    int to = Math.min(text.length(), at + random.nextInt(4));
    return switch (random.nextInt(3)) {
      case 0 -> text.substring(0, at) + text.substring(to);
      case 1 -> text.substring(0, at) + PIECES[random.nextInt(PIECES.length)] + text.substring(at);
      default -> text.substring(0, at) + PIECES[random.nextInt(PIECES.length)] + text.substring(to);
    };
  }

  /** Returns whether both accept the text; fails when they differ. */
  private static boolean agrees(String text) {
    Problems problems = new Problems("x.toml");
    TomlTable ours = TomlParser.parse(SourceText.of("x.toml", text), problems);
    TomlParseResult theirs = Toml.parse(text, TomlVersion.V1_0_0);
    boolean accepted = !theirs.hasErrors();
    assertEquals(
        accepted, problems.isEmpty(), () -> text + "\n" + problems.list() + theirs.errors());
    if (accepted) {
      assertEquals(plain(theirs.toMap()).toString(), plain(ours).toString(), text);
    }
    return accepted;
  }

  private static Map<String, Object> plain(TomlTable table) {
    Map<String, Object> out = new LinkedHashMap<>();
    table.entries().forEach(e -> out.put(e.key(), plain(e.value())));
    return new java.util.TreeMap<>(out);
  }

  private static Object plain(TomlValue value) {
    if (value instanceof TomlValue.Text v) {
      return "t:" + v.text();
    } else if (value instanceof TomlValue.Whole v) {
      return "w:" + v.number();
    } else if (value instanceof TomlValue.Real v) {
      return "r:" + v.number();
    } else if (value instanceof TomlValue.Flag v) {
      return "f:" + v.flag();
    } else if (value instanceof TomlValue.Items v) {
      return v.values().stream().map(TomlParserAgainstTomljTest::plain).toList();
    } else if (value instanceof TomlValue.Table v) {
      return plain(v.table());
    } else if (value instanceof TomlValue.Tables v) {
      return v.tables().stream().map(TomlParserAgainstTomljTest::plain).toList();
    }
    throw new IllegalArgumentException(value.toString());
  }

  private static Object plain(Object value) {
    if (value instanceof Map<?, ?> map) {
      Map<String, Object> out = new java.util.TreeMap<>();
      map.forEach((k, v) -> out.put((String) k, plain(v)));
      return out;
    } else if (value instanceof org.tomlj.TomlTable table) {
      return plain(table.toMap());
    } else if (value instanceof org.tomlj.TomlArray array) {
      return plain(array.toList());
    } else if (value instanceof List<?> list) {
      List<Object> out = new ArrayList<>();
      list.forEach(v -> out.add(plain(v)));
      return out;
    } else if (value instanceof String text) {
      return "t:" + text;
    } else if (value instanceof Long whole) {
      return "w:" + whole;
    } else if (value instanceof Double real) {
      return "r:" + real;
    } else if (value instanceof Boolean flag) {
      return "f:" + flag;
    }
    return "other:" + value;
  }
}
