package org.mastwright.file;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.mastwright.design.Ground;
import org.mastwright.design.GuySet;
import org.mastwright.design.Joint;
import org.mastwright.design.Tower;
import org.mastwright.design.Tube;
import org.mastwright.units.Dimension;
import org.mastwright.units.Unit;
import org.mastwright.working.DefaultTaken.Side;

/** Tubes, joints, objects; guys and the anchors they end at. */
final class TowerReader {
  private static final double SAME_ANCHOR_M = 0.3;
  private static final double NEAR_ANCHOR_M = 1.5;

  private final Key top;
  private final Faults faults;
  private final double declination_rad;
  private final List<Ground.Anchor> anchors = new ArrayList<>();

  TowerReader(Key top, double declination_rad) {
    this.top = top;
    this.faults = top.faults();
    this.declination_rad = declination_rad;
  }

  List<Ground.Anchor> anchors() {
    return List.copyOf(anchors);
  }

  /** Named anchors; the foundation is read and not used. */
  Ground readAnchors() {
    Optional<Key> ground = top.get("ground");
    if (ground.isPresent()) {
      ground.get().get("anchors").ifPresent(list -> list.items().forEach(this::anchor));
      if (ground.get().has("foundation")) {
        faults.note(
            "read-not-used",
            "ground.foundation",
            "Foundation: read, not yet used; the footing is listed as not checked.");
      }
      ground.get().close();
    }
    return new Ground(List.of(), Optional.empty());
  }

  private void anchor(Key k) {
    String name = k.text("name", "");
    if (name.isEmpty()) {
      k.known("for");
      if (!k.has("for") && !k.has("kind")) {
        k.error("missing", "An anchor needs a name.", "Add `name:`.");
      }
      return;
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
    double level = out.orElseGet(() -> Math.sqrt(Math.max(0, sq(tape.orElse(0)) - eye * eye)));
    anchors.add(
        new Ground.Anchor(
            name, bearing, level * Math.sin(bearing), level * Math.cos(bearing), eye, kind(k)));
    k.close();
  }

  private static double sq(double v) {
    return v * v;
  }

  private Ground.Kind kind(Key k) {
    String kind = k.text("kind", "");
    k.known("screw", "block", "rock", "tested", "for");
    Optional<Key> body = k.get(kind);
    switch (kind) {
      case "tested" -> {
        if (body.isEmpty()) {
          k.error("missing", "What did it hold?", "Add `tested: {held: …, for: …, failed: no}`.");
          return new Ground.Kind.NotDescribed();
        }
        Ground.Kind t =
            new Ground.Kind.Tested(
                body.get().required("held", Dimension.FORCE, "What did it hold?"),
                body.get().value("for", Dimension.TIME).orElse(0),
                body.get().yes("failed", false));
        body.get().close();
        return t;
      }
      case "screw" -> {
        body.ifPresent(this::screwDepth);
        return new Ground.Kind.Screw(
            0,
            1,
            0,
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            true,
            OptionalDouble.empty(),
            OptionalDouble.empty());
      }
      case "block" -> {
        return new Ground.Kind.Block(0, 0, 0, 0, 0);
      }
      case "rock" -> {
        return new Ground.Kind.Rock(0, 0, 0, 0, 0);
      }
      default -> {
        k.error(
            "choice", "An anchor's kind is screw, block, rock or tested; it is never guessed.", "");
        return new Ground.Kind.NotDescribed();
      }
    }
  }

  private void screwDepth(Key s) {
    OptionalDouble depth = s.value("depth", Dimension.LENGTH);
    OptionalDouble rod = s.value("rod-length", Dimension.LENGTH);
    if (depth.isPresent() && rod.isPresent() && depth.getAsDouble() == rod.getAsDouble()) {
      s.get("depth")
          .orElseThrow()
          .error(
              "E19",
              Unit.IN.print(depth.getAsDouble()) + " is also the rod length.",
              "A rod set in line with a guy does not go that deep. Give `rod-length` and `angle:"
                  + " in-line`, and leave `depth` out.");
    }
  }

  Tower read(Key t, boolean verification) {
    Tower.Kind kind = towerKind(t);
    double foot = t.value("foot-level", Dimension.LENGTH).orElse(0);
    List<Tube> tubes = new ArrayList<>();
    Optional<Key> list = t.need("tubes", "missing", "There are no tubes.");
    if (list.isPresent()) {
      double at = 0;
      for (Key k : list.get().items()) {
        Optional<Tube> tube = new TubeReader(k).read(at);
        if (tube.isPresent()) {
          tubes.add(tube.get());
          at = tube.get().top_m();
        }
      }
    }
    if (tubes.isEmpty()) {
      if (!faults.hasErrors()) {
        t.error("missing", "There are no tubes.", "");
      }
      throw new IllegalArgumentException("no tubes");
    }
    double length = tubes.get(tubes.size() - 1).top_m();
    List<Joint> joints = new ArrayList<>();
    t.get("joints").ifPresent(l -> l.items().forEach(k -> joint(k, foot, length, joints)));
    List<Tower.Attachment> objects = new ArrayList<>();
    t.get("attachments").ifPresent(l -> l.items().forEach(k -> object(k, foot, length, objects)));
    List<GuySet> guys = new ArrayList<>();
    t.get("guys")
        .ifPresent(
            l -> {
              for (Key k : l.items()) {
                guys.add(guySet(k, guys.size() + 1, foot, tubes, verification));
              }
            });
    if (kind == Tower.Kind.GUYED_MAST && guys.isEmpty() && !verification) {
      t.error("missing", "A guyed mast has guys.", "Add `guys:`, or write kind: monopole.");
    }
    if (kind == Tower.Kind.MONOPOLE && !guys.isEmpty()) {
      t.error("choice", "A monopole has no guys.", "Write kind: guyed-mast.");
    }
    Tower tower =
        new Tower(kind, base(t), foot, tubes, joints, damping(t), outOfPlumb(t), objects, guys);
    t.close();
    return tower;
  }

  private static Tower.Kind towerKind(Key t) {
    Optional<Key> k = t.need("kind", "missing", "What kind of tower is it?");
    String word = k.map(Key::text).orElse("");
    for (Tower.Kind x : Tower.Kind.values()) {
      if (x.key().equals(word)) {
        return x;
      }
    }
    k.ifPresent(
        b ->
            b.error(
                "E20",
                "\""
                    + word
                    + "\" cannot be checked here; round and many-sided tubes can:"
                    + " `guyed-mast` or `monopole`.",
                "Do not describe a lattice as one tube: its local members would go unseen."));
    return Tower.Kind.MONOPOLE;
  }

  private Tower.BaseSupport base(Key t) {
    Optional<Key> k = t.need("base", "missing", "How is the foot held?");
    if (k.isEmpty()) {
      return new Tower.BaseSupport.Fixed();
    }
    Key b = k.get();
    if (b.isMap()) {
      Optional<Key> hinged = b.get("hinged");
      OptionalDouble spring = b.positive("rotational-stiffness", Dimension.ROTATIONAL_STIFFNESS);
      b.close();
      if (hinged.isPresent()) {
        Optional<Key> axis = hinged.get().need("axis", "missing", "Which way does the pin lie?");
        hinged.get().close();
        return new Tower.BaseSupport.Hinged(axis.map(Key::bearing).orElse(0.0) + declination_rad);
      }
      return new Tower.BaseSupport.Sprung(spring.orElse(Double.NaN));
    }
    return switch (b.text()) {
      case "pinned" -> new Tower.BaseSupport.Pinned();
      case "fixed" -> new Tower.BaseSupport.Fixed();
      default -> {
        b.error(
            "choice",
            "\"" + b.text() + "\" is no base known here.",
            "Write pinned, fixed, {hinged: {axis: 0 deg}} or {rotational-stiffness: 25 MN.m/rad}.");
        yield new Tower.BaseSupport.Fixed();
      }
    };
  }

  private double damping(Key t) {
    OptionalDouble ratio = t.positive("damping-ratio", Dimension.ONE);
    OptionalDouble decrement = t.positive("log-decrement", Dimension.ONE);
    if (ratio.isPresent() && decrement.isPresent()) {
      t.error("choice", "damping-ratio and log-decrement are both given.", "Keep one.");
    }
    if (ratio.isEmpty() && decrement.isEmpty()) {
      faults.taken("tower.damping-ratio", "0.2 %, welded tube", "recalled", Side.SAFE);
    }
    return ratio.orElse(decrement.isPresent() ? decrement.getAsDouble() / (2 * Math.PI) : 0.002);
  }

  private double outOfPlumb(Key t) {
    OptionalDouble lean = t.positive("out-of-plumb", Dimension.ONE);
    if (lean.isEmpty()) {
      faults.taken("tower.out-of-plumb", "1/500", "practice", Side.NEUTRAL);
    }
    return lean.orElse(1.0 / 500);
  }

  /** A place by `height` above the datum or `up-the-mast`. */
  private double place(Key k, double foot, double length) {
    OptionalDouble height = k.value("height", Dimension.LENGTH);
    OptionalDouble along = k.value("up-the-mast", Dimension.LENGTH);
    if (height.isPresent() == along.isPresent()) {
      k.error("missing", "Give `height` or `up-the-mast`, one of them.", "");
      return 0;
    }
    double s = along.orElseGet(() -> height.orElse(0) - foot);
    if (s > length + 1e-6 || s < -1e-6) {
      k.error(
          "E11",
          Unit.M.print(s + foot)
              + " is not on the mast, which goes from "
              + Unit.M.print(foot)
              + " to "
              + Unit.M.print(foot + length)
              + ".",
          "If it was measured along the mast, say `up-the-mast`.");
    }
    return Math.max(0, Math.min(length, s));
  }

  private void joint(Key k, double foot, double length, List<Joint> all) {
    double s = place(k, foot, length);
    String word = k.text("kind", "");
    Joint.Kind kind = null;
    for (Joint.Kind x : Joint.Kind.values()) {
      kind = x.key().equals(word) ? x : kind;
    }
    if (kind == null) {
      k.error("choice", "\"" + word + "\" is no joint known here.", "");
      return;
    }
    k.known(
        "shape",
        "size",
        "plate",
        "bolts",
        "bolt",
        "grade",
        "bolt-circle",
        "weld",
        "rods",
        "gap",
        "grout",
        "thread",
        "overlap",
        "outside",
        "thickness",
        "preload",
        "detail-category");
    k.close();
    all.add(new Joint(s, kind, OptionalDouble.empty(), Map.of(), Map.of(), k.integer("bolts", 0)));
  }

  private void object(Key k, double foot, double length, List<Tower.Attachment> all) {
    String what = k.text("what", "object");
    if (k.has("from") || k.has("to")) {
      double from = k.value("from", Dimension.LENGTH).orElse(foot) - foot;
      double to = k.value("to", Dimension.LENGTH).orElse(foot + length) - foot;
      double mass = k.value("mass", Dimension.MASS_PER_LENGTH).orElse(0);
      double width = k.value("width", Dimension.LENGTH).orElse(0);
      double drag = k.value("drag", Dimension.ONE).orElse(1.2);
      k.close();
      if (!(to > from) || from < -1e-6 || to > length + 1e-6) {
        k.error("E11", "The object does not lie on the mast.", "");
        return;
      }
      all.add(
          new Tower.Attachment(
              what,
              Math.max(0, from),
              Math.min(length, to),
              mass * (to - from),
              width * (to - from) * drag));
      return;
    }
    double s = place(k, foot, length);
    double mass = k.value("mass", Dimension.MASS).orElse(0);
    double area = k.value("area", Dimension.AREA).orElse(0);
    double drag = k.value("drag", Dimension.ONE).orElse(1.2);
    k.close();
    all.add(new Tower.Attachment(what, s, s, mass, area * drag));
  }

  private GuySet guySet(Key k, int number, double foot, List<Tube> tubes, boolean verification) {
    double length = tubes.get(tubes.size() - 1).top_m();
    double s = place(k, foot, length);
    double radius = radiusAt(tubes, s);
    List<GuySet.Guy> guys = k.has("to") ? named(k) : shortForm(k, verification);
    GuySet.Rope rope = new RopeReader(k).rope();
    GuySet.EndFitting ends = new RopeReader(k).ends();
    GuySet.Tension tension = new RopeReader(k).tension(guys.size());
    boolean atAnchor = true;
    if (tension instanceof GuySet.Tension.Force) {
      Optional<Key> at = k.need("tension-at", "E12", "The tension is a force: at which end?");
      atAnchor = at.map(a -> !a.text().equals("mast")).orElse(true);
    }
    k.known("tension-at");
    int setting = 0;
    Optional<Key> of = k.get("tension-of");
    if (of.isPresent()) {
      for (int i = 0; i < guys.size(); i++) {
        if (anchors.get(guys.get(i).anchor()).name().equals(of.get().text())) {
          setting = i;
        }
      }
    }
    GuySet set =
        new GuySet(
            number,
            s,
            k.value("arm", Dimension.LENGTH).orElse(radius),
            rope,
            ends,
            new RopeReader(k).hardware(),
            tension,
            atAnchor,
            k.value("tolerance", Dimension.ONE).orElse(0.10),
            setting,
            k.yes("upright", !verification) && !verification,
            k.value("thermal-expansion", Dimension.THERMAL_EXPANSION).orElse(12e-6),
            guys);
    k.close();
    return set;
  }

  private static double radiusAt(List<Tube> tubes, double s) {
    for (Tube t : tubes) {
      if (s <= t.top_m() + 1e-9) {
        return t.sectionAt(s).outside_m() / 2;
      }
    }
    return 0;
  }

  private List<GuySet.Guy> named(Key k) {
    List<GuySet.Guy> guys = new ArrayList<>();
    for (Key name : k.get("to").orElseThrow().items()) {
      int found = -1;
      for (int i = 0; i < anchors.size(); i++) {
        found = anchors.get(i).name().equals(name.text()) ? i : found;
      }
      if (found < 0) {
        name.error(
            "anchor",
            "There is no anchor named " + name.text() + ".",
            "Named: " + String.join(", ", anchors.stream().map(Ground.Anchor::name).toList()));
      } else {
        Ground.Anchor a = anchors.get(found);
        guys.add(new GuySet.Guy(Math.atan2(a.east_m(), a.north_m()), found));
      }
    }
    return guys;
  }

  private List<GuySet.Guy> shortForm(Key k, boolean verification) {
    List<GuySet.Guy> guys = new ArrayList<>();
    Optional<Key> azimuths =
        k.need(
            "azimuths", "missing", "Where do the guys go? Name anchors in `to`, or give azimuths.");
    if (azimuths.isEmpty()) {
      return guys;
    }
    List<Key> all = azimuths.get().items();
    double[] radius = values(k, "radius", all.size());
    double[] level = values(k, "anchor-level", all.size());
    for (int i = 0; i < all.size(); i++) {
      double bearing = all.get(i).bearing() + declination_rad;
      guys.add(new GuySet.Guy(bearing, place(all.get(i), bearing, radius[i], level[i])));
    }
    if (!verification) {
      faults.open(
          "anchors-not-described",
          "ground.anchors",
          "The anchors of guys in short form are not described: what they hold is not checked.",
          "Describe them in ground.anchors and name them in `to`.");
    }
    return guys;
  }

  private static double[] values(Key k, String key, int count) {
    double[] out = new double[count];
    Optional<Key> found = k.get(key);
    if (found.isEmpty()) {
      if (key.equals("radius")) {
        k.error("missing", "How far out are the anchors?", "Add `radius:`.");
      }
      return out;
    }
    List<Key> items = found.get().items();
    if (items.size() != 1 && items.size() != count) {
      found
          .get()
          .error(
              "E13",
              "has " + items.size() + " values but there are " + count + " guys in this set.",
              "Give one value or " + count + ".");
    }
    for (int i = 0; i < count; i++) {
      out[i] =
          items.get(items.size() == 1 ? 0 : Math.min(i, items.size() - 1)).si(Dimension.LENGTH);
    }
    return out;
  }

  /** Index of the anchor at a place: one that is there, or a new one. */
  private int place(Key at, double bearing, double radius, double level) {
    double east = radius * Math.sin(bearing);
    double north = radius * Math.cos(bearing);
    for (int i = 0; i < anchors.size(); i++) {
      Ground.Anchor a = anchors.get(i);
      double apart =
          Math.sqrt(sq(a.east_m() - east) + sq(a.north_m() - north) + sq(a.up_m() - level));
      if (apart < SAME_ANCHOR_M) {
        if (apart < 1e-9) {
          return i;
        }
      } else if (apart < NEAR_ANCHOR_M) {
        faults.warning(
            "E14",
            at,
            "Two guys end " + Unit.M.print(apart) + " apart. One anchor or two?",
            "If one, give both the same radius; pulls are added only then.");
      }
    }
    anchors.add(
        new Ground.Anchor(
            "A" + (anchors.size() + 1),
            bearing,
            east,
            north,
            level,
            new Ground.Kind.NotDescribed()));
    return anchors.size() - 1;
  }
}
