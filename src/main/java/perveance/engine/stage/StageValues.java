package perveance.engine.stage;

import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.device.Device;

/**
 * A stage's values with its devices found: what a kind builds from.
 *
 * @param entry the stage as entered
 * @param devices devices by key ({@code device}, {@code device2})
 * @param around what stands around the stage in its chassis
 */
public record StageValues(StageEntry entry, Map<String, Device> devices, Surroundings around) {
  /** Copies the map. */
  public StageValues {
    devices = Map.copyOf(devices);
  }

  /**
   * A stage by itself.
   *
   * @param entry the stage as entered
   * @param devices devices by key ({@code device}, {@code device2})
   */
  public StageValues(StageEntry entry, Map<String, Device> devices) {
    this(entry, devices, Surroundings.NONE);
  }

  /**
   * The same stage in other surroundings.
   *
   * @param surroundings what stands around it
   * @return the stage there
   */
  public StageValues in(Surroundings surroundings) {
    return new StageValues(entry, devices, surroundings);
  }

  /**
   * Reference of the stage.
   *
   * @return for example {@code V1a}
   */
  public String ref() {
    return entry.ref();
  }

  /**
   * Whether a key is stated.
   *
   * @param key key
   * @return true when it is there
   */
  public boolean has(String key) {
    return entry.settings().containsKey(key);
  }

  /**
   * A stated quantity.
   *
   * @param key key
   * @return value in the key's SI unit [1]
   * @throws IllegalArgumentException when the key is absent or no quantity
   */
  public double number(String key) {
    return find(key).orElseThrow(() -> new IllegalArgumentException("no quantity for key " + key));
  }

  /**
   * A quantity, or a usual value.
   *
   * @param key key
   * @param usual taken when absent, in the key's SI unit [1]
   * @return value in the key's SI unit [1]
   */
  public double number(String key, double usual) {
    return find(key).orElse(usual);
  }

  /**
   * A quantity that may be absent.
   *
   * @param key key
   * @return value in the key's SI unit, or empty [1]
   */
  public OptionalDouble find(String key) {
    return entry.settings().get(key) instanceof Setting.Number n
        ? OptionalDouble.of(n.value())
        : OptionalDouble.empty();
  }

  /**
   * A word.
   *
   * @param key key
   * @return the word, or empty
   */
  public Optional<String> word(String key) {
    return Optional.ofNullable(entry.settings().get(key)).map(Setting::text);
  }

  /**
   * A flag; absent means false.
   *
   * @param key key
   * @return true when stated true
   */
  public boolean flag(String key) {
    return entry.settings().get(key) instanceof Setting.Flag f && f.flag();
  }

  /**
   * The device of the stage.
   *
   * @return device named by {@code device}
   */
  public Device device() {
    Device device = devices.get("device");
    if (device == null) {
      throw new IllegalArgumentException("stage " + ref() + " has no device");
    }
    return device;
  }

  /**
   * The second device where a stage has two different ones; otherwise the first.
   *
   * @return device named by {@code device2}, or {@code device}
   */
  public Device secondDevice() {
    Device second = devices.get("device2");
    return second == null ? device() : second;
  }
}
