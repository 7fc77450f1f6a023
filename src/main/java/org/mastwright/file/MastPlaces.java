package org.mastwright.file;

import java.util.List;
import java.util.OptionalDouble;
import org.mastwright.design.Tube;
import org.mastwright.units.Dimension;

/** Places on the mast: by height above the datum or along the mast from its foot. */
record MastPlaces(double foot_m, List<Tube> tubes) {
  private static final double NEAR_M = 1e-6;

  MastPlaces {
    tubes = List.copyOf(tubes);
  }

  double length_m() {
    return tubes.get(tubes.size() - 1).top_m();
  }

  /** What {@code height} or {@code up-the-mast} says, exactly one of them. */
  double along(Key k) {
    OptionalDouble height = k.value("height", Dimension.LENGTH);
    OptionalDouble along = k.value("up-the-mast", Dimension.LENGTH);
    if (height.isPresent() == along.isPresent()) {
      k.error("missing", "Give `height` or `up-the-mast`, one of them.", "");
      return 0;
    }
    double s = along.orElseGet(() -> height.orElse(0) - foot_m);
    if (s > length_m() + NEAR_M || s < -NEAR_M) {
      Key at = k.get(height.isPresent() ? "height" : "up-the-mast").orElseThrow();
      off(at, s, height.isPresent());
    }
    return Math.max(0, Math.min(length_m(), s));
  }

  /** Says that a place is not on the mast. */
  void off(Key at, double along_m, boolean byHeight) {
    String foot = at.alike(foot_m, Dimension.LENGTH);
    String length = at.alike(length_m(), Dimension.LENGTH);
    at.error(
        "E11",
        at.text()
            + (along_m < 0
                ? " is below the mast's foot (" + foot + ")."
                : " is above the mast top ("
                    + (byHeight
                        ? at.alike(foot_m + length_m(), Dimension.LENGTH)
                            + ": foot "
                            + foot
                            + " + tubes "
                            + length
                        : length + " along the mast")
                    + ")."),
        byHeight
            ? "If " + at.text() + " was measured from somewhere else, say `up-the-mast`."
            : "If " + at.text() + " was measured from the ground, say `height`.");
  }

  /** Half the outside diameter at a place. */
  double radius_m(double along_m) {
    for (Tube t : tubes) {
      if (along_m <= t.top_m() + NEAR_M) {
        return t.sectionAt(Math.min(along_m, t.top_m())).outside_m() / 2;
      }
    }
    return 0;
  }
}
