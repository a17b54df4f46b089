package perveance.report;

import java.awt.Color;
import java.util.ArrayList;
import java.util.List;

/** A paragraph, wrapped at spaces, with an optional bold word in front and a hanging indent. */
final class TextBlock implements Block {
  private static final double LEADING = 1.28;

  private final Typeface faces;
  private final String lead;
  private final String text;
  private final double size;
  private final Color colour;
  private final boolean bold;
  private final double below;

  TextBlock(Typeface faces, String lead, String text, double size, Color colour) {
    this(faces, lead, text, size, colour, false, 2);
  }

  TextBlock(
      Typeface faces,
      String lead,
      String text,
      double size,
      Color colour,
      boolean bold,
      double below) {
    this.faces = faces;
    this.lead = lead;
    this.text = text;
    this.size = size;
    this.colour = colour;
    this.bold = bold;
    this.below = below;
  }

  private double indent() {
    return lead.isEmpty() ? 0 : faces.bold().width(lead + "  ", size);
  }

  @Override
  public double height(double width) {
    return lines(width).size() * size * LEADING + below;
  }

  private List<String> lines(double width) {
    return wrap(bold ? faces.bold() : faces.regular(), text, size, width - indent());
  }

  @Override
  public void draw(Ink ink, double x, double y, double width) {
    double baseline = y + size;
    if (!lead.isEmpty()) {
      ink.text(x, baseline, faces.bold(), size, Ink.BLACK, lead);
    }
    SheetFont face = bold ? faces.bold() : faces.regular();
    for (String line : lines(width)) {
      ink.text(x + indent(), baseline, face, size, colour, line);
      baseline += size * LEADING;
    }
  }

  /** Lines no wider than the width; a word wider than a line is broken inside. */
  static List<String> wrap(SheetFont face, String text, double size, double width) {
    List<String> lines = new ArrayList<>();
    String line = "";
    for (String word : text.trim().split("\\s+", -1)) {
      String rest = word;
      String longer = line.isEmpty() ? rest : line + " " + rest;
      if (face.width(longer, size) <= width) {
        line = longer;
        continue;
      }
      if (!line.isEmpty()) {
        lines.add(line);
      }
      while (face.width(rest, size) > width && rest.length() > 1) {
        int fits = fitting(face, rest, size, width);
        lines.add(rest.substring(0, fits));
        rest = rest.substring(fits);
      }
      line = rest;
    }
    lines.add(line);
    return lines;
  }

  private static int fitting(SheetFont face, String text, double size, double width) {
    int fits = 1;
    while (fits < text.length() && face.width(text.substring(0, fits + 1), size) <= width) {
      fits++;
    }
    return fits;
  }
}
