package perveance.engine.device.geometry;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Langmuir and Blodgett's function against tables. */
class LangmuirBlodgettTest {
  /*
   * Derived. Case: every radius ratio of the table, cathode inside and cathode outside.
   * Expected: langmuir_blodgett_beta2.tsv. Tolerance: half of the fifth decimal printed.
   */
  @Test
  @DisplayName("agrees with an independent integration at every ratio, both ways")
  void independentIntegration() {
    List<double[]> rows = ReferenceTable.rows("langmuir_blodgett_beta2.tsv");
    assertEquals(37, rows.size());
    for (double[] row : rows) {
      assertEquals(row[1], LangmuirBlodgett.at(row[0]).squared(), 6e-6, "inside, ratio " + row[0]);
      assertEquals(
          row[3], LangmuirBlodgett.at(1 / row[0]).squared(), 6e-6, "outside, ratio " + row[0]);
    }
  }

  /*
   * Published. Source: table of Langmuir and Blodgett, Phys. Rev. 22, 347, 1923 (from memory).
   * Tolerance: half of the last digit printed, and one more unit for the reprints' rounding.
   */
  @ParameterizedTest
  @CsvSource({
    "1.1,0.00842,1e-5", "1.5,0.1193,1e-4", "2,0.2793,1e-4", "3,0.5170,1e-4", "4,0.6671,1e-4",
    "5,0.7666,1e-4", "6,0.8362,1e-4", "10,0.9782,1e-4", "20,1.0715,1e-4", "42,1.0946,1e-4",
    "100,1.0782,1e-4", "1000,1.017,1e-3"
  })
  @DisplayName("agrees with the printed table")
  void printedTable(double ratio, double expected, double tolerance) {
    assertEquals(expected, LangmuirBlodgett.at(ratio).squared(), tolerance);
  }

  /*
   * Derived (W4). Expected: beta^2 is largest, 1.09467, at a ratio of 41.54, and there its slope is
   * zero. Tolerance: the digits given.
   */
  @Test
  @DisplayName("has its maximum at a ratio of 41.54")
  void maximum() {
    assertEquals(1.09467, LangmuirBlodgett.at(41.54).squared(), 5e-6);
    assertEquals(0, LangmuirBlodgett.at(41.54).slope(), 2e-5);
    assertTrue(LangmuirBlodgett.at(41).slope() > 0);
    assertTrue(LangmuirBlodgett.at(42).slope() < 0);
  }

  @ParameterizedTest
  @CsvSource({"1", "0", "-2", "NaN", "1e7"})
  @DisplayName("refuses ratios without a gap or out of range")
  void refuses(double ratio) {
    assertThrows(IllegalArgumentException.class, () -> LangmuirBlodgett.at(ratio));
  }
}
