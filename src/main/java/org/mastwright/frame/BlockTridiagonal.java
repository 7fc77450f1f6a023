package org.mastwright.frame;

import org.ejml.data.DMatrix6;
import org.ejml.data.DMatrix6x6;
import org.ejml.dense.fixed.CommonOps_DDF6;

/**
 * A symmetric block tridiagonal matrix of 6×6 blocks with its factorisation {@code L·D·Lᵀ}: time
 * and room in proportion to the number of nodes, and nothing allocated once it stands.
 *
 * <p>{@code diagonal[i]} is block (i, i), 36 numbers row by row; {@code upper[i]} is block (i,
 * i+1). The count of negative pivots is the number of eigenvalues below zero (Sylvester).
 */
final class BlockTridiagonal {
  /** A pivot smaller than this share of the block's greatest is taken as this much. */
  private static final double PIVOT_GUARD = 1e-14;

  final int nodes;
  final double[][] diagonal;
  final double[][] upper;

  private final DMatrix6x6[] inverse;
  private final DMatrix6x6[] carry;
  private final DMatrix6x6 block = new DMatrix6x6();
  private final DMatrix6x6 side = new DMatrix6x6();
  private final double[] work = new double[36];
  private final double[] inverted = new double[36];
  private final double[] reciprocals = new double[6];
  private final DMatrix6 a = new DMatrix6();
  private final DMatrix6 b = new DMatrix6();
  private int negativePivots;
  private int firstNegative = -1;

  BlockTridiagonal(int nodes) {
    this.nodes = nodes;
    this.diagonal = new double[nodes][36];
    this.upper = new double[nodes - 1][36];
    this.inverse = new DMatrix6x6[nodes];
    this.carry = new DMatrix6x6[nodes - 1];
    for (int i = 0; i < nodes; i++) {
      inverse[i] = new DMatrix6x6();
      if (i < nodes - 1) {
        carry[i] = new DMatrix6x6();
      }
    }
  }

  void zero() {
    for (double[] d : diagonal) {
      java.util.Arrays.fill(d, 0);
    }
    for (double[] u : upper) {
      java.util.Arrays.fill(u, 0);
    }
  }

  /** {@code this = p + s·q}, of one size. */
  void setToSum(BlockTridiagonal p, double s, BlockTridiagonal q) {
    for (int i = 0; i < nodes; i++) {
      for (int k = 0; k < 36; k++) {
        diagonal[i][k] = p.diagonal[i][k] + s * q.diagonal[i][k];
      }
    }
    for (int i = 0; i < nodes - 1; i++) {
      for (int k = 0; k < 36; k++) {
        upper[i][k] = p.upper[i][k] + s * q.upper[i][k];
      }
    }
  }

  /** Factorises; the blocks stay as they are. */
  void factor() {
    negativePivots = 0;
    firstNegative = -1;
    for (int i = 0; i < nodes; i++) {
      block.setTo(0, diagonal[i]);
      if (i > 0) {
        // block −= upperᵀ · carry, where carry = inverse · upper of the node below
        side.setTo(0, upper[i - 1]);
        CommonOps_DDF6.multAddTransA(-1, side, carry[i - 1], block);
      }
      invert(i);
      if (i < nodes - 1) {
        side.setTo(0, upper[i]);
        CommonOps_DDF6.mult(inverse[i], side, carry[i]);
      }
    }
  }

  /**
   * Inverse of {@code block} by {@code L·D·Lᵀ} without pivoting, counting negative pivots: {@code
   * L⁻ᵀ·D⁻¹·L⁻¹}, of which one half is worked out.
   */
  private void invert(int node) {
    read(block, work);
    double greatest = 0;
    for (int k = 0; k < 6; k++) {
      greatest = Math.max(greatest, Math.abs(work[7 * k]));
    }
    double guard = PIVOT_GUARD * (greatest > 0 ? greatest : 1);
    for (int j = 0; j < 6; j++) {
      double pivot = work[7 * j];
      if (!(Math.abs(pivot) >= guard)) {
        pivot = pivot < 0 ? -guard : guard;
      }
      if (pivot < 0 && negativePivots++ == 0) {
        firstNegative = node;
      }
      double reciprocal = 1 / pivot;
      reciprocals[j] = reciprocal;
      for (int i = j + 1; i < 6; i++) {
        double factor = work[6 * i + j] * reciprocal;
        for (int k = j + 1; k <= i; k++) {
          work[6 * i + k] -= factor * work[6 * k + j];
        }
      }
      for (int i = j + 1; i < 6; i++) {
        work[6 * i + j] *= reciprocal;
      }
    }
    invertUnitTriangle();
    for (int r = 0; r < 6; r++) {
      for (int c = 0; c <= r; c++) {
        double sum = c == r ? reciprocals[r] : work[6 * r + c] * reciprocals[r];
        for (int k = r + 1; k < 6; k++) {
          sum += work[6 * k + r] * reciprocals[k] * work[6 * k + c];
        }
        inverted[6 * r + c] = sum;
        inverted[6 * c + r] = sum;
      }
    }
    inverse[node].setTo(0, inverted);
  }

  /** The unit lower triangle in {@code work} becomes its inverse. */
  private void invertUnitTriangle() {
    for (int c = 0; c < 5; c++) {
      for (int r = c + 1; r < 6; r++) {
        double sum = -work[6 * r + c];
        for (int k = c + 1; k < r; k++) {
          sum -= work[6 * r + k] * work[6 * k + c];
        }
        work[6 * r + c] = sum;
      }
    }
  }

  private static void read(DMatrix6x6 m, double[] out) {
    out[0] = m.a11;
    out[1] = m.a12;
    out[2] = m.a13;
    out[3] = m.a14;
    out[4] = m.a15;
    out[5] = m.a16;
    out[6] = m.a21;
    out[7] = m.a22;
    out[8] = m.a23;
    out[9] = m.a24;
    out[10] = m.a25;
    out[11] = m.a26;
    out[12] = m.a31;
    out[13] = m.a32;
    out[14] = m.a33;
    out[15] = m.a34;
    out[16] = m.a35;
    out[17] = m.a36;
    out[18] = m.a41;
    out[19] = m.a42;
    out[20] = m.a43;
    out[21] = m.a44;
    out[22] = m.a45;
    out[23] = m.a46;
    out[24] = m.a51;
    out[25] = m.a52;
    out[26] = m.a53;
    out[27] = m.a54;
    out[28] = m.a55;
    out[29] = m.a56;
    out[30] = m.a61;
    out[31] = m.a62;
    out[32] = m.a63;
    out[33] = m.a64;
    out[34] = m.a65;
    out[35] = m.a66;
  }

  /** Eigenvalues below zero, counted by the last factorisation. */
  int negativePivots() {
    return negativePivots;
  }

  /** The node of the first negative pivot, or −1. */
  int firstNegative() {
    return firstNegative;
  }

  /** Solves in place; {@code x} has six numbers a node. */
  void solve(double[] x) {
    for (int i = 1; i < nodes; i++) {
      load(x, i - 1, a);
      CommonOps_DDF6.mult(a, carry[i - 1], b);
      subtract(x, i, b);
    }
    for (int i = nodes - 1; i >= 0; i--) {
      load(x, i, a);
      CommonOps_DDF6.mult(inverse[i], a, b);
      store(x, i, b);
      if (i < nodes - 1) {
        load(x, i + 1, a);
        CommonOps_DDF6.mult(carry[i], a, b);
        subtract(x, i, b);
      }
    }
  }

  private static void load(double[] x, int node, DMatrix6 v) {
    int o = 6 * node;
    v.setTo(x[o], x[o + 1], x[o + 2], x[o + 3], x[o + 4], x[o + 5]);
  }

  private static void store(double[] x, int node, DMatrix6 v) {
    int o = 6 * node;
    x[o] = v.a1;
    x[o + 1] = v.a2;
    x[o + 2] = v.a3;
    x[o + 3] = v.a4;
    x[o + 4] = v.a5;
    x[o + 5] = v.a6;
  }

  private static void subtract(double[] x, int node, DMatrix6 v) {
    int o = 6 * node;
    x[o] -= v.a1;
    x[o + 1] -= v.a2;
    x[o + 2] -= v.a3;
    x[o + 3] -= v.a4;
    x[o + 4] -= v.a5;
    x[o + 5] -= v.a6;
  }

  /** {@code y = A·x}; {@code y} is overwritten. */
  void multiply(double[] x, double[] y) {
    java.util.Arrays.fill(y, 0);
    for (int n = 0; n < nodes; n++) {
      addProduct(diagonal[n], x, 6 * n, y, 6 * n);
      if (n < nodes - 1) {
        addProduct(upper[n], x, 6 * n + 6, y, 6 * n);
        addTransposedProduct(upper[n], x, 6 * n, y, 6 * n + 6);
      }
    }
  }

  private static void addProduct(double[] m, double[] x, int from, double[] y, int to) {
    for (int i = 0; i < 6; i++) {
      double sum = 0;
      for (int j = 0; j < 6; j++) {
        sum += m[6 * i + j] * x[from + j];
      }
      y[to + i] += sum;
    }
  }

  private static void addTransposedProduct(double[] m, double[] x, int from, double[] y, int to) {
    for (int i = 0; i < 6; i++) {
      double sum = 0;
      for (int j = 0; j < 6; j++) {
        sum += m[6 * j + i] * x[from + j];
      }
      y[to + i] += sum;
    }
  }
}
