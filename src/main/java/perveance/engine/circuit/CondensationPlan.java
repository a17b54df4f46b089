package perveance.engine.circuit;

import java.util.Arrays;

/** Chooses the pivots of a {@link Condensation} and keeps their order. */
final class CondensationPlan {
  /** A pivot smaller than this against its row's largest entry is left to Newton's matrix. */
  private static final double CHOOSE = 1e-6;

  /** Rows and columns of the full matrix: pivots first, then those that stay, devices first. */
  final int[] row;

  final int[] column;

  int pivots;

  private final int full;
  private final int kept;
  private final double[] work;
  private final double[] rowScale;
  private final boolean[] rowTaken;
  private final boolean[] columnTaken;

  CondensationPlan(int full, int kept) {
    this.full = full;
    this.kept = kept;
    this.row = new int[full];
    this.column = new int[full];
    this.work = new double[full * full];
    this.rowScale = new double[full];
    this.rowTaken = new boolean[full];
    this.columnTaken = new boolean[full];
  }

  void make(double[] linear) {
    System.arraycopy(linear, 0, work, 0, work.length);
    Arrays.fill(rowTaken, false);
    Arrays.fill(columnTaken, false);
    for (int i = 0; i < full; i++) {
      double largest = 0;
      for (int j = 0; j < full; j++) {
        largest = Math.max(largest, Math.abs(work[i * full + j]));
      }
      rowScale[i] = largest;
    }
    pivots = 0;
    while (choose()) {
      reduce();
      pivots++;
    }
    int nextRow = pivots;
    int nextColumn = pivots;
    for (int i = 0; i < full; i++) {
      if (!rowTaken[i]) {
        row[nextRow++] = i;
      }
      if (!columnTaken[i]) {
        column[nextColumn++] = i;
      }
    }
  }

  /** The largest entry, against its row, that is no device's. */
  private boolean choose() {
    double best = CHOOSE;
    boolean found = false;
    for (int i = kept; i < full; i++) {
      for (int j = kept; j < full && !rowTaken[i]; j++) {
        double size = columnTaken[j] ? 0 : Math.abs(work[i * full + j]) / rowScale[i];
        if (size > best) {
          best = size;
          row[pivots] = i;
          column[pivots] = j;
          found = true;
        }
      }
    }
    return found;
  }

  private void reduce() {
    int at = row[pivots] * full;
    int c = column[pivots];
    rowTaken[row[pivots]] = true;
    columnTaken[c] = true;
    for (int i = 0; i < full; i++) {
      double factor = work[i * full + c] / work[at + c];
      if (factor != 0 && !rowTaken[i]) {
        for (int j = 0; j < full; j++) {
          work[i * full + j] -= factor * work[at + j];
        }
      }
    }
  }
}
