package org.mastwright.mast;

import java.util.ArrayList;
import java.util.List;
import org.mastwright.design.Basis;
import org.mastwright.design.GuySet;
import org.mastwright.design.Tower;
import org.mastwright.design.Tube;

/**
 * How far the axis is off its true line as built, free of stress, towards the lee side.
 *
 * <p>Monopole: sway {@code φ} (EN 1993-1-1 5.3.2: 1/200 αh, or the stated lean if greater) and a
 * bow of {@code L/300} to {@code L/150} by buckling curve. Guyed: the stated lean (1/500) and spans
 * bowed by {@code L/1000} with alternating signs. AISC 360: 1/500 out of plumb in place of notional
 * loads.
 */
final class Imperfection {
  private Imperfection() {}

  /** Level offset of each node. */
  static List<Double> offsets_m(Tower tower, Mesh mesh, Basis.StrengthBasis strength) {
    List<Double> offsets = new ArrayList<>();
    for (int i = 0; i < mesh.nodes(); i++) {
      double s = mesh.along_m(i);
      offsets.add(
          tower.guys().isEmpty()
              ? freeStanding(tower, s, strength)
              : tower.outOfPlumbRatio() * s + spanBow(tower, s));
    }
    return offsets;
  }

  private static double freeStanding(Tower tower, double s, Basis.StrengthBasis strength) {
    double length_m = tower.length_m();
    if (strength != Basis.StrengthBasis.EN_1993) {
      return Math.max(tower.outOfPlumbRatio(), 1.0 / 500) * s
          + length_m / 1000 * Math.sin(Math.PI * s / length_m);
    }
    double height = Math.min(1, Math.max(2.0 / 3, 2 / Math.sqrt(length_m)));
    double sway = Math.max(tower.outOfPlumbRatio(), height / 200);
    return sway * s + length_m * bowRatio(tower) * Math.sin(Math.PI * s / length_m);
  }

  /** e0/L of elastic analysis: curve a for hot finished tubes, c for all others. */
  private static double bowRatio(Tower tower) {
    boolean hot = tower.tubes().stream().allMatch(t -> t.making() == Tube.Making.HOT_FINISHED);
    return hot ? 1.0 / 300 : 1.0 / 200;
  }

  private static double spanBow(Tower tower, double s) {
    double from = 0;
    int sign = 1;
    for (GuySet set : tower.guys()) {
      if (s <= set.along_m()) {
        double span_m = set.along_m() - from;
        return sign * span_m / 1000 * Math.sin(Math.PI * (s - from) / span_m);
      }
      from = set.along_m();
      sign = -sign;
    }
    return 0;
  }
}
