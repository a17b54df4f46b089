package perveance.files.device;

import perveance.engine.base.Unit;
import perveance.files.toml.Range;

/** What a figure of a valve may be at all; wide, for a slip of three powers of ten. */
final class Ranges {
  static final Range VOLTAGE = Range.above0(Unit.VOLT, 100_000);
  static final Range ANY_VOLTAGE = Range.within(Unit.VOLT, 100_000);
  static final Range GRID_VOLTAGE = Range.within(Unit.VOLT, 10_000);
  static final Range CURRENT = Range.above0(Unit.AMPERE, 1000);
  static final Range CURRENT_OR_NONE = Range.from0(Unit.AMPERE, 1000);
  static final Range POWER = Range.above0(Unit.WATT, 100_000);
  static final Range RESISTANCE = Range.above0(Unit.OHM, 1e9);
  static final Range CONDUCTANCE = Range.above0(Unit.SIEMENS, 10);
  static final Range FACTOR = Range.above0(Unit.RATIO, 100_000);
  static final Range CAPACITANCE = Range.from0(Unit.FARAD, 1e-8);
  static final Range RESERVOIR = Range.above0(Unit.FARAD, 0.1);
  static final Range ERROR = Range.from0(Unit.RATIO, 1000);
  static final Range NUMBER = Range.within(Unit.RATIO, 1e12);

  private Ranges() {}
}
