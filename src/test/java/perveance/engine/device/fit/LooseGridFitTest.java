package perveance.engine.device.fit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.Evidence;
import perveance.engine.device.SpreadTriodeLaw;
import perveance.engine.device.SpreadTriodeParameters;

/** Derived: loose places of a grid are found where cut-off points tell of them, and only there. */
class LooseGridFitTest {
  private static final OptionalDouble NONE = OptionalDouble.empty();
  private static final double[][] POINTS = {
    {50, -0.5}, {100, -0.5}, {100, -1}, {150, -1}, {200, -1}, {200, -2}, {250, -1.5}, {250, -2.5}
  };

  private static DeviceLaw law(double share, double ratio) {
    return new SpreadTriodeLaw(
        new SpreadTriodeParameters(
            2.7e-3, 0.5, 1 / 70.0, 0.15, 0.3, share, ratio, 3, 0.35 * 2.7e-3, -0.6, 0.0861733));
  }

  private static Evidence evidence(
      String kind, double va, double vg, OptionalDouble current, OptionalDouble gm) {
    return new Evidence(
        "triode",
        kind,
        va,
        OptionalDouble.of(vg),
        NONE,
        current,
        NONE,
        NONE,
        NONE,
        gm,
        true,
        "test",
        "found",
        "high",
        "");
  }

  /** Points at work, and the cut-off at 10 uA at two anode voltages. */
  private static List<Evidence> sheet(DeviceLaw law) {
    LawReadings readings = new LawReadings(law);
    List<Evidence> sheet = new ArrayList<>();
    for (double[] at : POINTS) {
      Evidence empty = evidence("point", at[0], at[1], OptionalDouble.of(0), NONE);
      sheet.add(
          evidence(
              "point",
              at[0],
              at[1],
              OptionalDouble.of(readings.predict(empty, Figure.CURRENT)),
              OptionalDouble.of(readings.predict(empty, Figure.MUTUAL_CONDUCTANCE))));
    }
    for (double va : new double[] {100, 250}) {
      Evidence guess = evidence("cut-off", va, -va / 40, OptionalDouble.of(1e-5), NONE);
      double cutOff = readings.predict(guess, Figure.CUT_OFF);
      sheet.add(evidence("cut-off", va, cutOff, OptionalDouble.of(1e-5), NONE));
    }
    return sheet;
  }

  private static LawFit fitted(DeviceLaw law) {
    return assertInstanceOf(
            FitResult.Fitted.class, new TriodeFitter().fit(sheet(law), FitConditions.USUAL))
        .fit();
  }

  private static SpreadTriodeParameters constants(LawFit fit) {
    return assertInstanceOf(SpreadTriodeLaw.class, fit.law()).constants();
  }

  /**
   * Case: 3 % of the cathode behind places 2.2 times as open. The share itself is known within a
   * factor of three only, since spread and share trade against each other; what the sheet prints is
   * met: currents and gm to 3 %, as printed tables are, the cut-off to a twentieth.
   */
  @Test
  void aShareIsFoundAndTheCutOffIsMet() {
    LawFit fit = fitted(law(0.03, TriodeTrial.REMOTE_PENETRATION));
    double share = constants(fit).remoteShare();
    assertTrue(share > 0.01 && share < 0.09, "" + share);
    assertEquals(TriodeTrial.REMOTE_PENETRATION, constants(fit).remotePenetration());
    for (Residual residual : fit.residuals()) {
      double tolerance = residual.figure() == Figure.CUT_OFF ? 0.05 : 0.03;
      assertEquals(0, residual.relativeError(), tolerance, residual.toString());
    }
    assertTrue(fit.fittedKeys().contains("remote_share"));
  }

  @Test
  void anEvenGridStaysEven() {
    LawFit fit = fitted(law(0, 1));
    assertEquals(0, constants(fit).remoteShare());
    assertEquals(4, fit.fittedKeys().size());
  }
}
