package org.mastwright.assess;

import java.util.OptionalDouble;
import org.mastwright.design.Design;
import org.mastwright.design.Rotor;
import org.mastwright.design.Turbine;

/** Heights and distances from the geometry alone. */
final class Outlines {
  private Outlines() {}

  static Outline of(Design design) {
    double top_m = design.tower().topHeight_m();
    if (design.turbine().isEmpty()) {
      OptionalDouble none = OptionalDouble.empty();
      return new Outline(top_m, none, none, none, none, top_m);
    }
    Turbine turbine = design.turbine().get();
    Rotor rotor = turbine.rotor();
    return rotor
        .upright()
        .map(u -> upright(top_m, rotor, u))
        .orElseGet(() -> horizontal(top_m, turbine));
  }

  private static Outline upright(double top_m, Rotor rotor, Rotor.Upright u) {
    double bottom_m = top_m + u.bottomAboveTop_m();
    double highest_m = bottom_m + u.height_m();
    return new Outline(
        top_m,
        OptionalDouble.of((bottom_m + highest_m) / 2),
        OptionalDouble.of(bottom_m),
        OptionalDouble.of(highest_m),
        OptionalDouble.of(rotor.radius_m()),
        highest_m);
  }

  private static Outline horizontal(double top_m, Turbine turbine) {
    Rotor rotor = turbine.rotor();
    double hub_m = top_m + turbine.head().hubAboveTop_m();
    double radius_m = rotor.radius_m();
    return new Outline(
        top_m,
        OptionalDouble.of(hub_m),
        OptionalDouble.of(hub_m - radius_m),
        OptionalDouble.of(hub_m + radius_m),
        OptionalDouble.of(Math.hypot(radius_m, rotor.overhang_m())),
        hub_m + radius_m);
  }
}
