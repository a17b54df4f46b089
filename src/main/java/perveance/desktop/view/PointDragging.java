package perveance.desktop.view;

import java.util.List;
import java.util.Optional;
import javafx.scene.Cursor;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseEvent;
import perveance.desktop.view.LoadLineLayer.Grip;
import perveance.desktop.viewmodel.Desk;
import perveance.desktop.viewmodel.PointDrag;
import perveance.desktop.viewmodel.PointDrag.Mover;
import perveance.desktop.viewmodel.Workbench;
import perveance.engine.analysis.LoadLineView;
import perveance.engine.analysis.StageAnswer;

/** The hand on the characteristics: takes hold of a grip and pulls. */
final class PointDragging {
  private static final double REACH = 13;
  private static final double KEY_STEP = 0.02;
  private static final double MILLI = 1e-3;

  private final Workbench bench;
  private final CharacteristicsView view;
  private final LoadLineLayer lines;
  private final PointDrag drag;
  private Mover mover = Mover.BIAS;
  private Optional<Grip> held = Optional.empty();

  PointDragging(Desk desk, PointDrag drag, CharacteristicsView view, LoadLineLayer lines) {
    this.bench = desk.bench();
    this.view = view;
    this.lines = lines;
    this.drag = drag;
    lines.addEventHandler(MouseEvent.MOUSE_MOVED, this::hover);
    lines.addEventHandler(MouseEvent.MOUSE_PRESSED, this::press);
    lines.addEventHandler(MouseEvent.MOUSE_DRAGGED, this::pull);
    lines.addEventHandler(MouseEvent.MOUSE_RELEASED, e -> release());
    view.setFocusTraversable(true);
    view.addEventHandler(KeyEvent.KEY_PRESSED, this::keyed);
  }

  void mover(Mover chosen) {
    mover = chosen;
  }

  private Optional<Grip> at(double x, double y) {
    return lines.grips().stream()
        .filter(g -> Math.hypot(g.x() - x, g.y() - y) < REACH)
        .min(
            (a, b) ->
                Double.compare(Math.hypot(a.x() - x, a.y() - y), Math.hypot(b.x() - x, b.y() - y)));
  }

  private void hover(MouseEvent event) {
    lines.setCursor(at(event.getX(), event.getY()).isPresent() ? Cursor.HAND : Cursor.CROSSHAIR);
  }

  private void press(MouseEvent event) {
    view.requestFocus();
    held = at(event.getX(), event.getY());
    if (held.isPresent()) {
      drag.begin();
      view.hold(true);
    }
  }

  private void release() {
    if (held.isPresent()) {
      held = Optional.empty();
      drag.end();
      view.hold(false);
    }
  }

  private void pull(MouseEvent event) {
    Optional<LoadLineView> line = bench.stageAnswer().flatMap(StageAnswer::loadLine);
    if (held.isEmpty() || line.isEmpty()) {
      return;
    }
    PlotScale scale = view.scale();
    double volts = scale.valueX(event.getX());
    double amperes = scale.valueY(event.getY()) * MILLI;
    switch (held.get().handle()) {
      case POINT -> point(scale, line.get(), event);
      case DC_END -> end(line.get().dc(), volts, amperes, true);
      case AC_END -> end(line.get().ac(), volts, amperes, false);
      case SWING_UP, SWING_DOWN -> swing(scale, line.get(), event);
    }
  }

  /** With the bias free the point runs along the dc line: its foot nearest to the hand is meant. */
  private void point(PlotScale scale, LoadLineView line, MouseEvent event) {
    double x = event.getX();
    double y = event.getY();
    List<LoadLineView.Point> dc = line.dc();
    if (mover == Mover.BIAS && dc.size() > 1) {
      double ax = scale.x(dc.get(0).voltage());
      double ay = scale.y(dc.get(0).current() / MILLI);
      double bx = scale.x(dc.get(dc.size() - 1).voltage());
      double by = scale.y(dc.get(dc.size() - 1).current() / MILLI);
      double length = (bx - ax) * (bx - ax) + (by - ay) * (by - ay);
      double share = ((x - ax) * (bx - ax) + (y - ay) * (by - ay)) / Math.max(1, length);
      y = ay + Math.max(0.005, Math.min(1, share)) * (by - ay);
    }
    drag.point(mover, scale.valueX(x), scale.valueY(y) * MILLI);
  }

  /** The line turns about its foot, the ac line about the operating point. */
  private void end(List<LoadLineView.Point> line, double volts, double amperes, boolean dc) {
    LoadLineView.Point foot = line.get(0);
    if (dc) {
      double current = Math.max(amperes, 1e-6);
      drag.dcLoad(Math.max(1, foot.voltage() - Math.max(0, volts)) / current);
      return;
    }
    LoadLineView now = bench.stageAnswer().flatMap(StageAnswer::loadLine).orElseThrow();
    double rise = amperes - now.current();
    if (rise > 0) {
      drag.acLoad(Math.max(1, now.anode() - Math.max(0, volts)) / rise);
    }
  }

  private void swing(PlotScale scale, LoadLineView line, MouseEvent event) {
    List<LoadLineView.Point> path = line.excursion();
    if (path.size() < 2) {
      return;
    }
    boolean up = held.orElseThrow().handle() == LoadLineLayer.Handle.SWING_UP;
    LoadLineView.Point end = up ? path.get(0) : path.get(path.size() - 1);
    double qx = scale.x(line.anode());
    double qy = scale.y(line.current() / MILLI);
    double ex = scale.x(end.voltage()) - qx;
    double ey = scale.y(end.current() / MILLI) - qy;
    double along =
        ((event.getX() - qx) * ex + (event.getY() - qy) * ey) / Math.max(1, ex * ex + ey * ey);
    drag.swing(Math.max(0.02, along));
  }

  /** Arrows move the operating point a little; B and L choose what may move. */
  private void keyed(KeyEvent event) {
    Optional<LoadLineView> line = bench.stageAnswer().flatMap(StageAnswer::loadLine);
    if (line.isEmpty() || event.isShortcutDown()) {
      return;
    }
    double sign = event.getCode() == KeyCode.UP || event.getCode() == KeyCode.LEFT ? 1 : -1;
    switch (event.getCode()) {
      case UP, DOWN, LEFT, RIGHT -> {
        drag.begin();
        drag.point(
            mover,
            line.get().anode() * (1 - sign * KEY_STEP),
            line.get().current() * (1 + sign * KEY_STEP));
        drag.end();
      }
      default -> {
        return;
      }
    }
    event.consume();
  }
}
