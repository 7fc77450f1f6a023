package org.mastwright.assess;

import java.util.List;
import org.mastwright.forces.BaseReaction;
import org.mastwright.forces.Vector3;

/**
 * What the ground must hold.
 *
 * @param foot the governing reactions at the foot: greatest down, least down, greatest shear,
 *     greatest moment
 */
public record Reactions(List<FootReaction> foot, List<AnchorPull> anchors) {
  public Reactions {
    foot = List.copyOf(foot);
    anchors = List.copyOf(anchors);
  }

  /** A reaction with what makes it notable. */
  public record FootReaction(
      String what, String caseId, BaseReaction factored, BaseReaction unfactored) {}

  /**
   * The greatest pull on one anchor: the vector sum of its guys.
   *
   * @param guys that end here, as (set, azimuth)
   * @param factored_N in the governing strength case
   * @param unfactored_N greatest of the characteristic cases
   */
  public record AnchorPull(
      String name,
      List<GuyEnd> guys,
      Vector3 factored_N,
      String caseId,
      Vector3 unfactored_N,
      String unfactoredCaseId) {
    public AnchorPull {
      guys = List.copyOf(guys);
    }
  }

  /** A guy that ends at an anchor. */
  public record GuyEnd(int set, double azimuth_rad) {}
}
