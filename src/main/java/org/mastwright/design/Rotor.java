package org.mastwright.design;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The rotor.
 *
 * @param diameter_m of the swept disc, or the greatest of an upright rotor
 * @param areaPerBlade_m2 one blade seen flat
 * @param massBand_kg the least and greatest rotor mass to consider; equal when it was stated
 * @param overhang_m rotor plane to tower axis, positive, on the side {@code position} says
 * @param clockwise seen from upwind, or from above for an upright rotor
 * @param balanceRecord whether a balance record of the assembled rotor exists
 */
public record Rotor(
    Kind kind,
    int blades,
    double diameter_m,
    double areaPerBlade_m2,
    double mass_kg,
    MassBand massBand_kg,
    Position position,
    double overhang_m,
    double tilt_rad,
    double cone_rad,
    double hubRadius_m,
    double tipSpeedRatio,
    double pitch_rad,
    boolean clockwise,
    Blade blade,
    Shaft shaft,
    boolean balanceRecord,
    List<BladeSection> sections,
    Optional<Upright> upright) {
  public Rotor {
    sections = List.copyOf(sections);
  }

  public double radius_m() {
    return diameter_m / 2;
  }

  /** Area swept: the disc, or width times height of an upright rotor (0.65 of it when bowed). */
  public double sweptArea_m2() {
    return upright
        .map(u -> diameter_m * u.height_m() * (kind == Kind.DARRIEUS ? 0.65 : 1.0))
        .orElse(Math.PI * diameter_m * diameter_m / 4);
  }

  /** The kinds that are told apart. */
  public enum Kind {
    PROPELLER("propeller"),
    MULTI_BLADE("multi-blade"),
    FOUR_SAIL("four-sail"),
    SAVONIUS("savonius"),
    DARRIEUS("darrieus"),
    STRAIGHT_BLADED("straight-bladed");

    private final String key;

    Kind(String key) {
      this.key = key;
    }

    /** As typed. */
    public String key() {
      return key;
    }

    /** Whether it turns about an upright axis. */
    public boolean isUpright() {
      return this == SAVONIUS || this == DARRIEUS || this == STRAIGHT_BLADED;
    }
  }

  /** On which side of the tower the rotor runs. */
  public enum Position {
    UPWIND,
    DOWNWIND
  }

  /** Bounds of the rotor mass. */
  public record MassBand(double least_kg, double greatest_kg) {}

  /** One blade; the inertia is about the shaft. {@code stated} false: from the mass rule. */
  public record Blade(double mass_kg, double cogRadius_m, double inertia_kgm2, boolean stated) {}

  /** Hub to first bearing, and hub to yaw axis. */
  public record Shaft(double bearingArm_m, double yawArm_m) {}

  /** One station of the blade with the polar that holds there. */
  public record BladeSection(
      double radius_m,
      double chord_m,
      double twist_rad,
      String airfoilName,
      List<PolarPoint> polar) {
    public BladeSection {
      polar = List.copyOf(polar);
    }
  }

  /** A row of an airfoil table. */
  public record PolarPoint(double alpha_rad, double cl, double cd, OptionalDouble cm) {}

  /** What an upright rotor has besides. */
  public record Upright(
      double bottomAboveTop_m,
      double height_m,
      double shaftOutside_m,
      double shaftWall_m,
      double shaftLength_m,
      double bladeLength_m,
      double bladeChord_m,
      double bladeThicknessRatio,
      String bladeShape,
      int strutsPerBlade,
      double strutLength_m,
      double strutChord_m,
      double strutMass_kg,
      String topHeld) {}
}
