package org.mastwright.file;

import java.nio.charset.StandardCharsets;
import java.util.List;
import org.mastwright.assess.Assessment;
import org.mastwright.assess.CaseResult;
import org.mastwright.assess.SpeedResult;
import org.mastwright.forces.GuyForces;
import org.mastwright.forces.Response;

/** Tables for a spreadsheet: a comma between columns, a point in numbers, units in the head. */
public final class Csv {
  private static final double RPM = Math.PI / 30;

  private Csv() {}

  /** Every guy in every case. */
  public static byte[] guys(Assessment a) {
    StringBuilder out = new StringBuilder();
    row(
        out,
        "case",
        "wind_from_deg",
        "set",
        "azimuth_deg",
        "tension_at_mast_N",
        "tension_at_anchor_N",
        "slack");
    for (CaseResult c : a.cases()) {
      Response r = c.response();
      for (GuyForces g : r.guys()) {
        row(
            out,
            r.mark().id(),
            number(Math.toDegrees(r.mark().windFrom_rad())),
            Integer.toString(g.set()),
            number(Math.toDegrees(g.azimuth_rad())),
            number(g.tensionAtMast_N()),
            number(g.tensionAtAnchor_N()),
            g.slack() ? "yes" : "no");
      }
    }
    return out.toString().getBytes(StandardCharsets.UTF_8);
  }

  /** Rotor speeds to avoid and clear ranges. */
  public static byte[] speeds(SpeedResult s) {
    StringBuilder out = new StringBuilder();
    row(out, "kind", "from_rpm", "to_rpm", "least_Hz", "greatest_Hz", "why");
    for (SpeedResult.Window w : s.windowsToAvoid()) {
      row(
          out,
          "avoid",
          number(w.from_radps() / RPM),
          number(w.to_radps() / RPM),
          number(w.least_Hz()),
          number(w.greatest_Hz()),
          w.why());
    }
    for (SpeedResult.Range r : s.clear()) {
      row(out, "clear", number(r.from_radps() / RPM), number(r.to_radps() / RPM), "", "", "");
    }
    return out.toString().getBytes(StandardCharsets.UTF_8);
  }

  /** Six significant figures; empty where there is none. */
  private static String number(double v) {
    return Double.isFinite(v)
        ? new java.math.BigDecimal(v)
            .round(new java.math.MathContext(6))
            .stripTrailingZeros()
            .toPlainString()
        : "";
  }

  private static void row(StringBuilder out, String... cells) {
    out.append(String.join(",", List.of(cells).stream().map(Csv::quoted).toList())).append("\n");
  }

  private static String quoted(String cell) {
    return cell.matches("[^,\"\n\r]*") ? cell : "\"" + cell.replace("\"", "\"\"") + "\"";
  }
}
