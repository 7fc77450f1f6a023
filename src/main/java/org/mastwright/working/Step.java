package org.mastwright.working;

import java.util.List;
import org.mastwright.units.Unit;
import org.mastwright.units.UnitSystem;

/**
 * One evaluated formula, or one value given: everything the report needs to print a line.
 *
 * @param symbol of the result
 * @param template the formula with its variables in braces; for a value that is not calculated
 *     here, plain words that say where it comes from
 * @param inputs the variables' values, in SI; empty for a given value
 * @param si the result in SI
 * @param unit the metric unit the result is printed in
 * @param clause the source
 */
public record Step(
    String symbol, String template, List<Input> inputs, double si, Unit unit, Clause clause) {

  /**
   * A variable with its value.
   *
   * @param symbol as in the template
   * @param si the SI value
   * @param unit the metric unit it is printed in
   */
  public record Input(String symbol, double si, Unit unit) {
    /** The value printed in the reader's unit; both systems print the metric one here. */
    public String print(UnitSystem units) {
      Unit shown = units == UnitSystem.US ? unit.american().orElse(unit) : unit;
      String text = shown.print(si, 4);
      return si < 0 ? "(" + text + ")" : text;
    }
  }

  public Step {
    inputs = List.copyOf(inputs);
    if (!Double.isFinite(si)) {
      throw new ArithmeticException(symbol + " is not finite: " + template);
    }
  }

  /** A value that is given or comes from another calculation; {@code words} say from where. */
  public static Step given(String symbol, String words, double si, Unit unit, Clause clause) {
    return new Step(symbol, words, List.of(), si, unit, clause);
  }

  /** Whether a formula was evaluated, as against a value that came from elsewhere. */
  public boolean isCalculated() {
    return !inputs.isEmpty();
  }

  /** The formula in symbols, or the words of a given value. */
  public String formula() {
    return Formula.plain(template);
  }

  /** The formula with the numbers put in; blank for a given value. */
  public String substituted(UnitSystem units) {
    return inputs.isEmpty() ? "" : Formula.substituted(template, inputs, units);
  }

  /** The result in the reader's unit or units. */
  public String result(UnitSystem units) {
    return units.print(si, unit, 4);
  }

  /** {@code F_Rd = f_u·A/γ_M = 1570 MPa·28.30 mm²/1.500 = 29.62 kN [EN …, 7.2(1)]}. */
  public String line(UnitSystem units) {
    String middle = isCalculated() ? formula() + " = " + substituted(units) : "(" + template + ")";
    return symbol + " = " + middle + " = " + result(units) + " [" + clause.cite() + "]";
  }
}
