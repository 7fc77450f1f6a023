package org.mastwright.design;

import java.util.List;
import java.util.Optional;
import org.mastwright.units.UnitSystem;

/** One tower, whole: what stands in one tower file. */
public record Design(
    Project project,
    List<Paper> documents,
    Surroundings surroundings,
    Optional<Basis> basis,
    Optional<Site> site,
    Optional<Turbine> turbine,
    Tower tower,
    Ground ground,
    Optional<Raising> raising,
    List<CountedSwings> measured,
    Optional<Verification> verification) {
  public Design {
    documents = List.copyOf(documents);
    measured = List.copyOf(measured);
  }

  /** The same with another tower. */
  public Design withTower(Tower other) {
    return new Design(
        project,
        documents,
        surroundings,
        basis,
        site,
        turbine,
        other,
        ground,
        raising,
        measured,
        verification);
  }

  /** The same tower, printed in other units. */
  public Design withUnits(UnitSystem units) {
    return new Design(
        project.withUnits(units),
        documents,
        surroundings,
        basis,
        site,
        turbine,
        tower,
        ground,
        raising,
        measured,
        verification);
  }

  /**
   * A paper the calculation relies on.
   *
   * @param usedFor the part of the file that was taken from it
   */
  public record Paper(String what, String by, String date, String usedFor) {}

  /**
   * A frequency counted on the standing tower.
   *
   * @param what mast or guy; {@code state} such as no-rotor; {@code direction} as typed
   * @param frequency_Hz swings over time
   */
  public record CountedSwings(String what, String state, String direction, double frequency_Hz) {}
}
