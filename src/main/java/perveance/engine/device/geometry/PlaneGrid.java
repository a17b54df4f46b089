package perveance.engine.device.geometry;

/**
 * A plane grid of parallel wires.
 *
 * @param pitch distance between wires, above 0 [m]
 * @param wireRadius above 0, below a third of the pitch [m]
 * @param gridToAnode distance from the wires' plane, above 0 [m]
 */
public record PlaneGrid(double pitch, double wireRadius, double gridToAnode) implements GridWires {
  /** Checks the dimensions. */
  public PlaneGrid {
    Dimension.positive("gridToAnode", gridToAnode);
    Dimension.wire(pitch, wireRadius);
  }

  @Override
  public double reach() {
    return 2 * Math.PI * gridToAnode / pitch;
  }
}
