package org.mastwright.frame;

import static org.mastwright.frame.Algebra.apply;
import static org.mastwright.frame.Algebra.cross;
import static org.mastwright.frame.Algebra.minus;
import static org.mastwright.frame.Algebra.plus;
import static org.mastwright.frame.Algebra.product;
import static org.mastwright.frame.Algebra.skew;
import static org.mastwright.frame.Algebra.times;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * Unbalanced forces and tangent stiffness of a chain in a state under {@code permanent + factor ·
 * variable} loads. One assembler serves one thread.
 *
 * <p>The tangent is kept symmetric: the skew part of moments about fixed axes is left out of it,
 * which the iteration makes good, and pivots are counted on the symmetric part.
 */
final class Assembler {
  final Chain chain;
  final ChainLoad load;
  final BlockTridiagonal tangent;

  /** Loads less inner forces, six numbers a node; at the base only what is free to move. */
  final double[] unbalanced;

  /** The same with the base's held directions: minus the reaction. */
  final double[] whole;

  final CorotatedBeam[] beams;
  final Catenary[] cables;

  /** Greatest force or moment met, to measure the unbalanced ones by. */
  double greatest_N;

  private final double[][] weight_Npm;
  private final double[] free;

  Assembler(Chain chain, ChainLoad load) {
    this.chain = chain;
    this.load = load;
    int n = chain.nodes().size();
    this.tangent = new BlockTridiagonal(n);
    this.unbalanced = new double[6 * n];
    this.whole = new double[6 * n];
    this.beams = new CorotatedBeam[n - 1];
    this.cables = new Catenary[chain.cables().size()];
    for (int i = 0; i < n - 1; i++) {
      beams[i] =
          new CorotatedBeam(
              chain.beams().get(i), chain.nodes().get(i).array(), chain.nodes().get(i + 1).array());
    }
    this.weight_Npm = weights(chain, load);
    this.free = freeTurning(chain.base());
  }

  private static double[][] weights(Chain chain, ChainLoad load) {
    double[][] weights = new double[chain.beams().size()][3];
    double g = chain.gravity_mps2();
    for (int i = 0; i < weights.length; i++) {
      weights[i][2] = -chain.beams().get(i).mass_kgpm() * g * load.gravityFactor();
    }
    for (ChainLoad.AddedMass m : load.addedMasses()) {
      weights[m.beam()][2] -= m.mass_kgpm() * g * m.weightFactor();
    }
    return weights;
  }

  /** Projector of spins of the base on those that are free, 3×3. */
  static double[] freeTurning(Chain.Base base) {
    if (base.hingeBearing_rad().isPresent()) {
      double b = base.hingeBearing_rad().getAsDouble();
      double x = Math.sin(b);
      double y = Math.cos(b);
      return new double[] {x * x, x * y, 0, x * y, y * y, 0, 0, 0, 0};
    }
    double level = Double.isInfinite(base.spring_Nmprad()) ? 0 : 1;
    return new double[] {level, 0, 0, 0, level, 0, 0, 0, 0};
  }

  /** Fills everything for a state. */
  void assemble(ChainState state, double factor, boolean withTangent) {
    Arrays.fill(whole, 0);
    greatest_N = 1e-3;
    if (withTangent) {
      tangent.zero();
    }
    for (int i = 0; i < beams.length; i++) {
      addBeam(i, state, withTangent);
      addLineLoad(i, weight_Npm[i], weight_Npm[i], 1, state, withTangent);
    }
    addBodies(state, withTangent);
    addPart(load.permanent(), 1, state, withTangent);
    if (factor != 0) {
      addPart(load.variable(), factor, state, withTangent);
    }
    addCables(state, factor, withTangent);
    addSpring(state, withTangent);
    holdBase(withTangent);
  }

  private void addBeam(int i, ChainState state, boolean withTangent) {
    CorotatedBeam beam = beams[i];
    beam.update(
        state.place_m[i],
        state.rotation[i],
        state.place_m[i + 1],
        state.rotation[i + 1],
        withTangent);
    for (int k = 0; k < 12; k++) {
      whole[6 * i + k] -= beam.force[k];
    }
    greatest_N = Math.max(greatest_N, Math.abs(beam.axial_N));
    if (withTangent) {
      double[] t = beam.tangent;
      for (int r = 0; r < 6; r++) {
        for (int c = 0; c < 6; c++) {
          int at = 6 * r + c;
          tangent.diagonal[i][at] += (t[12 * r + c] + t[12 * c + r]) / 2;
          tangent.diagonal[i + 1][at] += (t[12 * (r + 6) + c + 6] + t[12 * (c + 6) + r + 6]) / 2;
          tangent.upper[i][at] += (t[12 * r + c + 6] + t[12 * (c + 6) + r]) / 2;
        }
      }
    }
  }

  /** A dead load per undeformed length, linear, by the beam's own shape functions. */
  private void addLineLoad(
      int i, double[] lower, double[] upper, double factor, ChainState state, boolean tangential) {
    double length = beams[i].length_m();
    double[] f1 = times(factor * length / 20, plus(times(7, lower), times(3, upper)));
    double[] f2 = times(factor * length / 20, plus(times(3, lower), times(7, upper)));
    double square = factor * length * length;
    double[] c1 = times(square, plus(times(1.0 / 20, lower), times(1.0 / 30, upper)));
    double[] c2 = times(-square, plus(times(1.0 / 30, lower), times(1.0 / 20, upper)));
    addForce(i, f1, beams[i].axisWith(state.rotation[i]), c1, tangential);
    addForce(i + 1, f2, beams[i].axisWith(state.rotation[i + 1]), c2, tangential);
  }

  /** What the line loads of a beam put on its two nodes: twelve numbers. */
  double[] lineLoadOn(int i, ChainState state, double factor) {
    double[] q1 = weight_Npm[i].clone();
    double[] q2 = weight_Npm[i].clone();
    addBeamLoads(load.permanent(), i, 1, q1, q2);
    addBeamLoads(load.variable(), i, factor, q1, q2);
    double length = beams[i].length_m();
    double square = length * length;
    double[] c1 = times(square, plus(times(1.0 / 20, q1), times(1.0 / 30, q2)));
    double[] c2 = times(-square, plus(times(1.0 / 30, q1), times(1.0 / 20, q2)));
    double[] m1 = cross(beams[i].axisWith(state.rotation[i]), c1);
    double[] m2 = cross(beams[i].axisWith(state.rotation[i + 1]), c2);
    double[] out = new double[12];
    for (int k = 0; k < 3; k++) {
      out[k] = length / 20 * (7 * q1[k] + 3 * q2[k]);
      out[3 + k] = m1[k];
      out[6 + k] = length / 20 * (3 * q1[k] + 7 * q2[k]);
      out[9 + k] = m2[k];
    }
    return out;
  }

  private static void addBeamLoads(
      ChainLoad.Part part, int beam, double factor, double[] lower, double[] upper) {
    for (ChainLoad.BeamLoad b : part.beams()) {
      if (b.beam() == beam) {
        double[] l = b.lower_Npm().array();
        double[] u = b.upper_Npm().array();
        for (int k = 0; k < 3; k++) {
          lower[k] += factor * l[k];
          upper[k] += factor * u[k];
        }
      }
    }
  }

  /** A force on a node and a couple {@code arm × couple} whose arm turns with the node. */
  private void addForce(
      int node, double[] force, double[] arm, double[] couple, boolean tangential) {
    double[] moment = cross(arm, couple);
    for (int k = 0; k < 3; k++) {
      whole[6 * node + k] += force[k];
      whole[6 * node + 3 + k] += moment[k];
      greatest_N = Math.max(greatest_N, Math.abs(force[k]));
    }
    if (tangential) {
      subtractSymmetric(node, product(skew(couple), skew(arm)));
    }
  }

  /** Takes the symmetric part of a 3×3 from the spins' block of a node. */
  private void subtractSymmetric(int node, double[] m) {
    for (int r = 0; r < 3; r++) {
      for (int c = 0; c < 3; c++) {
        tangent.diagonal[node][6 * (r + 3) + c + 3] -= (m[3 * r + c] + m[3 * c + r]) / 2;
      }
    }
  }

  private void addBodies(ChainState state, boolean tangential) {
    for (Chain.Body body : chain.bodies()) {
      double[] arm = apply(state.rotation[body.node()], body.centre_m().array());
      double[] weight = {0, 0, -body.mass_kg() * chain.gravity_mps2() * load.gravityFactor()};
      addForce(body.node(), weight, arm, weight, tangential);
    }
  }

  private void addPart(ChainLoad.Part part, double factor, ChainState state, boolean tangential) {
    for (ChainLoad.NodeLoad n : part.nodes()) {
      double[] arm = apply(state.rotation[n.node()], n.offset_m().array());
      double[] force = times(factor, n.force_N().array());
      addForce(n.node(), force, arm, force, tangential);
      double[] moment = n.moment_Nm().array();
      for (int k = 0; k < 3; k++) {
        whole[6 * n.node() + 3 + k] += factor * moment[k];
      }
    }
    for (ChainLoad.BeamLoad b : part.beams()) {
      addLineLoad(
          b.beam(), b.lower_Npm().array(), b.upper_Npm().array(), factor, state, tangential);
    }
  }

  private void addCables(ChainState state, double factor, boolean tangential) {
    double[][][] parts = cableLoads(factor);
    for (int c = 0; c < cables.length; c++) {
      if (load.isRemoved(c)) {
        cables[c] = null;
        continue;
      }
      Chain.Cable cable = chain.cables().get(c);
      double[] arm = apply(state.rotation[cable.node()], cable.offset_m().array());
      double[] end = plus(state.place_m[cable.node()], arm);
      double stretch = 1 + cable.thermalExpansion_perK() * load.cableTemperatureChange_K();
      Catenary now =
          Catenary.between(
              minus(end, cable.anchor_m().array()),
              cable.axial_N(),
              cable.unstretched_m() * stretch,
              parts[c],
              state.cableGuess_N[c]);
      state.cableGuess_N[c] = now.lower();
      cables[c] = now;
      double[] pull = times(-1, now.upper());
      addForce(cable.node(), pull, arm, pull, tangential);
      if (tangential) {
        addAtOffset(cable.node(), now.stiffness(), arm);
      }
    }
  }

  /** Loads per unstretched length of every cable, weight included. */
  private double[][][] cableLoads(double factor) {
    List<double[][]> all = new ArrayList<>();
    for (Chain.Cable cable : chain.cables()) {
      double own = -cable.mass_kgpm() * chain.gravity_mps2() * load.gravityFactor();
      all.add(new double[][] {{0, 0, own}});
    }
    addCableParts(all, load.permanent(), 1);
    if (factor != 0) {
      addCableParts(all, load.variable(), factor);
    }
    return all.toArray(double[][][]::new);
  }

  private static void addCableParts(List<double[][]> all, ChainLoad.Part part, double factor) {
    for (ChainLoad.CableLoad l : part.cables()) {
      double[][] before = all.get(l.cable());
      int count = Math.max(before.length, l.parts_Npm().size());
      double[][] sum = new double[count][];
      for (int p = 0; p < count; p++) {
        double[] old = before[p * before.length / count];
        double[] more = l.parts_Npm().get(p * l.parts_Npm().size() / count).array();
        sum[p] = plus(old, times(factor, more));
      }
      all.set(l.cable(), sum);
    }
  }

  /** Adds a 3×3 stiffness of a point at an arm from a node to the node's block. */
  private void addAtOffset(int node, double[] k, double[] arm) {
    addOffsetStiffness(tangent.diagonal[node], k, arm);
  }

  static void addOffsetStiffness(double[] block, double[] k, double[] arm) {
    double[] r = skew(arm);
    double[] kr = product(k, r);
    double[] rk = product(r, k);
    double[] rkr = product(r, kr);
    for (int i = 0; i < 3; i++) {
      for (int j = 0; j < 3; j++) {
        block[6 * i + j] += k[3 * i + j];
        block[6 * i + j + 3] -= kr[3 * i + j];
        block[6 * (i + 3) + j] += rk[3 * i + j];
        block[6 * (i + 3) + j + 3] -= rkr[3 * i + j];
      }
    }
  }

  private boolean sprung() {
    double k = chain.base().spring_Nmprad();
    return k > 0 && !Double.isInfinite(k);
  }

  /** What the base's spring does to node 0: a moment against its turning; zero without one. */
  double[] springMoment(ChainState state) {
    return sprung()
        ? times(
            -chain.base().spring_Nmprad(), apply(free, Algebra.rotationVector(state.rotation[0])))
        : new double[3];
  }

  private void addSpring(ChainState state, boolean tangential) {
    if (!sprung()) {
      return;
    }
    double[] moment = springMoment(state);
    for (int i = 0; i < 3; i++) {
      whole[3 + i] += moment[i];
      for (int j = 0; j < 3 && tangential; j++) {
        tangent.diagonal[0][6 * (i + 3) + j + 3] += chain.base().spring_Nmprad() * free[3 * i + j];
      }
    }
  }

  /** Leaves only the free spins of node 0 in the balance and holds the rest. */
  private void holdBase(boolean tangential) {
    System.arraycopy(whole, 0, unbalanced, 0, whole.length);
    Arrays.fill(unbalanced, 0, 3, 0);
    double[] moment = apply(free, new double[] {whole[3], whole[4], whole[5]});
    System.arraycopy(moment, 0, unbalanced, 3, 3);
    if (tangential) {
      double[] d = tangent.diagonal[0];
      double scale = Math.max(Math.abs(d[0]), Math.abs(d[21]));
      hold(d, tangent.upper[0], free, scale);
    }
  }

  /** Projects the base's blocks on its free spins and puts {@code scale} on what is held. */
  static void hold(double[] diagonal, double[] upper, double[] free, double scale) {
    double[] p = new double[36];
    for (int i = 0; i < 3; i++) {
      for (int j = 0; j < 3; j++) {
        p[6 * (i + 3) + j + 3] = free[3 * i + j];
      }
    }
    double[] pd = product6(product6(p, diagonal), p);
    for (int i = 0; i < 36; i++) {
      diagonal[i] = pd[i] + scale * ((i % 7 == 0 ? 1 : 0) - p[i]);
    }
    System.arraycopy(product6(p, upper), 0, upper, 0, 36);
  }

  private static double[] product6(double[] a, double[] b) {
    double[] c = new double[36];
    for (int i = 0; i < 6; i++) {
      for (int k = 0; k < 6; k++) {
        double v = a[6 * i + k];
        if (v != 0) {
          for (int j = 0; j < 6; j++) {
            c[6 * i + j] += v * b[6 * k + j];
          }
        }
      }
    }
    return c;
  }

  double[] freeTurning() {
    return free.clone();
  }

  /** Greatest unbalanced force or moment. */
  double residual_N() {
    double most = 0;
    for (double u : unbalanced) {
      most = Math.max(most, Math.abs(u));
    }
    return most;
  }

  /** The node of the greatest unbalanced force. */
  int worstNode() {
    int worst = 0;
    for (int i = 0; i < unbalanced.length; i++) {
      if (Math.abs(unbalanced[i]) > Math.abs(unbalanced[worst])) {
        worst = i;
      }
    }
    return worst / 6;
  }
}
