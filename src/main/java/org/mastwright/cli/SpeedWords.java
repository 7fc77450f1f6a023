package org.mastwright.cli;

import java.util.ArrayList;
import java.util.List;
import org.mastwright.assess.Assessment;
import org.mastwright.assess.SpeedResult;
import org.mastwright.design.Tower;
import org.mastwright.units.Numbers;
import org.mastwright.units.Unit;

/** Rotor speeds to avoid and clear ranges, with a scale. */
final class SpeedWords {
  private static final double RPM = Math.PI / 30;
  private static final int CELLS = 66;

  private final Assessment a;
  private final SpeedResult s;
  private final List<String> out = new ArrayList<>();

  private SpeedWords(Assessment a) {
    this.a = a;
    this.s = a.speeds().orElseThrow();
  }

  static List<String> of(Assessment a, String written, double took_s, int exitCode, boolean plain) {
    SpeedWords w = new SpeedWords(a);
    w.head();
    w.avoid();
    w.clear();
    if (!plain) {
      w.scale();
    }
    w.why();
    w.out.add("");
    Words.wrap(w.out, "  ", "Not looked at: strength, wind, soil, raising.");
    Words.wrap(w.out, "  ", written);
    w.out.add("  " + Words.CAUTION);
    w.out.add(Words.right("  " + Numbers.fixed(took_s, 1) + " s", "exit code " + exitCode));
    return w.out.stream().map(l -> plain ? Words.ascii(l) : l).toList();
  }

  private static String rpm(double omega_radps) {
    return Numbers.fixed(omega_radps / RPM, 0);
  }

  private void head() {
    var rotor = a.design().turbine().orElseThrow().rotor();
    Words.wrap(
        out,
        "",
        "mastwright "
            + a.version()
            + "  speeds  "
            + a.input().name()
            + "   "
            + rotor.kind().key()
            + ", "
            + Words.count(rotor.blades(), "blade")
            + ", "
            + rpm(s.lowest_radps())
            + "-"
            + rpm(s.highest_radps())
            + " rpm");
    out.add("");
  }

  private void avoid() {
    String head = "  AVOID running at  ";
    for (SpeedResult.Window w : s.windowsToAvoid()) {
      String range = Words.pad(rpm(w.from_radps()) + " - " + rpm(w.to_radps()) + " rpm", 17);
      Words.wrap(
          out,
          head + range,
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
  }

  private void clear() {
    String head = "  CLEAR             ";
    for (SpeedResult.Range r : s.clear()) {
      out.add(head + rpm(r.from_radps()) + " - " + rpm(r.to_radps()) + " rpm");
      head = " ".repeat(head.length());
    }
    if (s.clear().isEmpty()) {
      out.add("  No clear range: change the tower or the speed range.");
    }
    out.add("");
  }

  /** One row of signs over the speed range, marked at round speeds. */
  private void scale() {
    double from = s.lowest_radps() / RPM;
    double to = s.highest_radps() / RPM;
    double step = roundStep((to - from) / 6);
    StringBuilder labels = new StringBuilder(" ".repeat(CELLS + 10));
    StringBuilder ticks = new StringBuilder(".".repeat(CELLS));
    for (double v = Math.ceil(from / step) * step; v <= to + 1e-9; v += step) {
      int at = (int) Math.round((v - from) / (to - from) * (CELLS - 1));
      ticks.setCharAt(at, '|');
      String label = Numbers.fixed(v, 0);
      labels.replace(at, at + label.length(), label);
    }
    StringBuilder bar = new StringBuilder();
    for (int i = 0; i < CELLS; i++) {
      double at = s.lowest_radps() + (s.highest_radps() - s.lowest_radps()) * (i + 0.5) / CELLS;
      boolean avoid =
          s.windowsToAvoid().stream().anyMatch(w -> at >= w.from_radps() && at <= w.to_radps());
      bar.append(avoid ? 'X' : '.');
    }
    out.add("  rpm  " + labels.toString().stripTrailing());
    out.add("       " + ticks);
    out.add("       " + bar);
    out.add("       X: avoid. Starting and stopping: go through without dwelling there.");
    out.add("");
  }

  private static double roundStep(double least) {
    double ten = Math.pow(10, Math.floor(Math.log10(least)));
    for (double m : new double[] {1, 2, 5, 10}) {
      if (m * ten >= least) {
        return m * ten;
      }
    }
    return 10 * ten;
  }

  private void why() {
    s.remarks()
        .forEach(
            r -> Words.wrap(out, "  ", Character.toUpperCase(r.charAt(0)) + r.substring(1) + "."));
    String guys =
        a.design().tower().guys().isEmpty()
            ? ""
            : ", guys loose and taut, the mast leaning in the wind it runs in";
    String foot =
        a.design().tower().base() instanceof Tower.BaseSupport.Sprung
            ? ", foot half and twice as stiff"
            : "";
    Words.wrap(
        out,
        "  ",
        "Why a range and not a line: head mass +-10 %"
            + guys
            + foot
            + ", and the margin of the file.");
    a.findings().stream()
        .filter(f -> f.id().equals("margin"))
        .forEach(f -> Words.wrap(out, "  ", f.message() + " " + f.remedy()));
  }
}
