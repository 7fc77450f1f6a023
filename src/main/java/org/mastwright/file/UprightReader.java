package org.mastwright.file;

import java.util.Optional;
import org.mastwright.design.Rotor;
import org.mastwright.units.Dimension;

/** What an upright rotor has besides: read and kept; no load model for it is built yet. */
final class UprightReader {
  private final Key u;

  UprightReader(Key u) {
    this.u = u;
  }

  private static double length(Optional<Key> part, String key) {
    return part.map(p -> p.value(key, Dimension.LENGTH).orElse(0)).orElse(0.0);
  }

  Rotor.Upright read() {
    double bottom =
        u.required(
            "rotor-bottom-above-top",
            Dimension.LENGTH,
            "How far above the mast top do the blades begin?");
    double height = u.required("height", Dimension.LENGTH, "How high is the swept area?");
    Optional<Key> shaft = u.get("shaft");
    Optional<Key> blade = u.get("blade");
    Optional<Key> struts = u.get("struts");
    Rotor.Upright read =
        new Rotor.Upright(
            bottom,
            height,
            length(shaft, "outside"),
            length(shaft, "wall"),
            length(shaft, "length"),
            length(blade, "length"),
            length(blade, "chord"),
            blade.map(b -> b.value("thickness", Dimension.ONE).orElse(0)).orElse(0.0),
            blade.map(b -> b.choice("shape", "straight")).orElse("straight"),
            struts.map(s -> s.integer("per-blade", 0)).orElse(0),
            length(struts, "length"),
            length(struts, "chord"),
            struts.map(s -> s.value("mass", Dimension.MASS).orElse(0)).orElse(0.0),
            u.choice("top-held", "free"));
    shaft.ifPresent(Key::close);
    blade.ifPresent(Key::close);
    struts.ifPresent(Key::close);
    u.close();
    return read;
  }
}
