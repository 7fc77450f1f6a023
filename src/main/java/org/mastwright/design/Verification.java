package org.mastwright.design;

import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;

/**
 * Direct loads in place of site and turbine, to check the mechanics against another calculation.
 *
 * @param mastAddedMass_kgpm besides the tube's own
 * @param shearFlexible false: Euler-Bernoulli, no rotary inertia of the tube
 * @param guyInertia true: guys vibrate with their own mass
 * @param elementsPerTube empty for the default mesh
 */
public record Verification(
    double gravity_mps2,
    double mastAddedMass_kgpm,
    boolean shearFlexible,
    boolean guyInertia,
    OptionalInt elementsPerTube,
    int modes,
    Optional<HeadBody> head,
    List<PointMass> masses,
    List<DirectCase> cases) {
  public Verification {
    masses = List.copyOf(masses);
    cases = List.copyOf(cases);
  }

  /** East, north and up components of a length, force, moment or load per length. */
  public record Vector(double east, double north, double up) {}

  /**
   * A rigid body on the mast top; inertia (kg·m²) about its own centre, centre (m) from the top.
   */
  public record HeadBody(double mass_kg, Vector centre, Vector inertia) {}

  /** A mass on the axis. */
  public record PointMass(double along_m, double mass_kg) {}

  /** One set of loads. */
  public record DirectCase(
      String id,
      double temperatureChange_K,
      List<DirectForce> forces,
      List<DirectMoment> moments,
      List<LineLoad> mastLineLoads,
      List<GuyLoad> guyLineLoads,
      List<LineMass> mastLineMasses,
      List<RemovedGuy> guysRemoved) {
    public DirectCase {
      forces = List.copyOf(forces);
      moments = List.copyOf(moments);
      mastLineLoads = List.copyOf(mastLineLoads);
      guyLineLoads = List.copyOf(guyLineLoads);
      mastLineMasses = List.copyOf(mastLineMasses);
      guysRemoved = List.copyOf(guysRemoved);
    }
  }

  /** A force (N) that keeps its direction, at an offset (m) that turns with the mast. */
  public record DirectForce(double along_m, Vector force, Vector offset) {}

  /** A moment (N·m) about fixed axes. */
  public record DirectMoment(double along_m, Vector moment) {}

  /** Load per length (N/m) along the undeformed axis, linear between the ends. */
  public record LineLoad(double bottom_m, double top_m, Vector bottom, Vector top) {}

  /** Load per unstretched length (N/m); set and azimuth empty for all guys. */
  public record GuyLoad(OptionalInt set, Optional<Double> azimuth_rad, Vector load) {}

  /** Added mass per length of this case, weight and inertia. */
  public record LineMass(double bottom_m, double top_m, double mass_kgpm) {}

  /** A guy that is not there. */
  public record RemovedGuy(int set, double azimuth_rad) {}
}
