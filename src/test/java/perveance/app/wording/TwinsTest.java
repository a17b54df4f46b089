package perveance.app.wording;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.api.Test;

/** Derived: two valves share a row only where every figure of it agrees. */
class TwinsTest {
  @Test
  void equalRowsNameBothValvesAndDifferentOnesStandApart() {
    Twins twins = new Twins();
    twins.add("V3", new FigureRow("anode", "438 V", "413-463 V", ""));
    twins.add("V3", new FigureRow("cathode", "0 V", "", ""));
    twins.add("V4", new FigureRow("anode", "438 V", "414-463 V", ""));
    twins.add("V4", new FigureRow("cathode", "0 V", "", ""));
    assertEquals(
        List.of("V3 anode", "V3, V4 cathode", "V4 anode"),
        twins.rows().stream().map(FigureRow::label).toList());
  }
}
