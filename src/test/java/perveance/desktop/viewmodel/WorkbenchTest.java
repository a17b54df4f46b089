package perveance.desktop.viewmodel;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import perveance.app.Edit;
import perveance.engine.base.BiasMessage;
import perveance.engine.base.Finding;
import perveance.engine.base.HazardMessage;
import perveance.engine.base.Remedy;
import perveance.engine.base.Severity;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.Setting;
import perveance.engine.stage.StageKind;
import perveance.engine.stage.StageKinds;
import perveance.engine.stage.Supply;

/** What a person does, without a window. */
class WorkbenchTest {
  private final Workbench bench = RealEngine.bench();
  private final StageList list = new StageList(bench);

  private Optional<String> set(String key, String text) {
    return KeyEditor.parse(bench.chassis(), "V1a", key, text)
            instanceof KeyEditor.Outcome.Accepted accepted
        ? bench.edit(accepted.edit())
        : Optional.of("refused");
  }

  private String setting(String key) {
    Setting setting = bench.chassis().stage("V1a").orElseThrow().settings().get(key);
    return setting == null ? "" : setting.text();
  }

  @ParameterizedTest
  @CsvSource({
    "anode_load, anode load",
    "anode_load2, anode load 2",
    "anode_load2_power, anode load 2 power",
    "device2, device 2"
  })
  void keysAreReadAsWords(String key, String words) {
    assertEquals(words, KeyEditor.words(key));
  }

  @Test
  void anEditIsAnsweredAndUndone() {
    double before = bench.stageAnswer().orElseThrow().smallSignal().gain();
    assertEquals(Optional.empty(), set("anode_load", "47k"));
    double after = bench.stageAnswer().orElseThrow().smallSignal().gain();
    assertTrue(Math.abs(after) < Math.abs(before), before + " to " + after);
    assertTrue(bench.settled().get());
    bench.undo();
    assertEquals("100k", setting("anode_load"));
    assertEquals(before, bench.stageAnswer().orElseThrow().smallSignal().gain(), 1e-9);
    bench.redo();
    assertEquals("47k", setting("anode_load"));
  }

  @Test
  void theWordTypedForABeamValveIsKept() {
    Edit.SetKey expected = new Edit.SetKey("V1a", "connection", new Setting.Word("tetrode"));
    assertEquals(
        new KeyEditor.Outcome.Accepted(expected),
        KeyEditor.parse(bench.chassis(), "V1a", "connection", "tetrode"));
  }

  @ParameterizedTest
  @CsvSource({
    "anode_load, 22 V",
    "anode_load, 0.001",
    "anode_load, rubbish",
    "device, ''",
    "connection, sideways"
  })
  void whatCannotBeIsRefusedInWords(String key, String text) {
    KeyEditor.Outcome outcome = KeyEditor.parse(bench.chassis(), "V1a", key, text);
    String why = assertInstanceOf(KeyEditor.Outcome.Refused.class, outcome).why();
    assertTrue(why.endsWith("."), why);
  }

  @Test
  void anUnknownValveIsRefusedAndTheChassisStays() {
    Chassis before = bench.chassis();
    Optional<String> why = set("device", "12AX9000");
    assertTrue(why.isPresent());
    assertTrue(bench.message().get().contains("12AX9000"), bench.message().get());
    assertEquals(before, bench.chassis());
  }

  @ParameterizedTest
  @CsvSource({
    "anode_load, true, 110k",
    "anode_load, false, 91k",
    "cathode_resistor, true, 1k6",
    "coupling, true, 27n",
    "coupling, false, 18n"
  })
  void arrowsStepAlongTheSeries(String key, boolean up, String next) {
    Edit edit = KeyEditor.step(bench.chassis(), "V1a", key, up).orElseThrow();
    bench.edit(edit);
    assertEquals(next, setting(key));
  }

  @Test
  void theStepsOfADragAreOne() {
    PointDrag drag = new PointDrag(bench, Runnable::run, Runnable::run);
    drag.begin();
    drag.point(PointDrag.Mover.BIAS, 0, 1.1e-3);
    drag.point(PointDrag.Mover.BIAS, 0, 1.2e-3);
    drag.point(PointDrag.Mover.BIAS, 0, 1.3e-3);
    drag.end();
    assertEquals(1.3e-3, current(), 1.3e-3 * 0.01);
    assertEquals(1, bench.history().get().past().size());
    bench.undo();
    assertEquals("1k5", setting("cathode_resistor"));
  }

  /** The written value has three figures, hence one per cent. */
  @Test
  void loadLinesAndSwingFollowTheHand() {
    PointDrag drag = new PointDrag(bench, Runnable::run, Runnable::run);
    drag.begin();
    drag.dcLoad(80e3);
    drag.end();
    var line = bench.stageAnswer().orElseThrow().loadLine().orElseThrow();
    assertEquals(80e3, line.dcResistance(), 800);
    drag.begin();
    drag.acLoad(60e3);
    drag.end();
    line = bench.stageAnswer().orElseThrow().loadLine().orElseThrow();
    assertEquals(60e3, line.acResistance(), 600);
    drag.begin();
    drag.swing(1.5);
    drag.end();
    assertEquals("0.75 V", setting("drive"));
    assertEquals(3, bench.history().get().past().size());
  }

  private double current() {
    return bench.stageAnswer().orElseThrow().loadLine().orElseThrow().current();
  }

  @Test
  void aRemedyIsOneStep() {
    Finding finding =
        Finding.of(
                BiasMessage.values()[0],
                Severity.CAUTION,
                "V1a",
                new String[BiasMessage.values()[0].partCount()].length == 0
                    ? new String[0]
                    : "x".repeat(BiasMessage.values()[0].partCount()).split(""))
            .withRemedy(
                new Remedy(
                    "Two values at once.",
                    java.util.Map.of("cathode_resistor", "1k8", "anode_load", "120k")));
    bench.take(finding);
    assertEquals("1k8", setting("cathode_resistor"));
    assertEquals("120k", setting("anode_load"));
    bench.undo();
    assertEquals("1k5", setting("cathode_resistor"));
    assertEquals("100k", setting("anode_load"));
  }

  /** A finding about a supply node changes that node, and takes nothing else of it away. */
  @Test
  void aRemedyForASupplyNodeIsOnePressToo() {
    Supply before = bench.chassis().supplies().get(0);
    Finding finding =
        Finding.of(
                HazardMessage.SLOW_DISCHARGE,
                Severity.CAUTION,
                "supply " + before.name(),
                "It",
                "a minute",
                "60 V")
            .withRemedy(
                new Remedy(
                    "Both.", java.util.Map.of("bleeder", "68k", "reservoir_voltage", "450 V")));
    bench.take(finding);
    Supply now = bench.chassis().supplies().get(0);
    assertEquals(68e3, now.bleeder().orElseThrow());
    assertEquals(450, now.ratings().reservoirVoltage().orElseThrow());
    assertEquals(before.reservoir(), now.reservoir());
    bench.undo();
    assertEquals(before, bench.chassis().supplies().get(0));
  }

  static List<StageKind> kinds() {
    return StageKinds.all();
  }

  /** Whatever kinds the engine has, a person gets one that answers. */
  @ParameterizedTest
  @MethodSource("kinds")
  void aStageOfEveryKindIsAddedAndAnswers(StageKind kind) {
    assertEquals(Optional.empty(), list.add(kind, Optional.empty()));
    String ref = bench.chosenStage().get();
    assertFalse(ref.equals("V1a"), "the new stage is chosen");
    assertTrue(bench.stageAnswer().isPresent(), () -> kind.title() + " has no answer");
    bench.undo();
    assertEquals(1, bench.chassis().stages().size());
    assertEquals("V1a", bench.chosenStage().get());
  }

  @Test
  void stagesAreDuplicatedMovedRenamedAndRemoved() {
    assertEquals(Optional.empty(), list.duplicate("V1a"));
    String copy = bench.chosenStage().get();
    list.move(copy, -1);
    assertEquals(copy, bench.chassis().stages().get(0).ref());
    list.rename(copy, "V9");
    assertEquals("V9", bench.chosenStage().get());
    list.remove("V9");
    assertEquals("V1a", bench.chosenStage().get());
    assertEquals(1, bench.chassis().stages().size());
  }

  @Test
  void supplyNodesAreSetFromWhatIsTyped() {
    assertEquals(Optional.empty(), list.setSupply("B", Optional.of("A"), "10k", "22u", ""));
    assertEquals("C", list.freeSupplyName());
    assertTrue(list.setSupply("C", Optional.of("A"), "-3", "", "").isPresent());
    list.removeSupply("A");
    assertTrue(bench.chassis().supply("A").isPresent(), "a node in use stays");
    assertFalse(bench.message().get().isEmpty());
  }

  @Test
  void anotherValveIsSeenBeforeItIsTaken() {
    DeviceSwap.Effect[] shown = new DeviceSwap.Effect[1];
    DeviceSwap swap = new DeviceSwap(bench, "V1a", "device", e -> shown[0] = e);
    assertEquals("12AX7", swap.find("ecc83").get(0).type());
    Chassis before = bench.chassis();
    swap.show("12AU7");
    assertEquals(Optional.empty(), shown[0].refusal());
    assertTrue(shown[0].rows().stream().anyMatch(r -> r.figure().equals("gain")));
    assertEquals(before, bench.chassis(), "looking changes nothing");
    assertEquals(Optional.empty(), swap.take("12AU7"));
    assertEquals("12AU7", setting("device"));
  }

  /** Random steps and values, seeded: nothing throws, and undo leads back to the start. */
  @Test
  void manyEditsAreAllUndone() {
    Chassis start = bench.chassis();
    Random random = new Random(5);
    List<String> keys = List.of("anode_load", "cathode_resistor", "grid_leak", "coupling", "load");
    for (int i = 0; i < 60; i++) {
      KeyEditor.step(bench.chassis(), "V1a", keys.get(random.nextInt(5)), random.nextBoolean())
          .ifPresent(bench::edit);
    }
    int steps = bench.history().get().past().size();
    assertTrue(steps > 40, steps + " steps");
    while (!bench.history().get().past().isEmpty()) {
      bench.undo();
    }
    assertEquals(start, bench.chassis());
    assertFalse(bench.modified().get());
  }
}
