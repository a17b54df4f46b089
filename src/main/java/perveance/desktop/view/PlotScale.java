package perveance.desktop.view;

import perveance.plot.PlotAxis;

/**
 * Between pixels and the units of linear axes.
 *
 * @param left of the area between the axes, in pixels [1]
 * @param top of the area between the axes, in pixels [1]
 * @param width of the area between the axes, in pixels [1]
 * @param height of the area between the axes, in pixels [1]
 * @param horizontal axis
 * @param vertical axis
 */
record PlotScale(
    double left, double top, double width, double height, PlotAxis horizontal, PlotAxis vertical) {
  double x(double value) {
    return left + width * (value - horizontal.low()) / (horizontal.high() - horizontal.low());
  }

  double y(double value) {
    return top + height * (vertical.high() - value) / (vertical.high() - vertical.low());
  }

  double valueX(double x) {
    return horizontal.low() + (x - left) / width * (horizontal.high() - horizontal.low());
  }

  double valueY(double y) {
    return vertical.high() - (y - top) / height * (vertical.high() - vertical.low());
  }

  boolean contains(double x, double y) {
    return x >= left && x <= left + width && y >= top && y <= top + height;
  }
}
