package org.mastwright.design;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** How the mast is tilted up. Read now; calculated by the raising package when it is built. */
public record Raising(
    Hinge hinge,
    GinPole ginPole,
    List<LiftingLine> lines,
    Haul haul,
    Optional<Winch> winch,
    List<Prop> props,
    String backGuy,
    String liftWith,
    OptionalDouble windLimit_mps) {
  public Raising {
    lines = List.copyOf(lines);
    props = List.copyOf(props);
  }

  /** The pin the mast turns about. */
  public record Hinge(double height_m, double ahead_m, double pin_m, String grade) {}

  /** The pole that gives the hauling line its lever. */
  public record GinPole(double length_m, Tube tube, boolean sideStays) {}

  /** From a guy level or a place along the mast to the gin-pole tip. */
  public record LiftingLine(
      OptionalDouble along_m, int toSet, boolean staysAsGuy, Optional<GuySet.Rope> rope) {}

  /** The hauling line and its tackle. */
  public record Haul(GuySet.Rope rope, int parts, double sheaveEfficiencyRatio, String by) {}

  /** The winch and where it stands. */
  public record Winch(
      double rating_N, String at, double bearing_rad, double out_m, double eyeHeight_m) {}

  /** A support under the lying mast. */
  public record Prop(double along_m, double height_m) {}
}
