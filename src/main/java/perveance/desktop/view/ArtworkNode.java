package perveance.desktop.view;

import java.awt.geom.AffineTransform;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import javafx.geometry.Bounds;
import javafx.scene.canvas.Canvas;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.layout.Region;
import javafx.scene.text.Font;
import javafx.scene.text.FontPosture;
import javafx.scene.text.FontWeight;
import org.jfree.fx.FXGraphics2D;
import org.jspecify.annotations.Nullable;
import perveance.plot.Artwork;
import perveance.plot.Hotspot;
import perveance.plot.Pictures;

/** Shows an artwork; the only class of the window that draws with the chart library's graphics. */
final class ArtworkNode extends Region {
  private final Canvas canvas = new Canvas();
  private final FXGraphics2D graphics = new SharpText(canvas.getGraphicsContext2D());
  private Artwork artwork = (g, area) -> List.of();
  private List<Hotspot> spots = List.of();
  private Runnable drawn = () -> {};
  private double zoom = 1;
  private double panX;
  private double panY;

  /** The library rounds sizes to whole units and does not see that a loaded face is bold. */
  private static final class SharpText extends FXGraphics2D {
    private static final int MOST_FACES = 64;

    private final GraphicsContext context;
    private final Map<java.awt.Font, Font> faces = new HashMap<>();

    SharpText(GraphicsContext context) {
      super(context);
      this.context = context;
    }

    @Override
    public void setFont(java.awt.@Nullable Font font) {
      super.setFont(font);
      if (font != null && context != null) {
        context.setFont(face(font));
      }
    }

    /** Small type under a large scale is spaced badly; so it is set at its true size. */
    @Override
    public void drawString(@Nullable String text, float x, float y) {
      AffineTransform now = getTransform();
      boolean plain = now.getShearX() == 0 && now.getShearY() == 0 && now.getScaleX() > 0;
      if (text == null || !plain || now.getScaleX() == 1) {
        super.drawString(text, x, y);
        return;
      }
      Point2D at = now.transform(new Point2D.Double(x, y), null);
      java.awt.Font font = getFont();
      context.save();
      context.setTransform(1, 0, 0, 1, 0, 0);
      context.setFont(face(font.deriveFont((float) (font.getSize2D() * now.getScaleX()))));
      context.fillText(text, at.getX(), at.getY());
      context.restore();
    }

    private static FontWeight weight(java.awt.Font font) {
      return font.getFontName(Locale.ROOT).contains("Bold") ? FontWeight.BOLD : FontWeight.NORMAL;
    }

    private static FontPosture posture(java.awt.Font font) {
      return font.getFontName(Locale.ROOT).contains("Italic")
          ? FontPosture.ITALIC
          : FontPosture.REGULAR;
    }

    /** The names of a face are read from its file, so they are asked for once. */
    private Font face(java.awt.Font font) {
      if (faces.size() > MOST_FACES) {
        faces.clear();
      }
      return faces.computeIfAbsent(
          font, f -> Font.font(f.getFamily(Locale.ROOT), weight(f), posture(f), f.getSize2D()));
    }
  }

  ArtworkNode() {
    getChildren().add(canvas);
    Pictures.smooth(graphics);
    setMinSize(40, 40);
  }

  /** Shows something else and draws it. */
  void show(Artwork shown) {
    artwork = shown;
    draw();
  }

  /** Told after each drawing. */
  void onDrawn(Runnable listener) {
    drawn = listener;
  }

  /** Where things were drawn, in this node's coordinates. */
  List<Hotspot> spots() {
    return spots;
  }

  double zoom() {
    return zoom;
  }

  /** Enlarges around a point. */
  void zoom(double factor, double x, double y) {
    double next = Math.max(0.5, Math.min(6, zoom * factor));
    panX = x - (x - panX) * next / zoom;
    panY = y - (y - panY) * next / zoom;
    zoom = next;
    draw();
  }

  void pan(double dx, double dy) {
    panX += dx;
    panY += dy;
    draw();
  }

  /** All of it, as large as fits. */
  void fit() {
    zoom = 1;
    panX = 0;
    panY = 0;
    draw();
  }

  @Override
  protected void layoutChildren() {
    if (canvas.getWidth() != getWidth() || canvas.getHeight() != getHeight()) {
      canvas.setWidth(getWidth());
      canvas.setHeight(getHeight());
      draw();
    }
  }

  @Override
  protected double computePrefWidth(double height) {
    return 300;
  }

  @Override
  protected double computePrefHeight(double width) {
    return 240;
  }

  private void draw() {
    double width = canvas.getWidth();
    double height = canvas.getHeight();
    if (width < 20 || height < 20) {
      return;
    }
    canvas.getGraphicsContext2D().clearRect(0, 0, width, height);
    spots = artwork.draw(graphics, new Rectangle2D.Double(panX, panY, width * zoom, height * zoom));
    drawn.run();
  }

  /** Area between the axes of a chart; the whole node where none is reported. */
  Bounds data() {
    return spots.stream()
        .filter(s -> s.name().equals(Artwork.BETWEEN_AXES))
        .map(s -> new javafx.geometry.BoundingBox(s.x(), s.y(), s.width(), s.height()))
        .findFirst()
        .map(Bounds.class::cast)
        .orElse(getLayoutBounds());
  }
}
