package org.mastwright.file;

import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.mastwright.design.Section;
import org.mastwright.design.Tube;
import org.mastwright.units.Dimension;
import org.mastwright.units.Numbers;
import org.mastwright.units.Unit;
import org.mastwright.working.DefaultTaken.Side;

/** One tube: a trade size or measured, straight or tapered. */
final class TubeReader {
  /** Welded American pipe may be this much thinner than it is called. */
  private static final double WELDED_PIPE_FACTOR = 0.93;

  private final Key k;
  private final Faults faults;

  TubeReader(Key k) {
    this.k = k;
    this.faults = k.faults();
  }

  Optional<Tube> read(double bottom_m) {
    double length = k.required("length", Dimension.LENGTH, "How long is it?");
    Optional<Key> pipe = k.get("pipe");
    if (pipe.isPresent() && (k.has("outside") || k.has("wall"))) {
      k.error("choice", "Both a pipe and an outside or wall are given.", "Keep one of the two.");
    }
    return pipe.isPresent() ? fromPipe(pipe.get(), bottom_m, length) : fromSizes(bottom_m, length);
  }

  private Optional<Tube.Steel> steel(double wall) {
    Optional<Key> s = k.get("steel");
    if (s.isEmpty()) {
      k.error(
          "E9",
          "The steel is not given and is not guessed. Look for a stencil on the pipe (A53 B, S355).",
          "If there is none, write `steel: unknown`; the weakest common pipe is then taken.");
      return Optional.empty();
    }
    if (s.get().isMap()) {
      Key m = s.get();
      double e = m.value("modulus", Dimension.PRESSURE).orElse(210e9);
      double fy = m.required("yield", Dimension.PRESSURE, "The yield strength is missing.");
      Tube.Steel steel =
          new Tube.Steel(
              "as given",
              fy,
              m.value("ultimate", Dimension.PRESSURE).orElse(fy * 1.2),
              e,
              m.value("shear-modulus", Dimension.PRESSURE).orElse(e / 2.6),
              m.value("density", Dimension.DENSITY).orElse(7850),
              false,
              "as given");
      m.close();
      return Optional.of(steel);
    }
    Optional<Tube.Steel> steel = Tables.steel(s.get().text(), wall);
    if (steel.isEmpty()) {
      s.get()
          .error(
              "choice",
              "\"" + s.get().text() + "\" is no steel known here.",
              "Known: S235, S275, S355, A53-B, A500-B, A500-C, A36, A572-50, unknown; or {yield, ultimate}.");
    } else if (steel.get().assumed()) {
      faults.open(
          "steel-unknown",
          k.path() + ".steel",
          "The steel is unknown; the weakest common pipe is taken (205 / 330 MPa).",
          "Find the stencil or have a piece tested.");
    }
    return steel;
  }

  private double corrosion() {
    return k.value("corrosion", Dimension.LENGTH).orElse(0);
  }

  private Optional<Tube> fromPipe(Key pipe, double bottom_m, double length) {
    Optional<Tube> tube =
        pipe.has("dn") ? fromDn(pipe, bottom_m, length) : fromSchedule(pipe, bottom_m, length);
    pipe.close();
    return tube;
  }

  /** Threaded pipe to EN 10255 by its nominal diameter. */
  private Optional<Tube> fromDn(Key pipe, double bottom_m, double length) {
    String dn = pipe.text("dn", "");
    String series = pipe.choice("series", "medium");
    if (pipe.has("nominal") || pipe.has("schedule")) {
      pipe.error("choice", "Both dn and nominal are given.", "Keep one of the two.");
    }
    Optional<Map<String, String>> row =
        Tables.rows("en10255.csv").stream().filter(r -> r.get("dn").equals(dn)).findFirst();
    if (row.isEmpty() || series.isEmpty()) {
      pipe.error(
          "choice",
          "Pipe DN " + dn + " is not in the table.",
          "Write outside and wall as measured.");
      return Optional.empty();
    }
    double outside = Double.parseDouble(row.get().get("outside")) / 1000;
    double wall = Double.parseDouble(row.get().get(series)) / 1000;
    if (!(wall > corrosion())) {
      k.get("corrosion").orElse(k).error("range", "leaves no wall.", "");
      return Optional.empty();
    }
    Section full = new Section(outside, wall, 0);
    Section left = new Section(outside, wall - corrosion(), 0);
    return steel(wall)
        .map(
            s ->
                new Tube(
                    "DN " + dn + " " + series + " pipe",
                    bottom_m,
                    bottom_m + length,
                    left,
                    left,
                    s,
                    Tube.Making.UNKNOWN,
                    full.area_m2() * s.density_kgpm3(),
                    "EN 10255 Table 2 (recalled)"));
  }

  private Optional<Tube> fromSchedule(Key pipe, double bottom_m, double length) {
    String nominal = pipe.text("nominal", "");
    String schedule = pipe.text("schedule", "");
    Optional<Map<String, String>> row = Tables.pipe(nominal, schedule);
    if (row.isEmpty()) {
      pipe.error(
          "choice",
          "Pipe " + nominal + " schedule " + schedule + " is not in the table.",
          "Write outside and wall as measured.");
      return Optional.empty();
    }
    double outside = Double.parseDouble(row.get().get("OD")) * 0.0254;
    double wall = Double.parseDouble(row.get().get("tnom")) * 0.0254;
    double nominalMass = Double.parseDouble(row.get().get("W")) * 0.45359237 / 0.3048;
    boolean nominalWall = k.choice("wall-is", "nominal").equals("nominal");
    double strong = nominalWall ? wall * WELDED_PIPE_FACTOR : wall;
    if (nominalWall) {
      faults.taken(
          k.path() + ".wall-is",
          "nominal x 0.93 (" + Unit.MM.print(strong) + ")",
          "section tables",
          Side.SAFE);
    }
    double left = strong - corrosion();
    if (!(left > 0)) {
      k.get("corrosion").orElse(k).error("range", "leaves no wall.", "");
      return Optional.empty();
    }
    Section section = new Section(outside, left, 0);
    return steel(wall)
        .map(
            s ->
                new Tube(
                    nominal + " schedule " + schedule + " pipe",
                    bottom_m,
                    bottom_m + length,
                    section,
                    section,
                    s,
                    Tube.Making.WELDED_PIPE,
                    nominalMass,
                    "pipe table of the AISC manual, ASME B36.10 sizes (read)"));
  }

  private Optional<Tube> fromSizes(double bottom_m, double length) {
    k.choice("wall-is");
    k.yes("measured", false);
    double[] outside = ends("outside");
    double[] wall = ends("wall");
    if (Double.isNaN(outside[0] + outside[1] + wall[0] + wall[1])) {
      return Optional.empty();
    }
    k.get("outside").filter(Key::isScalar).ifPresent(o -> tradeSize(o, outside[0]));
    int sides = sides();
    double flat = sides > 0 && k.choice("across").equals("corners") ? Math.cos(Math.PI / sides) : 1;
    double left0 = wall[0] - corrosion();
    double left1 = wall[1] - corrosion();
    if (!(left0 > 0)
        || !(left1 > 0)
        || outside[0] * flat < 2 * wall[0]
        || outside[1] * flat < 2 * wall[1]) {
      k.error("range", "The wall does not fit the tube.", "");
      return Optional.empty();
    }
    Section bottom = new Section(outside[0] * flat, left0, sides);
    Section top = new Section(outside[1] * flat, left1, sides);
    Section fullBottom = new Section(outside[0] * flat, wall[0], sides);
    Section fullTop = new Section(outside[1] * flat, wall[1], sides);
    Tube.Making making = Tables.making(outside[0] * 1000, wall[0] * 1000);
    return steel(Math.max(wall[0], wall[1]))
        .map(
            s -> {
              Section half =
                  new Section((outside[0] + outside[1]) / 2 * flat, (wall[0] + wall[1]) / 2, sides);
              double mean = (fullBottom.area_m2() + 4 * half.area_m2() + fullTop.area_m2()) / 6;
              String label =
                  Unit.MM.print(outside[0], 4)
                      + (outside[0] == outside[1] ? "" : " to " + Unit.MM.print(outside[1], 4))
                      + " × "
                      + Unit.MM.print(wall[0], 3)
                      + (sides > 0 ? ", " + sides + "-sided" : "");
              return new Tube(
                  label,
                  bottom_m,
                  bottom_m + length,
                  bottom,
                  top,
                  s,
                  making,
                  mean * s.density_kgpm3(),
                  "sizes as given");
            });
  }

  private void tradeSize(Key o, double outside) {
    double inches = outside / 0.0254;
    boolean typedInches = o.text().endsWith("in");
    Optional<Double> real = Tables.outsideOfTradeSize(inches);
    if (typedInches
        && real.isPresent()
        && Math.abs(real.get() - inches) > 0.01
        && !k.yes("measured", false)) {
      o.error(
          "E8",
          o.text()
              + " is the trade size of pipe that measures "
              + Numbers.fixed(real.get(), 3)
              + " in.",
          "Write `pipe: {nominal: "
              + o.text()
              + ", schedule: 40}`; or, if you measured "
              + Numbers.fixed(inches, 2)
              + " in across, add `measured: true`.");
    }
  }

  private int sides() {
    String shape = k.choice("shape", "round");
    if (!shape.startsWith("polygon-")) {
      return 0;
    }
    int sides = Integer.parseInt(shape.substring("polygon-".length()));
    if (!k.has("across")) {
      Key outside = k.get("outside").orElse(k);
      String size = outside.isScalar() ? " of " + outside.text() : "";
      outside.error(
          "E16",
          "A " + sides + "-sided tube" + size + ": across flats or corners?",
          "Add `across: flats` or `across: corners`.");
    }
    return sides;
  }

  /** One value for both ends, or {bottom, top}. */
  private double[] ends(String key) {
    Optional<Key> found = k.need(key, "missing", "The tube's " + key + " is not given.");
    if (found.isEmpty()) {
      return new double[] {Double.NaN, Double.NaN};
    }
    if (found.get().isMap()) {
      double[] both = {
        found.get().required("bottom", Dimension.LENGTH, "At the bottom?"),
        found.get().required("top", Dimension.LENGTH, "At the top?")
      };
      found.get().close();
      return both;
    }
    OptionalDouble one = k.positive(key, Dimension.LENGTH);
    return new double[] {one.orElse(Double.NaN), one.orElse(Double.NaN)};
  }
}
