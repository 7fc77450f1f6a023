package org.mastwright.design;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The wind of the site.
 *
 * @param stated a measured or mapped speed, or an IEC class
 * @param terrain of the site: EN 0, I, II, III, IV or ASCE B, C, D; as typed
 */
public record SiteWind(
    Stated stated, Optional<AnnualMean> annualMean, String terrain, Topography topography) {

  /** How the extreme wind is stated. */
  public sealed interface Stated {
    /**
     * A speed: it always carries averaging time, height, terrain and level or return period.
     *
     * @param terrain where it was measured; {@code open} when not stated
     * @param source as typed, for the report
     */
    record Speed(
        double speed_mps,
        Averaging averaging,
        Level level,
        double height_m,
        String terrain,
        String source)
        implements Stated {}

    /** IEC 61400-2 class I, II, III, IV: reference wind 50, 42.5, 37.5 or 30 m/s. */
    record IecClass(String name, double referenceSpeed_mps) implements Stated {}
  }

  /** Over what time a speed is averaged. */
  public enum Averaging {
    GUST_3_S("3 s", 3),
    ONE_MINUTE("1 min", 60),
    TEN_MINUTES("10 min", 600),
    ONE_HOUR("1 h", 3600),
    /** The time in which a mile of wind passes: 1609.344 m over the speed itself. */
    FASTEST_MILE("fastest-mile", 0);

    private final String key;
    private final double seconds;

    Averaging(String key, double seconds) {
      this.key = key;
      this.seconds = seconds;
    }

    /** As typed. */
    public String key() {
      return key;
    }

    /** Averaging time; for the fastest mile it depends on the speed. */
    public double time_s(double speed_mps) {
      return this == FASTEST_MILE ? 1609.344 / speed_mps : seconds;
    }
  }

  /** How rare a speed is. */
  public sealed interface Level {
    /** Strength-level map speed of a risk category I, II, III or IV: 300, 700, 1700, 3000 years. */
    record Ultimate(String riskCategory, double returnPeriod_yr) implements Level {}

    /** Mean time between exceedances; a nominal speed is 50 years. */
    record ReturnPeriod(double returnPeriod_yr) implements Level {}

    /** Years between exceedances. */
    double returnPeriod_yr();
  }

  /** Long-term mean speed and the height it holds at. */
  public record AnnualMean(double speed_mps, double height_m) {}

  /** The lie of the land; one kind of factor, never both. */
  public sealed interface Topography {
    /** Nobody said: worked out flat, and the verdict is at most incomplete. */
    record NotStated() implements Topography {}

    /** Stated flat. */
    record Flat() implements Topography {}

    /** Acts on speed (EN). */
    record SpeedFactor(double speedFactor) implements Topography {}

    /** Acts on pressure (ASCE). */
    record PressureFactor(double pressureFactor) implements Topography {}

    /** A hill, ridge or escarpment to be worked out by the basis. */
    record Hill(String kind, double height_m, double halfLength_m, double upwindDistance_m)
        implements Topography {}

    /** By sector of the wind's origin; flat outside the sectors given. */
    record BySector(List<Sector> sectors) implements Topography {
      public BySector {
        sectors = List.copyOf(sectors);
      }
    }

    /** Wind from {@code from_rad} clockwise to {@code to_rad}. */
    record Sector(
        double from_rad,
        double to_rad,
        OptionalDouble speedFactor,
        OptionalDouble pressureFactor) {}
  }
}
