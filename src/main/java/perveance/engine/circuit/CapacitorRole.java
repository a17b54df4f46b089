package perveance.engine.circuit;

/** What a capacitor does at mid-band: hold its charge over a cycle, or be negligible. */
public enum CapacitorRole {
  /** Coupling, bypass, reservoir: holds its voltage over a mid-band cycle. */
  HOLDS,
  /** Interelectrode and wiring capacitance: an open circuit at mid-band. */
  STRAY
}
