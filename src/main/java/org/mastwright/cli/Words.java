package org.mastwright.cli;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.mastwright.assess.Assessment;
import org.mastwright.assess.SpeedResult;
import org.mastwright.assess.Verdict;
import org.mastwright.file.Reading;
import org.mastwright.units.Numbers;
import org.mastwright.units.Unit;
import org.mastwright.units.UnitSystem;
import org.mastwright.working.Check;
import org.mastwright.working.Finding;
import org.mastwright.working.Outcome;
import org.mastwright.working.Question;

/** What the terminal says, 80 columns wide. */
final class Words {
  private static final int WIDTH = 80;
  private static final double CLOSE = 0.9;
  private static final double RPM = Math.PI / 30;

  private Words() {}

  /** The summary of a check. */
  static List<String> summary(Assessment a, UnitSystem units, String written, boolean plain) {
    List<String> out = new ArrayList<>();
    out.add(
        "mastwright "
            + a.version()
            + "  check  "
            + a.input().name()
            + "   "
            + a.design().project().title());
    out.add("");
    out.add("  " + a.verdict().answer() + "    " + decides(a));
    out.add("");
    if (!plain) {
      out.add(row("QUESTION", "WORST PLACE", "USED", "ANSWER"));
    }
    for (Question q : Question.values()) {
      worst(a, q).ifPresent(c -> out.add(answer(q, c, plain)));
    }
    if (a.findings().stream().anyMatch(f -> f.id().equals("raising-not-checked"))) {
      out.add(
          plain
              ? "NOT CHECKED  Can it be raised?"
              : row("Can it be raised?", "read, not yet used", "-", "NOT CHECKED"));
    }
    next(a, out);
    out.add("");
    out.add("  " + a.defaults().size() + " values were not given. What was taken: report, Given");
    out.add(
        "  Keep people and cars "
            + units.print(a.outline().fallRadius_m(), Unit.M)
            + " away: the tower can fall that far.");
    out.add("");
    out.add("  " + written);
    out.add("  A calculation, not an approval: local codes and a licensed engineer decide.");
    out.add("  exit code " + a.exitCode());
    return out.stream().map(l -> fit(plain ? ascii(l) : l)).toList();
  }

  private static String decides(Assessment a) {
    return a.governing()
        .map(
            c ->
                "decides: "
                    + c.subject().title()
                    + "  "
                    + used(c)
                    + "  ("
                    + c.subject().where()
                    + ")")
        .orElse("");
  }

  private static String used(Check c) {
    return c.utilisation().isPresent() ? Numbers.utilisation(c.utilisation().getAsDouble()) : "-";
  }

  private static double rank(Check c) {
    double base = c.outcome() == Outcome.FAIL ? 1e6 : c.outcome() == Outcome.NOT_ASSESSED ? 1e3 : 0;
    return base + Math.min(999, c.utilisation().orElse(999));
  }

  private static Optional<Check> worst(Assessment a, Question q) {
    return a.checks().stream()
        .filter(c -> c.subject().question() == q)
        .max(Comparator.comparingDouble(Words::rank));
  }

  private static String answer(Question q, Check c, boolean plain) {
    String word =
        switch (c.outcome()) {
          case FAIL -> "FAILS";
          case NOT_ASSESSED -> "NOT CHECKED";
          case PASS -> c.utilisation().orElse(0) > CLOSE ? "passes, close" : "passes";
        };
    return plain
        ? word + "  " + q.question() + "  " + c.subject().where() + "  " + used(c)
        : row(q.question(), c.subject().where(), used(c), word);
  }

  private static String row(String question, String place, String used, String answer) {
    return "  " + pad(question, 28) + pad(place, 30) + pad(used, 6) + answer;
  }

  private static String pad(String text, int width) {
    String cut = text.length() > width - 1 ? text.substring(0, width - 2) + "…" : text;
    return cut + " ".repeat(width - cut.length());
  }

  private static void next(Assessment a, List<String> out) {
    List<String> lines = new ArrayList<>();
    a.checks().stream()
        .filter(c -> c.outcome() == Outcome.FAIL)
        .limit(4)
        .forEach(
            c ->
                lines.add(
                    c.subject().title() + " No: " + c.subject().where() + ", " + used(c) + "."));
    a.findings(Finding.Severity.OPEN_POINT).stream()
        .map(f -> f.remedy().isEmpty() ? f.message() : f.remedy())
        .distinct()
        .limit(5)
        .forEach(lines::add);
    if (!lines.isEmpty()) {
      out.add("");
      out.add("  DO NEXT");
      for (int i = 0; i < lines.size(); i++) {
        wrap(out, "  " + (i + 1) + "  ", lines.get(i));
      }
    }
  }

  private static void wrap(List<String> out, String head, String text) {
    String indent = " ".repeat(head.length());
    StringBuilder line = new StringBuilder(head);
    for (String word : text.split(" ")) {
      if (line.length() + word.length() + 1 > WIDTH) {
        out.add(line.toString().stripTrailing());
        line = new StringBuilder(indent);
      }
      line.append(word).append(' ');
    }
    out.add(line.toString().stripTrailing());
  }

  private static String fit(String line) {
    return line.length() > WIDTH
        ? line.substring(0, WIDTH - 1) + (isAscii(line) ? "." : "…")
        : line;
  }

  private static boolean isAscii(String s) {
    return s.chars().allMatch(c -> c < 128);
  }

  /** ASCII only, for screen readers and e-mail. */
  static String ascii(String text) {
    return text.replace("°", " deg")
        .replace("−", "-")
        .replace("–", "-")
        .replace("×", "x")
        .replace("·", ".")
        .replace("²", "2")
        .replace("³", "3")
        .replace("…", ".")
        .replace("±", "+-")
        .replaceAll("[^\\x00-\\x7f]", "?");
  }

  /** A wrong file. */
  static List<String> faults(Reading r) {
    List<String> out = new ArrayList<>();
    long errors = r.faults().stream().filter(f -> f.severity() == Finding.Severity.ERROR).count();
    long warnings = r.faults().size() - errors;
    out.add(
        r.fileName()
            + " cannot be checked yet: "
            + count(errors, "error")
            + ", "
            + count(warnings, "warning"));
    out.add("");
    for (Finding f : r.faults()) {
      faultLines(r, f, out);
    }
    out.add(
        "  Nothing was calculated. More on any of these: mastwright explain "
            + r.faults().get(0).id());
    return out;
  }

  static void faultLines(Reading r, Finding f, List<String> out) {
    String kind = f.severity() == Finding.Severity.WARNING ? "warning  " : "";
    out.add("  " + f.line() + ":" + f.column() + "   " + kind + f.path());
    wrap(out, "         ", f.message());
    if (!f.remedy().isEmpty()) {
      wrap(out, "         ", f.remedy());
    }
  }

  private static String count(long n, String word) {
    return n + " " + word + (n == 1 ? "" : "s");
  }

  /** Rotor speeds to avoid and clear ranges. */
  static List<String> speeds(Assessment a, boolean plain) {
    List<String> out = new ArrayList<>();
    SpeedResult s = a.speeds().orElseThrow();
    out.add(
        "mastwright "
            + a.version()
            + "  speeds  "
            + a.input().name()
            + "   "
            + rpm(s.lowest_radps())
            + "-"
            + rpm(s.highest_radps())
            + " rpm");
    out.add("");
    String head = "  AVOID running at ";
    for (SpeedResult.Window w : s.windowsToAvoid()) {
      wrap(
          out,
          head + pad(rpm(w.from_radps()) + " - " + rpm(w.to_radps()) + " rpm", 17),
          w.why()
              + ", "
              + Numbers.significant(w.least_Hz(), 3)
              + "-"
              + Unit.HZ.print(w.greatest_Hz()));
      head = " ".repeat(head.length());
    }
    if (s.windowsToAvoid().isEmpty()) {
      out.add("  Nothing to avoid in this range.");
    }
    head = "  CLEAR            ";
    for (SpeedResult.Range r : s.clear()) {
      out.add(head + rpm(r.from_radps()) + " - " + rpm(r.to_radps()) + " rpm");
      head = " ".repeat(head.length());
    }
    if (s.clear().isEmpty()) {
      out.add("  No clear range: change the tower or the speed range.");
    }
    out.add("");
    scale(s, out);
    out.add("");
    s.remarks().forEach(r -> out.add("  " + r));
    out.add("  Why a range and not a line: head mass +-10 %, guys loose and taut, margin.");
    out.add("  A calculation, not an approval.");
    return out.stream().map(l -> fit(plain ? ascii(l) : l)).toList();
  }

  private static String rpm(double omega) {
    return Numbers.fixed(omega / RPM, 0);
  }

  private static void scale(SpeedResult s, List<String> out) {
    int cells = 60;
    StringBuilder bar = new StringBuilder("       ");
    for (int i = 0; i < cells; i++) {
      double at = s.lowest_radps() + (s.highest_radps() - s.lowest_radps()) * (i + 0.5) / cells;
      boolean avoid =
          s.windowsToAvoid().stream().anyMatch(w -> at >= w.from_radps() && at <= w.to_radps());
      bar.append(avoid ? 'X' : '.');
    }
    out.add("  rpm  " + pad(rpm(s.lowest_radps()), 55) + rpm(s.highest_radps()));
    out.add(bar.toString());
  }

  /** A verification run as a short table. */
  static List<String> verification(Assessment a) {
    List<String> out = new ArrayList<>();
    out.add("mastwright " + a.version() + "  check  " + a.input().name() + "   VERIFICATION");
    for (var c : a.cases()) {
      var r = c.response();
      out.add(
          fit(
              "  "
                  + r.mark().id()
                  + "  top "
                  + Unit.MM.print(r.top().level_m())
                  + "  base "
                  + Unit.N.print(r.base().shear_N())
                  + ", "
                  + Unit.NM.print(r.base().moment_Nm())
                  + "  moment "
                  + Unit.NM.print(r.greatestMoment().moment_Nm())));
    }
    out.add("  A calculation, not an approval.");
    return out;
  }

  static boolean isVerification(Assessment a) {
    return a.verdict() == Verdict.VERIFICATION;
  }
}
