package perveance.engine.analysis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import perveance.engine.base.OutputMessage;

/** An output stage into a load with inductance. */
class ReactiveLoadTest {
  /** A valve of constant mu and ra: every figure follows from the complex load. */
  private static final double MU = 4.2;

  private static final double RA = 800;

  private static Bench linear(String... keysAndTexts) {
    String[] usual = {
      "device", "linear", "supply", "A", "primary", "2k5", "secondary_load", "8R",
      "grid_bias", "-40 V", "grid_leak", "100k", "source", "1R", "drive", "20 V"
    };
    String[] all = new String[usual.length + keysAndTexts.length];
    System.arraycopy(usual, 0, all, 0, usual.length);
    System.arraycopy(keysAndTexts, 0, all, usual.length, keysAndTexts.length);
    return Bench.on(250)
        .devices(new SampleDevices("linear", new LinearTriodeLaw(MU, RA, 60e-3, 0, 1)))
        .stage("V1", "single-ended-output", all);
  }

  /**
   * Derived. With 8 ohm and 8 ohm of reactance the primary sees 2.5 k + j 2.5 k: 1 mH at 1,273.24
   * Hz. The current's peak is mu Vg / |ra + 2500 + j 2500| = 84 / 4140.05 = 20.29 mA, the power i^2
   * R / 2 = 0.5146 W, the anode swings by i |Z| = 71.73 V. Tolerance: wiring capacitance and the
   * source before the grid, below 1e-3.
   */
  @Test
  void powerAndVoltageAreThoseOfTheComplexLoad() {
    StageAnswer answer = linear("load_inductance", "1m").full();
    ReactiveAnswer reactive = answer.large().reactive().orElseThrow();
    double current = MU * 20 / Math.hypot(RA + 2500, 2500);
    double swing = current * Math.hypot(2500, 2500);
    DevicePoint idle = answer.points().get(0);
    assertEquals(1273.24, reactive.frequency(), 0.01);
    assertEquals(0.5 * current * current * 2500, reactive.power(), 1e-3 * reactive.power());
    assertEquals(idle.anode() + swing, reactive.anodePeak(), 1e-3 * swing);
    assertEquals(idle.anodeCurrent() + current, reactive.currentPeak(), 1e-3 * current);
    assertEquals(Math.sqrt(8 * reactive.power()), reactive.output(), 1e-9);
    assertFalse(reactive.cutOff());
  }

  /**
   * Derived. The anode takes what the supply gives and the load does not: 250 V times the idle
   * current less the power (a linear valve's mean current is its idle one). Tolerance as above.
   */
  @Test
  void energyIsInBalance() {
    StageAnswer answer = linear("load_inductance", "1m").full();
    ReactiveAnswer reactive = answer.large().reactive().orElseThrow();
    double given = 250 * answer.points().get(0).anodeCurrent();
    double taken = reactive.power() + reactive.anodeDissipation().get(0);
    assertEquals(given, taken, 1e-3 * given);
  }

  /**
   * Derived. The path is the ellipse of the load: at 45 degrees its axes follow from v = -|Z| i
   * turned by the angle, so the area it encloses is pi i^2 |Z| sin 45 (area of an ellipse of two
   * sines out of phase). A polygon of n corners in an ellipse has n / (2 pi) sin(2 pi / n) of it.
   */
  @Test
  void thePathIsTheEllipse() {
    StageAnswer answer = linear("load_inductance", "1m").full();
    ReactiveAnswer reactive = answer.large().reactive().orElseThrow();
    assertEquals(reactive.path(), answer.loadLine().orElseThrow().reactive());
    double area = 0;
    for (int k = 1; k < reactive.path().size(); k++) {
      LoadLineView.Point a = reactive.path().get(k - 1);
      LoadLineView.Point b = reactive.path().get(k);
      area += 0.5 * (a.voltage() * b.current() - b.voltage() * a.current());
    }
    int corners = reactive.path().size() - 1;
    double current = MU * 20 / Math.hypot(RA + 2500, 2500);
    double ellipse = Math.PI * current * current * 2500;
    double polygon = corners / (2 * Math.PI) * Math.sin(2 * Math.PI / corners);
    assertEquals(ellipse * polygon, Math.abs(area), 2e-3 * ellipse);
  }

  /** Derived. Far below the corner the load is its resistance, and the figures those at drive. */
  @Test
  void atALowFrequencyTheLoadIsItsResistance() {
    StageAnswer answer = linear("load_inductance", "1m", "load_frequency", "10 Hz").full();
    ReactiveAnswer reactive = answer.large().reactive().orElseThrow();
    double driven = answer.driven().orElseThrow().power().orElseThrow();
    assertEquals(10, reactive.frequency(), 1e-12);
    assertEquals(driven, reactive.power(), 1e-3 * driven);
  }

  /** The figures into the resistance are those of a stage that states no inductance. */
  @Test
  void theOtherFiguresAreThoseIntoTheResistance() {
    StageAnswer with = linear("load_inductance", "1m").full();
    StageAnswer without = linear().full();
    assertEquals(without.smallSignal().gain(), with.smallSignal().gain(), 1e-12);
    assertEquals(without.driven(), with.driven());
    assertTrue(without.large().reactive().isEmpty());
  }

  /**
   * Derived. At a frequency at which the primary's own reactance is below the load, the valve has
   * to give the current of both; driven to the clean limit of the load alone it is cut off.
   */
  @Test
  void anEllipseReachesCutOffBeforeTheLine() {
    Bench bench = FindingCases.of(OutputMessage.REACTIVE_CUT_OFF);
    StageAnswer answer = bench.full();
    ReactiveAnswer reactive = answer.large().reactive().orElseThrow();
    assertTrue(reactive.inputPeak() <= answer.clean().inputPeak());
    assertTrue(reactive.cutOff());
  }
}
