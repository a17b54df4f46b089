package perveance.accuracy;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import perveance.engine.device.Device;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.device.Evidence;
import perveance.engine.device.LawKind;
import perveance.engine.device.fit.LawReadings;
import perveance.engine.device.fit.Residual;

/** The pentode and beam laws of the library against published figures. */
@Tag("published")
class PublishedPentodesTest {
  private static final int ANODE = ElectrodeCurrents.ANODE;
  private static final int GRID = ElectrodeCurrents.GRID;
  private static final int SCREEN = ElectrodeCurrents.SCREEN;

  /**
   * Tabulated points not marked low (RCA, Philips, GE, G.E.C. and Tung-Sol sheets as named in the
   * device files). Current and gm 6 %, mu 8 % (printed to two figures, rounded to 8 or 10), screen
   * current 20 % (printed to half a milliampere), ra 25 % (rounded guesses), triode-connected
   * points 10 %. These points are in the fit. An exception stands with its reason in {@link
   * #allowed}; the EL34's triode table at 375 V has the test below.
   */
  @ParameterizedTest
  @ValueSource(
      strings = {
        "EL84", "EL34", "6L6", "6L6GC", "6V6GT", "6AQ5", "KT66", "KT88", "6550", "6F6", "EL36",
        "EF86", "6SJ7", "6AU6", "EF80", "6SK7"
      })
  void tabulatedPointsAreMet(String type) {
    Device device = Library.device(type);
    assertEquals(LawKind.PENTODE, device.law().kind());
    int figures = 0;
    for (Residual residual : new LawReadings(device.law()).compare(device.evidence())) {
      Evidence evidence = residual.evidence();
      if (!evidence.kind().equals("point") || evidence.confidence().equals("low")) {
        continue;
      }
      if (type.equals("EL34") && evidence.anodeVoltage() == 375) {
        assertFalse(evidence.fit(), "likely a table of supply voltages");
        continue;
      }
      assertEquals(0, residual.relativeError(), allowed(type, residual), type + " " + residual);
      figures++;
    }
    assertTrue(figures >= 4, type + " has " + figures + " figures");
  }

  private static double allowed(String type, Residual residual) {
    Evidence evidence = residual.evidence();
    if (type.equals("EF86") && evidence.gridVoltage().orElse(0) == -2) {
      // a check, not in the fit: the same 3.0 mA is printed at -2.2 V and at -2.0 V, where 2.2 mA/V
      // times 0.2 V is 15 %; and 2.0 mA/V beside 2.2 mA/V, which rises by 8 % on the way
      return 0.19;
    }
    if (evidence.connection().equals("triode")) {
      return 0.10;
    }
    return switch (residual.figure()) {
      case CURRENT, MUTUAL_CONDUCTANCE -> 0.06;
      case AMPLIFICATION -> 0.08;
      case SCREEN_CURRENT -> 0.20;
      case ANODE_RESISTANCE -> 0.25;
      case CUT_OFF -> 0.06;
    };
  }

  /**
   * EL34 triode-connected, 375 V, 370 ohm in the cathode, 70 mA (Philips, memory); not in the fit.
   * Between anode and cathode the two triode tables ask for a mu of (375 - 250) V / (25.9 - 15.5) V
   * = 12.0 where 10.5 is printed; with 375 V as the supply, 349.1 V there, it is 9.5, and the
   * current is as printed: 4 %, that of a tabulated triode-connected current. If the 375 V were the
   * anode's after all, the resistor holds the current within the 10 % of triode-connected points.
   */
  @Test
  void el34TriodeSettlesOnItsCathodeResistor() {
    assertEquals(0.07, settled(375, 370, 370), 0.04 * 0.07);
    assertEquals(0.07, settled(375, 370, 0), 0.1 * 0.07);
  }

  /**
   * Cathode current of an EL34 triode with a cathode resistor, of which a part is in the supply.
   */
  private static double settled(double supply, double resistor, double inSupply) {
    DeviceLaw law = Library.device("EL34").law();
    ElectrodeCurrents out = new ElectrodeCurrents();
    double current = 0.07;
    for (int i = 0; i < 200; i++) {
      double anode = supply - inSupply * current;
      law.evaluate(anode, -resistor * current, anode, out);
      current += 0.1 * (out.current(ANODE) + out.current(SCREEN) - current);
    }
    return current;
  }

  /**
   * Remote cut-off: 6SK7, 10 uA/V at 250 V, 100 V, -35 V (RCA, memory). The law's part with wide
   * turns is fitted to it; 30 %, which is what 4 % of the grid voltage makes there, because the
   * sheet calls that voltage approximate. Before it the mutual conductance must fall steadily: each
   * 4 V below the last.
   */
  @Test
  void remoteCutOffIsRemote() {
    DeviceLaw law = Library.device("6SK7").law();
    double last = Double.POSITIVE_INFINITY;
    for (int grid = -3; grid >= -35; grid -= 4) {
      double gm = slope(law, 250, grid, 100);
      assertTrue(gm > 0 && gm < last, "gm " + gm + " at " + grid);
      last = gm;
    }
    assertEquals(10e-6, slope(law, 250, -35, 100), 3e-6);
    assertEquals(0, slope(Library.device("6SJ7").law(), 250, -35, 100), 0, "sharp cut-off");
  }

  private static double slope(DeviceLaw law, double anode, double grid, double screen) {
    ElectrodeCurrents out = new ElectrodeCurrents();
    law.evaluate(anode, grid, screen, out);
    return out.slope(ANODE, GRID);
  }

  /**
   * W77: EL34 at 250 V, -12.2 V with its screen on a tap of the anode's winding. Expected, from ra
   * 15 k, gm 11 mA/V, mu(g1-g2) 11 by 1/ra' = 1/ra + x gm/mu: 15 k, 3750, 2143, 2013, 938 ohm and
   * mu' 165, 41.3, 23.6, 22.1, 10.3. Tolerance 5 %: the law meets the three figures within 2 %
   * each.
   */
  @ParameterizedTest
  @CsvSource({"0,15000,165", "0.2,3750,41.3", "0.4,2143,23.6", "0.43,2013,22.1", "1,938,10.3"})
  void distributedScreen(double tap, double anodeResistance, double amplification) {
    ElectrodeCurrents out = new ElectrodeCurrents();
    Library.device("EL34").law().evaluate(250, -12.2, 250, out);
    double conductance = out.slope(ANODE, ANODE) + tap * out.slope(ANODE, SCREEN);
    assertEquals(anodeResistance, 1 / conductance, 0.05 * anodeResistance);
    assertEquals(amplification, out.slope(ANODE, GRID) / conductance, 0.05 * amplification);
  }

  /**
   * Screen resistance of the EF86 in the 250 V, 220 k, 1 M, 2.2 k stage. Expected 132 k (a tutorial
   * on pentode stages after Kuehnel, found). Tolerance 20 %, that of the screen current it follows.
   */
  @Test
  void screenResistanceOfTheEf86() {
    DeviceLaw law = Library.device("EF86").law();
    TestCoupledPentode.Rest rest = new TestCoupledPentode(law, 250, 220e3, 1e6, 2200, 680e3).rest();
    ElectrodeCurrents out = new ElectrodeCurrents();
    law.evaluate(rest.anode(), rest.grid(), rest.screen(), out);
    assertEquals(132e3, 1 / out.slope(SCREEN, SCREEN), 0.2 * 132e3);
  }

  /** Every name in the type columns of the published tables finds its device. */
  @ParameterizedTest
  @ValueSource(
      strings = {
        "EL84",
        "6BQ5",
        "EL84/6BQ5",
        "EL34",
        "6CA7",
        "EL34/6CA7",
        "6L6",
        "6L6G",
        "6L6/6L6GC",
        "6L6 (metal), 6L6G",
        "6L6GC",
        "6V6GT",
        "6V6GTA",
        "6V6GT/6V6GTA",
        "6AQ5",
        "6AQ5A",
        "6AQ5/6AQ5A",
        "EL90",
        "KT66",
        "KT88",
        "6550",
        "6550A",
        "6F6",
        "EL36",
        "6CM5",
        "EL36/6CM5",
        "EF86",
        "6267",
        "6SJ7",
        "6AU6",
        "6AU6A",
        "EF94",
        "EF80",
        "6BX6",
        "6SK7",
        "5881"
      })
  void everyPublishedNameIsFound(String name) {
    assertEquals(LawKind.PENTODE, Library.device(name).law().kind());
  }

  /** A name of the family finds the ratings printed for it. */
  @ParameterizedTest
  @CsvSource({"6AU6A,3.5", "6AQ5A,12", "6V6GTA,14", "6550A,42", "5881,23"})
  void variantsHaveTheirOwnRatings(String name, double dissipation) {
    double found =
        Library.device(name).ratings().stream()
            .filter(ratings -> ratings.type().equals(name))
            .findFirst()
            .orElseThrow()
            .anodeDissipation()
            .orElseThrow();
    assertEquals(dissipation, found, 1e-9);
  }
}
