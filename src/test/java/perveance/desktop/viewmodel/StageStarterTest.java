package perveance.desktop.viewmodel;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import perveance.engine.analysis.AnalysisOptions;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.analysis.DevicePoint;
import perveance.engine.analysis.StageAnswer;
import perveance.engine.base.BiasMessage;
import perveance.engine.base.Finding;
import perveance.engine.base.Progress;
import perveance.engine.base.Severity;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.StageEntry;
import perveance.engine.stage.StageKind;
import perveance.engine.stage.StageKinds;

/** A new stage is one that works: a person changes it, and need not mend it first. */
class StageStarterTest {
  private final Engine engine = new RealEngine();

  static Stream<StageKind> kinds() {
    return StageKinds.all().stream();
  }

  private ChassisAnswer started(StageKind kind) {
    Chassis empty = Starters.empty(Settings.USUAL);
    StageEntry entry =
        new StageStarter(engine).start(empty, "V1", kind, Optional.empty()).orElseThrow();
    return engine.answer(
        new Chassis("", empty.conditions(), empty.supplies(), List.of(entry)),
        AnalysisOptions.FULL,
        Progress.none());
  }

  @ParameterizedTest
  @MethodSource("kinds")
  void aNewStageOfAnyKindBreaksNoLimitAndDrawsNoGridCurrent(StageKind kind) {
    ChassisAnswer answer = started(kind);
    assertEquals(List.of(), answer.failures());
    for (Finding finding : answer.findings()) {
      assertTrue(finding.severity().compareTo(Severity.CAUTION) <= 0, finding::text);
      assertNotEquals(BiasMessage.GRID_CURRENT_IDLE, finding.code(), finding::text);
    }
  }

  @ParameterizedTest
  @MethodSource("kinds")
  void itIsCleanAtItsDriveAndConducts(StageKind kind) {
    StageAnswer stage = started(kind).stages().get(0);
    for (DevicePoint point : stage.points()) {
      assertTrue(point.anodeCurrent() > 0.3e-3, () -> point.ref() + " " + point.anodeCurrent());
    }
    double drive = stage.driven().orElseThrow().inputPeak();
    assertTrue(drive < stage.clean().inputPeak(), () -> drive + ", " + stage.clean());
  }
}
