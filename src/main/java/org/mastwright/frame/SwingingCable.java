package org.mastwright.frame;

import static org.mastwright.frame.Algebra.inverse;
import static org.mastwright.frame.Algebra.product;

/**
 * A cable that swings with its own mass: a string of straight pieces between its anchor and a node,
 * eliminated from the anchor up, so that only a 3×3 on its attachment is left.
 */
final class SwingingCable {
  final int node;
  final int inner;
  final double[] arm;

  /** Mass at each inner point and half of it at the attachment. */
  final double pointMass_kg;

  private final double[][] pieces;
  private final double[][] reduced;
  private final double[] end = new double[9];
  private int negativePivots;

  SwingingCable(Chain.Cable cable, Catenary now, double[] arm, int count, double addedMass_kgpm) {
    this.node = cable.node();
    this.arm = arm;
    this.inner = count - 1;
    this.pointMass_kg = (cable.mass_kgpm() + addedMass_kgpm) * cable.unstretched_m() / count;
    this.pieces = new double[count][];
    this.reduced = new double[inner][];
    double piece_m = cable.unstretched_m() / count;
    for (int i = 0; i < count; i++) {
      pieces[i] = stiffness(now.tensionAt((i + 0.5) * piece_m), cable.axial_N(), piece_m);
    }
  }

  private static double[] stiffness(double[] tension_N, double axial_N, double piece_m) {
    double t = Algebra.norm(tension_N);
    double now_m = piece_m * (1 + t / axial_N);
    double[] k = new double[9];
    for (int i = 0; i < 3; i++) {
      for (int j = 0; j < 3; j++) {
        double along = tension_N[i] * tension_N[j] / (t * t);
        k[3 * i + j] = axial_N / piece_m * along + t / now_m * ((i == j ? 1 : 0) - along);
      }
    }
    return k;
  }

  /** Eliminates the inner points of {@code K − σM}; what is left is in {@link #end}. */
  void factor(double sigma) {
    negativePivots = 0;
    for (int i = 0; i < inner; i++) {
      double[] s = new double[9];
      for (int k = 0; k < 9; k++) {
        s[k] = pieces[i][k] + pieces[i + 1][k] - (k % 4 == 0 ? sigma * pointMass_kg : 0);
      }
      if (i > 0) {
        subtract(s, product(product(pieces[i], reduced[i - 1]), pieces[i]));
      }
      negativePivots += negative(s);
      reduced[i] = inverse(s);
    }
    System.arraycopy(pieces[inner], 0, end, 0, 9);
    subtract(end, product(product(pieces[inner], reduced[inner - 1]), pieces[inner]));
  }

  /** What the factored cable adds to its node's block. */
  double[] end() {
    return end;
  }

  int negativePivots() {
    return negativePivots;
  }

  private static void subtract(double[] a, double[] b) {
    for (int k = 0; k < 9; k++) {
      a[k] -= b[k];
    }
  }

  /** Negative pivots of a symmetric 3×3. */
  private static int negative(double[] s) {
    double d1 = s[0];
    double d2 = s[4] - s[1] * s[1] / d1;
    double l = s[5] - s[1] * s[2] / d1;
    double d3 = s[8] - s[2] * s[2] / d1 - l * l / d2;
    return (d1 < 0 ? 1 : 0) + (d2 < 0 ? 1 : 0) + (d3 < 0 ? 1 : 0);
  }

  /** Eliminates loads on the inner points; returns what reaches the attachment. */
  double[] forward(double[] x, int from) {
    double[] carried = new double[3];
    for (int i = 0; i < inner; i++) {
      double[] here = {
        x[from + 3 * i] + carried[0],
        x[from + 3 * i + 1] + carried[1],
        x[from + 3 * i + 2] + carried[2]
      };
      System.arraycopy(here, 0, x, from + 3 * i, 3);
      carried = Algebra.apply(pieces[i + 1], Algebra.apply(reduced[i], here));
    }
    return carried;
  }

  /** Inner movements from the attachment's, after {@link #forward}. */
  void backward(double[] x, int from, double[] attachment) {
    double[] above = attachment;
    for (int i = inner - 1; i >= 0; i--) {
      double[] drawn = Algebra.apply(pieces[i + 1], above);
      double[] here = {
        x[from + 3 * i] + drawn[0], x[from + 3 * i + 1] + drawn[1], x[from + 3 * i + 2] + drawn[2]
      };
      above = Algebra.apply(reduced[i], here);
      System.arraycopy(above, 0, x, from + 3 * i, 3);
    }
  }

  /** Forces of the cable's own stiffness on inner points and attachment, added to {@code y}. */
  double[] multiply(double[] x, int from, double[] attachment, double[] y) {
    double[] lower = new double[3];
    double[] force = new double[3];
    for (int i = 0; i <= inner; i++) {
      double[] upper =
          i < inner
              ? new double[] {x[from + 3 * i], x[from + 3 * i + 1], x[from + 3 * i + 2]}
              : attachment;
      force = Algebra.apply(pieces[i], Algebra.minus(upper, lower));
      for (int k = 0; k < 3; k++) {
        if (i < inner) {
          y[from + 3 * i + k] += force[k];
        }
        if (i > 0) {
          y[from + 3 * (i - 1) + k] -= force[k];
        }
      }
      lower = upper;
    }
    return force;
  }
}
