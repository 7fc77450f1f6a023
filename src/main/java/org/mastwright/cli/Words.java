package org.mastwright.cli;

import java.util.ArrayList;
import java.util.List;
import org.mastwright.assess.Assessment;
import org.mastwright.file.Reading;
import org.mastwright.units.Unit;
import org.mastwright.working.Finding;

/** What is common to everything the terminal says: 80 columns, plain words, plain ASCII. */
final class Words {
  static final int WIDTH = 80;

  /** Stands wherever a verdict is shown. */
  static final String CAUTION =
      "A calculation, not an approval: local codes and a licensed engineer decide.";

  private Words() {}

  /** A cell of a table, cut where it must be. */
  static String pad(String text, int width) {
    String cut = text.length() > width - 1 ? text.substring(0, width - 2) + "…" : text;
    return cut + " ".repeat(width - cut.length());
  }

  /** Adds a text under a head, broken between words. */
  static void wrap(List<String> out, String head, String text) {
    String indent = " ".repeat(head.length());
    StringBuilder line = new StringBuilder(head);
    boolean first = true;
    for (String word : text.split(" ")) {
      if (!first && line.length() + word.length() > WIDTH) {
        out.add(line.toString().stripTrailing());
        line = new StringBuilder(indent);
      }
      line.append(word).append(' ');
      first = false;
    }
    out.add(line.toString().stripTrailing());
  }

  /** One line broken between words, with its own indent. */
  static List<String> wrapped(String line) {
    List<String> out = new ArrayList<>();
    String text = line.stripLeading();
    wrap(out, line.substring(0, line.length() - text.length()), text);
    return out;
  }

  /** Right-hand end of a line. */
  static String right(String left, String right) {
    int gap = WIDTH - left.length() - right.length();
    return gap > 0 ? left + " ".repeat(gap) + right : left + "  " + right;
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
        .replace("’", "'")
        .replaceAll("[^\\x00-\\x7f]", "?");
  }

  /** A wrong file. */
  static List<String> faults(Reading r) {
    List<String> out = new ArrayList<>();
    long errors = r.faults().stream().filter(f -> f.severity() == Finding.Severity.ERROR).count();
    long warnings = r.faults().size() - errors;
    String many = count(errors, "error") + (warnings > 0 ? ", " + count(warnings, "warning") : "");
    out.add(
        errors > 0
            ? r.fileName() + " cannot be checked yet: " + many
            : r.fileName() + " was not checked, as --strict asks: " + count(warnings, "warning"));
    out.add("");
    for (Finding f : r.faults()) {
      fault(f, out);
    }
    out.add("");
    out.add(
        "  Nothing was calculated. More on any of these: mastwright explain "
            + r.faults().get(0).id());
    return out;
  }

  /** Line and column, path, what is wrong, what would be right. */
  static void fault(Finding f, List<String> out) {
    String kind = f.severity() == Finding.Severity.WARNING ? "warning  " : "";
    out.add("  " + pad(f.line() + ":" + f.column(), 8) + kind + f.path());
    wrap(out, "          ", f.message());
    if (!f.remedy().isEmpty()) {
      wrap(out, "          ", f.remedy());
    }
  }

  static String count(long n, String word) {
    return n + " " + word + (n == 1 ? "" : "s");
  }

  /** A verification run as a short table. */
  static List<String> verification(Assessment a, String written) {
    List<String> out = new ArrayList<>();
    out.add("mastwright " + a.version() + "  check  " + a.input().name() + "   VERIFICATION");
    out.add("");
    out.add(
        "  "
            + pad("CASE", 14)
            + pad("TOP MOVES", 13)
            + pad("FOOT SHEAR", 13)
            + pad("FOOT MOMENT", 15)
            + "GREATEST MOMENT");
    for (var c : a.cases()) {
      var r = c.response();
      out.add(
          "  "
              + pad(r.mark().id(), 14)
              + pad(Unit.MM.print(r.top().level_m()), 13)
              + pad(Unit.N.print(r.base().shear_N()), 13)
              + pad(Unit.NM.print(r.base().moment_Nm()), 15)
              + Unit.NM.print(r.greatestMoment().moment_Nm()));
    }
    out.add("");
    out.add("  Direct loads, no factors, no checks: the mechanics alone.");
    out.add("  " + written);
    out.add(right("  A calculation, not an approval.", "exit code " + a.exitCode()));
    return out.stream().map(Words::ascii).toList();
  }
}
