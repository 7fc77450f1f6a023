package org.mastwright.frame;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

/** The analytic tangent against differences of the forces. */
class TangentCrossCheckTest {
  private static final Chain.Beam BEAM = new Chain.Beam(5e7, 2e5, 1.5e5, 1e7, 8, 0, 0);

  /** Greatest difference of the tangent from differences of the forces, over its greatest entry. */
  private static double tangentError(double localRotation) {
    Random random = new Random(7);
    double[] a = {0, 0, 0};
    double[] b = {0.3, -0.2, 1.1};
    CorotatedBeam beam = new CorotatedBeam(BEAM, a, b);
    double[] turn = Algebra.rotation(new double[] {0.4, 0.3, -0.5});
    double[] lower = noise(random, a, 0.01 * localRotation);
    double[] upper = noise(random, Algebra.apply(turn, b), 0.01 * localRotation);
    double[] r1 =
        Algebra.product(Algebra.rotation(noise(random, new double[3], localRotation)), turn);
    double[] r2 =
        Algebra.product(Algebra.rotation(noise(random, new double[3], localRotation)), turn);
    beam.update(lower, r1, upper, r2, true);
    double[] tangent = beam.tangent.clone();
    double scale = 0;
    double error = 0;
    double h = 1e-6;
    for (int j = 0; j < 12; j++) {
      double[] plus = forces(beam, lower, r1, upper, r2, j, h);
      double[] minus = forces(beam, lower, r1, upper, r2, j, -h);
      for (int i = 0; i < 12; i++) {
        scale = Math.max(scale, Math.abs(tangent[12 * i + j]));
        error = Math.max(error, Math.abs((plus[i] - minus[i]) / (2 * h) - tangent[12 * i + j]));
      }
    }
    return error / scale;
  }

  /** It leaves out terms of the second order in the local rotations, which are mrad in use. */
  @Test
  void beamTangentIsTheDerivativeOfItsForces() {
    assertEquals(0, tangentError(0.001), 1e-8);
    assertEquals(0, tangentError(0.01), 1e-6);
    assertEquals(0, tangentError(0.1), 1e-4);
  }

  private static double[] forces(
      CorotatedBeam beam,
      double[] lower,
      double[] r1,
      double[] upper,
      double[] r2,
      int j,
      double h) {
    double[][] parts = {lower.clone(), new double[3], upper.clone(), new double[3]};
    parts[j / 3][j % 3] += h;
    beam.update(
        parts[0],
        Algebra.product(Algebra.rotation(parts[1]), r1),
        parts[2],
        Algebra.product(Algebra.rotation(parts[3]), r2),
        false);
    return beam.force.clone();
  }

  private static double[] noise(Random random, double[] about, double size) {
    double[] out = about.clone();
    for (int i = 0; i < 3; i++) {
      out[i] += size * (random.nextDouble() - 0.5);
    }
    return out;
  }

  @Test
  void cableStiffnessIsTheDerivativeOfItsPull() {
    double[][] loads = {{3, 1, -2}, {2, 0.5, -2}, {1, 0, -2}};
    double[] span = {24, 3, 18};
    for (double length : new double[] {30.0, 30.1, 30.16, 30.5, 33}) {
      Catenary c = Catenary.between(span, 3.5e6, length, loads, null);
      double h = 1e-6;
      double scale = 0;
      for (double k : c.stiffness()) {
        scale = Math.max(scale, Math.abs(k));
      }
      for (int j = 0; j < 3; j++) {
        double[] up = span.clone();
        double[] down = span.clone();
        up[j] += h;
        down[j] -= h;
        double[] f1 = Catenary.between(up, 3.5e6, length, loads, null).upper();
        double[] f0 = Catenary.between(down, 3.5e6, length, loads, null).upper();
        for (int i = 0; i < 3; i++) {
          assertEquals((f1[i] - f0[i]) / (2 * h), c.stiffness()[3 * i + j], 1e-5 * scale);
        }
      }
    }
  }

  @Test
  void rigidTurningGivesNoForce() {
    double[] a = {0, 0, 0};
    double[] b = {0, 0, 2};
    CorotatedBeam beam = new CorotatedBeam(BEAM, a, b);
    double[] turn = Algebra.rotation(new double[] {0.7, -0.4, 0.9});
    beam.update(
        new double[] {1, 2, 3},
        turn,
        Algebra.plus(new double[] {1, 2, 3}, Algebra.apply(turn, b)),
        turn,
        false);
    for (double f : beam.force) {
      assertEquals(0, f, 1e-6);
    }
    assertEquals(List.of(0.0), List.of(Math.abs(beam.axial_N) < 1e-6 ? 0.0 : beam.axial_N));
  }
}
