package org.mastwright.frame;

import static org.mastwright.frame.Algebra.apply;
import static org.mastwright.frame.Algebra.applyTransposed;
import static org.mastwright.frame.Algebra.cross;
import static org.mastwright.frame.Algebra.dot;
import static org.mastwright.frame.Algebra.minus;
import static org.mastwright.frame.Algebra.norm;
import static org.mastwright.frame.Algebra.plus;
import static org.mastwright.frame.Algebra.product;
import static org.mastwright.frame.Algebra.skew;
import static org.mastwright.frame.Algebra.times;
import static org.mastwright.frame.Algebra.transpose;

/**
 * A beam between two nodes in a frame that turns with it: finite movements and rotations, small
 * strains.
 *
 * <p>In its own frame it has one stretch and two rotations an end. Bending is Timoshenko's, with
 * {@code φ = 12 EI / (κGA L²)}; the mean stretch includes the bow {@code (2a² − ab + 2b²)/30} of
 * the end rotations, which gives the second-order stiffness within one beam. The tangent is the
 * exact derivative of the end forces by spins of the nodes; where the nodes balance it is
 * symmetric.
 */
final class CorotatedBeam {
  /** End forces on the nodes: force and moment at the lower, then the upper node. */
  final double[] force = new double[12];

  /** Derivative of {@code force} by movement and spin, 12×12 row by row. */
  final double[] tangent = new double[144];

  /** Axes of the turned frame as columns of a rotation. */
  double[] frame;

  /** Axial force, positive in tension. */
  double axial_N;

  private final Chain.Beam beam;
  private final double length_m;
  private final double[] reference;

  CorotatedBeam(Chain.Beam beam, double[] lower_m, double[] upper_m) {
    this.beam = beam;
    double[] chord = minus(upper_m, lower_m);
    this.length_m = norm(chord);
    this.reference = axes(times(1 / length_m, chord));
  }

  double length_m() {
    return length_m;
  }

  /** Columns: along the beam, then two across; the second lies level where it can. */
  private static double[] axes(double[] along) {
    double[] helper = Math.abs(along[1]) < 0.9 ? new double[] {0, 1, 0} : new double[] {1, 0, 0};
    double[] third = cross(along, helper);
    third = times(1 / norm(third), third);
    return columns(along, cross(third, along), third);
  }

  private static double[] columns(double[] a, double[] b, double[] c) {
    return new double[] {a[0], b[0], c[0], a[1], b[1], c[1], a[2], b[2], c[2]};
  }

  private static double[] column(double[] m, int j) {
    return new double[] {m[j], m[3 + j], m[6 + j]};
  }

  /** Axis along the beam at rest, turned with the lower or upper node. */
  double[] axisWith(double[] rotation) {
    return apply(rotation, column(reference, 0));
  }

  /**
   * Forces and tangent for node places and rotations.
   *
   * @param withTangent false: forces only
   */
  void update(
      double[] lower_m,
      double[] lowerRotation,
      double[] upper_m,
      double[] upperRotation,
      boolean withTangent) {
    double[] chord = minus(upper_m, lower_m);
    double now_m = norm(chord);
    double[] e1 = times(1 / now_m, chord);
    double[] triad1 = product(lowerRotation, reference);
    double[] triad2 = product(upperRotation, reference);
    double[] q1 = column(triad1, 1);
    double[] q2 = column(triad2, 1);
    double[] q = times(0.5, plus(q1, q2));
    double[] e3 = cross(e1, q);
    e3 = times(1 / norm(e3), e3);
    double[] e2 = cross(e3, e1);
    frame = columns(e1, e2, e3);
    double[] back = transpose(frame);
    double[] a = Algebra.rotationVector(product(back, triad1));
    double[] b = Algebra.rotationVector(product(back, triad2));
    double stretch_m = (now_m * now_m - length_m * length_m) / (now_m + length_m);

    Local local = new Local(beam, length_m, stretch_m, a, b);
    axial_N = local.axial_N;
    double[] m1 = conjugate(a, local.lower_Nm);
    double[] m2 = conjugate(b, local.upper_Nm);
    double[] spin = frameSpin(applyTransposed(frame, q), q1, q2, now_m);
    collect(local, m1, m2, spin);
    if (withTangent) {
      differentiate(local, a, b, m1, m2, spin, now_m, applyTransposed(frame, q));
    }
  }

  /** Forces and stiffness in the turned frame. */
  private static final class Local {
    final double axial_N;
    final double[] lower_Nm = new double[3];
    final double[] upper_Nm = new double[3];
    final double[] stiffness = new double[49];

    Local(Chain.Beam beam, double length, double stretch, double[] a, double[] b) {
      double phi = 12 * beam.bending_Nm2() / (beam.shear_N() * length * length);
      double near = beam.bending_Nm2() * (4 + phi) / (length * (1 + phi));
      double far = beam.bending_Nm2() * (2 - phi) / (length * (1 + phi));
      double twist = beam.torsion_Nm2() / length;
      double bow = 0;
      for (int k = 1; k < 3; k++) {
        bow += (2 * a[k] * a[k] - a[k] * b[k] + 2 * b[k] * b[k]) / 30;
      }
      axial_N = beam.axial_N() * (stretch / length + bow);
      double drawn = axial_N * length / 30;
      lower_Nm[0] = twist * (a[0] - b[0]);
      upper_Nm[0] = twist * (b[0] - a[0]);
      set(0, 0, beam.axial_N() / length);
      set(1, 1, twist);
      set(4, 4, twist);
      set(1, 4, -twist);
      double[] pull = new double[7];
      for (int k = 1; k < 3; k++) {
        lower_Nm[k] = near * a[k] + far * b[k] + drawn * (4 * a[k] - b[k]);
        upper_Nm[k] = far * a[k] + near * b[k] + drawn * (4 * b[k] - a[k]);
        set(1 + k, 1 + k, near + 4 * drawn);
        set(4 + k, 4 + k, near + 4 * drawn);
        set(1 + k, 4 + k, far - drawn);
        pull[1 + k] = (4 * a[k] - b[k]) / 30;
        pull[4 + k] = (4 * b[k] - a[k]) / 30;
      }
      for (int i = 1; i < 7; i++) {
        stiffness[i] += beam.axial_N() * pull[i];
        stiffness[7 * i] += beam.axial_N() * pull[i];
        for (int j = 1; j < 7; j++) {
          stiffness[7 * i + j] += beam.axial_N() * length * pull[i] * pull[j];
        }
      }
    }

    private void set(int i, int j, double value) {
      stiffness[7 * i + j] = value;
      stiffness[7 * j + i] = value;
    }
  }

  /** Moment that works on spins, from the one that works on the rotation vector {@code v}. */
  private static double[] conjugate(double[] v, double[] m) {
    double[] first = cross(v, m);
    return plus(plus(m, times(0.5, first)), times(1.0 / 12, cross(v, first)));
  }

  /** Derivative of a rotation vector by spin: {@code 1 − ½ v× + ¹⁄₁₂ v×v×}. */
  private static double[] spinToVector(double[] v) {
    double[] k = skew(v);
    double[] kk = product(k, k);
    double[] t = Algebra.identity();
    for (int i = 0; i < 9; i++) {
      t[i] += -0.5 * k[i] + kk[i] / 12;
    }
    return t;
  }

  /** Derivative of {@link #conjugate} by the rotation vector. */
  private static double[] conjugateByVector(double[] v, double[] m) {
    double[] k = skew(v);
    double[] mk = skew(m);
    double[] outer = skew(cross(v, m));
    double[] second = product(k, mk);
    double[] d = new double[9];
    for (int i = 0; i < 9; i++) {
      d[i] = -0.5 * mk[i] + (-second[i] - outer[i]) / 12;
    }
    return d;
  }

  /**
   * Spin of the turned frame by the nodes' movements and spins, all in that frame: 3×12 row by row.
   */
  private double[] frameSpin(double[] q, double[] q1, double[] q2, double now_m) {
    double[] l1 = applyTransposed(frame, q1);
    double[] l2 = applyTransposed(frame, q2);
    double eta = q[0] / q[1];
    double[] g = new double[36];
    g[2] = eta / now_m;
    g[3] = l1[1] / q[1] / 2;
    g[4] = -l1[0] / q[1] / 2;
    g[8] = -eta / now_m;
    g[9] = l2[1] / q[1] / 2;
    g[10] = -l2[0] / q[1] / 2;
    g[12 + 2] = 1 / now_m;
    g[12 + 8] = -1 / now_m;
    g[24 + 1] = -1 / now_m;
    g[24 + 7] = 1 / now_m;
    return g;
  }

  /** End forces in the turned frame: moments less what they do through the frame's own spin. */
  private void collect(Local local, double[] m1, double[] m2, double[] g) {
    double[] own = ownSpins(m1, m2, g);
    own[0] -= local.axial_N;
    own[6] += local.axial_N;
    turnVector(own, force);
  }

  /** Twelve numbers from the turned frame to the fixed axes. */
  private void turnVector(double[] own, double[] out) {
    for (int part = 0; part < 4; part++) {
      for (int i = 0; i < 3; i++) {
        out[3 * part + i] =
            frame[3 * i] * own[3 * part]
                + frame[3 * i + 1] * own[3 * part + 1]
                + frame[3 * i + 2] * own[3 * part + 2];
      }
    }
  }

  /** The tangent, built in the turned frame and then turned. */
  private void differentiate(
      Local local,
      double[] a,
      double[] b,
      double[] m1,
      double[] m2,
      double[] g,
      double now_m,
      double[] q) {
    double[] own = new double[144];
    addStretching(own, local, a, b, g);
    addSpinning(own, spinStiffness(local, a, b), g);
    addFrameTurning(own, local, m1, m2, g, now_m, q);
    turnMatrix(own);
  }

  /**
   * Moments by spins of both ends against the frame, 6×6: what the rotation vectors do, and what
   * the moments gain as the vectors they work on change.
   */
  private static double[] spinStiffness(Local local, double[] a, double[] b) {
    double[][] t = {spinToVector(a), spinToVector(b)};
    double[] half = new double[36];
    for (int r = 0; r < 6; r++) {
      for (int end = 0; end < 2; end++) {
        int from = 7 * (r + 1) + 1 + 3 * end;
        for (int c = 0; c < 3; c++) {
          half[6 * r + 3 * end + c] =
              local.stiffness[from] * t[end][c]
                  + local.stiffness[from + 1] * t[end][3 + c]
                  + local.stiffness[from + 2] * t[end][6 + c];
        }
      }
    }
    double[] whole = new double[36];
    for (int end = 0; end < 2; end++) {
      for (int r = 0; r < 3; r++) {
        for (int c = 0; c < 6; c++) {
          whole[6 * (3 * end + r) + c] =
              t[end][r] * half[18 * end + c]
                  + t[end][3 + r] * half[18 * end + 6 + c]
                  + t[end][6 + r] * half[18 * end + 12 + c];
        }
      }
    }
    addBlock(whole, 0, product(conjugateByVector(a, local.lower_Nm), t[0]));
    addBlock(whole, 21, product(conjugateByVector(b, local.upper_Nm), t[1]));
    return whole;
  }

  private static void addBlock(double[] six, int at, double[] three) {
    for (int r = 0; r < 3; r++) {
      for (int c = 0; c < 3; c++) {
        six[at + 6 * r + c] += three[3 * r + c];
      }
    }
  }

  /**
   * {@code PᵀSP} where the ends spin against the frame by {@code P = E − J·g}: their own spins less
   * the frame's.
   */
  private static void addSpinning(double[] own, double[] s, double[] g) {
    double[] sp = new double[72];
    for (int r = 0; r < 6; r++) {
      for (int k = 0; k < 3; k++) {
        double both = s[6 * r + k] + s[6 * r + 3 + k];
        for (int j = 0; j < 12; j++) {
          sp[12 * r + j] -= both * g[12 * k + j];
        }
      }
      for (int k = 0; k < 3; k++) {
        sp[12 * r + 3 + k] += s[6 * r + k];
        sp[12 * r + 9 + k] += s[6 * r + 3 + k];
      }
    }
    for (int k = 0; k < 3; k++) {
      for (int i = 0; i < 12; i++) {
        double v = g[12 * k + i];
        if (v != 0) {
          for (int j = 0; j < 12; j++) {
            own[12 * i + j] -= v * (sp[12 * k + j] + sp[12 * (k + 3) + j]);
          }
        }
      }
      for (int j = 0; j < 12; j++) {
        own[12 * (3 + k) + j] += sp[12 * k + j];
        own[12 * (9 + k) + j] += sp[12 * (k + 3) + j];
      }
    }
  }

  /** The stretch with itself and with the spins it couples to. */
  private static void addStretching(double[] own, Local local, double[] a, double[] b, double[] g) {
    double k0 = local.stiffness[0];
    double[] pull = new double[] {local.stiffness[1], local.stiffness[2], local.stiffness[3]};
    double[] lower = applyTransposed(spinToVector(a), pull);
    pull = new double[] {local.stiffness[4], local.stiffness[5], local.stiffness[6]};
    double[] upper = applyTransposed(spinToVector(b), pull);
    double[] row = ownSpins(lower, upper, g);
    for (int j = 0; j < 12; j++) {
      own[j] -= row[j];
      own[72 + j] += row[j];
      own[12 * j] -= row[j];
      own[12 * j + 6] += row[j];
    }
    own[0] += k0;
    own[6] -= k0;
    own[72] -= k0;
    own[78] += k0;
  }

  /** {@code Pᵀ·(lower, upper)}: what a pair of moments on the spins does to the nodes. */
  private static double[] ownSpins(double[] lower, double[] upper, double[] g) {
    double[] out = new double[12];
    for (int j = 0; j < 12; j++) {
      out[j] =
          -(g[j] * (lower[0] + upper[0])
              + g[12 + j] * (lower[1] + upper[1])
              + g[24 + j] * (lower[2] + upper[2]));
    }
    for (int k = 0; k < 3; k++) {
      out[3 + k] += lower[k];
      out[9 + k] += upper[k];
    }
    return out;
  }

  /** What the end forces gain because the frame itself turns with the nodes. */
  private void addFrameTurning(
      double[] own, Local local, double[] m1, double[] m2, double[] g, double now_m, double[] q) {
    double d = local.axial_N / now_m;
    for (int k = 1; k < 3; k++) {
      own[12 * k + k] += d;
      own[12 * (6 + k) + 6 + k] += d;
      own[12 * k + 6 + k] -= d;
      own[12 * (6 + k) + k] -= d;
    }
    double[] pm = ownSpins(m1, m2, g);
    for (int part = 0; part < 4; part++) {
      double[] s = skew(new double[] {pm[3 * part], pm[3 * part + 1], pm[3 * part + 2]});
      for (int i = 0; i < 3; i++) {
        for (int j = 0; j < 12; j++) {
          double sum = 0;
          for (int k = 0; k < 3; k++) {
            sum += s[3 * i + k] * g[12 * k + j];
          }
          own[12 * (3 * part + i) + j] -= sum;
        }
      }
    }
    double eta = q[0] / q[1];
    double[] sum = plus(m1, m2);
    double[] lean = {0, (eta * sum[0] + sum[1]) / now_m, sum[2] / now_m};
    for (int i = 0; i < 12; i++) {
      double v = g[i] * lean[0] + g[12 + i] * lean[1] + g[24 + i] * lean[2];
      own[12 * i] -= v;
      own[12 * i + 6] += v;
    }
  }

  private void turnMatrix(double[] own) {
    double[] half = new double[144];
    for (int row = 0; row < 12; row++) {
      for (int part = 0; part < 4; part++) {
        for (int j = 0; j < 3; j++) {
          half[12 * row + 3 * part + j] =
              own[12 * row + 3 * part] * frame[3 * j]
                  + own[12 * row + 3 * part + 1] * frame[3 * j + 1]
                  + own[12 * row + 3 * part + 2] * frame[3 * j + 2];
        }
      }
    }
    for (int part = 0; part < 4; part++) {
      for (int i = 0; i < 3; i++) {
        for (int c = 0; c < 12; c++) {
          tangent[12 * (3 * part + i) + c] =
              frame[3 * i] * half[12 * (3 * part) + c]
                  + frame[3 * i + 1] * half[12 * (3 * part + 1) + c]
                  + frame[3 * i + 2] * half[12 * (3 * part + 2) + c];
        }
      }
    }
  }

  /** Axial unit vector now. */
  double[] axis() {
    return column(frame, 0);
  }

  static double along(double[] axis, double[] v) {
    return dot(axis, v);
  }
}
