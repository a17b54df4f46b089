package perveance.engine.device.fit;

import perveance.engine.device.DeviceLaw;
import perveance.engine.device.Evidence;

/**
 * A typical law scaled to one valve by one measured point.
 *
 * <p>Valves of a type differ most in conduction (perveance), with wear as in the making, so one
 * current measured at known voltages tells the factor by which this valve conducts more or less
 * than the typical one.
 */
public sealed interface SpecimenFit {
  /**
   * The valve's law.
   *
   * @param law typical law times the factor
   * @param conduction measured over typical current at the measured voltages [1]
   * @param typicalCurrent current of a typical valve at these voltages [A]
   */
  record Scaled(DeviceLaw law, double conduction, double typicalCurrent) implements SpecimenFit {
    /**
     * Conduction in per cent of a typical valve.
     *
     * @return 100 for a typical valve [%]
     */
    public double percentOfTypical() {
      return 100 * conduction;
    }
  }

  /**
   * The point does not tell.
   *
   * @param reason why, in words
   */
  record NotScaled(String reason) implements SpecimenFit {}

  /**
   * Scales a law.
   *
   * @param typical law of a typical valve
   * @param measured one point with anode current; the grid voltage too unless it is a diode
   * @return the valve's law, or why there is none
   */
  static SpecimenFit scale(DeviceLaw typical, Evidence measured) {
    double current = measured.anodeCurrent().orElse(0);
    if (!(current > 0)) {
      return new NotScaled("the measured point has no anode current");
    }
    if (measured.gridVoltage().isEmpty()
        && typical.kind() != perveance.engine.device.LawKind.DIODE) {
      return new NotScaled("the measured point has no grid voltage");
    }
    double expected = new LawReadings(typical).predict(measured, Figure.CURRENT);
    if (!(expected > 0)) {
      return new NotScaled(
          "a typical valve is cut off at the measured voltages, so the current tells no factor");
    }
    double conduction = current / expected;
    return new Scaled(typical.specimen(conduction, 0), conduction, expected);
  }
}
