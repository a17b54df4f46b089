package perveance.engine.base;

import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;

/** Reads what stands behind a number: a prefix, a unit, both or neither. */
final class UnitSpelling {
  /** Spellings with a factor of their own. */
  private static final Map<String, UnitMeaning> SPECIAL =
      Map.ofEntries(
          Map.entry("%", UnitMeaning.tenTo(Unit.RATIO, -2)),
          Map.entry("percent", UnitMeaning.tenTo(Unit.RATIO, -2)),
          // as printed on American parts and drawings: microfarad and micro-microfarad
          Map.entry("mfd", UnitMeaning.tenTo(Unit.FARAD, -6)),
          Map.entry("MFD", UnitMeaning.tenTo(Unit.FARAD, -6)),
          Map.entry("mmfd", UnitMeaning.tenTo(Unit.FARAD, -12)),
          Map.entry("MMFD", UnitMeaning.tenTo(Unit.FARAD, -12)),
          Map.entry("uuF", UnitMeaning.tenTo(Unit.FARAD, -12)),
          Map.entry("\u00b5\u00b5F", UnitMeaning.tenTo(Unit.FARAD, -12)),
          Map.entry("megohm", UnitMeaning.tenTo(Unit.OHM, 6)),
          Map.entry("megohms", UnitMeaning.tenTo(Unit.OHM, 6)),
          Map.entry("kilohm", UnitMeaning.tenTo(Unit.OHM, 3)),
          Map.entry("kilohms", UnitMeaning.tenTo(Unit.OHM, 3)),
          Map.entry("min", UnitMeaning.times(Unit.SECOND, "60")),
          Map.entry("in", UnitMeaning.times(Unit.METRE, "0.0254")),
          Map.entry("inch", UnitMeaning.times(Unit.METRE, "0.0254")),
          Map.entry("thou", UnitMeaning.times(Unit.METRE, "0.0000254")),
          Map.entry("\u00b0C", UnitMeaning.plus(Unit.KELVIN, "273.15")),
          Map.entry("degC", UnitMeaning.plus(Unit.KELVIN, "273.15")));

  private UnitSpelling() {}

  /** Symbols, the usual one first, read exactly as written because case tells them apart. */
  private static List<String> symbols(Unit unit) {
    return switch (unit) {
      case VOLT -> List.of("V", "v");
      case AMPERE -> List.of("A", "a");
      // R as printed on parts, Greek capital omega U+03A9, ohm sign U+2126
      case OHM -> List.of("R", "\u03a9", "\u2126");
      case FARAD -> List.of("F", "f");
      case HENRY -> List.of("H", "h");
      case WATT -> List.of("W", "w");
      case HERTZ -> List.of("Hz", "hz", "HZ", "c/s");
      case SIEMENS -> List.of("A/V", "S", "\u2127");
      case SECOND -> List.of("s");
      case JOULE -> List.of("J");
      case KELVIN -> List.of("K");
      case METRE -> List.of("m");
      case RATIO -> List.of();
      case DECIBEL -> List.of("dB", "db", "DB");
      case PERVEANCE -> List.of("A/V^1.5", "A/V^(3/2)", "A/V^3/2");
    };
  }

  /** Words in lower case, read in any case. */
  private static List<String> words(Unit unit) {
    return switch (unit) {
      case VOLT -> List.of("volt", "volts");
      case AMPERE -> List.of("amp", "amps", "ampere", "amperes");
      case OHM -> List.of("ohm", "ohms");
      case FARAD -> List.of("farad", "farads");
      case HENRY -> List.of("henry", "henries", "henrys");
      case WATT -> List.of("watt", "watts");
      case HERTZ -> List.of("hertz", "cps");
      case SIEMENS -> List.of("siemens", "mho", "mhos");
      case SECOND -> List.of("sec", "second", "seconds");
      case JOULE -> List.of("joule", "joules");
      case KELVIN -> List.of("kelvin", "kelvins");
      case METRE -> List.of("metre", "metres", "meter", "meters");
      case DECIBEL -> List.of("decibel", "decibels");
      case RATIO, PERVEANCE -> List.of();
    };
  }

  /** Reads a suffix as meaning the given unit; nothing at all means the unit itself. */
  static Optional<UnitMeaning> read(String suffix, Unit unit) {
    if (suffix.isEmpty()) {
      return Optional.of(UnitMeaning.tenTo(unit, 0));
    }
    Optional<UnitMeaning> named = readNamed(suffix, unit);
    return named.isPresent() ? named : readPrefix(suffix, unit);
  }

  /** Reads a suffix as naming any unit, for telling what stands there instead. */
  static Optional<UnitMeaning> readAny(String suffix) {
    for (Unit unit : Unit.values()) {
      Optional<UnitMeaning> named = readNamed(suffix, unit);
      if (named.isPresent()) {
        return named;
      }
    }
    return Optional.empty();
  }

  /** Whether the spelling names the unit itself, without any prefix. */
  static boolean names(String spelling, Unit unit) {
    return symbols(unit).contains(spelling)
        || words(unit).contains(spelling.toLowerCase(Locale.ROOT));
  }

  private static Optional<UnitMeaning> readNamed(String suffix, Unit unit) {
    for (String symbol : symbols(unit)) {
      if (suffix.endsWith(symbol)) {
        Optional<UnitMeaning> meaning = readBefore(suffix, symbol, unit);
        if (meaning.isPresent()) {
          return meaning;
        }
      }
    }
    for (String word : words(unit)) {
      int start = suffix.length() - word.length();
      if (start >= 0 && suffix.regionMatches(true, start, word, 0, word.length())) {
        Optional<UnitMeaning> meaning = readBefore(suffix, word, unit);
        if (meaning.isPresent()) {
          return meaning;
        }
      }
    }
    // spelt out: the first closure of a program costs its start 8 ms
    UnitMeaning special = SPECIAL.get(suffix);
    return special != null && special.unit() == unit ? Optional.of(special) : Optional.empty();
  }

  private static Optional<UnitMeaning> readBefore(String suffix, String name, Unit unit) {
    return readPrefix(suffix.substring(0, suffix.length() - name.length()), unit);
  }

  private static Optional<UnitMeaning> readPrefix(String spelling, Unit unit) {
    for (SiPrefix prefix : SiPrefix.values()) {
      if (prefix.suits(unit) && prefix.spellings().contains(spelling)) {
        return Optional.of(UnitMeaning.tenTo(unit, prefix.exponent()));
      }
    }
    return Optional.empty();
  }
}
