package perveance.reference;

import java.util.LinkedHashMap;
import java.util.Map;

/** What one engine says of a case: figures by what they are, in a fixed order. */
final class Answers {
  private final Map<String, Double> figures = new LinkedHashMap<>();

  void put(String what, double value) {
    figures.put(what, value);
  }

  double get(String what) {
    Double found = figures.get(what);
    if (found == null) {
      throw new IllegalArgumentException("no answer for " + what);
    }
    return found;
  }

  Map<String, Double> all() {
    return figures;
  }

  /** The figures as lines of two columns. */
  String text() {
    StringBuilder text = new StringBuilder();
    figures.forEach((what, value) -> text.append(what).append('\t').append(value).append('\n'));
    return text.toString();
  }

  static Answers parse(String text) {
    Answers answers = new Answers();
    text.lines()
        .filter(line -> !line.isBlank() && !line.startsWith("#"))
        .map(line -> line.split("\t"))
        .forEach(pair -> answers.put(pair[0], Double.parseDouble(pair[1])));
    return answers;
  }

  static String voltage(String node) {
    return "dc voltage " + node + " [V]";
  }

  static String current(String valve, String electrode) {
    return "dc current " + valve + " " + electrode + " [A]";
  }

  static String signal(String output, double frequency, String part) {
    return "ac " + output + " " + frequency + " Hz " + part + " [1]";
  }

  static String harmonic(String output, int order) {
    return "harmonic " + output + " " + order + " [V]";
  }
}
