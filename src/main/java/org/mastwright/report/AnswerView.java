package org.mastwright.report;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import org.mastwright.assess.Assessment;
import org.mastwright.assess.Outline;
import org.mastwright.assess.Verdict;
import org.mastwright.design.Project;
import org.mastwright.design.Surroundings;
import org.mastwright.units.Unit;
import org.mastwright.working.Check;
import org.mastwright.working.Finding;
import org.mastwright.working.Outcome;
import org.mastwright.working.Question;
import org.mastwright.working.Status;

/**
 * The first page.
 *
 * @param title cut to two lines; whole on the page of what was given
 * @param word the answer
 * @param counts how many checks fail, how many were not made
 * @param decides the governing check with its place; blank without one
 * @param decidesCase its load case in words; blank without one
 * @param open what is still open, one line each, cut to what the page holds
 */
public record AnswerView(
    String title,
    String word,
    String style,
    String counts,
    String decidesHead,
    String decides,
    String decidesUse,
    String decidesCase,
    List<Fact> who,
    List<Row> rows,
    List<Fact> madeFor,
    List<Line> open,
    List<Fact> around,
    Figure side) {
  private static final int OPEN_LINES = 4;
  private static final int LONGEST_LINE = 92;
  private static final int LONGEST_PLACE = 30;
  private static final int FULL_FROM = 11;
  private static final int LONGEST_TITLE = 90;

  /** A question with its worst answer; {@code letter} refers to the side view. */
  public record Row(
      String question,
      String letter,
      String place,
      String used,
      String answer,
      String style,
      String chapter) {}

  /** A line with the chapter that says more; blank when none does. */
  public record Line(String words, String chapter) {}

  /** Whether there is so much on the page that it has to be set closer. */
  public boolean full() {
    return rows.size() + open.size() > FULL_FROM;
  }

  static AnswerView of(Assessment a, Print print, Map<String, String> titles) {
    return new AnswerView(
        Print.shorten(Print.words(a.design().project().title()), LONGEST_TITLE),
        a.verdict().answer(),
        style(a.verdict()),
        counts(a),
        a.verdict() == Verdict.FAIL ? "DECIDES" : "MOST USED",
        a.governing().map(c -> decides(c)).orElse(""),
        a.governing().map(AnswerView::use).orElse(""),
        a.governing().map(c -> CheckView.caseWords(c.subject().caseId(), titles)).orElse(""),
        who(a.design().project()),
        rows(a),
        Basics.madeFor(a.design(), print),
        open(a),
        around(a, print),
        SideFigure.answer(a, print));
  }

  static String style(Verdict verdict) {
    return switch (verdict) {
      case FAIL -> "fails";
      case INCOMPLETE -> "open";
      case PASS, VERIFICATION -> "passes";
    };
  }

  private static String decides(Check check) {
    return Print.shorten(
        Print.symbols(check.subject().title() + " " + check.subject().where()), 120);
  }

  private static String use(Check check) {
    return check.utilisation().isPresent() ? "used " + CheckView.used(check) : "";
  }

  private static String counts(Assessment a) {
    long fail = count(a, Outcome.FAIL);
    long open = count(a, Outcome.NOT_ASSESSED);
    int points = a.findings(Finding.Severity.OPEN_POINT).size();
    String checks =
        a.checks().isEmpty()
            ? "No check was made."
            : (fail == 0 ? "None" : fail)
                + " of "
                + a.checks().size()
                + " checks "
                + (fail == 1 ? "fails" : "fail")
                + ", "
                + (open == 0 ? "none" : open)
                + " not assessed.";
    return points == 0 ? checks : checks + " Open points: " + points + ".";
  }

  private static long count(Assessment a, Outcome outcome) {
    return a.checks().stream().filter(c -> c.outcome() == outcome).count();
  }

  private static List<Fact> who(Project p) {
    return List.of(
        new Fact("Made for", Print.shorten(Print.words(p.client()), 60)),
        new Fact("Owner", Print.shorten(Print.words(p.owner()), 60)),
        new Fact("Address", Print.shorten(Print.words(p.address()), 60)),
        new Fact("Parcel", Print.shorten(Print.words(p.parcel()), 60)),
        new Fact("Date", p.date().map(Object::toString).orElse(Print.NOT_GIVEN)),
        new Fact("Prepared by", Print.shorten(Print.words(p.preparedBy()), 60)));
  }

  private static List<Row> rows(Assessment a) {
    record Ranked(int order, double useRatio, Row row) {}
    List<Ranked> rows = new ArrayList<>();
    for (Question question : Chapters.questions(a)) {
      Check worst = worst(a, question);
      rows.add(
          new Ranked(
              severity(worst.outcome()), worst.utilisation().orElse(9e9), row(question, worst)));
    }
    rows.sort(
        Comparator.comparingInt(Ranked::order)
            .thenComparing(Comparator.comparingDouble(Ranked::useRatio).reversed()));
    return rows.stream().map(Ranked::row).toList();
  }

  /** A failed check is worse than one not made, that one worse than any that passes. */
  private static Check worst(Assessment a, Question question) {
    return a.checks().stream()
        .filter(c -> c.subject().question() == question)
        .min(
            Comparator.comparingInt((Check c) -> severity(c.outcome()))
                .thenComparing(
                    Comparator.comparingDouble((Check c) -> c.utilisation().orElse(9e9))
                        .reversed()))
        .orElseThrow();
  }

  private static int severity(Outcome outcome) {
    return switch (outcome) {
      case FAIL -> 0;
      case NOT_ASSESSED -> 1;
      case PASS -> 2;
    };
  }

  private static Row row(Question question, Check worst) {
    return new Row(
        question.question(),
        letter(question),
        Print.shorten(Print.symbols(worst.subject().where()), LONGEST_PLACE),
        CheckView.used(worst),
        CheckView.answer(worst),
        CheckView.style(worst),
        Chapters.id(question));
  }

  /** The letter of the side view at which a question is at home. */
  private static String letter(Question question) {
    return switch (question) {
      case CLEARANCE, ROTOR_SPEED -> "A";
      case GUYS -> "B";
      case TUBE -> "C";
      case ANCHORS -> "D";
      case FOOT, FOOTING -> "E";
      case RAISING -> "F";
      case AROUND, SOUNDNESS -> "";
    };
  }

  private static List<Line> open(Assessment a) {
    List<Line> lines = new ArrayList<>();
    List<Finding> points = a.findings(Finding.Severity.OPEN_POINT);
    points.stream()
        .limit(OPEN_LINES)
        .forEach(f -> lines.add(new Line(Print.shorten(f.message(), LONGEST_LINE), "")));
    if (points.size() > OPEN_LINES) {
      lines.add(new Line("and " + (points.size() - OPEN_LINES) + " more, page ", "given"));
    }
    long recalled = ClauseRegister.count(a, Status.RECALLED);
    if (recalled > 0) {
      lines.add(
          new Line(
              "clauses from memory, to be compared with the printed standard: "
                  + recalled
                  + ", page ",
              "clauses"));
    }
    if (!a.defaults().isEmpty()) {
      lines.add(
          new Line(
              "values not given, and what was taken instead: " + a.defaults().size() + ", page ",
              "given"));
    }
    return lines;
  }

  private static List<Fact> around(Assessment a, Print print) {
    Outline o = a.outline();
    Surroundings s = a.design().surroundings();
    List<Fact> facts = new ArrayList<>();
    facts.add(new Fact("A fall strikes within", print.of(o.fallRadius_m(), Unit.M)));
    facts.add(
        new Fact(
            "Overhead line",
            s.overheadLine_m().isPresent()
                ? print.of(s.overheadLine_m(), Unit.M) + " away"
                : "DISTANCE NOT GIVEN"));
    if (o.lowestBlade_m().isPresent()) {
      facts.add(new Fact("Lowest blade tip at", print.of(o.lowestBlade_m(), Unit.M)));
    }
    facts.add(
        new Fact(
            "Nearest lot line",
            s.lotLines().stream()
                .min(Comparator.comparingDouble(Surroundings.LotLine::distance_m))
                .map(l -> print.of(l.distance_m(), Unit.M))
                .orElse(Print.NOT_GIVEN)));
    return facts;
  }
}
