package perveance.files.toml;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** Replacements in a text, gathered against its first state and applied together. */
final class TextEdits {
  private record Edit(int start, int end, String text) {}

  private final String text;
  private final List<Edit> edits = new ArrayList<>();

  TextEdits(String text) {
    this.text = text;
  }

  /** Replaces a part; parts must not overlap. */
  void replace(int start, int end, String replacement) {
    edits.add(new Edit(start, end, replacement));
  }

  /** Inserts at a place; several insertions at one place keep their order. */
  void insert(int at, String inserted) {
    edits.add(new Edit(at, at, inserted));
  }

  /**
   * A part of the text with the edits that fall into it. An insertion between two parts belongs to
   * the first of them.
   */
  String apply(int from, int to) {
    List<Edit> here = new ArrayList<>();
    for (Edit edit : edits) {
      boolean ofPartAbove = edit.end() == from && from > 0;
      if (edit.start() >= from && edit.end() <= to && !ofPartAbove) {
        here.add(edit);
      }
    }
    // an insertion goes before a removal that begins at the same place
    here.sort(Comparator.comparingInt(Edit::start).thenComparingInt(Edit::end));
    StringBuilder out = new StringBuilder();
    int at = from;
    for (Edit edit : here) {
      if (edit.start() < at) {
        throw new IllegalStateException("edits overlap at offset " + edit.start());
      }
      out.append(text, at, edit.start()).append(edit.text());
      at = edit.end();
    }
    return out.append(text, at, to).toString();
  }
}
