package perveance.engine.stage;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;

/**
 * One stage as entered: its kind and the values of its keys, in the order of the file.
 *
 * @param ref name on the drawing, for example {@code V1a}
 * @param kind name of the stage kind, for example {@code common-cathode}
 * @param settings values by key, without {@code ref} and {@code kind}
 */
public record StageEntry(String ref, String kind, Map<String, Setting> settings) {
  /** Copies the map, keeping its order. */
  public StageEntry {
    settings = Collections.unmodifiableMap(new LinkedHashMap<>(settings));
  }

  /**
   * The same stage with one key changed or added.
   *
   * @param key key
   * @param setting new value
   * @return the changed stage
   */
  public StageEntry with(String key, Setting setting) {
    Map<String, Setting> changed = new LinkedHashMap<>(settings);
    changed.put(key, setting);
    return new StageEntry(ref, kind, changed);
  }

  /**
   * The same stage without a key.
   *
   * @param key key
   * @return the changed stage
   */
  public StageEntry without(String key) {
    Map<String, Setting> changed = new LinkedHashMap<>(settings);
    changed.remove(key);
    return new StageEntry(ref, kind, changed);
  }
}
