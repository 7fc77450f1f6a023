package org.mastwright.file;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.mastwright.design.Rotor;
import org.mastwright.design.Turbine;
import org.mastwright.units.Dimension;
import org.mastwright.units.Unit;
import org.mastwright.working.DefaultTaken.Side;

/** The machine, with what was not given taken from practice and listed. */
final class TurbineReader {
  private final Key t;
  private final Faults faults;

  TurbineReader(Key t) {
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
    Optional<Key> rotorKey = t.need("rotor", "missing", "The rotor is not described.");
    Optional<Key> ratedKey = t.need("rated", "missing", "The rated point is not given.");
    Optional<Key> headKey = t.need("head", "missing", "The head is not described.");
    Optional<Turbine.Tail> tail = t.get("tail").map(this::tail);
    if (rotorKey.isEmpty() || ratedKey.isEmpty() || headKey.isEmpty()) {
      return null;
    }
    double mass = mass(rotorKey.get(), headKey.get(), tail);
    Turbine.Rated rated = rated(ratedKey.get());
    Rotor rotor = new RotorReader(rotorKey.get(), t.get("upright"), rated, mass).read();
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
            t.positive("survival-wind", Dimension.SPEED),
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
            t.positive("short-circuit-factor", Dimension.ONE).orElse(2),
            control,
            furl,
            parked(),
            imbalanceGrade() * 1e-3,
            thrust(),
            orders(),
            t.value("margin", Dimension.ONE).orElse(0.10));
    t.close();
    return all;
  }

  /** The whole, or the sum of rotor, head and tail; never guessed. */
  private double mass(Key rotor, Key head, Optional<Turbine.Tail> tail) {
    OptionalDouble whole = t.positive("mass", Dimension.MASS);
    OptionalDouble r = rotor.positive("mass", Dimension.MASS);
    OptionalDouble h = head.positive("mass", Dimension.MASS);
    double rest = tail.map(Turbine.Tail::mass_kg).orElse(0.0);
    if (whole.isEmpty() && (r.isEmpty() || h.isEmpty())) {
      t.error(
          "missing",
          "The mass on the tower is never guessed.",
          "Add `mass:`, or `rotor.mass` and `head.mass`.");
      return Double.NaN;
    }
    double sum = r.orElse(0) + h.orElse(0) + rest;
    if (whole.isPresent() && r.isPresent() && h.isPresent()) {
      if (Math.abs(sum - whole.getAsDouble()) > 0.02 * whole.getAsDouble()) {
        t.get("mass")
            .orElseThrow()
            .error(
                "mass",
                "Rotor, head and tail together have "
                    + t.get("mass").orElseThrow().alike(sum, Dimension.MASS)
                    + ", not "
                    + t.text("mass", "")
                    + ".",
                "Leave one of the masses out, or correct it.");
      }
    } else if (whole.isPresent() && sum >= whole.getAsDouble()) {
      t.get("mass").orElseThrow().error("mass", "is not more than its parts.", "");
    }
    return whole.orElse(sum);
  }

  private double imbalanceGrade() {
    Optional<Key> k = t.get("imbalance-grade");
    if (k.isEmpty()) {
      return 16;
    }
    if (!k.get().text().matches("G\\d{1,4}(\\.\\d+)?")) {
      k.get()
          .error(
              "choice", "\"" + k.get().text() + "\" is no balance grade.", "Write G16, as mm/s.");
      return 16;
    }
    return Double.parseDouble(k.get().text().substring(1));
  }

  private Turbine.Rated rated(Key k) {
    boolean electrical = k.choice("power-is", "electrical").equals("electrical");
    Turbine.Rated r =
        new Turbine.Rated(
            k.required("power", Dimension.POWER, "The rated power is missing."),
            electrical,
            k.required("wind", Dimension.SPEED, "The rated wind is missing."),
            k.required("rotor-speed", Dimension.ROTATION_SPEED, "The rated speed is missing."));
    k.close();
    return r;
  }

  private Turbine.Head head(Key k, Rotor rotor, double mass, Optional<Turbine.Tail> tail) {
    double hub = hub(k, rotor);
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

  private static double hub(Key k, Rotor rotor) {
    if (rotor.kind().isUpright()) {
      k.get("hub-above-top")
          .ifPresent(
              at ->
                  RotorReader.notUpright(
                      at,
                      rotor.kind(),
                      "no hub height",
                      "Write `upright.rotor-bottom-above-top`: from the mast top up to the lower"
                          + " end of the blades."));
      return rotor.upright().map(u -> u.bottomAboveTop_m() + u.height_m() / 2).orElse(1.0);
    }
    return k.required("hub-above-top", Dimension.LENGTH, "The height of the hub is never guessed.");
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
            k.get().choice("kind", "passive"), k.get().positive("rate", Dimension.ROTATION_SPEED));
    k.get().close();
    return yaw;
  }

  private Turbine.Control control() {
    String word = t.choice("control", "none");
    if (!t.has("control")) {
      taken("control", "none", Side.SAFE);
    }
    for (Turbine.Control c : Turbine.Control.values()) {
      if (c.key().equals(word)) {
        return c;
      }
    }
    return Turbine.Control.NONE;
  }

  private Turbine.Parked parked() {
    if (!t.has("parked")) {
      taken("parked", "both, the worse counts", Side.SAFE);
    }
    return switch (t.choice("parked")) {
      case "stopped" -> Turbine.Parked.STOPPED;
      case "spinning" -> Turbine.Parked.SPINNING;
      default -> Turbine.Parked.BOTH;
    };
  }

  private Optional<Turbine.StatedThrust> thrust() {
    Optional<Key> k = t.get("thrust");
    if (k.isEmpty()) {
      return Optional.empty();
    }
    if (k.get().isScalar()) {
      List<double[]> rows =
          DataTable.read(k.get(), faults.folder, List.of("wind_mps", "thrust_N"), List.of());
      return rows.isEmpty()
          ? Optional.empty()
          : Optional.of(
              new Turbine.StatedThrust(
                  k.get().text(),
                  rows.stream().map(r -> new Turbine.StatedThrust.Point(r[0], r[1])).toList()));
    }
    Turbine.StatedThrust stated =
        new Turbine.StatedThrust(
            k.get().text("source", "maker"),
            List.of(
                new Turbine.StatedThrust.Point(
                    k.get().value("at", Dimension.SPEED).orElse(0),
                    k.get().required("greatest", Dimension.FORCE, "How great?"))));
    k.get().close();
    return Optional.of(stated);
  }

  private List<Integer> orders() {
    List<Integer> all = new ArrayList<>();
    t.get("extra-orders")
        .ifPresent(
            list -> {
              for (Key k : list.items()) {
                int order = k.wholeNumber(1);
                if (order < 1) {
                  k.error("range", "an order is 1 or more.", "");
                }
                all.add(order);
              }
            });
    return all;
  }
}
