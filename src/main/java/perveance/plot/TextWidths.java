package perveance.plot;

import java.awt.Font;
import java.awt.font.FontRenderContext;
import java.util.LinkedHashMap;
import java.util.Map;

/** Widths of texts; measured once, since a drawing is laid out again with every answer. */
final class TextWidths {
  private static final FontRenderContext CONTEXT = new FontRenderContext(null, true, true);
  private static final float MEASURED_SIZE = 100;
  private static final int MOST = 2000;

  private final Font font;
  private final Map<String, Double> known = new LinkedHashMap<>();

  TextWidths(Font font) {
    this.font = font.deriveFont(MEASURED_SIZE);
  }

  double of(String text, double size) {
    if (known.size() > MOST) {
      known.clear();
    }
    double width =
        known.computeIfAbsent(
            text, t -> t.isEmpty() ? 0 : font.getStringBounds(t, CONTEXT).getWidth());
    return width * size / MEASURED_SIZE;
  }
}
