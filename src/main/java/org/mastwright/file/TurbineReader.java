package org.mastwright.file;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.mastwright.design.Rotor;
import org.mastwright.design.Site;
import org.mastwright.design.Turbine;
import org.mastwright.units.Dimension;
import org.mastwright.units.Unit;
import org.mastwright.working.DefaultTaken.Side;

/** The machine, with what was not given taken from practice and listed. */
final class TurbineReader {
  private final Key t;
  private final Faults faults;

  TurbineReader(Key t, Optional<Site> site) {
    this.t = t;
    this.faults = t.faults();
  }

  private void taken(String path, String value, Side side) {
    faults.taken("turbine." + path, value, "practice", side);
  }

  private double given(Key k, String key, Dimension d, double otherwise, Unit unit, Side side) {
    OptionalDouble v = k.value(key, d);
    if (v.isEmpty()) {
      faults.taken(k.path() + "." + key, unit.print(otherwise), "practice", side);
    }
    return v.orElse(otherwise);
  }

  Turbine read() {
    double mass = t.required("mass", Dimension.MASS, "The mass on the tower is never guessed.");
    Optional<Key> rotorKey = t.need("rotor", "missing", "The rotor is not described.");
    Optional<Key> ratedKey = t.need("rated", "missing", "The rated point is not given.");
    Optional<Key> headKey = t.need("head", "missing", "The head is not described.");
    if (rotorKey.isEmpty() || ratedKey.isEmpty() || headKey.isEmpty()) {
      return null;
    }
    Turbine.Rated rated = rated(ratedKey.get());
    Rotor rotor = rotor(rotorKey.get(), rated, mass);
    Optional<Turbine.Tail> tail = t.get("tail").map(this::tail);
    Turbine.Head head = head(headKey.get(), rotor, mass, tail);
    Turbine.RotorSpeed speed = rotorSpeed(rated);
    OptionalDouble cutIn = OptionalDouble.empty();
    OptionalDouble cutOut = OptionalDouble.empty();
    Optional<Key> wind = t.get("wind");
    if (wind.isPresent()) {
      cutIn = wind.get().positive("cut-in", Dimension.SPEED);
      cutOut = wind.get().positive("cut-out", Dimension.SPEED);
      wind.get().close();
    }
    Optional<Turbine.Furl> furl = t.get("furl").map(this::furl);
    Turbine.Control control = control();
    Turbine all =
        new Turbine(
            t.text("source", ""),
            t.text("certified-class", ""),
            t.value("survival-wind", Dimension.SPEED),
            mass,
            rotor,
            head,
            tail,
            rated,
            speed,
            cutIn,
            cutOut,
            design(rated),
            yaw(),
            t.positive("brake-torque", Dimension.MOMENT),
            t.value("short-circuit-factor", Dimension.ONE).orElse(2),
            control,
            furl,
            parked(),
            16,
            thrust(),
            orders(),
            t.value("margin", Dimension.ONE).orElse(0.10));
    t.known("imbalance-grade", "upright");
    t.close();
    return all;
  }

  private Turbine.Rated rated(Key k) {
    boolean electrical = k.text("power-is", "electrical").equals("electrical");
    Turbine.Rated r =
        new Turbine.Rated(
            k.required("power", Dimension.POWER, "The rated power is missing."),
            electrical,
            k.required("wind", Dimension.SPEED, "The rated wind is missing."),
            k.required("rotor-speed", Dimension.ROTATION_SPEED, "The rated speed is missing."));
    k.close();
    return r;
  }

  private Rotor rotor(Key k, Turbine.Rated rated, double mass) {
    Rotor.Kind kind = Rotor.Kind.PROPELLER;
    boolean known = false;
    for (Rotor.Kind x : Rotor.Kind.values()) {
      if (x.key().equals(k.text("kind", ""))) {
        kind = x;
        known = true;
      }
    }
    if (!known) {
      k.error(
          "choice",
          "rotor.kind is propeller, multi-blade, four-sail, savonius, darrieus or"
              + " straight-bladed.",
          "");
    } else if (kind.isUpright()) {
      k.error(
          "rotor-not-built",
          "Upright rotors are not calculated by this version.",
          "No load model for them is built yet.");
    }
    int blades = k.integer("blades", 3);
    double d = k.required("diameter", Dimension.LENGTH, "The rotor diameter is missing.");
    double area = bladeArea(k, d, blades);
    OptionalDouble ownMass = k.positive("mass", Dimension.MASS);
    if (ownMass.isEmpty()) {
      taken("rotor.mass", "25 % of the whole, 15 to 40 %", Side.UNKNOWN);
    }
    double m = ownMass.orElse(0.25 * mass);
    double ratio =
        k.positive("tip-speed-ratio", Dimension.ONE)
            .orElse(rated.omega_radps() * d / 2 / rated.wind_mps());
    if (!k.has("tip-speed-ratio")) {
      taken(
          "rotor.tip-speed-ratio", Unit.ONE.print(ratio) + ", from the rated point", Side.UNKNOWN);
    }
    for (String later : List.of("sections", "blade", "shaft")) {
      if (k.has(later)) {
        faults.note("read-not-used", k.path() + "." + later, "Read, not yet used.");
      }
    }
    k.known("hub-radius", "pitch", "balance");
    Rotor rotor =
        new Rotor(
            kind,
            blades,
            d,
            area,
            m,
            new Rotor.MassBand(
                ownMass.isPresent() ? m : 0.15 * mass, ownMass.isPresent() ? m : 0.40 * mass),
            k.text("position", "upwind").equals("downwind")
                ? Rotor.Position.DOWNWIND
                : Rotor.Position.UPWIND,
            given(k, "overhang", Dimension.LENGTH, 0.12 * d, Unit.M, Side.UNKNOWN),
            given(k, "tilt", Dimension.ANGLE, 0, Unit.DEG, Side.UNKNOWN),
            k.value("cone", Dimension.ANGLE).orElse(0),
            0,
            ratio,
            0,
            !k.text("spin", "clockwise").equals("anticlockwise"),
            new Rotor.Blade(m / blades, 0.35 * d / 2, m / blades * d * d / 4 / 6, false),
            new Rotor.Shaft(0.1 * d, 0.12 * d),
            false,
            List.of(),
            Optional.empty());
    k.close();
    return rotor;
  }

  private double bladeArea(Key k, double d, int blades) {
    OptionalDouble stated = k.positive("area-per-blade", Dimension.AREA);
    OptionalDouble solidity = k.positive("solidity", Dimension.ONE);
    if (stated.isPresent()) {
      return stated.getAsDouble();
    }
    if (solidity.isEmpty()) {
      taken("rotor.area-per-blade", "12 % solidity", Side.SAFE);
    }
    return solidity.orElse(0.12) * Math.PI * d * d / 4 / blades;
  }

  private Turbine.Head head(Key k, Rotor rotor, double mass, Optional<Turbine.Tail> tail) {
    double hub =
        k.required("hub-above-top", Dimension.LENGTH, "The height of the hub is never guessed.");
    double tailArea = tail.map(Turbine.Tail::area_m2).orElse(0.0);
    double side =
        given(
            k,
            "side-area",
            Dimension.AREA,
            0.04 * rotor.sweptArea_m2() + tailArea,
            Unit.M2,
            Side.UNKNOWN);
    double up = hub;
    double ahead = 0;
    Optional<Key> centre = k.get("centre");
    if (centre.isPresent()) {
      up = centre.get().value("above-top", Dimension.LENGTH).orElse(hub);
      ahead = centre.get().value("ahead", Dimension.LENGTH).orElse(0);
      centre.get().close();
    } else {
      taken("head.centre", "over the axis at hub height", Side.UNKNOWN);
    }
    double radius = 0.15 * rotor.diameter_m();
    double axis = mass * radius * radius;
    double across = axis;
    Optional<Key> inertia = k.get("inertia");
    if (inertia.isPresent()) {
      axis = inertia.get().value("about-tower-axis", Dimension.MASS_INERTIA).orElse(axis);
      across = inertia.get().value("about-transverse-axis", Dimension.MASS_INERTIA).orElse(across);
      inertia.get().close();
    } else {
      taken("head.inertia", "mass x (0.15 x diameter)²", Side.UNKNOWN);
    }
    double own =
        k.positive("mass", Dimension.MASS)
            .orElse(mass - rotor.mass_kg() - tail.map(Turbine.Tail::mass_kg).orElse(0.0));
    k.close();
    return new Turbine.Head(own, hub, up, ahead, side, axis, across);
  }

  private Turbine.Tail tail(Key k) {
    Turbine.Tail tail =
        new Turbine.Tail(
            k.required("area", Dimension.AREA, "The tail's area is missing."),
            k.required("arm", Dimension.LENGTH, "The tail's arm is missing."),
            k.value("mass", Dimension.MASS).orElse(0));
    k.close();
    return tail;
  }

  private Turbine.RotorSpeed rotorSpeed(Turbine.Rated rated) {
    Optional<Key> k = t.get("rotor-speed");
    if (k.isEmpty()) {
      taken("rotor-speed", "a third of rated to rated x 1.1", Side.SAFE);
      return new Turbine.RotorSpeed(
          rated.omega_radps() / 3,
          rated.omega_radps() * 1.1,
          OptionalDouble.empty(),
          OptionalDouble.empty(),
          List.of());
    }
    List<Turbine.Band> skip = new ArrayList<>();
    k.get()
        .get("skip")
        .ifPresent(
            list -> {
              for (Key pair : list.items()) {
                List<Key> ends = pair.items();
                if (ends.size() != 2) {
                  pair.error("shape", "a band has two ends.", "Write [171 rpm, 208 rpm].");
                } else {
                  skip.add(
                      new Turbine.Band(
                          ends.get(0).si(Dimension.ROTATION_SPEED),
                          ends.get(1).si(Dimension.ROTATION_SPEED)));
                }
              }
            });
    double lowest =
        given(
            k.get(),
            "lowest",
            Dimension.ROTATION_SPEED,
            rated.omega_radps() / 3,
            Unit.RPM,
            Side.UNKNOWN);
    double highest =
        given(
            k.get(),
            "highest",
            Dimension.ROTATION_SPEED,
            rated.omega_radps() * 1.1,
            Unit.RPM,
            Side.SAFE);
    if (!(highest > lowest)) {
      k.get().error("range", "highest must be above lowest.", "");
    }
    Turbine.RotorSpeed speed =
        new Turbine.RotorSpeed(
            lowest,
            highest,
            k.get().positive("trip", Dimension.ROTATION_SPEED),
            k.get().positive("runaway", Dimension.ROTATION_SPEED),
            skip);
    k.get().close();
    return speed;
  }

  private Turbine.Furl furl(Key k) {
    Turbine.Furl furl =
        new Turbine.Furl(
            k.required("begins", Dimension.SPEED, "Where does furling begin?"),
            k.required("complete", Dimension.SPEED, "Where is furling complete?"),
            k.text("how", ""));
    k.close();
    return furl;
  }

  private Turbine.DesignPoint design(Turbine.Rated rated) {
    Optional<Key> k = t.get("design");
    if (k.isEmpty()) {
      taken("design", "the rated values", Side.NEUTRAL);
      return new Turbine.DesignPoint(rated.power_W(), rated.omega_radps());
    }
    Turbine.DesignPoint d =
        new Turbine.DesignPoint(
            k.get().positive("power", Dimension.POWER).orElse(rated.power_W()),
            k.get().positive("rotor-speed", Dimension.ROTATION_SPEED).orElse(rated.omega_radps()));
    k.get().close();
    return d;
  }

  private Turbine.Yaw yaw() {
    Optional<Key> k = t.get("yaw");
    if (k.isEmpty()) {
      return new Turbine.Yaw("passive", OptionalDouble.empty());
    }
    Turbine.Yaw yaw =
        new Turbine.Yaw(
            k.get().text("kind", "passive"), k.get().positive("rate", Dimension.ROTATION_SPEED));
    k.get().close();
    return yaw;
  }

  private Turbine.Control control() {
    String word = t.text("control", "none");
    if (!t.has("control")) {
      taken("control", "none", Side.SAFE);
    }
    for (Turbine.Control c : Turbine.Control.values()) {
      if (c.key().equals(word)) {
        return c;
      }
    }
    t.error(
        "choice",
        "turbine.control is fixed-speed-stall, furling, pitch-to-feather, brake-only" + " or none.",
        "");
    return Turbine.Control.NONE;
  }

  private Turbine.Parked parked() {
    if (!t.has("parked")) {
      taken("parked", "both, the worse counts", Side.SAFE);
    }
    return switch (t.text("parked", "both")) {
      case "stopped" -> Turbine.Parked.STOPPED;
      case "spinning" -> Turbine.Parked.SPINNING;
      case "both" -> Turbine.Parked.BOTH;
      default -> {
        t.error("choice", "turbine.parked is stopped or spinning.", "");
        yield Turbine.Parked.BOTH;
      }
    };
  }

  private Optional<Turbine.StatedThrust> thrust() {
    return t.get("thrust")
        .map(
            k -> {
              Turbine.StatedThrust s =
                  new Turbine.StatedThrust(
                      k.text("source", "maker"),
                      List.of(
                          new Turbine.StatedThrust.Point(
                              k.value("at", Dimension.SPEED).orElse(0),
                              k.required("greatest", Dimension.FORCE, "How great?"))));
              k.close();
              return s;
            });
  }

  private List<Integer> orders() {
    List<Integer> all = new ArrayList<>();
    t.get("extra-orders")
        .ifPresent(
            list -> {
              for (Key k : list.items()) {
                try {
                  all.add(Integer.parseInt(k.text()));
                } catch (NumberFormatException e) {
                  k.error("number", "an order is a whole number.", "");
                }
              }
            });
    return all;
  }
}
