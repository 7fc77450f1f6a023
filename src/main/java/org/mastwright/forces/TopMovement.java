package org.mastwright.forces;

/**
 * Where the mast top has gone from its plumb place.
 *
 * @param tilt_rad lean of the axis at the top from plumb
 * @param tiltTowards_rad bearing it leans to
 * @param twist_rad about the axis, right-handed about up
 */
public record TopMovement(
    double east_m,
    double north_m,
    double up_m,
    double tilt_rad,
    double tiltTowards_rad,
    double twist_rad) {
  /** Level movement. */
  public double level_m() {
    return Math.hypot(east_m, north_m);
  }
}
