package perveance.engine.base;

import java.util.Objects;
import java.util.Optional;
import java.util.OptionalInt;

/**
 * One thing that is wrong with what a person handed in.
 *
 * @param file the file as the person named it; empty when the input is not a file
 * @param line the line, counted from 1; empty where none can be told
 * @param key the key, such as "stage V1a anode_load"; empty when it concerns the file as a whole
 * @param found what stands there, in words that follow "found"
 * @param expected what should stand there, in words that follow "expected"
 * @param suggestion the nearest thing that would be right, such as a key of similar spelling
 */
public record Problem(
    String file,
    OptionalInt line,
    String key,
    String found,
    String expected,
    Optional<String> suggestion) {
  /** Refuses lines before the first. */
  public Problem {
    Objects.requireNonNull(file, "file");
    Objects.requireNonNull(key, "key");
    Objects.requireNonNull(found, "found");
    Objects.requireNonNull(expected, "expected");
    Objects.requireNonNull(suggestion, "suggestion");
    if (line.isPresent() && line.getAsInt() < 1) {
      throw new IllegalArgumentException("line is before the first: " + line.getAsInt());
    }
  }

  /**
   * Creates a problem without a suggestion.
   *
   * @param file the file as the person named it
   * @param line the line, counted from 1
   * @param key the key concerned
   * @param found what stands there
   * @param expected what should stand there
   * @return the problem
   */
  public static Problem at(String file, int line, String key, String found, String expected) {
    return new Problem(file, OptionalInt.of(line), key, found, expected, Optional.empty());
  }

  /**
   * Creates the problem that a refused quantity makes at a place.
   *
   * @param file the file as the person named it
   * @param line the line, counted from 1
   * @param key the key concerned
   * @param refusal why the text is not the quantity asked for
   * @return the problem
   */
  public static Problem at(String file, int line, String key, QuantityException refusal) {
    return at(file, line, key, refusal.found(), refusal.expected());
  }

  /**
   * Adds the nearest thing that would be right.
   *
   * @param nearest what the person probably meant
   * @return the problem with the suggestion
   */
  public Problem suggesting(String nearest) {
    return new Problem(file, line, key, found, expected, Optional.of(nearest));
  }

  /**
   * Says the problem in one line: place, key, found, expected, suggestion.
   *
   * @return the sentence
   */
  public String message() {
    StringBuilder text = new StringBuilder(file);
    line.ifPresent(number -> text.append(text.isEmpty() ? "line " : ":").append(number));
    if (!text.isEmpty()) {
      text.append(": ");
    }
    if (!key.isEmpty()) {
      text.append(key).append(": ");
    }
    text.append("found ").append(found).append(", expected ").append(expected);
    suggestion.ifPresent(nearest -> text.append("; did you mean \"").append(nearest).append("\"?"));
    return text.toString();
  }
}
