package org.mastwright.design;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The machine on top.
 *
 * @param mass_kg all above the yaw bearing, rotor, head and tail
 * @param greatestRotorShareFraction upper end of the rotor's share of the mass when it was not
 *     stated; equal to the share otherwise
 * @param survivalWind_mps as stated; echoed, never a load
 * @param controlledBy how the speed is kept
 * @param parked which states of the stopped machine count in a storm
 * @param margin required distance of a natural frequency from an excitation, outside the band
 */
public record Turbine(
    String source,
    String certifiedClass,
    OptionalDouble survivalWind_mps,
    double mass_kg,
    Rotor rotor,
    Head head,
    Optional<Tail> tail,
    Rated rated,
    RotorSpeed rotorSpeed,
    OptionalDouble cutIn_mps,
    OptionalDouble cutOut_mps,
    DesignPoint design,
    Yaw yaw,
    OptionalDouble brakeTorque_Nm,
    double shortCircuitFactor,
    Control controlledBy,
    Optional<Furl> furl,
    Parked parked,
    double imbalanceGrade_mps,
    Optional<StatedThrust> statedThrust,
    List<Integer> extraOrders,
    double marginRatio) {
  public Turbine {
    extraOrders = List.copyOf(extraOrders);
  }

  /**
   * What is above the mast top besides the rotor.
   *
   * @param mass_kg of the head without rotor and tail
   * @param hubAboveTop_m of the rotor centre above the mast top
   * @param centreAboveTop_m of the centre of all above the yaw bearing
   * @param centreAhead_m of the same, positive towards the rotor
   * @param inertiaAboutTowerAxis_kgm2 of all above the yaw bearing, about a vertical axis through
   *     its own centre
   * @param inertiaTransverse_kgm2 of the same about any horizontal axis through its own centre
   */
  public record Head(
      double mass_kg,
      double hubAboveTop_m,
      double centreAboveTop_m,
      double centreAhead_m,
      double sideArea_m2,
      double inertiaAboutTowerAxis_kgm2,
      double inertiaTransverse_kgm2) {}

  /** The vane: its arm is from the tower axis to the centre of its area. */
  public record Tail(double area_m2, double arm_m, double mass_kg) {}

  /**
   * The rated point; {@code power_W} at the shaft or at the terminals as {@code electrical} says.
   */
  public record Rated(double power_W, boolean electrical, double wind_mps, double omega_radps) {}

  /**
   * The speeds the rotor turns at.
   *
   * @param skip bands the controller does not dwell in, as (from, to) in rad/s
   */
  public record RotorSpeed(
      double lowest_radps,
      double highest_radps,
      OptionalDouble trip_radps,
      OptionalDouble runaway_radps,
      List<Band> skip) {
    public RotorSpeed {
      skip = List.copyOf(skip);
    }
  }

  /** A band of rotor speed. */
  public record Band(double from_radps, double to_radps) {}

  /** Power and speed at 1.4 times the annual mean wind (IEC 61400-2 design values). */
  public record DesignPoint(double power_W, double omega_radps) {}

  /** How it faces the wind, and how fast it turns to it when that was stated. */
  public record Yaw(String kind, OptionalDouble rate_radps) {}

  /** How the rotor is kept from overspeed. */
  public enum Control {
    FIXED_SPEED_STALL("fixed-speed-stall"),
    FURLING("furling"),
    PITCH_TO_FEATHER("pitch-to-feather"),
    BRAKE_ONLY("brake-only"),
    NONE("none");

    private final String key;

    Control(String key) {
      this.key = key;
    }

    /** As typed. */
    public String key() {
      return key;
    }
  }

  /** The wind at which furling begins and is complete. */
  public record Furl(double begins_mps, double complete_mps, String how) {}

  /** The state of the stopped machine in a storm. */
  public enum Parked {
    STOPPED,
    SPINNING,
    /** Nobody said: both are run, the worse counts. */
    BOTH
  }

  /** A thrust stated by the maker, used beside ours, the greater counting. */
  public record StatedThrust(String source, List<Point> curve) {
    public StatedThrust {
      curve = List.copyOf(curve);
    }

    /** One row of the table. */
    public record Point(double wind_mps, double thrust_N) {}
  }
}
