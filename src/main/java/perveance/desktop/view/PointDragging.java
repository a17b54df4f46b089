package perveance.desktop.view;

import perveance.desktop.viewmodel.Desk;

/** Stub replaced below. */
final class PointDragging {
  PointDragging(Desk desk, CharacteristicsView view, LoadLineLayer lines) {}
}
