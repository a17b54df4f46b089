package perveance.desktop.view;

import perveance.desktop.viewmodel.Desk;
import perveance.plot.PlotFonts;

/** Stub, replaced below. */
final class DevicePicker {
  DevicePicker(Desk desk, PlotFonts fonts, String searched) {}

  void ask() {}
}
