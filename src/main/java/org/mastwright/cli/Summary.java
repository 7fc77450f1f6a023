package org.mastwright.cli;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.mastwright.assess.Assessment;
import org.mastwright.design.Ground;
import org.mastwright.design.SiteWind;
import org.mastwright.design.Tower;
import org.mastwright.units.Numbers;
import org.mastwright.units.Unit;
import org.mastwright.units.UnitSystem;
import org.mastwright.working.Check;
import org.mastwright.working.Finding;
import org.mastwright.working.Outcome;
import org.mastwright.working.Question;

/** The answer of a check for a tired installer: what fails, why, and what to do next. */
final class Summary {
  private static final double CLOSE = 0.9;
  private static final int MOST_FAILURES = 4;
  private static final int MOST_OPEN = 5;

  private final Assessment a;
  private final UnitSystem units;
  private final boolean plain;
  private final List<String> out = new ArrayList<>();

  private Summary(Assessment a, boolean plain) {
    this.a = a;
    this.units = a.design().project().units();
    this.plain = plain;
  }

  static List<String> of(Assessment a, String written, double took_s, boolean plain) {
    Summary s = new Summary(a, plain);
    s.head();
    s.answers();
    s.next();
    s.foot(written, took_s);
    return s.out.stream().map(l -> plain ? Words.ascii(l) : l).toList();
  }

  private void head() {
    String run = "mastwright " + a.version() + "  check  " + a.input().name();
    String reference = a.design().project().reference();
    String title = (reference.isBlank() ? "" : reference + ", ") + a.design().project().title();
    out.add(run.length() + title.length() + 3 <= Words.WIDTH ? run + "   " + title : run);
    if (run.length() + title.length() + 3 > Words.WIDTH) {
      Words.wrap(out, "  ", title);
    }
    out.add("");
    Words.wrap(out, "  " + a.verdict().answer() + "    ", decides());
    out.add("");
    wind().ifPresent(w -> Words.wrap(out, "  Wind    ", w));
    Words.wrap(out, "  Tower   ", tower());
    out.add("");
  }

  /** The failed check that counts most, or the one nearest to failing. */
  private String decides() {
    return a.governing()
        .map(
            c ->
                (c.outcome() == Outcome.FAIL ? "worst: " : "nearest to its limit: ")
                    + c.subject().title()
                    + ", "
                    + c.subject().where()
                    + (c.utilisation().isPresent() ? ", used " + used(c) : ""))
        .orElse("nothing could be judged");
  }

  private Optional<String> wind() {
    return a.design()
        .site()
        .map(
            s -> {
              if (s.wind().stated() instanceof SiteWind.Stated.IecClass c) {
                return "IEC class "
                    + c.name()
                    + ", "
                    + units.print(c.referenceSpeed_mps(), Unit.MPS)
                    + " (10 min mean at the hub)";
              }
              SiteWind.Stated.Speed v = (SiteWind.Stated.Speed) s.wind().stated();
              String level =
                  v.level() instanceof SiteWind.Level.Ultimate u
                      ? "ultimate, category " + u.riskCategory()
                      : Numbers.significant(v.level().returnPeriod_yr(), 3) + " years";
              return units.print(v.speed_mps(), Unit.MPS)
                  + ", "
                  + (v.averaging() == SiteWind.Averaging.GUST_3_S
                      ? "3 s gust"
                      : v.averaging().key() + " mean")
                  + ", "
                  + level
                  + ", "
                  + units.print(v.height_m(), Unit.M)
                  + " up";
            });
  }

  private String tower() {
    Tower t = a.design().tower();
    StringBuilder words = new StringBuilder();
    if (a.outline().lowestBlade_m().isPresent() && a.outline().highestBlade_m().isPresent()) {
      words
          .append("blades ")
          .append(units.print(a.outline().lowestBlade_m().getAsDouble(), Unit.M))
          .append(" to ")
          .append(units.print(a.outline().highestBlade_m().getAsDouble(), Unit.M))
          .append(" up");
    } else {
      words.append(units.print(t.topHeight_m(), Unit.M)).append(" high");
    }
    if (t.guys().isEmpty()) {
      return words + "; monopole";
    }
    List<Ground.Anchor> anchors = a.design().ground().anchors();
    double nearest = anchors.stream().mapToDouble(Ground.Anchor::out_m).min().orElse(0);
    double furthest = anchors.stream().mapToDouble(Ground.Anchor::out_m).max().orElse(0);
    String out_m = units.print(nearest, Unit.M);
    String far = units.print(furthest, Unit.M);
    return words
        + "; "
        + Words.count(t.guys().size(), "guy level")
        + ", "
        + Words.count(anchors.size(), "anchor")
        + " "
        + (out_m.equals(far) ? out_m : out_m + " to " + far)
        + " out";
  }

  private void answers() {
    if (!plain) {
      out.add(row("QUESTION", "WORST PLACE", "USED", "ANSWER"));
    }
    for (Question q : Question.values()) {
      worst(q).ifPresent(c -> answer(q, c));
    }
    if (a.findings().stream().anyMatch(f -> f.id().equals("raising-not-checked"))) {
      out.add(
          plain
              ? "NOT CHECKED  Can it be raised?"
              : row("Can it be raised?", "read, not yet used", "-", "NOT CHECKED"));
    }
  }

  private void answer(Question q, Check c) {
    String word =
        switch (c.outcome()) {
          case FAIL -> "FAILS";
          case NOT_ASSESSED -> "NOT CHECKED";
          case PASS -> c.utilisation().orElse(0) > CLOSE ? "passes, close" : "passes";
        };
    if (plain) {
      out.add(word + "  " + q.question() + "  " + c.subject().where() + "  " + used(c));
      return;
    }
    String place = c.subject().where();
    if (place.length() < 29) {
      out.add(row(q.question(), place, used(c), word));
    } else {
      out.add(row(q.question(), place.substring(0, breakAt(place)), used(c), word));
      Words.wrap(out, " ".repeat(30), place.substring(breakAt(place)).strip());
    }
    if (c.outcome() == Outcome.NOT_ASSESSED) {
      assessed(q)
          .ifPresent(b -> out.add(" ".repeat(30) + "what was: at most " + used(b) + ", passes"));
    }
  }

  /** Where a long place is broken, before the table's column ends. */
  private static int breakAt(String place) {
    int space = place.lastIndexOf(' ', 28);
    return space > 10 ? space : 28;
  }

  private static String used(Check c) {
    return c.utilisation().isPresent() ? Numbers.utilisation(c.utilisation().getAsDouble()) : "-";
  }

  private static double rank(Check c) {
    double base = c.outcome() == Outcome.FAIL ? 1e6 : c.outcome() == Outcome.NOT_ASSESSED ? 1e3 : 0;
    return base + Math.min(999, c.utilisation().orElse(0));
  }

  private Optional<Check> worst(Question q) {
    return a.checks().stream()
        .filter(c -> c.subject().question() == q)
        .max(Comparator.comparingDouble(Summary::rank));
  }

  /** The worst of those that were assessed, where others were not. */
  private Optional<Check> assessed(Question q) {
    return a.checks().stream()
        .filter(c -> c.subject().question() == q && c.outcome() == Outcome.PASS)
        .max(Comparator.comparingDouble(c -> c.utilisation().orElse(0)));
  }

  private static String row(String question, String place, String used, String answer) {
    return "  " + Words.pad(question, 28) + Words.pad(place, 30) + Words.pad(used, 6) + answer;
  }

  /** What fails first, then what is open. */
  private void next() {
    List<String> lines = new ArrayList<>();
    List<Check> failed =
        a.checks().stream()
            .filter(c -> c.outcome() == Outcome.FAIL)
            .sorted(Comparator.comparingDouble(Summary::rank).reversed())
            .toList();
    failed.stream()
        .limit(MOST_FAILURES)
        .forEach(
            c ->
                lines.add(
                    c.subject().title()
                        + " No: "
                        + c.subject().where()
                        + (c.utilisation().isPresent() ? ", " + used(c) : "")
                        + "."));
    if (failed.size() > MOST_FAILURES) {
      lines.add(failed.size() - MOST_FAILURES + " more fail: see the report.");
    }
    List<String> open =
        a.findings(Finding.Severity.OPEN_POINT).stream()
            .map(f -> f.remedy().isEmpty() ? f.message() : f.remedy())
            .distinct()
            .toList();
    open.stream().limit(MOST_OPEN).forEach(lines::add);
    if (open.size() > MOST_OPEN) {
      lines.add(open.size() - MOST_OPEN + " more points are open: report, Given.");
    }
    if (!lines.isEmpty()) {
      out.add("");
      out.add("  DO NEXT");
      for (int i = 0; i < lines.size(); i++) {
        Words.wrap(out, "  " + (i + 1) + "  ", lines.get(i));
      }
    }
  }

  private void foot(String written, double took_s) {
    out.add("");
    Words.wrap(
        out,
        "  ",
        Words.count(a.defaults().size(), "value")
            + (a.defaults().size() == 1 ? " was" : " were")
            + " not given. What was taken instead: report, Given.");
    long unused = a.findings().stream().filter(f -> f.id().equals("read-not-used")).count();
    if (unused > 0) {
      Words.wrap(out, "  ", "Read, not yet used: " + unusedKeys() + ".");
    }
    Words.wrap(
        out,
        "  ",
        "Keep people and cars "
            + units.print(a.outline().fallRadius_m(), Unit.M)
            + " away: the tower can fall that far. Distance to power lines: "
            + (a.design().surroundings().overheadLine_m().isPresent()
                ? units.print(a.design().surroundings().overheadLine_m().getAsDouble(), Unit.M)
                    + "."
                : "NOT GIVEN."));
    out.add("");
    Words.wrap(out, "  ", written);
    out.add("  " + Words.CAUTION);
    out.add(Words.right("  " + Numbers.fixed(took_s, 1) + " s", "exit code " + a.exitCode()));
  }

  private String unusedKeys() {
    return String.join(
        ", ",
        a.findings().stream()
            .filter(f -> f.id().equals("read-not-used"))
            .map(f -> f.path().replaceAll("\\[\\d+\\]", ""))
            .distinct()
            .toList());
  }
}
