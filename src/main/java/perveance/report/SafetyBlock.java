package perveance.report;

import java.awt.Color;
import java.util.ArrayList;
import java.util.List;
import perveance.app.wording.SafetyBox;

/** The framed cautions: signal word white on black, one act per line with a box to tick. */
final class SafetyBlock implements Block {
  private static final double SIZE = 9;
  private static final double LINE = 11.5;
  private static final double PANEL = 92;
  private static final double TICK = 9;

  private final Typeface faces;
  private final SafetyBox box;

  SafetyBlock(Typeface faces, SafetyBox box) {
    this.faces = faces;
    this.box = box;
  }

  private double textWidth(double width) {
    return width - PANEL - TICK - 24;
  }

  private List<List<String>> steps(double width) {
    List<List<String>> steps = new ArrayList<>();
    for (String step : box.steps()) {
      steps.add(TextBlock.wrap(faces.regular(), step, SIZE, textWidth(width)));
    }
    return steps;
  }

  private List<String> footer(double width) {
    return TextBlock.wrap(faces.regular(), box.footer(), 7.5, textWidth(width));
  }

  @Override
  public double height(double width) {
    return frame(width) + 8;
  }

  private double frame(double width) {
    double lines = steps(width).stream().mapToDouble(s -> s.size() * LINE + 2.5).sum();
    return Math.max(86, lines + footer(width).size() * 9.5 + 12);
  }

  @Override
  public void draw(Ink ink, double x, double y, double width) {
    double h = frame(width);
    ink.fill(x, y, PANEL, h, Ink.BLACK);
    ink.box(x, y, width, h, 1.8, Ink.BLACK);
    centred(ink, x, y + h / 2 - 16, 13, box.signal());
    centred(ink, x, y + h / 2 + 4, 15, box.headline());
    double at = y + h / 2 + 19;
    for (String line : TextBlock.wrap(faces.regular(), box.consequence(), 8.5, PANEL - 8)) {
      ink.text(
          x + (PANEL - faces.regular().width(line, 8.5)) / 2,
          at,
          faces.regular(),
          8.5,
          Color.WHITE,
          line);
      at += 10;
    }
    lines(ink, x + PANEL + 10, y + 7, width);
  }

  private void lines(Ink ink, double x, double top, double width) {
    double y = top;
    for (List<String> step : steps(width)) {
      ink.box(x, y + 1, TICK, TICK, 0.8, Ink.BLACK);
      for (String line : step) {
        ink.text(x + TICK + 6, y + SIZE, faces.regular(), SIZE, Ink.BLACK, line);
        y += LINE;
      }
      y += 2.5;
    }
    for (String line : footer(width)) {
      ink.text(x + TICK + 6, y + 8, faces.regular(), 7.5, Ink.SOFT, line);
      y += 9.5;
    }
  }

  private void centred(Ink ink, double x, double y, double size, String text) {
    double w = faces.bold().width(text, size);
    ink.text(x + (PANEL - w) / 2, y, faces.bold(), size, Color.WHITE, text);
  }
}
