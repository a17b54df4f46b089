package perveance.app;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.Conditions;
import perveance.engine.stage.Setting;
import perveance.engine.stage.StageEntry;
import perveance.engine.stage.Supply;
import perveance.engine.stage.SupplyFeed;

/** Edits and their history: derived checks, every edit is undone and redone exactly. */
class HistoryTest {
  private static Chassis chassis() {
    StageEntry first =
        new StageEntry(
            "V1a",
            "common-cathode",
            Map.of("supply", new Setting.Word("A"), "drives", new Setting.Word("V1b")));
    StageEntry second =
        new StageEntry("V1b", "cathode-follower", Map.of("supply", new Setting.Word("B")));
    return new Chassis(
        "Tester",
        Conditions.USUAL,
        List.of(
            new Supply(
                "A", new SupplyFeed.Stated(300), OptionalDouble.empty(), OptionalDouble.empty()),
            new Supply(
                "B",
                new SupplyFeed.Dropped("A", 10_000),
                OptionalDouble.of(22e-6),
                OptionalDouble.empty())),
        List.of(first, second));
  }

  @Test
  void undoRestoresAndRedoRepeats() {
    History start = History.of(chassis());
    Edit edit = new Edit.SetKey("V1a", "anode_load", new Setting.Number("220k", 220e3));
    History done = start.after(edit);
    assertEquals(Optional.of("set V1a anode load to 220k"), done.undoLabel());
    assertEquals(start.now(), done.undone().now());
    assertEquals(done.now(), done.undone().redone().now());
    assertEquals(Optional.of("set V1a anode load to 220k"), done.undone().redoLabel());
  }

  @Test
  void anEditThatChangesNothingIsNoStep() {
    History start = History.of(chassis());
    assertSame(start, start.after(new Edit.SetTitle("Tester")));
  }

  @Test
  void renamesFollowEveryUse() {
    Chassis stage = new Edit.RenameStage("V1b", "V2a").apply(chassis());
    assertEquals(Optional.of("V2a"), drives(stage));
    Chassis supply = new Edit.RenameSupply("A", "HT").apply(chassis());
    assertEquals(new Setting.Word("HT"), supply.stages().get(0).settings().get("supply"));
    assertTrue(
        supply.supply("B").orElseThrow().feed() instanceof SupplyFeed.Dropped d
            && d.from().equals("HT"));
  }

  @Test
  void removingAStageLeavesNobodyDrivingIt() {
    Chassis changed = new Edit.RemoveStage("V1b").apply(chassis());
    assertEquals(Optional.empty(), drives(changed));
  }

  @Test
  void editsThatDoNotFitAreRefused() {
    assertThrows(IllegalArgumentException.class, () -> new Edit.RemoveStage("V9").apply(chassis()));
    assertThrows(IllegalArgumentException.class, () -> new Edit.RemoveSupply("A").apply(chassis()));
    assertThrows(
        IllegalArgumentException.class, () -> new Edit.RenameStage("V1a", "V1b").apply(chassis()));
  }

  @Test
  void aDragIsOneStep() {
    History history = History.of(chassis());
    history = history.after(new Edit.SetKey("V1a", "source", new Setting.Number("1k", 1e3)));
    for (int i = 2; i < 50; i++) {
      history =
          history.continued(new Edit.SetKey("V1a", "source", new Setting.Number(i + "k", i * 1e3)));
    }
    assertEquals(1, history.past().size());
    assertEquals(chassis(), history.undone().now());
  }

  @Test
  void randomWalksComeBack() {
    SplittableRandom random = new SplittableRandom(7);
    History history = History.of(chassis());
    for (int i = 0; i < 300; i++) {
      history =
          switch (random.nextInt(4)) {
            case 0 -> history.undone();
            case 1 -> history.redone();
            case 2 -> history.after(new Edit.MoveStage("V1a", random.nextInt(2)));
            default ->
                history.after(
                    new Edit.SetKey("V1b", "load", new Setting.Number("x", random.nextInt(9))));
          };
    }
    while (history.undoLabel().isPresent()) {
      history = history.undone();
    }
    assertEquals(chassis(), history.now());
  }

  private static Optional<String> drives(Chassis chassis) {
    return Optional.ofNullable(chassis.stages().get(0).settings().get("drives")).map(Setting::text);
  }
}
