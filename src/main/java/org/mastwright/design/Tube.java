package org.mastwright.design;

/**
 * One tube of the mast; lengths are along the mast from its foot.
 *
 * @param label as typed, for the report, such as {@code 4 in schedule 40 pipe}
 * @param bottom_m where it begins
 * @param top_m where it ends
 * @param bottom section at its lower end, as used for strength and stiffness
 * @param top section at its upper end
 * @param nominalMass_kgpm mean mass per length of the tube as bought (its nominal wall)
 * @param source table or measurement that the size comes from
 */
public record Tube(
    String label,
    double bottom_m,
    double top_m,
    Section bottom,
    Section top,
    Steel steel,
    Making making,
    double nominalMass_kgpm,
    String source) {
  public Tube {
    if (!(top_m > bottom_m)) {
      throw new IllegalArgumentException("tube " + label + " has no length");
    }
  }

  public double length_m() {
    return top_m - bottom_m;
  }

  public boolean isTapered() {
    return !bottom.equals(top);
  }

  /** The section at a place along the mast, between the two ends linearly. */
  public Section sectionAt(double along_m) {
    double t = (along_m - bottom_m) / length_m();
    return new Section(
        bottom.outside_m() + t * (top.outside_m() - bottom.outside_m()),
        bottom.wall_m() + t * (top.wall_m() - bottom.wall_m()),
        bottom.sides());
  }

  /** How it was made: it decides the buckling curve. */
  public enum Making {
    HOT_FINISHED,
    COLD_FORMED,
    WELDED_PIPE,
    UNKNOWN
  }

  /**
   * A steel.
   *
   * @param name grade as typed
   * @param source where the values come from, with status word
   */
  public record Steel(
      String name,
      double yield_Pa,
      double ultimate_Pa,
      double modulus_Pa,
      double shearModulus_Pa,
      double density_kgpm3,
      boolean assumed,
      String source) {}
}
