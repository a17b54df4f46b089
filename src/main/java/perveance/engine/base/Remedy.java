package perveance.engine.base;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Objects;

/**
 * A cure for a finding that the engine has computed: a sentence for the person and the edits of the
 * stage's keys that carry it out, so that it can be applied with one press.
 *
 * @param text what to change and what that does, a full sentence
 * @param edits keys of the stage concerned and the new text of each, in the order to apply; empty
 *     where the cure is not a change of the file
 */
public record Remedy(String text, Map<String, String> edits) {
  /** Copies the edits, keeping their order. */
  public Remedy {
    Objects.requireNonNull(text, "text");
    edits = Collections.unmodifiableMap(new LinkedHashMap<>(edits));
  }

  /**
   * Creates a cure that is done by hand and changes no key.
   *
   * @param text what to do, a full sentence
   * @return the cure without edits
   */
  public static Remedy byHand(String text) {
    return new Remedy(text, Map.of());
  }

  /**
   * Creates a cure that sets one key.
   *
   * @param text what to change and what that does, a full sentence
   * @param key the key of the stage
   * @param value the new text of the key
   * @return the cure with one edit
   */
  public static Remedy set(String text, String key, String value) {
    return new Remedy(text, Map.of(key, value));
  }
}
