package perveance.engine.stage;

import java.util.Map;
import java.util.Optional;
import perveance.engine.circuit.Element;
import perveance.engine.device.Capacitances;
import perveance.engine.device.Device;
import perveance.engine.device.LawKind;
import perveance.engine.stage.Drawing.SymbolType;
import perveance.engine.stage.StageCircuit.StageDevice;

/** Puts a valve section with its interelectrode and wiring capacitances into the circuit. */
final class ValveWiring {
  static final String TRIODE = "triode";
  static final String PENTODE = "pentode";
  static final String ULTRA_LINEAR = "ultra-linear";

  /**
   * Usual wiring capacitances: 0.7 pF from grid to anode, 1.5 pF from grid and 3 pF from anode to
   * chassis (common practice for short leads and an unscreened socket) [F].
   */
  private static final double USUAL_GRID_ANODE = 0.7e-12;

  private static final double USUAL_GRID = 1.5e-12;
  private static final double USUAL_ANODE = 3e-12;

  /** Share of a pentode's input capacitance that goes to its screen; about half in most types. */
  private static final double SCREEN_SHARE = 0.5;

  private ValveWiring() {}

  /**
   * Nodes of a section.
   *
   * @param anode node
   * @param grid node
   * @param screen node; the cathode's where there is no screen
   * @param cathode node
   */
  record Nodes(int anode, int grid, int screen, int cathode) {}

  /**
   * How a device's screen is joined: as stated, or in the way that its kind suggests. What is said
   * of a beam valve, {@code beam} or {@code tetrode}, is a screen with a feed of its own as well.
   */
  static String connection(StageValues values, Device device) {
    if (device.law().kind() != LawKind.PENTODE) {
      return TRIODE;
    }
    String stated = values.word(StageKeys.CONNECTION.key()).orElse(PENTODE);
    return stated.equals(TRIODE) || stated.equals(ULTRA_LINEAR) ? stated : PENTODE;
  }

  static SymbolType symbol(Device device) {
    if (device.law().kind() == LawKind.PENTODE) {
      return device.beam() ? SymbolType.BEAM_TETRODE : SymbolType.PENTODE;
    }
    boolean filament = !device.heaters().isEmpty() && device.heaters().get(0).directlyHeated();
    return filament ? SymbolType.DIRECTLY_HEATED_TRIODE : SymbolType.TRIODE;
  }

  /** Adds a section named {@code ref} whose device stands under {@code key}. */
  static void add(
      StageWiring wiring, String ref, String key, Nodes nodes, String connection, boolean biased) {
    Map<String, Device> devices = wiring.values().devices();
    Device device = Optional.ofNullable(devices.get(key)).orElseGet(wiring.values()::device);
    wiring.element(
        new Element.Valve(
            ref, device.law(), nodes.anode(), nodes.grid(), nodes.screen(), nodes.cathode()));
    wiring.device(new StageDevice(ref, device, key, connection, biased));
    capacitances(wiring, ref, device, nodes);
  }

  private static void capacitances(StageWiring wiring, String ref, Device device, Nodes nodes) {
    Capacitances own = device.capacitances();
    StageValues values = wiring.values();
    double wiringGridAnode = values.number(StageKeys.STRAY_GRID_ANODE.key(), USUAL_GRID_ANODE);
    boolean screened = device.law().kind() == LawKind.PENTODE;
    double toScreen = screened ? SCREEN_SHARE * own.gridCathode() : 0;
    Stray stray = new Stray(wiring, ref);
    stray.add("grid_anode", nodes.grid(), nodes.anode(), own.gridAnode() + wiringGridAnode);
    stray.add("grid_cathode", nodes.grid(), nodes.cathode(), own.gridCathode() - toScreen);
    stray.add("grid_screen", nodes.grid(), nodes.screen(), toScreen);
    stray.add("anode_cathode", nodes.anode(), nodes.cathode(), own.anodeCathode());
    stray.add(
        "grid_wiring", nodes.grid(), 0, values.number(StageKeys.STRAY_GRID.key(), USUAL_GRID));
    stray.add(
        "anode_wiring", nodes.anode(), 0, values.number(StageKeys.STRAY_ANODE.key(), USUAL_ANODE));
    assume(wiring, own);
  }

  private static void assume(StageWiring wiring, Capacitances own) {
    if (own.equals(Capacitances.NONE)) {
      wiring.assume("No interelectrode capacitances are published; only the wiring counts.");
    }
    StageValues values = wiring.values();
    boolean stated =
        values.has(StageKeys.STRAY_GRID_ANODE.key())
            && values.has(StageKeys.STRAY_GRID.key())
            && values.has(StageKeys.STRAY_ANODE.key());
    if (!stated) {
      wiring.assume(
          "Wiring capacitances that are not stated: 0.7 pF grid to anode, 1.5 pF grid to chassis,"
              + " 3 pF anode to chassis.");
    }
  }

  /** Adds capacitances between electrodes of one section. */
  private record Stray(StageWiring wiring, String ref) {
    void add(String local, int a, int b, double capacitance) {
      if (capacitance > 0 && a != b) {
        wiring.element(
            new Element.Capacitor(
                ref + ".capacitance_" + local,
                a,
                b,
                capacitance,
                perveance.engine.circuit.CapacitorRole.STRAY));
      }
    }
  }
}
