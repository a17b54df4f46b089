package perveance.engine.device;

import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * Everything known of one device type.
 *
 * @param type type designation, for example {@code 12AX7}
 * @param aliases other names of the same device
 * @param sections how many equal systems one envelope holds [1]
 * @param base base, for example {@code B9A}
 * @param pins pins by number and electrode in the order of the file, {@code 1 -> a2}
 * @param heaters ways of wiring the heater, usual one first
 * @param ratings limits, the one used by default first
 * @param capacitances of one section
 * @param evidence what the law answers to
 * @param law fitted law of one section
 * @param fit how good the fit is, in words and figures
 * @param validity region covered by evidence
 * @param notes published disagreements, assumptions
 * @param rectifier what is published of a rectifier beside its law; empty for other kinds
 * @param beam whether it is a beam tetrode, which has its own symbol but the law of a pentode
 */
public record Device(
    String type,
    List<String> aliases,
    int sections,
    String base,
    Map<String, String> pins,
    List<Heater> heaters,
    List<Ratings> ratings,
    Capacitances capacitances,
    List<Evidence> evidence,
    DeviceLaw law,
    FitSummary fit,
    Validity validity,
    List<String> notes,
    Optional<RectifierRatings> rectifier,
    boolean beam) {
  /** Copies what could change. */
  public Device {
    aliases = List.copyOf(aliases);
    pins = java.util.Collections.unmodifiableMap(new java.util.LinkedHashMap<>(pins));
    heaters = List.copyOf(heaters);
    ratings = List.copyOf(ratings);
    evidence = List.copyOf(evidence);
    notes = List.copyOf(notes);
  }

  /**
   * A device that is neither a rectifier nor a beam tetrode.
   *
   * @param type type designation
   * @param aliases other names of the same device
   * @param sections how many equal systems one envelope holds
   * @param base base
   * @param pins pins by number and electrode
   * @param heaters ways of wiring the heater
   * @param ratings limits
   * @param capacitances of one section
   * @param evidence what the law answers to
   * @param law fitted law of one section
   * @param fit how good the fit is
   * @param validity region covered by evidence
   * @param notes published disagreements, assumptions
   */
  public Device(
      String type,
      List<String> aliases,
      int sections,
      String base,
      Map<String, String> pins,
      List<Heater> heaters,
      List<Ratings> ratings,
      Capacitances capacitances,
      List<Evidence> evidence,
      DeviceLaw law,
      FitSummary fit,
      Validity validity,
      List<String> notes) {
    this(
        type,
        aliases,
        sections,
        base,
        pins,
        heaters,
        ratings,
        capacitances,
        evidence,
        law,
        fit,
        validity,
        notes,
        Optional.empty(),
        false);
  }

  /**
   * The ratings used unless the user names another type of the family.
   *
   * @return first ratings of the file
   */
  public Optional<Ratings> defaultRatings() {
    return ratings.stream().findFirst();
  }
}
