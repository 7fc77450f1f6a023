package org.mastwright.design;

import java.time.LocalDate;
import java.util.Optional;
import org.mastwright.units.UnitSystem;

/**
 * Whose tower it is and how the paper looks.
 *
 * @param declination_rad magnetic north east of true north; zero when bearings are true
 */
public record Project(
    String title,
    String reference,
    String owner,
    String address,
    String parcel,
    String client,
    Optional<LocalDate> date,
    String revision,
    String preparedBy,
    String checkedBy,
    Sheet sheet,
    UnitSystem units,
    double declination_rad) {

  /** The same, printed in other units. */
  public Project withUnits(UnitSystem other) {
    return new Project(
        title,
        reference,
        owner,
        address,
        parcel,
        client,
        date,
        revision,
        preparedBy,
        checkedBy,
        sheet,
        other,
        declination_rad);
  }

  /** The paper size of every page. */
  public enum Sheet {
    A4,
    LETTER
  }
}
