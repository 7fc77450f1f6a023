package org.mastwright.frame;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.mastwright.Source;

/** Vibration, stability and large movements against closed forms. EI = m = L = 1. */
class BeamsPublishedTest {
  private static double omega(Chain chain, ChainLoad load, int mode) {
    Equilibrium balance = EquilibriumSolver.solve(chain, load);
    VibrationSolver.Modes modes =
        VibrationSolver.modes(balance, 2 * mode, VibrationSolver.CableMass.NONE);
    assertTrue(modes.complete());
    return 2 * Math.PI * modes.modes().get(2 * mode - 1).frequency_Hz();
  }

  private static Chain cantilever(int beams) {
    return Chains.column(1, beams, s -> Chains.slender(1, 1), Chain.Base.clamped());
  }

  private static Chain tipped(Chain chain, double mass) {
    int tip = chain.nodes().size() - 1;
    return chain.withBodies(List.of(Chain.Body.point(tip, mass)));
  }

  @Test
  @Source(key = "Euler-Bernoulli beam", locator = "value 8.1", status = "recomputed")
  void value8_1_cantilever() {
    double[] beta = {1.8751041, 4.6940911, 7.8547574, 10.9955407};
    for (int mode = 1; mode <= 4; mode++) {
      double found = Math.sqrt(omega(cantilever(60), ChainLoad.weightOnly(), mode));
      assertEquals(beta[mode - 1], found, 1e-5 * beta[mode - 1]);
    }
  }

  @Test
  @Source(key = "Euler-Bernoulli beam with tip mass", locator = "value 8.2", status = "recomputed")
  void value8_2_tipMass() {
    double[] mu = {0.1, 0.2, 0.5, 1, 2, 5, 10};
    double[] beta = {1.722742, 1.616400, 1.419964, 1.247917, 1.076196, 0.870021, 0.735782};
    for (int i = 0; i < mu.length; i++) {
      double found = Math.sqrt(omega(tipped(cantilever(40), mu[i]), ChainLoad.weightOnly(), 1));
      assertEquals(beta[i], found, 2e-6 * beta[i]);
    }
    double second = Math.sqrt(omega(tipped(cantilever(60), 1), ChainLoad.weightOnly(), 2));
    assertEquals(4.031139, second, 4e-6);
  }

  @Test
  @Source(key = "33/140 rule", locator = "value 8.3", status = "recomputed")
  void value8_3_ruleOfThumbError() {
    double[] mu = {0, 0.1, 0.5, 1, 5};
    double[] error = {1.465, 0.725, 0.150, 0.053, 0.003};
    for (int i = 0; i < mu.length; i++) {
      double rule = Math.sqrt(3 / (mu[i] + 33.0 / 140));
      Chain chain = mu[i] == 0 ? cantilever(60) : tipped(cantilever(60), mu[i]);
      double found = omega(chain, ChainLoad.weightOnly(), 1);
      assertEquals(error[i], 100 * (rule / found - 1), 1e-3);
    }
  }

  @Test
  @Source(key = "beam on a rotational spring", locator = "value 8.5", status = "recomputed")
  void value8_5_sprungBase() {
    double[] k = {1, 5, 10, 20, 50, 100};
    double[] beta = {1.247917, 1.616400, 1.722742, 1.791171, 1.839294, 1.856787};
    for (int i = 0; i < k.length; i++) {
      Chain chain = Chains.column(1, 40, s -> Chains.slender(1, 1), Chain.Base.sprung(k[i]));
      assertEquals(beta[i], Math.sqrt(omega(chain, ChainLoad.weightOnly(), 1)), 1e-5 * beta[i]);
    }
  }

  private static double tapered(double tip, int stiffnessPower, int massPower, int mode) {
    Chain chain =
        Chains.column(
            1,
            200,
            s -> {
              double d = 1 - (1 - tip) * s;
              return Chains.slender(Math.pow(d, stiffnessPower), Math.pow(d, massPower));
            },
            Chain.Base.clamped());
    return omega(chain, ChainLoad.weightOnly(), mode);
  }

  @Test
  @Source(key = "tapered cantilever, cone", locator = "value 8.6", status = "recomputed")
  void value8_6_cone() {
    double[] tip = {1, 0.8, 0.6, 0.5, 0.4, 0.2};
    double[] expected = {3.5160, 3.8551, 4.3188, 4.6252, 5.0090, 6.1964};
    for (int i = 0; i < tip.length; i++) {
      assertEquals(expected[i], tapered(tip[i], 4, 2, 1), 1e-4 * expected[i]);
    }
  }

  @Test
  @Source(key = "tapered cantilever, thin tube", locator = "value 8.7", status = "recomputed")
  void value8_7_thinTube() {
    double[] tip = {1, 0.8, 0.6, 0.5, 0.4, 0.2};
    double[] expected = {3.5160, 3.6083, 3.7371, 3.8238, 3.9343, 4.2925};
    for (int i = 0; i < tip.length; i++) {
      assertEquals(expected[i], tapered(tip[i], 3, 1, 1), 1e-4 * expected[i]);
    }
    assertEquals(18.3173, tapered(0.5, 3, 1, 2), 1e-4 * 18.3173);
  }

  @Test
  @Source(key = "tapered cantilever with tip mass", locator = "value 8.8", status = "recomputed")
  void value8_8_thinTubeWithTipMass() {
    double[][] rows = {
      {0.5, 0.5, 1.72065}, {0.5, 1, 1.28035}, {0.5, 2, 0.93048},
      {0.6, 0.5, 1.79689}, {0.6, 1, 1.34815}, {0.6, 2, 0.98454},
      {0.8, 0.5, 1.92007}, {0.8, 1, 1.46270}, {0.8, 2, 1.07824}
    };
    for (double[] row : rows) {
      Chain chain =
          Chains.column(
              1,
              200,
              s -> {
                double d = 1 - (1 - row[0]) * s;
                return Chains.slender(d * d * d, d);
              },
              Chain.Base.clamped());
      double found = omega(tipped(chain, row[1]), ChainLoad.weightOnly(), 1);
      assertEquals(row[2], found, 1e-4 * row[2]);
    }
  }

  /** Pinned at both ends: the top held by two pairs of stiff level cables. */
  private static Chain pinnedColumn(int beams) {
    Chain chain = Chains.column(1, beams, s -> Chains.slender(1, 1), Chain.Base.pinned());
    Chain.Point none = new Chain.Point(0, 0, 0);
    double far = 1e5;
    List<Chain.Cable> stays =
        List.of(
            new Chain.Cable(beams, none, new Chain.Point(far, 0, 1), 1e12, 0, far - 1e-5, 0),
            new Chain.Cable(beams, none, new Chain.Point(-far, 0, 1), 1e12, 0, far - 1e-5, 0),
            new Chain.Cable(beams, none, new Chain.Point(0, far, 1), 1e12, 0, far - 1e-5, 0),
            new Chain.Cable(beams, none, new Chain.Point(0, -far, 1), 1e12, 0, far - 1e-5, 0));
    return chain.withCables(stays);
  }

  @Test
  @Source(key = "pinned column", locator = "value 8.9", status = "recomputed")
  void value8_9_halfTheEulerLoad() {
    Chain chain = pinnedColumn(40);
    double euler = Math.PI * Math.PI;
    double free = omega(chain, ChainLoad.weightOnly(), 1);
    double pressed = omega(chain, Chains.force(40, 0, 0, -euler / 2), 1);
    assertEquals(Math.PI * Math.PI, free, 1e-4);
    assertEquals(0.707107, pressed / free, 1e-5);
  }

  @Test
  @Source(key = "cantilever under end load", locator = "value 8.10", status = "recomputed")
  void value8_10_pressedCantilever() {
    double[] n = {0.1, 0.25, 0.5, 0.75, 0.9};
    double[] mu = {0, 1, 5};
    double[][] expected = {
      {.95216, .87414, .72086, .51516, .32801},
      {.94967, .86831, .71094, .50419, .31947},
      {.94938, .86765, .70984, .50299, .31853}
    };
    for (int m = 0; m < mu.length; m++) {
      Chain chain = mu[m] == 0 ? cantilever(40) : tipped(cantilever(40), mu[m]);
      double free = omega(chain, ChainLoad.weightOnly(), 1);
      for (int i = 0; i < n.length; i++) {
        double load = -n[i] * Math.PI * Math.PI / 4;
        double ratio = omega(chain, Chains.force(40, 0, 0, load), 1) / free;
        assertEquals(expected[m][i], ratio, 2e-5);
      }
    }
  }

  @Test
  @Source(key = "self-weight buckling", locator = "value 8.11", status = "recomputed")
  void value8_11_selfWeight() {
    Chain chain = Chains.column(1, 60, s -> Chains.slender(1, 1), Chain.Base.clamped(), 1);
    Equilibrium balance = EquilibriumSolver.solve(chain, ChainLoad.weightOnly());
    assertEquals(7.83735, BucklingSolver.criticalFactor(balance), 1e-4);
  }

  @Test
  @Source(key = "Euler columns", locator = "value 8.17", status = "read, recomputed")
  void value8_17_cantileverColumn() {
    double i = Math.PI / 64 * (Math.pow(0.2191, 4) - Math.pow(0.2031, 4));
    double area = Math.PI / 4 * (0.2191 * 0.2191 - 0.2031 * 0.2031);
    Chain.Beam tube =
        new Chain.Beam(210e9 * area, 210e9 * i, 1e7, Double.POSITIVE_INFINITY, 0, 0, 0);
    Chain chain = Chains.column(10, 30, s -> tube, Chain.Base.clamped());
    Equilibrium balance = EquilibriumSolver.solve(chain, Chains.force(30, 0, 0, -1000));
    assertEquals(153.355, BucklingSolver.criticalFactor(balance), 1e-4 * 153.355);
  }

  @Test
  @Source(key = "beam-column", locator = "value 8.18", status = "read, recomputed")
  void value8_18_secondOrderMoment() {
    double i = Math.PI / 64 * (Math.pow(0.2191, 4) - Math.pow(0.2031, 4));
    double area = Math.PI / 4 * (0.2191 * 0.2191 - 0.2031 * 0.2031);
    Chain.Beam tube =
        new Chain.Beam(30 * 210e9 * area, 210e9 * i, 1e7, Double.POSITIVE_INFINITY, 0, 0, 0);
    Chain chain = Chains.column(6, 40, s -> tube, Chain.Base.clamped());
    double push = 1;
    Equilibrium b = EquilibriumSolver.solve(chain, Chains.force(40, push, 0, -40e3));
    assertEquals(1.08513, b.baseMoment_Nm().y() / (-6 * push), 2e-5);
  }

  /**
   * A simple beam is symmetric: its middle keeps its direction, so its half (length 1) is a
   * cantilever with half the push on its tip; Ncr = π²/4. The push is small, so that movements stay
   * small; without thrust its moment is push · 1 by statics.
   */
  @Test
  @Source(key = "beam-column", locator = "value 8.16", status = "read, recomputed")
  void value8_16_pushedInTheMiddle() {
    double push = 1e-3;
    Chain half = cantilever(40);
    Equilibrium pressed =
        EquilibriumSolver.solve(half, Chains.force(40, push, 0, -Math.PI * Math.PI / 8));
    double factor = pressed.baseMoment_Nm().y() / -push;
    assertEquals(1.81683, factor, 1e-5);
  }

  @Test
  @Source(key = "elastica, elliptic integrals", locator = "PL²/EI = 1, 2, 5", status = "read")
  void largeMovement() {
    double[] p = {1, 2, 5};
    double[] across = {0.30172, 0.49346, 0.71379};
    double[] down = {0.05643, 0.16064, 0.38763};
    Chain chain = cantilever(60);
    for (int i = 0; i < 3; i++) {
      Equilibrium b = EquilibriumSolver.solve(chain, Chains.force(60, p[i], 0, 0));
      assertEquals(across[i], b.movement_m(60).x_m(), 2e-5);
      assertEquals(-down[i], b.movement_m(60).z_m(), 2e-5);
    }
  }

  /**
   * A level push F at the top of a column of length L bends the foot by F·L, however it is held.
   */
  @Test
  @Source(key = "statics", locator = "moment of a force about the foot", status = "practice")
  void footBearsTheMomentOnASpringAsOnAClamp() {
    double push = 1000;
    Chain.Beam tube = new Chain.Beam(1.1e9, 6.2e6, 4.8e6, Double.POSITIVE_INFINITY, 0, 0, 0);
    for (Chain.Base base : List.of(Chain.Base.clamped(), Chain.Base.sprung(5e6))) {
      Chain chain = Chains.column(6, 20, s -> tube, base);
      Equilibrium b = EquilibriumSolver.solve(chain, Chains.force(20, push, 0, 0));
      // the lever shortens by a few hundredths of a millimetre as the column leans
      assertEquals(-6 * push, b.baseMoment_Nm().y(), 1e-4 * 6 * push);
      assertEquals(-push, b.baseForce_N().x(), 1e-8 * push);
    }
  }
}
