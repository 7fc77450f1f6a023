package org.mastwright.forces;

/** What the ground does to the mast at its foot: force and moment about the axes. */
public record BaseReaction(
    double east_N,
    double north_N,
    double up_N,
    double momentAboutEast_Nm,
    double momentAboutNorth_Nm,
    double torque_Nm) {
  /** Level force. */
  public double shear_N() {
    return Math.hypot(east_N, north_N);
  }

  /** Overturning moment. */
  public double moment_Nm() {
    return Math.hypot(momentAboutEast_Nm, momentAboutNorth_Nm);
  }
}
