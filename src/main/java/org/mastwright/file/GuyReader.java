package org.mastwright.file;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.mastwright.design.Ground;
import org.mastwright.design.GuySet;
import org.mastwright.units.Dimension;

/** One guy level: where it holds the mast, where its guys end, rope, ends, tension. */
final class GuyReader {
  private static final double STEEL_EXPANSION_PER_K = 12e-6;

  private final Key k;
  private final int number;
  private final MastPlaces places;
  private final GroundReader ground;
  private final double declination_rad;
  private final boolean verification;

  GuyReader(
      Key k,
      int number,
      MastPlaces places,
      GroundReader ground,
      double declination_rad,
      boolean verification) {
    this.k = k;
    this.number = number;
    this.places = places;
    this.ground = ground;
    this.declination_rad = declination_rad;
    this.verification = verification;
  }

  GuySet read() {
    double along = places.along(k);
    if (k.has("to") == k.has("azimuths")) {
      k.error(
          "missing",
          "Where do the guys go?",
          "Name anchors in `to`, or give `azimuths` and `radius`.");
    }
    List<GuySet.Guy> guys = k.has("to") ? named() : shortForm();
    RopeReader rope = new RopeReader(k);
    GuySet.Rope strand = rope.rope();
    GuySet.Tension tension = rope.tension(guys.size());
    boolean atAnchor = !k.choice("tension-at", "anchor").equals("mast");
    if (tension instanceof GuySet.Tension.Force && !k.has("tension-at")) {
      Key at = k.get("tension").orElseThrow();
      at.error(
          "E12",
          (at.isScalar() ? at.text() : "These tensions") + ": at which end?",
          "Add `tension-at: anchor` (where the gauge usually sits) or `mast`.");
    }
    GuySet set =
        new GuySet(
            number,
            along,
            k.value("arm", Dimension.LENGTH).orElse(places.radius_m(along)),
            strand,
            rope.ends(),
            rope.hardware(),
            tension,
            atAnchor,
            k.value("tolerance", Dimension.ONE).orElse(0.10),
            settingGuy(guys),
            k.yes("upright", !verification) && !verification,
            k.value("thermal-expansion", Dimension.THERMAL_EXPANSION).orElse(STEEL_EXPANSION_PER_K),
            guys);
    k.close();
    return set;
  }

  private int settingGuy(List<GuySet.Guy> guys) {
    Optional<Key> of = k.get("tension-of");
    if (of.isEmpty()) {
      return 0;
    }
    List<Ground.Anchor> anchors = ground.anchors();
    for (int i = 0; i < guys.size(); i++) {
      if (anchors.get(guys.get(i).anchor()).name().equals(of.get().text())) {
        return i;
      }
    }
    of.get()
        .error(
            "anchor",
            "No guy of this set ends at " + of.get().text() + ".",
            "Name one of the anchors in `to`.");
    return 0;
  }

  private List<GuySet.Guy> named() {
    List<GuySet.Guy> guys = new ArrayList<>();
    List<Ground.Anchor> anchors = ground.anchors();
    for (Key name : k.get("to").orElseThrow().items()) {
      int found = ground.named(name.text());
      if (found < 0) {
        name.error(
            "anchor",
            "There is no anchor named " + name.text() + ".",
            "Named: "
                + String.join(", ", anchors.stream().map(Ground.Anchor::name).toList())
                + ".");
      } else {
        ground.use(found, number);
        Ground.Anchor a = anchors.get(found);
        guys.add(new GuySet.Guy(clockwise(Math.atan2(a.east_m(), a.north_m())), found));
      }
    }
    return guys;
  }

  private List<GuySet.Guy> shortForm() {
    List<GuySet.Guy> guys = new ArrayList<>();
    Optional<Key> azimuths = k.get("azimuths");
    if (azimuths.isEmpty()) {
      return guys;
    }
    List<Key> all = azimuths.get().items();
    List<Double> bearings =
        all.stream().map(b -> clockwise(b.bearing() + declination_rad)).toList();
    if (!k.has("radius")) {
      k.error("missing", "How far out are the anchors?", "Add `radius:`.");
    }
    double[] radius = values("radius", bearings);
    double[] level = values("anchor-level", bearings);
    Key unit = k.get("radius").map(r -> r.items().get(0)).orElse(k);
    for (int i = 0; i < bearings.size(); i++) {
      guys.add(
          new GuySet.Guy(
              bearings.get(i), ground.place(unit, number, bearings.get(i), radius[i], level[i])));
    }
    return guys;
  }

  /** A bearing from 0 to less than a whole turn. */
  private static double clockwise(double bearing_rad) {
    double turn = 2 * Math.PI;
    double b = bearing_rad % turn;
    return b < -1e-12 ? b + turn : Math.max(0, b);
  }

  /** One value for all guys, or one each. */
  private double[] values(String key, List<Double> bearings) {
    int count = bearings.size();
    double[] out = new double[count];
    Optional<Key> found = k.get(key);
    if (found.isEmpty()) {
      return out;
    }
    List<Key> items = found.get().items();
    if (items.isEmpty() || items.size() != 1 && items.size() != count) {
      found
          .get()
          .error(
              "E13",
              "has "
                  + items.size()
                  + " values but there are "
                  + count
                  + " guys in this set ("
                  + points(bearings)
                  + ").",
              "Give one value or " + Plain.number(count) + ".");
      return out;
    }
    for (int i = 0; i < count; i++) {
      out[i] = items.get(items.size() == 1 ? 0 : i).si(Dimension.LENGTH);
    }
    return out;
  }

  private static String points(List<Double> bearings) {
    return String.join(", ", bearings.stream().map(Compass::point).toList());
  }
}
