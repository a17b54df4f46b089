package perveance.engine.device.geometry;

/** Checks of dimensions. */
final class Dimension {
  private Dimension() {}

  static double positive(String name, double value) {
    if (!(value > 0) || value == Double.POSITIVE_INFINITY) {
      throw new IllegalArgumentException(name + " must be above 0, found " + value);
    }
    return value;
  }

  static void wire(double pitch, double wireRadius) {
    positive("pitch", pitch);
    positive("wireRadius", wireRadius);
    if (wireRadius > pitch / 3) {
      throw new IllegalArgumentException(
          "wireRadius must be at most a third of the pitch " + pitch + ", found " + wireRadius);
    }
  }
}
