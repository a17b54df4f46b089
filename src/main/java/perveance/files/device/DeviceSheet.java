package perveance.files.device;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import perveance.engine.device.Capacitances;
import perveance.engine.device.Device;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.Evidence;
import perveance.engine.device.FitSummary;
import perveance.engine.device.Heater;
import perveance.engine.device.Ratings;
import perveance.engine.device.RectifierRatings;
import perveance.engine.device.Validity;

/**
 * What is published of a device type: its file without the fitted law.
 *
 * @param type type designation
 * @param aliases other names of the same device
 * @param kind {@code triode}, {@code pentode}, {@code beam} or {@code rectifier}
 * @param sections how many equal systems one envelope holds
 * @param base base
 * @param pins electrode by pin
 * @param heaters ways of wiring the heater
 * @param ratings limits
 * @param capacitances of one section
 * @param evidence what a law must answer to
 * @param notes published disagreements
 * @param rectifier what is published of a rectifier beside its law
 */
public record DeviceSheet(
    String type,
    List<String> aliases,
    String kind,
    int sections,
    String base,
    Map<String, String> pins,
    List<Heater> heaters,
    List<Ratings> ratings,
    Capacitances capacitances,
    List<Evidence> evidence,
    List<String> notes,
    Optional<RectifierRatings> rectifier) {
  /** Copies what could change. */
  public DeviceSheet {
    aliases = List.copyOf(aliases);
    pins = Collections.unmodifiableMap(new LinkedHashMap<>(pins));
    heaters = List.copyOf(heaters);
    ratings = List.copyOf(ratings);
    evidence = List.copyOf(evidence);
    notes = List.copyOf(notes);
  }

  /**
   * The device with its law.
   *
   * @param law the law of one section
   * @param fit how good it is
   * @param validity what its evidence covers
   * @return the device
   */
  public Device with(DeviceLaw law, FitSummary fit, Validity validity) {
    return new Device(
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
        rectifier,
        kind.equals("beam"));
  }
}
