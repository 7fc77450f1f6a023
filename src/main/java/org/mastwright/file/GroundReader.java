package org.mastwright.file;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.mastwright.design.Ground;
import org.mastwright.units.Dimension;
import org.mastwright.units.Unit;

/** Anchors by name or for guys in short form, and the footing. */
final class GroundReader {
  private static final double SAME_ANCHOR_M = 0.3;
  private static final double NEAR_ANCHOR_M = 1.5;
  private static final double CONCRETE_KGPM3 = 2300;

  /** Cube strength over cylinder strength of usual concrete; recalled from EN 206 class names. */
  private static final double CYLINDER_OVER_CUBE = 0.8;

  private final Faults faults;
  private final double declination_rad;
  private final List<Ground.Anchor> anchors = new ArrayList<>();

  /** The lowest level whose guys end at each anchor; 0 for none yet. */
  private final List<Integer> usedBy = new ArrayList<>();

  private final List<ForGuys> templates = new ArrayList<>();

  /** What stands in ground.anchors for guys in short form. */
  private record ForGuys(List<Double> bearings_rad, List<Integer> sets, Ground.Kind kind) {
    boolean fits(double bearing_rad, int set) {
      boolean there =
          bearings_rad.isEmpty()
              || bearings_rad.stream()
                  .anyMatch(b -> Math.abs(Math.sin((b - bearing_rad) / 2)) < 1e-3);
      return there && (sets.isEmpty() || sets.contains(set));
    }
  }

  GroundReader(Faults faults, double declination_rad) {
    this.faults = faults;
    this.declination_rad = declination_rad;
  }

  List<Ground.Anchor> anchors() {
    return List.copyOf(anchors);
  }

  /** Reads anchors and footing; the anchors of the short form come later, with the guys. */
  Optional<Ground.Foundation> read(Optional<Key> ground) {
    if (ground.isEmpty()) {
      return Optional.empty();
    }
    ground.get().get("anchors").ifPresent(list -> list.items().forEach(this::anchor));
    Optional<Ground.Foundation> footing = ground.get().get("foundation").flatMap(this::foundation);
    ground.get().close();
    return footing;
  }

  private void anchor(Key k) {
    String name = k.text("name", "");
    if (name.isEmpty()) {
      template(k);
      return;
    }
    if (anchors.stream().anyMatch(a -> a.name().equals(name))) {
      k.error("duplicate", "There are two anchors named " + name + ".", "Give each its own name.");
    }
    double bearing =
        k.need("bearing", "missing", "The anchor's bearing is missing.")
                .map(Key::bearing)
                .orElse(0.0)
            + declination_rad;
    double eye = k.value("eye", Dimension.LENGTH).orElse(0);
    OptionalDouble out = k.positive("out", Dimension.LENGTH);
    OptionalDouble tape = k.positive("tape", Dimension.LENGTH);
    if (out.isPresent() == tape.isPresent()) {
      k.error("missing", "An anchor needs `out` (level) or `tape` (straight), one of them.", "");
    }
    if (tape.isPresent() && tape.getAsDouble() <= Math.abs(eye)) {
      k.error("range", "The tape is shorter than the eye is high or deep.", "");
    }
    double level = out.orElseGet(() -> Math.sqrt(Math.max(0, sq(tape.orElse(0)) - eye * eye)));
    anchors.add(
        new Ground.Anchor(
            name, bearing, level * Math.sin(bearing), level * Math.cos(bearing), eye, kind(k)));
    usedBy.add(0);
    k.close();
  }

  private void template(Key k) {
    List<Double> bearings = new ArrayList<>();
    List<Integer> sets = new ArrayList<>();
    Optional<Key> whom = k.get("for");
    if (whom.isPresent()) {
      whom.get()
          .get("azimuths")
          .ifPresent(l -> l.items().forEach(b -> bearings.add(b.bearing() + declination_rad)));
      whom.get().get("sets").ifPresent(l -> l.items().forEach(s -> sets.add(s.wholeNumber(0))));
      whom.get().close();
    }
    for (String own : List.of("bearing", "out", "tape", "eye")) {
      if (k.has(own)) {
        k.error("missing", "An anchor with a place of its own needs a name.", "Add `name:`.");
        break;
      }
    }
    templates.add(new ForGuys(bearings, sets, kind(k)));
    k.close();
  }

  private static double sq(double v) {
    return v * v;
  }

  private static Ground.Kind kind(Key k) {
    String kind = k.choice("kind");
    if (kind.isEmpty()) {
      if (!k.has("kind")) {
        k.error(
            "missing",
            "What kind of anchor is it? It is never guessed.",
            "Add `kind: screw`, block, rock or tested.");
      }
      return new Ground.Kind.NotDescribed();
    }
    for (String other : List.of("screw", "block", "rock", "tested")) {
      if (!other.equals(kind) && k.has(other)) {
        k.get(other)
            .orElseThrow()
            .error("choice", "The anchor's kind is " + kind + ".", "Keep one of the two.");
      }
    }
    Optional<Key> body = k.get(kind);
    Ground.Kind read =
        switch (kind) {
          case "tested" -> body.map(GroundReader::tested).orElse(null);
          case "screw" -> body.map(GroundReader::screw).orElse(null);
          case "block" -> body.map(GroundReader::block).orElse(null);
          default -> body.map(GroundReader::rock).orElse(null);
        };
    if (read == null) {
      k.error(
          "missing",
          "The size of the " + kind + " anchor is never guessed.",
          "Add `" + kind + ":`.");
      return new Ground.Kind.NotDescribed();
    }
    body.orElseThrow().close();
    return read;
  }

  private static Ground.Kind tested(Key t) {
    return new Ground.Kind.Tested(
        t.required("held", Dimension.FORCE, "What did it hold?"),
        t.value("for", Dimension.TIME).orElse(0),
        t.yes("failed", false));
  }

  private static Ground.Kind screw(Key s) {
    OptionalDouble depth = s.positive("depth", Dimension.LENGTH);
    OptionalDouble rod = s.positive("rod-length", Dimension.LENGTH);
    if (depth.isPresent() && rod.isPresent()) {
      Key at = s.get("depth").orElseThrow();
      if (depth.getAsDouble() == rod.getAsDouble()) {
        double down = rod.getAsDouble() * Math.sin(Math.PI / 4);
        at.error(
            "E19",
            at.text()
                + " is also the rod length. A rod set in line with a guy at 45 deg goes only "
                + at.alike(down, Dimension.LENGTH)
                + " deep.",
            "Give `rod-length: " + at.text() + ", angle: in-line`, and leave `depth` out.");
      } else {
        at.error("choice", "depth and rod-length are both given.", "Keep one of the two.");
      }
    }
    if (depth.isEmpty() && rod.isEmpty()) {
      s.error(
          "missing",
          "How deep does the screw sit?",
          "Add `rod-length:` and `angle:`, or `depth:`.");
    }
    return new Ground.Kind.Screw(
        s.required("helix", Dimension.LENGTH, "How wide is the helix?"),
        s.integer("count", 1),
        s.positive("rod", Dimension.LENGTH).orElse(0),
        rod,
        depth,
        s.choice("angle", depth.isPresent() ? "vertical" : "in-line").equals("in-line"),
        s.positive("torque", Dimension.MOMENT),
        s.positive("holding", Dimension.FORCE));
  }

  private static Ground.Kind block(Key b) {
    return new Ground.Kind.Block(
        b.required("length", Dimension.LENGTH, "How long is the block?"),
        b.required("width", Dimension.LENGTH, "How wide is the block?"),
        b.required("height", Dimension.LENGTH, "How high is the block?"),
        b.value("top-below-ground", Dimension.LENGTH).orElse(0),
        b.positive("density", Dimension.DENSITY).orElse(CONCRETE_KGPM3));
  }

  private static Ground.Kind rock(Key r) {
    return new Ground.Kind.Rock(
        r.required("hole", Dimension.LENGTH, "How wide is the hole?"),
        r.required("bonded", Dimension.LENGTH, "How long is the bond?"),
        r.required("bar", Dimension.LENGTH, "How thick is the bar?"),
        r.required("grade", Dimension.PRESSURE, "How strong is the bar?"),
        r.required("bond", Dimension.PRESSURE, "How strong is the bond?"));
  }

  private Optional<Ground.Foundation> foundation(Key f) {
    f.need("kind", "missing", "What kind of footing is it?");
    String kind = f.choice("kind");
    for (String other : List.of("pad", "pier", "embedded")) {
      if (!other.equals(kind) && f.has(other)) {
        f.get(other)
            .orElseThrow()
            .error("choice", "The footing's kind is " + kind + ".", "Keep one of the two.");
      }
    }
    Optional<Ground.Shape> shape =
        switch (kind) {
          case "" -> Optional.empty();
          case "rock" -> Optional.of(new Ground.Shape.OnRock());
          default ->
              f.need(kind, "missing", "The sizes of the " + kind + " are missing.")
                  .map(k -> shape(kind, k));
        };
    OptionalDouble strength = OptionalDouble.empty();
    double density = CONCRETE_KGPM3;
    Optional<Key> concrete = f.get("concrete");
    if (concrete.isPresent()) {
      strength = strength(concrete.get());
      density = concrete.get().positive("density", Dimension.DENSITY).orElse(density);
      concrete.get().close();
    }
    Optional<Ground.Bars> bars = f.get("bars").map(GroundReader::bars);
    f.close();
    OptionalDouble cylinder = strength;
    double weight = density;
    return shape.map(s -> new Ground.Foundation(s, cylinder, weight, bars));
  }

  private static Ground.Shape shape(String kind, Key k) {
    Ground.Shape shape =
        switch (kind) {
          case "pad" ->
              new Ground.Shape.Pad(
                  k.required("length", Dimension.LENGTH, "How long is the pad?"),
                  k.required("width", Dimension.LENGTH, "How wide is the pad?"),
                  k.required("thickness", Dimension.LENGTH, "How thick is the pad?"),
                  k.required("underside", Dimension.LENGTH, "How deep is its underside?"),
                  k.value("stands-out", Dimension.LENGTH).orElse(0));
          case "pier" ->
              new Ground.Shape.Pier(
                  k.required("diameter", Dimension.LENGTH, "How wide is the pier?"),
                  k.required("below-ground", Dimension.LENGTH, "How deep is the pier?"),
                  k.value("stands-out", Dimension.LENGTH).orElse(0));
          default ->
              new Ground.Shape.Embedded(
                  k.required("depth", Dimension.LENGTH, "How deep is the pole set?"),
                  k.required("diameter", Dimension.LENGTH, "How wide is the hole?"));
        };
    k.close();
    return shape;
  }

  /** Cylinder strength: as stated, four fifths of a cube's, or the first number of a grade. */
  private static OptionalDouble strength(Key c) {
    OptionalDouble stated = c.positive("strength", Dimension.PRESSURE);
    boolean cube = c.choice("test", "cylinder").equals("cube");
    Optional<Key> grade = c.get("grade");
    if (grade.isEmpty()) {
      return cube && stated.isPresent()
          ? OptionalDouble.of(CYLINDER_OVER_CUBE * stated.getAsDouble())
          : stated;
    }
    if (stated.isPresent()) {
      c.error("choice", "Both a strength and a grade are given.", "Keep one of the two.");
    }
    if (!grade.get().text().matches("C\\d{2,3}/\\d{2,3}")) {
      grade
          .get()
          .error(
              "choice",
              "\"" + grade.get().text() + "\" is no concrete grade.",
              "Write a grade such as C30/37.");
      return OptionalDouble.empty();
    }
    String number = grade.get().text().substring(1, grade.get().text().indexOf('/'));
    return OptionalDouble.of(Double.parseDouble(number) * Unit.MPA.factor());
  }

  private static Ground.Bars bars(Key b) {
    b.need("count", "missing", "How many bars?");
    Ground.Bars bars =
        new Ground.Bars(
            b.integer("count", 0),
            b.required("size", Dimension.LENGTH, "How thick are the bars?"),
            b.required("cover", Dimension.LENGTH, "How much concrete is outside the bars?"),
            b.positive("ties", Dimension.LENGTH));
    b.close();
    return bars;
  }

  /** A guy of a level ends at an anchor. */
  void use(int anchor, int set) {
    if (usedBy.get(anchor) == 0) {
      usedBy.set(anchor, set);
    }
  }

  /** Index of a named anchor, or -1. */
  int named(String name) {
    int found = -1;
    for (int i = 0; i < anchors.size(); i++) {
      found = anchors.get(i).name().equals(name) ? i : found;
    }
    return found;
  }

  /**
   * Index of the anchor of a guy in short form: one that is there, or a new one. Eyes within 0.3 m
   * are one anchor, those nearer than 1.5 m are asked about.
   */
  int place(Key at, int set, double bearing_rad, double out_m, double up_m) {
    double east = out_m * Math.sin(bearing_rad);
    double north = out_m * Math.cos(bearing_rad);
    for (int i = 0; i < anchors.size(); i++) {
      Ground.Anchor a = anchors.get(i);
      double apart =
          Math.sqrt(sq(a.east_m() - east) + sq(a.north_m() - north) + sq(a.up_m() - up_m));
      if (apart < SAME_ANCHOR_M) {
        use(i, set);
        return i;
      }
      if (apart < NEAR_ANCHOR_M) {
        faults.warning(
            "E14",
            at,
            (usedBy.get(i) > 0
                    ? "The guys of sets " + usedBy.get(i) + " and " + set
                    : "Anchor " + a.name() + " and the guys of set " + set)
                + " to the "
                + Compass.point(bearing_rad)
                + " end "
                + at.alike(apart, Dimension.LENGTH)
                + " apart. One anchor or two?",
            "If one, give both the same radius; pulls are added only then.");
      }
    }
    Ground.Kind kind =
        templates.stream()
            .filter(t -> t.fits(bearing_rad, set))
            .map(ForGuys::kind)
            .findFirst()
            .orElse(new Ground.Kind.NotDescribed());
    anchors.add(
        new Ground.Anchor("A" + (anchors.size() + 1), bearing_rad, east, north, up_m, kind));
    usedBy.add(set);
    return anchors.size() - 1;
  }
}
