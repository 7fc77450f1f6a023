package org.mastwright.frame;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * Stiffness and mass about a balance, with swinging cables as side chains. Vectors hold six numbers
 * a node and then three for each inner point of each swinging cable.
 */
final class ModalSystem {
  final int size;
  final BlockTridiagonal stiffness;
  final BlockTridiagonal mass;
  final List<SwingingCable> swinging = new ArrayList<>();

  private final int nodes;
  private final double[] free;
  private final BlockTridiagonal shifted;

  ModalSystem(Equilibrium balance, VibrationSolver.CableMass cableMass) {
    Chain chain = balance.chain();
    this.nodes = chain.nodes().size();
    Assembler a = new Assembler(chain, balance.load());
    a.assemble(balance.state().copy(), balance.factor(), true);
    this.free = a.freeTurning();
    this.stiffness = a.tangent;
    this.mass = new BlockTridiagonal(nodes);
    this.shifted = new BlockTridiagonal(nodes);
    addBeams(a);
    addBodies(chain, balance);
    addCables(a, balance, cableMass);
    Assembler.hold(mass.diagonal[0], mass.upper[0], free, 0);
    int points = 0;
    for (SwingingCable c : swinging) {
      points += c.inner;
    }
    this.size = 6 * nodes + 3 * points;
  }

  private void addBeams(Assembler a) {
    Chain chain = a.chain;
    double[] added = new double[chain.beams().size()];
    for (ChainLoad.AddedMass m : a.load.addedMasses()) {
      added[m.beam()] += m.mass_kgpm();
    }
    for (int i = 0; i < added.length; i++) {
      Chain.Beam b = chain.beams().get(i);
      BeamMass.add(
          mass,
          i,
          BeamMass.of(
              a.beams[i].frame,
              a.beams[i].length_m(),
              b.mass_kgpm() + added[i],
              b.rotaryInertia_kgm(),
              b.polarInertia_kgm()));
    }
  }

  private void addBodies(Chain chain, Equilibrium balance) {
    for (Chain.Body body : chain.bodies()) {
      double[] r = balance.state().rotation[body.node()];
      double[] arm = Algebra.apply(r, body.centre_m().array());
      double[] own = {
        body.inertia_kgm2().x_kgm2(),
        0,
        0,
        0,
        body.inertia_kgm2().y_kgm2(),
        0,
        0,
        0,
        body.inertia_kgm2().z_kgm2()
      };
      double[] turned = Algebra.product(Algebra.product(r, own), Algebra.transpose(r));
      double[] block = mass.diagonal[body.node()];
      double[] m = new double[9];
      for (int k = 0; k < 3; k++) {
        m[4 * k] = body.mass_kg();
      }
      Assembler.addOffsetStiffness(block, m, arm);
      for (int i = 0; i < 3; i++) {
        for (int j = 0; j < 3; j++) {
          block[6 * (i + 3) + j + 3] += turned[3 * i + j];
        }
      }
    }
  }

  private void addCables(Assembler a, Equilibrium balance, VibrationSolver.CableMass cableMass) {
    double[] ice = new double[a.cables.length];
    addIce(a.load.permanent(), ice);
    addIce(a.load.variable(), ice);
    for (int c = 0; c < a.cables.length; c++) {
      if (a.cables[c] == null || cableMass == VibrationSolver.CableMass.NONE) {
        continue;
      }
      Chain.Cable cable = a.chain.cables().get(c);
      double[] arm =
          Algebra.apply(balance.state().rotation[cable.node()], cable.offset_m().array());
      double whole = (cable.mass_kgpm() + ice[c]) * cable.unstretched_m();
      if (cableMass == VibrationSolver.CableMass.THIRD_AT_NODE) {
        addPointMass(cable.node(), whole / 3, arm);
      } else if (a.cables[c].lowerTension_N() > 0) {
        SwingingCable s =
            new SwingingCable(cable, a.cables[c], arm, VibrationSolver.CABLE_PIECES, ice[c]);
        swinging.add(s);
        addPointMass(cable.node(), s.pointMass_kg / 2, arm);
        double[] static9 = a.cables[c].stiffness();
        double[] negated = new double[9];
        for (int k = 0; k < 9; k++) {
          negated[k] = -static9[k];
        }
        Assembler.addOffsetStiffness(stiffness.diagonal[cable.node()], negated, arm);
      }
    }
  }

  private static void addIce(ChainLoad.Part part, double[] ice) {
    for (ChainLoad.CableLoad l : part.cables()) {
      ice[l.cable()] += l.addedMass_kgpm();
    }
  }

  private void addPointMass(int node, double mass_kg, double[] arm) {
    double[] m = {mass_kg, 0, 0, 0, mass_kg, 0, 0, 0, mass_kg};
    Assembler.addOffsetStiffness(mass.diagonal[node], m, arm);
  }

  /** Factorises {@code K − σM}; returns the number of frequencies below {@code √σ}. */
  int factor(double sigma) {
    shifted.setToSum(stiffness, -sigma, mass);
    int negative = 0;
    for (SwingingCable c : swinging) {
      c.factor(sigma);
      negative += c.negativePivots();
      Assembler.addOffsetStiffness(shifted.diagonal[c.node], c.end(), c.arm);
    }
    shifted.factor();
    return negative + shifted.negativePivots();
  }

  /** Solves in place with the last factorisation. */
  void solve(double[] x) {
    int at = 6 * nodes;
    for (SwingingCable c : swinging) {
      double[] f = c.forward(x, at);
      double[] m = Algebra.cross(c.arm, f);
      for (int k = 0; k < 3; k++) {
        x[6 * c.node + k] += f[k];
        x[6 * c.node + 3 + k] += m[k];
      }
      at += 3 * c.inner;
    }
    double[] chain = Arrays.copyOf(x, 6 * nodes);
    hold(chain);
    shifted.solve(chain);
    System.arraycopy(chain, 0, x, 0, chain.length);
    at = 6 * nodes;
    for (SwingingCable c : swinging) {
      c.backward(x, at, attachment(x, c));
      at += 3 * c.inner;
    }
  }

  private void hold(double[] x) {
    double[] spin = Algebra.apply(free, new double[] {x[3], x[4], x[5]});
    Arrays.fill(x, 0, 3, 0);
    System.arraycopy(spin, 0, x, 3, 3);
  }

  private static double[] attachment(double[] x, SwingingCable c) {
    int o = 6 * c.node;
    double[] turn = {x[o + 3], x[o + 4], x[o + 5]};
    return Algebra.plus(new double[] {x[o], x[o + 1], x[o + 2]}, Algebra.cross(turn, c.arm));
  }

  /** {@code M·x}. */
  double[] massTimes(double[] x) {
    double[] y = new double[size];
    double[] chain = new double[6 * nodes];
    mass.multiply(Arrays.copyOf(x, 6 * nodes), chain);
    System.arraycopy(chain, 0, y, 0, chain.length);
    int at = 6 * nodes;
    for (SwingingCable c : swinging) {
      for (int k = 0; k < 3 * c.inner; k++) {
        y[at + k] = c.pointMass_kg * x[at + k];
      }
      at += 3 * c.inner;
    }
    return y;
  }

  /** {@code K·x}. */
  double[] stiffnessTimes(double[] x) {
    double[] y = new double[size];
    double[] chain = new double[6 * nodes];
    stiffness.multiply(Arrays.copyOf(x, 6 * nodes), chain);
    System.arraycopy(chain, 0, y, 0, chain.length);
    int at = 6 * nodes;
    for (SwingingCable c : swinging) {
      double[] f = c.multiply(x, at, attachment(x, c), y);
      double[] m = Algebra.cross(c.arm, f);
      for (int k = 0; k < 3; k++) {
        y[6 * c.node + k] += f[k];
        y[6 * c.node + 3 + k] += m[k];
      }
      at += 3 * c.inner;
    }
    return y;
  }
}
