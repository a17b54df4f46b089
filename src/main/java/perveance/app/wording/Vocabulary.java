package perveance.app.wording;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Which of the two trade vocabularies is printed; both are read everywhere. */
public enum Vocabulary {
  /** Anode, valve, HT, earth. */
  BRITISH(Map.of()),
  /** Plate, tube, B+, ground. */
  AMERICAN(american());

  private final Map<String, String> words;
  private final Pattern pattern;

  Vocabulary(Map<String, String> words) {
    this.words = words;
    this.pattern =
        words.isEmpty()
            ? Pattern.compile("(?!)")
            : Pattern.compile("\\b(" + String.join("|", words.keySet()) + ")\\b");
  }

  private static Map<String, String> american() {
    Map<String, String> words = new LinkedHashMap<>();
    words.put("anodes", "plates");
    words.put("anode", "plate");
    words.put("Anode", "Plate");
    words.put("valves", "tubes");
    words.put("valve", "tube");
    words.put("Valves", "Tubes");
    words.put("Valve", "Tube");
    words.put("HT", "B+");
    words.put("earthed", "grounded");
    words.put("earth", "ground");
    words.put("Earth", "Ground");
    words.put("bypassed", "bypassed");
    words.put("mutual conductance", "transconductance");
    return words;
  }

  /**
   * A text in this vocabulary.
   *
   * @param text in British words
   * @return the same in this vocabulary
   */
  public String say(String text) {
    Matcher matcher = pattern.matcher(text);
    return matcher.replaceAll(
        m -> Matcher.quoteReplacement(words.getOrDefault(m.group(1), m.group(1))));
  }
}
