package perveance.engine.stage;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Every kind's drawing shows its circuit, whatever keys are stated. */
class StageDrawingTest {
  static List<Map.Entry<String, StageBench>> stages() {
    return List.copyOf(StageSamples.all().entrySet());
  }

  @ParameterizedTest
  @MethodSource("stages")
  void drawingShowsTheCircuit(Map.Entry<String, StageBench> sample) {
    StageBench bench = sample.getValue();
    assertEquals(List.of(), bench.kind.check(bench.values()), sample.getKey());
    new DrawingChecks(sample.getKey(), bench.build(250)).all();
  }
}
