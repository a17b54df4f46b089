package perveance.desktop.view;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import javafx.geometry.Rectangle2D;
import javafx.geometry.VPos;
import javafx.scene.canvas.Canvas;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.layout.Region;
import javafx.scene.paint.Color;
import javafx.scene.text.Font;
import javafx.scene.text.FontWeight;
import perveance.desktop.viewmodel.Desk;
import perveance.desktop.viewmodel.Settings;
import perveance.engine.analysis.Band;
import perveance.engine.analysis.DevicePoint;
import perveance.engine.analysis.LoadLineView;
import perveance.engine.analysis.StageAnswer;
import perveance.engine.base.QuantityFormat;
import perveance.engine.base.Unit;
import perveance.engine.device.Validity;
import perveance.plot.PlotDescription;
import perveance.plot.PlotPoint;
import perveance.plot.StagePlots;

/** What moves over the characteristics; plain lines, so that a drag costs little. */
final class LoadLineLayer extends Region {
  private static final double MILLI = 1e-3;
  private static final double PIECE = 8;
  private static final double MOST_PIECES = 200;

  private final Desk desk;
  private final Canvas canvas = new Canvas();
  private final TextWidth widths = new TextWidth();
  private final List<Grip> grips = new ArrayList<>();
  private PlotScale scale = new PlotScale(0, 0, 1, 1, NONE, NONE);
  private static final perveance.plot.PlotAxis NONE = new perveance.plot.PlotAxis("", 0, 1, false);

  LoadLineLayer(Desk desk) {
    this.desk = desk;
    getChildren().add(canvas);
  }

  /** What a hand can take hold of. */
  enum Handle {
    POINT,
    DC_END,
    AC_END,
    SWING_UP,
    SWING_DOWN
  }

  /**
   * Something that a hand can take hold of.
   *
   * @param handle what
   * @param x where, in pixels [1]
   * @param y where, in pixels [1]
   */
  record Grip(Handle handle, double x, double y) {}

  List<Grip> grips() {
    return List.copyOf(grips);
  }

  PlotScale scale() {
    return scale;
  }

  @Override
  protected void layoutChildren() {
    canvas.setWidth(getWidth());
    canvas.setHeight(getHeight());
  }

  void clear() {
    grips.clear();
    canvas.getGraphicsContext2D().clearRect(0, 0, canvas.getWidth(), canvas.getHeight());
  }

  void draw(
      StageAnswer answer,
      LoadLineView view,
      PlotDescription frame,
      PlotScale newScale,
      List<Rectangle2D> texts) {
    scale = newScale;
    clear();
    canvas.setWidth(getWidth());
    canvas.setHeight(getHeight());
    GraphicsContext g = canvas.getGraphicsContext2D();
    Settings settings = desk.settings().get();
    g.save();
    g.beginPath();
    g.rect(scale.left(), scale.top(), scale.width(), scale.height());
    g.clip();
    List<PlotPoint> edge = StagePlots.gridCurrentEdge(answer, frame);
    gridCurrent(g, edge, settings);
    evidence(g, answer, view, settings);
    line(g, view.dc(), Skin.ink(settings), 1.6, false);
    line(g, view.ac(), Skin.accent(settings), 1.5, true);
    line(g, view.excursion(), Skin.accent(settings), 4.5, false);
    line(g, view.reactive(), Skin.accent(settings), 1.8, false);
    band(g, answer, view, settings);
    g.restore();
    grips(view);
    paintGrips(g, settings);
    List<Rectangle2D> taken = new ArrayList<>(texts);
    grips.forEach(grip -> taken.add(new Rectangle2D(grip.x() - 8, grip.y() - 9, 16, 18)));
    taken.add(label(g, view, settings, taken));
    if (edge.size() > 1) {
      taken.addAll(covered(view.dc()));
      taken.addAll(covered(view.ac()));
      gridCurrentWords(g, settings, edge, taken);
    }
  }

  private void gridCurrent(GraphicsContext g, List<PlotPoint> edge, Settings settings) {
    if (edge.size() < 2) {
      return;
    }
    g.setFill(Skin.shade(settings));
    g.beginPath();
    g.moveTo(scale.left(), scale.top());
    g.lineTo(scale.left(), scale.y(0));
    for (PlotPoint p : edge) {
      g.lineTo(scale.x(p.x()), scale.y(p.y()));
    }
    g.lineTo(scale.left() + scale.width(), scale.y(edge.get(edge.size() - 1).y()));
    g.lineTo(
        scale.left() + scale.width(),
        Math.min(scale.top(), scale.y(edge.get(edge.size() - 1).y())));
    g.closePath();
    g.fill();
  }

  /** In the corner, or as far down the axis as something else stands there; only if they fit. */
  private void gridCurrentWords(
      GraphicsContext g, Settings settings, List<PlotPoint> edge, List<Rectangle2D> taken) {
    String words = desk.say("grid current");
    Font font = font(11, false);
    double width = widths.width(words, font);
    double height = 15 * settings.textSize();
    double x = scale.left() + 7;
    for (double y = scale.top() + 3; y < scale.top() + scale.height() / 2; y += 5) {
      Rectangle2D box = new Rectangle2D(x, y, width, height);
      if (taken.stream().noneMatch(box::intersects) && shaded(edge, x + width, y + height)) {
        g.setFill(Skin.amber(settings));
        g.setFont(font);
        g.setTextBaseline(VPos.TOP);
        g.fillText(words, x, y);
        return;
      }
    }
  }

  /** What a line covers, in short pieces, so that a slanting line does not cover its whole box. */
  private List<Rectangle2D> covered(List<LoadLineView.Point> line) {
    List<Rectangle2D> pieces = new ArrayList<>();
    for (int i = 1; i < line.size(); i++) {
      double x = scale.x(line.get(i - 1).voltage());
      double y = scale.y(line.get(i - 1).current() / MILLI);
      double across = scale.x(line.get(i).voltage()) - x;
      double down = scale.y(line.get(i).current() / MILLI) - y;
      int count = (int) Math.ceil(Math.min(MOST_PIECES, Math.hypot(across, down) / PIECE));
      for (int k = 0; k < count; k++) {
        double left = x + across * (across < 0 ? k + 1 : k) / count;
        double top = y + down * (down < 0 ? k + 1 : k) / count;
        double width = Math.abs(across) / count + 2;
        pieces.add(new Rectangle2D(left - 1, top - 1, width, Math.abs(down) / count + 2));
      }
    }
    return pieces;
  }

  /** Whether the curve at which grid current begins runs to the right of a point or below it. */
  private boolean shaded(List<PlotPoint> edge, double x, double y) {
    return edge.stream().noneMatch(p -> scale.x(p.x()) < x && scale.y(p.y()) < y);
  }

  /** The region that published evidence covers. */
  private void evidence(
      GraphicsContext g, StageAnswer answer, LoadLineView view, Settings settings) {
    Optional<Validity> region =
        StagePlots.section(answer, view.ref()).map(s -> s.device().validity());
    if (region.isEmpty()) {
      return;
    }
    Validity v = region.get();
    g.setStroke(Skin.ink(settings).deriveColor(0, 1, 1, 0.35));
    g.setLineWidth(1);
    g.setLineDashes(1.5, 4);
    double x = scale.x(v.lowestAnodeVoltage());
    double y = scale.y(v.highestCurrent() / MILLI);
    double w = scale.x(v.highestAnodeVoltage()) - x;
    double h = scale.y(v.lowestCurrent() / MILLI) - y;
    g.strokeRect(x, y, w, h);
    g.setLineDashes();
  }

  private void line(
      GraphicsContext g,
      List<LoadLineView.Point> points,
      Color colour,
      double width,
      boolean dash) {
    g.setStroke(colour);
    g.setLineWidth(width);
    if (dash) {
      g.setLineDashes(7, 5);
    }
    g.beginPath();
    for (int i = 0; i < points.size(); i++) {
      double x = scale.x(points.get(i).voltage());
      double y = scale.y(points.get(i).current() / MILLI);
      if (i == 0) {
        g.moveTo(x, y);
      } else {
        g.lineTo(x, y);
      }
    }
    g.stroke();
    g.setLineDashes();
  }

  /** The 95 % band of the operating point, as an ellipse around it. */
  private void band(GraphicsContext g, StageAnswer answer, LoadLineView view, Settings settings) {
    Optional<DevicePoint> point =
        answer.points().stream().filter(p -> p.ref().equals(view.ref())).findFirst();
    if (point.isEmpty()) {
      return;
    }
    Map<String, Band> bands = point.get().bands();
    Band volts = bands.getOrDefault("anode", bands.get("anodeChassis"));
    Band amperes = bands.get("anodeCurrent");
    if (volts == null || amperes == null) {
      return;
    }
    double across = (volts.high() - volts.low()) / 2;
    double rx = scale.x(view.anode() + across) - scale.x(view.anode());
    double ry = (scale.y(amperes.low() / MILLI) - scale.y(amperes.high() / MILLI)) / 2;
    double x = scale.x(view.anode());
    double y = scale.y(view.current() / MILLI);
    g.setFill(Skin.accent(settings).deriveColor(0, 1, 1, 0.2));
    g.fillOval(x - rx, y - ry, 2 * rx, 2 * ry);
    g.setStroke(Skin.accent(settings));
    g.setLineWidth(1);
    g.strokeOval(x - rx, y - ry, 2 * rx, 2 * ry);
  }

  private void grips(LoadLineView view) {
    add(Handle.POINT, view.anode(), view.current());
    end(Handle.DC_END, view.dc());
    if (Math.abs(view.acResistance() / view.dcResistance() - 1) > 0.01) {
      end(Handle.AC_END, view.ac());
    }
    List<LoadLineView.Point> swing = view.excursion();
    if (swing.size() > 1) {
      LoadLineView.Point last = swing.get(swing.size() - 1);
      add(Handle.SWING_UP, swing.get(0).voltage(), swing.get(0).current());
      add(Handle.SWING_DOWN, last.voltage(), last.current());
    }
  }

  private void add(Handle handle, double voltage, double current) {
    grips.add(new Grip(handle, scale.x(voltage), scale.y(current / MILLI)));
  }

  /** The upper end of a line, where it leaves the picture. */
  private void end(Handle handle, List<LoadLineView.Point> line) {
    if (line.size() < 2) {
      return;
    }
    LoadLineView.Point foot = line.get(0);
    LoadLineView.Point head = line.get(line.size() - 1);
    double top = scale.vertical().high() * MILLI;
    double share =
        head.current() > top ? (top - foot.current()) / (head.current() - foot.current()) : 1;
    if (head.voltage() < 0) {
      share = Math.min(share, foot.voltage() / (foot.voltage() - head.voltage()));
    }
    add(
        handle,
        foot.voltage() + share * (head.voltage() - foot.voltage()),
        foot.current() + share * (head.current() - foot.current()));
  }

  private void paintGrips(GraphicsContext g, Settings settings) {
    for (Grip grip : grips) {
      g.setFill(Skin.paper(settings));
      g.setStroke(grip.handle() == Handle.DC_END ? Skin.ink(settings) : Skin.accent(settings));
      g.setLineWidth(2);
      if (grip.handle() == Handle.POINT) {
        g.setFill(Skin.accent(settings));
        g.fillOval(grip.x() - 4.5, grip.y() - 4.5, 9, 9);
        g.setStroke(Skin.paper(settings));
        g.strokeOval(grip.x() - 6, grip.y() - 6, 12, 12);
      } else if (grip.handle() == Handle.DC_END || grip.handle() == Handle.AC_END) {
        g.fillOval(grip.x() - 5, grip.y() - 5, 10, 10);
        g.strokeOval(grip.x() - 5, grip.y() - 5, 10, 10);
      } else {
        g.fillRoundRect(grip.x() - 3.5, grip.y() - 8, 7, 16, 3, 3);
        g.strokeRoundRect(grip.x() - 3.5, grip.y() - 8, 7, 16, 3, 3);
      }
    }
  }

  /** The operating point in words, on the side of it where nothing else stands. */
  private Rectangle2D label(
      GraphicsContext g, LoadLineView view, Settings settings, List<Rectangle2D> taken) {
    QuantityFormat format = QuantityFormat.TYPESET;
    String text =
        format.reading(view.anode(), Unit.VOLT, 3)
            + ", "
            + format.reading(view.current(), Unit.AMPERE, 3);
    Font font = font(13, true);
    Rectangle2D box =
        besidePoint(view, widths.width(text, font) + 4, 16 * settings.textSize(), taken);
    g.setFont(font);
    g.setTextBaseline(VPos.TOP);
    g.setFill(Skin.paper(settings).deriveColor(0, 1, 1, 0.8));
    g.fillRect(box.getMinX(), box.getMinY(), box.getWidth(), box.getHeight());
    g.setFill(Skin.accent(settings));
    g.fillText(text, box.getMinX() + 2, box.getMinY());
    return box;
  }

  private Rectangle2D besidePoint(
      LoadLineView view, double width, double height, List<Rectangle2D> taken) {
    double x = scale.x(view.anode());
    double y = scale.y(view.current() / MILLI);
    Rectangle2D first = null;
    for (double away : new double[] {10, 18, 30, 44}) {
      for (double[] side : new double[][] {{1, -1}, {-1, 1}, {1, 1}, {-1, -1}, {1, 0}, {-1, 0}}) {
        double left = side[0] > 0 ? x + away : x - away - width;
        double top = y - height / 2 + side[1] * (height / 2 + away / 3);
        Rectangle2D box = new Rectangle2D(inside(left, width), top, width, height);
        first = first == null ? box : first;
        boolean within = top > scale.top() && top + height < scale.top() + scale.height();
        if (within && taken.stream().noneMatch(box::intersects)) {
          return box;
        }
      }
    }
    return java.util.Objects.requireNonNull(first);
  }

  private double inside(double left, double width) {
    return Math.max(scale.left() + 1, Math.min(left, scale.left() + scale.width() - width));
  }

  private Font font(double size, boolean bold) {
    return Font.font(
        "Liberation Sans",
        bold ? FontWeight.BOLD : FontWeight.NORMAL,
        size * desk.settings().get().textSize());
  }
}
