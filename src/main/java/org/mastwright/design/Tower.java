package org.mastwright.design;

import java.util.List;

/**
 * The mast or pole.
 *
 * @param footLevel_m lowest end of the bottom tube above the datum
 * @param tubes bottom to top, without gaps
 * @param dampingRatio structural damping of the first mode over critical
 * @param outOfPlumbRatio lean of the axis as built
 * @param guys bottom to top; empty for a monopole
 * @param openings hand holes and doors
 */
public record Tower(
    Kind kind,
    BaseSupport base,
    double footLevel_m,
    List<Tube> tubes,
    List<Joint> joints,
    double dampingRatio,
    double outOfPlumbRatio,
    List<Attachment> attachments,
    List<GuySet> guys,
    List<Opening> openings) {
  public Tower {
    openings = List.copyOf(openings);
    tubes = List.copyOf(tubes);
    joints = List.copyOf(joints);
    attachments = List.copyOf(attachments);
    guys = List.copyOf(guys);
    if (tubes.isEmpty()) {
      throw new IllegalArgumentException("a tower has at least one tube");
    }
  }

  /** The same tower with other guys. */
  public Tower withGuys(List<GuySet> others) {
    return new Tower(
        kind,
        base,
        footLevel_m,
        tubes,
        joints,
        dampingRatio,
        outOfPlumbRatio,
        attachments,
        others,
        openings);
  }

  /** Length of the mast along its axis. */
  public double length_m() {
    return tubes.get(tubes.size() - 1).top_m();
  }

  /** Height of the mast top above the datum. */
  public double topHeight_m() {
    return footLevel_m + length_m();
  }

  /** The two kinds. */
  public enum Kind {
    GUYED_MAST("guyed-mast"),
    MONOPOLE("monopole");

    private final String key;

    Kind(String key) {
      this.key = key;
    }

    /** As typed. */
    public String key() {
      return key;
    }
  }

  /** How the foot is held. All kinds hold it in place and against turning about its own axis. */
  public sealed interface BaseSupport {
    /** Free to lean in every direction. */
    record Pinned() implements BaseSupport {}

    /** Clamped. */
    record Fixed() implements BaseSupport {}

    /** Free to turn about one level pin, whose bearing is given; clamped about the other axis. */
    record Hinged(double axisBearing_rad) implements BaseSupport {}

    /** On a rotational spring about every level axis. */
    record Sprung(double stiffness_Nmprad) implements BaseSupport {}
  }

  /**
   * Something fixed to the mast, from {@code bottom_m} to {@code top_m} along the mast (equal for a
   * single object).
   *
   * @param mass_kg in all
   * @param dragArea_m2 area times drag coefficient, in all; from any direction
   */
  public record Attachment(
      String what, double bottom_m, double top_m, double mass_kg, double dragArea_m2) {}

  /** A hole in the tube: its centre along the mast, level width, upright length, bearing. */
  public record Opening(double along_m, double width_m, double tall_m, double facing_rad) {}
}
