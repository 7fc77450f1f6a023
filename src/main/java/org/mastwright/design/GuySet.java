package org.mastwright.design;

import java.util.List;
import java.util.OptionalDouble;

/**
 * The guys of one level.
 *
 * @param number from 1 at the lowest
 * @param along_m of the attachment along the mast from its foot
 * @param arm_m of the attachment off the mast axis, towards the anchor
 * @param tensionAtAnchor true when the tension was read at the anchor end, false at the mast
 * @param toleranceFraction of the setting
 * @param settingGuy index in {@code guys} of the guy that was set
 * @param upright whether the other guys take what keeps the mast plumb in still air
 */
public record GuySet(
    int number,
    double along_m,
    double arm_m,
    Rope rope,
    EndFitting ends,
    List<Hardware> hardware,
    Tension tension,
    boolean tensionAtAnchor,
    double toleranceFraction,
    int settingGuy,
    boolean upright,
    double thermalExpansion_perK,
    List<Guy> guys) {
  public GuySet {
    hardware = List.copyOf(hardware);
    guys = List.copyOf(guys);
    if (guys.size() < 2 || settingGuy < 0 || settingGuy >= guys.size()) {
      throw new IllegalArgumentException("guy set " + number + ": guys " + guys.size());
    }
  }

  /** The same level with its rope at one end of the band of its modulus. */
  public GuySet withModulusAt(int sign) {
    Rope r = rope;
    Rope other =
        new Rope(
            r.label(),
            r.diameter_m(),
            r.area_m2(),
            r.modulus_Pa() * (1 + sign * r.modulusBandFraction()),
            0,
            r.mass_kgpm(),
            r.breaking_N(),
            r.source());
    return new GuySet(
        number,
        along_m,
        arm_m,
        other,
        ends,
        hardware,
        tension,
        tensionAtAnchor,
        toleranceFraction,
        settingGuy,
        upright,
        thermalExpansion_perK,
        guys);
  }

  /**
   * One guy.
   *
   * @param azimuth_rad true bearing from the mast axis to its anchor eye
   * @param anchor index into {@link Ground#anchors()}
   */
  public record Guy(double azimuth_rad, int anchor) {}

  /**
   * A wire rope or strand.
   *
   * @param breaking_N breaking force
   * @param area_m2 of metal
   * @param modulusBandFraction uncertainty of the modulus, 0.15 where it was taken from the kind
   */
  public record Rope(
      String label,
      double diameter_m,
      double area_m2,
      double modulus_Pa,
      double modulusBandFraction,
      double mass_kgpm,
      double breaking_N,
      String source) {}

  /** How the ends are made; the efficiency is on the breaking force. */
  public record EndFitting(String kind, int count, double efficiencyRatio, boolean assumed) {}

  /**
   * A piece in the line of the guy.
   *
   * @param workingLoad_N with its {@code safetyFactor}; or {@code breaking_N}
   */
  public record Hardware(
      String what,
      OptionalDouble workingLoad_N,
      OptionalDouble safetyFactor,
      OptionalDouble breaking_N) {
    /** The load it breaks at, when that can be told. */
    public OptionalDouble ultimate_N() {
      if (breaking_N.isPresent()) {
        return breaking_N;
      }
      return workingLoad_N.isPresent() && safetyFactor.isPresent()
          ? OptionalDouble.of(workingLoad_N.getAsDouble() * safetyFactor.getAsDouble())
          : OptionalDouble.empty();
    }
  }

  /** How the tension was stated; everything but a force is at the anchor end. */
  public sealed interface Tension {
    /** One value for the set, or one per guy in the order of the guys. */
    record Force(List<Double> values_N) implements Tension {
      public Force {
        values_N = List.copyOf(values_N);
      }
    }

    /** A share of the breaking force. */
    record OfBreaking(double fraction) implements Tension {}

    /** Sag below the chord at mid-span, square to the chord. */
    record Sag(double sag_m) implements Tension {}

    /** A pulse sent along the guy comes back {@code returns} times in {@code time_s}. */
    record Pulse(int returns, double time_s) implements Tension {}

    /** Snug: 2 % of breaking, run also at 0.5 % and 5 %. */
    record Snug() implements Tension {}
  }
}
