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

/** The rotor: its size, blades, mass and, where given, the geometry of a blade. */
final class RotorReader {
  private static final double SHARE = 0.25;
  private static final double LEAST_SHARE = 0.15;
  private static final double GREATEST_SHARE = 0.40;
  private static final double SOLIDITY_OF_THREE = 0.12;

  private final Key k;
  private final Optional<Key> upright;
  private final Turbine.Rated rated;
  private final double machine_kg;
  private final Faults faults;

  RotorReader(Key k, Optional<Key> upright, Turbine.Rated rated, double machine_kg) {
    this.k = k;
    this.upright = upright;
    this.rated = rated;
    this.machine_kg = machine_kg;
    this.faults = k.faults();
  }

  Rotor read() {
    Rotor.Kind kind = kind();
    int blades = k.integer("blades", 3);
    if (blades < 1 || blades > 60) {
      k.get("blades").orElse(k).error("range", "A rotor has 1 to 60 blades.", "");
      blades = 3;
    }
    double d = k.required("diameter", Dimension.LENGTH, "The rotor diameter is missing.");
    double area = bladeArea(d, blades);
    OptionalDouble own = k.positive("mass", Dimension.MASS);
    if (own.isEmpty()) {
      taken("mass", "25 % of the whole, 15 to 40 %", Side.UNKNOWN);
    }
    double mass = own.orElse(SHARE * machine_kg);
    Rotor rotor =
        new Rotor(
            kind,
            blades,
            d,
            area,
            mass,
            new Rotor.MassBand(
                own.orElse(LEAST_SHARE * machine_kg), own.orElse(GREATEST_SHARE * machine_kg)),
            k.choice("position", "upwind").equals("downwind")
                ? Rotor.Position.DOWNWIND
                : Rotor.Position.UPWIND,
            overhang(kind, d),
            angle("tilt", kind),
            k.value("cone", Dimension.ANGLE).orElse(0),
            k.value("hub-radius", Dimension.LENGTH).orElse(0),
            tipSpeedRatio(d),
            k.value("pitch", Dimension.ANGLE).orElse(0),
            k.choice("spin", "clockwise").equals("clockwise"),
            blade(mass / blades, d / 2),
            shaft(d),
            k.choice("balance", "unknown").equals("in-place"),
            sections(),
            uprightPart(kind));
    k.close();
    return rotor;
  }

  private void taken(String key, String value, Side side) {
    faults.taken(k.path() + "." + key, value, "practice", side);
  }

  private Rotor.Kind kind() {
    k.need("kind", "missing", "What kind of rotor is it?");
    String word = k.choice("kind");
    for (Rotor.Kind x : Rotor.Kind.values()) {
      if (x.key().equals(word)) {
        if (x.isUpright()) {
          k.get("kind")
              .orElseThrow()
              .error(
                  "rotor-not-built",
                  "Upright rotors are not calculated by this version.",
                  "No load model for them is built yet.");
        }
        return x;
      }
    }
    return Rotor.Kind.PROPELLER;
  }

  /** E17: what an upright rotor does not have. */
  static void notUpright(Key at, Rotor.Kind kind, String what, String remedy) {
    String word = kind.key();
    String name =
        word.equals("straight-bladed")
            ? word
            : Character.toUpperCase(word.charAt(0)) + word.substring(1);
    at.error("E17", "A " + name + " rotor has " + what + ".", remedy);
  }

  private double overhang(Rotor.Kind kind, double d) {
    if (kind.isUpright()) {
      k.get("overhang").ifPresent(at -> notUpright(at, kind, "no overhang", "Leave it out."));
      k.get("position").ifPresent(at -> notUpright(at, kind, "no upwind side", "Leave it out."));
      return 0;
    }
    OptionalDouble stated = k.value("overhang", Dimension.LENGTH);
    if (stated.isEmpty()) {
      taken("overhang", Unit.M.print(0.12 * d), Side.UNKNOWN);
    } else if (stated.getAsDouble() < 0) {
      k.get("overhang")
          .orElseThrow()
          .error("range", "is always positive.", "Say on which side with `position`.");
    }
    return stated.orElse(0.12 * d);
  }

  private double angle(String key, Rotor.Kind kind) {
    if (kind.isUpright()) {
      k.get(key).ifPresent(at -> notUpright(at, kind, "no " + key, "Leave it out."));
      return 0;
    }
    OptionalDouble stated = k.value(key, Dimension.ANGLE);
    if (stated.isEmpty()) {
      taken(key, "0 deg", Side.UNKNOWN);
    }
    return stated.orElse(0);
  }

  private double tipSpeedRatio(double d) {
    OptionalDouble stated = k.positive("tip-speed-ratio", Dimension.ONE);
    double ratio = stated.orElse(rated.omega_radps() * d / 2 / rated.wind_mps());
    if (stated.isEmpty()) {
      taken("tip-speed-ratio", Unit.ONE.print(ratio) + ", from the rated point", Side.UNKNOWN);
    }
    return ratio;
  }

  /** As stated, from the solidity, or that of a three-blade rotor of 12 %. */
  private double bladeArea(double d, int blades) {
    OptionalDouble stated = k.positive("area-per-blade", Dimension.AREA);
    OptionalDouble solidity = k.positive("solidity", Dimension.ONE);
    double disc = Math.PI * d * d / 4;
    if (stated.isPresent()) {
      return stated.getAsDouble();
    }
    if (solidity.isPresent()) {
      return solidity.getAsDouble() * disc / blades;
    }
    taken("area-per-blade", "12 % solidity of a three-blade rotor", Side.SAFE);
    return SOLIDITY_OF_THREE * disc / Math.min(blades, 3);
  }

  /** One blade; by the mass rule where it is not described. */
  private Rotor.Blade blade(double share_kg, double radius_m) {
    Optional<Key> b = k.get("blade");
    if (b.isEmpty()) {
      return new Rotor.Blade(share_kg, 0.35 * radius_m, share_kg * radius_m * radius_m / 6, false);
    }
    double mass = b.get().positive("mass", Dimension.MASS).orElse(share_kg);
    Rotor.Blade blade =
        new Rotor.Blade(
            mass,
            b.get().positive("cog-radius", Dimension.LENGTH).orElse(0.35 * radius_m),
            b.get()
                .positive("inertia", Dimension.MASS_INERTIA)
                .orElse(mass * radius_m * radius_m / 6),
            b.get().has("mass"));
    b.get().close();
    return blade;
  }

  private Rotor.Shaft shaft(double d) {
    Optional<Key> s = k.get("shaft");
    if (s.isEmpty()) {
      return new Rotor.Shaft(0.1 * d, 0.12 * d);
    }
    Rotor.Shaft shaft =
        new Rotor.Shaft(
            s.get().positive("bearing-arm", Dimension.LENGTH).orElse(0.1 * d),
            s.get().positive("yaw-arm", Dimension.LENGTH).orElse(0.12 * d));
    s.get().close();
    return shaft;
  }

  private List<Rotor.BladeSection> sections() {
    List<Rotor.BladeSection> all = new ArrayList<>();
    k.get("sections")
        .ifPresent(
            list -> {
              for (Key s : list.items()) {
                all.add(section(s));
                s.close();
              }
            });
    return all;
  }

  private Rotor.BladeSection section(Key s) {
    double radius = s.required("radius", Dimension.LENGTH, "At what radius?");
    double chord = s.required("chord", Dimension.LENGTH, "How wide is the blade there?");
    Optional<Key> twist = s.need("twist", "missing", "What is the twist there?");
    Optional<Key> airfoil = s.need("airfoil", "missing", "Which airfoil table?");
    List<Rotor.PolarPoint> polar = new ArrayList<>();
    if (airfoil.isPresent()) {
      List<String> must = List.of("alpha_deg", "cl", "cd");
      for (double[] r : DataTable.read(airfoil.get(), faults.folder, must, List.of("cm"))) {
        OptionalDouble cm = Double.isNaN(r[3]) ? OptionalDouble.empty() : OptionalDouble.of(r[3]);
        polar.add(new Rotor.PolarPoint(Unit.DEG.toSi(r[0]), r[1], r[2], cm));
      }
    }
    return new Rotor.BladeSection(
        radius,
        chord,
        twist.map(t -> t.si(Dimension.ANGLE)).orElse(Double.NaN),
        airfoil.map(Key::text).orElse(""),
        polar);
  }

  private Optional<Rotor.Upright> uprightPart(Rotor.Kind kind) {
    if (upright.isEmpty()) {
      if (kind.isUpright()) {
        k.error("missing", "An upright rotor is not described.", "Add `turbine.upright:`.");
      }
      return Optional.empty();
    }
    if (!kind.isUpright()) {
      upright.get().error("choice", "A " + kind.key() + " rotor is not upright.", "Leave it out.");
      return Optional.empty();
    }
    return Optional.of(new UprightReader(upright.get()).read());
  }
}
