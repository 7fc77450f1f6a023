package org.mastwright.file;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.mastwright.design.Site;
import org.mastwright.units.Dimension;

/** The ground and the earthquake: read and kept; nothing is calculated from them yet. */
final class SoilReader {
  private SoilReader() {}

  static Site.Soil soil(Key s) {
    List<Site.Soil.Layer> layers = new ArrayList<>();
    s.get("layers").ifPresent(list -> list.items().forEach(l -> layers.add(layer(l))));
    String meaning = s.choice("bearing-is");
    if (s.has("bearing") && !s.has("bearing-is")) {
      s.get("bearing")
          .orElseThrow()
          .error(
              "missing",
              "Is this an allowable or an ultimate value? The difference is a factor of about three.",
              "Add `bearing-is: allowable` or `bearing-is: ultimate`.");
    }
    OptionalDouble strength = s.positive("undrained-strength", Dimension.PRESSURE);
    OptionalDouble unconfined = s.positive("unconfined", Dimension.PRESSURE);
    if (strength.isPresent() && unconfined.isPresent()) {
      s.error(
          "choice", "undrained-strength and unconfined are both given.", "Keep one of the two.");
    }
    Site.Soil soil =
        new Site.Soil(
            s.choice("source", "assumed"),
            s.choice("class"),
            s.yes("wet", true),
            s.positive("bearing", Dimension.PRESSURE),
            meaning,
            s.positive("lateral-bearing", Dimension.PRESSURE_PER_LENGTH),
            s.positive("friction-angle", Dimension.ANGLE),
            unconfined.isPresent() ? OptionalDouble.of(unconfined.getAsDouble() / 2) : strength,
            s.positive("unit-weight", Dimension.WEIGHT_PER_VOLUME),
            s.value("water-level", Dimension.LENGTH),
            s.value("frost", Dimension.LENGTH),
            layers);
    s.close();
    return soil;
  }

  private static Site.Soil.Layer layer(Key l) {
    Site.Soil.Layer layer =
        new Site.Soil.Layer(
            l.required("to", Dimension.LENGTH, "How deep does the layer go?"),
            l.choice("class"),
            l.positive("friction-angle", Dimension.ANGLE),
            l.positive("undrained-strength", Dimension.PRESSURE),
            l.positive("unit-weight", Dimension.WEIGHT_PER_VOLUME));
    l.close();
    return layer;
  }

  static Site.Seismic seismic(Key q) {
    Site.Seismic seismic =
        new Site.Seismic(
            q.positive("sds", Dimension.ACCELERATION),
            q.positive("sd1", Dimension.ACCELERATION),
            q.positive("importance", Dimension.ONE).orElse(1),
            q.positive("plateau", Dimension.ACCELERATION),
            q.positive("corner-period", Dimension.TIME),
            q.choice("ground-type"));
    q.close();
    return seismic;
  }
}
