package perveance.engine.device.geometry;

/**
 * A helix around the cathode, inside the anode.
 *
 * @param pitch distance between turns, above 0 [m]
 * @param wireRadius above 0, below a third of the pitch [m]
 * @param gridRadius radius of the helix, above 0 [m]
 * @param anodeRadius above the helix's radius [m]
 */
public record CylinderGrid(double pitch, double wireRadius, double gridRadius, double anodeRadius)
    implements GridWires {
  /** Checks the dimensions. */
  public CylinderGrid {
    Dimension.positive("gridRadius", gridRadius);
    Dimension.wire(pitch, wireRadius);
    if (!(anodeRadius > gridRadius)) {
      throw new IllegalArgumentException(
          "anodeRadius must be above the grid's radius " + gridRadius + ", found " + anodeRadius);
    }
  }

  @Override
  public double reach() {
    return 2 * Math.PI * gridRadius / pitch * Math.log(anodeRadius / gridRadius);
  }
}
