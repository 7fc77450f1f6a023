package org.mastwright.forces;

/**
 * Forces in a cross-section and where it has moved to.
 *
 * @param along_m along the undeformed mast from its foot
 * @param height_m above the datum, undeformed
 * @param axial_N positive in tension
 * @param shearEast_N force of the upper part on the lower, along east, square to the axis
 * @param momentAboutEast_Nm of the upper part on the lower, about the section's centre
 * @param torque_Nm about the mast axis
 * @param east_m movement from the plumb position
 */
public record SectionForces(
    double along_m,
    double height_m,
    double axial_N,
    double shearEast_N,
    double shearNorth_N,
    double momentAboutEast_Nm,
    double momentAboutNorth_Nm,
    double torque_Nm,
    double east_m,
    double north_m) {
  /** Resultant shear. */
  public double shear_N() {
    return Math.hypot(shearEast_N, shearNorth_N);
  }

  /** Resultant bending moment. */
  public double moment_Nm() {
    return Math.hypot(momentAboutEast_Nm, momentAboutNorth_Nm);
  }
}
