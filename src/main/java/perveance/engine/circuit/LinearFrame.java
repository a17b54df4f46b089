package perveance.engine.circuit;

import java.util.Arrays;

/**
 * Linear nodal equations over all nodes, known ones included, and branches: (real + j omega rate) x
 * = 0, where a voltage source ties known nodes. Which unknowns remain is the business of the user.
 */
final class LinearFrame {
  final int nodes;
  final int size;
  final double[] real;
  final double[] rate;

  LinearFrame(int nodes, int branches) {
    this.nodes = nodes;
    this.size = nodes + branches;
    this.real = new double[size * size];
    this.rate = new double[size * size];
  }

  void clear() {
    Arrays.fill(real, 0);
    Arrays.fill(rate, 0);
  }

  void conductance(int a, int b, double g) {
    between(real, a, b, g);
  }

  void capacitance(int a, int b, double c) {
    between(rate, a, b, c);
  }

  private void between(double[] matrix, int a, int b, double value) {
    matrix[a * size + a] += value;
    matrix[b * size + b] += value;
    matrix[a * size + b] -= value;
    matrix[b * size + a] -= value;
  }

  /** A current g (v(plus) - v(minus)) that leaves node from and enters node to. */
  void transconductance(int from, int to, int plus, int minus, double g) {
    real[from * size + plus] += g;
    real[from * size + minus] -= g;
    real[to * size + plus] -= g;
    real[to * size + minus] += g;
  }

  /** A branch from a to b with va - vb = (resistance + j omega inductance) times its current. */
  void branch(int branch, int a, int b, double resistance, double inductance) {
    int at = nodes + branch;
    real[a * size + at] += 1;
    real[b * size + at] -= 1;
    real[at * size + a] += 1;
    real[at * size + b] -= 1;
    real[at * size + at] -= resistance;
    rate[at * size + at] -= inductance;
  }

  void addReal(int row, int column, double value) {
    real[row * size + column] += value;
  }

  void addRate(int row, int column, double value) {
    rate[row * size + column] += value;
  }
}
