package org.mastwright.report;

import java.util.ArrayList;
import java.util.List;
import java.util.function.ToDoubleFunction;
import java.util.stream.Collectors;
import org.mastwright.assess.Assessment;
import org.mastwright.assess.Reactions;
import org.mastwright.forces.BaseReaction;
import org.mastwright.forces.Vector3;
import org.mastwright.units.Unit;
import org.mastwright.units.UnitSystem;

/** What the ground must hold, whatever the reader's units in both systems. */
public record ReactionsView(List<Table> tables) {
  static ReactionsView of(Assessment a) {
    List<Table> tables = new ArrayList<>();
    for (UnitSystem units : List.of(UnitSystem.SI, UnitSystem.US)) {
      Print print = new Print(units);
      String words = units == UnitSystem.SI ? "SI units" : "US units";
      List<Reactions.FootReaction> foot = a.reactions().foot();
      tables.add(foot("Foot, factored, " + words, foot, print, true));
      tables.add(foot("Foot, without factors, " + words, foot, print, false));
      tables.add(anchors("Anchors, " + words, a.reactions().anchors(), print));
    }
    return new ReactionsView(tables.stream().filter(Table::filled).toList());
  }

  private static Table foot(
      String caption, List<Reactions.FootReaction> rows, Print print, boolean factored) {
    List<BaseReaction> b =
        rows.stream().map(r -> factored ? r.factored() : r.unfactored()).toList();
    return Table.of(caption)
        .words("notable for", rows.stream().map(Reactions.FootReaction::what).toList())
        .numbers(print.head("up", Unit.KN), column(b, BaseReaction::up_N, Unit.KN, print))
        .numbers(print.head("east", Unit.KN), column(b, BaseReaction::east_N, Unit.KN, print))
        .numbers(print.head("north", Unit.KN), column(b, BaseReaction::north_N, Unit.KN, print))
        .numbers(
            print.head("moment", Unit.KNM), column(b, BaseReaction::moment_Nm, Unit.KNM, print))
        .numbers(
            print.head("torque", Unit.KNM), column(b, BaseReaction::torque_Nm, Unit.KNM, print))
        .brief("case", rows.stream().map(Reactions.FootReaction::caseId).toList())
        .build();
  }

  private static <T> List<String> column(
      List<T> rows, ToDoubleFunction<T> value, Unit unit, Print print) {
    return print.column(rows.stream().map(r -> (Double) value.applyAsDouble(r)).toList(), unit);
  }

  private static Table anchors(String caption, List<Reactions.AnchorPull> rows, Print print) {
    List<Vector3> factored = rows.stream().map(Reactions.AnchorPull::factored_N).toList();
    List<Vector3> plain = rows.stream().map(Reactions.AnchorPull::unfactored_N).toList();
    return Table.of(caption)
        .words("anchor", rows.stream().map(Reactions.AnchorPull::name).toList())
        .words("guys", rows.stream().map(ReactionsView::guys).toList())
        .numbers(print.head("pull", Unit.KN), column(factored, Vector3::length, Unit.KN, print))
        .numbers(print.head("level", Unit.KN), column(factored, Vector3::level, Unit.KN, print))
        .numbers(print.head("up", Unit.KN), column(factored, Vector3::up, Unit.KN, print))
        .numbers("towards", factored.stream().map(v -> Print.bearing(v.bearing_rad())).toList())
        .brief("case", rows.stream().map(Reactions.AnchorPull::caseId).toList())
        .numbers(
            print.head("pull without factors", Unit.KN),
            column(plain, Vector3::length, Unit.KN, print))
        .build();
  }

  private static String guys(Reactions.AnchorPull pull) {
    return "level "
        + pull.guys().stream()
            .map(g -> String.valueOf(g.set()))
            .distinct()
            .collect(Collectors.joining(", "));
  }
}
