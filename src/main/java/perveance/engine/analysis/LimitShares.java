package perveance.engine.analysis;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.base.Unit;
import perveance.engine.device.Ratings;
import perveance.engine.stage.StageCircuit.StageDevice;

/**
 * How much of every published limit a valve uses: at idle, with cold valves, and at the stated
 * drive. Every row of ratings in the device file is compared, the default one first.
 */
final class LimitShares {
  static final String IDLE = "idle";
  static final String COLD = "cold start";
  static final String DRIVE = "drive";

  private final StageDevice device;
  private final DevicePoint idle;
  private final double heater;
  private final List<LimitUse> uses = new ArrayList<>();

  /**
   * Starts with a valve at idle.
   *
   * @param device the valve
   * @param idle its operating point
   * @param heater heater supply to chassis [V]
   */
  LimitShares(StageDevice device, DevicePoint idle, double heater) {
    this.device = device;
    this.idle = idle;
    this.heater = heater;
  }

  /** All uses so far. */
  List<LimitUse> uses() {
    return List.copyOf(uses);
  }

  void addIdle(OptionalDouble gridResistance) {
    double cathodeCurrent =
        idle.anodeCurrent() + idle.gridCurrent() + idle.screenCurrent().orElse(0);
    for (Ratings r : device.device().ratings()) {
      add(r, "anode voltage", IDLE, idle.anode(), r.anodeVoltage(), Unit.VOLT);
      add(r, "anode dissipation", IDLE, idle.anodeDissipation(), r.anodeDissipation(), Unit.WATT);
      add(r, "screen voltage", IDLE, idle.screen(), r.screenVoltage(), Unit.VOLT);
      add(
          r,
          "screen dissipation",
          IDLE,
          idle.screenDissipation(),
          r.screenDissipation(),
          Unit.WATT);
      add(r, "cathode current", IDLE, cathodeCurrent, r.cathodeCurrent(), Unit.AMPERE);
      add(
          r,
          device.cathodeBiased() ? "grid leak, cathode bias" : "grid leak, fixed bias",
          IDLE,
          gridResistance,
          device.cathodeBiased() ? r.gridLeakCathode() : r.gridLeakFixed(),
          Unit.OHM);
      addHeater(r, IDLE, idle.cathodeChassis());
    }
  }

  /** Both sections of an envelope together; called for one of them. */
  void addEnvelope(double bothDissipation, String when) {
    for (Ratings r : device.device().ratings()) {
      add(
          r,
          "both anodes' dissipation",
          when,
          bothDissipation,
          r.bothAnodesDissipation(),
          Unit.WATT);
    }
  }

  /**
   * With cold valves.
   *
   * @param anode anode to cathode [V]
   * @param cathode cathode to chassis [V]
   */
  void addCold(double anode, double cathode) {
    for (Ratings r : device.device().ratings()) {
      add(r, "cold anode voltage", COLD, anode, r.coldAnodeVoltage(), Unit.VOLT);
      addHeater(r, COLD, cathode);
    }
  }

  /**
   * At the stated drive.
   *
   * @param anodeDissipation mean [W]
   * @param screenDissipation mean, empty for a triode [W]
   * @param cathodeCurrent mean, empty where not known [A]
   */
  void addDriven(
      double anodeDissipation, OptionalDouble screenDissipation, OptionalDouble cathodeCurrent) {
    for (Ratings r : device.device().ratings()) {
      add(r, "anode dissipation", DRIVE, anodeDissipation, r.anodeDissipation(), Unit.WATT);
      add(r, "screen dissipation", DRIVE, screenDissipation, r.screenDissipation(), Unit.WATT);
      add(r, "cathode current", DRIVE, cathodeCurrent, r.cathodeCurrent(), Unit.AMPERE);
    }
  }

  private void addHeater(Ratings ratings, String when, double cathode) {
    double across = cathode - heater;
    boolean heaterNegative = across >= 0;
    add(
        ratings,
        heaterNegative ? "heater-cathode, heater negative" : "heater-cathode, heater positive",
        when,
        Math.abs(across),
        heaterNegative ? ratings.heaterNegative() : ratings.heaterPositive(),
        Unit.VOLT);
  }

  private void add(
      Ratings ratings,
      String what,
      String when,
      OptionalDouble value,
      OptionalDouble limit,
      Unit unit) {
    if (value.isPresent()) {
      add(ratings, what, when, value.getAsDouble(), limit, unit);
    }
  }

  private void add(
      Ratings ratings, String what, String when, double value, OptionalDouble limit, Unit unit) {
    if (limit.isPresent()) {
      uses.add(
          new LimitUse(
              device.ref(),
              what,
              when,
              value,
              limit.getAsDouble(),
              unit,
              ratings.system(),
              source(ratings)));
    }
  }

  /** How the publication of some ratings is named beside a limit. */
  static String source(Ratings ratings) {
    return ratings.type() + ": " + ratings.source();
  }

  /** The use of one kind at one time under the default ratings. */
  static Optional<LimitUse> find(List<LimitUse> uses, String ref, String what, String when) {
    return uses.stream()
        .filter(u -> u.ref().equals(ref) && u.what().equals(what) && u.when().equals(when))
        .findFirst();
  }
}
