package org.mastwright.file;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.mastwright.design.GuySet;
import org.mastwright.units.Dimension;
import org.mastwright.units.Quantities;
import org.mastwright.units.Unit;
import org.mastwright.working.DefaultTaken.Side;

/** The rope of a level, its ends, hardware and tension. */
final class RopeReader {
  private static final double NO_ROPE = 1e-3;

  /** Breaking force of a strand over the sum of its wires; recalled. */
  private static final double SPINNING_LOSS = 0.86;

  private final Key k;
  private final Faults faults;

  RopeReader(Key k) {
    this.k = k;
    this.faults = k.faults();
  }

  GuySet.Rope rope() {
    return k.need("strand", "missing", "The strand is not given and never guessed.")
        .map(RopeReader::rope)
        .orElseGet(RopeReader::placeholder);
  }

  /** A rope of any line. */
  static GuySet.Rope rope(Key s) {
    GuySet.Rope rope = s.has("diameter") ? asGiven(s) : fromTables(s);
    s.close();
    return rope;
  }

  /** Stands in after an error so that the rest of the file can still be read. */
  static GuySet.Rope placeholder() {
    return new GuySet.Rope("?", NO_ROPE, NO_ROPE, NO_ROPE, 0, NO_ROPE, NO_ROPE, "?");
  }

  private static GuySet.Rope asGiven(Key s) {
    double d = s.required("diameter", Dimension.LENGTH, "The diameter is missing.");
    return new GuySet.Rope(
        Unit.MM.print(d) + " rope",
        d,
        s.required("area", Dimension.AREA, "The metal area is missing."),
        s.required("modulus", Dimension.PRESSURE, "The modulus is missing."),
        0,
        s.required("mass", Dimension.MASS_PER_LENGTH, "The mass per length is missing."),
        s.required("breaking", Dimension.FORCE, "The breaking force is never guessed."),
        "as given");
  }

  private static GuySet.Rope fromTables(Key s) {
    String nominal = s.text("nominal", "");
    String construction = s.text("construction", "");
    String grade = s.text("grade", "");
    double[] kind = Tables.construction(construction);
    double d;
    try {
      d = Quantities.read(nominal, Dimension.LENGTH);
    } catch (Quantities.Unreadable wrong) {
      s.error(wrong.id(), "strand.nominal: " + wrong.getMessage(), "");
      return placeholder();
    }
    if (kind.length == 0 || grade.isEmpty()) {
      s.error(
          "missing",
          "A strand needs its construction (1x7, 1x19, 7x7, 7x19) and grade, or {diameter, area,"
              + " modulus, mass, breaking}.",
          "");
      return placeholder();
    }
    OptionalDouble stated = s.positive("breaking", Dimension.FORCE);
    OptionalDouble modulus = s.positive("modulus", Dimension.PRESSURE);
    if (modulus.isEmpty()) {
      s.faults()
          .taken(
              s.path() + ".modulus", Unit.GPA.print(kind[1]) + " ±15 %", "recalled", Side.UNKNOWN);
    }
    double area = kind[0] * Math.PI * d * d / 4;
    double mass = area * 7850 * 1.03;
    OptionalDouble breaking = stated;
    String source = "construction and grade, recalled";
    String inches = nominal.replace(" in", "");
    Optional<Map<String, String>> row =
        Tables.rows("astm_a475_strand.csv").stream()
            .filter(r -> r.get("nominal_in").equals(inches))
            .findFirst();
    if (construction.equals("1x7") && row.isPresent() && row.get().get(grade + "_kN") != null) {
      double wire = Double.parseDouble(row.get().get("wire_mm")) / 1000;
      area = 7 * Math.PI * wire * wire / 4;
      mass = Double.parseDouble(row.get().get("kg_per_304.8m")) / 304.8;
      String kn = row.get().get(grade + "_kN");
      breaking =
          stated.isPresent() || kn.isEmpty()
              ? stated
              : OptionalDouble.of(Double.parseDouble(kn) * 1000);
      source =
          "ASTM A475 Table 1 ("
              + (row.get().get("status").equals("SEEN") ? "read" : "recalled")
              + ")";
    } else if (grade.equals("aircraft")) {
      Optional<Double> lbf = Tables.aircraftBreaking_lbf(inches);
      if (breaking.isEmpty() && lbf.isPresent()) {
        breaking = OptionalDouble.of(lbf.get() * Unit.LBF.factor());
      }
    } else if (breaking.isEmpty() && grade.endsWith("MPa")) {
      breaking = OptionalDouble.of(SPINNING_LOSS * strength(s) * area);
    }
    if (breaking.isEmpty()) {
      s.error(
          "missing",
          "The breaking force of this strand is not in the tables and never guessed.",
          "Add `breaking:` from its certificate.");
      return placeholder();
    }
    return new GuySet.Rope(
        nominal + " " + construction + " " + grade,
        d,
        s.positive("area", Dimension.AREA).orElse(area),
        modulus.orElse(kind[1]),
        modulus.isPresent() ? 0 : 0.15,
        s.positive("mass", Dimension.MASS_PER_LENGTH).orElse(mass),
        breaking.getAsDouble(),
        source);
  }

  /** A grade that is the strength of the wires. */
  private static double strength(Key s) {
    Key grade = s.get("grade").orElseThrow();
    double v = grade.si(Dimension.PRESSURE);
    return v > 0 ? v : NO_ROPE;
  }

  GuySet.EndFitting ends() {
    Optional<Key> e = k.get("ends");
    if (e.isEmpty()) {
      faults.taken(k.path() + ".ends", "clips, 0.80", "recalled", Side.SAFE);
      return new GuySet.EndFitting("clips", 0, 0.80, true);
    }
    OptionalDouble stated = e.get().positive("efficiency", Dimension.ONE);
    String kind = e.get().text("kind", stated.isPresent() ? "as given" : "clips");
    double ratio =
        switch (kind) {
          case "grip", "swaged" -> 0.90;
          case "socket" -> 1.0;
          default -> 0.80;
        };
    if (stated.isEmpty()) {
      faults.taken(
          e.get().path() + ".efficiency",
          Unit.ONE.print(ratio) + ", " + kind,
          "recalled",
          Side.SAFE);
    }
    GuySet.EndFitting fitting =
        new GuySet.EndFitting(
            kind, e.get().integer("count", 0), stated.orElse(ratio), stated.isEmpty());
    e.get().close();
    return fitting;
  }

  List<GuySet.Hardware> hardware() {
    List<GuySet.Hardware> all = new ArrayList<>();
    k.get("hardware")
        .ifPresent(
            list -> {
              for (Key h : list.items()) {
                GuySet.Hardware piece =
                    new GuySet.Hardware(
                        h.text("what", "hardware"),
                        h.positive("working-load", Dimension.FORCE),
                        h.positive("safety", Dimension.ONE),
                        h.positive("breaking", Dimension.FORCE));
                if (piece.workingLoad_N().isPresent() && piece.safetyFactor().isEmpty()) {
                  faults.warning(
                      "E15",
                      h,
                      "A working load of " + h.text("working-load", "") + " has no `safety`.",
                      "Write the maker's factor (often 5 for forged gear), or the breaking load."
                          + " Without it the hardware is not assessed.");
                }
                h.close();
                all.add(piece);
              }
            });
    return all;
  }

  GuySet.Tension tension(int guys) {
    Optional<Key> found = k.need("tension", "missing", "The tension is never guessed.");
    if (found.isEmpty()) {
      return new GuySet.Tension.Snug();
    }
    Key t = found.get();
    if (t.isMap()) {
      OptionalDouble sag = t.positive("sag", Dimension.LENGTH);
      Optional<Key> pulse = t.get("pulse");
      t.close();
      if (pulse.isPresent()) {
        GuySet.Tension p =
            new GuySet.Tension.Pulse(
                pulse.get().integer("returns", 10),
                pulse.get().required("time", Dimension.TIME, "In what time?"));
        pulse.get().close();
        return p;
      }
      if (sag.isEmpty()) {
        t.error("missing", "A tension is a force, a share, snug, {sag} or {pulse}.", "");
      }
      return new GuySet.Tension.Sag(sag.orElse(Double.NaN));
    }
    if (t.text().equals("snug")) {
      faults.taken(
          t.path(), "2 % of breaking, run also at 0.5 % and 5 %", "practice", Side.UNKNOWN);
      return new GuySet.Tension.Snug();
    }
    if (t.text().endsWith("of breaking")) {
      try {
        return new GuySet.Tension.OfBreaking(
            Quantities.read(t.text().replace("of breaking", "").trim(), Dimension.ONE));
      } catch (Quantities.Unreadable wrong) {
        t.error(wrong.id(), wrong.getMessage(), "Write 10 % of breaking.");
        return new GuySet.Tension.Snug();
      }
    }
    List<Double> values = new ArrayList<>();
    for (Key v : t.items()) {
      values.add(v.si(Dimension.FORCE));
    }
    if (values.size() != 1 && values.size() != guys) {
      t.error(
          "E13",
          "has " + values.size() + " values but there are " + guys + " guys in this set.",
          "Give one value or " + Plain.number(guys) + ".");
      return new GuySet.Tension.Snug();
    }
    return new GuySet.Tension.Force(values);
  }
}
