package org.mastwright.frame;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Random;
import org.ejml.data.DMatrixRMaj;
import org.ejml.dense.row.CommonOps_DDRM;
import org.ejml.dense.row.decomposition.TriangularSolver_DDRM;
import org.ejml.dense.row.factory.DecompositionFactory_DDRM;
import org.ejml.interfaces.decomposition.CholeskyDecomposition_F64;
import org.ejml.interfaces.decomposition.EigenDecomposition_F64;

/**
 * Small vibrations about a balance by subspace iteration, with the count of negative pivots of
 * {@code K − ω²M} as the proof that no mode was missed.
 */
public final class VibrationSolver {
  /** Straight pieces a swinging cable is cut into. */
  static final int CABLE_PIECES = 12;

  private static final int MOST_ITERATIONS = 300;
  private static final double TOLERANCE = 1e-12;
  private static final long SEED = 20310504;

  private VibrationSolver() {}

  /** How the cables' mass takes part. */
  public enum CableMass {
    /** Not at all: they are springs. */
    NONE,
    /** A third of it rides on the node. */
    THIRD_AT_NODE,
    /** They swing by themselves. */
    SWINGING
  }

  /**
   * The lowest modes.
   *
   * @param complete whether the pivots prove that none was missed
   */
  public record Modes(List<Mode> modes, boolean complete) {
    public Modes {
      modes = List.copyOf(modes);
    }
  }

  /**
   * One mode, scaled to unit modal mass.
   *
   * @param movement of each node
   * @param spin of each node
   * @param residualRatio of {@code Kx = ω²Mx}
   */
  public record Mode(
      double frequency_Hz,
      List<ChainLoad.Components> movementComponents,
      List<ChainLoad.Components> spinComponents,
      double residualRatio) {
    public Mode {
      movementComponents = List.copyOf(movementComponents);
      spinComponents = List.copyOf(spinComponents);
    }
  }

  /** The {@code count} lowest modes about a stable balance. */
  public static Modes modes(Equilibrium balance, int count, CableMass cableMass) {
    if (!balance.isStable()) {
      throw new IllegalArgumentException("vibration is about a stable balance only");
    }
    ModalSystem system = new ModalSystem(balance, cableMass);
    system.factor(0);
    int width = Math.min(Math.max(2 * count, count + 8), system.size - 6);
    double[][] x = start(system.size, width);
    double[] values = new double[width];
    for (int i = 0; i < MOST_ITERATIONS; i++) {
      double[] before = values;
      values = iterate(system, x);
      if (settled(before, values, Math.min(count, width))) {
        break;
      }
    }
    int asked = Math.min(count, width);
    return new Modes(list(system, x, values, asked), proven(system, values, asked));
  }

  /** How many natural frequencies lie below one: the count of negative pivots proves it. */
  public static int countBelow(Equilibrium balance, double frequency_Hz, CableMass cableMass) {
    double omega = 2 * Math.PI * frequency_Hz;
    return new ModalSystem(balance, cableMass).factor(omega * omega);
  }

  private static double[][] start(int size, int width) {
    Random random = new Random(SEED);
    double[][] x = new double[width][size];
    for (double[] v : x) {
      for (int k = 0; k < size; k++) {
        v[k] = random.nextDouble() - 0.5;
      }
    }
    return x;
  }

  /** One round: {@code x ← K⁻¹Mx}, then the best combinations; returns ω² in rising order. */
  private static double[] iterate(ModalSystem system, double[][] x) {
    int p = x.length;
    double[][] mx = new double[p][];
    double[][] next = new double[p][];
    for (int i = 0; i < p; i++) {
      mx[i] = system.massTimes(x[i]);
      next[i] = mx[i].clone();
      system.solve(next[i]);
    }
    double[][] k = new double[p][p];
    double[][] m = new double[p][p];
    for (int i = 0; i < p; i++) {
      double[] mn = system.massTimes(next[i]);
      for (int j = 0; j <= i; j++) {
        k[i][j] = k[j][i] = (dot(next[i], mx[j]) + dot(next[j], mx[i])) / 2;
        m[i][j] = m[j][i] = dot(mn, next[j]);
      }
    }
    return combine(x, next, k, m);
  }

  private static double[] combine(double[][] x, double[][] next, double[][] k, double[][] m) {
    int p = x.length;
    double[] scale = new double[p];
    for (int i = 0; i < p; i++) {
      scale[i] = 1 / Math.sqrt(m[i][i]);
    }
    for (int i = 0; i < p; i++) {
      for (int j = 0; j < p; j++) {
        k[i][j] *= scale[i] * scale[j];
        m[i][j] *= scale[i] * scale[j];
      }
    }
    DMatrixRMaj back = inverseOfFactor(new DMatrixRMaj(k));
    DMatrixRMaj half = new DMatrixRMaj(p, p);
    DMatrixRMaj reduced = new DMatrixRMaj(p, p);
    CommonOps_DDRM.mult(back, new DMatrixRMaj(m), half);
    CommonOps_DDRM.multTransB(half, back, reduced);
    EigenDecomposition_F64<DMatrixRMaj> eigen = DecompositionFactory_DDRM.eig(p, true, true);
    if (!eigen.decompose(reduced)) {
      throw new IllegalStateException("eigenvalues of the subspace were not found");
    }
    // eigenvalues are 1/ω²: the greatest is the lowest frequency
    List<Integer> order = new ArrayList<>();
    for (int i = 0; i < p; i++) {
      order.add(i);
    }
    order.sort(Comparator.comparingDouble(i -> -eigen.getEigenvalue(i).real));
    double[] values = new double[p];
    DMatrixRMaj vector = new DMatrixRMaj(p, 1);
    for (int i = 0; i < p; i++) {
      double inverse = eigen.getEigenvalue(order.get(i)).real;
      values[i] = inverse > 0 ? 1 / inverse : Double.POSITIVE_INFINITY;
      CommonOps_DDRM.multTransA(back, eigen.getEigenVector(order.get(i)), vector);
      Arrays.fill(x[i], 0);
      double size = inverse > 0 ? 1 / Math.sqrt(inverse) : 1;
      for (int j = 0; j < p; j++) {
        double share = vector.get(j) * scale[j] * size;
        for (int n = 0; n < x[i].length; n++) {
          x[i][n] += share * next[j][n];
        }
      }
    }
    return values;
  }

  /** Inverse of the lower Cholesky factor of a symmetric matrix. */
  private static DMatrixRMaj inverseOfFactor(DMatrixRMaj k) {
    CholeskyDecomposition_F64<DMatrixRMaj> cholesky =
        DecompositionFactory_DDRM.chol(k.numRows, true);
    if (!cholesky.decompose(k)) {
      throw new IllegalStateException("the subspace lost its independence");
    }
    DMatrixRMaj l = cholesky.getT(null);
    TriangularSolver_DDRM.invertLower(l.data, l.numRows);
    return l;
  }

  private static double dot(double[] a, double[] b) {
    double sum = 0;
    for (int i = 0; i < a.length; i++) {
      sum += a[i] * b[i];
    }
    return sum;
  }

  private static boolean settled(double[] before, double[] now, int count) {
    for (int i = 0; i < count; i++) {
      if (!(Math.abs(now[i] - before[i]) <= TOLERANCE * now[i])) {
        return false;
      }
    }
    return true;
  }

  private static List<Mode> list(ModalSystem system, double[][] x, double[] values, int count) {
    List<Mode> modes = new ArrayList<>();
    for (int i = 0; i < count; i++) {
      double[] kx = system.stiffnessTimes(x[i]);
      double[] mx = system.massTimes(x[i]);
      double off = 0;
      double size = 0;
      // the first six are the held base, where both sides are reactions
      for (int n = 6; n < kx.length; n++) {
        off += Math.pow(kx[n] - values[i] * mx[n], 2);
        size += kx[n] * kx[n];
      }
      modes.add(
          new Mode(
              Math.sqrt(values[i]) / (2 * Math.PI),
              components(x[i], system.mass.nodes, 0),
              components(x[i], system.mass.nodes, 3),
              Math.sqrt(off / size)));
    }
    return modes;
  }

  private static List<ChainLoad.Components> components(double[] x, int nodes, int from) {
    List<ChainLoad.Components> all = new ArrayList<>();
    for (int n = 0; n < nodes; n++) {
      int o = 6 * n + from;
      all.add(new ChainLoad.Components(x[o], x[o + 1], x[o + 2]));
    }
    return all;
  }

  /** As many pivots below a shift just above the last mode as there are modes found below it. */
  private static boolean proven(ModalSystem system, double[] values, int count) {
    double sigma = values[count - 1] * (1 + 1e-6);
    int found = 0;
    for (double v : values) {
      if (v < sigma) {
        found++;
      }
    }
    return system.factor(sigma) == found;
  }

  /**
   * Rayleigh's quotient of a shape: a frequency never below the first one.
   *
   * @param movements of each node; {@code spins} of each node
   */
  public static double rayleigh_Hz(
      Equilibrium balance,
      List<ChainLoad.Components> movements,
      List<ChainLoad.Components> spins,
      CableMass cableMass) {
    if (cableMass == CableMass.SWINGING) {
      throw new IllegalArgumentException("a shape of the nodes says nothing of swinging cables");
    }
    ModalSystem system = new ModalSystem(balance, cableMass);
    double[] x = new double[system.size];
    for (int n = 0; n < movements.size(); n++) {
      System.arraycopy(movements.get(n).array(), 0, x, 6 * n, 3);
      System.arraycopy(spins.get(n).array(), 0, x, 6 * n + 3, 3);
    }
    double ratio = dot(x, system.stiffnessTimes(x)) / dot(x, system.massTimes(x));
    return Math.sqrt(ratio) / (2 * Math.PI);
  }
}
