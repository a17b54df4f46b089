package perveance.engine.device;

/** What a law describes; decides which electrodes exist. */
public enum LawKind {
  /** Anode and cathode. */
  DIODE,
  /** Anode, grid, cathode. */
  TRIODE,
  /** Anode, control grid, screen, cathode (pentodes and beam tetrodes). */
  PENTODE
}
