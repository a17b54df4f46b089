package perveance.engine.device;

/**
 * Interelectrode capacitances of one section, without shield.
 *
 * @param gridAnode Cga [F]
 * @param gridCathode Cgk, for pentodes grid to all but anode [F]
 * @param anodeCathode Cak, for pentodes anode to all but grid [F]
 */
public record Capacitances(double gridAnode, double gridCathode, double anodeCathode) {
  /** Not published: taken as zero, and said so. */
  public static final Capacitances NONE = new Capacitances(0, 0, 0);
}
