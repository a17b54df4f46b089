package perveance.files.toml;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Edits leave every other character as it was. */
class TomlEditorTest {
  private static final List<String> ORDER = List.of("ref", "kind", "load", "bypass", "drive");

  private static final String TEXT =
      """
      # my amplifier
      perveance = 1   # version

      title = "x"

      [supply.A]  # main
      voltage = "300 V"

      # -- input --

      # first
      [[stage]]
      ref = "V1a"  # left
      load   =   "100k"  # carbon
      # about the drive
      drive = "1 V"
      # end of first

      # second
      [[stage]]  # two
        ref = 'V1b'

      # -- output --

      [[stage]]
      ref = "V2"
      """;

  private final TomlEditor editor =
      new TomlEditor(SourceText.of("a.toml", TEXT), KeyWords.AS_WRITTEN);
  private final List<TomlTable> stages = editor.root().tables("stage");

  @ParameterizedTest
  @ValueSource(
      strings = {"", "\n", "#x", "a=1", "a=1\n[b]", "[b]\n#c\n\n#d\n\n", "\n\n[[a]]\n\n[[a]]"})
  void withoutEditsTheTextStaysAsItIs(String text) {
    assertEquals(text, new TomlEditor(SourceText.of("a.toml", text), KeyWords.AS_WRITTEN).result());
    String windows = text.replace("\n", "\r\n");
    assertEquals(
        windows, new TomlEditor(SourceText.of("a.toml", windows), KeyWords.AS_WRITTEN).result());
    assertEquals(TEXT, editor.result());
  }

  @Test
  void aValueIsReplacedWithItsCommentAndAlignmentKept() {
    editor.set(stages.get(0), "load", "\"120k\"", ORDER);
    assertEquals(TEXT.replace("\"100k\"  # carbon", "\"120k\"  # carbon"), editor.result());
  }

  @Test
  void aNewKeyGoesBesideItsUsualNeighbourWithItsIndent() {
    editor.set(stages.get(0), "bypass", "\"22u\"", ORDER);
    editor.set(stages.get(0), "kind", "\"cc\"", ORDER);
    editor.set(stages.get(1), "kind", "\"cf\"", ORDER);
    editor.set(stages.get(2), "odd", "1", ORDER);
    assertEquals(
        TEXT.replace("# left\n", "# left\nkind = \"cc\"\n")
            .replace("# carbon\n", "# carbon\nbypass = \"22u\"\n")
            .replace("  ref = 'V1b'\n", "  ref = 'V1b'\n  kind = \"cf\"\n")
            .replace("ref = \"V2\"\n", "ref = \"V2\"\nodd = 1\n"),
        editor.result());
  }

  @Test
  void aKeyThatComesFirstGoesAboveTheCommentsOfTheNext() {
    String text = "[[stage]]\n# the drive\ndrive = 1\n";
    TomlEditor other = new TomlEditor(SourceText.of("a.toml", text), KeyWords.AS_WRITTEN);
    other.set(other.root().tables("stage").get(0), "load", "2", ORDER);
    assertEquals("[[stage]]\nload = 2\n# the drive\ndrive = 1\n", other.result());
  }

  @Test
  void aRemovedKeyTakesTheCommentBehindItAndNoOther() {
    editor.remove(stages.get(0), "load");
    editor.remove(stages.get(0), "drive");
    assertEquals(
        TEXT.replace("load   =   \"100k\"  # carbon\n", "").replace("drive = \"1 V\"\n", ""),
        editor.result());
  }

  @Test
  void aKeyIsAddedWhereTheLastLineHasNoEnd() {
    TomlEditor other =
        new TomlEditor(SourceText.of("a.toml", "[[stage]]\r\nref = 1"), KeyWords.AS_WRITTEN);
    TomlTable stage = other.root().tables("stage").get(0);
    other.set(stage, "kind", "2", ORDER);
    other.set(stage, "load", "3", ORDER);
    assertEquals("[[stage]]\r\nref = 1\r\nkind = 2\r\nload = 3", other.result());
  }

  @Test
  void stagesChangePlacesWithTheirCommentsWhileHeadingsStay() {
    editor.arrange(stages, kept(2, 0, 1));
    assertEquals(
        """
        # my amplifier
        perveance = 1   # version

        title = "x"

        [supply.A]  # main
        voltage = "300 V"

        # -- input --

        [[stage]]
        ref = "V2"

        # first
        [[stage]]
        ref = "V1a"  # left
        load   =   "100k"  # carbon
        # about the drive
        drive = "1 V"
        # end of first

        # -- output --

        # second
        [[stage]]  # two
          ref = 'V1b'
        """,
        editor.result());
  }

  @Test
  void aRemovedStageTakesItsOwnCommentsAndLeavesTheHeadings() {
    editor.arrange(stages, kept(1));
    assertEquals(
        """
        # my amplifier
        perveance = 1   # version

        title = "x"

        [supply.A]  # main
        voltage = "300 V"

        # -- input --

        # second
        [[stage]]  # two
          ref = 'V1b'

        # -- output --
        """,
        editor.result());
  }

  @Test
  void newStagesGoWhereTheyAreWanted() {
    String fresh = editor.block("[[stage]]", values("ref", "\"N\"", "odd key", "1"));
    editor.arrange(
        stages,
        List.of(
            new BlockWanted.New(fresh),
            new BlockWanted.Kept(stages.get(0)),
            new BlockWanted.New(fresh.replace("N", "M")),
            new BlockWanted.New(fresh.replace("N", "O")),
            new BlockWanted.Kept(stages.get(1)),
            new BlockWanted.Kept(stages.get(2)),
            new BlockWanted.New(fresh.replace("N", "P"))));
    String block = "[[stage]]\nref = \"N\"\n\"odd key\" = 1\n";
    assertEquals(
        TEXT.replace("# first\n", block + "\n# first\n")
                .replace(
                    "# end of first\n",
                    "# end of first\n\n" + block.replace("N", "M") + "\n" + block.replace("N", "O"))
            + "\n"
            + block.replace("N", "P"),
        editor.result());
  }

  @Test
  void aFileWithoutStagesGetsThemAtItsEnd() {
    TomlEditor other = new TomlEditor(SourceText.of("a.toml", "a = 1\n# bye"), KeyWords.AS_WRITTEN);
    String fresh = other.block("[[stage]]", values("ref", "1"));
    other.arrange(List.of(), List.of(new BlockWanted.New(fresh), new BlockWanted.New(fresh)));
    assertEquals("a = 1\n# bye\n\n[[stage]]\nref = 1\n\n[[stage]]\nref = 1\n", other.result());
  }

  @Test
  void aTableIsAddedAboveANeighbour() {
    editor.addAbove(editor.block("[conditions]", values("mains", "1")), Optional.of(stages.get(0)));
    assertEquals(
        TEXT.replace("# first\n", "[conditions]\nmains = 1\n\n# first\n"), editor.result());
  }

  @Test
  void tablesInBracesAndDottedKeysAreEditedInTheirOwnForm() {
    String text =
        "supply = { A = { voltage = 1, reservoir = 2 }, B = {} } # s\nc.mains = 1 # m\nc.x = 2\n";
    TomlEditor other = new TomlEditor(SourceText.of("a.toml", text), KeyWords.AS_WRITTEN);
    TomlTable supply = other.root().table("supply").orElseThrow();
    TomlTable a = supply.table("A").orElseThrow();
    TomlTable c = other.root().table("c").orElseThrow();
    other.set(a, "bleeder", "3", List.of());
    other.remove(a, "voltage");
    other.set(supply.table("B").orElseThrow(), "voltage", "9", List.of());
    other.set(c, "meter", "7", List.of());
    other.remove(c, "mains");
    assertEquals(
        "supply = { A = { reservoir = 2, bleeder = 3 }, B = { voltage = 9 } } # s\n"
            + "c.x = 2\nc.meter = 7\n",
        other.result());
    TomlEditor again = new TomlEditor(SourceText.of("a.toml", text), KeyWords.AS_WRITTEN);
    again.remove(again.root().table("supply").orElseThrow(), "B");
    again.remove(again.root(), "c");
    assertEquals("supply = { A = { voltage = 1, reservoir = 2 } } # s\n", again.result());
  }

  @Test
  void commasInBracesComeOutRightWhateverGoesAndComes() {
    List<String> keys = List.of("a", "b", "c");
    for (int removed = 0; removed < 8; removed++) {
      for (int added = 0; added < 3; added++) {
        TomlEditor other =
            new TomlEditor(
                SourceText.of("a.toml", "t = {a = 1, b = 2,c = 3 } # x"), KeyWords.AS_WRITTEN);
        TomlTable table = other.root().table("t").orElseThrow();
        Map<String, String> expected = new LinkedHashMap<>();
        for (int i = 0; i < 3; i++) {
          if ((removed >> i & 1) == 1) {
            other.remove(table, keys.get(i));
          } else {
            expected.put(keys.get(i), String.valueOf(i + 1));
          }
        }
        for (int i = 0; i < added; i++) {
          other.set(table, "n" + i, "9", List.of());
          expected.put("n" + i, "9");
        }
        String text = other.result();
        Problems problems = new Problems("a.toml");
        TomlTable after = TomlParser.parse(SourceText.of("a.toml", text), problems);
        assertEquals(List.of(), problems.list(), text);
        Map<String, String> found = new LinkedHashMap<>();
        for (TomlEntry entry : after.table("t").orElseThrow().entries()) {
          found.put(
              entry.key(),
              text.substring(entry.value().span().start(), entry.value().span().end()));
        }
        assertEquals(expected, found, text);
      }
    }
  }

  @Test
  void blocksWithoutBlankLinesBetweenKeepTheirKeysApart() {
    String text = "x = 1\n[a]\nb = 1\n[c]\nd = 1\n[[e]]\n[f]\n";
    TomlEditor other = new TomlEditor(SourceText.of("a.toml", text), KeyWords.AS_WRITTEN);
    other.set(other.root(), "y", "2", List.of());
    other.set(other.root().table("a").orElseThrow(), "n", "2", List.of());
    other.set(other.root().tables("e").get(0), "n", "3", List.of());
    other.rename(other.root().table("c").orElseThrow(), "[cc]");
    assertEquals(
        "x = 1\ny = 2\n[a]\nb = 1\nn = 2\n[cc]\nd = 1\n[[e]]\nn = 3\n[f]\n", other.result());
  }

  @Test
  void aFaultyTextIsNotEdited() {
    SourceText faulty = SourceText.of("a.toml", "a = ");
    assertThrows(IllegalArgumentException.class, () -> new TomlEditor(faulty, KeyWords.AS_WRITTEN));
  }

  private List<BlockWanted> kept(int... indices) {
    List<BlockWanted> wanted = new java.util.ArrayList<>();
    for (int index : indices) {
      wanted.add(new BlockWanted.Kept(stages.get(index)));
    }
    return wanted;
  }

  private static Map<String, String> values(String... pairs) {
    Map<String, String> values = new LinkedHashMap<>();
    for (int i = 0; i < pairs.length; i += 2) {
      values.put(pairs[i], pairs[i + 1]);
    }
    return values;
  }
}
