package org.mastwright.report;

import java.util.List;
import org.mastwright.units.UnitSystem;
import org.mastwright.working.Derivation;
import org.mastwright.working.Step;

/**
 * A step of the calculation, set as XHTML.
 *
 * @param symbol of the result
 * @param formula in symbols, or the words of a given value
 * @param numbers the formula with its numbers; blank for a given value
 * @param source clause and status
 */
public record StepView(
    String symbol, String formula, String numbers, String result, boolean given, String source) {
  static StepView of(Step step, UnitSystem units) {
    return new StepView(
        Typeset.symbol(step.symbol()),
        Typeset.formula(step),
        Typeset.numbers(step, units),
        Print.symbols(step.result(units)),
        !step.isCalculated(),
        step.clause().citeWithStatus());
  }

  static List<StepView> of(List<Step> steps, UnitSystem units) {
    return steps.stream().map(s -> of(s, units)).toList();
  }

  /** Steps under a heading. */
  public record Block(String heading, String words, List<StepView> steps) {
    static Block of(Derivation d, UnitSystem units) {
      return new Block(d.heading(), d.words(), StepView.of(d.steps(), units));
    }
  }
}
