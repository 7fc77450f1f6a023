package org.mastwright.file;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.mastwright.design.GuySet;
import org.mastwright.design.Joint;
import org.mastwright.design.Tower;
import org.mastwright.design.Tube;
import org.mastwright.units.Dimension;
import org.mastwright.working.DefaultTaken.Side;

/** Tubes, foot, joints, objects and guys. */
final class TowerReader {
  private final Faults faults;
  private final double declination_rad;
  private final GroundReader ground;

  TowerReader(Faults faults, double declination_rad, GroundReader ground) {
    this.faults = faults;
    this.declination_rad = declination_rad;
    this.ground = ground;
  }

  Tower read(Key t, boolean verification) {
    Tower.Kind kind = towerKind(t);
    double foot = t.value("foot-level", Dimension.LENGTH).orElse(0);
    MastPlaces places = new MastPlaces(foot, tubes(t));
    List<Joint> joints = new ArrayList<>();
    t.get("joints")
        .ifPresent(l -> l.items().forEach(k -> JointReader.read(k, places).ifPresent(joints::add)));
    List<Tower.Attachment> objects = new ArrayList<>();
    t.get("attachments").ifPresent(l -> l.items().forEach(k -> object(k, places, objects)));
    List<GuySet> guys = new ArrayList<>();
    t.get("guys")
        .ifPresent(
            l -> {
              for (Key k : l.items()) {
                guys.add(
                    new GuyReader(k, guys.size() + 1, places, ground, declination_rad, verification)
                        .read());
              }
            });
    List<Tower.Opening> openings = new ArrayList<>();
    t.get("tubes")
        .ifPresent(
            l ->
                l.items()
                    .forEach(
                        k ->
                            k.get("openings")
                                .ifPresent(
                                    o -> o.items().forEach(x -> opening(x, places, openings)))));
    for (int i = 1; i < guys.size(); i++) {
      if (guys.get(i).along_m() <= guys.get(i - 1).along_m()) {
        t.error("order", "Guy levels go bottom to top.", "Sort `guys` by height.");
      }
    }
    if (kind == Tower.Kind.GUYED_MAST && guys.isEmpty() && !verification) {
      t.error("missing", "A guyed mast has guys.", "Add `guys:`, or write kind: monopole.");
    }
    if (kind == Tower.Kind.MONOPOLE && !guys.isEmpty()) {
      t.error("choice", "A monopole has no guys.", "Write kind: guyed-mast.");
    }
    Tower tower =
        new Tower(
            kind,
            base(t),
            foot,
            places.tubes(),
            joints,
            damping(t),
            outOfPlumb(t),
            objects,
            guys,
            openings);
    t.close();
    return tower;
  }

  private List<Tube> tubes(Key t) {
    List<Tube> tubes = new ArrayList<>();
    t.need("tubes", "missing", "There are no tubes.")
        .ifPresent(
            list -> {
              double at = 0;
              for (Key k : list.items()) {
                TubeReader reader = new TubeReader(k);
                Optional<Tube> tube = reader.read(at);
                k.close();
                if (tube.isPresent()) {
                  tubes.add(tube.get());
                  at = tube.get().top_m();
                }
              }
            });
    if (tubes.isEmpty()) {
      if (!faults.hasErrors()) {
        t.error("missing", "There are no tubes.", "");
      }
      throw new IllegalArgumentException("no tubes");
    }
    return tubes;
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

  private static void object(Key k, MastPlaces places, List<Tower.Attachment> all) {
    String what = k.text("what", "object");
    double drag = k.value("drag", Dimension.ONE).orElse(1.2);
    if (k.has("from") || k.has("to")) {
      double length = places.length_m();
      double from = k.value("from", Dimension.LENGTH).orElse(places.foot_m()) - places.foot_m();
      double to =
          k.value("to", Dimension.LENGTH).orElse(places.foot_m() + length) - places.foot_m();
      double mass = k.value("mass", Dimension.MASS_PER_LENGTH).orElse(0);
      double width = k.value("width", Dimension.LENGTH).orElse(0);
      k.close();
      if (from < -1e-6) {
        places.off(k.get("from").orElse(k), from, true);
      } else if (to > length + 1e-6) {
        places.off(k.get("to").orElse(k), to, true);
      } else if (!(to > from)) {
        k.error("range", "The object ends below where it begins.", "Swap `from` and `to`.");
      } else {
        all.add(
            new Tower.Attachment(
                what,
                Math.max(0, from),
                Math.min(length, to),
                mass * (to - from),
                width * (to - from) * drag));
      }
      return;
    }
    double s = places.along(k);
    double mass = k.value("mass", Dimension.MASS).orElse(0);
    double area = k.value("area", Dimension.AREA).orElse(0);
    k.close();
    all.add(new Tower.Attachment(what, s, s, mass, area * drag));
  }

  /** Holes in the tubes. */
  private void opening(Key o, MastPlaces places, List<Tower.Opening> all) {
    double along = places.along(o);
    all.add(
        new Tower.Opening(
            along,
            o.required("width", Dimension.LENGTH, "How wide is the opening?"),
            o.required("tall", Dimension.LENGTH, "How tall is the opening?"),
            o.get("facing").map(Key::bearing).orElse(0.0) + declination_rad));
    o.close();
  }
}
