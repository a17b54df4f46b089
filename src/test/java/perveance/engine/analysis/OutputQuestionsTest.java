package perveance.engine.analysis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import perveance.engine.base.SignalMessage;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.LawKind;

/**
 * What builders and technicians ask about output stages and their drivers, with the simple valve of
 * the sums that are done on paper. *Derived*: the sum stands at each case (common practice); the
 * engine is exact for such a valve, so tolerances are those of the printed digits.
 */
class OutputQuestionsTest {
  private static final String NO_BIAS = "-0.000001 V";

  private static StageAnswer pair(double anode, String primary, String drive) {
    return Bench.on(anode)
        .devices(new SampleDevices("valve", SimpleValve.triode(0, 10e-3)))
        .stage(
            "V1",
            "push-pull-output",
            "device",
            "valve",
            "anode_voltage",
            anode + " V",
            "grid_bias",
            NO_BIAS,
            "primary",
            primary,
            "drive",
            drive)
        .full();
  }

  /**
   * Which load for 420 V with 60 V left at the peak: 360 V over a quarter of the primary. 3.4, 4, 5
   * and 6.6 k: 424, 360, 288 and 218 mA, 76, 65, 52 and 39 W.
   */
  @ParameterizedTest
  @CsvSource({
    "3.4k, 42.35 V, 424, 76.2",
    "4k, 36 V, 360, 64.8",
    "5k, 28.8 V, 288, 51.8",
    "6.6k, 21.82 V, 218, 39.3"
  })
  void powerAndPeakCurrentOfAPair(String primary, String drive, double milliamperes, double watts) {
    DrivenAnswer driven = pair(420, primary, drive).driven().orElseThrow();
    assertEquals(milliamperes, 1e3 * driven.peakAnodeCurrent(), 0.6);
    assertEquals(watts, driven.power().orElseThrow(), 0.1);
  }

  /**
   * What each valve of a pair in class B dissipates: half of 2/pi V Ip - Ip^2 RL / 2, with RL a
   * quarter of the primary. 420 V, 4 k: 17.9 W at 267 mA, where it is greatest, 15.7 W at 360 mA; 2
   * k (a wrong speaker) at 300 mA: 28.9 W.
   */
  @ParameterizedTest
  @CsvSource({"4k, 26.7 V, 17.85", "4k, 36 V, 15.7", "2k, 30 V, 28.85"})
  void dissipationOfAPair(String primary, String drive, double watts) {
    DrivenAnswer driven = pair(420, primary, drive).driven().orElseThrow();
    assertEquals(watts, driven.anodeDissipation().get(0), 0.06);
    assertEquals(watts, driven.anodeDissipation().get(1), 0.06);
  }

  /**
   * A single valve at 250 V and 48 mA that keeps 30 V: 220 V / 48 mA = 4.6 k, 5.3 W; 280 ohm of
   * winding take 13.4 V of the supply.
   */
  @Test
  void loadOfASingleValve() {
    StageAnswer answer =
        Bench.on(263.44)
            .devices(new SampleDevices("valve", SimpleValve.triode(48e-3, 4.8e-3)))
            .stage(
                "V1",
                "single-ended-output",
                "device",
                "valve",
                "supply",
                "A",
                "grid_bias",
                NO_BIAS,
                "primary",
                "4583",
                "winding_resistance",
                "280R",
                "drive",
                "10 V")
            .full();
    assertEquals(250, answer.points().get(0).anode(), 0.01);
    DrivenAnswer driven = answer.driven().orElseThrow();
    assertEquals(5.28, driven.power().orElseThrow(), 0.005);
    assertEquals(96e-3, driven.peakAnodeCurrent(), 1e-6);
  }

  /**
   * How much idle current: a share of the limit over the voltage. 438 V: 28.5, 37.1 and 40.0 mA of
   * anode current are 50, 65 and 70 % of 25 W; of the 10 W of this valve 2.5 times as much.
   */
  @ParameterizedTest
  @CsvSource({"28.5e-3, 0.50", "37.1e-3, 0.65", "40.0e-3, 0.70"})
  void shareOfTheDissipationAtIdle(double current, double share) {
    StageAnswer answer =
        Bench.on(438)
            .devices(new SampleDevices("valve", SimpleValve.triode(current, 1e-3)))
            .stage(
                "V1",
                "push-pull-output",
                "device",
                "valve",
                "anode_voltage",
                "438 V",
                "grid_bias",
                NO_BIAS,
                "primary",
                "4k")
            .full();
    LimitUse use =
        answer.limits().stream()
            .filter(l -> l.what().equals("anode dissipation") && l.when().equals("idle"))
            .findFirst()
            .orElseThrow();
    assertEquals(share * 25 / 10, use.share(), 0.002 * 2.5);
  }

  /**
   * Screen watts behind 1 k from 415 V: 4.5 mA leave 410.5 V, 1.85 W in the screen; 25 mA, the mean
   * when clipping, 390 V, 9.75 W, and 0.63 W in the resistor.
   */
  @ParameterizedTest
  @CsvSource({"4.5e-3, 1.85, 0.020", "25e-3, 9.75, 0.625"})
  void screenWatts(double current, double screenWatts, double resistorWatts) {
    DeviceLaw law = new SimpleValve(LawKind.PENTODE, 50e-3, 5e-3, current, 0);
    StageAnswer answer =
        Bench.on(415)
            .devices(new SampleDevices("valve", law))
            .stage(
                "V1",
                "single-ended-output",
                "device",
                "valve",
                "supply",
                "A",
                "grid_bias",
                NO_BIAS,
                "screen_resistor",
                "1k",
                "primary",
                "5k")
            .full();
    assertEquals(screenWatts, answer.points().get(0).screenDissipation().orElseThrow(), 0.005);
    double watts =
        answer.parts().stream()
            .filter(p -> p.part().key().equals("screen_resistor"))
            .findFirst()
            .orElseThrow()
            .idlePower();
    assertEquals(resistorWatts, watts, 0.0005);
  }

  /**
   * How large a grid leak: gas current times the leak times gm. 2 uA and 9 mA/V: 220 k lift the
   * grid by 0.44 V and the current by 4 mA; 470 k by 0.94 V and 8.5 mA.
   */
  @ParameterizedTest
  @CsvSource({"220k, 0.44, 4.0", "470k, 0.94, 8.5"})
  void gasCurrentInAGridLeak(String leak, double volts, double milliamperes) {
    double[] current = new double[2];
    double[] grid = new double[2];
    for (int gas = 0; gas < 2; gas++) {
      DeviceLaw law = new SimpleValve(LawKind.TRIODE, 100e-3, 9e-3, 0, -2e-6 * gas);
      StageAnswer answer =
          Bench.on(300)
              .devices(new SampleDevices("valve", law))
              .stage(
                  "V1",
                  "push-pull-output",
                  "device",
                  "valve",
                  "supply",
                  "A",
                  "grid_bias",
                  "-6 V",
                  "grid_leak",
                  leak,
                  "primary",
                  "5k")
              .full();
      current[gas] = answer.points().get(0).anodeCurrent();
      grid[gas] = answer.points().get(0).grid();
    }
    assertEquals(volts, grid[1] - grid[0], 0.001);
    assertEquals(milliamperes, 1e3 * (current[1] - current[0]), 0.05);
  }

  /**
   * Will the splitter drive the output grids? 38 V peak are wanted; a gain of 28 asks 1.36 V of its
   * input; it is clean to 45 V: 1.5 dB, told as little.
   */
  @Test
  void aThinMarginOfADriver() {
    // mu 56, 50 k, 50 k load: a gain of 28; clean until 45 / 28 V of bias are used up
    StageAnswer answer =
        Bench.on(300)
            .devices(new SampleDevices("valve", new LinearTriodeLaw(56, 50e3, 1e-3, 0, 1)))
            .stage(
                "V1",
                "common-cathode",
                "device",
                "valve",
                "supply",
                "A",
                "anode_load",
                "50k",
                "grid_bias",
                Double.toString(-45 / 28.0) + " V",
                "grid_leak",
                "1M",
                "drive",
                "1.357 V")
            .full();
    assertEquals(-28, answer.smallSignal().gain(), 0.01);
    assertEquals(38, Math.sqrt(2) * answer.driven().orElseThrow().output(), 0.05);
    assertEquals(45, answer.clean().outputPeak(), 0.1);
    assertEquals(1.5, answer.clean().headroom().orElseThrow(), 0.05);
    assertTrue(
        answer.findings().stream().anyMatch(f -> f.code() == SignalMessage.LITTLE_HEADROOM),
        answer.findings().toString());
  }
}
