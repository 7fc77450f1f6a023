package org.mastwright.design;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Where it stands.
 *
 * @param altitude_m above sea level; empty when not stated
 * @param airDensity_kgpm3 as stated; empty for the basis' own, lowered only by a stated altitude
 */
public record Site(
    OptionalDouble altitude_m,
    OptionalDouble airDensity_kgpm3,
    SiteWind wind,
    Ice ice,
    Temperature temperature,
    Optional<Soil> soil,
    Optional<Seismic> seismic) {

  /** Absolute temperatures: when the guys are set, the lowest and the highest expected. */
  public record Temperature(double setting_K, double lowest_K, double highest_K) {}

  /** Ice, or that there is none, or that nobody said. */
  public sealed interface Ice {
    /** Nobody said: calculated without, and the verdict is at most incomplete. */
    record NotStated() implements Ice {}

    /** Stated: no ice here. */
    record None() implements Ice {}

    /**
     * A uniform thickness.
     *
     * @param oneSidedFraction share of the mass on the iced side; 0 for all round
     */
    record Thickness(
        Kind kind, double thickness_m, Optional<WithWind> withWind, double oneSidedFraction)
        implements Ice {}

    /** An ISO 12494 class such as G3 or R4. */
    record IsoClass(String icingClass, Optional<WithWind> withWind, double oneSidedFraction)
        implements Ice {}

    /** What the ice is. */
    enum Kind {
      GLAZE,
      RIME
    }

    /** The wind that blows with ice. */
    sealed interface WithWind {
      /** A stated speed with its averaging time. */
      record Speed(double speed_mps, SiteWind.Averaging averaging) implements WithWind {}

      /** A factor on pressure. */
      record PressureFactor(double pressureFactor) implements WithWind {}

      /** A factor on speed. */
      record SpeedFactor(double speedFactor) implements WithWind {}
    }
  }

  /**
   * The ground.
   *
   * @param source how it is known: assumed, felt or report
   * @param soilClass as in the tower file, such as {@code clay-firm}; blank when not stated
   */
  public record Soil(
      String source,
      String soilClass,
      boolean wet,
      OptionalDouble bearing_Pa,
      String bearingIs,
      OptionalDouble lateralBearing_Papm,
      OptionalDouble frictionAngle_rad,
      OptionalDouble undrainedStrength_Pa,
      OptionalDouble unitWeight_Npm3,
      OptionalDouble waterLevel_m,
      OptionalDouble frostDepth_m,
      List<Layer> layers) {
    public Soil {
      layers = List.copyOf(layers);
    }

    /** A layer from the surface down, to {@code bottom_m} below ground. */
    public record Layer(
        double bottom_m,
        String soilClass,
        OptionalDouble frictionAngle_rad,
        OptionalDouble undrainedStrength_Pa,
        OptionalDouble unitWeight_Npm3) {}
  }

  /** Design earthquake: spectral accelerations (ASCE) or plateau and corner period (EN). */
  public record Seismic(
      OptionalDouble sds_mps2,
      OptionalDouble sd1_mps2,
      double importanceFactor,
      OptionalDouble plateau_mps2,
      OptionalDouble cornerPeriod_s,
      String groundType) {}
}
