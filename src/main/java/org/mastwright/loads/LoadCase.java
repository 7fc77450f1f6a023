package org.mastwright.loads;

import java.util.List;
import org.mastwright.forces.CaseMark;
import org.mastwright.forces.Vector3;

/**
 * Everything that acts on the tower in one case, factored, in global axes.
 *
 * <p>Permanent actions (weight times {@code gravityFactor}, pretension) come first; the others are
 * the variable actions that a limit-point search scales together.
 *
 * @param gravityFactor on the weight of mast, head, guys and attachments
 * @param guyTemperatureChange_K from the setting temperature
 * @param headCentre_m centre of the mass on the mast top, from the top, as the head is turned now
 * @param head forces on rotor, head and tail
 * @param mast loads per length of the mast axis
 * @param guys loads per unstretched length of each guy
 * @param ice added mass per length of the mast, weight already factored by {@code iceFactor}
 * @param guyIce_kgpm added mass per length of every guy, in the order of the levels; empty for none
 * @param iceOnHead_kg added mass at the head centre
 * @param iceFactor on the weight of ice
 * @param removed guys that are not there, as (set, index)
 */
public record LoadCase(
    CaseMark mark,
    PretensionState pretension,
    double gravityFactor,
    double guyTemperatureChange_K,
    Vector3 headCentre_m,
    List<PointLoad> head,
    List<MastLoad> mast,
    List<GuyLoad> guys,
    List<MastMass> ice,
    List<Double> guyIce_kgpm,
    double iceOnHead_kg,
    double iceFactor,
    List<GuyPlace> removed) {
  public LoadCase {
    head = List.copyOf(head);
    mast = List.copyOf(mast);
    guys = List.copyOf(guys);
    ice = List.copyOf(ice);
    guyIce_kgpm = List.copyOf(guyIce_kgpm);
    removed = List.copyOf(removed);
  }

  /**
   * A force and a moment on the head or mast; the force keeps its direction, its point of
   * application turns with the mast.
   *
   * @param what acts, for the report: {@code rotor thrust}
   * @param along_m of the mast station it is fixed to
   * @param offset_m point of application from that station
   */
  public record PointLoad(
      String what, double along_m, Vector3 offset_m, Vector3 force_N, Vector3 moment_Nm) {}

  /** Load per length between two places, linear. */
  public record MastLoad(
      String what, double bottom_m, double top_m, Vector3 bottom_Npm, Vector3 top_Npm) {}

  /** Load per unstretched length on equal parts of one guy, from the anchor up. */
  public record GuyLoad(GuyPlace guy, List<Vector3> parts_Npm) {
    public GuyLoad {
      parts_Npm = List.copyOf(parts_Npm);
    }
  }

  /** Added mass per length between two places. */
  public record MastMass(double bottom_m, double top_m, double mass_kgpm) {}

  /** A guy by its set (from 1) and its index in the set (from 0). */
  public record GuyPlace(int set, int index) {}
}
