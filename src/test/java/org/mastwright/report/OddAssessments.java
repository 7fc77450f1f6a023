package org.mastwright.report;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.mastwright.assess.Assessment;
import org.mastwright.assess.Outline;
import org.mastwright.assess.Reactions;
import org.mastwright.assess.SelfCheck;
import org.mastwright.assess.Verdict;
import org.mastwright.design.Design;
import org.mastwright.design.Ground;
import org.mastwright.design.GuySet;
import org.mastwright.design.Project;
import org.mastwright.design.Raising;
import org.mastwright.design.Surroundings;
import org.mastwright.units.Unit;
import org.mastwright.units.UnitSystem;
import org.mastwright.working.Check;
import org.mastwright.working.Clause;
import org.mastwright.working.DefaultTaken;
import org.mastwright.working.Finding;
import org.mastwright.working.Question;
import org.mastwright.working.Status;
import org.mastwright.working.Step;
import org.mastwright.working.Subject;

/** Assessments at the two ends: as full, and as empty, as they come. */
final class OddAssessments {
  private static final String LONG =
      "a long remark that a careful person typed into the tower file, because it seemed to matter"
          + " and there was nowhere else to put it, with an Überlange_Zeichenkette_ohne_Leerzeichen"
          + "_die_nicht_umbricht_und_doch_irgendwo_stehen_muss at its end";

  private OddAssessments() {}

  /** Long words everywhere, every question asked, more open points than the first page holds. */
  static Assessment crowded() {
    Project project =
        new Project(
            LONG,
            "REF-2031-000117-A",
            LONG,
            LONG,
            LONG,
            LONG,
            Optional.empty(),
            "B12",
            LONG,
            LONG,
            Project.Sheet.LETTER,
            UnitSystem.BOTH,
            0);
    Design d = SampleDesigns.guyed(project);
    Design raised =
        new Design(
            d.project(),
            d.documents(),
            d.surroundings(),
            d.basis(),
            d.site(),
            d.turbine(),
            d.tower(),
            d.ground(),
            Optional.of(raising(d)),
            List.of(),
            Optional.empty());
    Assessment a = SampleAssessments.of(raised, Verdict.FAIL);
    List<Check> checks = new ArrayList<>(a.checks());
    for (Question question : Question.values()) {
      checks.add(limit("long-" + question.ordinal(), question, 60e3 + question.ordinal()));
    }
    List<Finding> findings = new ArrayList<>(a.findings());
    List<DefaultTaken> defaults = new ArrayList<>(a.defaults());
    for (int i = 0; i < 40; i++) {
      findings.add(Finding.at("open-" + i, Finding.Severity.OPEN_POINT, "key." + i, LONG, LONG));
      defaults.add(
          new DefaultTaken(
              "tower.tubes[" + i + "].steel.yield", LONG, LONG, DefaultTaken.Side.UNKNOWN));
    }
    return new Assessment(
        a.version(),
        a.input(),
        raised,
        defaults,
        findings,
        a.verdict(),
        checks,
        a.derivations(),
        a.combinations(),
        a.cases(),
        a.envelope(),
        a.reactions(),
        a.modes(),
        a.buckling(),
        a.rotor(),
        a.speeds(),
        a.selfCheck(),
        a.outline(),
        a.handCheck());
  }

  private static Raising raising(Design d) {
    GuySet.Rope rope = d.tower().guys().get(0).rope();
    return new Raising(
        new Raising.Hinge(0.23, 0.08, 0.019, "A36"),
        new Raising.GinPole(7.3, d.tower().tubes().get(0), true),
        List.of(),
        new Raising.Haul(rope, 2, 0.95, "winch"),
        Optional.empty(),
        List.of(),
        "east",
        "rotor",
        OptionalDouble.empty());
  }

  private static Check limit(String id, Question question, double demand_N) {
    Clause clause =
        new Clause(
            "Guidelines with a very long name for small machines",
            "1999",
            "chapter 7, section 4, table 12, note c and the text below it",
            Status.RECALLED);
    Step demand = Step.given("F_Ed", LONG, demand_N, Unit.KN, clause);
    Step capacity = Step.given("F_Rd", LONG, 50e3, Unit.KN, clause);
    return new Check.Limit(
        new Subject(id, "Does it hold, " + LONG + "?", question, LONG, "I1-225-lo", LONG),
        clause,
        demand,
        capacity,
        List.of(),
        List.of(Finding.of("f", Finding.Severity.NOTE, LONG, LONG)));
  }

  /** A verification file: no site, no machine, no date, hardly a name. */
  static Assessment bare() {
    Project project =
        new Project(
            "",
            "",
            "",
            "",
            "",
            "",
            Optional.empty(),
            "",
            "",
            "",
            Project.Sheet.A4,
            UnitSystem.SI,
            0);
    Design d = SampleDesigns.pole(project);
    Design bare =
        new Design(
            project,
            List.of(),
            Surroundings.none(),
            Optional.empty(),
            Optional.empty(),
            Optional.empty(),
            d.tower(),
            new Ground(List.of(), Optional.empty()),
            Optional.empty(),
            List.of(),
            Optional.empty());
    OptionalDouble none = OptionalDouble.empty();
    return new Assessment(
        "1.0",
        SampleAssessments.INPUT,
        bare,
        List.of(),
        List.of(),
        Verdict.VERIFICATION,
        List.of(),
        List.of(),
        List.of(),
        List.of(),
        List.of(),
        new Reactions(List.of(), List.of()),
        List.of(),
        List.of(),
        Optional.empty(),
        Optional.empty(),
        new SelfCheck(0, 0, false, 0, List.of()),
        new Outline(12.3, none, none, none, none, 12.3),
        Optional.empty());
  }

  /** Checks at and beside their limits with the words they must get. */
  static Map<Check, String> edges() {
    Map<Check, String> edges = new LinkedHashMap<>();
    edges.put(limit("edge-a", Question.TUBE, 44_900), "passes  0.90");
    edges.put(limit("edge-b", Question.TUBE, 45_000), "passes, close  0.90");
    edges.put(limit("edge-c", Question.TUBE, 50_000), "passes, close  1.00");
    edges.put(limit("edge-d", Question.TUBE, 50_000.1), "FAILS  1.01");
    return edges;
  }
}
