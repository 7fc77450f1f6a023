package org.mastwright.frame;

/**
 * Vectors of three and 3×3 matrices (row by row) of finite rotations; nothing is modified unless
 * said.
 */
final class Algebra {
  /** Below this the series of sin x / x is used. */
  private static final double SMALL_ANGLE_RAD = 1e-4;

  private Algebra() {}

  static double dot(double[] a, double[] b) {
    return a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
  }

  static double norm(double[] a) {
    return Math.sqrt(dot(a, a));
  }

  static double[] cross(double[] a, double[] b) {
    return new double[] {
      a[1] * b[2] - a[2] * b[1], a[2] * b[0] - a[0] * b[2], a[0] * b[1] - a[1] * b[0]
    };
  }

  static double[] plus(double[] a, double[] b) {
    return new double[] {a[0] + b[0], a[1] + b[1], a[2] + b[2]};
  }

  static double[] minus(double[] a, double[] b) {
    return new double[] {a[0] - b[0], a[1] - b[1], a[2] - b[2]};
  }

  static double[] times(double s, double[] a) {
    return new double[] {s * a[0], s * a[1], s * a[2]};
  }

  static double[] identity() {
    return new double[] {1, 0, 0, 0, 1, 0, 0, 0, 1};
  }

  /** {@code A·v}. */
  static double[] apply(double[] a, double[] v) {
    return new double[] {
      a[0] * v[0] + a[1] * v[1] + a[2] * v[2],
      a[3] * v[0] + a[4] * v[1] + a[5] * v[2],
      a[6] * v[0] + a[7] * v[1] + a[8] * v[2]
    };
  }

  /** {@code Aᵀ·v}. */
  static double[] applyTransposed(double[] a, double[] v) {
    return new double[] {
      a[0] * v[0] + a[3] * v[1] + a[6] * v[2],
      a[1] * v[0] + a[4] * v[1] + a[7] * v[2],
      a[2] * v[0] + a[5] * v[1] + a[8] * v[2]
    };
  }

  /** {@code A·B}. */
  static double[] product(double[] a, double[] b) {
    double[] c = new double[9];
    for (int i = 0; i < 3; i++) {
      for (int j = 0; j < 3; j++) {
        c[3 * i + j] = a[3 * i] * b[j] + a[3 * i + 1] * b[3 + j] + a[3 * i + 2] * b[6 + j];
      }
    }
    return c;
  }

  static double[] transpose(double[] a) {
    return new double[] {a[0], a[3], a[6], a[1], a[4], a[7], a[2], a[5], a[8]};
  }

  /** The matrix of {@code v ×}. */
  static double[] skew(double[] v) {
    return new double[] {0, -v[2], v[1], v[2], 0, -v[0], -v[1], v[0], 0};
  }

  /** The rotation by the vector {@code v} (Rodrigues). */
  static double[] rotation(double[] v) {
    double angle = norm(v);
    double a2 = angle * angle;
    double s = angle < SMALL_ANGLE_RAD ? 1 - a2 / 6 : Math.sin(angle) / angle;
    double h = angle / 2;
    double sh = angle < SMALL_ANGLE_RAD ? 1 - h * h / 6 : Math.sin(h) / h;
    double c = sh * sh / 2;
    double[] k = skew(v);
    double[] kk = product(k, k);
    double[] r = identity();
    for (int i = 0; i < 9; i++) {
      r[i] += s * k[i] + c * kk[i];
    }
    return r;
  }

  /** The rotation vector of a rotation of less than half a turn. */
  static double[] rotationVector(double[] r) {
    double[] axial = {(r[7] - r[5]) / 2, (r[2] - r[6]) / 2, (r[3] - r[1]) / 2};
    double sine = norm(axial);
    double cosine = (r[0] + r[4] + r[8] - 1) / 2;
    double angle = Math.atan2(sine, cosine);
    double scale = sine < 1e-6 ? 1 + angle * angle / 6 : angle / sine;
    return times(scale, axial);
  }

  /** Solves {@code A·x = b} for a symmetric positive 3×3 by Cramer's rule. */
  static double[] solve(double[] a, double[] b) {
    return apply(inverse(a), b);
  }

  static double[] inverse(double[] a) {
    double[] c = {
      a[4] * a[8] - a[5] * a[7], a[2] * a[7] - a[1] * a[8], a[1] * a[5] - a[2] * a[4],
      a[5] * a[6] - a[3] * a[8], a[0] * a[8] - a[2] * a[6], a[2] * a[3] - a[0] * a[5],
      a[3] * a[7] - a[4] * a[6], a[1] * a[6] - a[0] * a[7], a[0] * a[4] - a[1] * a[3]
    };
    double det = a[0] * c[0] + a[1] * c[3] + a[2] * c[6];
    for (int i = 0; i < 9; i++) {
      c[i] /= det;
    }
    return c;
  }
}
