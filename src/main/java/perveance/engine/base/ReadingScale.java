package perveance.engine.base;

import java.util.List;

/**
 * Which multiple of a unit a reading is printed in, as meters and data sheets do: 0.11 W rather
 * than 110 mW, 1000 uF rather than 1 mF.
 *
 * @param from the least size printed with this prefix, as a power of ten
 * @param prefix the prefix
 */
record ReadingScale(int from, SiPrefix prefix) {
  private static ReadingScale step(int from, SiPrefix prefix) {
    return new ReadingScale(from, prefix);
  }

  /** The steps of a unit from the largest down; what is smaller than all takes the last. */
  static List<ReadingScale> of(Unit unit) {
    return switch (unit) {
      case VOLT ->
          List.of(
              step(4, SiPrefix.KILO),
              step(-1, SiPrefix.NONE),
              step(-4, SiPrefix.MILLI),
              step(-7, SiPrefix.MICRO),
              step(-10, SiPrefix.NANO));
      case AMPERE ->
          List.of(
              step(0, SiPrefix.NONE),
              step(-4, SiPrefix.MILLI),
              step(-7, SiPrefix.MICRO),
              step(-10, SiPrefix.NANO),
              step(-13, SiPrefix.PICO));
      case OHM ->
          List.of(
              step(9, SiPrefix.GIGA),
              step(6, SiPrefix.MEGA),
              step(3, SiPrefix.KILO),
              step(-1, SiPrefix.NONE),
              step(-4, SiPrefix.MILLI));
      case FARAD ->
          List.of(step(-6, SiPrefix.MICRO), step(-9, SiPrefix.NANO), step(-12, SiPrefix.PICO));
      case WATT, JOULE ->
          List.of(step(-2, SiPrefix.NONE), step(-5, SiPrefix.MILLI), step(-8, SiPrefix.MICRO));
      case HERTZ ->
          List.of(
              step(9, SiPrefix.GIGA),
              step(6, SiPrefix.MEGA),
              step(3, SiPrefix.KILO),
              step(-1, SiPrefix.NONE),
              step(-4, SiPrefix.MILLI));
      case HENRY, SECOND, METRE ->
          List.of(step(0, SiPrefix.NONE), step(-3, SiPrefix.MILLI), step(-6, SiPrefix.MICRO));
      case SIEMENS, PERVEANCE -> List.of(step(-4, SiPrefix.MILLI), step(-7, SiPrefix.MICRO));
      case RATIO, DECIBEL, KELVIN -> List.of(step(0, SiPrefix.NONE));
    };
  }

  /** The prefix for a size whose first figure stands at the given power of ten. */
  static SiPrefix prefixFor(Unit unit, int leadingPower) {
    List<ReadingScale> steps = of(unit);
    for (ReadingScale step : steps) {
      if (leadingPower >= step.from()) {
        return step.prefix();
      }
    }
    return steps.get(steps.size() - 1).prefix();
  }
}
