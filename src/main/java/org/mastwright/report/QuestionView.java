package org.mastwright.report;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.mastwright.assess.Assessment;
import org.mastwright.assess.CaseResult;
import org.mastwright.assess.SpeedResult;
import org.mastwright.design.GuySet;
import org.mastwright.forces.GuyForces;
import org.mastwright.forces.LimitState;
import org.mastwright.forces.Response;
import org.mastwright.units.Numbers;
import org.mastwright.units.Unit;
import org.mastwright.working.Question;

/**
 * The checks of one question, with what belongs beside them.
 *
 * @param chapter id of its heading
 * @param summary its checks in one table
 */
public record QuestionView(
    String chapter,
    String question,
    Table summary,
    List<Figure> figures,
    List<Table> tables,
    List<String> remarks,
    List<CheckView> checks) {

  static List<QuestionView> of(Assessment a, Print print, Map<String, String> titles) {
    return Chapters.questions(a).stream().map(q -> of(q, a, print, titles)).toList();
  }

  private static QuestionView of(
      Question q, Assessment a, Print print, Map<String, String> titles) {
    List<CheckView> checks =
        a.checks().stream()
            .filter(c -> c.subject().question() == q)
            .map(c -> CheckView.of(c, titles, print.units()))
            .toList();
    Optional<SpeedResult> speeds = q == Question.ROTOR_SPEED ? a.speeds() : Optional.empty();
    return new QuestionView(
        Chapters.id(q),
        q.question(),
        summary(checks),
        speeds.map(s -> SpeedFigure.of(s, print)).stream().toList(),
        tables(q, a, print),
        speeds.map(SpeedResult::remarks).orElse(List.of()),
        checks);
  }

  private static Table summary(List<CheckView> checks) {
    return Table.of("Checks of this chapter")
        .words("check", checks.stream().map(CheckView::title).toList())
        .words("worst place", checks.stream().map(CheckView::where).toList())
        .numbers("used", checks.stream().map(CheckView::used).toList())
        .brief("answer", checks.stream().map(CheckView::answer).toList())
        .marked(checks.stream().map(c -> !c.style().equals("passes")).toList())
        .build();
  }

  private static List<Table> tables(Question q, Assessment a, Print print) {
    return switch (q) {
      case GUYS -> List.of(guys(a, print));
      case ROTOR_SPEED ->
          a.speeds().map(s -> List.of(windows(s), clear(s), bands(s))).orElse(List.of()).stream()
              .filter(Table::filled)
              .toList();
      default -> List.of();
    };
  }

  private static Table windows(SpeedResult s) {
    List<SpeedResult.Window> w = s.windowsToAvoid();
    return Table.of("Rotor speeds to avoid")
        .numbers("from, rpm", w.stream().map(x -> rpm(x.from_radps())).toList())
        .numbers("to, rpm", w.stream().map(x -> rpm(x.to_radps())).toList())
        .numbers(
            "frequency, Hz",
            w.stream().map(x -> hertz(x.least_Hz()) + " to " + hertz(x.greatest_Hz())).toList())
        .words("why", w.stream().map(SpeedResult.Window::why).toList())
        .build();
  }

  private static Table clear(SpeedResult s) {
    return Table.of("Clear ranges of rotor speed")
        .numbers("from, rpm", s.clear().stream().map(x -> rpm(x.from_radps())).toList())
        .numbers("to, rpm", s.clear().stream().map(x -> rpm(x.to_radps())).toList())
        .build();
  }

  private static Table bands(SpeedResult s) {
    List<SpeedResult.FrequencyBand> b = s.lines();
    return Table.of("Natural frequencies over the states considered")
        .numbers("mode", b.stream().map(x -> String.valueOf(x.mode())).toList())
        .words("shape", b.stream().map(SpeedResult.FrequencyBand::description).toList())
        .numbers("least, Hz", b.stream().map(x -> hertz(x.least_Hz())).toList())
        .numbers("greatest, Hz", b.stream().map(x -> hertz(x.greatest_Hz())).toList())
        .brief("counts", b.stream().map(x -> x.blocks() ? "yes" : "listed only").toList())
        .build();
  }

  private static String rpm(double speed_radps) {
    return Numbers.fixed(Unit.RPM.fromSi(speed_radps), 0);
  }

  private static String hertz(double frequency_Hz) {
    return Numbers.fixed(frequency_Hz, 2);
  }

  /** The greatest tension of each guy over all strength cases, with the case it comes from. */
  private static Table guys(Assessment a, Print print) {
    record Pulled(GuyForces guy, Response response) {}
    List<Pulled> worst = new ArrayList<>();
    List<Response> strength =
        a.cases().stream()
            .map(CaseResult::response)
            .filter(r -> r.mark().limitState() == LimitState.STRENGTH)
            .toList();
    for (GuySet set : a.design().tower().guys()) {
      for (int i = 0; i < set.guys().size(); i++) {
        int index = i;
        strength.stream()
            .flatMap(r -> r.guys().stream().map(g -> new Pulled(g, r)))
            .filter(p -> p.guy().set() == set.number() && p.guy().index() == index)
            .max(Comparator.comparingDouble(p -> p.guy().greatest_N()))
            .ifPresent(worst::add);
      }
    }
    return Table.of("Greatest tension of each guy, strength cases")
        .numbers("level", worst.stream().map(p -> String.valueOf(p.guy().set())).toList())
        .numbers("bearing", worst.stream().map(p -> Print.bearing(p.guy().azimuth_rad())).toList())
        .numbers(
            print.head("at the mast", Unit.KN),
            print.column(worst.stream().map(p -> p.guy().tensionAtMast_N()).toList(), Unit.KN))
        .numbers(
            print.head("at the anchor", Unit.KN),
            print.column(worst.stream().map(p -> p.guy().tensionAtAnchor_N()).toList(), Unit.KN))
        .brief("case", worst.stream().map(p -> p.response().mark().id()).toList())
        .build();
  }
}
