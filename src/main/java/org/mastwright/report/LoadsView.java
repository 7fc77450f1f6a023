package org.mastwright.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.mastwright.assess.Assessment;
import org.mastwright.assess.CaseResult;
import org.mastwright.assess.CombinationSummary;
import org.mastwright.forces.Response;
import org.mastwright.units.Unit;

/**
 * From wind to load cases.
 *
 * @param site wind, ice and ground in a line each
 * @param derivations each conversion with its steps
 * @param combinations with what they are made of
 * @param factors with their sources
 * @param governing the cases that decide a check
 * @param casesSolved how many cases were solved in all
 */
public record LoadsView(
    List<Fact> site,
    List<StepView.Block> derivations,
    Table combinations,
    Table factors,
    Table governing,
    int casesSolved) {

  static LoadsView of(Assessment a, Print print) {
    return new LoadsView(
        Basics.madeFor(a.design(), print),
        a.derivations().stream().map(d -> StepView.Block.of(d, print.units())).toList(),
        combinations(a.combinations()),
        factors(a.combinations()),
        governing(a, print),
        a.cases().size());
  }

  private static Table combinations(List<CombinationSummary> all) {
    return Table.of("Load combinations")
        .brief("code", all.stream().map(CombinationSummary::code).toList())
        .words("what it is for", all.stream().map(c -> c.title() + ". " + c.purpose()).toList())
        .words("made of", all.stream().map(CombinationSummary::composition).toList())
        .brief(
            "shows", all.stream().map(c -> c.limitState().name().toLowerCase(Locale.ROOT)).toList())
        .numbers("cases", all.stream().map(c -> String.valueOf(c.casesRun())).toList())
        .words("source", all.stream().map(c -> c.clause().citeWithStatus()).toList())
        .build();
  }

  private static Table factors(List<CombinationSummary> all) {
    List<String> codes = new ArrayList<>();
    List<String> names = new ArrayList<>();
    List<String> values = new ArrayList<>();
    List<String> sources = new ArrayList<>();
    for (CombinationSummary c : all) {
      for (CombinationSummary.FactorUsed f : c.factors()) {
        codes.add(c.code());
        names.add(f.name());
        values.add(Print.factor(f.valueFactor()));
        sources.add(f.clause().citeWithStatus());
      }
    }
    return Table.of("Partial factors")
        .brief("in", codes)
        .words("factor", names)
        .numbers("value", values)
        .words("source", sources)
        .build();
  }

  private static Table governing(Assessment a, Print print) {
    List<CaseResult> cases = a.cases().stream().filter(c -> !c.governs().isEmpty()).toList();
    List<Response> responses = cases.stream().map(CaseResult::response).toList();
    return Table.of("The cases that decide a check")
        .brief("case", responses.stream().map(r -> r.mark().id()).toList())
        .words("what happens", responses.stream().map(r -> r.mark().title()).toList())
        .numbers(
            print.head("push on the machine", Unit.KN),
            print.column(responses.stream().map(r -> r.mark().thrust_N()).toList(), Unit.KN))
        .numbers(
            print.head("top moves", Unit.MM),
            print.column(responses.stream().map(r -> r.top().level_m()).toList(), Unit.MM))
        .words("decides", cases.stream().map(c -> String.join(", ", c.governs())).toList())
        .build();
  }
}
