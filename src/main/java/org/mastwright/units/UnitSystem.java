package org.mastwright.units;

/** Which units are printed. With {@code BOTH}, SI first and American in brackets. */
public enum UnitSystem {
  SI,
  US,
  BOTH;

  /** A value printed for this reader, {@code unit} being the metric unit of its place. */
  public String print(double si, Unit unit, int significantDigits) {
    Unit american = unit.american().orElse(unit);
    if (this == SI || american.equals(unit)) {
      return unit.print(si, significantDigits);
    }
    String us = american.print(si, significantDigits);
    return this == US ? us : unit.print(si, significantDigits) + " (" + us + ")";
  }

  /** Three significant digits. */
  public String print(double si, Unit unit) {
    return print(si, unit, 3);
  }
}
