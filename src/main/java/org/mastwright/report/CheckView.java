package org.mastwright.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.mastwright.units.Numbers;
import org.mastwright.units.UnitSystem;
import org.mastwright.working.Check;
import org.mastwright.working.Finding;
import org.mastwright.working.Step;

/**
 * A check as it is printed.
 *
 * @param used utilisation rounded up, or a dash
 * @param answer the outcome in words
 * @param style of the outcome: fails, open, passes
 * @param comparison demand and capacity in one sentence; blank when not assessed
 * @param reason why it was not assessed; blank otherwise
 */
public record CheckView(
    String id,
    String title,
    String where,
    String loadCase,
    String clause,
    String used,
    String answer,
    String style,
    List<StepView> steps,
    String comparison,
    String reason,
    List<String> findings,
    String why) {
  /** A utilisation from here on is called close. */
  private static final double CLOSE_FROM = 0.90;

  static final String DASH = "–";

  /** The answer with the utilisation, where there is one. */
  public String badge() {
    return used.equals(DASH) ? answer : answer + "  " + used;
  }

  static CheckView of(Check check, Map<String, String> caseTitles, UnitSystem units) {
    return new CheckView(
        check.subject().id(),
        check.subject().title(),
        Print.symbols(check.subject().where()),
        caseWords(check.subject().caseId(), caseTitles),
        check.clause().citeWithStatus(),
        used(check),
        answer(check),
        style(check),
        StepView.of(steps(check), units),
        comparison(check, units),
        check instanceof Check.NotAssessed n ? Print.symbols(n.reason()) : "",
        check.findings().stream().map(CheckView::words).toList(),
        check.subject().why());
  }

  /** Id and title of a load case; blank where a check belongs to none. */
  static String caseWords(String id, Map<String, String> titles) {
    if (id.equals("-")) {
      return "";
    }
    return titles.containsKey(id) ? id + ", " + titles.get(id) : id;
  }

  static String used(Check check) {
    return check.utilisation().isPresent()
        ? Numbers.utilisation(check.utilisation().getAsDouble())
        : DASH;
  }

  static String answer(Check check) {
    return switch (check.outcome()) {
      case FAIL -> "FAILS";
      case NOT_ASSESSED -> "NOT CHECKED";
      case PASS -> check.utilisation().orElse(0) >= CLOSE_FROM ? "passes, close" : "passes";
    };
  }

  static String style(Check check) {
    return switch (check.outcome()) {
      case FAIL -> "fails";
      case NOT_ASSESSED -> "open";
      case PASS -> "passes";
    };
  }

  static String words(Finding finding) {
    String remedy = finding.remedy().isBlank() ? "" : " " + finding.remedy();
    return Print.symbols(finding.message() + remedy);
  }

  private static List<Step> steps(Check check) {
    List<Step> steps = new ArrayList<>(check.working());
    sides(check)
        .ifPresent(sides -> sides.stream().filter(s -> !steps.contains(s)).forEach(steps::add));
    return steps;
  }

  private static Optional<List<Step>> sides(Check check) {
    if (check instanceof Check.Limit l) {
      return Optional.of(List.of(l.demand(), l.capacity()));
    }
    if (check instanceof Check.Interaction i) {
      return Optional.of(List.of(i.sum()));
    }
    if (check instanceof Check.Separation s) {
      return Optional.of(List.of(s.required(), s.distance()));
    }
    return Optional.empty();
  }

  private static String comparison(Check check, UnitSystem units) {
    if (check instanceof Check.Limit l) {
      return compare("demand", l.demand(), "capacity", l.capacity(), check, units);
    }
    if (check instanceof Check.Separation s) {
      return compare("required", s.required(), "there is", s.distance(), check, units);
    }
    if (check instanceof Check.Interaction i) {
      return "sum " + Typeset.symbol(i.sum().symbol()) + " = " + used(check) + " against 1";
    }
    return "";
  }

  private static String compare(
      String first, Step a, String second, Step b, Check check, UnitSystem units) {
    return first
        + " "
        + side(a, units)
        + ", "
        + second
        + " "
        + side(b, units)
        + (check.utilisation().isPresent() ? ": used " + used(check) : "");
  }

  private static String side(Step step, UnitSystem units) {
    return Typeset.symbol(step.symbol()) + " = " + Print.symbols(step.result(units));
  }
}
