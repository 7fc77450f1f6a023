package org.mastwright.file;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import org.mastwright.design.Verification;
import org.mastwright.design.Verification.Vector;
import org.mastwright.units.Dimension;

/** Direct loads in place of site and turbine. */
final class VerificationReader {
  private final Key v;

  VerificationReader(Key v) {
    this.v = v;
  }

  Verification read() {
    double gravity = v.value("gravity", Dimension.ACCELERATION).orElse(9.80665);
    Optional<Verification.HeadBody> head = v.get("head").map(this::head);
    List<Verification.PointMass> masses = new ArrayList<>();
    for (Key m : list(v, "masses")) {
      masses.add(new Verification.PointMass(height(m), m.value("mass", Dimension.MASS).orElse(0)));
      m.close();
    }
    List<Verification.DirectCase> cases = new ArrayList<>();
    for (Key c : list(v, "cases")) {
      cases.add(directCase(c));
    }
    Verification all =
        new Verification(
            gravity,
            v.value("mast-added-mass", Dimension.MASS_PER_LENGTH).orElse(0),
            v.yes("shear-flexible", true),
            v.yes("guy-inertia", false),
            v.has("elements") ? OptionalInt.of(v.integer("elements", 20)) : OptionalInt.empty(),
            v.integer("modes", 6),
            head,
            masses,
            cases);
    v.close();
    return all;
  }

  private static List<Key> list(Key k, String key) {
    return k.get(key).map(Key::items).orElse(List.of());
  }

  private static double height(Key k) {
    return k.value("height", Dimension.LENGTH).orElse(0);
  }

  private static Vector vector(Optional<Key> k, Dimension d, String prefix) {
    if (k.isEmpty()) {
      return new Vector(0, 0, 0);
    }
    return new Vector(
        k.get().value(prefix + "east", d).orElse(0),
        k.get().value(prefix + "north", d).orElse(0),
        k.get().value(prefix + "up", d).orElse(0));
  }

  private Verification.HeadBody head(Key h) {
    Verification.HeadBody body =
        new Verification.HeadBody(
            h.value("mass", Dimension.MASS).orElse(0),
            vector(h.get("centre"), Dimension.LENGTH, ""),
            vector(h.get("inertia"), Dimension.MASS_INERTIA, "about-"));
    h.close();
    return body;
  }

  private Verification.DirectCase directCase(Key c) {
    List<Verification.DirectForce> forces = new ArrayList<>();
    for (Key f : list(c, "forces")) {
      forces.add(
          new Verification.DirectForce(
              height(f),
              vector(Optional.of(f), Dimension.FORCE, ""),
              vector(f.get("at"), Dimension.LENGTH, "")));
      f.close();
    }
    List<Verification.DirectMoment> moments = new ArrayList<>();
    for (Key m : list(c, "moments")) {
      moments.add(
          new Verification.DirectMoment(
              height(m), vector(Optional.of(m), Dimension.MOMENT, "about-")));
      m.close();
    }
    List<Verification.LineLoad> lines = new ArrayList<>();
    for (Key l : list(c, "mast-line-loads")) {
      lines.add(line(l));
    }
    List<Verification.GuyLoad> guys = new ArrayList<>();
    for (Key g : list(c, "guy-line-loads")) {
      guys.add(
          new Verification.GuyLoad(
              g.has("set") ? OptionalInt.of(g.integer("set", 1)) : OptionalInt.empty(),
              g.get("azimuth").map(Key::bearing),
              vector(Optional.of(g), Dimension.FORCE_PER_LENGTH, "")));
      g.close();
    }
    List<Verification.LineMass> ice = new ArrayList<>();
    for (Key m : list(c, "mast-line-masses")) {
      ice.add(
          new Verification.LineMass(
              m.value("from", Dimension.LENGTH).orElse(0),
              m.value("to", Dimension.LENGTH).orElse(0),
              m.value("mass", Dimension.MASS_PER_LENGTH).orElse(0)));
      m.close();
    }
    List<Verification.RemovedGuy> gone = new ArrayList<>();
    for (Key r : list(c, "guys-removed")) {
      gone.add(
          new Verification.RemovedGuy(
              r.integer("set", 1), r.get("azimuth").map(Key::bearing).orElse(0.0)));
      r.close();
    }
    String id = c.text("id", "V");
    double dt = c.value("temperature-change", Dimension.TEMPERATURE_CHANGE).orElse(0);
    c.close();
    return new Verification.DirectCase(id, dt, forces, moments, lines, guys, ice, gone);
  }

  /** Each component one value, or {bottom, top}. */
  private static Verification.LineLoad line(Key l) {
    double[] bottom = new double[3];
    double[] top = new double[3];
    String[] names = {"east", "north", "up"};
    for (int i = 0; i < 3; i++) {
      Optional<Key> k = l.get(names[i]);
      if (k.isPresent() && k.get().isMap()) {
        bottom[i] = k.get().value("bottom", Dimension.FORCE_PER_LENGTH).orElse(0);
        top[i] = k.get().value("top", Dimension.FORCE_PER_LENGTH).orElse(0);
        k.get().close();
      } else if (k.isPresent()) {
        bottom[i] = k.get().si(Dimension.FORCE_PER_LENGTH);
        top[i] = bottom[i];
      }
    }
    Verification.LineLoad load =
        new Verification.LineLoad(
            l.value("from", Dimension.LENGTH).orElse(0),
            l.value("to", Dimension.LENGTH).orElse(0),
            new Vector(bottom[0], bottom[1], bottom[2]),
            new Vector(top[0], top[1], top[2]));
    l.close();
    return load;
  }
}
