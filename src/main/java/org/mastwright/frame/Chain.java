package org.mastwright.frame;

import java.util.List;
import java.util.OptionalDouble;

/**
 * The structure at rest, without load: nodes from the base up, one beam between neighbours, cables
 * and rigid bodies on nodes. Immutable.
 *
 * @param nodes reference positions; they may bend and lean (imperfections): that shape is free of
 *     stress
 * @param beams one fewer than nodes; beam {@code i} joins node {@code i} to {@code i + 1}
 * @param base how node 0 is held
 */
public record Chain(
    List<Point> nodes,
    List<Beam> beams,
    List<Cable> cables,
    List<Body> bodies,
    Base base,
    double gravity_mps2) {
  public Chain {
    nodes = List.copyOf(nodes);
    beams = List.copyOf(beams);
    cables = List.copyOf(cables);
    bodies = List.copyOf(bodies);
    if (nodes.size() < 2 || beams.size() != nodes.size() - 1) {
      throw new IllegalArgumentException(
          "a chain of " + nodes.size() + " nodes cannot have " + beams.size() + " beams");
    }
  }

  /** The same chain with other cables. */
  public Chain withCables(List<Cable> others) {
    return new Chain(nodes, beams, others, bodies, base, gravity_mps2);
  }

  /** The same chain with other bodies. */
  public Chain withBodies(List<Body> others) {
    return new Chain(nodes, beams, cables, others, base, gravity_mps2);
  }

  /** The same chain with nodes moved (imperfections). */
  public Chain withNodes(List<Point> others) {
    return new Chain(others, beams, cables, bodies, base, gravity_mps2);
  }

  /** A place or a vector of lengths. */
  public record Point(double x_m, double y_m, double z_m) {
    double[] array() {
      return new double[] {x_m, y_m, z_m};
    }

    static Point of(double[] a) {
      return new Point(a[0], a[1], a[2]);
    }
  }

  /**
   * A straight beam of constant section, the same about both axes.
   *
   * @param axial_N stiffness EA
   * @param bending_Nm2 stiffness EI
   * @param torsion_Nm2 stiffness GJ
   * @param shear_N stiffness κGA; infinite for a beam that does not shear (Euler-Bernoulli)
   * @param mass_kgpm mass per length, with weight
   * @param rotaryInertia_kgm rotary inertia per length about a transverse axis; 0 to neglect it
   * @param polarInertia_kgm inertia per length about the axis
   */
  public record Beam(
      double axial_N,
      double bending_Nm2,
      double torsion_Nm2,
      double shear_N,
      double mass_kgpm,
      double rotaryInertia_kgm,
      double polarInertia_kgm) {
    public Beam {
      if (!(axial_N > 0) || !(bending_Nm2 > 0) || !(torsion_Nm2 > 0) || !(shear_N > 0)) {
        throw new IllegalArgumentException("a beam needs positive stiffnesses");
      }
    }
  }

  /**
   * An elastic cable between a fixed anchor and a point that turns with a node.
   *
   * @param offset_m from the node to the attachment, at rest
   * @param axial_N stiffness EA
   * @param mass_kgpm per unstretched length
   * @param unstretched_m length without tension at the reference temperature
   */
  public record Cable(
      int node,
      Point offset_m,
      Point anchor_m,
      double axial_N,
      double mass_kgpm,
      double unstretched_m,
      double thermalExpansion_perK) {
    /** The same cable with another unstretched length. */
    public Cable withUnstretched(double length_m) {
      return new Cable(
          node, offset_m, anchor_m, axial_N, mass_kgpm, length_m, thermalExpansion_perK);
    }
  }

  /**
   * A rigid body on a node, with weight.
   *
   * @param centre_m from the node, at rest
   * @param inertia_kgm2 about its own centre, principal about x, y, z at rest
   */
  public record Body(int node, double mass_kg, Point centre_m, Inertia inertia_kgm2) {
    /** A mass without extent. */
    public static Body point(int node, double mass_kg) {
      return new Body(node, mass_kg, new Point(0, 0, 0), new Inertia(0, 0, 0));
    }
  }

  /** Moments of inertia about the three axes. */
  public record Inertia(double x_kgm2, double y_kgm2, double z_kgm2) {}

  /**
   * How the base is held. It never moves and never twists.
   *
   * @param hinge bearing (clockwise from y) of the only level axis it can turn about, or empty
   * @param spring_Nmprad rotational stiffness about every level axis it can turn about; zero is a
   *     pin; infinite is a clamp
   */
  public record Base(OptionalDouble hingeBearing_rad, double spring_Nmprad) {
    /** Free to lean everywhere. */
    public static Base pinned() {
      return new Base(OptionalDouble.empty(), 0);
    }

    /** Clamped. */
    public static Base clamped() {
      return new Base(OptionalDouble.empty(), Double.POSITIVE_INFINITY);
    }

    /** On a rotational spring. */
    public static Base sprung(double spring_Nmprad) {
      return new Base(OptionalDouble.empty(), spring_Nmprad);
    }

    /** Free to turn about one level axis, clamped about the other. */
    public static Base hinged(double bearing_rad) {
      return new Base(OptionalDouble.of(bearing_rad), 0);
    }
  }
}
