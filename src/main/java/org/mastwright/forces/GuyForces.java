package org.mastwright.forces;

import java.util.List;

/**
 * One guy in a solved case.
 *
 * @param set from 1 at the lowest
 * @param index in the set, from 0
 * @param azimuth_rad true bearing to its anchor
 * @param anchor index of its anchor
 * @param anchorPull_N what the guy does to the anchor: towards the mast and up
 * @param stillAirHorizontal_N its horizontal pull in still air, same pretension state
 * @param slack horizontal pull below a tenth of its still-air value
 * @param removed not there in this case: all forces are zero
 * @param shape_m points along the guy from anchor to mast, deflected, from the mast foot at the
 *     datum
 */
public record GuyForces(
    int set,
    int index,
    double azimuth_rad,
    int anchor,
    double tensionAtMast_N,
    double tensionAtAnchor_N,
    Vector3 anchorPull_N,
    double stillAirHorizontal_N,
    boolean slack,
    boolean removed,
    List<Vector3> shape_m) {
  public GuyForces {
    shape_m = List.copyOf(shape_m);
  }

  /** The greater of the two end tensions. */
  public double greatest_N() {
    return Math.max(tensionAtMast_N, tensionAtAnchor_N);
  }

  /** Level part of the pull. */
  public double horizontal_N() {
    return anchorPull_N.level();
  }
}
