package org.mastwright.design;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What stands around the tower.
 *
 * @param overheadLine_m distance from the mast foot to the nearest power line
 * @param lowestBladeRule_m least height of the blade tips above ground asked for by a local rule
 */
public record Surroundings(
    List<LotLine> lotLines,
    OptionalDouble overheadLine_m,
    Optional<Runway> runway,
    Optional<Setback> setback,
    OptionalDouble lowestBladeRule_m) {
  public Surroundings {
    lotLines = List.copyOf(lotLines);
  }

  /** Nothing said. */
  public static Surroundings none() {
    return new Surroundings(
        List.of(),
        OptionalDouble.empty(),
        Optional.empty(),
        Optional.empty(),
        OptionalDouble.empty());
  }

  /** A boundary: bearing to it from the mast foot and distance. */
  public record LotLine(double bearing_rad, double distance_m) {}

  /** An airfield: distance and length of its runway. */
  public record Runway(double distance_m, double length_m) {}

  /** A local rule: total height times {@code multiplierFactor} from what {@code of} names. */
  public record Setback(String of, double multiplierFactor) {}
}
