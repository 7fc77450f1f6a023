package org.mastwright.frame;

/** Consistent mass of a beam in its own frame, turned to fixed axes: 12×12 row by row. */
final class BeamMass {
  private BeamMass() {}

  /**
   * @param frame axes of the beam as columns
   * @param mass_kgpm with everything carried along
   */
  static double[] of(
      double[] frame,
      double length_m,
      double mass_kgpm,
      double rotaryInertia_kgm,
      double polarInertia_kgm) {
    double[] m = new double[144];
    pair(m, 0, 6, mass_kgpm * length_m / 6);
    pair(m, 3, 9, polarInertia_kgm * length_m / 6);
    bending(m, new int[] {1, 5, 7, 11}, 1, length_m, mass_kgpm, rotaryInertia_kgm);
    bending(m, new int[] {2, 4, 8, 10}, -1, length_m, mass_kgpm, rotaryInertia_kgm);
    return turned(m, frame);
  }

  private static void pair(double[] m, int i, int j, double sixth) {
    m[13 * i] += 2 * sixth;
    m[13 * j] += 2 * sixth;
    m[12 * i + j] += sixth;
    m[12 * j + i] += sixth;
  }

  /** Hermite shapes; {@code sign} of the rotation against the slope in this plane. */
  private static void bending(
      double[] m, int[] at, double sign, double l, double mass, double rotary) {
    double a = mass * l / 420;
    double b = rotary / (30 * l);
    double[][] k = {
      {
        156 * a + 36 * b,
        sign * (22 * l * a + 3 * l * b),
        54 * a - 36 * b,
        sign * (-13 * l * a + 3 * l * b)
      },
      {0, 4 * l * l * (a + b), sign * (13 * l * a - 3 * l * b), -3 * l * l * a - l * l * b},
      {0, 0, 156 * a + 36 * b, sign * (-22 * l * a - 3 * l * b)},
      {0, 0, 0, 4 * l * l * (a + b)}
    };
    for (int i = 0; i < 4; i++) {
      for (int j = i; j < 4; j++) {
        m[12 * at[i] + at[j]] += k[i][j];
        if (i != j) {
          m[12 * at[j] + at[i]] += k[i][j];
        }
      }
    }
  }

  /** {@code R·M·Rᵀ} with the 3×3 frame in each of the four places. */
  static double[] turned(double[] own, double[] frame) {
    double[] half = new double[144];
    double[] out = new double[144];
    for (int row = 0; row < 12; row++) {
      for (int c = 0; c < 12; c++) {
        int part = c / 3 * 3;
        int j = c % 3;
        for (int k = 0; k < 3; k++) {
          half[12 * row + c] += own[12 * row + part + k] * frame[3 * j + k];
        }
      }
    }
    for (int row = 0; row < 12; row++) {
      int part = row / 3 * 3;
      int i = row % 3;
      for (int c = 0; c < 12; c++) {
        for (int k = 0; k < 3; k++) {
          out[12 * row + c] += frame[3 * i + k] * half[12 * (part + k) + c];
        }
      }
    }
    return out;
  }

  /** Adds a symmetric 12×12 of beam {@code i} to a block tridiagonal matrix. */
  static void add(BlockTridiagonal into, int i, double[] m) {
    for (int r = 0; r < 6; r++) {
      for (int c = 0; c < 6; c++) {
        into.diagonal[i][6 * r + c] += m[12 * r + c];
        into.diagonal[i + 1][6 * r + c] += m[12 * (r + 6) + c + 6];
        into.upper[i][6 * r + c] += m[12 * r + c + 6];
      }
    }
  }
}
