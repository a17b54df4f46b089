package perveance.engine.base;

import java.math.BigDecimal;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;

/** Reads what stands behind a number: a prefix, a unit, both or neither. */
final class UnitSpelling {
  private static final BigDecimal CELSIUS_ZERO = new BigDecimal("273.15");

  /** Symbols, read exactly as written because case tells them apart. */
  private static final Map<Unit, List<String>> SYMBOLS =
      Map.ofEntries(
          Map.entry(Unit.VOLT, List.of("V", "v")),
          Map.entry(Unit.AMPERE, List.of("A", "a")),
          // Greek capital omega U+03A9, ohm sign U+2126, and R as printed on parts
          Map.entry(Unit.OHM, List.of("\u03a9", "\u2126", "R")),
          Map.entry(Unit.FARAD, List.of("F", "f")),
          Map.entry(Unit.HENRY, List.of("H", "h")),
          Map.entry(Unit.WATT, List.of("W", "w")),
          Map.entry(Unit.HERTZ, List.of("Hz", "hz", "HZ", "c/s")),
          Map.entry(Unit.SIEMENS, List.of("S", "A/V", "\u2127")),
          Map.entry(Unit.SECOND, List.of("s")),
          Map.entry(Unit.JOULE, List.of("J")),
          Map.entry(Unit.KELVIN, List.of("K")),
          Map.entry(Unit.METRE, List.of("m")),
          Map.entry(Unit.RATIO, List.of()),
          Map.entry(Unit.DECIBEL, List.of("dB", "db", "DB")),
          Map.entry(Unit.PERVEANCE, List.of("A/V^1.5", "A/V^(3/2)", "A/V^3/2")));

  /** Words, read in any case. */
  private static final Map<Unit, List<String>> WORDS =
      Map.ofEntries(
          Map.entry(Unit.VOLT, List.of("volt", "volts")),
          Map.entry(Unit.AMPERE, List.of("amp", "amps", "ampere", "amperes")),
          Map.entry(Unit.OHM, List.of("ohm", "ohms")),
          Map.entry(Unit.FARAD, List.of("farad", "farads")),
          Map.entry(Unit.HENRY, List.of("henry", "henries", "henrys")),
          Map.entry(Unit.WATT, List.of("watt", "watts")),
          Map.entry(Unit.HERTZ, List.of("hertz", "cps")),
          Map.entry(Unit.SIEMENS, List.of("siemens", "mho", "mhos")),
          Map.entry(Unit.SECOND, List.of("sec", "second", "seconds")),
          Map.entry(Unit.JOULE, List.of("joule", "joules")),
          Map.entry(Unit.KELVIN, List.of("kelvin", "kelvins")),
          Map.entry(Unit.METRE, List.of("metre", "metres", "meter", "meters")),
          Map.entry(Unit.DECIBEL, List.of("decibel", "decibels")));

  /** Spellings with a factor of their own. */
  private static final Map<String, Meaning> SPECIAL =
      Map.ofEntries(
          Map.entry("%", Meaning.scaled(Unit.RATIO, "0.01")),
          Map.entry("percent", Meaning.scaled(Unit.RATIO, "0.01")),
          // as printed on American parts and drawings: microfarad and micro-microfarad
          Map.entry("mfd", Meaning.scaled(Unit.FARAD, "1e-6")),
          Map.entry("MFD", Meaning.scaled(Unit.FARAD, "1e-6")),
          Map.entry("mmfd", Meaning.scaled(Unit.FARAD, "1e-12")),
          Map.entry("MMFD", Meaning.scaled(Unit.FARAD, "1e-12")),
          Map.entry("uuF", Meaning.scaled(Unit.FARAD, "1e-12")),
          Map.entry("\u00b5\u00b5F", Meaning.scaled(Unit.FARAD, "1e-12")),
          Map.entry("megohm", Meaning.scaled(Unit.OHM, "1e6")),
          Map.entry("megohms", Meaning.scaled(Unit.OHM, "1e6")),
          Map.entry("kilohm", Meaning.scaled(Unit.OHM, "1e3")),
          Map.entry("kilohms", Meaning.scaled(Unit.OHM, "1e3")),
          Map.entry("min", Meaning.scaled(Unit.SECOND, "60")),
          Map.entry("in", Meaning.scaled(Unit.METRE, "0.0254")),
          Map.entry("inch", Meaning.scaled(Unit.METRE, "0.0254")),
          Map.entry("thou", Meaning.scaled(Unit.METRE, "0.0000254")),
          Map.entry("\u00b0C", new Meaning(Unit.KELVIN, BigDecimal.ONE, CELSIUS_ZERO)),
          Map.entry("degC", new Meaning(Unit.KELVIN, BigDecimal.ONE, CELSIUS_ZERO)));

  private UnitSpelling() {}

  /** A unit and what makes the written number into one without prefix: n * factor + offset. */
  record Meaning(Unit unit, BigDecimal factor, BigDecimal offset) {
    static Meaning scaled(Unit unit, String factor) {
      return new Meaning(unit, new BigDecimal(factor), BigDecimal.ZERO);
    }

    static Meaning prefixed(Unit unit, SiPrefix prefix) {
      return new Meaning(
          unit, BigDecimal.ONE.scaleByPowerOfTen(prefix.exponent()), BigDecimal.ZERO);
    }

    BigDecimal apply(BigDecimal number) {
      return number.multiply(factor).add(offset);
    }
  }

  /** Reads a suffix as meaning the given unit; nothing at all means the unit itself. */
  static Optional<Meaning> read(String suffix, Unit unit) {
    if (suffix.isEmpty()) {
      return Optional.of(Meaning.prefixed(unit, SiPrefix.NONE));
    }
    Optional<Meaning> named = readNamed(suffix, unit);
    return named.isPresent() ? named : readBarePrefix(suffix, unit);
  }

  /** Reads a suffix as naming any unit, for telling what stands there instead. */
  static Optional<Meaning> readAny(String suffix) {
    for (Unit unit : Unit.values()) {
      Optional<Meaning> named = readNamed(suffix, unit);
      if (named.isPresent()) {
        return named;
      }
    }
    return Optional.empty();
  }

  /** Whether the spelling names the unit itself, without any prefix. */
  static boolean names(String spelling, Unit unit) {
    return SYMBOLS.getOrDefault(unit, List.of()).contains(spelling)
        || WORDS.getOrDefault(unit, List.of()).contains(spelling.toLowerCase(Locale.ROOT));
  }

  private static Optional<Meaning> readNamed(String suffix, Unit unit) {
    Meaning special = SPECIAL.get(suffix);
    if (special != null && special.unit() == unit) {
      return Optional.of(special);
    }
    for (SiPrefix prefix : SiPrefix.values()) {
      for (String spelling : prefix.spellings()) {
        if (prefix.suits(unit)
            && suffix.startsWith(spelling)
            && names(suffix.substring(spelling.length()), unit)) {
          return Optional.of(Meaning.prefixed(unit, prefix));
        }
      }
    }
    return Optional.empty();
  }

  private static Optional<Meaning> readBarePrefix(String suffix, Unit unit) {
    for (SiPrefix prefix : SiPrefix.values()) {
      if (prefix.suits(unit) && prefix.spellings().contains(suffix)) {
        return Optional.of(Meaning.prefixed(unit, prefix));
      }
    }
    return Optional.empty();
  }
}
