package org.mastwright.report;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.mastwright.assess.Assessment;
import org.mastwright.assess.BucklingResult;
import org.mastwright.assess.CaseResult;
import org.mastwright.assess.SelfCheck;
import org.mastwright.forces.Response;
import org.mastwright.units.Numbers;
import org.mastwright.units.Unit;

/**
 * How the tower was modelled and whether it balances.
 *
 * @param facts of the model
 * @param balance greatest unbalance, residual, difference of the second method
 * @param comparisons each with its two numbers
 * @param limits factors on the variable actions at which equilibrium is lost
 * @param buckling linear factors, for information
 */
public record ModelView(
    List<Fact> facts, List<Fact> balance, Table comparisons, Table limits, Table buckling) {

  /** The lowest factors say what there is to say. */
  private static final int MOST_LIMITS = 12;

  static ModelView of(Assessment a, Print print) {
    return new ModelView(
        facts(a, print), balance(a), comparisons(a.selfCheck()), limits(a), buckling(a));
  }

  private static List<Fact> facts(Assessment a, Print print) {
    Optional<Response> first = a.cases().stream().findFirst().map(CaseResult::response);
    return List.of(
        new Fact("Mast length", print.of(a.design().tower().length_m(), Unit.M)),
        new Fact("Tubes", String.valueOf(a.design().tower().tubes().size())),
        new Fact(
            "Sections looked at",
            first.map(r -> String.valueOf(r.stations().size())).orElse("none")),
        new Fact("Guys", first.map(r -> String.valueOf(r.guys().size())).orElse("none")),
        new Fact("Cases solved", String.valueOf(a.cases().size())),
        new Fact(
            "Most iterations",
            a.cases().stream()
                .map(c -> c.response().iterations())
                .max(Comparator.naturalOrder())
                .map(String::valueOf)
                .orElse("none")));
  }

  private static List<Fact> balance(Assessment a) {
    SelfCheck s = a.selfCheck();
    long lost = a.cases().stream().filter(c -> !c.response().converged()).count();
    return List.of(
        new Fact(
            "Greatest unbalanced force over the greatest applied",
            Numbers.significant(s.equilibriumRatio(), 2)),
        new Fact("Greatest residual of the iteration", Numbers.significant(s.residualRatio(), 2)),
        new Fact(
            "Greatest difference of a second method", Unit.PERCENT.print(s.secondMethodRatio(), 2)),
        new Fact("Count of pivots proves that no frequency was missed", Print.yesNo(s.modeCount())),
        new Fact("Cases without equilibrium under full load", String.valueOf(lost)));
  }

  private static Table comparisons(SelfCheck s) {
    List<SelfCheck.Row> rows = s.rows();
    return Table.of("The same quantity by two routes, in SI units")
        .words("quantity", rows.stream().map(SelfCheck.Row::what).toList())
        .words("first route", rows.stream().map(SelfCheck.Row::first).toList())
        .numbers("value", rows.stream().map(r -> Numbers.significant(r.firstSi(), 5)).toList())
        .words("second route", rows.stream().map(SelfCheck.Row::second).toList())
        .numbers("value", rows.stream().map(r -> Numbers.significant(r.secondSi(), 5)).toList())
        .brief("unit", rows.stream().map(r -> Print.symbols(" " + r.unit()).strip()).toList())
        .build();
  }

  private static Table limits(Assessment a) {
    List<Response> searched = new ArrayList<>();
    a.cases().stream()
        .map(CaseResult::response)
        .filter(r -> r.limit().isPresent() || !r.converged())
        .forEach(searched::add);
    int found = searched.size();
    searched.sort(Comparator.comparingDouble(ModelView::factorOf));
    searched.subList(found < MOST_LIMITS ? found : MOST_LIMITS, found).clear();
    String which = found > MOST_LIMITS ? ", the " + MOST_LIMITS + " lowest of " + found : "";
    return Table.of("How far the variable loads can grow before equilibrium is lost" + which)
        .brief("case", searched.stream().map(r -> r.mark().id()).toList())
        .words("what happens", searched.stream().map(r -> r.mark().title()).toList())
        .numbers("factor", searched.stream().map(ModelView::factor).toList())
        .words("meaning", searched.stream().map(ModelView::meaning).toList())
        .build();
  }

  private static String factor(Response r) {
    return Print.factor(factorOf(r));
  }

  private static double factorOf(Response r) {
    return r.limit().map(Response.LimitPoint::factor).orElse(r.reachedFactor());
  }

  private static String meaning(Response r) {
    if (!r.converged()) {
      return "no equilibrium under the full load";
    }
    return r.limit().map(l -> l.lost().isPresent()).orElse(true)
        ? "none beyond it"
        : "still in equilibrium where the search ended";
  }

  private static Table buckling(Assessment a) {
    List<BucklingResult> rows = a.buckling();
    return Table.of("Linear buckling, for information and no proof")
        .brief("case", rows.stream().map(BucklingResult::caseId).toList())
        .numbers("factor", rows.stream().map(b -> Print.factor(b.criticalFactor())).toList())
        .build();
  }
}
