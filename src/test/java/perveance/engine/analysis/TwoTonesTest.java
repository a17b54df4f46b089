package perveance.engine.analysis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import perveance.engine.circuit.Drive;
import perveance.engine.circuit.MidbandOutcome;
import perveance.engine.circuit.MidbandSolver;
import perveance.engine.circuit.Waveform;
import perveance.engine.numeric.Harmonics;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.ChassisCircuits;

/** Intermodulation of stages. */
class TwoTonesTest {
  private static StageModel standard() {
    Chassis chassis = Bench.on(310).standardWith("drive", "0.5 V").chassis();
    return ChassisModel.of(chassis, new ChassisCircuits(chassis, Bench.LIBRARY)).models().get(0);
  }

  private static Harmonics output(StageModel model, Waveform waveform, double peak) {
    MidbandOutcome outcome =
        new MidbandSolver(model.dc(), new Drive(waveform, model.shares())).solve(peak);
    MidbandOutcome.Converged solved = (MidbandOutcome.Converged) outcome;
    return solved.solution().harmonics(model.mainOutput().plus(), model.mainOutput().minus());
  }

  /**
   * Derived: tones of few cycles against those of the tests themselves, 60 Hz with 7 kHz and 19
   * with 20 kHz, on the same stage. At mid-band both must make the same. Tolerance 0.1 %: products
   * of high order that fold in the short period.
   */
  @Test
  void fewCyclesStandForTheTestsOwnTones() {
    StageModel model = standard();
    Intermodulation found = new TwoTones(model).at(0.5).orElseThrow();
    Harmonics far = output(model, Waveform.smpte(), 0.5);
    double first = far.amplitude(347) + far.amplitude(353);
    double second = far.amplitude(344) + far.amplitude(356);
    double smpte = Math.hypot(first, second) / far.amplitude(350);
    assertEquals(smpte, found.smpte(), 1e-3 * smpte);
    Harmonics near = output(model, Waveform.ccif(), 0.5);
    double products =
        Math.hypot(Math.hypot(near.amplitude(1), near.amplitude(18)), near.amplitude(21));
    double ccif = products / (near.amplitude(19) + near.amplitude(20));
    assertEquals(ccif, found.ccif(), 1e-3 * ccif);
  }

  /**
   * Derived: for a curvature of second order alone, output x + c x^2, a sine of peak p has a second
   * harmonic of c p / 2; tones of 0.8 p and 0.2 p make side tones of 2 c 0.8 p 0.2 p / 2 each way,
   * together 4 times 0.8 times that harmonic over the high tone: 3.2 h2. Two tones of p / 2 make a
   * difference tone of c p^2 / 4 against a sum of p: h2 / 2. Tolerance 3 %: a triode at a tenth of
   * its clean swing is near that curve.
   */
  @Test
  void atLowLevelsItFollowsTheSecondHarmonic() {
    StageModel model = standard();
    double second = new DrivenLevels(model).answer(0.1).orElseThrow().harmonics().get(0);
    Intermodulation found = new TwoTones(model).at(0.1).orElseThrow();
    assertEquals(3.2 * second, found.smpte(), 0.03 * 3.2 * second);
    assertEquals(0.5 * second, found.ccif(), 0.03 * 0.5 * second);
  }

  @Test
  void theFullAnswerHasItAtTheDriveAndAgainstLevel() {
    StageAnswer answer = Bench.on(310).standardWith("drive", "0.5 V").full();
    assertTrue(answer.driven().orElseThrow().intermodulation().isPresent());
    double before = 0;
    int levels = 0;
    for (DrivenAnswer level : answer.levels()) {
      if (level.intermodulation().isPresent()) {
        double smpte = level.intermodulation().get().smpte();
        assertTrue(smpte > before, "rises with level");
        before = smpte;
        levels++;
      }
    }
    assertEquals(3, levels);
  }

  @Test
  void whileSomethingIsDraggedItIsLeftOut() {
    StageAnswer live = Bench.on(310).standardWith("drive", "0.5 V").first();
    assertTrue(live.driven().orElseThrow().intermodulation().isEmpty());
  }
}
