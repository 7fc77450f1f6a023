package org.mastwright.file;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.mastwright.design.GuySet;
import org.mastwright.design.Raising;
import org.mastwright.design.Tube;
import org.mastwright.units.Dimension;

/** How the mast is tilted up: read and kept; nothing is calculated from it yet. */
final class RaisingReader {
  private static final double SHEAVE = 0.95;

  private final Key r;
  private final MastPlaces places;
  private final double declination_rad;

  RaisingReader(Key r, MastPlaces places, double declination_rad) {
    this.r = r;
    this.places = places;
    this.declination_rad = declination_rad;
  }

  Optional<Raising> read(int guySets, List<String> anchors) {
    Optional<Raising.Hinge> hinge =
        r.need("hinge", "missing", "Where is the hinge?").map(RaisingReader::hinge);
    Optional<Raising.GinPole> pole =
        r.need("gin-pole", "missing", "The gin pole is not described.")
            .flatMap(RaisingReader::pole);
    List<Raising.LiftingLine> lines = new ArrayList<>();
    r.need("lines", "missing", "Which lines go from the mast to the gin pole?")
        .ifPresent(list -> list.items().forEach(l -> lines.add(line(l, guySets))));
    Optional<Raising.Haul> haul =
        r.need("haul", "missing", "The hauling line is not described.").map(RaisingReader::haul);
    Optional<Raising.Winch> winch = r.get("winch").map(this::winch);
    List<Raising.Prop> props = new ArrayList<>();
    r.get("props").ifPresent(list -> list.items().forEach(p -> props.add(prop(p))));
    String backGuy = r.text("back-guy", "");
    if (!backGuy.isEmpty() && !anchors.contains(backGuy)) {
      r.get("back-guy")
          .orElseThrow()
          .error(
              "anchor",
              "There is no anchor named " + backGuy + ".",
              "Named: " + String.join(", ", anchors) + ".");
    }
    String with = r.choice("lift-with", "rotor");
    OptionalDouble wind = r.positive("wind-limit", Dimension.SPEED);
    r.close();
    if (hinge.isEmpty() || pole.isEmpty() || haul.isEmpty()) {
      return Optional.empty();
    }
    return Optional.of(
        new Raising(hinge.get(), pole.get(), lines, haul.get(), winch, props, backGuy, with, wind));
  }

  private static Raising.Hinge hinge(Key h) {
    Raising.Hinge hinge =
        new Raising.Hinge(
            h.need("height", "missing", "How high is the hinge?")
                .map(k -> k.si(Dimension.LENGTH))
                .orElse(Double.NaN),
            h.value("ahead", Dimension.LENGTH).orElse(0),
            h.required("pin", Dimension.LENGTH, "How thick is the pin?"),
            h.text("grade", ""));
    h.close();
    return hinge;
  }

  private static Optional<Raising.GinPole> pole(Key p) {
    double length = p.required("length", Dimension.LENGTH, "How long is the gin pole?");
    boolean stays = p.yes("side-stays", false);
    Optional<Tube> tube = new TubeReader(p).read(0);
    p.close();
    return tube.map(t -> new Raising.GinPole(length, t, stays));
  }

  private Raising.LiftingLine line(Key l, int guySets) {
    int set = l.integer("to-set", 0);
    OptionalDouble height = l.value("to-height", Dimension.LENGTH);
    if (l.has("to-set") == height.isPresent()) {
      l.error("missing", "A line goes `to-set` or `to-height`, one of them.", "");
    }
    if (l.has("to-set") && (set < 1 || set > guySets)) {
      l.get("to-set")
          .orElseThrow()
          .error(
              "range", "There are " + guySets + " guy levels, counted from 1 at the lowest.", "");
    }
    Optional<Key> rope = l.get("rope");
    boolean stays = l.yes("stays-as-guy", false);
    if (rope.isEmpty() && !stays) {
      l.error(
          "missing",
          "The rope of this line is not given.",
          "Add `rope:`, or `stays-as-guy: true`.");
    }
    OptionalDouble along =
        height.isPresent()
            ? OptionalDouble.of(height.getAsDouble() - places.foot_m())
            : OptionalDouble.empty();
    if (along.isPresent()
        && !(along.getAsDouble() > 0 && along.getAsDouble() <= places.length_m())) {
      places.off(l.get("to-height").orElseThrow(), along.getAsDouble(), true);
    }
    Optional<GuySet.Rope> read = rope.map(RopeReader::rope);
    l.close();
    return new Raising.LiftingLine(along, set, stays, read);
  }

  private static Raising.Haul haul(Key h) {
    GuySet.Rope rope =
        h.need("rope", "missing", "The hauling rope is not given.")
            .map(RopeReader::rope)
            .orElseGet(RopeReader::placeholder);
    Raising.Haul haul =
        new Raising.Haul(
            rope,
            h.integer("parts", 1),
            h.positive("sheave-efficiency", Dimension.ONE).orElse(SHEAVE),
            h.choice("by"));
    h.close();
    return haul;
  }

  private Raising.Winch winch(Key w) {
    Raising.Winch winch =
        new Raising.Winch(
            w.required("rating", Dimension.FORCE, "What is it rated for?"),
            w.choice("at"),
            w.get("bearing").map(Key::bearing).orElse(0.0) + declination_rad,
            w.value("out", Dimension.LENGTH).orElse(0),
            w.value("eye", Dimension.LENGTH).orElse(0));
    w.close();
    return winch;
  }

  private Raising.Prop prop(Key p) {
    double along = p.required("up-the-mast", Dimension.LENGTH, "Where is the prop?");
    double height = p.required("height", Dimension.LENGTH, "How high is the prop?");
    if (along > places.length_m()) {
      places.off(p.get("up-the-mast").orElseThrow(), along, false);
    }
    p.close();
    return new Raising.Prop(along, height);
  }
}
