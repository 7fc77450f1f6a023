package org.mastwright.frame;

import java.util.List;

/**
 * What acts on a chain, in two parts: the permanent part is always whole, the variable part is the
 * one a limit-point search scales.
 *
 * @param gravityFactor on all weight
 * @param cableTemperatureChange_K of all cables
 * @param removed whether each cable is gone; empty when all are there
 */
public record ChainLoad(
    double gravityFactor,
    double cableTemperatureChange_K,
    List<Boolean> removed,
    List<AddedMass> addedMasses,
    Part permanent,
    Part variable) {
  public ChainLoad {
    removed = List.copyOf(removed);
    addedMasses = List.copyOf(addedMasses);
  }

  /** Weight only, all cables there, at the reference temperature. */
  public static ChainLoad weightOnly() {
    return new ChainLoad(1, 0, List.of(), List.of(), Part.NONE, Part.NONE);
  }

  /** The same with a variable part. */
  public ChainLoad withVariable(Part part) {
    return new ChainLoad(
        gravityFactor, cableTemperatureChange_K, removed, addedMasses, permanent, part);
  }

  boolean isRemoved(int cable) {
    return !removed.isEmpty() && removed.get(cable);
  }

  /** Mass per length added to a beam (ice): weight times {@code weightFactor}, and inertia. */
  public record AddedMass(int beam, double mass_kgpm, double weightFactor) {}

  /** Loads that act together. */
  public record Part(List<NodeLoad> nodes, List<BeamLoad> beams, List<CableLoad> cables) {
    /** Nothing. */
    public static final Part NONE = new Part(List.of(), List.of(), List.of());

    public Part {
      nodes = List.copyOf(nodes);
      beams = List.copyOf(beams);
      cables = List.copyOf(cables);
    }
  }

  /** A force, moment or load per length, by its components. */
  public record Components(double x, double y, double z) {
    double[] array() {
      return new double[] {x, y, z};
    }
  }

  /**
   * A force that keeps its direction on a point that turns with the node, and a moment about fixed
   * axes.
   */
  public record NodeLoad(
      int node, Chain.Point offset_m, Components force_N, Components moment_Nm) {}

  /** Load per undeformed length of a beam, keeping its direction, linear from its lower end. */
  public record BeamLoad(int beam, Components lower_Npm, Components upper_Npm) {}

  /**
   * Load per unstretched length on equal parts of a cable, from the anchor, besides weight.
   *
   * @param addedMass_kgpm ice: its weight must be in the parts; it adds inertia
   */
  public record CableLoad(int cable, List<Components> parts_Npm, double addedMass_kgpm) {
    public CableLoad {
      parts_Npm = List.copyOf(parts_Npm);
    }
  }
}
