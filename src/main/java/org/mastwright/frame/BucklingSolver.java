package org.mastwright.frame;

/**
 * Linear buckling: the chain at rest, straight; the axial forces of a balance scaled; the stiffness
 * of the cables held as it is in that balance. Information beside the limit point, not a proof.
 */
public final class BucklingSolver {
  private static final double GREATEST_FACTOR = 1e6;

  private BucklingSolver() {}

  /**
   * The least factor on the axial forces at which the chain buckles.
   *
   * @return infinite when nothing is compressed
   */
  public static double criticalFactor(Equilibrium balance) {
    Chain chain = balance.chain();
    int n = chain.nodes().size();
    BlockTridiagonal elastic = new BlockTridiagonal(n);
    BlockTridiagonal geometric = new BlockTridiagonal(n);
    fill(balance, elastic, geometric);
    BlockTridiagonal sum = new BlockTridiagonal(n);
    double high = 1;
    while (count(sum, elastic, high, geometric) == 0) {
      high *= 2;
      if (high > GREATEST_FACTOR) {
        return Double.POSITIVE_INFINITY;
      }
    }
    double low = 0;
    for (int i = 0; i < 200 && high - low > 1e-12 * high; i++) {
      double middle = (low + high) / 2;
      if (count(sum, elastic, middle, geometric) == 0) {
        low = middle;
      } else {
        high = middle;
      }
    }
    return (low + high) / 2;
  }

  private static int count(
      BlockTridiagonal sum, BlockTridiagonal elastic, double factor, BlockTridiagonal geometric) {
    sum.setToSum(elastic, factor, geometric);
    sum.factor();
    return sum.negativePivots();
  }

  private static void fill(
      Equilibrium balance, BlockTridiagonal elastic, BlockTridiagonal geometric) {
    Chain chain = balance.chain();
    Assembler rest = new Assembler(chain, balance.load());
    ChainState straight = ChainState.atRest(chain);
    for (int i = 0; i < chain.beams().size(); i++) {
      CorotatedBeam beam = rest.beams[i];
      beam.update(
          straight.place_m[i],
          straight.rotation[i],
          straight.place_m[i + 1],
          straight.rotation[i + 1],
          true);
      BeamMass.add(elastic, i, beam.tangent);
      double lower_N = balance.lowerEnd(i).axial_N();
      double upper_N = balance.upperEnd(i).axial_N();
      BeamMass.add(geometric, i, geometric(beam.frame, beam.length_m(), lower_N, upper_N));
    }
    addCables(balance, elastic);
    addWeights(balance, geometric);
    addSpring(chain, elastic);
    double[] free = Assembler.freeTurning(chain.base());
    double scale = Math.max(elastic.diagonal[0][0], elastic.diagonal[0][21]);
    Assembler.hold(elastic.diagonal[0], elastic.upper[0], free, scale);
    Assembler.hold(geometric.diagonal[0], geometric.upper[0], free, 0);
  }

  private static void addCables(Equilibrium balance, BlockTridiagonal elastic) {
    Chain chain = balance.chain();
    Assembler now = new Assembler(chain, balance.load());
    now.assemble(balance.state().copy(), balance.factor(), false);
    for (int c = 0; c < now.cables.length; c++) {
      if (now.cables[c] != null) {
        Chain.Cable cable = chain.cables().get(c);
        double[] arm =
            Algebra.apply(balance.state().rotation[cable.node()], cable.offset_m().array());
        Assembler.addOffsetStiffness(
            elastic.diagonal[cable.node()], now.cables[c].stiffness(), arm);
      }
    }
  }

  /** A weight above its node topples it as the axial forces do. */
  private static void addWeights(Equilibrium balance, BlockTridiagonal geometric) {
    Chain chain = balance.chain();
    for (Chain.Body body : chain.bodies()) {
      double weight_N = body.mass_kg() * chain.gravity_mps2() * balance.load().gravityFactor();
      double toppling = weight_N * body.centre_m().z_m();
      geometric.diagonal[body.node()][21] -= toppling;
      geometric.diagonal[body.node()][28] -= toppling;
    }
  }

  private static void addSpring(Chain chain, BlockTridiagonal elastic) {
    double k = chain.base().spring_Nmprad();
    if (k > 0 && !Double.isInfinite(k)) {
      elastic.diagonal[0][21] += k;
      elastic.diagonal[0][28] += k;
    }
  }

  private static final double[] GAUSS_AT = {0.5 - Math.sqrt(0.15), 0.5, 0.5 + Math.sqrt(0.15)};
  private static final double[] GAUSS_WEIGHT = {5.0 / 18, 8.0 / 18, 5.0 / 18};

  /** Geometric stiffness of a beam whose axial force (tension positive) varies linearly. */
  private static double[] geometric(double[] frame, double length, double lower_N, double upper_N) {
    double[] m = new double[144];
    for (int g = 0; g < GAUSS_AT.length; g++) {
      double t = GAUSS_AT[g];
      double pull = (lower_N + t * (upper_N - lower_N)) * GAUSS_WEIGHT[g] * length;
      double[] slope = {
        6 * (t * t - t) / length, 3 * t * t - 4 * t + 1, 6 * (t - t * t) / length, 3 * t * t - 2 * t
      };
      addOuter(m, new int[] {1, 5, 7, 11}, 1, slope, pull);
      addOuter(m, new int[] {2, 4, 8, 10}, -1, slope, pull);
    }
    return BeamMass.turned(m, frame);
  }

  /** Slopes of the Hermite shapes times each other; {@code sign} of the rotation in this plane. */
  private static void addOuter(double[] m, int[] at, double sign, double[] slope, double pull) {
    for (int i = 0; i < 4; i++) {
      for (int j = 0; j < 4; j++) {
        double turn = (i % 2 == 0 ? 1 : sign) * (j % 2 == 0 ? 1 : sign);
        m[12 * at[i] + at[j]] += pull * turn * slope[i] * slope[j];
      }
    }
  }
}
