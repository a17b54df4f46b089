package perveance.cli;

import java.util.ArrayList;
import java.util.List;

/** Aligns columns of text; the last column runs free and is wrapped with a hanging indent. */
final class TextTable {
  private static final int GAP = 2;

  private final int indent;
  private final int width;
  private final List<List<String>> rows = new ArrayList<>();

  TextTable(int indent, int width) {
    this.indent = indent;
    this.width = width;
  }

  void row(String... cells) {
    rows.add(List.of(cells));
  }

  boolean isEmpty() {
    return rows.isEmpty();
  }

  /** Lines of the table without line ends. */
  List<String> lines() {
    int columns = rows.stream().mapToInt(List::size).max().orElse(0);
    int[] widths = new int[columns];
    for (List<String> row : rows) {
      for (int i = 0; i < row.size(); i++) {
        widths[i] = Math.max(widths[i], row.get(i).codePointCount(0, row.get(i).length()));
      }
    }
    List<String> lines = new ArrayList<>();
    rows.forEach(row -> lines.addAll(lines(row, widths)));
    return lines;
  }

  private List<String> lines(List<String> row, int[] widths) {
    StringBuilder line = new StringBuilder(" ".repeat(indent));
    for (int i = 0; i < row.size() - 1; i++) {
      String cell = row.get(i);
      line.append(cell).append(" ".repeat(widths[i] - cell.codePointCount(0, cell.length()) + GAP));
    }
    int hanging = line.length();
    List<String> wrapped = wrap(row.get(row.size() - 1), Math.max(24, width - hanging));
    List<String> lines = new ArrayList<>();
    for (int i = 0; i < wrapped.size(); i++) {
      String start = i == 0 ? line.toString() : " ".repeat(hanging);
      lines.add((start + wrapped.get(i)).stripTrailing());
    }
    return lines;
  }

  /** Lines no longer than the width, broken at spaces. */
  static List<String> wrap(String text, int width) {
    List<String> lines = new ArrayList<>();
    StringBuilder line = new StringBuilder();
    for (String word : text.split(" ", -1)) {
      if (!line.isEmpty() && line.length() + 1 + word.length() > width) {
        lines.add(line.toString());
        line.setLength(0);
      }
      line.append(line.isEmpty() ? "" : " ").append(word);
    }
    lines.add(line.toString());
    return lines;
  }
}
