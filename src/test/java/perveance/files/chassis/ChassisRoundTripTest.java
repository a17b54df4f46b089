package perveance.files.chassis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Random;
import java.util.Set;
import org.junit.jupiter.api.Test;
import perveance.engine.base.BadInputException;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.Conditions;
import perveance.engine.stage.HeaterSupply;
import perveance.engine.stage.Setting;
import perveance.engine.stage.StageEntry;
import perveance.engine.stage.Supply;
import perveance.engine.stage.SupplyFeed;
import perveance.files.toml.SourceText;

/**
 * Random chains of edits, each saved into the text of the one before: what is read back equals the
 * chassis field by field, and every comment outlives everything but the block or the value that it
 * belongs to.
 */
class ChassisRoundTripTest {
  private static final int CHAINS = 150;
  private static final int EDITS = 12;

  private static final List<String> OHMS = List.of("47k", "100k", "220k", "1M", "4k7", "68000");

  private Random random = new Random(0);
  private int names;

  @Test
  void whatIsSavedIsWhatIsReadAndCommentsStay() throws BadInputException {
    for (int chain = 0; chain < CHAINS; chain++) {
      random = new Random(chain);
      String text = Samples.THREE_STAGES;
      boolean dense = chain % 4 == 3;
      if (dense) {
        text = text.replaceAll("\n+", "\n");
      }
      if (chain % 3 == 1) {
        text = text.replace("\n", "\r\n");
      } else if (chain % 3 == 2) {
        text = text.strip(); // the last line without an end
      }
      for (int edit = 0; edit < EDITS; edit++) {
        text = editAndSave(text, chain + "/" + edit, dense);
      }
    }
  }

  private String editAndSave(String text, String which, boolean dense) throws BadInputException {
    Chassis before = Samples.read(text);
    Chassis after = edited(before);
    String saved = ChassisWriter.update(SourceText.of("a", text), before, after);
    String shown = which + "\n" + text + "\n-----\n" + saved;
    assertEquals(after, readOrFail(saved, shown), shown);
    Set<String> lost = comments(text);
    lost.removeAll(comments(saved));
    // a heading that stands apart belongs to no block and must never go
    assertTrue(dense || lost.stream().noneMatch(c -> c.startsWith("# --")), () -> lost + shown);
    if (keepsEverything(before, after)) {
      assertEquals(Set.of(), lost, shown);
    }
    // the second saving of the same chassis changes nothing
    assertEquals(saved, ChassisWriter.update(SourceText.of("a", saved), after, after));
    return saved;
  }

  private static Chassis readOrFail(String text, String shown) {
    try {
      return Samples.read(text);
    } catch (BadInputException e) {
      throw new AssertionError(e.getMessage() + "\n" + shown, e);
    }
  }

  /** Whether no stage, node or key of before has gone. */
  private static boolean keepsEverything(Chassis before, Chassis after) {
    if (before.stages().size() > after.stages().size()
        || before.supplies().size() > after.supplies().size()) {
      return false;
    }
    for (StageEntry old : before.stages()) {
      if (after.stages().stream()
          .noneMatch(
              s ->
                  s.settings().keySet().containsAll(old.settings().keySet())
                      && s.ref().equals(old.ref()))) {
        return false;
      }
    }
    return after.supplies().containsAll(before.supplies());
  }

  private static Set<String> comments(String text) {
    Set<String> comments = new LinkedHashSet<>();
    for (String line : text.split("\\R")) {
      int at = line.indexOf('#');
      // a title of this test holds a # that begins no comment
      if (at >= 0 && !line.startsWith("title")) {
        comments.add(line.substring(at));
      }
    }
    return comments;
  }

  private Chassis edited(Chassis c) {
    List<StageEntry> stages = new ArrayList<>(c.stages());
    List<Supply> supplies = new ArrayList<>(c.supplies());
    Conditions conditions = c.conditions();
    String title = c.title();
    int at = stages.isEmpty() ? 0 : random.nextInt(stages.size());
    switch (stages.isEmpty() ? 7 : random.nextInt(12)) {
      case 0 -> stages.set(at, stages.get(at).with("anode_load", ohms()));
      case 1 -> stages.set(at, stages.get(at).with("grid_stopper", ohms()));
      case 2 -> stages.set(at, stages.get(at).without("grid_stopper").without("source"));
      case 3 -> stages.set(at, stages.get(at).with("stray_anode", new Setting.Number("5p", 5e-12)));
      case 4 -> removeStage(stages, at);
      case 5 -> Collections.shuffle(stages, random);
      case 6 -> rename(stages, at);
      case 7 -> stages.add(Math.min(at, stages.size()), fresh(supplies));
      case 8 -> title = "Title # " + names++ + " \u00B5";
      case 9 -> supplies.add(random.nextInt(supplies.size() + 1), node("N" + names++));
      case 10 -> changeSupplies(supplies, stages);
      default -> conditions = conditions(conditions);
    }
    return new Chassis(title, conditions, supplies, stages);
  }

  private Setting ohms() {
    String text = OHMS.get(random.nextInt(OHMS.size()));
    double value =
        switch (text) {
          case "47k" -> 47e3;
          case "100k" -> 100e3;
          case "220k" -> 220e3;
          case "1M" -> 1e6;
          case "4k7" -> 4700;
          default -> 68e3;
        };
    return new Setting.Number(text, value);
  }

  private static void removeStage(List<StageEntry> stages, int at) {
    String ref = stages.remove(at).ref();
    stages.replaceAll(s -> drives(s).equals(ref) ? s.without("drives") : s);
  }

  private void rename(List<StageEntry> stages, int at) {
    StageEntry old = stages.get(at);
    String ref = "R" + names++;
    stages.set(at, new StageEntry(ref, old.kind(), old.settings()));
    stages.replaceAll(
        s -> drives(s).equals(old.ref()) ? s.with("drives", new Setting.Word(ref)) : s);
  }

  private static String drives(StageEntry stage) {
    Setting drives = stage.settings().get("drives");
    return drives == null ? "" : drives.text();
  }

  private StageEntry fresh(List<Supply> supplies) {
    return new StageEntry("F" + names++, "common-cathode", java.util.Map.of())
        .with("device", new Setting.Word("6SN7GT"))
        .with("supply", new Setting.Word(supplies.get(random.nextInt(supplies.size())).name()))
        .with("anode_load", ohms())
        .with("cathode_resistor", new Setting.Number("1k", 1000))
        .with("grid_leak", new Setting.Number("1M", 1e6));
  }

  private static Supply node(String name) {
    return new Supply(
        name, new SupplyFeed.Stated(123.4), OptionalDouble.of(1e-7), OptionalDouble.empty());
  }

  private void changeSupplies(List<Supply> supplies, List<StageEntry> stages) {
    if (random.nextBoolean()) {
      Collections.shuffle(supplies, random);
    } else {
      int at = random.nextInt(supplies.size());
      Supply old = supplies.get(at);
      String name = random.nextBoolean() ? old.name() : "S " + names++;
      supplies.set(at, node(name));
      supplies.replaceAll(s -> refed(s, old.name(), name));
      stages.replaceAll(
          s ->
              s.settings().get("supply") instanceof Setting.Word w && w.text().equals(old.name())
                  ? s.with("supply", new Setting.Word(name))
                  : s);
    }
  }

  private static Supply refed(Supply supply, String old, String now) {
    return supply.feed() instanceof SupplyFeed.Dropped d && d.from().equals(old)
        ? new Supply(
            supply.name(),
            new SupplyFeed.Dropped(now, d.dropper()),
            supply.reservoir(),
            supply.bleeder(),
            supply.ratings())
        : supply;
  }

  private Conditions conditions(Conditions c) {
    double mains = 100 + random.nextInt(150);
    return new Conditions(
        mains,
        random.nextBoolean() ? mains : mains + 3.5,
        random.nextBoolean() ? 50 : 60,
        c.meter() == 10e6 ? 11e6 : 10e6,
        c.resistorTolerance(),
        random.nextInt(100) / 100.0,
        c.supplyTolerance(),
        c.threshold(),
        new HeaterSupply(
            random.nextBoolean() ? 6.3 : 12.6,
            OptionalDouble.of(1 + random.nextInt(8)),
            random.nextInt(3) * 0.15));
  }
}
