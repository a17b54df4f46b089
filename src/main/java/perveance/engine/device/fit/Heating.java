package perveance.engine.device.fit;

/** To which point of a filament the voltages of the evidence refer. */
public enum Heating {
  /** Heated with alternating current, voltages to the filament's middle (the usual table). */
  ALTERNATING,
  /** Heated with direct current, voltages to the negative end of the filament. */
  DIRECT_TO_NEGATIVE_END
}
