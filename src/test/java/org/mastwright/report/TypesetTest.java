package org.mastwright.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.mastwright.units.Unit;
import org.mastwright.units.UnitSystem;
import org.mastwright.working.Step;

class TypesetTest {
  @Test
  void aSymbolsTailIsASubscript() {
    assertEquals("<i>F</i><sub>Rd</sub>", Typeset.symbol("F_Rd"));
    assertEquals("<i>λ</i>", Typeset.symbol("λ"));
    assertEquals("<i>N</i><sub>b,Rd</sub>", Typeset.symbol("N_b_Rd"));
  }

  @Test
  void aQuotientIsAFraction() {
    Step step = SampleAssessments.RESISTANCE.at(1210e6, 24.5e-6, 1.1);
    String formula = Typeset.formula(step);
    assertTrue(formula.startsWith("<span class=\"frac\"><span class=\"over\"><i>f</i>"), formula);
    assertTrue(Typeset.numbers(step, UnitSystem.SI).contains("1210 MPa"));
  }

  @Test
  void aPowerOfAValueWithAUnitIsBracketed() {
    Step step = SampleAssessments.PRESSURE.at(1.225, 40);
    assertTrue(
        Typeset.numbers(step, UnitSystem.SI)
            .contains("<span class=\"v\">(40 m/s)</span><sup>2</sup>"),
        Typeset.numbers(step, UnitSystem.SI));
  }

  @Test
  void aBareNumberAndASymbolAreNotBracketed() {
    Step step = SampleAssessments.REDUCTION.at(1.2, 0.9);
    assertTrue(
        Typeset.numbers(step, UnitSystem.SI).contains("<span class=\"v\">1.200</span><sup>"));
    assertTrue(Typeset.formula(step).contains("<i>Φ</i><sup>2</sup>"), Typeset.formula(step));
  }

  @Test
  void aGivenValueKeepsItsWords() {
    Step given = Step.given("V", "a < b & c", 40, Unit.MPS, SampleAssessments.PRACTICE);
    assertEquals("a &lt; b &amp; c", Typeset.formula(given));
    assertEquals("", Typeset.numbers(given, UnitSystem.SI));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {
        "{a}·{b}/{c}; QUOTIENT",
        "{a} + {b}·{c} − 2; SUM",
        "√({a}² + {b}^0.5); ROOT",
        "min(1, 1/({a} + √({b}² − 1))); CALL",
        "|{a} − {b}·{c}|; BARS",
        "(1 − {a})^(3/2); POWER",
        "−{a}·cos(π·{b}/2); PRODUCT",
        "2·π·{a}; PRODUCT"
      })
  void theAgreedSignsAreUnderstood(String template, FormulaText.Kind kind) {
    assertEquals(Optional.of(kind), FormulaText.parse(template).map(FormulaText::kind), template);
  }

  @Test
  void whatIsNotUnderstoodStaysOnOneLine() {
    assertEquals(Optional.empty(), FormulaText.parse("{a} if {b} > 2"));
    assertEquals(Optional.empty(), FormulaText.parse("({a}"));
    assertEquals(Optional.empty(), FormulaText.parse(""));
  }

  @Test
  void aCloseUtilisationIsCalledClose() {
    OddAssessments.edges()
        .forEach(
            (check, words) ->
                assertEquals(words, CheckView.of(check, Map.of(), UnitSystem.SI).badge()));
  }
}
