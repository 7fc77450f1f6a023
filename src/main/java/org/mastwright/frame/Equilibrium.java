package org.mastwright.frame;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** A chain in balance: places, forces, reactions. Immutable. */
public final class Equilibrium {
  private final Chain chain;
  private final ChainLoad load;
  private final ChainState state;
  private final double factor;
  private final double residualRatio;
  private final int iterations;
  private final int negativePivots;
  private final List<BeamEnd> beamEnds;
  private final List<Optional<CableForces>> cables;
  private final BeamEnd base;

  /**
   * Force and moment in a section at one end of a beam: what the part above does to the part below,
   * about the node, in fixed axes.
   *
   * @param axis_x components of the unit vector along the beam, upwards
   */
  public record BeamEnd(
      ChainLoad.Components force_N,
      ChainLoad.Components moment_Nm,
      ChainLoad.Components axisComponents) {
    /** Axial force, positive in tension. */
    public double axial_N() {
      return Algebra.dot(force_N.array(), axisComponents.array());
    }

    /** Moment about the beam's axis. */
    public double torque_Nm() {
      return Algebra.dot(moment_Nm.array(), axisComponents.array());
    }

    /** Force square to the axis. */
    public ChainLoad.Components shear_N() {
      return across(force_N);
    }

    /** Moment about axes square to the beam's. */
    public ChainLoad.Components bending_Nm() {
      return across(moment_Nm);
    }

    private ChainLoad.Components across(ChainLoad.Components v) {
      double[] e = axisComponents.array();
      double[] rest = Algebra.minus(v.array(), Algebra.times(Algebra.dot(v.array(), e), e));
      return new ChainLoad.Components(rest[0], rest[1], rest[2]);
    }
  }

  /**
   * A cable's forces.
   *
   * @param anchorPull_N what the cable does to its anchor
   * @param nodePull_N what it does to its attachment
   * @param shape_m points from anchor to attachment
   */
  public record CableForces(
      ChainLoad.Components anchorPull_N,
      ChainLoad.Components nodePull_N,
      double anchorTension_N,
      double nodeTension_N,
      List<Chain.Point> shape_m) {}

  Equilibrium(Assembler a, ChainState state, double factor, int iterations, int negativePivots) {
    this.chain = a.chain;
    this.load = a.load;
    this.state = state.copy();
    this.factor = factor;
    this.residualRatio = a.residual_N() / a.greatest_N;
    this.iterations = iterations;
    this.negativePivots = negativePivots;
    this.beamEnds = ends(a, state, factor);
    this.cables = cableForces(a);
    this.base = reaction(a, state);
  }

  /** What holds node 0: the directions that are held, and the spring. */
  private static BeamEnd reaction(Assembler a, ChainState state) {
    double[] held = {-a.whole[3], -a.whole[4], -a.whole[5]};
    double[] moment = Algebra.plus(held, a.springMoment(state));
    return new BeamEnd(
        components(a.whole, 0, -1), components(moment, 0, 1), new ChainLoad.Components(0, 0, 1));
  }

  private static ChainLoad.Components components(double[] a, int at, double sign) {
    return new ChainLoad.Components(sign * a[at], sign * a[at + 1], sign * a[at + 2]);
  }

  /** Section forces at both ends of every beam: end forces less the loads shared to the node. */
  private static List<BeamEnd> ends(Assembler a, ChainState state, double factor) {
    List<BeamEnd> ends = new ArrayList<>();
    for (int i = 0; i < a.beams.length; i++) {
      double[] shared = a.lineLoadOn(i, state, factor);
      CorotatedBeam beam = a.beams[i];
      double[] f = new double[12];
      for (int k = 0; k < 12; k++) {
        f[k] = (beam.force[k] - shared[k]) * (k < 6 ? -1 : 1);
      }
      double[] e = beam.axis();
      ChainLoad.Components axis = new ChainLoad.Components(e[0], e[1], e[2]);
      ends.add(new BeamEnd(components(f, 0, 1), components(f, 3, 1), axis));
      ends.add(new BeamEnd(components(f, 6, 1), components(f, 9, 1), axis));
    }
    return List.copyOf(ends);
  }

  private static List<Optional<CableForces>> cableForces(Assembler a) {
    List<Optional<CableForces>> all = new ArrayList<>();
    for (int c = 0; c < a.cables.length; c++) {
      Catenary cable = a.cables[c];
      if (cable == null) {
        all.add(Optional.empty());
        continue;
      }
      Chain.Point from = a.chain.cables().get(c).anchor_m();
      List<Chain.Point> shape =
          cable.shape_m(12).stream()
              .map(
                  p ->
                      new Chain.Point(
                          from.x_m() + p.x_m(), from.y_m() + p.y_m(), from.z_m() + p.z_m()))
              .toList();
      all.add(
          Optional.of(
              new CableForces(
                  components(cable.lower(), 0, 1),
                  components(cable.upper(), 0, -1),
                  cable.lowerTension_N(),
                  cable.upperTension_N(),
                  shape)));
    }
    return List.copyOf(all);
  }

  public Chain chain() {
    return chain;
  }

  public ChainLoad load() {
    return load;
  }

  /** Factor on the variable loads. */
  public double factor() {
    return factor;
  }

  ChainState state() {
    return state;
  }

  /** Movement of a node from its reference place. */
  public Chain.Point movement_m(int node) {
    double[] d = Algebra.minus(state.place_m[node], chain.nodes().get(node).array());
    return Chain.Point.of(d);
  }

  /** Where a node is. */
  public Chain.Point place_m(int node) {
    return Chain.Point.of(state.place_m[node]);
  }

  /** Rotation vector of a node from rest, about x, y, z. */
  public ChainLoad.Components rotation_rad(int node) {
    double[] v = Algebra.rotationVector(state.rotation[node]);
    return new ChainLoad.Components(v[0], v[1], v[2]);
  }

  /** An offset that turned with a node. */
  public Chain.Point turned_m(int node, Chain.Point offset_m) {
    return Chain.Point.of(Algebra.apply(state.rotation[node], offset_m.array()));
  }

  /** Section at the lower end of a beam. */
  public BeamEnd lowerEnd(int beam) {
    return beamEnds.get(2 * beam);
  }

  /** Section at the upper end of a beam. */
  public BeamEnd upperEnd(int beam) {
    return beamEnds.get(2 * beam + 1);
  }

  /** What the ground does to node 0. */
  public ChainLoad.Components baseForce_N() {
    return base.force_N();
  }

  /** What the ground does to node 0, about it. */
  public ChainLoad.Components baseMoment_Nm() {
    return base.moment_Nm();
  }

  /** Forces of a cable; empty when it is removed. */
  public Optional<CableForces> cable(int index) {
    return cables.get(index);
  }

  /** Greatest unbalanced force over the greatest force met. */
  public double residualRatio() {
    return residualRatio;
  }

  public int iterations() {
    return iterations;
  }

  /** Negative pivots of the symmetric tangent: 0 when the balance is stable. */
  public int negativePivots() {
    return negativePivots;
  }

  public boolean isStable() {
    return negativePivots == 0;
  }
}
