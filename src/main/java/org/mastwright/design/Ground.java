package org.mastwright.design;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** What holds the tower to the earth. */
public record Ground(List<Anchor> anchors, Optional<Foundation> foundation) {
  public Ground {
    anchors = List.copyOf(anchors);
  }

  /**
   * One anchor; guys that end at it pull on it together.
   *
   * @param east_m of the eye from the mast axis
   * @param up_m of the eye above the datum
   */
  public record Anchor(
      String name, double bearing_rad, double east_m, double north_m, double up_m, Kind kind) {
    /** Level distance from the mast axis. */
    public double out_m() {
      return Math.hypot(east_m, north_m);
    }
  }

  /** What an anchor is. */
  public sealed interface Kind {
    /** A screw: torque and holding as stated; depth or rod length and angle. */
    record Screw(
        double helix_m,
        int count,
        double rod_m,
        OptionalDouble rodLength_m,
        OptionalDouble depth_m,
        boolean inLine,
        OptionalDouble torque_Nm,
        OptionalDouble holding_N)
        implements Kind {}

    /** A buried block. */
    record Block(
        double length_m,
        double width_m,
        double height_m,
        double topBelowGround_m,
        double density_kgpm3)
        implements Kind {}

    /** A grouted bar in rock. */
    record Rock(double hole_m, double bonded_m, double bar_m, double barStrength_Pa, double bond_Pa)
        implements Kind {}

    /** Pulled and watched: the load held, how long, and whether it gave way at that load. */
    record Tested(double held_N, double time_s, boolean failed) implements Kind {}

    /** Not described, as in a verification file. */
    record NotDescribed() implements Kind {}

    /** As typed. */
    default String key() {
      return switch (this.getClass().getSimpleName()) {
        case "NotDescribed" -> "not described";
        default -> this.getClass().getSimpleName().toLowerCase(java.util.Locale.ROOT);
      };
    }
  }

  /** The footing of the mast. */
  public record Foundation(
      Shape shape,
      OptionalDouble concreteStrength_Pa,
      double concreteDensity_kgpm3,
      Optional<Bars> bars) {}

  /** The shapes of footing. */
  public sealed interface Shape {
    /** A pad. */
    record Pad(
        double length_m, double width_m, double thickness_m, double underside_m, double standsOut_m)
        implements Shape {}

    /** A round pier. */
    record Pier(double diameter_m, double belowGround_m, double standsOut_m) implements Shape {}

    /** The pole set in the ground or in a concrete collar. */
    record Embedded(double depth_m, double diameter_m) implements Shape {}

    /** On rock. */
    record OnRock() implements Shape {}
  }

  /** Reinforcement of the footing. */
  public record Bars(int count, double size_m, double cover_m, OptionalDouble ties_m) {}
}
